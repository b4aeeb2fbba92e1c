# Published albedo curves as their authors print them, read off by other people's code.
import numpy as np
from mpmath import mp, mpf, nstr, tanh
from scipy.integrate import dblquad

from common import made_by, save

mp.dps = 30


def tanh_form(middle, half, at, width, temperatures):
    curve = lambda T: mpf(middle) - mpf(half) * tanh((mpf(T) - mpf(at)) / mpf(width))
    return [{"T": T, "albedo": nstr(curve(T), 20)} for T in temperatures]


def linear_form(temperatures):
    return [{"T": T, "albedo": float(np.interp(T, [255, 290], [0.6, 0.2]))} for T in temperatures]


def parabola_through(ice, free, T_ice, T_free, temperatures):
    """The parabola with its vertex at T_free that passes through the ice albedo at T_ice: fitted, then read off."""
    conditions = [[T_free**2, T_free, 1], [2 * T_free, 1, 0], [T_ice**2, T_ice, 1]]
    coefficients = np.linalg.solve(np.array(conditions, dtype=float), [free, 0, ice])
    inside = lambda T: float(np.polyval(coefficients, T))
    return [{"T": T, "albedo": ice if T <= T_ice else free if T >= T_free else inside(T)} for T in temperatures]


def sphere_with_caps(cap_edge_degrees, open_albedo, ice_albedo):
    """Mean albedo over a sphere, ice poleward of a latitude."""
    edge = np.radians(cap_edge_degrees)
    band = lambda albedo, a, b: dblquad(lambda lat, _: albedo * np.cos(lat), 0, 2 * np.pi, a, b)[0]
    return 2 * (band(open_albedo, 0, edge) + band(ice_albedo, edge, np.pi / 2)) / (4 * np.pi)


save(
    "albedo_forms",
    {
        "title": "Albedo curves and means",
        "made": made_by(__file__, "each form evaluated as its authors print it", "mpmath", "numpy", "scipy"),
        "kaperEngler": tanh_form("0.5", "0.2", 265, 10, [200, 250, 265, 271, 288, 330]),
        "spiegel": tanh_form("0.525", "0.245", 268, 5, [250, 268, 273, 288]),
        "linear": linear_form([240, 255, 262, 272.5, 285, 290, 300]),
        "pierrehumbert": parabola_through(0.6, 0.2, 260, 290, [250, 260, 268, 275, 283, 290, 300]),
        "caps": [
            {"edge": edge, "open": 0.32, "ice": 0.62, "albedo": sphere_with_caps(edge, 0.32, 0.62)} for edge in (50, 72)
        ],
    },
)
