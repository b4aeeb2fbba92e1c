// The proved search on loops: what it claims, what it leaves undecided, and what a state holds.
import { describe, expect, test } from "vitest";
import * as core from "../../src/index.ts";

const ICE = { cold: 0.7, warm: 0.3, midpoint: 265, width: 10 };

const iceLoop = () =>
  core.closeLoop(({ temperature, given }) => ({
    heating: {
      sunlight: core.absorbedFlux({
        flux: given("flux", 1361, "W m-2", { within: [0, 1e7] }),
        albedo: core.tanhAlbedo({ temperature, ...ICE }),
      }),
    },
    cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
    heatCapacity: 4.2e8,
  }));

/** A loop whose net flux is a given formula of temperature and of a parameter p. */
const loopOf = (write: (temperature: core.Quantity, p: core.Quantity) => core.Value, p = 0) =>
  core.closeLoop(({ temperature, given }) => ({
    heating: { imagined: core.inUnit(write(core.inUnit(temperature, "1"), given("p", p, "1")), "W m-2") },
    cooling: {},
    heatCapacity: 1,
  }));

describe("the proved search", () => {
  const { div, findStates, log, max, min, mul, sqrt, square, sub } = core;

  test("proves that the list is complete", () => {
    const found = findStates(iceLoop(), { within: [2.7, 2000] });
    expect(found).toMatchObject({ proof: "proved", complete: true, undecided: [], notes: [] });
    expect(found.states.map((s) => s.stability)).toEqual(["stable", "unstable", "stable"]);
    for (const state of found.states) {
      expect(state.proved).toBe(true);
      expect(state.bracket[1] - state.bracket[0]).toBeLessThan(1e-11);
      const [low, high] = state.feedbackParameterRange as readonly [number, number];
      expect(state.feedbackParameter).toBeGreaterThan(low);
      expect(state.feedbackParameter).toBeLessThan(high);
      expect(high - low).toBeLessThan(1e-10);
    }
  });

  test("does not depend on the range, as long as the states are inside", () => {
    const wide = findStates(iceLoop(), { within: [2.7, 2000] }).states;
    const narrow = findStates(iceLoop(), { within: [233.987, 289] }).states;
    narrow.forEach((state, i) => {
      expect(Math.abs(state.temperature - (wide[i] as core.State).temperature)).toBeLessThan(1e-12);
    });
    expect(narrow).toHaveLength(3);
  });

  test("x² = p: two states, none, and at p = 0 an undecided fold with its distance", () => {
    const loop = loopOf((t, p) => sub(square(sub(t, 300)), p));
    for (const p of [1, 1e-4, 1e-8, 1e-12, 1e-16, 1e-20]) {
      const found = findStates(loop, { within: [150, 400], at: { p } });
      expect([p, found.proof, found.states.length]).toEqual([p, "proved", 2]);
      expect(findStates(loop, { within: [150, 400], at: { p: -p } })).toMatchObject({
        proof: "proved",
        states: [],
      });
    }
    const touching = findStates(loop, { within: [150, 400], at: { p: 0 } });
    expect(touching).toMatchObject({ proof: "partial", complete: false, states: [] });
    expect(touching.undecided).toMatchObject([{ kind: "fold", counts: "0 or 2" }]);
    const [doubt] = touching.undecided;
    const [low, high] = (doubt as core.Undecided).distances?.p ?? [1, -1];
    expect(low).toBeLessThanOrEqual(0);
    expect(high).toBeGreaterThanOrEqual(0);
    expect(high - low).toBeLessThan(1e-6);
  });

  test("a continuum is one undecided stretch, a step is a jump, a hole is undefined", () => {
    const flat = findStates(
      loopOf((t) => max(0, sub(t, 300))),
      { within: [150, 400] },
    );
    expect(flat.undecided.map((u) => u.kind)).toContain("flat");
    expect(flat.undecided.length).toBeLessThanOrEqual(3);
    const steep = findStates(
      loopOf((t) => div(1, sub(t, 300.123))),
      { within: [150, 400] },
    );
    expect(steep.states).toEqual([]);
    expect(steep.undecided.length).toBeGreaterThan(0);
    const hole = findStates(
      loopOf((t) => log(sub(t, 200))),
      { within: [150, 400] },
    );
    expect(hole.states.map((s) => s.temperature)).toEqual([201]);
    expect(hole.undecided.map((u) => u.kind)).toContain("undefined");
    const root = findStates(
      loopOf((t) => sub(sqrt(sub(t, 100)), 10)),
      { within: [150, 400] },
    );
    expect(root).toMatchObject({ proof: "proved" });
    expect(root.states.map((s) => s.temperature)).toEqual([200]);
  });

  test("a crossing exactly at a kink is one entry", () => {
    // slopes 1 and 2 on the two sides: one state, proved although the kink is there
    const crossing = findStates(
      loopOf((t) => max(sub(t, 300), mul(2, sub(t, 300)))),
      { within: [150, 400] },
    );
    expect(crossing.states.length + crossing.undecided.length).toBe(1);
    // touching from below with a corner
    const corner = findStates(
      loopOf((t) => min(sub(t, 300), sub(300, t))),
      { within: [150, 400] },
    );
    expect(corner.states).toEqual([]);
    expect(corner.undecided).toMatchObject([{ kind: "corner" }]);
  });

  test("where the balance has no value, its bounds are not told", () => {
    const { undecided } = findStates(
      loopOf((t) => core.log(sub(t, 200))),
      { within: [150, 400] },
    );
    expect(undecided.map((u) => [u.kind, u.enclosure, u.distances])).toContainEqual([
      "undefined",
      null,
      null,
    ]);
    expect(undecided.every((u) => u.enclosure === null || u.enclosure.every(Number.isFinite))).toBe(true);
  });

  test("an exhausted effort is said, with the stretch that was not searched", () => {
    const found = findStates(iceLoop(), { within: [2.7, 2000], effort: 10 });
    expect(found).toMatchObject({ proof: "partial", complete: false });
    expect(found.undecided.at(-1)).toMatchObject({ kind: "effort" });
    expect(found.undecided.at(-1)?.interval[1]).toBe(2000);
    expect(found.notes).toMatchObject([{ code: "search-stopped" }]);
  });

  test.each([0.01, 1, 3, 5, 10, 25])("the closure bound holds far above a step of %d K", (width) => {
    // the argument of tanh is then wrong by many roundings, but tanh no longer answers
    for (const flux of [3.9e6, 2e5]) {
      const loop = core.closeLoop(({ temperature }) => {
        const albedo = core.tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width });
        return {
          heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
          cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
          heatCapacity: 4e8,
        };
      });
      const { states, complete } = findStates(loop, { within: [2.7, 3000] });
      expect([states.length, complete]).toEqual([1, true]);
      const [{ imbalance, ledger }] = states as [core.State];
      const heating = Math.max(...ledger.flows.map((f) => f.value));
      expect(imbalance.temperature).toBeLessThanOrEqual(Math.max(5e-12, 2e-14 * heating));
    }
  });

  test("the closure bound holds in its relative form where flows are huge", () => {
    // an icy loop pushed to about 2000 K, and a bare rock at the flux of 55 Cancri e (S/S☉ = 2450, von Braun et al. 2011,
    // from memory): half a unit in the last place of T alone is worth 1e-10 W m⁻²
    const hot = findStates(iceLoop(), { within: [2.7, 3000], at: { flux: 3.9e6 } });
    const rock = core.closeLoop(({ temperature }) => ({
      heating: { sunlight: core.absorbedFlux({ flux: 2450 * core.SOLAR_IRRADIANCE, albedo: 0.06 }) },
      cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.9 }) },
      heatCapacity: 0,
    }));
    const found = [...hot.states, ...findStates(rock, { within: [2.7, 5000] }).states];
    expect(found.map((s) => s.proved && s.temperature > 1900)).toEqual([true, true]);
    for (const { imbalance, ledger, notes } of found) {
      const heating = Math.max(...ledger.flows.map((f) => f.value));
      expect(imbalance.temperature).toBeLessThanOrEqual(Math.max(5e-12, 2e-14 * heating));
      expect(notes.filter((n) => n.severity === "invalid")).toEqual([]);
    }
  });

  test("signs come from declared ranges only", () => {
    // with no range a negative p must be searched as honestly as a positive one
    const loop = loopOf((t, p) => sub(mul(p, sub(t, 300)), 1));
    const up = findStates(loop, { within: [150, 400], at: { p: 0.5 } });
    const down = findStates(loop, { within: [150, 400], at: { p: -0.5 } });
    expect([up, down].map((f) => f.states.map((s) => s.temperature))).toEqual([[302], [298]]);
    expect([up.proof, down.proof]).toEqual(["proved", "proved"]);
  });
});

describe("a state", () => {
  const [cold, middle, warm] = core.findStates(iceLoop(), { within: [150, 400] }).states;

  test("is a frozen plain object that survives JSON", () => {
    expect(JSON.parse(JSON.stringify(cold))).toEqual(cold);
    expect(Object.isFrozen(cold?.ledger.flows[0])).toBe(true);
  });

  test("has no -0, which JSON does not keep", () => {
    const loop = core.closeLoop(({ temperature, given, couple }) => {
      const p = given("p", -0, "1");
      const warmth = core.inUnit(temperature, "1");
      const reversed = couple("reversed", core.mul(-4, core.mul(p, warmth)));
      return {
        heating: { sunlight: 240, less: core.inUnit(reversed, "W m-2") },
        cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
        heatCapacity: 1,
        report: { reversed, more: core.mul(4, p) },
      };
    });
    for (const p of [0, -0]) {
      const [state] = core.findStates(loop, { within: [150, 400], at: { p } }).states;
      expect([state?.givens.p, state?.couplings.reversed]).toEqual([0, 0]);
      expect(state?.report).toEqual({ reversed: 0, more: 0 });
      expect(state?.ledger.flows[1]?.value).toBe(0);
    }
  });

  test("has times only where it returns", () => {
    expect(cold?.eFoldingTime).toBeCloseTo(-4.2e8 / (cold?.feedbackParameter as number), -3);
    expect(middle?.eFoldingTime).toBeNull();
    expect(warm?.eigenvalues?.[0]?.re).toBeLessThan(0);
  });

  test("carries a caution outside the published range, and is invalid outside the hard one", () => {
    const hot = core.findStates(iceLoop(), { within: [150, 600], at: { flux: 4000 } }).states.at(-1);
    expect(hot?.notes).toMatchObject([
      {
        code: "outside-published",
        severity: "caution",
        about: "tanhAlbedo.temperature",
        range: [200, 340],
        unit: "K",
      },
    ]);
    const overfull = core.closeLoop(({ temperature, given }) => ({
      heating: {
        sunlight: core.absorbedFlux({
          flux: 1361,
          albedo: core.mixAlbedo({
            covers: [{ fraction: given("cover", 0.5, "1"), albedo: 0.2 }],
            bare: 0.4,
          }),
        }),
      },
      cooling: { longwave: core.greyEmission({ temperature, emissivity: 1 }) },
      heatCapacity: 1,
    }));
    expect(core.findStates(overfull, { within: [150, 400] }).states[0]?.notes).toEqual([]);
    const [invalid] = core.findStates(overfull, { within: [150, 400], at: { cover: 1.2 } }).states;
    expect(invalid?.notes).toMatchObject([
      { code: "outside-range", severity: "invalid", about: "mixAlbedo.covers[0].fraction", value: 1.2 },
      { code: "outside-range", severity: "invalid" },
    ]);
  });
});
