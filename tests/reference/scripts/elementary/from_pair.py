"""Error bounds of expm1 and tanh: Taylor's series for small arguments, the pair behind exp for the others."""
from fractions import Fraction
import mpmath as mp

from exponentials import EXPONENTIAL, names
from forms import Form, half_ulp, in_ulps, literal
from series import Series
from source import check_near, constants_of, lines_of, run, run_exactly

NEAR = mp.mpf(2) ** -50
EXPM1_M = "const m = expPair(x, 0)"
TANH_M = "const m = expPair(2 * a, 0)"
HIGH = "const high = scale(expParts[0] as number, m)"
LOW = "const low = scale(expParts[1] as number, m)"
TANH_RATIO = "const ratio = above / below"
EIGHTH = mp.mpf(2) ** (mp.mpf(1) / 8)


def steps(low, high, factor):
    """Short intervals that cover [low, high]."""
    edges = [mp.mpf(low)]
    while edges[-1] < high:
        edges.append(min(mp.mpf(high), edges[-1] * factor))
    return zip(edges, edges[1:])


def parts(low, high, relative):
    """The forms of the two parts of an exponential between low and high."""
    size = half_ulp(high * (1 + NEAR))
    return Form(low * (1 - NEAR), high * (1 + NEAR)), Form(-size, size, rest=relative * high)


def expect(file, function, *lines):
    for line in lines:
        assert line in lines_of(file, function), f"{file}: {function}: no longer there: {line}"


def tanh_coefficients(n):
    """From t' = 1 − t²."""
    t = [Fraction(0)]
    for i in range(n):
        t.append((Fraction(i == 0) - sum(t[k] * t[i - k] for k in range(i + 1))) / (i + 1))
    return t


def check_formulas():
    x = Series(0, 1)
    assert run("expm1.ts", "series", Series, {"x": x}, {})["return"].of == [0] + EXPONENTIAL[1:9]
    assert run("tanh.ts", "series", Series, {"a": x}, {})["return"].of == tanh_coefficients(13)


def check_meaning():
    """Without rounding, the formulas give the functions from any two parts of the exponential."""
    for x in map(mp.mpf, ("-30", "-1", "-0.016", "0.07", "1", "3.3", "17", "600")):
        upper = mp.mpf(float(mp.exp(x)))
        lower = mp.exp(x) - upper
        given = {EXPM1_M: None, HIGH: upper, LOW: lower}
        check_near(run_exactly("expm1.ts", "difference", {}, given)["return"], mp.expm1(x), -390, "expm1")
        if 0 < x < 20:
            upper = mp.mpf(float(mp.exp(2 * x)))
            lower = mp.exp(2 * x) - upper
            # the quotient is corrected to the second order of its rounding
            ratio = mp.mpf(float((upper - 1) / (upper + 1)))
            given = {TANH_M: None, HIGH: upper, LOW: lower, TANH_RATIO: ratio}
            check_near(run_exactly("tanh.ts", "quotient", {}, given)["return"], mp.tanh(x), -98, "tanh")


def expm1_bounds(pair):
    """Below TINY, by series, from the pair."""
    expect(
        "expm1.ts", "expm1", "if (size < TINY) return x", "return size < 1 / 64 ? series(x) : difference(x)"
    )
    constants = constants_of("expm1.ts")
    assert constants["TINY"] == 2.0**-54 and mp.exp(constants["SATURATED"]) < mp.mpf(2) ** -54
    # |e^x − 1 − x| < 0.51 x², and an ulp is at least 2^-53 |x|
    tiny = mp.mpf("0.51") * mp.mpf(2) ** -54 / mp.mpf(2) ** -53
    series = mp.mpf(0)
    for low, high in steps(mp.mpf(2) ** -54, mp.mpf(1) / 64, EIGHTH):
        truncated = high**9 / 362880 * mp.e**high
        for x in (Form(low, high), Form(-high, -low)):
            adjust = {"return": lambda f: f.with_rest(truncated)}
            done = run("expm1.ts", "series", literal, {"x": x}, {}, adjust)
            series = max(series, in_ulps(done["return"]))
    top = mp.mpf(2) ** 64  # beyond it 1 is nothing beside e^x, and the same bound holds for every binade
    up = steps(mp.exp(mp.mpf(1) / 64), top, EIGHTH)
    down = steps(mp.exp(constants["SATURATED"]), mp.exp(-mp.mpf(1) / 64), EIGHTH)
    difference = mp.mpf(0)
    for low, high in [*up, *down]:
        upper, lower = parts(low, high, pair)
        given = {EXPM1_M: None, HIGH: upper, LOW: lower}
        done = run("expm1.ts", "difference", literal, names({}), given)
        difference = max(difference, in_ulps(done["return"]))
    return tiny, series, difference


def tanh_bounds(pair):
    """Where it is x, by series, from the pair, and where it is 1."""
    expect(
        "tanh.ts", "tanh", "const value = a < 1 / 16 ? series(a) : quotient(a)",
        "if (!(a > 0 && a < SATURATED)) return Math.sign(x)",
    )
    constants = constants_of("tanh.ts")
    # below 2^-27 the series takes less than half the spacing under a away from it (c1 is -1/3 but for its rounding
    # and what is less than z), so it gives a
    z = mp.mpf(2) ** -54
    assert z * (mp.mpf(1) / 3 + z) * (1 + NEAR) < mp.mpf(2) ** -54
    # |tanh x − x| < |x|³/3, and an ulp is at least 2^-53 |x|
    tiny = mp.mpf(2) ** -54 / 3 / mp.mpf(2) ** -53
    next_one = abs(tanh_coefficients(15)[15])
    series = mp.mpf(0)
    for low, high in steps(mp.mpf(2) ** -27, mp.mpf(1) / 16, EIGHTH):
        adjust = {"return": lambda f: f.with_rest(next_one.numerator * high**15 / next_one.denominator)}
        done = run("tanh.ts", "series", literal, {"a": Form(low, high)}, {}, adjust)
        series = max(series, in_ulps(done["return"]))
    quotient = mp.mpf(0)
    for low, high in steps(mp.mpf(1) / 16, constants["SATURATED"], EIGHTH):
        quotient = max(quotient, quotient_bound(low, high, pair))
    saturated = (1 - mp.tanh(constants["SATURATED"])) / mp.mpf(2) ** -53
    return tiny, series, quotient, saturated


def quotient_bound(low, high, pair):
    """For |x| in [low, high]."""
    upper, lower = parts(mp.exp(2 * low), mp.exp(2 * high), pair)
    ratio = Form(mp.tanh(low) * (1 - NEAR), mp.tanh(high) * (1 + NEAR))
    known = {}

    def keep(name):
        def note(form):
            known[name] = form
            return form
        return note

    def narrow(gap):
        # ratio is above / below rounded, back is their product rounded: the difference is exact (Sterbenz)
        size = known["below"].size * half_ulp(ratio.size) + half_ulp(known["back"].size)
        return gap.within(-size, size, exact=True)

    def truncated(result):
        # the formula divides by high + 1, not by e^(2|x|) + 1; what it divides is rest
        rest, tail, below = known["rest"], lower, known["below"]
        return result.with_rest(2 * (rest.size + rest.error()) * (tail.size + tail.error()) / below.least**2)

    given = {TANH_M: None, HIGH: upper, LOW: lower, TANH_RATIO: ratio}
    adjust = {name: keep(name) for name in ("below", "back", "rest")}
    adjust.update({"gap": narrow, "return": truncated})
    return in_ulps(run("tanh.ts", "quotient", literal, names({}), given, adjust)["return"])
