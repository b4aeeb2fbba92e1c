# The balance of N grey layers over a ground, by exact elimination: who gives whom how much, and every temperature.
#
# A layer emits and absorbs longwave with one emissivity and lets the rest through. It takes its share of the sunlight
# going down and of the sunlight coming back up. The ground reflects `1 - emissivity` of the longwave that falls on it.
from fractions import Fraction

from mpmath import mp, mpf, nstr

from common import made_by, save

mp.dps = 60
SIGMA = "5.670374419e-8"


def written(x, digits=24):
    return nstr(mpf(x.numerator) / mpf(x.denominator) if isinstance(x, Fraction) else x, digits, min_fixed=-8, max_fixed=10)


def solved(rows, right):
    """Gauss-Jordan elimination in fractions."""
    n = len(right)
    table = [row[:] + [b] for row, b in zip(rows, right)]
    for c in range(n):
        pivot = next(r for r in range(c, n) if table[r][c] != 0)
        table[c], table[pivot] = table[pivot], table[c]
        table[c] = [x / table[c][c] for x in table[c]]
        for r in range(n):
            if r != c:
                table[r] = [x - table[r][c] * y for x, y in zip(table[r], table[c])]
    return [row[n] for row in table]


def column(S, albedo, ground_emissivity, emissivities, absorptivities, layer_heating=None, ground_heating="0"):
    n = len(emissivities)
    e, a = [Fraction(x) for x in emissivities], [Fraction(x) for x in absorptivities]
    ground = Fraction(ground_emissivity)
    extra = [Fraction(x) for x in layer_heating or ["0"] * n] + [Fraction(ground_heating)]
    # sunlight: down through the layers, back up from the ground
    sun = [Fraction(0)] * (n + 1)
    beam = Fraction(S) / 4
    sun_down, sun_up = [beam], []
    for k in range(n):
        sun[k] += beam * a[k]
        beam *= 1 - a[k]
        sun_down.append(beam)
    sun[n] = beam * (1 - Fraction(albedo))
    beam *= Fraction(albedo)
    sun_up.insert(0, beam)
    for k in reversed(range(n)):
        sun[k] += beam * a[k]
        beam *= 1 - a[k]
        sun_up.insert(0, beam)
    planetary_albedo = beam / (Fraction(S) / 4)

    # longwave: fluxes as linear forms in sigma T^4 of the layers (from the top) and the ground
    def form(k=None, weight=Fraction(0)):
        return [weight if j == k else Fraction(0) for j in range(n + 1)]

    def through(flux, k):
        return [x * (1 - e[k]) + y for x, y in zip(flux, form(k, e[k]))]

    down = [form()]
    for k in range(n):
        down.append(through(down[k], k))
    up = [None] * n + [[x * (1 - ground) + y for x, y in zip(down[n], form(n, ground))]]
    for k in reversed(range(n)):
        up[k] = through(up[k + 1], k)
    rows = [[e[k] * (x + y) - z for x, y, z in zip(down[k], up[k + 1], form(k, 2 * e[k]))] for k in range(n)]
    rows.append([ground * x - y for x, y in zip(down[n], form(n, ground))])
    fourth = solved(rows, [-(s + x) for s, x in zip(sun, extra)])
    value = lambda flux: sum(c * x for c, x in zip(flux, fourth))
    temperatures = [(mpf(x.numerator) / mpf(x.denominator) / mpf(SIGMA)) ** mpf("0.25") for x in fourth]
    assert Fraction(S) / 4 * (1 - planetary_albedo) + sum(extra) == value(up[0])
    return {
        "layers": [
            {
                "T": written(temperatures[k]),
                "sunlight": written(sun[k]),
                "longwaveAbsorbed": written(e[k] * (value(down[k]) + value(up[k + 1]))),
                "longwaveEmitted": written(2 * e[k] * fourth[k]),
            }
            for k in range(n)
        ],
        "ground": {
            "T": written(temperatures[n]),
            "sunlight": written(sun[n]),
            "longwaveAbsorbed": written(ground * value(down[n])),
            "longwaveEmitted": written(ground * fourth[n]),
        },
        "interfaces": [
            {
                "sunlightDown": written(sun_down[k]),
                "sunlightUp": written(sun_up[k]),
                "longwaveDown": written(value(down[k])),
                "longwaveUp": written(value(up[k])),
            }
            for k in range(n + 1)
        ],
        "planetaryAlbedo": written(planetary_albedo),
        "olr": written(value(up[0])),
    }


def case(name, S, albedo, ground_emissivity, emissivities, absorptivities, **heating):
    inputs = {"S": S, "albedo": albedo, "groundEmissivity": ground_emissivity, "emissivities": emissivities}
    inputs.update({"absorptivities": absorptivities, **heating})
    given = {"layer_heating": heating.get("layerHeating"), "ground_heating": heating.get("groundHeating", "0")}
    return {"id": "vi-" + name, "inputs": inputs, **column(S, albedo, ground_emissivity, emissivities, absorptivities, **given)}


MIXED = ["0.3", "0.45", "0.6", "0.75", "0.5", "0.8"]
SHORTWAVE = ["0.02", "0.05", "0.03", "0.06", "0.01", "0.04"]
cases = [case("n0-bare", "1361", "0.3", "1", [], [])]
for n in range(1, 7):
    cases.append(case(f"n{n}-opaque", "1361", "0.3", "1", ["1"] * n, ["0"] * n))
    cases.append(case(f"n{n}-grey0.6", "1361", "0.3", "1", ["0.6"] * n, ["0"] * n))
    cases.append(case(f"n{n}-mixed", "1361", "0.25", "0.97", MIXED[:n], SHORTWAVE[:n]))
cases.append(case("n1-classic0.78", "1361", "0.3", "1", ["0.78"], ["0"]))
cases.append(
    case("n2-heated", "1361", "0.3", "0.95", ["0.5", "0.7"], ["0.1", "0.1"], layerHeating=["0", "20"], groundHeating="-20")
)
cases.append(case("n1-all-sw-in-layer", "1361", "0.3", "1", ["0.9"], ["1"]))
save(
    "vi_n_layer",
    {
        "title": "Grey layers over a ground, from the top down; W m^-2 and K",
        "made": made_by(__file__, "exact fractions; temperatures as 60-digit fourth roots with sigma " + SIGMA, "mpmath"),
        "cases": cases,
    },
)
