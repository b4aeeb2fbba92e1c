// Table ii: every equilibrium with a ramp albedo and a straight-line emission.
import { describe, expect, test } from "vitest";
import { rampAlbedo } from "../../src/albedo/rampAlbedo.ts";
import { linearEmission } from "../../src/greenhouse/linearEmission.ts";
import { slopesOf } from "../../src/law/slopesOf.ts";
import { closeLoop } from "../../src/loop/closeLoop.ts";
import { absorbedFlux } from "../../src/star/absorbedFlux.ts";
import { findStates } from "../../src/states/findStates.ts";
import type { State } from "../../src/states/state.ts";
import table from "../reference/computed/ii_ramp_linear.json" with { type: "json" };
import { expectRow, expectState, type Reading } from "./compareState.ts";
import { nearest, numbers, of, type ReferenceCase, type ReferenceRow } from "./table.ts";

const cases = table.cases as unknown as ReferenceCase<
  "A" | "B" | "T_ice" | "T_free" | "alpha_ice" | "alpha_free"
>[];

/**
 * Rows that no search in doubles can decide, with the stretch that stays open: 4000/3, 550/3 and 8800/7 are not doubles,
 * and a corner is touched, not crossed.
 */
const UNDECIDABLE = [
  { id: "ii-d2-continuum", S: "4000/3", kind: "flat", from: -20, to: 20 },
  { id: "ii-e-corner-roots", S: "1800", kind: "corner", from: -10, to: -10 },
  { id: "ii-e-corner-roots", S: "8800/7", kind: "corner", from: 10, to: 10 },
] as const;
/** Temperatures searched, K: below every state of the table and above. */
const WITHIN = [120, 460] as const;

/** A case of the table: its loop, and how our states are read. */
function prepared({ inputs, unit }: (typeof cases)[number]) {
  // the zero of the Celsius cases is put at 273 K, an integer, so that no temperature is rounded by the shift
  const zero = unit === "K" ? 0 : 273;
  const p = numbers(inputs);
  const albedo = {
    cold: p.alpha_ice,
    warm: p.alpha_free,
    frozenBelow: p.T_ice + zero,
    openAbove: p.T_free + zero,
  };
  const emission = { intercept: p.A, slope: p.B, reference: zero };
  const loop = closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    return {
      heating: {
        sunlight: absorbedFlux({ flux, albedo: couple("albedo", rampAlbedo({ temperature, ...albedo })) }),
      },
      cooling: { longwave: linearEmission({ temperature, ...emission }) },
      heatCapacity: 4e8,
    };
  });
  const read = ({ temperature, givens, ledger }: State): Reading => ({
    size: ledger.flows.reduce((sum, flow) => sum + Math.abs(flow.value), 2 * Math.abs(p.A)),
    parts: {
      outgoing: -of(slopesOf(linearEmission, { temperature, ...emission }).slopes, "temperature"),
      albedo:
        (-of(givens, "flux") / 4) *
        of(slopesOf(rampAlbedo, { temperature, ...albedo }).slopes, "temperature"),
    },
    reference: "outgoing",
  });
  const search = (S: string) => findStates(loop, { within: WITHIN, at: { flux: nearest(S) } });
  return { zero, read, search };
}

describe.each(cases)("$id", (reference) => {
  const { zero, read, search } = prepared(reference);
  const decidable = reference.rows.filter(
    ({ S }) => !UNDECIDABLE.some((row) => row.id === reference.id && row.S === S),
  );
  test.each(decidable)("S = $S", (row) => {
    expectRow(search(row.S) as never, row, zero, read);
  });
});

test.each(UNDECIDABLE)("$id at S = $S is undecided, and said to be", ({ id, S, kind, from, to }) => {
  const reference = cases.find((c) => c.id === id) as (typeof cases)[number];
  const { zero, read, search } = prepared(reference);
  const { proof, complete, undecided, states } = search(S);
  const row = reference.rows.find((r) => r.S === S) as ReferenceRow;
  const decided = row.states.filter((state) => state.onCorner === false);

  expect({ proof, complete }).toEqual({ proof: "partial", complete: false });
  expect(undecided.map((entry) => entry.kind)).toEqual([kind]);
  const { interval, enclosure, distances } = undecided[0] as (typeof undecided)[number];
  // no wider than rounding of a balance of some 500 W m⁻² over a slope of 2 W m⁻² K⁻¹ asks for
  const close = 1e-10;
  expect(interval[0]).toBeLessThanOrEqual(from + zero);
  expect(interval[0]).toBeGreaterThan(from + zero - close);
  expect(interval[1]).toBeGreaterThanOrEqual(to + zero);
  expect(interval[1]).toBeLessThan(to + zero + close);
  expect(enclosure?.[0]).toBeLessThanOrEqual(0);
  expect(enclosure?.[1]).toBeGreaterThanOrEqual(0);
  if (kind === "corner") {
    // the flux of the table lies on the fold: rounding apart, nothing has to change
    const [less, more] = distances?.flux ?? [Number.NaN, Number.NaN];
    expect(less).toBeLessThanOrEqual(0);
    expect(more).toBeGreaterThanOrEqual(0);
    expect(more - less).toBeLessThan(1e-9);
  }
  expect(states).toHaveLength(decided.length);
  decided.forEach((state, i) => {
    expectState(states[i] as State, state, zero, read);
  });
});

test("the table has every row", () => {
  expect(cases.map((c) => c.rows.length)).toEqual([18, 18, 18, 4, 3, 4]);
  expect(cases.flatMap((c) => c.rows.flatMap((row) => row.states))).toHaveLength(125);
});
