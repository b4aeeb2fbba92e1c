// Random loops with four couplings that act on each other.
import fc from "fast-check";
import {
  add,
  closeLoop,
  defineLaw,
  div,
  exp,
  findStates,
  inUnit,
  type Loop,
  mul,
  type State,
  sub,
  type Value,
} from "../../src/index.ts";

export const NAMES = ["a", "b", "c", "d"] as const;
export type Name = (typeof NAMES)[number];
export type Names = "given push" | `coupling ${Name}`;
export type Plain = Loop<Names>;

/** Strengths: how each coupling answers to temperature, to those before it, and how it acts on the budget. */
const strength = fc.double({ min: -0.3, max: 0.3, noNaN: true });
export const plans = fc.record({
  own: fc.array(strength, { minLength: 4, maxLength: 4 }),
  between: fc.array(strength, { minLength: 6, maxLength: 6 }),
  acts: fc.array(strength, { minLength: 4, maxLength: 4 }),
});
export type Plan = typeof plans extends fc.Arbitrary<infer P> ? P : never;

const product = defineLaw({
  name: "product",
  output: { symbol: "y", unit: "1" },
  inputs: { warmth: { symbol: "x", unit: "1" }, factor: { symbol: "k", unit: "1" } },
  write: ({ warmth, factor }) => mul(factor, add(warmth, mul(0.1, mul(warmth, warmth)))),
});

/** How a budget may be written without being another budget. */
interface Writing {
  readonly laws?: boolean;
  readonly helpers?: boolean;
  readonly couple?: readonly Name[];
  readonly rename?: (name: Name) => string;
}

/** Four couplings, each acting on all that follow and on the budget: 15 feedback loops when all are cut. */
export function planLoop(plan: Plan, writing: Writing = {}): Plain {
  const { laws = false, helpers = false, couple: chosen = NAMES, rename = (name) => name } = writing;
  return closeLoop(({ temperature, given, couple }) => {
    const push = given("push", 0, "W m-2", { within: [-100, 100] });
    const warmth = div(inUnit(sub(temperature, 288), "1"), 10);
    const answer = (x: Value, factor: number): Value => {
      if (laws) return product({ warmth: x, factor }) as Value;
      const bent = add(x, mul(0.1, mul(x, x))) as Value;
      return helpers ? (inUnit(mul(factor, inUnit(bent, "1")), "1") as Value) : (mul(factor, bent) as Value);
    };
    const made: Value[] = [];
    let k = 0;
    for (const [i, name] of NAMES.entries()) {
      let value = answer(warmth, plan.own[i] as number);
      for (const before of made) value = add(value, answer(before, plan.between[k++] as number)) as Value;
      made.push(chosen.includes(name) ? couple(rename(name), value) : value);
    }
    const acting = made.map((m, i) =>
      inUnit(mul(mul(10, plan.acts[i] as number), exp(mul(0.1, m))), "W m-2"),
    );
    const heating = Object.fromEntries(acting.map((flow, i) => [`h${i}`, flow]));
    const emission = inUnit(mul(0.9, sub(temperature, 288)), "W m-2");
    const offset = plan.acts.reduce((sum, x) => sum + 10 * x, 0);
    return {
      heating: { push, ...heating },
      cooling: { longwave: emission, offset },
      heatCapacity: 1e8,
      report: helpers ? { warmth: mul(warmth, 3) } : {},
    } as never;
  }) as never;
}

export const stateOf = (loop: Plain) => findStates(loop, { within: [287, 289] }).states[0] as State<Names>;
