"""Polynomials with exact coefficients: what a formula of the program is when nothing is rounded."""
from fractions import Fraction


class Series:
    def __init__(self, *coefficients):
        self.of = [Fraction(c) for c in coefficients]

    def __add__(self, other):
        n = max(len(self.of), len(other.of))
        get = lambda s, i: s.of[i] if i < len(s.of) else 0
        return Series(*[get(self, i) + get(other, i) for i in range(n)])

    def __neg__(self):
        return Series(*[-c for c in self.of])

    def __sub__(self, other):
        return self + -other

    def __mul__(self, other):
        product = [0] * (len(self.of) + len(other.of) - 1)
        for i, a in enumerate(self.of):
            for k, b in enumerate(other.of):
                product[i + k] += a * b
        return Series(*product)

    def __truediv__(self, other):
        assert len(other.of) == 1
        return Series(*[c / other.of[0] for c in self.of])
