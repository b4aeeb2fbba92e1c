"""Error bounds of log, log1p and power, and of the pair of doubles that power takes from log."""
from fractions import Fraction
import mpmath as mp

from exponentials import names
from forms import Form, half_ulp, in_ulps, joint_error, literal
from from_pair import EIGHTH, expect, steps
from series import Series
from source import check_near, constants_of, run, run_exactly

table = constants_of("logTable.ts")
HALVED = int(table["HALVED"])
LN2_HIGH = literal(table["LN2_HIGH"])
LN2_LOW = Form(table["LN2_LOW"], rest=abs(mp.log(2) - mp.mpf(table["LN2_HIGH"]) - mp.mpf(table["LN2_LOW"])))
REDUCE = "const cell = reduceLog(x, tail)"
REDUCE_EXACTLY = "const cell = reduceLog(x, 0)"
TO_E = "const e = cell >> 7"
TO_J = "const j = cell & 127"
LOGARITHM = [Fraction(0)] + [Fraction((-1) ** (n + 1), n) for n in range(1, 12)]


def check_formulas():
    f = Series(0, 1)
    assert run("logSeries.ts", "logSeries", Series, {"f": f}, {})["return"].of == [0, 0] + LOGARITHM[2:10]
    nothing = lambda *_: Series(0)
    imports = {
        "logParts": [f, Series(0)], "logHigh": [Series(0)], "logLow": [Series(0)], "sumError": nothing,
        "productError": nothing, "LN2_HIGH": Series(0), "LN2_LOW": Series(0),
    }
    done = run("logPair.ts", "logPair", Series, imports, {REDUCE_EXACTLY: None, TO_E: Series(0), TO_J: 0})
    assert done["cubic"].of == [0, 0, 0] + LOGARITHM[3:11] and done["upper"].of == LOGARITHM[:11]


def truncation(size, degree):
    """What Taylor's series leaves out."""
    return size ** (degree + 1) / (degree + 1) / (1 - size)


def log_series(f):
    leave_out = {"return": lambda form: form.with_rest(truncation(f.size, 9))}
    return run("logSeries.ts", "logSeries", literal, {"f": f}, {}, leave_out)["return"]


def exponents():
    """Every exponent that a double can have, in groups."""
    for e in (0, -1, 1):
        yield Form(e)
    for low, high in [(2**i, min(2 ** (i + 1) - 1, 1075)) for i in range(1, 11)]:
        yield Form(low, high, 0)
        yield Form(-high, -low, 0)


def reduction_lines(j, unit, upper, lower):
    return {
        "if (reciprocal[0] === 0) fillLogTable()": None,
        "if (x < LEAST_NORMAL) return reduceLog(x * TWO_TO_54, 0) - 54 * 128": None,
        "bits.setFloat64(0, x)": None,
        "const word = bits.getInt32(0)": None,
        "const e = (word >> 20) - 1023": None,
        "const j = (word >> 13) & 127": j,
        "const unit = powerOfTwo(-e)": unit,
        "const m = x * unit": None,
        "const upper = m + SPLITTER - SPLITTER": upper,
        "const lower = m - upper": lower,
        "return (j < HALVED ? e : e + 1) * 128 + j": None,
    }


def check_meaning(tables):
    """Without rounding, the formulas give the logarithm, but for what the series leave out."""
    series = lambda f: run_exactly("logSeries.ts", "logSeries", {"f": f}, {})["return"]
    constants = {name: mp.mpf(table[name]) for name in ("LN2_HIGH", "LN2_LOW")}
    constants["logSeries"] = series
    for j in (0, 1, 52, 53, 100, 126, 127):
        for e in (-1074, -1, 0, 1, 700):
            m = 1 + (j + mp.mpf("0.37")) / 128
            tail = mp.mpf(2) ** -55
            upper = mp.floor(m * 2**26) / 2**26
            lines = reduction_lines(j, mp.mpf(1), upper, m - upper)
            scope = {**constants, **tables, "tail": tail, "logParts": [None, None]}
            f = run_exactly("logReduction.ts", "reduceLog", scope, lines)["f"]
            check_near(1 + f, (m + tail) * tables["reciprocal"][j], -390, "reduceLog")
            part = f * mp.mpf(2) ** -56
            scope = {**constants, **tables, "logParts": [f - part, part]}
            lines = {TO_E: mp.mpf(e if j < HALVED else e + 1), TO_J: j}
            wanted = mp.log(m + tail) + e * mp.log(2)
            found = run_exactly("logOfSum.ts", "logOfSum", scope, {REDUCE: None, **lines})["return"]
            check_near(found, wanted, -61, "log")
            scope["logParts"] = [f - part, part]
            found = run_exactly("logPair.ts", "logPair", scope, {REDUCE_EXACTLY: None, **lines})["upper"]
            check_near(found, wanted, -68, "logPair")


def reduced(tables, j, with_tail):
    """The two parts of f in cell j; 1 + f is c times an argument between 1 and 2, with a tail or none."""
    assert constants_of("logReduction.ts")["SPLITTER"] == 2.0**26
    low, high = 1 + mp.mpf(j) / 128, 1 + mp.mpf(j + 1) / 128
    tail = Form(-mp.mpf(2) ** -53, mp.mpf(2) ** -53) if with_tail else Form(0)
    lower = Form(-mp.mpf(2) ** -27, mp.mpf(2) ** -27, -52)
    given = reduction_lines(j, literal(1), Form(low, high, -26), lower)
    scope = names({}, reciprocal=[Form(c) for c in tables["reciprocal"]], logParts=[None, None], tail=tail)
    return run("logReduction.ts", "reduceLog", literal, scope, given)["logParts"]


def cell_names(tables, j):
    c = tables["reciprocal"][j]
    exact = -mp.log(c if j < HALVED else 2 * c)
    missing = abs(exact - tables["logHigh"][j] - tables["logLow"][j])
    assert missing < mp.mpf(2) ** -74
    high = [None] * 128
    low = [None] * 128
    high[j], low[j] = Form(tables["logHigh"][j]), Form(tables["logLow"][j], rest=missing)
    return names({}, LN2_HIGH=LN2_HIGH, LN2_LOW=LN2_LOW, logHigh=high, logLow=low, logSeries=log_series)


def next_to_one(tables):
    """Around 1 the result is f itself and its series. Below 2^-60 the series is nothing beside f."""
    for j, c in ((0, 1), (127, mp.mpf(1) / 2)):
        assert tables["reciprocal"][j] == c and tables["logHigh"][j] == tables["logLow"][j] == 0
    for low, high in steps(mp.mpf(2) ** -60, mp.mpf(1) / 128, EIGHTH):
        yield 0, Form(low, high)
        yield 127, Form(-high, -low)


def cells(tables, with_tail=False):
    """Every cell and exponent, but for the two around 1 with exponent 0: what the formulas are run with."""
    for j in range(128):
        for e in exponents():
            if not (e.is_zero and j in (0, 127)):
                scope = cell_names(tables, j)
                yield {**scope, "logParts": reduced(tables, j, with_tail)}, {TO_E: e, TO_J: j}


def around_one(tables):
    for j, f in next_to_one(tables):
        yield {**cell_names(tables, j), "logParts": [f, Form(0)]}, {TO_E: Form(0), TO_J: j}


def log_bounds(tables):
    """Around 1, and elsewhere."""
    return tuple(
        max(in_ulps(run("logOfSum.ts", "logOfSum", literal, scope, {REDUCE: None, **given})["return"])
            for scope, given in cases)
        for cases in (around_one(tables), cells(tables))
    )


def log1p_bounds(tables):
    """Below TINY, by series, and from the logarithm of the sum."""
    expect(
        "log1p.ts", "log1p", "if (size < TINY) return x", "if (size < 1 / 128) return x + logSeries(x)",
        "const sum = 1 + x", "return logOfSum(sum, anySumError(1, x, sum))",
    )
    assert constants_of("log1p.ts")["TINY"] == 2.0**-54
    # |ln(1 + x) − x| < 0.51 x², and an ulp is at least 2^-53 |x|
    tiny = mp.mpf("0.51") * mp.mpf(2) ** -54 / mp.mpf(2) ** -53
    series = max(in_ulps(f + log_series(f)) for _, f in next_to_one(tables))
    rest = max(
        in_ulps(run("logOfSum.ts", "logOfSum", literal, scope, {REDUCE: None, **given})["return"])
        for scope, given in cells(tables, with_tail=True)
    )
    return tiny, series, rest


def log_pair_bound(tables):
    """The relative error of the pair."""
    worst = mp.mpf(0)
    for cases in (around_one(tables), cells(tables)):
        for scope, given in cases:
            size = scope["logParts"][0].size
            leave_out = {"cubic": lambda form: form.with_rest(truncation(size, 10))}
            done = run("logPair.ts", "logPair", literal, scope, {REDUCE_EXACTLY: None, **given}, leave_out)
            upper = done["upper"]
            error = joint_error(upper, done["logParts"][1])
            worst = max(worst, error / (upper.least * (1 - mp.mpf(2) ** -50) - error))
    return worst * (1 + mp.mpf(10) ** -9)


def power_bound(log_pair, exp_pair, largest):
    """From the relative errors of the two pairs; largest is the greatest |exponent · ln base|."""
    expect(
        "power.ts", "power", "const logarithm = logPair(base)", "const product = exponent * logarithm",
        "const tail = productError(exponent, logarithm, product) + exponent * (logParts[1] as number)",
        "const m = expPair(product, tail)", "return scale(expParts[0] as number, m)",
    )
    lower = half_ulp(largest)  # of either part of the tail
    argument = largest * log_pair + half_ulp(lower) + half_ulp(2 * lower)
    relative = (mp.exp(argument) - 1) + exp_pair * mp.exp(argument)
    return mp.mpf(1) / 2 + relative / mp.mpf(2) ** -53, 2 * lower
