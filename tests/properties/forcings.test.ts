// What holds for every forcing: nothing at its reference, more with more gas, no step at the edges of its regimes.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Port } from "../../src/graph/card.ts";
import { co2AdjustedForcingEtminan, co2AdjustedForcingMeinshausen } from "../../src/index.ts";
import { slopesOf } from "../../src/law/slopesOf.ts";
import { type AnyLaw, laws } from "./laws.ts";
import { settings } from "./settings.ts";

const forcings = laws.filter((law) => law.card.reduces === "cooling");

test("there are twelve, each with its kind in its name and its output", () => {
  expect(forcings).toHaveLength(12);
  for (const { card } of forcings) {
    const kind = /^(co2|ch4|n2o)(Adjusted|Effective)Forcing[A-Z]/.exec(card.name)?.[2]?.toLowerCase();
    expect(card.output.about).toBe(`${kind} radiative forcing, a reduction of cooling`);
    expect(card.about.toLowerCase()).toContain(kind);
    expect(card.inputs.reference, card.name).not.toHaveProperty("default");
  }
});

const within = (port: Port) => port.within as readonly [number, number];

/** Anywhere in a port's range, small shares as likely as large ones. */
function anyShare(port: Port): fc.Arbitrary<number> {
  const [low, high] = within(port);
  return fc
    .double({ min: Math.log(low), max: Math.log(high), noNaN: true })
    .map((x) => Math.min(high, Math.max(low, Math.exp(x))));
}
const inputsOf = (law: AnyLaw) =>
  fc.record(
    Object.fromEntries(
      Object.entries(law.card.inputs).map(([name, port]) => [name, anyShare(port as Port)]),
    ) as Record<"concentration" | "reference", fc.Arbitrary<number>>,
  );

describe.each(forcings.map((law) => [law.card.name, law] as const))("%s", (_, law) => {
  test("is zero at its reference", () => {
    fc.assert(
      fc.property(inputsOf(law), (inputs) => {
        expect(law({ ...inputs, concentration: inputs.reference })).toBe(0);
      }),
      settings(300),
    );
  });

  test("grows with its gas, and has the sign of the change", () => {
    fc.assert(
      fc.property(inputsOf(law), anyShare(law.card.inputs.concentration as Port), (inputs, other) => {
        const [less, more] = [Math.min(inputs.concentration, other), Math.max(inputs.concentration, other)];
        const rise = law({ ...inputs, concentration: more }) - law({ ...inputs, concentration: less });
        // the terms that cancel are a few W m⁻², each with a few roundings
        expect(rise).toBeGreaterThanOrEqual(-1e-14);
        if (more > 1.001 * less) expect(rise).toBeGreaterThan(0);
        const change = inputs.concentration - inputs.reference;
        if (Math.abs(change) > 1e-6 * inputs.reference)
          expect(Math.sign(law(inputs))).toBe(Math.sign(change));
      }),
      settings(1000),
    );
  });
});

describe("at the edges of their regimes", () => {
  const share = fc.double({ min: 200e-6, max: 400e-6, noNaN: true });
  const nitrousOxide = fc.double({ min: 200e-9, max: 525e-9, noNaN: true });
  const NEAR = 1e-9;
  /** Value and slope a little below and above a place. */
  const around = (place: number, at: (concentration: number) => { value: number; slope: number }) =>
    [at(place * (1 - NEAR)), at(place * (1 + NEAR))] as const;

  test.each([
    ["the reference", (reference: number) => reference],
    ["where the coefficient grows no further", (r: number) => r + 0.00075906 / (2 * 2.4785e-7) / 1e6],
  ])("Meinshausen's CO₂ has no step and no kink at %s", (_, edgeOf) => {
    fc.assert(
      fc.property(share, nitrousOxide, (reference, n) => {
        const [below, above] = around(edgeOf(reference), (concentration) => {
          const found = slopesOf(co2AdjustedForcingMeinshausen, {
            concentration,
            reference,
            nitrousOxide: n,
          });
          return { value: found.value, slope: found.slopes.concentration as number };
        });
        expect(Math.abs(above.value - below.value)).toBeLessThan(1e-6);
        expect(Math.abs(above.slope / below.slope - 1)).toBeLessThan(1e-6);
      }),
      settings(200),
    );
  });

  test("above that edge only the logarithm is left: doubling adds the same again", () => {
    const at = (concentration: number) =>
      co2AdjustedForcingMeinshausen({ concentration, reference: 277.15e-6, nitrousOxide: 273.87e-9 });
    const first = at(4e-3) - at(2e-3);
    expect(Math.abs(at(8e-3) - at(4e-3) - first)).toBeLessThan(1e-14 * 20);
    expect(Math.abs(at(1.2e-3) - at(0.6e-3) - first)).toBeGreaterThan(0.1);
  });

  test("the coefficient of Meinshausen's logarithm never falls, from d₁ below to d₁ − b₁²/4a₁ above", () => {
    const [reference, n] = [277.15e-6, 273.87e-9];
    const coefficient = (concentration: number) =>
      co2AdjustedForcingMeinshausen({ concentration, reference, nitrousOxide: n }) /
        Math.log(concentration / reference) +
      0.0021492 * Math.sqrt(273.87);
    fc.assert(
      fc.property(fc.double({ min: 1.001, max: 20, noNaN: true }), (ratio) => {
        const [less, more] = [coefficient(ratio * reference), coefficient(1.01 * ratio * reference)];
        expect(more).toBeGreaterThanOrEqual(less - 1e-11);
        expect(coefficient(reference / ratio)).toBeCloseTo(5.2488, 9);
      }),
      settings(300),
    );
    // the table's own closed form above C_max
    expect(coefficient(1809e-6)).toBeCloseTo(5.2488 + 0.00075906 ** 2 / (4 * 2.4785e-7), 9);
    expect(coefficient(0.1)).toBeCloseTo(5.2488 + 0.00075906 ** 2 / (4 * 2.4785e-7), 9);
  });

  test("Etminan's coefficient is as large below the reference as above it", () => {
    const [reference, meanNitrousOxide] = [800e-6, 300e-9];
    const coefficient = (concentration: number) =>
      co2AdjustedForcingEtminan({ concentration, reference, meanNitrousOxide }) /
      Math.log(concentration / reference);
    for (const step of [10e-6, 100e-6, 500e-6]) {
      expect(coefficient(reference - step) / coefficient(reference + step)).toBeCloseTo(1, 10);
      expect(coefficient(reference + step)).toBeGreaterThan(coefficient(reference + step / 2));
    }
  });

  test("Etminan's CO₂ has no step and no kink at the reference", () => {
    fc.assert(
      fc.property(share, nitrousOxide, (reference, meanNitrousOxide) => {
        const [below, above] = around(reference, (concentration) => {
          const found = slopesOf(co2AdjustedForcingEtminan, { concentration, reference, meanNitrousOxide });
          return { value: found.value, slope: found.slopes.concentration as number };
        });
        expect(Math.abs(above.value - below.value)).toBeLessThan(1e-6);
        expect(Math.abs(above.slope / below.slope - 1)).toBeLessThan(1e-6);
      }),
      settings(200),
    );
  });
});
