# Time means over a Kepler orbit by stepping through it: Kepler's equation solved at equal times, no closed form used.
import numpy as np
from scipy.integrate import quad
from scipy.optimize import brentq

from common import made_by, save


def distance(mean_anomaly, e):
    """r/a at a time."""
    anomaly = brentq(lambda E: E - e * np.sin(E) - mean_anomaly, -1e-9, np.pi + 1e-9, xtol=1e-15, rtol=1e-15)
    return 1 - e * np.cos(anomaly)


def time_mean(f, e):
    """Half an orbit is enough; the fast part near the star is split off."""
    near = min(np.pi / 2, 10 * (1 - e) ** 1.5)
    pieces = [0, near / 10, near, np.pi]
    parts = [quad(lambda M: f(distance(M, e)), a, b, epsabs=1e-13, epsrel=1e-12, limit=400) for a, b in zip(pieces, pieces[1:])]
    return sum(value for value, _ in parts) / np.pi


rows = []
for e in (0.0167, 0.1, 0.2056, 0.5, 0.9, 0.99):
    rows.append({"e": e, "flux": time_mean(lambda r: r**-2, e), "temperature": time_mean(lambda r: r**-0.5, e)})
save(
    "orbit_means",
    {
        "title": "Time-mean flux, and time-mean of the instantaneous equilibrium temperature, over those at r = a",
        "made": made_by(__file__, "quadrature in time over Kepler's equation", "numpy", "scipy"),
        "rows": rows,
    },
)
