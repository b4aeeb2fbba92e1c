# Flux of a black body as the integral of Planck's law over frequency and half a sphere of directions.
from mpmath import mp, mpf, expm1, inf, nstr, pi, quad

from common import made_by, save

mp.dps = 30
h, c, k = mpf("6.62607015e-34"), mpf(299792458), mpf("1.380649e-23")


def flux(T):
    # frequency in units of kT/h, so that the spectrum has its peak near 3
    unit = k * T / h
    radiance = lambda x: 2 * h * (x * unit) ** 3 / c**2 / expm1(x) * unit
    return pi * quad(radiance, [0, 3, 10, 30, 100, inf])


rows = [{"T": T, "flux": nstr(flux(mpf(T)), 20)} for T in (40, 125, 255, 288, 737, 2566, 5772)]
save(
    "planck_flux",
    {
        "title": "Flux of a black body, W m^-2, from h, c and k",
        "made": made_by(__file__, "quadrature of Planck's law, 30 digits", "mpmath"),
        "rows": rows,
    },
)
