# When a tabled star reaches the folds of a planet: inverse interpolation with NumPy, on folds that mpmath computed.
import json
import os

import numpy as np

from common import HERE, made_by, save

FLUX = 1361
TRACKS = {
    "rising": ([0.1, 1, 2.5, 4.6, 6, 8, 9.5], [0.71, 0.75, 0.84, 1, 1.13, 1.34, 1.62]),
    "ends before": ([0, 4, 5, 6], [0.8, 0.95, 1, 1.06]),
    "fades, then brightens": ([0, 0.05, 0.2, 1, 5, 9], [9, 3, 1.1, 0.8, 0.9, 1.7]),
    "pauses": ([-3, -1, 0, 1, 2, 5], [0.7, 0.9, 1, 1.1, 1.1, 1.4]),
}
NOWS = {"rising": [4.6, 3.3, 0.1], "ends before": [4.5, 6], "fades, then brightens": [0.1, 0.6, 1], "pauses": [0, 1.4]}


def wait(times, lights, now, factor):
    """Time from now until the light is so many times that of now; None if it never is."""
    times, lights = np.array(times, float), np.array(lights, float)
    today = np.interp(now, times, lights)
    later = times > now
    x = np.concatenate(([now], times[later]))
    y = np.concatenate(([today], lights[later])) / today - factor
    met = np.nonzero(y[:-1] * y[1:] <= 0)[0]
    if met.size == 0:
        return None
    piece = slice(met[0], met[0] + 2)
    order = np.argsort(y[piece])
    return float(np.interp(0, y[piece][order], x[piece][order]) - now)


with open(os.path.join(HERE, "..", "computed", "i_tanh_albedo.json"), encoding="utf-8") as file:
    cases = {case["id"]: case for case in json.load(file)["cases"]}
case = cases["i-textbook-sigma2018"]
rise, fall = (float(fold["S"]) / FLUX for fold in case["folds"])
rows = [
    {
        **{"track": name, "time": TRACKS[name][0], "luminosity": TRACKS[name][1], "now": now},
        **{"rise": wait(*TRACKS[name], now, rise), "fall": wait(*TRACKS[name], now, fall)},
    }
    for name, nows in NOWS.items()
    for now in nows
]
save(
    "brightening_tables",
    {
        "title": "Times in Gyr until a star with a tabled luminosity reaches the folds of a planet with a tanh albedo",
        "made": made_by(__file__, "numpy.interp, forward for today and inverse for the time, on the folds of i_tanh_albedo", "numpy"),
        "folds": case["id"],
        "flux": FLUX,
        "rows": rows,
    },
)
