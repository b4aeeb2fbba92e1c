"""Reads the functions of the library from their TypeScript sources and runs them on other kinds of numbers.

Every line of a function must either be one that can be run (a constant, an entry of a table, a return) or be
listed by the proof as given. So a proof cannot go on holding of a function that has been changed.
"""
import ast
import pathlib
import re

import mpmath as mp

ROOT = pathlib.Path(__file__).resolve().parents[4]
FOLDER = ROOT / "src" / "ground" / "elementary"


def text_of(file):
    text = (FOLDER / file).read_text()
    text = re.sub(r"/\*.*?\*/", "", text, flags=re.S)
    return re.sub(r"(?m)//.*$", "", text)


def constants_of(file):
    """The named numbers of a file."""
    found = re.findall(r"const (\w+) = (-?[\d.]+(?:e[-+]?\d+)?);", text_of(file))
    return {name: float(value) for name, value in found}


def lines_of(file, function):
    """The lines of a function's body, blanks squeezed."""
    found = re.search(r"(?ms)^(?:export )?function %s\([^)]*\): \w+ \{(.*?)^\}" % function, text_of(file))
    assert found, f"{file}: no function {function}"
    return [re.sub(r"\s+", " ", line).strip() for line in re.split(r";\s*\n", found.group(1)) if line.strip()]


class Literals(ast.NodeTransformer):
    """Turns the numbers of an expression into calls that make them the wanted kind; indices stay."""

    def visit_Subscript(self, node):
        return node

    def visit_Constant(self, node):
        call = ast.Call(ast.Name("literal", ast.Load()), [node], [])
        return ast.copy_location(call, node)


compiled = {}


def code_of(expression):
    if expression not in compiled:
        # scaling by 2^(k >> 7) is exact or the last step of all: the proofs treat it apart
        python = expression.replace(" as number", "").replace("k >> 7", "0")
        tree = Literals().visit(ast.parse(python.strip(), mode="eval"))
        compiled[expression] = compile(ast.fix_missing_locations(tree), expression, "eval")
    return compiled[expression]


def run(file, function, literal, names, given, adjust=None):
    """Runs a function line by line.

    names: values of its arguments and of what it imports; given: whole lines that are not run, with the value
    of the name they define, or None; adjust: for a name, what is done to its value once it is computed.
    Returns all the names, the returned value under "return".
    """
    names = {**names, "literal": literal}
    unused = set(given)
    for line in lines_of(file, function):
        if line in given:
            unused.discard(line)
            name = re.match(r"const (\w+) = ", line)
            if name:
                names[name.group(1)] = given[line]
            continue
        found = re.match(r"(?:const (\w+) =|(\w+)\[(\d)\] =|(return)) (.*)$", line)
        assert found, f"{file}: {function}: not accounted for: {line}"
        constant, array, index, returned, expression = found.groups()
        value = eval(code_of(expression), {"__builtins__": {}}, names)
        name = constant or returned or f"{array}{index}"
        if adjust and name in adjust:
            value = adjust[name](value)
        if array:
            names[array][int(index)] = value
        else:
            names[name] = value
    assert not unused, f"{file}: {function}: no longer there: {unused}"
    return names


def run_exactly(file, function, names, given):
    """Runs a function without any rounding, on numbers of 120 digits."""
    nothing = lambda *_: mp.mpf(0)
    helpers = dict.fromkeys(("sumError", "anySumError", "productError"), nothing)
    helpers["scale"] = lambda x, exponent: x
    return run(file, function, mp.mpf, {**helpers, **names}, given)


def check_near(found, wanted, tolerance, what):
    """The formula means what it should: the proof bounds only what rounding adds to it."""
    assert abs(found - wanted) <= mp.mpf(2) ** tolerance * abs(wanted), f"{what}: {found} is not {wanted}"
