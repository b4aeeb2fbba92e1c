# All equilibria of two smooth families of budgets, in 60-digit arithmetic.
#
# Balance as a curve S(T) = 4 OLR(T) / (1 - albedo(T)): its turning points are the folds, and on each monotone piece
# between them a flux is met once or never. So nothing can be missed, whatever the size of a piece.
from mpmath import mp, mpf, nstr, tanh, exp, diff

from common import made_by, save

mp.dps = 60
CELLS = 8000
SIGMA = "5.670374419e-8"


def written(x, digits=24):
    return nstr(x, digits, min_fixed=-8, max_fixed=10)


def root(f, low, high):
    """Bisection and secant steps in turn; f changes sign between low and high."""
    f_low, f_high = f(low), f(high)
    for step in range(400):
        if step % 2:
            x = low - f_low * (high - low) / (f_high - f_low)
        else:
            x = (low + high) / 2
        value = f(x)
        if value == 0 or high - low < mpf(10) ** -50:
            return x
        if (value > 0) == (f_low > 0):
            low, f_low = x, value
        else:
            high, f_high = x, value
    return (low + high) / 2


class Balance:
    """N(T) = S (1 - albedo) / 4 - olr, with every part of its slope."""

    def __init__(self, inputs, olr, olr_parts):
        number = {key: mpf(text) for key, text in inputs.items()}
        middle, half, at, width = (number[k] for k in ("alpha_mid", "alpha_half_range", "T0", "width"))
        self.albedo = lambda T: middle - half * tanh((T - at) / width)
        self.albedo_slope = lambda T: -half * (1 - tanh((T - at) / width) ** 2) / width
        self.olr = lambda T: olr(number, T)
        self.olr_parts = lambda T: olr_parts(number, T)

    def flux(self, T):
        return 4 * self.olr(T) / (1 - self.albedo(T))

    def flux_slope_sign(self, T):
        """A multiple of dS/dT: d ln S / dT."""
        return -sum(self.olr_parts(T).values()) / self.olr(T) + self.albedo_slope(T) / (1 - self.albedo(T))

    def slope_parts(self, T, S):
        return {**self.olr_parts(T), "albedo": -S / 4 * self.albedo_slope(T)}

    def turning_points(self, low, high):
        xs = [low + (high - low) * i / CELLS for i in range(CELLS + 1)]
        with mp.workdps(20):
            signs = [self.flux_slope_sign(x) > 0 for x in xs]
        return [root(self.flux_slope_sign, xs[i], xs[i + 1]) for i in range(CELLS) if signs[i] != signs[i + 1]]

    def states(self, S, pieces):
        found = []
        for low, high in pieces:
            if (self.flux(low) > S) != (self.flux(high) > S):
                T = root(lambda T: self.flux(T) - S, low, high)
                found.append(self.state(T, S))
        return found

    def state(self, T, S):
        parts = self.slope_parts(T, S)
        slope = sum(parts.values())
        curvature = diff(lambda x: sum(self.slope_parts(x, S).values()), T)
        factors = {k: -v / parts["planck"] for k, v in parts.items() if k != "planck"}
        return {
            "T": written(T),
            "lambda": written(slope),
            "stable": bool(slope < 0),
            "curvature": written(curvature, 8),
            "parts": {k: written(v) for k, v in parts.items()},
            "factors": {k: written(v) for k, v in factors.items()},
            "dTdS": written(-(1 - self.albedo(T)) / 4 / slope),
        }


def case(name, inputs, within, fluxes, olr, olr_parts):
    balance = Balance(inputs, olr, olr_parts)
    low, high = (mpf(x) for x in within)
    turns = balance.turning_points(low, high)
    edges = [low, *turns, high]
    pieces = list(zip(edges[:-1], edges[1:]))
    return {
        "id": name,
        "inputs": inputs,
        "within": within,
        "folds": [{"T": written(T), "S": written(balance.flux(T))} for T in turns],
        "rows": [{"S": S, "states": balance.states(mpf(S), pieces)} for S in fluxes],
    }


def every(step, first=1000, last=1800, more=()):
    return [str(S) for S in range(first, last + 1, step)] + list(more)


# --- i: grey emission ---
def grey(p, T):
    return p["epsilon"] * p["sigma"] * T**4


def grey_parts(p, T):
    return {"planck": -4 * p["epsilon"] * p["sigma"] * T**3}


def case_i(name, mid, half, at, width, epsilon, sigma, fluxes):
    inputs = {"alpha_mid": mid, "alpha_half_range": half, "T0": at, "width": width, "epsilon": epsilon, "sigma": sigma}
    return case("i-" + name, inputs, [100, 600], fluxes, grey, grey_parts)


near_folds = every(25, more=("1361", "1368", "1192.5", "1674.5", "1192.2", "1675"))
save(
    "i_tanh_albedo",
    {
        "title": "Equilibria with a tanh albedo and grey emission",
        "budget": "N = S(1 - alpha)/4 - epsilon sigma T^4, alpha = alpha_mid - alpha_half_range tanh((T - T0)/width)",
        "made": made_by(__file__, "S(T) cut at its turning points, one root per piece, 60 digits", "mpmath"),
        "cases": [
            case_i("textbook-sigma5.67e-8", "0.5", "0.2", "265", "10", "0.6", "5.67e-8", near_folds),
            case_i("textbook-sigma2018", "0.5", "0.2", "265", "10", "0.6", SIGMA, near_folds),
            case_i("narrow", "0.475", "0.175", "268", "5", "0.62", SIGMA, every(50)),
            case_i("wide-monostable", "0.45", "0.15", "270", "40", "0.6", SIGMA, every(100)),
            case_i("halfrange-definition", "0.46", "0.16", "263", "7.5", "0.61", "5.67e-8", every(50)),
        ],
    },
)


# --- iii: a grey column whose optical depth follows water vapour ---
def vapour(p, T):
    return p["tau_w"] * exp(p["L_over_Rv"] * (1 / p["T_ref"] - 1 / T))


def blanket(p, T):
    return 1 + mpf(3) / 4 * (p["tau_c"] + vapour(p, T))


def column(p, T):
    return p["sigma"] * T**4 / blanket(p, T)


def column_parts(p, T):
    thicker = mpf(3) / 4 * vapour(p, T) * p["L_over_Rv"] / T**2
    return {
        "planck": -4 * p["sigma"] * T**3 / blanket(p, T),
        "water_vapour": p["sigma"] * T**4 * thicker / blanket(p, T) ** 2,
    }


def case_iii(name, mid, half, at, width, tau_c, tau_w, fluxes):
    inputs = {"alpha_mid": mid, "alpha_half_range": half, "T0": at, "width": width}
    inputs.update({"tau_c": tau_c, "tau_w": tau_w, "L_over_Rv": "5420", "T_ref": "288", "sigma": SIGMA})
    return case("iii-" + name, inputs, [120, 700], fluxes, column, column_parts)


save(
    "iii_water_vapour",
    {
        "title": "Equilibria with a tanh albedo and a grey column that thickens with water vapour",
        "budget": "N = S(1 - alpha)/4 - sigma T^4/(1 + 3/4 tau), tau = tau_c + tau_w exp(L_over_Rv (1/T_ref - 1/T)), "
        "alpha as in table i",
        "made": made_by(__file__, "S(T) cut at its turning points, one root per piece, 60 digits", "mpmath"),
        "cases": [
            case_iii("a", "0.425", "0.175", "263", "8", "0.6", "0.6", every(50, 900, more=("1361",))),
            case_iii("b-dry", "0.425", "0.175", "263", "8", "0.8", "0.15", every(50, 900)),
            case_iii("c-warm", "0.45", "0.15", "268", "6", "0.75", "0.35", every(50, 900)),
        ],
    },
)
