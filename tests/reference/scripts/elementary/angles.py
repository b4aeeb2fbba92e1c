"""Error bounds of cos and sin."""
from fractions import Fraction
from math import factorial
import mpmath as mp

from exponentials import names
from forms import Form, half_ulp, in_ulps, joint_error, literal
from from_pair import EIGHTH, expect, steps
from series import Series
from source import check_near, constants_of, run, run_exactly

turns = constants_of("quarterTurns.ts")
QUARTER = mp.pi / 2
TO_K = "const k = x * PER_QUARTER + ROUNDER - ROUNDER"
TO_A = "const a = x - k * QUARTER_1"
K = int(turns["FARTHEST"] / QUARTER) + 1
# k is the integer nearest to x·2/π as rounded
off = K * (mp.mpf(2) ** -52 + abs(turns["PER_QUARTER"] * QUARTER - 1))
LARGEST = QUARTER * (mp.mpf(1) / 2 + off) + mp.mpf(2) ** -50


def sine(n):
    return [Fraction((0, 1, 0, -1)[i % 4], factorial(i)) for i in range(n)]


def cosine(n):
    return [Fraction((1, 0, -1, 0)[i % 4], factorial(i)) for i in range(n)]


def check_formulas():
    nothing = lambda *_: Series(0)
    scope = {"r": Series(0, 1), "tail": Series(0), "sumError": nothing, "productError": nothing}
    assert run("cosSin.ts", "sinSeries", Series, scope, {})["return"].of == sine(18)
    assert run("cosSin.ts", "cosSeries", Series, scope, {})["return"].of == cosine(17)


def check_meaning():
    """Without rounding, the formulas give sine and cosine, but for what the series leave out."""
    known = {name: mp.mpf(value) for name, value in turns.items()}
    for k in (0, 1, -7, 636619):
        for share in (mp.mpf("-0.49"), mp.mpf("0.003"), mp.mpf("0.3")):
            x = (k + share) * QUARTER
            given = {TO_K: mp.mpf(k), TO_A: x - k * known["QUARTER_1"], "return k & 3": None}
            scope = {**known, "turnParts": [None, None]}
            found = run_exactly("quarterTurns.ts", "reduceTurns", scope, given)["r"]
            check_near(found, share * QUARTER, -120, "reduceTurns")
            tail = mp.mpf(2) ** -55
            scope = {"r": share * QUARTER - tail, "tail": tail}
            sine_found = run_exactly("cosSin.ts", "sinSeries", scope, {})["return"]
            check_near(sine_found, mp.sin(share * QUARTER), -59, "sin")
            cosine_found = run_exactly("cosSin.ts", "cosSeries", scope, {})["return"]
            check_near(cosine_found, mp.cos(share * QUARTER), -57, "cos")


def nearest_approach():
    """The least |x − k·π/2| over all doubles x in range and all k but 0, from the doubles next to k·π/2."""
    bits = 200
    quarter = int(mp.floor(QUARTER * mp.mpf(2) ** bits))
    least = None
    for k in range(1, K + 1):
        exact = k * quarter
        unit = 1 << (exact.bit_length() - 53)
        off = exact % unit
        away = min(off, unit - off)
        least = away if least is None else min(least, away)
    return (mp.mpf(least) - K) / mp.mpf(2) ** bits


def reduction_error(low, high):
    """Of the unevaluated sum of the two parts of r, for |r| in [low, high] and k not 0; and the tail."""
    constants = {name: literal(turns[name]) for name in ("QUARTER_2", "QUARTER_3")}
    assert (Form(-K, K, 0) * literal(turns["QUARTER_1"])).rounding is None
    known = [mp.mpf(turns[f"QUARTER_{i}"]) for i in (1, 2, 3, 4)]
    fourth = Form(turns["QUARTER_4"], rest=abs(QUARTER - sum(known)))
    second_part = K * known[1]
    third_part = K * known[2]
    # |x| > 1/2, so x is a multiple of 2^-53 and QUARTER_1 one of 2^-32: the difference, below 1, is exact
    assert LARGEST + second_part < 1
    given = {
        TO_K: Form(-K, K, 0),
        TO_A: Form(low - second_part, high + second_part, -53),
        "return k & 3": None,
    }
    slack = K * known[3] * 2 + high * mp.mpf(2) ** -50
    adjust = {
        "first": lambda f: f.within(low - third_part - slack, high + third_part + slack),
        "second": lambda f: f.within(low - slack, high + slack),
    }
    scope = names({}, QUARTER_4=fourth, turnParts=[None, None], **constants)
    r, tail = run("quarterTurns.ts", "reduceTurns", literal, scope, given, adjust)["turnParts"]
    return joint_error(r, tail), tail.size


def series_bound(function, low, high, away, tail_size):
    """For |r| in [low, high], with that error and size of its tail."""
    tail = Form(-tail_size, tail_size, rest=away)
    degree, first = (19, 2) if function == "sinSeries" else (18, 1)
    # what the series leaves out, and what its treatment of the tail leaves out
    left_out = high**degree / factorial(degree) + tail_size * (high**4 / 24 + high**3 / 6 + tail_size)
    adjust = {"return": lambda f: f.with_rest(left_out)}
    scope = names({}, r=Form(low, high), tail=tail)
    return in_ulps(run("cosSin.ts", function, literal, scope, {}, adjust)["return"])


def bounds():
    """Of the sine series and of the cosine series, over every r that can occur; and the least |r|."""
    expect(
        "cosSin.ts", "sin",
        "if (!(size <= FARTHEST)) return NaN", "return size < TINY ? x : quarter(reduceTurns(x))",
    )
    assert constants_of("cosSin.ts")["TINY"] == 2.0**-27
    least = nearest_approach()
    sin_worst = cos_worst = mp.mpf(0)
    for low, high in steps(least / 2, LARGEST, EIGHTH):
        away, tail = reduction_error(low, high)
        sin_worst = max(sin_worst, series_bound("sinSeries", low, high, away, tail))
        cos_worst = max(cos_worst, series_bound("cosSeries", low, high, away, tail))
    return sin_worst, cos_worst, least
