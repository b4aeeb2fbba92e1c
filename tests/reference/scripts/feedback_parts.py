# Everything that is said of the feedbacks in a state, in 60-digit arithmetic, for three budgets.
#
# Each budget is a net flux of temperature, givens and couplings, and each coupling a function of temperature, givens and the
# couplings before it. Slopes are derivatives of these functions by mpmath. Numbers such as 0.6 stand for the doubles nearest
# to them, as in a program; so does 1/288 as a number that is worked out before temperature is known.
from mpmath import mp, mpf, diff, exp, log, nstr, tanh

from common import made_by, save

mp.dps = 60
SIGMA = mpf(5.670374419e-8)
STEPS = 7000


def written(x):
    return nstr(mpf(x), 30, min_fixed=-8, max_fixed=10)


class Budget:
    def __init__(self, name, within, givens, couplings, net, heat_capacity):
        self.name, self.within, self.net, self.heat_capacity = name, within, net, heat_capacity
        self.givens = {key: mpf(value) for key, value in givens.items()}
        self.couplings = couplings

    def values(self, T, p):
        q = {}
        for name, (_, law) in self.couplings.items():
            q[name] = law(T, p, q)
        return q

    def balance(self, T, p):
        return self.net(T, p, self.values(T, p))

    def roots(self):
        low, high = self.within
        f = lambda T: self.balance(T, self.givens)
        xs = [low + (high - low) * mpf(i) / STEPS for i in range(STEPS + 1)]
        with mp.workdps(20):
            signs = [f(x) > 0 for x in xs]
        return [bisected(f, xs[i], xs[i + 1]) for i in range(STEPS) if signs[i] != signs[i + 1]]

    def slope(self, law, T, p, q, wrt):
        """Of a law in temperature or in a coupling, with everything else held."""
        if wrt == "T":
            return diff(lambda x: law(x, p, q), T)
        return diff(lambda x: law(T, p, {**q, wrt: x}), q[wrt])

    def paths(self, T, p, q):
        """The product of slopes along every way from temperature through couplings to the net flux."""
        reads = {name: inputs for name, (inputs, _) in self.couplings.items()}
        found = {}

        def go_on(through, product):
            last = through[-1]
            whole = product * self.slope(self.net, T, p, q, last)
            if whole != 0:
                found[" → ".join(through)] = whole
            for name, inputs in reads.items():
                if last in inputs:
                    go_on([*through, name], product * self.slope(self.couplings[name][1], T, p, q, last))

        for name, inputs in reads.items():
            if "T" in inputs:
                go_on([name], self.slope(self.couplings[name][1], T, p, q, "T"))
        return found

    def state(self, T):
        p = self.givens
        q = self.values(T, p)
        total = diff(lambda x: self.balance(x, p), T)
        reference = self.slope(self.net, T, p, q, "T")
        parts = self.paths(T, p, q)
        assert abs(reference + sum(parts.values()) - total) < mpf(10) ** -40
        capacity = self.heat_capacity(T, p)
        factor = sum(-part / reference for part in parts.values())
        fluxes = {key: diff(lambda x: self.balance(T, {**p, key: x}), p[key]) for key in p}
        return {
            "T": written(T),
            "lambda": written(total),
            "reference": written(reference),
            "factor": written(factor),
            "gain": written(1 / (1 - factor)) if factor < 1 else None,
            "sensitivity": written(-1 / total),
            "time": written(capacity / abs(total)),
            "responses": {
                key: {"flux": written(flux), "temperature": written(-flux / total)} for key, flux in fluxes.items()
            },
            "loops": {
                key: {
                    "lambda": written(part),
                    "factor": written(-part / reference),
                    "without": {"lambda": written(total - part), "time": written(capacity / abs(total - part))},
                }
                for key, part in parts.items()
            },
        }

    def table(self):
        states = [self.state(T) for T in self.roots()]
        givens = {key: float(value) for key, value in self.givens.items()}
        return {"id": self.name, "within": list(self.within), "givens": givens, "states": states}


def bisected(f, low, high):
    rising = f(high) > 0
    while high - low > mpf(10) ** -55:
        middle = (low + high) / 2
        if (f(middle) > 0) == rising:
            high = middle
        else:
            low = middle
    return (low + high) / 2


# Ice, water vapour and carbon dioxide in one column: the budget of the acceptance case.
PER_288 = mpf(1 / 288)
column = Budget(
    "column",
    (100, 450),
    {"flux": 1361, "carbonDioxide": 280},
    {
        "albedo": (["T"], lambda T, p, q: mpf(0.6) - mpf(0.3) * (1 + tanh((T - 265) / 10)) / 2),
        "opticalDepth": (
            ["T"],
            lambda T, p, q: mpf(0.65)
            + mpf(0.12) * log(p["carbonDioxide"] / 280)
            + mpf(0.12) * exp(5417 * (PER_288 - 1 / T)),
        ),
    },
    lambda T, p, q: p["flux"] * (1 - q["albedo"]) / 4 - SIGMA * T**4 / (1 + mpf(0.75) * q["opticalDepth"]),
    lambda T, p: mpf(4.2e8),
)

# A chain: vapour makes cloud, and cloud brightens the planet; its heat capacity changes as ice melts. An invented planet.
chain = Budget(
    "chain",
    (200, 400),
    {"flux": 1361, "cloudiness": 0.5, "ground": 0.25},
    {
        "vapour": (["T"], lambda T, p, q: exp((T - 288) / 16)),
        "cloud": (["vapour"], lambda T, p, q: p["cloudiness"] * tanh(q["vapour"] / 2)),
        "albedo": (
            ["T", "cloud"],
            lambda T, p, q: mpf(0.375) - mpf(0.125) * tanh((T - 268) / 8) + mpf(0.0625) * q["cloud"],
        ),
    },
    lambda T, p, q: p["flux"] * (1 - q["albedo"]) / 4
    + p["ground"]
    + 8 * q["cloud"]
    - SIGMA * T**4 / (1 + mpf(0.75) * (mpf(0.5) + mpf(0.25) * q["vapour"])),
    lambda T, p: 134217728 * (1 + mpf(0.5) * tanh((T - 270) / 16)),
)

# A straight outgoing radiation whose slope, and the heat capacity, are givens. An invented planet.
straight = Budget(
    "straight",
    (200, 330),
    {"flux": 1365, "slope": 2, "carbonDioxide": 400, "capacity": 536870912},
    {"albedo": (["T"], lambda T, p, q: mpf(0.3) + mpf(0.3125) / (1 + exp((T - 262) / 4)))},
    lambda T, p, q: p["flux"] * (1 - q["albedo"]) / 4
    - (210 + p["slope"] * (T - mpf(273.15)) - mpf(5.35) * log(p["carbonDioxide"] / 280)),
    lambda T, p: p["capacity"],
)

save(
    "feedback_parts",
    {
        "title": "Feedbacks in every state of three budgets: parts of λ, factors, gain, sensitivities, times",
        "units": "T in K, lambda and reference in W m-2 K-1, sensitivity in K m2 W-1, time in s, flux in W m-2 per unit",
        "made": made_by(__file__, "bisection and derivatives at 60 digits, 30 written", "mpmath"),
        "budgets": [budget.table() for budget in (column, chain, straight)],
    },
)
