# Limits of the habitable zone of cool and hot stars, from the published coefficients (a copy of their own, from memory).
from fractions import Fraction

from mpmath import mp, mpf, nstr

from common import made_by, save

mp.dps = 30

# S_sun, a, b, c, d. Kopparapu et al. 2013, Table 3 as in the erratum; Kopparapu et al. 2014, Table 1 (1, 5 and 0.1 Earth masses)
TABLE = {
    2013: {
        ("recent Venus", 1): "1.7763 1.4335e-4 3.3954e-9 -7.6364e-12 -1.1950e-15",
        ("runaway greenhouse", 1): "1.0385 1.2456e-4 1.4612e-8 -7.6345e-12 -1.7511e-15",
        ("moist greenhouse", 1): "1.0146 8.1884e-5 1.9394e-9 -4.3618e-12 -6.8260e-16",
        ("maximum greenhouse", 1): "0.3507 5.9578e-5 1.6707e-9 -3.0058e-12 -5.1925e-16",
        ("early Mars", 1): "0.3207 5.4471e-5 1.5275e-9 -2.1709e-12 -3.8282e-16",
    },
    2014: {
        ("recent Venus", 1): "1.776 2.136e-4 2.533e-8 -1.332e-11 -3.097e-15",
        ("runaway greenhouse", 1): "1.107 1.332e-4 1.580e-8 -8.308e-12 -1.931e-15",
        ("maximum greenhouse", 1): "0.356 6.171e-5 1.698e-9 -3.198e-12 -5.575e-16",
        ("early Mars", 1): "0.320 5.547e-5 1.526e-9 -2.874e-12 -5.011e-16",
        ("runaway greenhouse", 5): "1.188 1.433e-4 1.707e-8 -8.968e-12 -2.084e-15",
        ("runaway greenhouse", 0.1): "0.99 1.209e-4 1.404e-8 -7.418e-12 -1.713e-15",
    },
}
# the ends of the published range, where every power of T* weighs
STARS = (2600, 7200)


def flux(numbers, T):
    """In units of the flux at the Earth, exactly."""
    return sum(Fraction(text) * (T - 5780) ** power for power, text in enumerate(numbers.split()))


def digits(share):
    return nstr(mpf(share.numerator) / share.denominator, 20)


save(
    "habitable_zone",
    {
        "title": "Flux at the limits of the habitable zone, in units of the flux at the Earth",
        "made": made_by(__file__, "the published polynomials in fractions", "mpmath"),
        "rows": [
            {"year": year, "name": name, "massEarths": mass, "T": T, "share": digits(flux(numbers, T))}
            for year, limits in TABLE.items()
            for (name, mass), numbers in limits.items()
            for T in STARS
        ],
    },
)
