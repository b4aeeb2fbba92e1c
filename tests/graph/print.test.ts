// How formulas look on paper, letter by letter.
import { describe, expect, test } from "vitest";
import { add, defineLaw, div, exp, fourth, mul, neg, square, sub, type Value } from "../../src/index.ts";
import { lawFormula, texSymbol, wireName } from "../../src/law/lawFormula.ts";

type Ports = Record<"x" | "y", Value>;

/** The formula of a law of two ports, as text and in TeX. */
function printed(write: (ports: Ports) => Value): readonly [string, string] {
  const law = defineLaw({
    name: "some",
    output: { symbol: "f", unit: "1" },
    inputs: { x: { symbol: "x_0", unit: "1" }, y: { symbol: "y_eff", unit: "1" } },
    write: write as never,
  });
  return [lawFormula(law, { notation: "text" }), lawFormula(law, { notation: "tex" })];
}

describe("parentheses and powers", () => {
  test.each<[string, string, (ports: Ports) => Value]>([
    ["x - (y - x)", "x_{0} - \\left(y_{\\mathrm{eff}} - x_{0}\\right)", ({ x, y }) => sub(x, sub(y, x))],
    ["x + x - y", "x_{0} + x_{0} - y_{\\mathrm{eff}}", ({ x, y }) => add(sub(x, y), x)],
    ["x - (-2)", "x_{0} - \\left(-2\\right)", ({ x }) => sub(x, -2)],
    ["-(x * y)", "-\\left(x_{0} \\, y_{\\mathrm{eff}}\\right)", ({ x, y }) => neg(mul(x, y))],
    ["x / (y / x)", "\\frac{x_{0}}{\\frac{y_{\\mathrm{eff}}}{x_{0}}}", ({ x, y }) => div(x, div(y, x))],
    ["(x + y)^8", "\\left(x_{0} + y_{\\mathrm{eff}}\\right)^{8}", ({ x, y }) => square(fourth(add(x, y)))],
    ["x / 1e-7", "\\frac{x_{0}}{1\\times 10^{-7}}", ({ x }) => div(x, 1e-7)],
    ["x * 1e-7", "x_{0} \\, \\left(1\\times 10^{-7}\\right)", ({ x }) => mul(1e-7, x)],
  ])("%s", (text, tex, write) => {
    expect(printed(write)).toEqual([text, tex]);
  });
});

test("shared parts of a long formula are named first, small ones and those of a short formula are written out", () => {
  const shared = ({ x, y }: Ports) => exp(mul(add(x, y), sub(x, y)));
  const twice = (write: (ports: Ports) => Value) => (ports: Ports) => mul(write(ports), add(write(ports), 1));
  expect(printed(twice(shared))[0]).toBe("exp((x + y) * (x - y)) * (exp((x + y) * (x - y)) + 1)");
  const [text, tex] = printed(twice(twice(twice(shared))));
  expect(text.split("\n")).toEqual([
    "s1 = exp((x + y) * (x - y))",
    "s2 = s1 * (s1 + 1)",
    "s3 = s2 * (1 + s2)",
    "s3 * (1 + s3)",
  ]);
  expect(tex.split(" \\\\ ")).toHaveLength(4);
  // x + y has three nodes, which is less than is named
  const [small] = printed(twice(twice(twice(twice(({ x, y }) => add(x, y))))));
  expect(small.split("\n")[0]).toBe("s1 = (x + y) * (x + y + 1)");
});

test("indices of several letters stand upright, rows of lists are counted from 1", () => {
  expect(["T", "T_s", "T_eff", "τ_0"].map(texSymbol)).toEqual([
    "T",
    "T_{s}",
    "T_{\\mathrm{eff}}",
    "\\tau_{0}",
  ]);
  const port = { symbol: "α_b", unit: "1" };
  expect(wireName("covers[0].albedo", port, "text")).toBe("albedo_1");
  expect(wireName("covers[1].albedo", port, "tex")).toBe("\\alpha_{2}");
  expect(wireName("bare", port, "tex")).toBe("\\alpha_{b}");
});
