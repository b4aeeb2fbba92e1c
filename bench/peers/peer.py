"""Answers timing requests on standard input, one a line, so that its rounds can be put between the rounds of others.

  numpy ice|vapour COUNT | scipy ice|vapour COUNT   -> nanoseconds a planet, number of states, for the first COUNT rows
  write numpy|scipy ice|vapour COUNT FILE           -> writes for each row: number of states, then MOST temperatures

Both look at N on a grid and refine every change of sign. NumPy: all planets at once, Newton's steps kept inside their
brackets. SciPy: brentq, planet by planet.
"""

import math
import sys
import time

import numpy as np

try:
    from scipy.optimize import brentq
except ImportError:
    brentq = None

SIGMA = 5.670374419e-8
LOW, HIGH, STEPS, MOST = 2.7, 2000.0, 400, 8
BLOCK = 50  # planets at once on the grid, so that what is computed stays in the cache
GRID = np.linspace(LOW, HIGH, STEPS + 1)
GRID_FOURTH = SIGMA * (GRID * GRID) * (GRID * GRID)
GRID_WARMTH = 1 / 288 - 1 / GRID
WIDTHS = {"ice": 7, "vapour": 10}


def absorbed(p, x, tanh):
    flux, internal, cold, warm, midpoint, width = p[:6]
    t = tanh((x - midpoint) / width)
    half = (cold - warm) / 2
    steep = flux / 4 * half / width
    return flux / 4 * (1 - (cold + warm) / 2 + half * t) + internal, steep * (1 - t * t)


def ice(p, x, tanh=np.tanh, _exp=None, _log=None):
    heating, slope = absorbed(p, x, tanh)
    cube = p[6] * SIGMA * (x * x * x)
    return heating - cube * x, slope - 4 * cube


def vapour(p, x, tanh=np.tanh, exp=np.exp, log=np.log):
    heating, slope = absorbed(p, x, tanh)
    dry, wet, latent, concentration = p[6:]
    vapour = wet * exp(latent * (1 / 288 - 1 / x))
    share = 1 / (1 + 0.75 * (dry + vapour))
    emitted = SIGMA * ((x * x) * (x * x)) * share
    rate = 4 / x - 0.75 * vapour * latent / (x * x) * share
    return heating - emitted + 5.35 * log(concentration / 280), slope - emitted * rate


def brackets(model, rows):
    """Row and left end of every change of sign on the grid; in place, as far as it goes."""
    flux, internal, cold, warm, midpoint, width = (rows[:, i : i + 1] for i in range(6))
    n = np.tanh((GRID - midpoint) / width)
    n *= flux / 4 * (cold - warm) / 2
    if model is ice:
        n += flux / 4 * (1 - (cold + warm) / 2) + internal
        n -= rows[:, 6:7] * GRID_FOURTH
    else:
        dry, wet, latent, concentration = (rows[:, i : i + 1] for i in range(6, 10))
        blanket = np.exp(latent * GRID_WARMTH)
        blanket *= 0.75 * wet
        blanket += 1 + 0.75 * dry
        n += flux / 4 * (1 - (cold + warm) / 2) + internal + 5.35 * np.log(concentration / 280)
        n -= GRID_FOURTH / blanket
    above = n > 0
    return np.nonzero(above[:, 1:] != above[:, :-1])


def grid_cells(model, rows):
    parts = [(start, *brackets(model, rows[start : start + BLOCK])) for start in range(0, len(rows), BLOCK)]
    return np.concatenate([start + row for start, row, _ in parts]), np.concatenate([cell for *_, cell in parts])


def by_numpy(model, rows):
    row, cell = grid_cells(model, rows)
    p = rows[row].T
    a, b = GRID[cell], GRID[cell + 1]
    rising = model(p, b)[0] > 0
    x = (a + b) / 2
    for _ in range(12):
        n, slope = model(p, x)
        above = (n > 0) == rising
        b, a = np.where(above, x, b), np.where(above, a, x)
        step = x - n / slope
        step = np.where((step >= a) & (step <= b), step, (a + b) / 2)
        done = np.all(np.abs(step - x) < 1e-8 * x)
        x = step
        if done:
            break
    return row, x


def by_scipy(model, rows):
    row, cell = grid_cells(model, rows)
    lists = rows.tolist()
    x = np.empty(len(row))
    for i, (r, c) in enumerate(zip(row.tolist(), cell.tolist())):
        p = lists[r]
        f = lambda t: model(p, t, math.tanh, math.exp, math.log)[0]  # noqa: E731
        x[i] = brentq(f, GRID[c], GRID[c + 1], xtol=1e-10, rtol=1e-13)
    return row, x


def main():
    models = {"ice": ice, "vapour": vapour}
    methods = {"numpy": by_numpy, "scipy": by_scipy}
    data = {name: np.fromfile(file).reshape(-1, WIDTHS[name]) for name, file in zip(models, sys.argv[1:3])}
    print(np.__version__, "none" if brentq is None else sys.modules["scipy"].__version__, flush=True)
    for line in sys.stdin:
        words = line.rstrip("\n").split(" ", 4)
        writing = words[0] == "write"
        method, name, count = words[1:4] if writing else words[:3]
        rows = data[name][: int(count)]
        start = time.process_time()
        with np.errstate(over="ignore"):
            row, x = methods[method](models[name], rows)
        each = (time.process_time() - start) * 1e9 / len(rows)
        if writing:
            out = np.zeros((len(rows), 1 + MOST))
            for r, t in zip(row, x):
                out[r, 0] += 1
                out[r, int(out[r, 0])] = t
            out.tofile(words[4])
        print(f"{each:.6g} {len(row)} {x.sum():.17g}", flush=True)


main()
