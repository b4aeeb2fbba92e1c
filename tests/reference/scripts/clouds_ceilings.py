# Clouds over surfaces, optical depths that scale, and the limits of a grey steam atmosphere, each from first principles.
from fractions import Fraction

from mpmath import exp, findroot, log, mp, mpf, nstr, power, quad
from scipy.optimize import fsolve, minimize_scalar

from common import made_by, save

mp.dps = 30
SIGMA = mpf("5.670374419e-8")
GAS = mpf("8.314462618")


def follow(R, a, surface):
    """Follows one unit of sunlight through every reflection until less than 1e-40 is under way."""
    passing = 1 - R - a
    out, ground, cloud = R, Fraction(0) * R, a
    down = passing
    while down > 1e-40:
        ground += down * (1 - surface)
        up = down * surface
        out += up * passing
        cloud += up * a
        down = up * R
    return out, ground, cloud


def clouds(cases):
    rows = []
    for R, a, surface in cases:
        shares = follow(*(Fraction(x) for x in (R, a, surface)))
        names = ("albedo", "ground", "cloud")
        row = {"reflectance": float(R), "absorptance": float(a), "surface": float(surface)}
        rows.append({**row, **{n: nstr(mpf(s.numerator) / s.denominator, 20) for n, s in zip(names, shares)}})
    return rows


def fitted(down, up, reflected, incoming):
    """The one layer that sends these fluxes down to the surface and back to space."""
    surface = up / down

    def miss(unknown):
        out, ground, _ = follow(unknown[0], unknown[1], surface)
        return [out - reflected / incoming, ground - (down - up) / incoming]

    R, a = fsolve(miss, [0.25, 0.2], xtol=1e-13)
    return {"reflectance": R, "absorptance": a, "surface": surface}


def saturation(T):
    return mpf("1.4e11") * exp(-mpf(43655) / (GAS * T))


def stratosphere(k, g, humidity):
    """The largest flux over all tropopause temperatures, by minimization."""
    flux = lambda T: 2 * SIGMA * T**4 / (1 + mpf(3) / 2 * humidity * k * saturation(T) / g)
    found = minimize_scalar(lambda T: -float(flux(mpf(T))), bounds=(120, 2000), method="bounded", options={"xatol": 1e-9})
    return nstr(flux(mpf(found.x)), 16)


def troposphere(k, g):
    """What each layer of the column sends to space, by quadrature over its temperature."""
    depth = lambda T: mpf(3) / 2 * k * saturation(T) / g
    slope = lambda T: depth(T) * mpf(43655) / (GAS * T * T)
    top = findroot(lambda T: log(depth(T)) - log(60), 350)
    nodes = [top * mpf(i) / 40 for i in range(2, 41)]
    return nstr(quad(lambda T: SIGMA * T**4 * exp(-depth(T)) * slope(T), nodes), 16)


limits = [("0.01", "9.8"), ("0.01", "3.7"), ("0.1", "9.8"), ("0.001", "25"), ("0.0001", "100"), ("10", "0.1")]
boiling = findroot(lambda T: 611 * exp(mpf("2.5e6") / mpf("461.5") * (1 / mpf("273.16") - 1 / T)) - 101325, 370)

save(
    "clouds_ceilings",
    {
        "title": "Clouds over surfaces, optical depths that scale, limits of a grey steam atmosphere",
        "made": made_by(
            __file__,
            "light followed through its reflections in fractions; powers, maxima and quadrature in 30 digits",
            "mpmath",
            "scipy",
        ),
        "clouds": clouds(
            [
                ("0.4", "0.1", "0.3"),
                ("0.25", "0", "0.15"),
                ("0.65", "0.05", "0.06"),
                ("0.65", "0.05", "0.85"),
                ("0", "0.2", "0.5"),
                ("0.3", "0.7", "0.9"),
            ]
        ),
        "layerOfTheEarth": {k: float(v) for k, v in fitted(185.0, 25.0, 100.0, 340.0).items()},
        "pressure": [
            {"pressure": p, "exponent": n, "ratio": nstr(power(mpf(p) / 101325, mpf(str(n))), 18)}
            for p, n in [(50662.5, 2), (9.2e6, 1), (9.2e6, 1.5), (610, 2)]
        ],
        "boiling": nstr(boiling, 16),
        "vapour": [
            {"T": T, "ratio": nstr(exp(quad(lambda x: mpf("2.5e6") / mpf("461.5") / x**2, [288, T])), 18)}
            for T in (240, 273.15, 300, 340)
        ],
        "stratosphere": [
            {"absorption": float(k), "gravity": float(g), "humidity": float(h), "flux": stratosphere(mpf(k), mpf(g), mpf(h))}
            for (k, g), h in zip(limits + [("0.01", "9.8")], ["1", "1", "0.5", "1", "0.01", "1", "0.1"])
        ],
        "troposphere": [
            {"absorption": float(k), "gravity": float(g), "flux": troposphere(mpf(k), mpf(g))} for k, g in limits
        ],
    },
)
