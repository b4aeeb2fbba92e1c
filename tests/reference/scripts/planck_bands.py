# Band fractions of a black body's energy by quadrature of Planck's law, between wavelengths in micrometres.
from mpmath import exp, expm1, inf, mp, mpf, nstr, pi, quad, zeta

from common import made_by, save

mp.dps = 60
C2 = mpf("6.62607015e-34") * 299792458 / mpf("1.380649e-23")
TEMPERATURES = ("150", "200", "255", "273.15", "288", "300", "320", "400", "700", "1000", "2600", "4000", "5772", "6500")
BANDS = (
    ("0", "4"),
    ("4", "inf"),
    ("8", "12"),
    ("13.5", "17"),
    ("0.38", "0.75"),
    ("0", "0.7"),
    ("6", "8"),
    ("17", "25"),
    ("25", "inf"),
    ("0", "1"),
)


def integral(low, high):
    """Of x³/(eˣ − 1); the exponential at the lower end is taken out, so that the quadrature is relative."""
    if low == 0:
        return integral(mpf(1), high) + quad(lambda x: x**3 / expm1(x), [0, 1]) if high > 1 else quad(lambda x: x**3 / expm1(x), [0, high])
    steps = [low + d for d in (0, 1, 3, 8, 20, 50, 120, 300) if low + d < high]
    return exp(-low) * quad(lambda x: x**3 * exp(low - x) / -expm1(-x), [*steps, high if high != inf else low + 500])


def fraction(T, shortest, longest):
    x = lambda wavelength: C2 / (mpf(wavelength) * mpf("1e-6") * mpf(T))
    low = mpf(0) if longest == "inf" else x(longest)
    high = inf if shortest == "0" else x(shortest)
    return integral(low, high) * 15 / pi**4


whole = integral(mpf(0), inf)
assert abs(whole - pi**4 / 15) < mpf("1e-45") and abs(whole - 6 * zeta(4)) < mpf("1e-45")
rows = [
    {"T": T, "from": shortest, "to": longest, "fraction": nstr(fraction(T, shortest, longest), 30)}
    for T in TEMPERATURES
    for shortest, longest in BANDS
]
save(
    "ix_planck_bands",
    {
        "title": "Share of the energy of a black body between two wavelengths in micrometres, from h, c and k",
        "made": made_by(__file__, "quadrature of Planck's law, 60 digits", "mpmath"),
        "rows": rows,
    },
)
