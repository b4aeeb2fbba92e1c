// The recordable operations: numbers are folded at once, quantities are recorded. Both give the same bits.
// On plain numbers they are IEEE arithmetic and check nothing: a law checks what goes into it and what comes out.
// All throw `not-a-quantity` for what is neither a number nor a quantity, `other-loop` for quantities of two loops, and
// `unit-mismatch` where units are told and do not fit. They hold for all numbers, and have no source but arithmetic.
import { exp as expOf } from "../ground/elementary/exp.ts";
import { log as logOf } from "../ground/elementary/log.ts";
import { max as maxOf, min as minOf } from "../ground/elementary/minMax.ts";
import { step as stepOf } from "../ground/elementary/step.ts";
import { tanh as tanhOf } from "../ground/elementary/tanh.ts";
import { fail } from "../ground/errors.ts";
import type { Op } from "./op.ts";
import { type Of, Quantity, type Value } from "./quantity.ts";

const NUMBER_OR_QUANTITY = "a number or a quantity";

type One = <N extends string = never>(a: Value<N>) => Of<N>;
type Two = <N extends string = never>(a: Value<N>, b: Value<N>) => Of<N>;
type Many = <N extends string = never>(...terms: readonly Value<N>[]) => Of<N>;

function record(op: Op, values: readonly unknown[]): Quantity {
  const quantity = values.find((v) => v instanceof Quantity);
  if (quantity) return quantity.graph.record(op, values);
  return fail("not-a-quantity", {
    path: op,
    value: values.find((v) => typeof v !== "number"),
    allowed: NUMBER_OR_QUANTITY,
  });
}
const one = (op: Op, fold: (a: number) => number): One =>
  ((a: unknown) => (typeof a === "number" ? fold(a) : record(op, [a]))) as unknown as One;
const two = (op: Op, fold: (a: number, b: number) => number): Two =>
  ((a: unknown, b: unknown) =>
    typeof a === "number" && typeof b === "number" ? fold(a, b) : record(op, [a, b])) as unknown as Two;

/** a + b. */
export const add: Two = /* @__PURE__ */ two("add", (a, b) => a + b);
/** a − b. */
export const sub: Two = /* @__PURE__ */ two("sub", (a, b) => a - b);
/** a · b. */
export const mul: Two = /* @__PURE__ */ two("mul", (a, b) => a * b);
/** a / b. Of plain numbers as IEEE has it: ±infinity or NaN where b is 0; only a law refuses what is not finite. */
export const div: Two = /* @__PURE__ */ two("div", (a, b) => a / b);
/** The smaller of two; a kink where they cross. */
export const min: Two = /* @__PURE__ */ two("min", minOf);
/** The larger of two; a kink where they cross. */
export const max: Two = /* @__PURE__ */ two("max", maxOf);
/**
 * 0 where a is below zero, 1 at zero and above: a leap. Its slope is 0 on both sides and none at the leap; no state is ever found
 * there, a search says that the balance leaps through zero (`jump`).
 */
export const step: One = /* @__PURE__ */ one("step", stepOf);
/** −a. */
export const neg: One = /* @__PURE__ */ one("neg", (a) => -a);
/** Square root. Of a plain number below 0 it is NaN; only a law refuses what is not finite. */
export const sqrt: One = /* @__PURE__ */ one("sqrt", Math.sqrt);
/** Natural exponential of a pure number. Of a plain number above 709.78 it is infinite; only a law refuses that. */
export const exp: One = /* @__PURE__ */ one("exp", expOf);
/** Natural logarithm of a pure number. Of a plain 0 it is −infinity, below 0 NaN; only a law refuses what is not finite. */
export const log: One = /* @__PURE__ */ one("log", logOf);
/** Hyperbolic tangent of a pure number. */
export const tanh: One = /* @__PURE__ */ one("tanh", tanhOf);
/** a². */
export const square: One = (a) => mul(a, a);
/** a⁴ as (a²)²; never a power function, whose bits differ between engines. */
export const fourth: One = (a) => square(square(a) as typeof a) as never;
/** Sum from left to right (the order is part of the result's bits). Throws `missing` without terms. */
export const sum: Many = (...terms) => chain("sum", add, terms) as never;
/** Product from left to right. Throws `missing` without factors. */
export const product: Many = (...factors) => chain("product", mul, factors) as never;
/** a where `share` is 0, b where it is 1, in proportion between: a + (b − a)·share. */
export const mix = <N extends string = never>(a: Value<N>, b: Value<N>, share: Value<N>): Of<N> =>
  add(a, mul(sub(b, a), share) as Value<N>) as Of<N>;

function chain(name: string, op: Two, terms: readonly Value[]): Value {
  if (terms.length === 0)
    return fail("missing", { path: name, value: "no terms", allowed: "at least one term" });
  return terms.slice(1).reduce((total, term) => op(total, term), checkedTerm(name, terms[0] as Value));
}
function checkedTerm(name: string, term: Value): Value {
  if (typeof term === "number" || term instanceof Quantity) return term;
  return fail("not-a-quantity", { path: name, value: term, allowed: NUMBER_OR_QUANTITY });
}

/** States the unit of a value where it cannot be told, as for a number times an empirical factor. Does not convert. */
export const inUnit = <N extends string = never>(value: Value<N>, unit: string): Of<N> =>
  (value instanceof Quantity ? value.graph.unitNode(value, unit) : checkedTerm("inUnit", value)) as Of<N>;
