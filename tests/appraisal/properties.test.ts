// Any planet is appraised, with finite numbers only, whatever the order of its fields, and whatever is left out.
import { isDeepStrictEqual } from "node:util";
import fc from "fast-check";
import { expect, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { toMarkdown } from "../../src/appraisal/toMarkdown.ts";
import { toRows } from "../../src/appraisal/toRows.ts";
import { toText } from "../../src/appraisal/toText.ts";
import { numbersIn } from "./planets.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const share = between(0, 1);
const measured = (min: number, max: number, unit: string) =>
  between(min, max).map((value) => `${value} ${unit}`);
const withError = (min: number, max: number, unit: string) =>
  fc.record(
    { value: between(min, max), unit: fc.constant(unit), minus: between(0, min), plus: between(0, max) },
    { requiredKeys: ["value", "unit"] },
  );

/** Shares of today's luminosity, or of another; today is the middle of the times. */
const tabled = fc
  .tuple(
    fc.uniqueArray(fc.integer({ min: -90, max: 90 }), { minLength: 2, maxLength: 8 }),
    fc.array(between(0.2, 4), { minLength: 8, maxLength: 8 }),
  )
  .map(([times, lights]) => {
    const time = times.sort((a, b) => a - b);
    const now = ((time[0] as number) + (time.at(-1) as number)) / 2;
    const luminosity = { value: lights.slice(0, time.length), unit: "1" };
    return { time: { value: time, unit: "Gyr" }, luminosity, now: `${now} Gyr` };
  });

const byLuminosity = fc.record(
  {
    name: fc.string(),
    luminosity: withError(1e-4, 50, "solLum"),
    effectiveTemperature: measured(2000, 12000, "K"),
    mass: measured(0.08, 3, "solMass"),
    brightening: fc.oneof(measured(-0.5, 0.5, "Gyr-1"), tabled),
  },
  { requiredKeys: ["luminosity", "mass"] },
);
const byRadius = fc.record(
  {
    radius: withError(0.1, 2, "solRad"),
    effectiveTemperature: withError(2400, 9000, "K"),
    mass: measured(0.08, 3, "solMass"),
    visibleShare: share,
  },
  { requiredKeys: ["radius", "effectiveTemperature", "mass"] },
);
const host = fc.oneof(byLuminosity, byRadius);
const companion = fc.record({ luminosity: measured(0.01, 5, "solLum"), distance: measured(10, 99, "au") });
const star = fc.oneof(
  { weight: 4, arbitrary: host },
  { weight: 1, arbitrary: fc.tuple(host, fc.option(companion)).map((all) => all.filter(Boolean)) },
);
const orbit = fc.record(
  {
    semiMajorAxis: measured(0.02, 30, "au"),
    period: measured(0.5, 9000, "d"),
    eccentricity: fc.oneof(fc.constant(0), between(0, 0.95)),
    average: fc.constantFrom("flux", "temperature"),
  },
  { requiredKeys: ["semiMajorAxis"] },
);

const albedo = fc.oneof(
  share,
  fc.record({
    law: fc.constantFrom("tanhAlbedo"),
    cold: between(0.5, 0.9),
    warm: between(0, 0.5),
    midpoint: measured(230, 290, "K"),
    width: measured(1, 30, "K"),
  }),
  fc.record({
    law: fc.constantFrom("rampAlbedo", "quadraticAlbedo"),
    cold: between(0.5, 0.9),
    warm: between(0, 0.5),
    frozenBelow: measured(220, 265, "K"),
    openAbove: measured(266, 300, "K"),
  }),
  fc.tuple(share, share, share).map(([first, visible, nearInfrared]) => ({
    covers: [
      { share: first, albedo: 0.1 },
      { share: "rest", visible, nearInfrared },
    ],
  })),
);
const depth = fc.oneof(
  between(0, 4),
  fc.record({
    law: fc.constant("vapourOpticalDepth"),
    referenceTemperature: measured(270, 300, "K"),
    referenceDepth: between(0, 2),
    humidity: share,
  }),
);
const emission = fc.oneof(
  fc.record({ law: fc.constant("greyEmission"), emissivity: between(0.1, 1) }),
  fc.record({
    law: fc.constant("greyColumnEmission"),
    opticalDepth: fc.oneof(depth, fc.array(depth, { minLength: 1, maxLength: 3 })),
  }),
  fc.record({ law: fc.constantFrom("budykoEmission", "northEmission", "kollCroninEmission") }),
);
const longwave = fc.oneof(
  { weight: 3, arbitrary: emission },
  {
    weight: 1,
    arbitrary: emission.map((inner) => ({ law: "ceilingEmission", ceiling: "282 W m-2", emission: inner })),
  },
);
const heatCapacity = fc.oneof(fc.constantFrom("unknown", "0 J m-2 K-1"), measured(1e3, 1e10, "J m-2 K-1"));

/** Everything but star and orbit may be left out. */
const described = fc
  .record(
    {
      name: fc.string(),
      source: fc.string(),
      star,
      orbit,
      redistribution: fc.oneof(
        fc.constantFrom("global", "dayside", "instant", "substellar"),
        fc.record({ transport: share, side: fc.constantFrom("day", "night") }),
      ),
      albedo,
      longwave,
      heatCapacity,
      internalHeat: measured(0, 50, "W m-2"),
      atmosphere: fc.record({ pressure: measured(1e-6, 500, "bar") }),
      rotation: fc.record({ period: measured(0.2, 300, "d") }),
      mass: measured(0.05, 20, "earthMass"),
    },
    { requiredKeys: ["star", "orbit"] },
  )
  .map((fields) => ({ format: "thermostead-planet-1", ...fields }))
  .filter(isPossible);

/** Two bands need to know the light, and two averages need two ends of one orbit. */
function isPossible({ star: lit, orbit: path, albedo: reflecting }: Record<string, unknown>): boolean {
  const stars = [lit].flat() as Record<string, unknown>[];
  const needsLight = typeof reflecting === "object" && "covers" in (reflecting as object);
  const isLit = (one: Record<string, unknown>) =>
    one.visibleShare !== undefined || one.effectiveTemperature !== undefined;
  if (needsLight && !stars.every(isLit)) return false;
  return stars.length === 1 || (path as { average?: string }).average !== "temperature";
}

/** The same value with the keys of every object in reverse. */
function reversed(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(reversed);
  if (typeof value !== "object" || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .reverse()
      .map(([key, part]) => [key, reversed(part)]),
  );
}

test("every planet is appraised, in finite numbers, and its reports are text", () => {
  const seen = { states: 0, margins: 0, incomplete: 0, several: 0 };
  fc.assert(
    fc.property(described, (description) => {
      const appraisal = appraisePlanet(description);
      for (const number of numbersIn(appraisal)) expect(Number.isFinite(number)).toBe(true);
      expect(isDeepStrictEqual(JSON.parse(JSON.stringify(appraisal)), appraisal)).toBe(true);
      for (const { name, value } of toRows(appraisal))
        expect(typeof value === "string" || Number.isFinite(value), name).toBe(true);
      const text = toText(appraisal);
      expect(text.replace(String(description.name), "")).not.toMatch(/\b(?:NaN|Infinity|undefined)\b/);
      expect(toMarkdown(appraisal).length).toBeGreaterThan(500);
      const { states, found, notes } = appraisal;
      seen.states += states.length;
      seen.margins += states.filter(({ margins }) => margins).length;
      seen.incomplete += found === null ? 1 : 0;
      seen.several += notes.some(({ code }) => code === "several-stars") ? 1 : 0;
    }),
    { seed: 20265, numRuns: 100 },
  );
  // the planets tried are of all kinds
  for (const count of Object.values(seen)) expect(count).toBeGreaterThan(5);
}, 60_000);

/** What is held fixed is a list in words, in the order in which it was written. */
const tidied = (value: unknown): unknown =>
  JSON.parse(JSON.stringify(value), (key, part) =>
    key === "held" ? part.replace("at fixed ", "").split(", ").sort() : part,
  );

test("the order of fields changes nothing", () => {
  fc.assert(
    fc.property(described, (description) => {
      const { description: _, ...appraisal } = appraisePlanet(description);
      const { description: __, ...other } = appraisePlanet(reversed(description));
      expect(isDeepStrictEqual(tidied(other), tidied(appraisal))).toBe(true);
    }),
    { seed: 20266, numRuns: 30 },
  );
}, 60_000);
