# Vapour pressures over liquid water, ice and dry ice from equations of state-grade lines, other than those of the library.
from math import exp, log

from scipy.optimize import brentq

from common import made_by, save


def liquid(T):
    """Wagner & Pruss 1993 (IAPWS SR1-86), in Pa; coefficients from memory."""
    tau = 1 - T / 647.096
    powers = {1: -7.85951783, 1.5: 1.84408259, 3: -11.7866497, 3.5: 22.6807411, 4: -15.9618719, 7.5: 1.80122502}
    return 22.064e6 * exp(647.096 / T * sum(a * tau**n for n, a in powers.items()))


def ice(T):
    """Wagner et al. 2011 (IAPWS R14-08), in Pa; coefficients from memory. Prints 8.94735 Pa at 230 K."""
    theta = T / 273.16
    terms = ((-21.2144006, 0.333333333e-2), (27.3203819, 1.20666667), (-6.10598130, 1.70333333))
    return 611.657 * exp(sum(a * theta**b for a, b in terms) / theta)


def dry_ice(T):
    """Sublimation of CO2, Span & Wagner 1996, in Pa; coefficients from memory."""
    tau = 1 - T / 216.592
    return 517950 * exp(216.592 / T * (-14.740846 * tau + 2.4327015 * tau**1.9 - 5.3061778 * tau**2.9))


def fanale(p):
    """Frost point of CO2, Fanale et al. 1982 as restated by Forget et al. 2013, in K; coefficients from memory."""
    return -3167.8 / (log(0.01 * p) - 23.23)


def frost_point(p):
    return brentq(lambda T: log(dry_ice(T) / p), 60, 216.592, xtol=1e-10)


assert abs(ice(230) - 8.94735) < 1e-5
save(
    "phase_lines",
    {
        "title": "Vapour pressures of water and frost points of CO2",
        "made": made_by(__file__, "closed forms; frost points by root finding", "scipy"),
        "liquid": [{"T": T, "p": liquid(T)} for T in (280, 320, 400, 500, 600, 640)],
        "ice": [{"T": T, "p": ice(T)} for T in (120, 150, 180, 200, 230, 250, 270)],
        "dryIce": [{"p": p, "T": frost_point(p)} for p in (10, 610, 10000, 101325, 500000)],
        "fanale": [{"p": p, "T": fanale(p)} for p in (1e-6, 610, 500000)],
    },
)
