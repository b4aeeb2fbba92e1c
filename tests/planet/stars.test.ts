// Several stars, one side of a locked planet, and the facts that are kept in SI.
import { describe, expect, it, test } from "vitest";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { findStates } from "../../src/states/findStates.ts";
import { orsolne, simple } from "./orsolne.ts";

const ROUNDING = 1e-14;
const close = (value: number | null | undefined, expected: number) =>
  expect(Math.abs((value as number) / expected - 1)).toBeLessThan(ROUNDING);
/** 3.828e26 W over 4π au², worked out in Python. */
const SOLAR = 1361.1664654085753;

describe("several stars", () => {
  const pair = [
    { name: "A", luminosity: "1 solLum", mass: "1 solMass" },
    { name: "B", luminosity: "0.5 solLum", mass: "0.75 solMass" },
  ];
  const orbit = { semiMajorAxis: "1 au" };

  it("add their light", () => {
    close(readPlanet(simple({ star: pair, orbit })).flux, 1.5 * SOLAR);
  });
  it("are one star where there is one in the list", () => {
    const star = { luminosity: "1 solLum" };
    expect(readPlanet(simple({ star: [star], orbit })).flux).toBe(readPlanet(simple({ star, orbit })).flux);
  });
  it("hold the planet with all their mass: 1.75 solar masses take it to 1.75^⅓ au in a year", () => {
    const planet = readPlanet(simple({ star: pair, orbit: { period: "1 yr" } }));
    const one = readPlanet(simple({ star: pair[0], orbit: { period: "1 yr" } }));
    // 1.75^⅓ = 1.205071132087615, worked out with bc
    close(planet.facts.semiMajorAxis, 1.205071132087615 * (one.facts.semiMajorAxis as number));
  });
  it("shine from elsewhere with a distance of their own, and no orbit acts on that", () => {
    const far = { luminosity: "4 solLum", distance: "20 au" };
    const ellipse = { semiMajorAxis: "1 au", eccentricity: 0.6, average: "flux" };
    close(readPlanet(simple({ star: [pair[0], far], orbit: ellipse })).flux, SOLAR / 0.8 + SOLAR / 100);
  });
  it("are givens named by their place in the list, each swept by itself", () => {
    const { loop } = readPlanet(simple({ star: pair, orbit }));
    const at = { "star[0].luminosity": 0, "star[1].luminosity": 3.828e26 };
    close(findStates(loop, { within: [50, 1000], at }).states[0]?.report.flux, SOLAR);
  });
  it("say that they stand at one distance", () => {
    const about = (star: unknown) => readPlanet(simple({ star, orbit })).notes.map((note) => note.about);
    expect(about(pair)).toContain("star");
    expect(about(pair[0])).not.toContain("star");
  });
});

describe("one side of a locked planet", () => {
  const side = (transport: number, name: string) => simple({ redistribution: { transport, side: name } });
  it.each([
    [0, "day", 2 / 3],
    [1, "day", 1 / 4],
    [0.6, "day", 2 / 3 - (5 * 0.6) / 12],
    [1, "night", 1 / 4],
    [0.6, "night", 0.15],
  ] as const)("with transport %d, the %s side: f = %d (Cowan & Agol 2011)", (transport, name, factor) => {
    const planet = readPlanet(side(transport, name));
    close(planet.assumptions.redistribution, factor);
    expect(planet.loop.givens.map((given) => given.name)).toContain("redistribution.transport");
    // no mean over the whole planet
    expect(planet.loop.flows.map((flow) => flow.standardName)).toEqual([null, null]);
  });
  it("says which side", () => {
    const { notes } = readPlanet(side(0.5, "night"));
    expect(notes.find(({ about }) => about === "redistribution")?.text).toMatch(/^the night side/);
  });
});

describe("facts", () => {
  it("are null where nothing is said", () => {
    const { facts } = readPlanet(simple());
    expect(facts).toEqual({
      stars: [],
      semiMajorAxis: null,
      orbitalPeriod: null,
      eccentricity: 0,
      fluxAtSemiMajorAxis: 1361,
      fluxAtPeriastron: 1361,
      fluxAtApoastron: 1361,
      meanFlux: 1361,
      heatCapacity: 4.2e8,
      surfacePressure: null,
      lapseRate: null,
      rotationPeriod: null,
      locked: null,
      mass: null,
      radius: null,
    });
  });
  it("follow from what is given", () => {
    const { facts, flux } = readPlanet(orsolne());
    const [star] = facts.stars;
    expect(star).toMatchObject({ name: "Talvar", path: "star", effectiveTemperature: 4680, mass: null });
    // 4π·(0.68·6.957e8)²·5.670374419e-8·4680⁴ = 7.650095e25 W, worked out with bc
    expect((star?.luminosity as number) / 7.650095e25).toBeCloseTo(1, 6);
    expect(facts).toMatchObject({ eccentricity: 0.08, orbitalPeriod: null, meanFlux: flux });
    close(facts.fluxAtPeriastron / facts.fluxAtSemiMajorAxis, 1 / (0.92 * 0.92));
    close(facts.fluxAtApoastron / facts.fluxAtSemiMajorAxis, 1 / (1.08 * 1.08));
    close(facts.heatCapacity, 60 * 1025 * 3990);
  });
  it("have the period from Kepler and the star's temperature from its size", () => {
    const star = { luminosity: "1 solLum", radius: "1 solRad", mass: "1 solMass" };
    const { facts } = readPlanet(simple({ star, orbit: { semiMajorAxis: "1 au" } }));
    // a Gaussian year is 365.2568983 d; the nominal solar mass agrees with Gauss's to 1e-9
    expect((facts.orbitalPeriod as number) / 86400).toBeCloseTo(365.2569, 3);
    // IAU 2015 B3: 5772 K
    expect(Math.abs((facts.stars[0]?.effectiveTemperature as number) - 5772)).toBeLessThan(0.5);
  });
  it("keep air, rotation and body in SI, with a note that no state depends on them", () => {
    const planet = readPlanet(
      simple({
        atmosphere: { pressure: "0.8 bar", lapseRate: "6.5 K km-1" },
        rotation: { period: "30 h", locked: false },
        mass: "2 earthMass",
        radius: "1.2 earthRad",
      }),
    );
    expect(planet.facts).toMatchObject({ surfacePressure: 80_000, rotationPeriod: 108_000, locked: false });
    close(planet.facts.lapseRate, 0.0065);
    close(planet.facts.radius, 1.2 * 6378100);
    expect(planet.notes.filter(({ code }) => code === "input-unused").map(({ about }) => about)).toEqual([
      "atmosphere.pressure",
      "atmosphere.lapseRate",
      "rotation.period",
      "mass",
      "radius",
    ]);
  });
  it("turn a locked planet once in an orbit", () => {
    const rotation = { locked: true };
    const orbit = { flux: "1000 W m-2", period: "12 d" };
    expect(readPlanet(simple({ orbit, rotation })).facts.rotationPeriod).toBe(12 * 86400);
  });
  it("take the surface pressure of the heat capacity where there is no other", () => {
    const heatCapacity = {
      law: "atmosphereCapacity",
      surfacePressure: "2 bar",
      gravity: "9.8 m s-2",
      specificHeat: "1004 J kg-1 K-1",
    };
    expect(readPlanet(simple({ heatCapacity })).facts.surfacePressure).toBe(2e5);
    const planet = readPlanet(simple({ heatCapacity, atmosphere: { pressure: "2.01 bar" } }));
    expect(planet.notes).toContainEqual(expect.objectContaining({ code: "inputs-agree" }));
  });
});

test("an unknown heat capacity leaves the states as they are and has a note", () => {
  const planet = readPlanet(simple({ heatCapacity: "unknown" }));
  expect(planet.facts.heatCapacity).toBeNull();
  expect(planet.notes.map(({ about }) => about)).toContain("heatCapacity");
  const [state] = findStates(planet.loop, { within: [50, 1000] }).states;
  const [same] = findStates(readPlanet(simple()).loop, { within: [50, 1000] }).states;
  expect(state?.temperature).toBe(same?.temperature);
});
