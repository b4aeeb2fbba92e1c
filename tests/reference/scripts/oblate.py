# What flattening does to the mean sunlight of a planet: the spheroid's shadow over its area, both measured by quadrature.
import numpy as np
from scipy.integrate import dblquad, quad

from common import made_by, save


def shadow_over_quarter_area(equatorial, polar):
    """1 for a sphere. The star stands over the equator, so the shadow is an ellipse of the two radii."""
    ring = lambda t: 2 * np.pi * equatorial * np.cos(t) * np.hypot(equatorial * np.sin(t), polar * np.cos(t))
    area, _ = quad(ring, -np.pi / 2, np.pi / 2, epsrel=1e-12)
    shadow, _ = dblquad(lambda r, _: r * equatorial * polar, 0, 2 * np.pi, 0, 1, epsrel=1e-12)
    return shadow / (area / 4)


# Radii in km: NASA planetary fact sheets (from memory).
RADII = {"jupiter": (71492, 66854), "saturn": (60268, 54364), "uranus": (25559, 24973)}
save(
    "oblate",
    {
        "title": "Mean sunlight of a flattened planet over that of a sphere",
        "made": made_by(__file__, "area and shadow of a spheroid by quadrature", "numpy", "scipy"),
        "rows": {name: {"radii": radii, "factor": shadow_over_quarter_area(*radii)} for name, radii in RADII.items()},
    },
)
