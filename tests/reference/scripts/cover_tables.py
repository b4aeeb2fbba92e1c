# Steady states with one species of plants, dark or bright, in 60-digit arithmetic.
#
# The parameters and both forms of the local temperature are those of Watson & Lovelock 1983, from memory: the plants are
# cooler or warmer than the planet by q' (A - A_i), or in fourth powers by q (A - A_i). Either way the local temperature T
# fixes the steady cover, the albedo and so the luminosity L(T). Its turning points are the folds; where plants set in, at
# growth = death, it has a corner. On each monotone piece between them a luminosity is met once or never.
from mpmath import diff, findroot, mp, mpf, nstr, sqrt

from common import made_by, save

mp.dps = 60
CELLS = 1500
WITHIN = (230, 350)
LUMINOSITIES = ["0.6", "0.65", "0.7", "0.75", "0.8", "0.9", "1", "1.1", "1.2", "1.3", "1.4", "1.5", "1.6"]
SHARED = {"S": "917", "sigma": "5.67e-8", "ground": "0.5", "best": "295.5", "k": "0.003265", "available": "1"}


def written(x):
    return nstr(x, 24, min_fixed=-8, max_fixed=10)


def root(f, low, high):
    return findroot(f, (low, high), solver="anderson", tol=mpf(10) ** -90, verify=False)


class Plants:
    def __init__(self, inputs, exchange):
        self.p = {key: mpf(text) for key, text in inputs.items()}
        self.exchange = exchange

    def growth(self, T):
        return max(mpf(0), 1 - self.p["k"] * (T - self.p["best"]) ** 2)

    def cover(self, T):
        p = self.p
        growth = self.growth(T)
        if growth * p["available"] <= p["death_rate"]:
            return mpf(0)
        return p["available"] - p["death_rate"] / growth

    def luminosity(self, T):
        """From the local temperature T back to the planet's, and to what it must absorb for that."""
        p = self.p
        albedo = p["ground"] + self.cover(T) * (p["plants"] - p["ground"])
        contrast = albedo - p["plants"]
        if self.exchange == "linear":
            planet = (T - p["q"] * contrast) ** 4
        else:
            planet = T**4 - p["q"] * contrast
        return p["sigma"] * planet / (p["S"] * (1 - albedo))

    def corners(self):
        p = self.p
        reach = sqrt((1 - p["death_rate"] / p["available"]) / p["k"])
        return [p["best"] - reach, p["best"] + reach]

    def folds(self):
        low, high = self.corners()
        slope = lambda T: diff(self.luminosity, T)
        ends = [low + (high - low) * (mpf(i) + mpf(1) / 2) / CELLS for i in range(CELLS)]
        slopes = [slope(T) for T in ends]
        return [
            root(slope, ends[i], ends[i + 1]) for i in range(CELLS - 1) if (slopes[i] > 0) != (slopes[i + 1] > 0)
        ]

    def states(self, L, turns):
        ends = [mpf(WITHIN[0]), *turns, mpf(WITHIN[1])]
        miss = lambda T: self.luminosity(T) - L
        return [
            {"T": written(T), "cover": written(self.cover(T)), "stable": miss(high) > miss(low)}
            for low, high in zip(ends, ends[1:])
            if (miss(low) > 0) != (miss(high) > 0)
            for T in [root(miss, low, high)]
        ]


def case(name, exchange, q, plants, death_rate):
    inputs = {**SHARED, "plants": plants, "death_rate": death_rate, "q": q}
    model = Plants(inputs, exchange)
    corners, folds = model.corners(), model.folds()
    turns = sorted([*corners, *folds])
    place = lambda T: {"L": written(model.luminosity(T)), "T": written(T)}
    return {
        "id": name,
        "exchange": exchange,
        "inputs": inputs,
        "onsets": [place(T) for T in corners],
        "folds": [{**place(T), "cover": written(model.cover(T))} for T in folds],
        "rows": [{"L": L, "states": model.states(mpf(L), turns)} for L in LUMINOSITIES],
    }


def growth_and_cover(celsius):
    """The paper's Celsius is K - 273."""
    model = Plants({**SHARED, "plants": "0.25", "death_rate": "0.3", "q": "20"}, "linear")
    T = 273 + mpf(celsius)
    return {"celsius": celsius, "growth": written(model.growth(T)), "cover": written(model.cover(T))}


save(
    "iv_plant_cover",
    {
        "title": "Steady states with one species of plants whose albedo differs from the ground's",
        "budget": "S L (1 - A) = sigma T_e^4, A = ground + a (plants - ground), a = max(0, available - death_rate/beta), "
        "beta = max(0, 1 - k (T - best)^2); T = q (A - plants) + T_e (linear) or T^4 = q (A - plants) + T_e^4 (fourth powers)",
        "made": made_by(__file__, "L(T) cut at its corners and turning points, one root per piece, 60 digits", "mpmath"),
        "curve": [growth_and_cover(t) for t in ("22.5", "15", "10", "8", "30", "36")],
        "within": list(WITHIN),
        "cases": [
            case(f"iv-{exchange.split()[0]}-{name}-{death_rate}", exchange, q, plants, death_rate)
            for exchange, q in (("fourth powers", "2.06e9"), ("linear", "20"))
            for name, plants in (("bright", "0.75"), ("dark", "0.25"))
            for death_rate in ("0.3", "0.25")
        ],
    },
)
