"""Arithmetic on error forms: what is known of a computed double.

A form holds the range of the computed value, a grid (the value is a multiple of 2^grid), and the difference
from its exact counterpart as a sum of named roundings, each with a factor, plus a rest. The exact counterpart of
a result is what the same operations give on the exact counterparts of the operands without rounding. Roundings
keep their names, so that a rounding which the program later takes away again (Dekker, Knuth) cancels. Where range
and grid show that an operation is exact, it adds no rounding.
"""
import functools
import itertools
import mpmath as mp

mp.mp.prec = 400
names = itertools.count()
UNIT = mp.mpf(2) ** -53
LEAST_EXPONENT = -1074


def exponent(size):
    """e with 2^e <= size < 2^(e + 1)."""
    return int(mp.frexp(size)[1]) - 1


def half_ulp(size):
    """The largest rounding error of a result whose exact value is at most this in size."""
    size = abs(mp.mpf(size))
    if size == 0:
        return mp.mpf(0)
    return mp.ldexp(1, max(exponent(size) - 52, LEAST_EXPONENT) - 1)


def ulp(size):
    return 2 * half_ulp(size)


def rounded(value):
    """To the nearest double; ranges of this file stay far from overflow and underflow."""
    return mp.mpf(float(value))


def grid_of(value):
    """The exponent of the last bit of a double."""
    if value == 0:
        return None
    mantissa, e = mp.mpf(value).man_exp
    return e


class Form:
    def __init__(self, low, high=None, grid=None, terms=None, rest=0):
        self.low = mp.mpf(low)
        self.high = self.low if high is None else mp.mpf(high)
        assert self.low <= self.high
        self.grid = grid_of(self.low) if grid is None and high is None else grid
        self.terms = dict(terms or {})
        self.rest = mp.mpf(rest)
        self.rounding = None
        self.origin = None
        self.opposite = None
        self.multiples = {}

    @property
    def size(self):
        return max(abs(self.low), abs(self.high))

    @property
    def least(self):
        """The smallest size."""
        return mp.mpf(0) if self.low <= 0 <= self.high else min(abs(self.low), abs(self.high))

    @property
    def is_point(self):
        return self.low == self.high

    @property
    def is_zero(self):
        return self.is_point and self.low == 0

    def error(self, without=None):
        """A bound of |computed − exact|, if wanted without the last rounding."""
        return self.rest + sum(abs(f) * bounds[n] for n, f in self.terms.items() if n != without)

    def with_rest(self, more):
        """The same form with a larger rest."""
        form = Form(self.low, self.high, self.grid, self.terms, self.rest + more)
        form.rounding = self.rounding
        form.origin = self.origin
        return form

    def multiple_of(self, name):
        """The name of the product of a rounding with this value, always the same."""
        if name not in self.multiples:
            self.multiples[name] = next(names)
            bounds[self.multiples[name]] = bounds[name] * self.size
        return self.multiples[name]

    def __neg__(self):
        if self.opposite is None:
            form = Form(-self.high, -self.low, self.grid, {n: -f for n, f in self.terms.items()}, self.rest)
            form.opposite = self
            self.opposite = form
        return self.opposite

    def __add__(self, other):
        if other.is_zero and other.error() == 0:
            return self
        if self.is_zero and self.error() == 0:
            return other
        terms = dict(self.terms)
        for n, f in other.terms.items():
            terms[n] = terms.get(n, 0) + f
        grid = None if self.grid is None or other.grid is None else min(self.grid, other.grid)
        result = finish(self.low + other.low, self.high + other.high, grid, terms, self.rest + other.rest)
        result.origin = ("+", self, other)
        return result

    def __sub__(self, other):
        return self + -other

    def __mul__(self, other):
        if any(it.is_zero and it.error() == 0 for it in (self, other)):
            return literal(0)
        terms = {}
        rest = self.error() * other.error()
        for one, two in ((self, other), (other, self)):
            if two.is_point:
                for n, f in one.terms.items():
                    terms[n] = terms.get(n, 0) + f * two.low
            else:
                for n, f in one.terms.items():
                    multiple = two.multiple_of(n)
                    terms[multiple] = terms.get(multiple, 0) + f
            rest += one.rest * two.size
        corners = [a * b for a in (self.low, self.high) for b in (other.low, other.high)]
        low = max(min(corners), 0) if self is other else min(corners)
        grid = None if self.grid is None or other.grid is None else self.grid + other.grid
        power = any(it.is_point and abs(it.low) == mp.ldexp(1, exponent(abs(it.low))) for it in (self, other))
        result = finish(low, max(corners), grid, terms, rest, exact=power)
        result.origin = ("*", self, other)
        return result

    def __truediv__(self, other):
        assert other.least > 0
        if self.is_point and other.is_point and not self.terms and not other.terms:
            value = self.low / other.low
            return Form(rounded(value), rest=abs(rounded(value) - value) + self.rest + other.rest)
        if other.is_point and other.low == 2:
            return self * literal(0.5)
        corners = [a / b for a in (self.low, self.high) for b in (other.low, other.high)]
        ratio = self.size / other.least
        rest = (self.error() + (ratio + self.error()) * other.error()) / (other.least - other.error())
        return finish(min(corners), max(corners), None, {}, rest)


    def within(self, low, high, exact=False):
        """The same form, known to lie in this range, and maybe to be exact."""
        terms = {n: f for n, f in self.terms.items() if not (exact and n == self.rounding)}
        form = Form(low, high, self.grid, terms, self.rest)
        if not exact:
            form.rounding = self.rounding
            form.origin = self.origin
        return form


bounds = {}


@functools.cache
def literal(value):
    """The form of a number written in the program: one object for each value."""
    return Form(value)


def finish(low, high, grid, terms, rest, exact=False):
    """The form of a result that is rounded unless it is exact."""
    size = max(abs(low), abs(high))
    fits = grid is not None and size <= mp.ldexp(1, grid + 53)
    if exact or fits or size == 0:
        return Form(low, high, grid, terms, rest)
    if low == high:
        return Form(rounded(low), None, None, terms, rest + abs(rounded(low) - low))
    name = next(names)
    bounds[name] = half_ulp(size)
    form = Form(rounded(low), rounded(high), grid, {**terms, name: 1}, rest)
    form.rounding = name
    return form


def taken_away(result):
    """The exact error of a sum or product, as the program computes it: the rounding with its sign turned."""
    if result.rounding is None:
        return Form(0)
    bound = bounds[result.rounding]
    return Form(-bound, bound, None, {result.rounding: -1})


def product_error(a, b, product):
    assert product.is_zero or same_origin(product, "*", a, b)
    return taken_away(product)


def any_sum_error(a, b, total):
    assert total is a or total is b or total.rounding is None or same_origin(total, "+", a, b)
    return taken_away(total) if same_origin(total, "+", a, b) else Form(0)


def sum_error(a, b, total):
    """Dekker's condition: |a| >= |b|, or a is a multiple of the last place of b."""
    ordered = a.least >= b.size or b.is_zero
    assert ordered or total.rounding is None or a.grid >= exponent(b.size) - 52, "sumError: wrong order"
    return any_sum_error(a, b, total)


def joint_error(a, b):
    """A bound of the error of the unevaluated sum a + b."""
    terms = dict(a.terms)
    for n, f in b.terms.items():
        terms[n] = terms.get(n, 0) + f
    return a.rest + b.rest + sum(abs(f) * bounds[n] for n, f in terms.items())


def in_ulps(form):
    """The error of a returned value in ulps of the exact result: half an ulp for its own rounding, and more.

    Where rounding crosses a power of two upwards, the value before rounding lies within its error of that
    power, and so does the rounded one: the bound holds there too.
    """
    before = form.error(without=form.rounding)
    least = form.least * (1 - mp.mpf(2) ** -50) - before
    assert least > 0
    return (mp.mpf(1) / 2 + before / ulp(least)) * (1 + mp.mpf(10) ** -9)


def same_origin(form, kind, a, b):
    return form.origin is not None and form.origin[0] == kind and form.origin[1] is a and form.origin[2] is b
