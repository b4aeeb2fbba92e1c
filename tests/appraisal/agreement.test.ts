// An appraisal agrees to the bit with direct calls of the laws and of the searches.
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { toText } from "../../src/appraisal/toText.ts";
import { tippingMargins } from "../../src/branches/tippingMargins.ts";
import { traceBranches } from "../../src/branches/traceBranches.ts";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import { equilibriumTemperature } from "../../src/greenhouse/equilibriumTemperature.ts";
import { SOLAR_IRRADIANCE } from "../../src/ground/constants.ts";
import { VERSION } from "../../src/ground/version.ts";
import { habitableZoneDistance } from "../../src/habitable/habitableZoneDistance.ts";
import { habitableZoneFlux } from "../../src/habitable/habitableZoneFlux.ts";
import { HABITABLE_ZONE_LIMITS } from "../../src/habitable/habitableZoneLimits.ts";
import type { Loop } from "../../src/loop/types.ts";
import { apoastronFlux } from "../../src/orbit/apoastronFlux.ts";
import { orbitalPeriod } from "../../src/orbit/orbitalPeriod.ts";
import { orbitMeanFlux } from "../../src/orbit/orbitMeanFlux.ts";
import { orbitMeanTemperature } from "../../src/orbit/orbitMeanTemperature.ts";
import { periastronFlux } from "../../src/orbit/periastronFlux.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { stellarFlux } from "../../src/star/stellarFlux.ts";
import { stellarLuminosity } from "../../src/star/stellarLuminosity.ts";
import { findStates } from "../../src/states/findStates.ts";
import { firstOf, plain, snowy } from "./planets.ts";

const [AU, SUN, RADIUS] = [149597870700, 3.828e26, 6.957e8];

describe("the starlight of a planet on an eccentric orbit", () => {
  const { starlight, equilibrium } = appraisePlanet(snowy());
  const luminosity = 0.2 * SUN;
  const fluxAtSemiMajorAxis = stellarFlux({ luminosity, distance: 0.46 * AU });
  const ports = { fluxAtSemiMajorAxis, eccentricity: 0.08 };

  test("is that of the laws", () => {
    expect(starlight.luminosity).toBe(luminosity);
    expect(starlight.atSemiMajorAxis.flux).toBe(fluxAtSemiMajorAxis);
    expect(starlight.mean.flux).toBe(orbitMeanFlux(ports));
    expect(starlight.periastron.flux).toBe(periastronFlux(ports));
    expect(starlight.apoastron.flux).toBe(apoastronFlux(ports));
    expect(starlight.mean.earths).toBe(orbitMeanFlux(ports) / SOLAR_IRRADIANCE);
    expect(starlight.companions).toBeNull();
    const mass = readPlanet(snowy()).facts.stars[0]?.mass as number;
    expect(starlight.period).toBe(orbitalPeriod({ semiMajorAxis: 0.46 * AU, mass }));
  });

  test("has two means, which move apart in opposite directions", () => {
    const dark = { albedo: 0, redistribution: 0.25 };
    const circular = equilibriumTemperature({ flux: fluxAtSemiMajorAxis, ...dark });
    expect(equilibrium.orbit.ofMeanFlux).toBe(
      equilibriumTemperature({ flux: orbitMeanFlux(ports), ...dark }),
    );
    // another way to the same number: a ratio of temperatures in place of a flux
    const meanOverTime = orbitMeanTemperature({ temperatureAtSemiMajorAxis: circular, eccentricity: 0.08 });
    expect(Math.abs((equilibrium.orbit.meanOverTime as number) / meanOverTime - 1)).toBeLessThan(1e-15);
    expect(equilibrium.orbit.ofMeanFlux).toBeGreaterThan(circular);
    expect(equilibrium.orbit.meanOverTime).toBeLessThan(circular);
  });
});

describe("equilibrium temperatures", () => {
  const { equilibrium, starlight, states } = appraisePlanet(plain({ internalHeat: "2 W m-2" }));
  const luminosity = stellarLuminosity({ radius: 0.68 * RADIUS, effectiveTemperature: 4680 });
  const flux = stellarFlux({ luminosity, distance: 0.46 * AU });

  it.each([
    [0, 0.25],
    [0.3, 0.25],
    [0, 0.5],
    [0.3, 0.5],
  ])("by convention with A = %d and f = %d", (albedo, redistribution) => {
    const found = equilibrium.conventional.find(
      (c) => c.albedo === albedo && c.redistribution === redistribution,
    );
    expect(found?.value).toBe(equilibriumTemperature({ flux, albedo, redistribution }));
  });

  test("as described, and of places", () => {
    const at = (redistribution: number) =>
      equilibriumTemperature({ flux, albedo: 0.3, internalFlux: 2, redistribution });
    expect(starlight.luminosity).toBe(luminosity);
    expect(equilibrium.described).toMatchObject({ value: at(0.25), albedo: 0.3, internalFlux: 2 });
    // f of day and night side without transport and with all of it: Cowan & Agol 2011
    expect(equilibrium.places).toEqual({
      substellar: at(1),
      day: { still: at(2 / 3), spread: at(2 / 3 - 5 / 12) },
      night: { still: at(0), spread: at(0.25) },
    });
    expect(states[0]?.places).toEqual(equilibrium.places);
  });

  test("where the albedo answers, each climate has its own", () => {
    const appraisal = appraisePlanet(snowy());
    expect(appraisal.equilibrium).toMatchObject({ described: null, places: null });
    for (const { state, equilibriumTemperature: own, greenhouseWarming, places } of appraisal.states) {
      const { flux, albedo } = state.report as { flux: number; albedo: number };
      expect(own).toBe(equilibriumTemperature({ flux, albedo, redistribution: 0.25, internalFlux: 0.08 }));
      expect(greenhouseWarming).toBe(state.temperature - own);
      expect(places?.substellar).toBe(
        equilibriumTemperature({ flux, albedo, redistribution: 1, internalFlux: 0.08 }),
      );
    }
  });
});

describe("climates", () => {
  const within = [50, 2500] as const;
  it.each([
    ["with a luminosity", snowy()],
    ["with radius and effective temperature", plain()],
    ["with a flux", plain({ star: undefined, orbit: { flux: "1361 W m-2" } })],
  ])("are those of findStates and analyseFeedbacks, %s", (_, description) => {
    const appraisal = appraisePlanet(description);
    const loop: Loop = readPlanet(description).loop;
    const found = findStates(loop, { within });
    expect(appraisal.found).toEqual(found);
    expect(appraisal.states.map(({ state }) => state)).toEqual(found.states);
    for (const { state, feedbacks } of appraisal.states)
      expect(feedbacks).toEqual(state.stability === "stable" ? analyseFeedbacks(loop, state) : null);
    expect(appraisal.states.length).toBeGreaterThan(0);
  });

  test("have the margins and the diagram of their luminosity between 0.4 and 2.5 times today's", () => {
    const { states, diagram: appraised } = appraisePlanet(snowy());
    const planet = readPlanet(snowy());
    const along = "star.luminosity";
    const now = 0.2 * SUN;
    const between = [0.4 * now, 2.5 * now] as const;
    const { units, now: place, ...diagram } = appraised as NonNullable<typeof appraised>;
    const { units: ofLoop, ...traced } = traceBranches(planet.loop, {
      ...{ along, between, within, tolerance: 5e-4 },
    });
    expect(diagram).toEqual(traced);
    const holding = states.filter(({ state }) => state.stability === "stable");
    expect(place).toEqual({ at: now, temperatures: holding.map(({ state }) => state.temperature) });
    expect(ofLoop).toContainEqual({ name: along, unit: "W" });
    expect(units).toContainEqual({ name: along, unit: "solLum", size: SUN });
    expect(units.map(({ name }) => name).sort()).toEqual([along, ...Object.keys(diagram.fixed)].sort());
    const rate = planet.facts.stars[0]?.brightening as number;
    const asked = states.map(({ state }) =>
      state.stability === "stable"
        ? tippingMargins(planet.loop as Loop, state, {
            along,
            between,
            within,
            tolerance: 5e-4,
            brightening: { rate },
          })
        : null,
    );
    expect(states.map(({ margins }) => margins)).toEqual(asked);
    expect(asked.filter(Boolean)).toHaveLength(2);
  });

  test("have their place on the diagram also where the luminosity is no given of theirs", () => {
    const { states, diagram, starlight } = appraisePlanet(plain());
    const [{ state }] = states as [(typeof states)[number]];
    expect(Object.keys(state.givens)).not.toContain(diagram?.along);
    expect(diagram?.now).toEqual({ at: starlight.luminosity, temperatures: [state.temperature] });
    const branch = diagram?.branches[0];
    const before = branch?.points.filter(({ at }) => at <= (starlight.luminosity as number)).at(-1);
    const after = branch?.points.find(({ at }) => at >= (starlight.luminosity as number));
    expect(before?.temperature).toBeLessThanOrEqual(state.temperature);
    expect(after?.temperature).toBeGreaterThanOrEqual(state.temperature);
  });

  test("need not be there for a diagram, which tells where they are", () => {
    const far = appraisePlanet(plain({ orbit: { semiMajorAxis: "0.9 au" } }), { within: [220, 400] });
    expect(far).toMatchObject({ states: [], leaves: "colder", diagram: { now: { temperatures: [] } } });
    expect(far.diagram?.branches).toHaveLength(1);
    const near = appraisePlanet(plain({ orbit: { semiMajorAxis: "0.2 au" } }), { within: [220, 400] });
    expect(near).toMatchObject({ states: [], leaves: "hotter", diagram: { proof: "proved" } });
    expect(appraisePlanet(plain()).leaves).toBeNull();
    // a step of the albedo inside the range: there is no state, and nothing is proved
    const leap = { law: "stepAlbedo", cold: 0.6, warm: 0.3, threshold: "265 K" };
    expect(appraisePlanet(plain({ albedo: leap }), { within: [264, 266] })).toMatchObject({
      ...{ states: [], leaves: null },
    });
    const dark = plain({ orbit: { flux: "0 W m-2" }, internalHeat: "3 W m-2" });
    expect(appraisePlanet(dark)).toMatchObject({ diagram: null, states: [{ margins: null }] });
  });

  test("within another range are searched there", () => {
    const { found, states, diagram } = appraisePlanet(snowy(), { within: [280, 300] });
    expect(states).toHaveLength(1);
    expect([found?.within, diagram?.within]).toEqual([
      [280, 300],
      [280, 300],
    ]);
  });

  test("found with little effort are not called complete", () => {
    const opticalDepth = [
      0.9,
      { law: "vapourOpticalDepth", referenceTemperature: "288 K", referenceDepth: 0.3 },
    ];
    const longwave = { law: "greyColumnEmission", opticalDepth };
    const appraisal = appraisePlanet(snowy({ longwave }), { effort: 10 });
    expect(appraisal.diagram).toMatchObject({ complete: false, proof: "partial" });
    // a climate whose branch is not decided has no margins, and the report says so
    expect(appraisal.states.map(({ margins }) => margins)).toContain(null);
    expect(toText(appraisal)).toMatch(/its branch is not decided/);
  });
});

describe("what would change a climate", () => {
  const { states, inputs } = appraisePlanet(snowy());

  test("is what following it to other inputs gives, to first order", () => {
    // off the ends of the ranges of inputs, so that each can be changed both ways
    const description = snowy({ redistribution: 0.26 });
    const { state, sensitivities } = firstOf(appraisePlanet(description));
    const { loop } = readPlanet(description);
    for (const { path, perPercent } of sensitivities ?? []) {
      const value = state.givens[path] as number;
      const at = (share: number) =>
        findStates(loop, { within: [150, 260], at: { [path]: value * (1 + share) } }).states[0]
          ?.temperature as number;
      // a central difference over ±0.001 %: its own error is of third order, here below 1e-6 of the slope
      const slope = (at(1e-5) - at(-1e-5)) / 0.002;
      expect(Math.abs(slope - perPercent), path).toBeLessThanOrEqual(1e-6 * Math.abs(perPercent) + 1e-9);
    }
    expect(sensitivities?.map(({ path }) => path).sort()).toEqual(loop.givens.map(({ name }) => name).sort());
  });

  test("is listed by size, with what the errors of inputs make", () => {
    for (const { sensitivities } of states) {
      if (!sensitivities) continue;
      const sizes = sensitivities.map(({ perPercent }) => Math.abs(perPercent));
      expect(sizes).toEqual([...sizes].sort((a, b) => b - a));
      const lit = sensitivities.find(({ path }) => path === "star.luminosity");
      const { perUnit, minus, plus, perPercent } = lit as NonNullable<typeof lit>;
      const input = inputs.find(({ path }) => path === "star.luminosity");
      expect(minus).toBe(-perUnit * (input?.minus as number));
      expect(plus).toBe(perUnit * (input?.plus as number));
      // errors of 5 and of 10 %
      expect(Math.abs((plus as number) / perPercent - 10)).toBeLessThan(1e-12);
      expect(Math.abs((minus as number) / perPercent + 5)).toBeLessThan(1e-12);
      expect(sensitivities.filter((s) => s.minus !== null)).toHaveLength(1);
    }
  });

  test("is told of radius and temperature where the star is known by them", () => {
    const { sensitivities } = firstOf(appraisePlanet(plain()));
    const per = (name: string) => sensitivities?.find(({ path }) => path === name)?.perPercent as number;
    // T ∝ T_eff, and T ∝ √R: with albedo and emissivity fixed
    const { temperature } = firstOf(appraisePlanet(plain())).state;
    expect(Math.abs(per("star.effectiveTemperature") - temperature / 100)).toBeLessThan(1e-9);
    expect(Math.abs(per("star.radius") - temperature / 200)).toBeLessThan(1e-9);
  });
});

test("published limits are those of the laws, with the planet's mean flux over each", () => {
  const { habitableZone, starlight } = appraisePlanet(snowy());
  expect(habitableZone).toHaveLength(HABITABLE_ZONE_LIMITS.length);
  habitableZone.forEach((limit, i) => {
    const { coefficients, name, paper, doi, massEarths, edge } = HABITABLE_ZONE_LIMITS[
      i
    ] as never as (typeof HABITABLE_ZONE_LIMITS)[number];
    const flux = habitableZoneFlux({ effectiveTemperature: 4680, ...coefficients });
    expect(limit).toMatchObject({ name, paper, doi, massEarths, edge, temperature: null });
    expect(limit.limit.flux).toBe(flux);
    expect(limit.distance).toBe(habitableZoneDistance({ luminosity: 0.2 * SUN, flux }));
    expect(limit.ratio).toBe(starlight.mean.flux / flux);
  });
});

test("a radius with a temperature gives the margins of the same luminosity", () => {
  const value = stellarLuminosity({ radius: 0.68 * RADIUS, effectiveTemperature: 4680 });
  const { albedo, longwave } = snowy();
  const byRadius = plain({ albedo, longwave });
  const star = { luminosity: { value, unit: "W" }, mass: "0.72 solMass" };
  const [a, b] = [appraisePlanet(byRadius), appraisePlanet({ ...byRadius, star })];
  expect(a.states.map(({ margins }) => margins)).toEqual(b.states.map(({ margins }) => margins));
  const [traced, told] = [a, b].map(({ diagram }) => diagram as NonNullable<typeof diagram>);
  // a luminosity that follows is shown in those of the Sun, one that is written as it is written
  expect(told?.units[0]).toEqual({ name: "star.luminosity", unit: "W", size: 1 });
  expect(traced).toEqual({
    ...told,
    units: [{ ...told?.units[0], unit: "solLum", size: SUN }, ...(told?.units.slice(1) ?? [])],
  });
  expect(a.ownLimits).toEqual(b.ownLimits);
  expect(a.ownLimits.length).toBeGreaterThan(0);
});

test("names the version and the constants", () => {
  expect(appraisePlanet(plain())).toMatchObject({
    version: VERSION,
    constants: "CODATA 2018, IAU 2012 B2, IAU 2015 B3",
  });
});
