// What an appraisal says of a planet that is not wholly known, of stars that are several, and of inputs that contradict.
import { describe, expect, it, test } from "vitest";
import type { Appraisal } from "../../src/appraisal/appraisal.ts";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { toText } from "../../src/appraisal/toText.ts";
import { codesOf, firstOf, numbersIn, plain, snowy, without } from "./planets.ts";

const missingOf = (description: unknown) => appraisePlanet(description).missing.map(({ path }) => path);

describe("a field that is left out is named, and what rests on it is left out", () => {
  it.each([
    ["albedo", { described: null, places: null }],
    ["redistribution", { described: null }],
  ])("%s", (field, equilibrium) => {
    const appraisal = appraisePlanet(without(plain(), field));
    expect(appraisal.missing.map(({ path }) => path)).toContain(field);
    expect(appraisal).toMatchObject({
      equilibrium,
      found: null,
      states: [],
      diagram: null,
      assumptions: null,
    });
    expect(appraisal.inputs.map(({ path }) => path)).not.toContain(field);
    expect(appraisal.notes.filter(({ about }) => about === field)).toEqual([]);
    expect(appraisal.notes.map(({ code }) => code)).toContain("incomplete-budget");
    expect(appraisal.equilibrium.conventional).toEqual(appraisePlanet(plain()).equilibrium.conventional);
  });

  test("longwave alone: equilibrium temperatures stay as described", () => {
    const appraisal = appraisePlanet(without(plain(), "longwave"));
    const whole = appraisePlanet(plain());
    expect(appraisal).toMatchObject({ found: null, states: [] });
    expect(appraisal.equilibrium).toEqual(whole.equilibrium);
    expect(appraisal.equilibrium.described).not.toBeNull();
    expect(appraisal.assumptions).toEqual(whole.assumptions);
    expect(appraisal.missing).toContainEqual({ path: "longwave", text: "no states" });
  });

  test("redistribution alone: places stay, as they do not depend on it", () => {
    const { equilibrium } = appraisePlanet(without(plain(), "redistribution"));
    expect(equilibrium.places).toEqual(appraisePlanet(plain()).equilibrium.places);
  });

  test("a surface below air that reflects", () => {
    const atmosphere = { pressure: "1 bar", reflectance: 0.1 };
    const air = { ...without(plain(), "albedo"), atmosphere };
    expect(missingOf(air)).toContain("surface");
    const clouds = { share: 0.5, reflectance: 0.4 };
    expect(missingOf({ ...without(plain(), "albedo"), clouds })).toContain("surface");
    expect(missingOf({ ...air, surface: 0.2 })).not.toContain("surface");
  });

  it.each([["left out"], ["unknown"]])("heatCapacity, %s", (word) => {
    const described = snowy({ heatCapacity: word === "unknown" ? word : undefined });
    const appraisal = appraisePlanet(described);
    expect(missingOf(described).includes("heatCapacity")).toBe(true);
    expect(appraisal.found).toMatchObject({ complete: true });
    for (const { averaging } of appraisal.states)
      expect(averaging).toMatchObject({ thermalInertiaRatio: null, favours: null });
    expect(firstOf(appraisal).averaging.text).toBe("the heat capacity is not known");
  });

  test("everything but star and orbit", () => {
    const { format, star, orbit } = plain();
    const appraisal = appraisePlanet({ format, star, orbit });
    expect(appraisal.missing.map(({ path }) => path)).toEqual([
      "redistribution",
      "albedo",
      "longwave",
      "heatCapacity",
      "orbit.eccentricity",
    ]);
    expect(appraisal.inputs.map(({ path }) => path)).toEqual([
      "star.radius",
      "star.effectiveTemperature",
      "star.mass",
      "orbit.semiMajorAxis",
    ]);
    expect(appraisal.habitableZone).toHaveLength(11);
    const named = appraisal.sources.flatMap(({ of }) => of);
    expect(named).toEqual(expect.arrayContaining(["stellarLuminosity", "stellarFlux", "orbitalPeriod"]));
    expect(named).not.toContain("greyEmission");
    expect(toText(appraisal)).not.toMatch(/null|undefined|NaN/);
  });

  test("a flux alone", () => {
    const appraisal = appraisePlanet({ format: "thermostead-planet-1", orbit: { flux: "1361 W m-2" } });
    expect(appraisal.starlight).toMatchObject({ luminosity: null, semiMajorAxis: null, period: null });
    expect(appraisal.starlight.mean).toEqual({ flux: 1361, earths: 1 });
    expect(appraisal.missing.map(({ path }) => path)).toContain("star.effectiveTemperature");
    expect(appraisal.habitableZone).toEqual([]);
  });

  test("the average over an eccentric orbit: that of the flux is taken, and said", () => {
    const orbit = { semiMajorAxis: "0.46 au", eccentricity: 0.3 };
    const [open, closed] = [{}, { average: "flux" }].map((more) =>
      appraisePlanet(plain({ orbit: { ...orbit, ...more } })),
    );
    expect(open?.states).toEqual(closed?.states);
    expect(open?.missing.map(({ path }) => path)).toContain("orbit.average");
    expect(closed?.missing.map(({ path }) => path)).not.toContain("orbit.average");
  });

  test("the eccentricity: a circle is taken, and said", () => {
    const orbit = { semiMajorAxis: "0.46 au" };
    const [open, closed] = [{}, { eccentricity: 0 }].map((more) =>
      appraisePlanet(plain({ orbit: { ...orbit, ...more } })),
    ) as [Appraisal, Appraisal];
    const path = "orbit.eccentricity";
    expect(open.starlight).toEqual(closed.starlight);
    expect(open.missing).toContainEqual({ path, text: "taken as 0, which is a circular orbit" });
    expect(closed.missing.map((field) => field.path)).not.toContain(path);
    const saying = (appraisal: Appraisal) =>
      appraisal.notes.filter(({ about }) => about.startsWith("orbit."));
    expect(saying(open)[0]).toMatchObject({
      about: path,
      text: "circular, as none is given: nothing is averaged",
    });
    expect(saying(closed)[0]).toMatchObject({ text: "a circular orbit, nothing is averaged" });
    expect(toText(open)).toContain("circular orbit, as no eccentricity is given");
    expect(toText(open)).toContain("the orbit is taken to be a circle");
    // a flux alone is read the same way
    expect(missingOf({ format: "thermostead-planet-1", orbit: { flux: "1361 W m-2" } })).toContain(path);
  });

  it.each([
    ["star.effectiveTemperature", plain({ star: { luminosity: "0.2 solLum" } })],
    ["star.luminosity", plain({ star: { effectiveTemperature: "4680 K" }, orbit: { flux: "900 W m-2" } })],
    ["atmosphere.pressure", plain()],
    ["orbit.period", plain({ star: { luminosity: "0.2 solLum" } })],
    ["star.brightening", plain()],
  ])("%s, which no state needs", (path, description) => {
    expect(missingOf(description)).toContain(path);
    expect(missingOf(snowy())).not.toContain(path);
  });
});

describe("inputs that contradict each other are noted, and the first is used", () => {
  it.each([
    [
      "a semi-major axis and a period",
      plain({ orbit: { semiMajorAxis: "0.46 au", period: "200 d" } }),
      "orbit.period and star.mass",
    ],
    [
      "a luminosity and a radius",
      plain({ star: { luminosity: "0.2 solLum", radius: "0.9 solRad", effectiveTemperature: "4680 K" } }),
      "star.radius and star.effectiveTemperature",
    ],
    ["a flux and a star", plain({ orbit: { semiMajorAxis: "0.46 au", flux: "900 W m-2" } }), "orbit.flux"],
    ["an orbit inside the star", plain({ orbit: { semiMajorAxis: "0.002 au" } }), "orbit"],
    [
      "two surface pressures",
      plain({
        atmosphere: { pressure: "1 bar" },
        heatCapacity: {
          law: "atmosphereCapacity",
          surfacePressure: "2 bar",
          gravity: "9 m s-2",
          specificHeat: "1000 J kg-1 K-1",
        },
      }),
      "heatCapacity.surfacePressure",
    ],
  ])("%s", (_, description, about) => {
    const { notes } = appraisePlanet(description);
    const found = notes.filter(({ code }) => code === "inputs-contradict");
    expect(found).toHaveLength(1);
    expect(found[0]).toMatchObject({ severity: "caution", about });
    expect(toText(appraisePlanet(description))).toContain("Cautions");
  });

  test("what agrees is no caution", () => {
    const orbit = { semiMajorAxis: "0.46 au", period: "134.3 d" };
    expect(codesOf(plain({ orbit }))).toContain("inputs-agree");
    expect(codesOf(plain({ orbit }))).not.toContain("inputs-contradict");
  });
});

describe("cautions", () => {
  const cool = { luminosity: "0.02 solLum", effectiveTemperature: "3300 K" };
  const covers = [{ share: "rest", visible: 0.6, nearInfrared: 0.2 }];
  it.each([
    ["a cool star with an albedo of the Sun's light", plain({ star: cool }), "albedo-of-another-star", true],
    ["a cool star and no albedo", without(plain({ star: cool }), "albedo"), "albedo-of-another-star", true],
    [
      "a cool star with two bands",
      plain({ star: cool, albedo: { covers } }),
      "albedo-of-another-star",
      false,
    ],
    ["a warmer star", plain(), "albedo-of-another-star", false],
    [
      "an eccentric orbit",
      plain({ orbit: { semiMajorAxis: "1 au", eccentricity: 0.2 } }),
      "eccentric-orbit",
      true,
    ],
    [
      "a nearly circular one",
      plain({ orbit: { semiMajorAxis: "1 au", eccentricity: 0.1 } }),
      "eccentric-orbit",
      false,
    ],
    ["a hot star", plain({ star: { ...cool, effectiveTemperature: "7201 K" } }), "star-outside-limits", true],
    [
      "a star at the end",
      plain({ star: { ...cool, effectiveTemperature: "7200 K" } }),
      "star-outside-limits",
      false,
    ],
    [
      "a brown dwarf",
      plain({ star: { ...cool, effectiveTemperature: "2599 K" } }),
      "star-outside-limits",
      true,
    ],
    ["a mass above those of the limits", plain({ mass: "10 earthMass" }), "mass-outside-limits", true],
    ["a mass below them", plain({ mass: "0.05 earthMass" }), "mass-outside-limits", true],
    ["a mass between them", plain({ mass: "5 earthMass" }), "mass-outside-limits", false],
    [
      "such a mass where there are no limits at all",
      plain({ mass: "10 earthMass", star: { ...cool, effectiveTemperature: "2599 K" } }),
      "mass-outside-limits",
      false,
    ],
    ["a locked planet", plain({ rotation: { locked: true } }), "slow-rotation", true],
    ["a slow one", plain({ rotation: { period: "30 d" } }), "slow-rotation", true],
    ["a fast one", plain({ rotation: { period: "20 d" } }), "slow-rotation", false],
  ])("%s", (_, description, code, noted) => {
    expect(codesOf(description).includes(code)).toBe(noted);
  });

  test("the source of a caution is among the sources, with its DOI", () => {
    const { sources } = appraisePlanet(plain({ star: cool }));
    const shields = sources.find(({ of }) => of.includes("albedo-of-another-star"));
    expect(shields?.dois).toEqual(["10.1089/ast.2012.0961"]);
  });
});

describe("several stars", () => {
  const sun = { luminosity: "0.1 solLum", effectiveTemperature: "4700 K", mass: "0.7 solMass" };
  const companion = { luminosity: "0.5 solLum", effectiveTemperature: "5500 K", distance: "10 au" };
  const stars = plain({ star: [sun, { ...sun, effectiveTemperature: "4600 K" }, companion] });
  const one = plain({ star: { ...sun, luminosity: "0.2 solLum", mass: "1.4 solMass" } });
  const [many, single] = [appraisePlanet(stars), appraisePlanet(one)];

  test("that it orbits count as one, others apart", () => {
    expect(many.starlight.luminosity).toBe(0.2 * 3.828e26);
    // the sum of two fluxes against the flux of a sum
    expect(Math.abs(many.starlight.mean.flux / single.starlight.mean.flux - 1)).toBeLessThan(1e-15);
    // L☉/4π au² from the nominal values, by a calculator: 1361.1664654
    const flux = (0.5 * 1361.1664654) / 100;
    expect(Math.abs((many.starlight.companions?.flux as number) / flux - 1)).toBeLessThan(1e-10);
    const added = many.equilibrium.conventional[0]?.value as number;
    expect(added).toBeGreaterThan(single.equilibrium.conventional[0]?.value as number);
    expect(firstOf(many).state.report.flux).toBe(
      many.starlight.mean.flux + (many.starlight.companions?.flux as number),
    );
    expect(many.equilibrium.described?.value).toBe(many.equilibrium.conventional[1]?.value);
    expect(many.equilibrium.orbit.meanOverTime).toBeNull();
  });

  test("have limits by the first that it orbits, and no margins", () => {
    expect(many.habitableZone.map(({ limit }) => limit)).toEqual(
      single.habitableZone.map(({ limit }) => limit),
    );
    expect(many.habitableZone[0]?.ratio).toBeGreaterThan(single.habitableZone[0]?.ratio as number);
    expect(many).toMatchObject({ diagram: null, ownLimits: [] });
    expect(many.notes.map(({ code }) => code)).toContain("several-stars");
    expect(many.states[0]?.margins).toBeNull();
    expect(many.states[0]?.feedbacks).not.toBeNull();
  });

  test("in a list of one are one", () => {
    const listed = appraisePlanet({ ...one, star: [one.star] });
    const values = (value: unknown) => numbersIn(value);
    expect(values(listed.states)).toEqual(values(single.states));
    expect(values(listed.diagram)).toEqual(values(single.diagram));
    const byRadius = plain({ star: [plain().star] });
    expect(values(appraisePlanet(byRadius).ownLimits)).toEqual(values(appraisePlanet(plain()).ownLimits));
    expect(appraisePlanet(byRadius).diagram?.along).toBe("star[0].luminosity");
  });
});

test("a star that is known by radius and temperature can light covers in two bands, at a distance in its radii", () => {
  const covers = [
    { share: 0.4, visible: 0.73, nearInfrared: 0.33 },
    { share: "rest", albedo: 0.1 },
  ];
  const orbit = { distanceInStellarRadii: 145 };
  const appraisal = appraisePlanet(plain({ albedo: { covers }, orbit }));
  expect(appraisal.states).toHaveLength(1);
  expect(firstOf(appraisal).margins?.along).toBe("star.luminosity");
});
