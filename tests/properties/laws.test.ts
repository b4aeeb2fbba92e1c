// What holds for every exported law: finite values, slopes, and the formula on paper.
import fc from "fast-check";
import { evaluate } from "mathjs";
import { describe, expect, test } from "vitest";
import { ThermosteadError } from "../../src/ground/errors.ts";
import { lawFormula, wireName } from "../../src/law/lawFormula.ts";
import { slopesOf } from "../../src/law/slopesOf.ts";
import type { Law } from "../../src/law/types.ts";
import {
  type AnyLaw,
  allowedInputs,
  type Inputs,
  JOINED,
  laws,
  portOf,
  ROWS,
  usualInputs,
  wiresOf,
  withWire,
} from "./laws.ts";
import { settings } from "./settings.ts";

/** Of the argument; small against every width that a law has, large against rounding. */
const STEP = 2e-4;

/** A slope by differences of fourth order; nothing at the end of a range, or where left and right disagree: at a kink. */
function difference(law: AnyLaw, inputs: Inputs, path: string): number | undefined {
  const x = wiresOf(inputs)[path] as number;
  const h = STEP * Math.abs(x);
  const { within = [-Number.MAX_VALUE, Number.MAX_VALUE] } = portOf(law, path);
  if (!(x - 2 * h >= within[0] && x + 2 * h <= within[1])) return undefined;
  const at = (steps: number) => law(withWire(inputs, path, x + steps * h));
  const [a, b, c, d, e] = [at(-2), at(-1), at(0), at(1), at(2)];
  const noise = 1e-13 * Math.max(...[a, b, c, d, e].map(Math.abs));
  const left = (3 * c - 4 * b + a) / (2 * h);
  const right = (4 * d - 3 * c - e) / (2 * h);
  if (Math.abs(left - right) > 1e-2 * Math.max(Math.abs(left), Math.abs(right)) + noise / h) return undefined;
  return (a - 8 * b + 8 * d - e) / (12 * h);
}

/** The value of a printed formula; one of several lines names its steps first. */
function evaluated(formula: string, scope: Record<string, number>): number {
  const result = evaluate(formula, { ...scope }) as number | { entries: unknown[] };
  return typeof result === "number" ? result : (result.entries.at(-1) as number);
}

const textNames = (inputs: Inputs) =>
  Object.fromEntries(
    Object.entries(wiresOf(inputs)).map(([path, value]) => [
      wireName(path, { symbol: "", unit: "1" }, "text"),
      value,
    ]),
  );

test("there are laws to test", () => {
  expect(laws.map((law) => law.card.name)).toContain("mixAlbedo");
  expect(laws.length).toBeGreaterThan(15);
});

describe.each(laws.map((law) => [law.card.name, law] as const))("%s", (_, law) => {
  test("gives a number in the range of its output wherever its ports allow, or says which condition is not met", () => {
    const { within = [-Number.MAX_VALUE, Number.MAX_VALUE] } = law.card.output;
    fc.assert(
      fc.property(allowedInputs(law), (inputs) => {
        try {
          const value = law(inputs);
          expect(value).toBeGreaterThanOrEqual(within[0]);
          expect(value).toBeLessThanOrEqual(within[1]);
        } catch (error) {
          if (!(error instanceof ThermosteadError)) throw error;
          expect(error.code).toBe("out-of-range");
          expect(JOINED).toContain(law.card.name);
        }
      }),
      settings(300),
    );
  });

  test("has the slopes that differences show", () => {
    let compared = 0;
    let kinks = 0;
    fc.assert(
      fc.property(usualInputs(law), (inputs) => {
        const { value, slopes } = slopesOf(law as unknown as Law, inputs as never);
        expect(value).toBe(law(inputs));
        for (const [path, slope] of Object.entries(slopes)) {
          const shown = difference(law, inputs, path);
          if (shown === undefined) {
            kinks++;
            continue;
          }
          compared++;
          const x = Math.abs(wiresOf(inputs)[path] as number);
          // truncation of the differences, and rounding of the law over the step
          const tolerance = 1e-6 * Math.abs(slope) + (1e-14 * Math.abs(value)) / (STEP * x);
          expect(Math.abs(slope - shown), path).toBeLessThanOrEqual(tolerance);
        }
      }),
      settings(100),
    );
    expect(compared).toBeGreaterThan(20 * kinks);
  });

  test("is printed as a formula that evaluates to its value", () => {
    const formula = lawFormula(law as unknown as Law, { notation: "text", rows: ROWS });
    fc.assert(
      fc.property(usualInputs(law), (inputs) => {
        const ours = law(inputs);
        const printed = evaluated(formula, textNames(inputs));
        // the reader of the formula has its own exp, log, tanh and powers
        expect(Math.abs(printed - ours)).toBeLessThanOrEqual(1e-13 * Math.abs(ours));
      }),
      settings(50),
    );
  });
});
