#!/usr/bin/env python3
"""Writes tests/reference/elementary/<function>.csv: exact arguments, results to about 30 digits, by mpmath.

    python3 tests/reference/scripts/make_elementary.py

A row is the argument (for power the base and the exponent), the result rounded to the nearest double, and what
is missing from it, in hundred-thousandths of the ulp of the exact result. Doubles are written with the digits
that give them back exactly. Five regimes for each function, 200 rows each (120 for power), from a fixed seed;
a row that starts with # names the regime. tables.csv holds what the tables of exp and log must be.
"""
import itertools
import math
import pathlib
import random

import mpmath as mp

mp.mp.prec = 400
OUT = pathlib.Path(__file__).resolve().parents[1] / "elementary"
LEAST = math.ulp(0.0)
QUARTER = mp.pi / 2
TURNS = 636619
chance = random.Random(1915)


def even(low, high):
    return lambda: (chance.uniform(low, high),)


def either_sign(draw):
    return lambda: tuple(chance.choice((-1, 1)) * x for x in draw())


def logarithmic(low, high):
    """Evenly in the exponent, with a full mantissa."""
    return lambda: (math.ldexp(chance.uniform(1, 2), chance.randint(low, high - 1)),)


def subnormal():
    return (chance.randrange(1, 1 << chance.randint(1, 52)) * LEAST,)


def shifted(draw, by):
    return lambda: (draw()[0] + by,)


def either(*draws):
    return lambda: chance.choice(draws)()


def hardest_turn():
    """The multiple of π/2 up to 10⁶ that lies nearest to a double."""
    quarter = int(QUARTER * mp.mpf(2) ** 200)

    def distance(k):
        exact = k * quarter
        unit = 1 << (exact.bit_length() - 53)
        return min(exact % unit, unit - exact % unit)

    return min(range(1, TURNS + 1), key=distance)


def near_turns():
    """The doubles nearest to multiples of π/2; the hardest of them first."""
    turns = itertools.chain([hardest_turn()], iter(lambda: chance.randint(1, TURNS), None))
    return lambda: (chance.choice((-1, 1)) * float(next(turns) * QUARTER),)


def pair(base, exponent):
    return lambda: (base()[0], exponent()[0])


def with_result(base, low, high):
    """A base, and an exponent that takes it to about 2^low … 2^high."""
    def draw():
        (x,) = base()
        return x, chance.uniform(low, high) / math.log2(x)
    return draw


def angles():
    return {
        "from 1e-12 to 2^-6": either_sign(logarithmic(-40, -6)),
        "up to pi/4": either_sign(even(0, 0.7854)),
        "up to two turns": either_sign(even(0, 12.6)),
        "up to 1e6": either_sign(even(12.6, 1e6)),
        "next to quarter turns": near_turns(),
    }


REGIMES = {
    "exp": {
        "below 2^-8": either_sign(logarithmic(-58, -8)),
        "up to 1": either_sign(even(0, 1)),
        "up to 40": either_sign(even(1, 40)),
        "to the limits": either(even(40, 709.78), even(-708.39, -40)),
        "subnormal results": even(-745.13, -708.4),
    },
    "log": {
        "next to 1": shifted(either_sign(logarithmic(-53, -6)), 1),
        "from 1/2 to 2": even(0.5, 2),
        "from 1e-3 to 1e3": logarithmic(-10, 10),
        "all exponents": logarithmic(-1022, 1023),
        "subnormal arguments": subnormal,
    },
    "tanh": {
        "below 2^-12": either_sign(logarithmic(-60, -12)),
        "up to 1/16": either_sign(logarithmic(-12, -4)),
        "up to 1": either_sign(even(0.0625, 1)),
        "up to 6": either_sign(even(1, 6)),
        "up to 19.06": either_sign(even(6, 19.06)),
    },
    "expm1": {
        "below 2^-20": either_sign(logarithmic(-60, -20)),
        "up to 1/64": either_sign(logarithmic(-20, -6)),
        "up to 1": either_sign(even(1 / 64, 1)),
        "from -38 to -1": even(-38, -1),
        "to the limit": even(1, 709.78),
    },
    "log1p": {
        "below 2^-20": either_sign(logarithmic(-60, -20)),
        "up to 1/128": either_sign(logarithmic(-20, -7)),
        "from -1 to -1/128": either(shifted(logarithmic(-53, -1), -1), even(-1, -1 / 128)),
        "up to 4": even(1 / 128, 4),
        "all exponents": logarithmic(2, 1023),
    },
    "power": {
        "tame": pair(even(0.1, 10), even(-4, 4)),
        "bases next to 1": with_result(shifted(either_sign(logarithmic(-12, -5)), 1), -1021, 1023),
        "roots": pair(logarithmic(-1000, 1000), either_sign(even(0, 1))),
        "to the limits": with_result(logarithmic(-40, 40), -1021, 1023),
        "subnormal results": with_result(logarithmic(-40, 40), -1073, -1022.5),
    },
    "cos": angles(),
    "sin": angles(),
}
EXACT = {
    "exp": mp.exp, "log": mp.log, "tanh": mp.tanh, "expm1": mp.expm1, "log1p": mp.log1p, "power": mp.power,
    "cos": mp.cos, "sin": mp.sin,
}


def double_and_rest(exact):
    high = mp.mpf(float(exact))
    return f"{float(high)!r},{float(exact - high)!r}"


def tables():
    """For each of the 128 entries 2^(j/128) and the logarithm of the cell's reciprocal, high part and rest."""
    yield "# 2^(j/128) to a double, rest, 512 c, -ln c (of 2c from cell 53) to a multiple of 2^-42, rest"
    for j in range(128):
        power = double_and_rest(mp.mpf(2) ** (mp.mpf(j) / 128))
        c = {0: 512, 127: 256}.get(j, round(512 / (1 + (j + 0.5) / 128)))
        logarithm = -mp.log(mp.mpf(c) / (512 if j < 53 else 256))
        high = mp.nint(logarithm * 2**42) / 2**42
        yield f"{power},{c},{float(high)!r},{float(logarithm - high)!r}"


def write(name, lines):
    text = "\n".join(lines) + "\n"
    (OUT / f"{name}.csv").write_text(text)
    print(name, len(text), "bytes")


def row(function, arguments):
    exact = EXACT[function](*map(mp.mpf, arguments))
    if exact == 0 or not LEAST / 2 < abs(exact) < mp.mpf(2) ** 1024 - mp.mpf(2) ** 971:
        return None
    exponent = int(mp.frexp(abs(exact))[1]) - 53
    ulp = mp.ldexp(1, max(exponent, -1074))
    result = float(mp.nint(exact / ulp) * ulp)
    missing = int(mp.nint((exact - mp.mpf(result)) / ulp * 10**5))
    return ",".join([*map(repr, arguments), repr(result), str(missing)])


for function, regimes in REGIMES.items():
    lines = []
    for regime, draw in regimes.items():
        lines.append(f"# {regime}")
        wanted = len(lines) + (120 if function == "power" else 200)
        while len(lines) < wanted:
            line = row(function, draw())
            if line:
                lines.append(line)
    write(function, lines)
write("tables", tables())
