# Forcings as the published fits give them, at concentrations where every term weighs (coefficients from memory).
from mpmath import log, mp, mpf, nstr, sqrt

from common import made_by, save

mp.dps = 30

# CO2 in ppm, CH4 and N2O in ppb: before and after
MIXES = (
    {"C": (280, 1100), "M": (800, 3300), "N": (280, 480)},
    {"C": (300, 190), "M": (1500, 400), "N": (500, 210)},
)


def mean(pair):
    return (mpf(pair[0]) + pair[1]) / 2


def etminan(C, M, N):
    """Etminan et al. 2016, Table 1."""
    change = abs(mpf(C[1]) - C[0])
    co2 = mpf("-2.4e-7") * change**2 + mpf("7.2e-4") * change - mpf("2.1e-4") * mean(N) + mpf("5.36")
    ch4 = mpf("-1.3e-6") * mean(M) - mpf("8.2e-6") * mean(N) + mpf("0.043")
    n2o = mpf("-8.0e-6") * mean(C) + mpf("4.2e-6") * mean(N) - mpf("4.9e-6") * mean(M) + mpf("0.117")
    return times_changes({"co2": co2, "ch4": ch4, "n2o": n2o}, C, M, N)


def meinshausen(C, M, N):
    """Meinshausen et al. 2020, Table 3: three regimes of C."""
    a, b, c, d = mpf("-2.4785e-7"), mpf("0.00075906"), mpf("-0.0021492"), mpf("5.2488")
    before, now = map(mpf, C)
    if now > before - b / (2 * a):
        alpha = d - b**2 / (4 * a)
    elif now > before:
        alpha = d + a * (now - before) ** 2 + b * (now - before)
    else:
        alpha = d
    root_c, root_m, root_n = sqrt(now), sqrt(mpf(M[1])), sqrt(mpf(N[1]))
    ch4 = mpf("-8.9603e-5") * root_m + mpf("-0.00012462") * root_n + mpf("0.045194")
    n2o = mpf("-0.00034197") * root_c + mpf("0.00025455") * root_n + mpf("-0.00024357") * root_m + mpf("0.12173")
    return times_changes({"co2": alpha + c * root_n, "ch4": ch4, "n2o": n2o}, C, M, N)


def times_changes(efficiencies, C, M, N):
    roots = lambda pair: sqrt(mpf(pair[1])) - sqrt(mpf(pair[0]))
    changes = {"co2": log(mpf(C[1]) / C[0]), "ch4": roots(M), "n2o": roots(N)}
    return {gas: efficiency * changes[gas] for gas, efficiency in efficiencies.items()}


def overlap(M, N):
    both = mpf(M) * N
    return mpf("0.47") * log(1 + mpf("2.01e-5") * both ** mpf("0.75") + mpf("5.31e-15") * M * both ** mpf("1.52"))


def myhre(C, M, N):
    """Myhre et al. 1998, as in IPCC 2001, Table 6.2."""
    alone = times_changes({"co2": mpf("5.35"), "ch4": mpf("0.036"), "n2o": mpf("0.12")}, C, M, N)
    alone["ch4"] -= overlap(M[1], N[0]) - overlap(M[0], N[0])
    alone["n2o"] -= overlap(M[0], N[1]) - overlap(M[0], N[0])
    return alone


# AR6 WGI, section 7.3.2: what clouds and the troposphere add
ADJUSTED = {"co2": mpf("1.05"), "ch4": mpf("0.86"), "n2o": mpf("1.07")}


def rows():
    for mix in MIXES:
        fits = {"myhre": myhre(**mix), "etminan": etminan(**mix), "meinshausen": meinshausen(**mix)}
        fits["ar6"] = {gas: ADJUSTED[gas] * value for gas, value in fits["meinshausen"].items()}
        yield {**mix, **{fit: {gas: nstr(value, 20) for gas, value in gases.items()} for fit, gases in fits.items()}}


beyond = meinshausen((280, 1900), (800, 3300), (280, 480))["co2"]
save(
    "forcing_fits",
    {
        "title": "Forcings by published fits (W m^-2); CO2 in ppm, CH4 and N2O in ppb, before and after",
        "made": made_by(__file__, "closed forms", "mpmath"),
        "rows": list(rows()),
        "beyond": {"C": [280, 1900], "N": 480, "co2": nstr(beyond, 20)},
    },
)
