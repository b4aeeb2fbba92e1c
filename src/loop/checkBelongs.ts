// Whether a state is an equilibrium of a loop.

import { fail } from "../ground/errors.ts";
import type { Range } from "../ground/range.ts";
import { checkedNumber, showRange } from "../ground/range.ts";
import { enclosureKernel } from "../reading/enclosureKernel.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { rangeAt } from "../search/interval.ts";
import { inputsOf, rangesOf } from "./inputs.ts";
import { kept } from "./kept.ts";
import type { Couplings, Givens, Loop, Variables } from "./types.ts";

/** What must be known of a state to take it up again: a `State` is one, also after `JSON.parse`. */
export interface StateLike<N extends string = string> {
  readonly variables: {
    readonly [K in Variables<N>]: { readonly value: number; readonly bracket: readonly [number, number] };
  };
  readonly givens: { readonly [K in Givens<N>]: number };
  readonly couplings: { readonly [K in Couplings<N>]: number };
}

/** A state as numbers in the order of the loop's inputs: variables, then givens. */
export interface Taken {
  readonly values: Float64Array;
  readonly low: Float64Array;
  readonly high: Float64Array;
}

/** How far from its value a state may be looked for, relative to it: more than any search leaves open, and no climate's worth. */
const CLOSE = 1e-6;
/** Sizes of the balance that are rounding, relative to the sum of all flows. */
const ROUNDING = 1e-12;

/**
 * Checks a state against a loop and returns its numbers. Throws `unreadable`, `missing`, `not-a-number`, `out-of-range`, and
 * `foreign-state` where names differ or where the balance over the state's bracket, close to its value and widened by rounding, excludes zero.
 */
export function checkBelongs<N extends string>(loop: Loop<N>, state: StateLike<N>, path: string): Taken {
  const { variables, givens, couplings } = loop;
  const parts = ["variables", "givens", "couplings"] as const;
  for (const part of parts) {
    const record = (state as Partial<StateLike> | null | undefined)?.[part];
    const names = loop[part].map((r) => r.name);
    if (typeof record !== "object" || record === null)
      fail("unreadable", { path: `${path}.${part}`, value: record, allowed: "as in a state that was found" });
    const found = Object.keys(record);
    if (found.length !== names.length || !names.every((name) => Object.hasOwn(record, name)))
      fail("foreign-state", {
        path: `${path}.${part}`,
        value: found.join(),
        allowed: `a state of this loop, with ${names.join() || "none"}`,
      });
  }
  const valuesOf = state as unknown as StateLike<string>;
  for (const { name } of couplings)
    checkedNumber(valuesOf.couplings[name], `${path}.couplings.${name}`, "in its own unit");
  const settings = givens.map(({ name, unit, within }) =>
    checkedNumber(valuesOf.givens[name], `${path}.givens.${name}`, unit, within),
  );
  const places = variables.map(({ name, unit, within }) =>
    placeOf(valuesOf.variables[name], `${path}.variables.${name}`, unit, within),
  );
  const taken = {
    values: Float64Array.of(...places.map((p) => p.value), ...settings),
    low: Float64Array.of(...places.map((p) => p.bracket[0]), ...settings),
    high: Float64Array.of(...places.map((p) => p.bracket[1]), ...settings),
  };
  const outside = balancesOf(loop)(closeTo(taken)).find(([low, high]) => low > 0 || high < 0);
  if (outside)
    fail("foreign-state", {
      path,
      value: `a balance of ${outside.map((x) => x.toPrecision(6)).join(" to ")} W m-2`,
      allowed: "an equilibrium of this loop at the state's givens",
    });
  return taken;
}

/** The part of a bracket that is close to its value: one as wide as a climate would hold a zero for any temperature. */
function closeTo({ values, low, high }: Taken): Taken {
  const reach = values.map((value) => CLOSE * Math.max(1, Math.abs(value)));
  return {
    values,
    low: low.map((end, i) => Math.max(end, (values[i] as number) - (reach[i] as number))),
    high: high.map((end, i) => Math.min(end, (values[i] as number) + (reach[i] as number))),
  };
}

function placeOf(place: unknown, path: string, unit: string, within: Range) {
  const { value, bracket } = Object(place) as { value?: unknown; bracket?: unknown };
  const at = checkedNumber(value, `${path}.value`, unit, within);
  const [low, high] = (Array.isArray(bracket) ? bracket : []) as readonly unknown[];
  const ends: Range = [checkedNumber(low, `${path}.bracket[0]`, unit, within), 0];
  const top = checkedNumber(high, `${path}.bracket[1]`, unit, within);
  if (!(ends[0] <= at && at <= top))
    fail("out-of-range", { path: `${path}.value`, value: at, allowed: showRange([ends[0], top]), unit });
  return { value: at, bracket: [ends[0], top] as const };
}

type Balances = (at: Taken) => readonly Range[];

/** Bounds of every rate of a loop over the bracket of a state; for a sampled loop, the values at its ends. */
const balancesOf = /* @__PURE__ */ kept<Balances>((loop) =>
  loop.sampled ? sampledBalances(loop) : enclosedBalances(loop),
);

function enclosedBalances(loop: Loop): Balances {
  const { graph, variables, givens, flows } = loop;
  const inputs = [...variables, ...givens].map((v) => v.node);
  const outputs = [...variables.map((v) => v.rate), ...flows.map((f) => f.node)];
  const wide = new Set(variables.map((v) => v.node));
  const kernel = enclosureKernel(graph, { inputs, outputs, wide, ranges: rangesOf(loop) });
  const out = new Float64Array(3 * outputs.length);
  return ({ low, high }) => {
    kernel(low, high, out);
    const bounds = outputs.map((_, i) => rangeAt(out, i));
    return widened(bounds, variables.length);
  };
}

function sampledBalances(loop: Loop): Balances {
  const { graph, variables, flows } = loop;
  const outputs = [...variables.map((v) => v.rate), ...flows.map((f) => f.node)];
  const kernel = valueKernel(graph, { inputs: inputsOf(loop), outputs });
  const [a, b] = [new Float64Array(outputs.length), new Float64Array(outputs.length)];
  return ({ low, high }) => {
    kernel(low, a);
    kernel(high, b);
    const bounds = outputs.map((_, i): Range => {
      const [x, y] = [a[i] as number, b[i] as number];
      return [Math.min(x, y), Math.max(x, y)];
    });
    return widened(bounds, variables.length);
  };
}

/** The bounds of the rates, that of temperature widened by the rounding of the flows that follow. */
function widened(bounds: readonly Range[], rates: number): Range[] {
  const size = bounds.slice(rates).reduce((sum, b) => sum + Math.max(Math.abs(b[0]), Math.abs(b[1])), 0);
  return bounds
    .slice(0, rates)
    .map(
      ([low, high], i): Range => (i === 0 ? [low - ROUNDING * size, high + ROUNDING * size] : [low, high]),
    );
}
