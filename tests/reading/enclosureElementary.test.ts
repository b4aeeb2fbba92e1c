// Enclosures of exp, log and tanh against values from elsewhere.
import { describe, expect, test } from "vitest";
import { add, exp, log, sub, tanh } from "../../src/graph/operations.ts";
import * as big from "./bigNumber.ts";
import { ELEMENTARY_TABLE } from "./elementaryTable.ts";
import { holds, isKnown } from "./enclosing.ts";
import { enclosed } from "./recorded.ts";

const OPERATIONS = { exp, log, tanh };
const EXACT = { exp: big.exp, log: big.log, tanh: big.tanh };

describe.each(["exp", "log", "tanh"] as const)("%s", (name) => {
  const read = enclosed((x) => OPERATIONS[name](x));
  const rows = ELEMENTARY_TABLE[name].map(([x, text]) => ({ x, truth: big.fromDecimal(text) }));

  test.each(rows)("holds the tabulated value at $x", ({ x, truth }) => {
    const [bounds] = read({ x });
    expect(isKnown(bounds)).toBe(true);
    expect(holds(bounds, truth)).toBe(true);
    // at most an ulp and a little: 2^-52 is 2.22e-16
    expect(bounds[2]).toBeLessThanOrEqual(2.6e-16 * Math.abs(bounds[0]) + 1.1e-300);
  });

  test("would miss some of them without the error", () => {
    expect(
      rows.filter(({ x, truth }) => !holds([read({ x })[0][0], read({ x })[0][0], 0], truth)).length,
    ).toBeGreaterThan(5);
  });

  test("holds all of them that a box holds", () => {
    for (let i = 0; i + 3 < rows.length; i++) {
      const part = rows.slice(i, i + 4);
      const [bounds] = read({ x: [part[0]?.x as number, part[3]?.x as number] });
      expect(part.filter(({ truth }) => !holds(bounds, truth))).toEqual([]);
    }
  });

  test("the whole-number arithmetic of these tests gives the same values to 40 digits", () => {
    for (const { x, truth } of rows) {
      const difference = big.sub(EXACT[name](big.fromDouble(x)) as big.Real, truth);
      const size = { m: difference.m < 0n ? -difference.m : difference.m, e: difference.e };
      const allowed = big.mul(big.fromDecimal("1e-40"), { m: truth.m < 0n ? -truth.m : truth.m, e: truth.e });
      expect(big.less(allowed, size), `at ${x}`).toBe(false);
    }
  });

  test("passes on the error of its argument", () => {
    // y + z − y is z, but the kernel must count the rounding of the sum
    const of = enclosed((_x, y, z) => OPERATIONS[name](sub(add(y, z), y)));
    for (const [y, z] of [
      [1e6, 0.3],
      [3e12, 1.7],
      [7, 0.001],
      // the sum is rounded by 0.499 of a unit in its last place, close to the most that there is: half the bound would not do
      [2 ** 41, 614.499 * 2 ** -11],
    ] as const) {
      const [bounds] = of({ y, z });
      expect(isKnown(bounds)).toBe(true);
      expect(holds(bounds, EXACT[name](big.fromDouble(z)) as big.Real)).toBe(true);
      expect(holds(bounds, EXACT[name](big.fromDouble(z)) as big.Real, 0)).toBe(false);
    }
  });
});
