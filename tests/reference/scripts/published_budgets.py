# Equilibria of published budgets with the published numbers, by SciPy's and NumPy's own root finders.
import numpy as np
from scipy.constants import Stefan_Boltzmann as sigma
from scipy.optimize import brentq

from common import made_by, save


def all_roots(f, low, high, cells=20000):
    x = np.linspace(low, high, cells + 1)
    y = f(x)
    return [brentq(f, x[i], x[i + 1], xtol=1e-12, rtol=1e-14) for i in np.nonzero(y[:-1] * y[1:] < 0)[0]]


def spiegel(S):
    """Spiegel, Menou & Scharf 2008, model 2, as a global mean."""
    albedo = lambda T: 0.525 - 0.245 * np.tanh((T - 268) / 5)
    olr = lambda T: sigma * T**4 / (1 + 0.75 * 0.79 * (T / 273) ** 3)
    olr_at = [{"T": T, "olr": olr(T)} for T in (250.0, 273.0, 288.0)]
    return {"S": S, "olr": olr_at, "T": all_roots(lambda T: S / 4 * (1 - albedo(T)) - olr(T), 150, 400)}


def pierrehumbert(S):
    """Pierrehumbert 2010, chapter 3: parabolic albedo, emission 113 + 2.177 (T - 220); each piece a polynomial."""
    emission = np.poly1d([2.177, 113 - 2.177 * 220])
    frozen = np.poly1d([1 / (260 - 290), -290 / (260 - 290)])
    albedos = [(0, 260, np.poly1d([0.6])), (260, 290, 0.2 + 0.4 * frozen**2), (290, 1000, np.poly1d([0.2]))]
    found = []
    for low, high, albedo in albedos:
        roots = (S / 4 * (1 - albedo) - emission).roots
        found += [float(T.real) for T in roots if abs(T.imag) < 1e-9 and low < T.real < high]
    return {"S": S, "T": sorted(found)}


def zaliapin_ghil(share, steepness):
    """Zaliapin & Ghil 2010, equations 11 and 12: c1 = 0.15, c2 = 0.7, T_c = 273 K, Q0 = 342.5 W m^-2."""
    sigma_there = 5.6697e-8
    albedo = lambda T: 0.15 + 0.7 / 2 * (1 - np.tanh(steepness * (T - 273)))
    olr = lambda T: sigma_there * T**4 * (1 - share * np.tanh(1.9e-15 * T**6))
    return {"m": share, "kappa": steepness, "T": all_roots(lambda T: 342.5 * (1 - albedo(T)) - olr(T), 100, 400)}


save(
    "published_budgets",
    {
        "title": "Equilibria of published budgets, K",
        "made": made_by(__file__, "SciPy's brentq over 20,000 cells; NumPy's polynomial roots", "numpy", "scipy"),
        "spiegel": spiegel(1360),
        "pierrehumbert": pierrehumbert(1370),
        "zaliapinGhil": [zaliapin_ghil(0.4, 0.05), zaliapin_ghil(0.5, 0.05), zaliapin_ghil(0.4, 1)],
    },
)
