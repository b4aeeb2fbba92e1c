#!/usr/bin/env python3
"""Bounds the error of the elementary functions, in ulps, for every argument, from their sources and tables.

    python3 tests/reference/scripts/prove_elementary.py [--write]

Needs mpmath and node. --write stores the bounds in tests/reference/elementary/bounds.json, with the
fingerprint of the sources for which they were proved. How it works is told in docs/elementary.md.
"""
import json
import pathlib
import sys

sys.dont_write_bytecode = True
HERE = pathlib.Path(__file__).resolve().parent
sys.path.insert(0, str(HERE / "elementary"))

import mpmath as mp
import angles
import exponentials
import from_pair
import logarithms
import tables
from source import constants_of

half = mp.mpf(1) / 2


def check_limits():
    """Where results overflow and where they round to 0: for exp, and for the product in power."""
    greatest, least = (mp.mpf(constants_of("expReduction.ts")[name]) for name in ("GREATEST", "LEAST"))
    overflow = mp.mpf(2) ** 1024 - mp.mpf(2) ** 970
    vanishing = mp.mpf(2) ** -1075
    spacing = mp.mpf(2) ** -43
    assert mp.exp(greatest) < overflow - mp.mpf(2) ** 972 and mp.exp(greatest + spacing / 2) > overflow
    assert mp.exp(least) > vanishing > mp.exp(least - spacing)
    # the exact product may lie half a spacing above the rounded one: 0 is then nearest but for a hair
    assert mp.exp(least - spacing / 2) < vanishing * (1 + mp.mpf(10) ** -12)


def prove():
    for module in (exponentials, from_pair, logarithms, angles):
        module.check_formulas()
    check_limits()
    dump = tables.load()
    values = dump["tables"]
    for module in (exponentials, logarithms):
        module.check_meaning(values)
    for module in (from_pair, angles):
        module.check_meaning()
    exp = exponentials.exp_bound(values)
    exp_pair = exponentials.exp_pair_bound(values, 0)
    log = logarithms.log_bounds(values)
    log_pair = logarithms.log_pair_bound(values)
    largest_tail = mp.mpf(2) ** -42
    with_tail = exponentials.exp_pair_bound(values, largest_tail)
    power, tail = logarithms.power_bound(log_pair, with_tail, mp.mpf("745.2"))
    assert tail <= largest_tail
    *angle, approach = angles.bounds()
    parts = {
        "exp": [exp],
        "log": log,
        "tanh": from_pair.tanh_bounds(exp_pair),
        "expm1": from_pair.expm1_bounds(exp_pair),
        "log1p": logarithms.log1p_bounds(values),
        "power": [power],
        "cos": angle,
        "sin": angle,
    }
    print(f"pair behind expm1, tanh and power: relative error 2^{mp.nstr(mp.log(exp_pair, 2), 5)}")
    print(f"pair of logarithms behind power: relative error 2^{mp.nstr(mp.log(log_pair, 2), 5)}")
    print(f"least distance from a multiple of pi/2: 2^{mp.nstr(mp.log(approach, 2), 5)}")
    bounds = {}
    for name, found in parts.items():
        print(name.ljust(6), "ulp in each of its ranges:", ", ".join(mp.nstr(bound, 6) for bound in found))
        bounds[name] = {"normal": upwards(max(found))}
        if name in ("exp", "power"):
            # one more rounding, of a value whose own ulp is at most half that of the result
            bounds[name]["subnormal"] = upwards(half + max(found) / 2)
    return {"sources": dump["fingerprint"], "bounds": bounds}


def upwards(bound):
    """To four decimals."""
    return float(mp.ceil(bound * 10**4)) / 10**4


result = prove()
text = json.dumps(result, indent=2) + "\n"
print(text, end="")
if "--write" in sys.argv[1:]:
    (HERE.parent / "elementary" / "bounds.json").write_text(text)
