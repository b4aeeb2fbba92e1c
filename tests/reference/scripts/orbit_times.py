# Time means and shares of time on Kepler orbits with many digits: quadrature over the eccentric anomaly and bisection.
from mpmath import atan, cos, mp, mpf, nstr, pi, quad, sqrt

from common import made_by, save

mp.dps = 40


def time_mean(f, e):
    """dM = (1 − e·cos E) dE, over half an orbit; pieces that shrink towards the star."""
    pieces = [mpf(0)] + [pi / 2**k for k in range(12, -1, -1)]
    return quad(lambda E: f(1 - e * cos(E)) * (1 - e * cos(E)), pieces) / pi


def anomaly_where(flux, e):
    """Eccentric anomaly at which (a/r)² falls to a flux, by bisection; an end of the half orbit where it never does."""
    low, high = mpf(0), +pi
    above = lambda E: (1 - e * cos(E)) ** 2 * flux < 1
    if not above(low):
        return low
    if above(high):
        return high
    for _ in range(140):
        middle = (low + high) / 2
        low, high = (middle, high) if above(middle) else (low, middle)
    return low


def time_share(e, low, high):
    near, far = anomaly_where(high, e), anomaly_where(low, e)
    return quad(lambda E: 1 - e * cos(E), [near, far]) / pi


means = []
for e in ("0", "1e-8", "0.0167", "0.1", "0.2056", "0.3", "0.5", "0.7", "0.9", "0.97", "0.99", "0.999", "0.9999"):
    means.append(
        {
            "e": float(e),
            "flux": nstr(time_mean(lambda r: r**-2, mpf(float(e))), 25),
            "temperature": nstr(time_mean(lambda r: 1 / sqrt(r), mpf(float(e))), 25),
        }
    )
LIMITS = (
    (0.3, 0.8, 1.2),
    (0.3, 0.0, 1.0),
    (0.3, 1.0, 9.0),
    (0.1, 0.9, 1.1),
    (0.1, 0.5, 0.9),
    (0.0167, 0.99, 1.01),
    (0.001, 0.999, 1.0005),
    (0.6, 2.0, 6.0),
    (0.6, 0.4, 0.5),
    (0.9, 10.0, 90.0),
    (0.99, 5000.0, 9000.0),
    (0.9999, 0.25, 0.26),
)
shares = [
    {"e": e, "low": low, "high": high, "share": nstr(time_share(mpf(e), mpf(low), mpf(high)), 25)} for e, low, high in LIMITS
]
angles = []
for k in range(-40, 41):
    along, across = 1.0, float(mpf("1.37") ** k)
    angles.append({"along": along, "across": across, "angle": nstr(atan(mpf(across)), 25)})
for k in range(1, 40):
    along, across = 1.0, k / 40 + 1e-3
    angles.append({"along": along, "across": across, "angle": nstr(atan(mpf(across)), 25)})
save(
    "orbit_times",
    {
        "title": "Time-mean flux and temperature over those at r = a, shares of time between two fluxes, and angles by their tangents",
        "made": made_by(__file__, "quadrature over the eccentric anomaly, bisection, 40 digits", "mpmath"),
        "means": means,
        "shares": shares,
        "angles": angles,
    },
)
