"""Error bounds of exp, and of the pair of doubles that expm1, tanh and power take from it."""
from fractions import Fraction
from math import factorial
import mpmath as mp

from forms import Form, any_sum_error, in_ulps, joint_error, literal, product_error, sum_error
from series import Series
from source import check_near, constants_of, run, run_exactly

half = mp.mpf(1) / 2
reduction = constants_of("expReduction.ts")
STEP = mp.log(2) / 128
FILL = "if (expHigh[0] === 0) fillExpTable()"
TO_K = "const k = x * STEPS + ROUNDER - ROUNDER"
TO_A = "const a = x - k * STEP_HIGH"
TO_J = "const j = k & 127"
RANGE = "if (!(x >= LEAST && x <= GREATEST)) return x < LEAST ? 0 : x > GREATEST ? Infinity : NaN"
RESULT = "return k >> 7"
EXPONENTIAL = [Fraction(1, factorial(n)) for n in range(12)]

# ---- The reduction x = k·(ln 2)/128 + r

K = int(max(-reduction["LEAST"], reduction["GREATEST"]) * 128 / mp.log(2)) + 2
assert constants_of("rounder.ts")["ROUNDER"] == 1.5 * 2**52
step_high, step_low = mp.mpf(reduction["STEP_HIGH"]), mp.mpf(reduction["STEP_LOW"])
# k is the integer nearest to x·STEPS as rounded, which is off by two parts: the rounding and STEPS itself.
off = K * (mp.mpf(2) ** -52 + abs(reduction["STEPS"] - 1 / STEP) * STEP)
# The tail that power adds is below 2^-42.
R = STEP * (half + off) + mp.mpf(2) ** -41
slip = K * abs(STEP - step_high - step_low)
# k·STEP_HIGH is exact: the form arithmetic finds it so. So is the difference: if k is not 0, |x| > 2^-9, so
# that x is a multiple of 2^-61, and the difference is below 2^-8.
A = R + K * abs(step_low)
assert STEP * (half - off) > mp.mpf(2) ** -9 and A < mp.mpf(2) ** -8
assert (Form(-K, K, 0) * literal(reduction["STEP_HIGH"])).rounding is None


def reduced():
    """The two cases: k is not 0, k is 0."""
    return [
        {"k": Form(-K, K, 0), "a": Form(-A, A, -61), "sumError": sum_error},
        # here a is x itself, and larger than the tail of x, which is all that is added to it
        {"k": Form(0), "a": Form(-R, R), "sumError": any_sum_error},
    ]


def names(tables, **more):
    constants = {name: literal(reduction[name]) for name in ("STEP_HIGH", "STEP_LOW", "STEPS")}
    helpers = {"sumError": sum_error, "anySumError": any_sum_error, "productError": product_error}
    return {**constants, **helpers, **tables, "scale": lambda value, exponent: value, **more}


def table_forms(tables):
    """2^(j/128) in two doubles, with what is missing from both."""
    high = [Form(value) for value in tables["expHigh"]]
    low = []
    for j, value in enumerate(tables["expLow"]):
        missing = abs(mp.mpf(2) ** (mp.mpf(j) / 128) - tables["expHigh"][j] - value)
        assert missing < mp.mpf(2) ** -102
        low.append(Form(value, rest=missing))
    return {"expHigh": high, "expLow": low}


def check_formulas():
    """The polynomials of the sources are Taylor's."""
    r = Series(0, 1)
    zero = [Series(0)]
    nothing = lambda *_: Series(0)
    imports = {
        "expHigh": zero, "expLow": zero, "expParts": [0, 0], "STEP_LOW": Series(0), "tail": Series(0),
        "sumError": nothing, "productError": nothing, "scale": nothing,
    }
    lines = {FILL: None, TO_K: Series(0), TO_A: r, TO_J: 0}
    found = run("exp.ts", "exp", Series, imports, {**lines, RANGE: None})["p"]
    assert found.of == [0] + EXPONENTIAL[1:6]
    found = run("expPair.ts", "expPair", Series, imports, {**lines, RESULT: None})["p"]
    assert found.of == [0, 0] + EXPONENTIAL[2:7]


def check_meaning(tables):
    """Without rounding, the formulas give the exponential, but for what the series leave out."""
    for j in (0, 1, 31, 64, 99, 127):
        for k in (j, j - 128 * 900, j + 128 * 800):
            for share in (-half, -mp.mpf(1) / 3, mp.mpf(1) / 50, half):
                x = (k + share) * STEP
                tail = share * mp.mpf(2) ** -45
                scope = {**tables, "STEP_LOW": step_low, "expParts": [0, 0], "tail": tail}
                lines = {FILL: None, TO_K: mp.mpf(k), TO_A: x - k * step_high, TO_J: j}
                scaled = mp.mpf(2) ** (mp.mpf(j) / 128) * mp.exp(share * STEP)
                found = run_exactly("exp.ts", "exp", scope, {**lines, RANGE: None})["return"]
                check_near(found, scaled, -59, "exp")
                found = run_exactly("expPair.ts", "expPair", scope, {**lines, RESULT: None})["upper"]
                check_near(found, scaled * mp.exp(tail), -69, "expPair")


def exp_bound(tables):
    forms = table_forms(tables)
    tail = R**6 / 720 * mp.e**R
    worst = mp.mpf(0)
    for j in range(128):
        # below 1 the ulp halves, so the entry for 1 is taken once for each sign of r
        for low, high in ((-R, 0), (0, R)) if j == 0 else ((-R, R),):
            for case in reduced():
                narrow = lambda r: r.within(low, high).with_rest(slip)
                done = run(
                    "exp.ts", "exp", literal, names(forms, **case),
                    {RANGE: None, FILL: None, TO_K: case["k"], TO_A: case["a"], TO_J: j},
                    {"r": narrow, "p": lambda p: p.with_rest(tail)},
                )
                worst = max(worst, in_ulps(done["return"]))
    return worst


def exp_pair_bound(tables, largest_tail):
    """The relative error of the pair."""
    forms = table_forms(tables)
    truncated = R**7 / 5040 * mp.e**R
    tail = Form(-largest_tail, largest_tail) if largest_tail else Form(0)
    worst = mp.mpf(0)
    for j in range(128):
        for case in reduced():
            done = run(
                "expPair.ts", "expPair", literal, names(forms, expParts=[None, None], tail=tail, **case),
                {FILL: None, TO_K: case["k"], TO_A: case["a"], TO_J: j, RESULT: None},
                {"r": lambda r: r.within(-R, R), "rTail": lambda t: t.with_rest(slip),
                 "p": lambda p: p.with_rest(truncated)},
            )
            upper, lower = done["expParts"]
            worst = max(worst, joint_error(upper, lower) / (upper.least * (1 - mp.mpf(2) ** -50)))
    return worst * (1 + mp.mpf(10) ** -9)
