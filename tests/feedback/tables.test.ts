// λ and its parts, feedback factors and dT/dS of tables i, ii and iii, and the folds at which their branches end.
import { describe, expect, test } from "vitest";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import { compareHeld } from "../../src/feedback/compareHeld.ts";
import {
  absorbedFlux,
  closeLoop,
  findStates,
  greyColumnEmission,
  greyEmission,
  type Loop,
  linearEmission,
  rampAlbedo,
  STEFAN_BOLTZMANN,
  type State,
  tanhAlbedo,
} from "../../src/index.ts";
import ice from "../reference/computed/i_tanh_albedo.json" with { type: "json" };
import ramps from "../reference/computed/ii_ramp_linear.json" with { type: "json" };
import vapour from "../reference/computed/iii_water_vapour.json" with { type: "json" };
import { tolerancesOf } from "../tables/compareState.ts";
import { nearest, type ReferenceCase, type ReferenceState } from "../tables/table.ts";
import { vapourDepth } from "../tables/vapourDepth.ts";

type Names = "given flux" | "coupling albedo" | "coupling opticalDepth";
type Case = ReferenceCase<string> & { readonly folds: readonly { readonly T: string; readonly S: string }[] };
interface Table {
  readonly title: string;
  readonly cases: readonly Case[];
  readonly loopOf: (p: Readonly<Record<string, number>>, zero: number) => Loop<Names>;
  /** Our name of each part of λ in the table. */
  readonly parts: Readonly<Record<string, string>>;
  readonly kind: string;
  readonly reason: RegExp;
}

const smoothAlbedo = (p: Readonly<Record<string, number>>) => ({
  cold: (p.alpha_mid as number) + (p.alpha_half_range as number),
  warm: (p.alpha_mid as number) - (p.alpha_half_range as number),
  midpoint: p.T0 as number,
  width: p.width as number,
});
const FLUX = ["flux", 1361, "W m-2", { within: [0, 1e5] }] as const;

const tables: readonly Table[] = [
  {
    title: "i",
    cases: ice.cases as never,
    parts: { planck: "reference", albedo: "albedo" },
    kind: "Planck response",
    reason: /^the fourth power of temperature in longwave/,
    loopOf: (p) =>
      closeLoop(({ temperature, given, couple }) => {
        const albedo = couple("albedo", tanhAlbedo({ temperature, ...smoothAlbedo(p) }));
        const emissivity = (p.epsilon as number) * ((p.sigma as number) / STEFAN_BOLTZMANN);
        return {
          heating: { sunlight: absorbedFlux({ flux: given(...FLUX), albedo }) },
          cooling: { longwave: greyEmission({ temperature, emissivity }) },
          heatCapacity: 4e8,
        };
      }) as never,
  },
  {
    title: "ii",
    cases: ramps.cases as never,
    parts: { outgoing: "reference", albedo: "albedo" },
    kind: "reference response",
    reason: /^not a Planck response: a straight line in temperature \(longwave\) already holds/,
    loopOf: (p, zero) =>
      closeLoop(({ temperature, given, couple }) => {
        const ramp = {
          cold: p.alpha_ice as number,
          warm: p.alpha_free as number,
          frozenBelow: (p.T_ice as number) + zero,
          openAbove: (p.T_free as number) + zero,
        };
        const albedo = couple("albedo", rampAlbedo({ temperature, ...ramp }));
        const straight = { intercept: p.A as number, slope: p.B as number, reference: zero };
        return {
          heating: { sunlight: absorbedFlux({ flux: given(...FLUX), albedo }) },
          cooling: { longwave: linearEmission({ temperature, ...straight }) },
          heatCapacity: 4e8,
        };
      }) as never,
  },
  {
    title: "iii",
    cases: vapour.cases as never,
    parts: { planck: "reference", albedo: "albedo", water_vapour: "opticalDepth" },
    kind: "Planck response",
    reason: /^the fourth power of temperature in longwave/,
    loopOf: (p) =>
      closeLoop(({ temperature, given, couple }) => {
        const albedo = couple("albedo", tanhAlbedo({ temperature, ...smoothAlbedo(p) }));
        const depth = vapourDepth({
          temperature,
          dry: p.tau_c as number,
          wet: p.tau_w as number,
          latent: p.L_over_Rv as number,
          reference: p.T_ref as number,
        });
        const opticalDepth = couple("opticalDepth", depth);
        return {
          heating: { sunlight: absorbedFlux({ flux: given(...FLUX), albedo }) },
          cooling: { longwave: greyColumnEmission({ temperature, opticalDepth }) },
          heatCapacity: 4e8,
        };
      }) as never,
  },
];

const within = [120, 700] as const;

describe.each(tables)("table $title", ({ cases, loopOf, parts, kind, reason }) => {
  let compared = 0;
  test.each(cases)("$id", ({ inputs, unit, rows }) => {
    const zero = unit === "degC" ? 273 : 0;
    const p = Object.fromEntries(Object.entries(inputs).map(([name, text]) => [name, nearest(text)]));
    const loop = loopOf(p, zero);
    for (const { S, states } of rows) {
      const found = findStates(loop, { within, at: { flux: nearest(S) } });
      for (const reference of states ?? []) {
        // a continuum has no single temperature
        if (reference.T === undefined) continue;
        const T = nearest(reference.T) + zero;
        const state = found.states.find((s) => Math.abs(s.temperature - T) < 1e-6);
        // states on a corner have no λ, and are not decided
        if (!state || reference.onCorner) continue;
        compared++;
        compareParts(loop, state, reference);
      }
    }
  });
  test("was compared with", () => {
    expect(compared).toBeGreaterThan(80);
  });

  function compareParts(loop: Loop<Names>, state: State<Names>, reference: ReferenceState): void {
    const feedbacks = analyseFeedbacks(loop, state);
    const named = new Map([["reference", feedbacks.reference.feedbackParameter]]);
    for (const { through, feedbackParameter } of feedbacks.loops)
      named.set(through.join(), feedbackParameter);
    const ours = Object.fromEntries(
      Object.entries(parts).map(([theirs, name]) => [theirs, named.get(name) ?? Number.NaN]),
    );
    const size = state.ledger.flows.reduce((sum, f) => sum + Math.abs(f.value), 400) * 6;
    const { slope } = tolerancesOf(reference, { size, parts: ours, reference: "" });
    expect(Object.keys(ours).sort()).toEqual(Object.keys(reference.parts).sort());
    for (const [name, part] of Object.entries(ours))
      expect(Math.abs(part - Number(reference.parts[name])), name).toBeLessThanOrEqual(slope);
    const under = Math.abs(feedbacks.reference.feedbackParameter);
    for (const { through, feedbackFactor } of feedbacks.loops) {
      const theirs = Object.keys(parts).find((key) => parts[key] === through.join()) as string;
      const factor = Number(reference.factors[theirs]);
      const allowed = (slope * (1 + Math.abs(factor))) / under + 1e-16;
      expect(Math.abs((feedbackFactor ?? Number.NaN) - factor), theirs).toBeLessThanOrEqual(allowed);
    }
    const lambda = Math.abs(Number(reference.lambda));
    const response = feedbacks.responses.flux.temperature ?? Number.NaN;
    const dTdS = Number(reference.dTdS);
    expect(Math.abs(response - dTdS)).toBeLessThanOrEqual(Math.abs(dTdS) * (slope / lambda + 1e-12) * 2);
    expect(feedbacks.reference.kind).toBe(kind);
    expect(feedbacks.reference.text).toMatch(reason);
    expect(Math.abs(feedbacks.residual)).toBeLessThan(2e-15 * (1 + under));
    expect(feedbacks.proved).toBe(true);
  }
});

const smooth = tables.filter((t) => t.title !== "ii");
describe.each(smooth)("folds of table $title", ({ cases, loopOf }) => {
  const folds = cases.flatMap(({ id, inputs, folds: list }) => list.map((fold) => ({ id, inputs, ...fold })));
  test.each(folds)("$id at S = $S", ({ inputs, T, S }) => {
    const p = Object.fromEntries(Object.entries(inputs).map(([name, text]) => [name, nearest(text)]));
    const loop = loopOf(p, 0);
    const [fold, at] = [Number(S), Number(T)];
    const statesAt = (flux: number) => findStates(loop, { within, at: { flux } }).states;
    const [lower, higher] = [statesAt(fold - 3), statesAt(fold + 3)];
    const [inside, outside] = lower.length > higher.length ? [lower, fold + 3] : [higher, fold - 3];
    const pair = [...inside]
      .sort((a, b) => Math.abs(a.temperature - at) - Math.abs(b.temperature - at))
      .slice(0, 2);
    for (const from of pair) {
      const [loss] = compareHeld(loop, { from, change: { flux: outside }, hold: ["albedo"], within }).lost;
      expect(loss).toMatchObject({ held: [], lost: { reason: "fold" } });
      // 6 W m⁻² of flux pass while rounding hides some 1e-12 W m⁻²; T moves as the square root of that
      expect(Math.abs((loss?.lost.givens.flux ?? 0) - fold)).toBeLessThan(1e-9);
      expect(Math.abs((loss?.lost.temperature ?? 0) - at)).toBeLessThan(2e-5);
      const drift = loss?.lost.drift;
      const { next, nextIs } = loss?.lost ?? {};
      const reached = statesAt(next?.givens.flux ?? outside);
      const ahead = reached.filter((s) =>
        drift === "warms" ? s.temperature > at + 0.1 : s.temperature < at - 0.1,
      );
      const target = drift === "warms" ? ahead[0] : ahead.at(-1);
      expect(nextIs).toBe(target ? "found" : "outside");
      if (target) expect(Math.abs((next?.temperature ?? 0) - target.temperature)).toBeLessThan(1e-9);
      if (target) expect(target.stability).toBe("stable");
    }
  });
});
