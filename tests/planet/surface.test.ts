// What lies below air and clouds: covers in two bands, ice that answers to temperature, and where sunlight goes.
import { describe, expect, it, test } from "vitest";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { findStates } from "../../src/states/findStates.ts";
import { residualOf } from "../../src/states/ledger.ts";
import { simple } from "./orsolne.ts";

/** A planet without `albedo`. */
const over = (surface: unknown, fields: object = {}) => simple({ albedo: undefined, surface, ...fields });
const statesOf = (description: unknown, at: Record<string, number> = {}) =>
  findStates(readPlanet(description).loop, { within: [50, 1000], at }).states;

/** A handful of rounded operations. */
const ROUNDING = 1e-14;
const close = (value: number | null | undefined, expected: number) =>
  expect(Math.abs((value as number) / expected - 1)).toBeLessThan(ROUNDING);

describe("clouds over a surface", () => {
  // R 0.4, a 0.1, α 0.3: what is reflected, absorbed below and absorbed in the cloud, as the project's brief prints them
  const clouds = { share: 1, reflectance: 0.4, absorptance: 0.1 };
  const [reflected, below, aloft] = [0.485227273, 0.397727273, 0.117045455] as const;
  const incoming = 1361 / 4;

  it("give the planetary albedo as an output, beside that of the surface", () => {
    const planet = readPlanet(over(0.3, { clouds }));
    expect(planet.assumptions).toMatchObject({ albedoOf: "surface and sky", albedoLaw: null });
    expect(planet.assumptions.albedo).toBeCloseTo(reflected, 9);
    expect(planet.equilibriumTemperature?.albedo).toBe(planet.assumptions.albedo);
    const [state] = statesOf(over(0.3, { clouds }));
    expect(state?.report).toMatchObject({ albedo: planet.assumptions.albedo, surfaceAlbedo: 0.3 });
  });
  it("split sunlight into flows, all of which end in the surface", () => {
    const [state] = statesOf(over(0.3, { clouds }));
    const flows = Object.fromEntries((state?.ledger.flows ?? []).map((flow) => [flow.name, flow]));
    expect(flows.sunlight).toMatchObject({
      from: "space",
      to: "surface",
      standardName: "surface_net_downward_shortwave_flux",
    });
    expect((flows.sunlight?.value ?? 0) / incoming).toBeCloseTo(below, 9);
    expect(flows.sunlightAloft).toMatchObject({ from: "space", to: "atmosphere" });
    expect((flows.sunlightAloft?.value ?? 0) / incoming).toBeCloseTo(aloft, 9);
    expect(flows.heatFromAloft).toMatchObject({ from: "atmosphere", value: flows.sunlightAloft?.value });
    expect(state?.notes).toEqual([]);
    for (const name of ["surface", "atmosphere"])
      expect(Math.abs(residualOf(state?.ledger as never, name))).toBeLessThan(1e-12 * incoming);
  });
  it("count by their share of the sky, which can be swept", () => {
    const description = over(0.3, { clouds: { ...clouds, share: 0.5 } });
    const albedoAt = (share: number) => statesOf(description, { "clouds.share": share })[0]?.report.albedo;
    close(albedoAt(0), 0.3);
    expect(albedoAt(1)).toBeCloseTo(reflected, 9);
    close(albedoAt(0.25), 0.75 * 0.3 + 0.25 * (albedoAt(1) as number));
  });
  it("leave the clear sky to the air, if that reflects or absorbs", () => {
    // the same layer in the clear sky as in the cloudy one is one layer everywhere
    const atmosphere = { reflectance: 0.4, absorptance: 0.1 };
    const one = readPlanet(over(0.3, { clouds })).assumptions.albedo as number;
    close(readPlanet(over(0.3, { atmosphere })).assumptions.albedo, one);
    close(readPlanet(over(0.3, { clouds: { ...clouds, share: 0.4 }, atmosphere })).assumptions.albedo, one);
  });
  it("that absorb nothing brighten the surface by R(1 − α)²/(1 − Rα)", () => {
    const sky = { share: 1, reflectance: 0.35 };
    const albedo = readPlanet(over(0.2, { clouds: sky })).assumptions.albedo as number;
    // R = 0.35, α = 0.2: 0.35·0.64/0.93 = 0.2408602150537634
    close(albedo - 0.2, 0.2408602150537634);
  });
  it("act on longwave alone where the albedo is the planet's", () => {
    const clouds = { share: 0.6, emissivity: 0.9, temperature: "255 K" };
    const [state] = statesOf(simple({ clouds }));
    // (1 − fε)·0.6σT⁴ + fε·σ·255⁴ = 0.7·1361/4, with fε = 0.54 and σ = 5.670374419e-8
    const cloudTop = 0.54 * 5.670374419e-8 * 255 ** 4;
    const fourth = (0.7 * incoming - cloudTop) / (0.46 * 0.6 * 5.670374419e-8);
    expect(Math.abs((state?.temperature as number) ** 4 / fourth - 1)).toBeLessThan(1e-13);
    expect(state?.report).not.toHaveProperty("surfaceAlbedo");
  });
  it("do both with one share", () => {
    const both = { ...clouds, share: 0.5, emissivity: 1, temperature: "250 K" };
    const { loop } = readPlanet(over(0.3, { clouds: both }));
    expect(loop.givens.filter(({ name }) => name.startsWith("clouds.")).map(({ name }) => name)).toEqual([
      "clouds.reflectance",
      "clouds.absorptance",
      "clouds.share",
      "clouds.emissivity",
      "clouds.temperature",
    ]);
  });
});

test("a surface without air and clouds is the planet", () => {
  const planet = readPlanet(over(0.3));
  expect(planet.assumptions.albedoOf).toBe("surface");
  expect(planet.equilibriumTemperature).toEqual(readPlanet(simple()).equilibriumTemperature);
  const [flow] = planet.loop.flows;
  expect(flow).toMatchObject({ name: "sunlight", standardName: "toa_net_downward_shortwave_flux" });
});

describe("covers in two bands", () => {
  const ice = { share: "rest", visible: 0.73, nearInfrared: 0.33 };
  it("weigh by the visible share of the star's energy: 0.52·0.73 + 0.48·0.33 = 0.538 (Shields et al. 2013)", () => {
    const planet = readPlanet(simple({ star: { visibleShare: 0.52 }, albedo: { covers: [ice] } }));
    close(planet.assumptions.albedo, 0.538);
    expect(planet.loop.givens.map(({ name }) => name)).toContain("star.visibleShare");
    expect(planet.notes.filter(({ about }) => about === "star.visibleShare")).toEqual([]);
  });
  it("take the star for a black body where the share is not given, and say so", () => {
    const star = { effectiveTemperature: "5772 K" };
    const planet = readPlanet(simple({ star, albedo: { covers: [ice] } }));
    const share = planet.facts.stars[0]?.visibleShare as number;
    // Planck's fraction below λT = 0.7 µm · 5772 K = 4040.4 µm K lies between the tables' 0.4809 (4000) and 0.5160 (4200)
    // (Incropera & DeWitt, Table 12.1, from memory)
    expect(share).toBeGreaterThan(0.4809);
    expect(share).toBeLessThan(0.4809 + (0.516 - 0.4809) / 4);
    close(planet.assumptions.albedo, 0.33 + 0.4 * share);
    expect(planet.notes).toContainEqual(
      expect.objectContaining({ about: "star.visibleShare", severity: "info", value: share }),
    );
  });
  it("caution where the star is too cool for that", () => {
    const star = { luminosity: "0.01 solLum", radius: "0.3 solRad" };
    const planet = readPlanet(simple({ star, albedo: { covers: [ice] } }));
    expect(planet.notes).toContainEqual(
      expect.objectContaining({ about: "star.visibleShare", severity: "caution" }),
    );
  });
  it("answer to the star's temperature", () => {
    const star = { effectiveTemperature: "5772 K" };
    const description = simple({ star, albedo: { covers: [ice] } });
    const [red] = statesOf(description, { "star.effectiveTemperature": 3000 });
    const [blue] = statesOf(description, { "star.effectiveTemperature": 8000 });
    expect(red?.report.albedo).toBeLessThan(blue?.report.albedo as number);
  });
  it("weigh several stars by their light", () => {
    const star = [
      { luminosity: "1 solLum", visibleShare: 0.5 },
      { luminosity: "3 solLum", visibleShare: 0.1 },
    ];
    const orbit = { semiMajorAxis: "2 au" };
    const planet = readPlanet(simple({ star, orbit, albedo: { covers: [ice] } }));
    close(planet.assumptions.albedo, 0.33 + 0.4 * 0.2);
  });
});

describe("ice whose share answers to temperature", () => {
  const covers = [
    {
      name: "ice",
      share: { law: "iceShare", frozenBelow: "250 K", openAbove: "280 K" },
      albedo: 0.6,
    },
    { name: "sea", share: 0.75, albedo: 0.06 },
    { name: "land", share: "rest", albedo: 0.2 },
  ];
  const open = 0.75 * 0.06 + 0.25 * 0.2;
  const column = { longwave: { law: "greyColumnEmission", opticalDepth: 0.8 } };

  it("lies over all others, so that a frozen planet is ice and an open one is not", () => {
    const states = statesOf(over({ covers }, column));
    expect(states.map(({ stability }) => stability)).toEqual(["stable", "unstable", "stable"]);
    close(states[0]?.report.surfaceAlbedo, 0.6);
    close(states[2]?.report.surfaceAlbedo, open);
    for (const { temperature, report } of states) {
      const frozen = Math.min(1, Math.max(0, (280 - temperature) / 30));
      close(report.surfaceAlbedo, open + frozen * (0.6 - open));
    }
  });
  it("makes the albedo a coupling under the name of its field", () => {
    const below = readPlanet(over({ covers }, column));
    expect(below.loop.couplings.map(({ name }) => name)).toEqual(["surfaceAlbedo"]);
    const whole = readPlanet(simple({ albedo: { covers } }));
    expect(whole.loop.couplings.map(({ name }) => name)).toEqual(["albedo"]);
    expect(whole.assumptions).toMatchObject({ albedo: null, albedoLaw: "iceShare" });
    expect(whole.equilibriumTemperature).toBeNull();
  });
  it("leaves the other shares and the temperatures free", () => {
    const names = readPlanet(over({ covers }, column)).loop.givens.map(({ name }) => name);
    expect(names).toContain("surface.covers[0].share.frozenBelow");
    expect(names).toContain("surface.covers[1].share");
  });
  it("lies over one other cover as well", () => {
    const planet = readPlanet(simple({ albedo: { covers: [covers[0], { share: 1, albedo: 0.1 }] } }));
    const [warm] = findStates(planet.loop, { within: [281, 400] }).states;
    close(warm?.report.albedo, 0.1);
  });
});

test("an albedo that leaps is a coupling with a state on either side, and the leap is named", () => {
  const step = { law: "stepAlbedo", cold: 0.62, warm: 0.32, threshold: "-10 degC" };
  const planet = readPlanet(over(step));
  expect(planet.loop.couplings.map(({ name }) => name)).toEqual(["surfaceAlbedo"]);
  const { states, undecided } = findStates(planet.loop, { within: [50, 1000] });
  expect(states.map(({ report }) => report.surfaceAlbedo)).toEqual([0.62, 0.32]);
  expect(undecided).toEqual([expect.objectContaining({ kind: "jump" })]);
});

test("a Bond albedo from a geometric one is a number", () => {
  const planet = readPlanet(simple({ albedo: { law: "bondAlbedo", geometric: 0.25, phaseIntegral: 1.2 } }));
  expect(planet.assumptions).toMatchObject({ albedo: 0.3, albedoLaw: "bondAlbedo", albedoOf: "planet" });
  expect(planet.loop.couplings).toEqual([]);
});
