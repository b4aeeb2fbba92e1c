// Any valid description is read and has finite states; anything else is refused with our error and nothing else.
import fc from "fast-check";
import { expect, test } from "vitest";
import { ThermosteadError } from "../../src/ground/errors.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { findStates } from "../../src/states/findStates.ts";
import { orsolne } from "./orsolne.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const measured = (min: number, max: number, unit: string) =>
  fc.oneof(
    between(min, max).map((value) => `${value} ${unit}`),
    between(min, max).map((value) => ({ value, unit, minus: Math.abs(value) / 10, source: "invented" })),
  );
const pure = (min: number, max: number) =>
  fc.oneof(
    between(min, max),
    between(min, max).map((value) => ({ value, unit: "1", plus: 0.01 })),
  );

const star = fc.oneof(
  fc.record({ luminosity: measured(0.01, 5, "solLum"), mass: measured(0.1, 2, "solMass") }),
  fc.record({
    radius: measured(0.1, 2, "solRad"),
    effectiveTemperature: measured(2500, 8000, "K"),
    mass: measured(0.1, 2, "solMass"),
  }),
);
const size = fc.oneof(
  fc.record({ semiMajorAxis: measured(0.2, 3, "au") }),
  fc.record({ period: measured(50, 900, "d") }),
);
const shape = fc.oneof(
  fc.constant({}),
  fc.record({ eccentricity: pure(0, 0.7), average: fc.constantFrom("flux", "temperature") }),
);
const step = { cold: pure(0.4, 1), warm: pure(0, 0.4) };
const ramp = { ...step, frozenBelow: measured(220, 265, "K"), openAbove: measured(266, 300, "K") };
const albedo = fc.oneof(
  pure(0, 1),
  fc.record({
    law: fc.constant("tanhAlbedo"),
    ...step,
    midpoint: measured(-20, 5, "degC"),
    width: measured(1, 30, "K"),
  }),
  fc.record({ law: fc.constantFrom("rampAlbedo", "quadraticAlbedo"), ...ramp }),
  fc.tuple(between(0, 0.5), between(0, 0.5), between(0, 1)).map(([a, b, albedo]) => ({
    covers: [
      { share: a, albedo },
      { share: b, albedo: 0.5 },
      { share: "rest", albedo: 0.1 },
    ],
  })),
);
const longwave = fc.oneof(
  fc.record({ law: fc.constant("greyEmission"), emissivity: pure(0.3, 1) }),
  fc.record({ law: fc.constant("greyColumnEmission"), opticalDepth: pure(0, 5) }),
  fc.record({
    law: fc.constant("linearEmission"),
    intercept: measured(150, 250, "W m-2"),
    slope: measured(1, 4, "W.m**-2.K**-1"),
    reference: measured(0, 20, "degC"),
  }),
);
const valid = fc
  .record({
    star,
    size,
    shape,
    albedo,
    longwave,
    redistribution: fc.oneof(fc.constantFrom("global", "dayside", "instant", "substellar"), pure(0.25, 1)),
    heatCapacity: fc.oneof(fc.constant("0 J/m^2/K"), measured(1, 1e9, "J/m^2/K")),
    internalHeat: measured(0, 5, "W m-2"),
  })
  .map(({ size, shape, ...rest }) => ({
    format: "thermostead-planet-1",
    ...rest,
    orbit: { ...size, ...shape },
  }));

/** Every number inside a value. */
function numbersIn(value: unknown): number[] {
  if (typeof value === "number") return [value];
  return typeof value === "object" && value !== null ? Object.values(value).flatMap(numbersIn) : [];
}

test("a valid description never throws and has finite states", () => {
  fc.assert(
    fc.property(valid, (description) => {
      const planet = readPlanet(description);
      expect(Number.isFinite(planet.flux)).toBe(true);
      const { states } = findStates(planet.loop, { within: [1, 20_000] });
      for (const number of numbersIn(states)) expect(Number.isFinite(number)).toBe(true);
    }),
    { seed: 20260, numRuns: 150, interruptAfterTimeLimit: 15_000 },
  );
});

/** Reads; true if it was refused with our error, and never anything else. */
function refused(value: unknown): boolean {
  try {
    readPlanet(value);
    return false;
  } catch (error) {
    expect(error).toBeInstanceOf(ThermosteadError);
    return true;
  }
}

test("junk is refused with our error and no other", () => {
  fc.assert(
    fc.property(
      fc.anything({ withBigInt: true, withDate: true, withMap: true, withNullPrototype: true }),
      (junk) => {
        expect(refused(junk)).toBe(true);
      },
    ),
    { seed: 20261, numRuns: 500 },
  );
});

test("a description with junk in one place is read or refused with our error", () => {
  const places = [
    ["star"],
    ["star", "radius"],
    ["orbit"],
    ["orbit", "average"],
    ["albedo"],
    ["albedo", "law"],
  ]
    .concat([
      ["albedo", "cold"],
      ["longwave"],
      ["redistribution"],
      ["heatCapacity"],
      ["internalHeat"],
      ["notes"],
    ])
    .map((place) => fc.constant(place));
  let refusals = 0;
  fc.assert(
    fc.property(fc.oneof(...places), fc.anything({ withBigInt: true }), ([outer, inner], junk) => {
      const description = orsolne() as unknown as Record<string, unknown>;
      if (inner === undefined) description[outer as string] = junk;
      else description[outer as string] = { ...(description[outer as string] as object), [inner]: junk };
      if (refused(description)) refusals++;
    }),
    { seed: 20262, numRuns: 1000 },
  );
  expect(refusals).toBeGreaterThan(900);
});
