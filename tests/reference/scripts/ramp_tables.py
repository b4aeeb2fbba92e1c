# All equilibria with a piecewise-linear albedo and a straight-line emission: everything is rational and done exactly.
from fractions import Fraction

from mpmath import mp, mpf, nstr

from common import made_by, save

mp.dps = 60


def written(x, digits=24):
    return nstr(mpf(x.numerator) / mpf(x.denominator), digits, min_fixed=-8, max_fixed=10)


def states(p, S):
    """Each piece of the ramp is one linear equation q + k T = 0; a root on a corner belongs to the flat piece."""
    A, B, T_ice, T_free, ice, free = (Fraction(p[k]) for k in ("A", "B", "T_ice", "T_free", "alpha_ice", "alpha_free"))
    fall = (free - ice) / (T_free - T_ice)
    pieces = [
        ("ice", None, T_ice, ice, Fraction(0)),
        ("ramp", T_ice, T_free, ice - fall * T_ice, fall),
        ("free", T_free, None, free, Fraction(0)),
    ]
    found = []
    for piece, low, high, at_zero, slope in pieces:
        k = -S / 4 * slope - B
        q = S / 4 * (1 - at_zero) - A
        if k == 0:
            if q == 0:
                found.append({"piece": piece, "everywhere": True})
            continue
        T = -q / k
        outside = (low is not None and T < low) or (high is not None and T > high)
        on_corner = T in (T_ice, T_free)
        if outside or (on_corner and piece == "ramp"):
            continue
        found.append(
            {
                "piece": piece,
                "T": written(T),
                "onCorner": on_corner,
                "lambda": written(k),
                "stable": None if on_corner else k < 0,
                "parts": {"outgoing": written(-B), "albedo": written(-S / 4 * slope)},
                "factors": {"albedo": written(-S / 4 * slope / B)},
                "dTdS": written((1 - at_zero - slope * T) / 4 / -k),
            }
        )
    return found


def case(name, unit, inputs, fluxes):
    keys = ("A", "B", "T_ice", "T_free", "alpha_ice", "alpha_free")
    p = dict(zip(keys, inputs))
    rows = [{"S": S, "states": states(p, Fraction(S))} for S in fluxes]
    return {"id": "ii-" + name, "inputs": p, "unit": unit, "rows": rows}


every_fifty = [str(S) for S in range(1000, 1801, 50)] + ["1361"]
save(
    "ii_ramp_linear",
    {
        "title": "Equilibria with a ramp albedo and a straight-line emission",
        "budget": "N = S(1 - alpha)/4 - (A + B T), alpha_ice below T_ice, alpha_free above T_free, linear between",
        "made": made_by(__file__, "exact fractions", "mpmath"),
        "cases": [
            case("a", "K", ("-377.2", "2.1", "250", "280", "0.7", "0.3"), every_fifty),
            case("b-celsius", "degC", ("203.3", "2.09", "-10", "0", "0.62", "0.3"), every_fifty),
            case("c-no-bistability", "degC", ("202", "1.9", "-20", "20", "0.45", "0.3"), every_fifty),
            case(
                "d-degenerate-slope",
                "degC",
                ("200", "2.5", "-20", "20", "0.6", "0.3"),
                ["1300", "1333.3333333333333333", "4000/3", "1400"],
            ),
            case("d2-continuum", "degC", ("550/3", "2.5", "-20", "20", "0.6", "0.3"), ["1300", "4000/3", "1400"]),
            case("e-corner-roots", "degC", ("200", "2", "-10", "10", "0.6", "0.3"), ["1800", "8800/7", "1500", "1200"]),
        ],
    },
)
