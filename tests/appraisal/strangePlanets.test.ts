// Reports of planets that are allowed and unlike Earth, read as a newcomer reads them.
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { toRows } from "../../src/appraisal/toRows.ts";
import { toText } from "../../src/appraisal/toText.ts";
import { plain, snowy } from "./planets.ts";

const textOf = (description: unknown) => toText(appraisePlanet(description));
const flat = (description: unknown) => textOf(description).replace(/\s+/g, " ");

describe("a planet that keeps one side to its star", () => {
  const locked = (redistribution: unknown) =>
    plain({ redistribution, rotation: { locked: true }, orbit: { period: "3 d" } });

  it.each([
    [{ transport: 0.4, side: "day" }, "day side or a part of it, not of the whole planet: f = 0.5"],
    [{ transport: 0.4, side: "night" }, "night side, not of the whole planet: f = 0.1"],
    ["substellar", "day side or a part of it, not of the whole planet: f = 1"],
  ])("with %j says whose climates these are", (redistribution, said) => {
    expect(flat(locked(redistribution))).toContain(`these are climates of the ${said}`);
  });

  it("says nothing of the kind where heat is spread over the whole", () => {
    expect(flat(locked("global"))).not.toContain("these are climates of");
    expect(flat(locked({ transport: 1, side: "day" }))).not.toContain("these are climates of");
  });

  it("is not called slow, and its words are among the inputs", () => {
    const text = textOf(locked({ transport: 0.4, side: "day" }));
    expect(text.replace(/\s+/g, " ")).toContain("rotation 3 d: a planet that keeps one side to its star can");
    expect(text).toMatch(/redistribution\.transport +0\.4\n +redistribution\.side +day\n/);
    expect(text).toMatch(/longwave\.emissivity .*\n +heatCapacity .*\n +rotation\.locked +true\n/);
  });
});

test("an eccentric orbit shows the flux that its climates have", () => {
  const orbit = (average: string) => ({ semiMajorAxis: "0.46 au", eccentricity: 0.9, average });
  const [cold, warm] = ["temperature", "flux"].map((average) => plain({ orbit: orbit(average) }));
  const { starlight, states } = appraisePlanet(cold);
  const { flux } = starlight.taken;
  // f = 1/4, A = 0.3: what the ledger absorbs
  expect(states[0]?.state.ledger.flows[0]?.value).toBeCloseTo((0.7 * flux) / 4, 9);
  expect(flux).toBeLessThan(starlight.mean.flux / 2);
  expect(textOf(cold)).toMatch(new RegExp(`that the climates below have +${flux.toFixed(1)} `));
  expect(textOf(warm)).not.toContain("that the climates below have");
  expect(toRows(appraisePlanet(cold))).toContainEqual({
    name: "starlight.taken.flux",
    value: flux,
    unit: "W m-2",
  });
});

test("a companion far away has a flux above 0, and names of stars are told", () => {
  const star = [
    { name: "Ash", luminosity: "0.2 solLum" },
    { name: "Birch", luminosity: "2 solLum", distance: "300 au" },
  ];
  const text = textOf(plain({ star }));
  // 2·1361.17/300² W m⁻²
  expect(text).toMatch(/of stars that it does not orbit, besides +0\.0302 +2\.22e-5\n/);
  expect(text).toMatch(/star\[1\]\.distance .*\n +star\[1\]\.name +Birch\n/);
});

test("a body without any greenhouse has none, not what rounding leaves", () => {
  const bare = plain({
    longwave: { law: "greyEmission", emissivity: 1 },
    orbit: { semiMajorAxis: "0.0452 au" },
  });
  const appraisal = appraisePlanet(bare);
  expect(Math.abs(appraisal.states[0]?.greenhouseWarming as number)).toBeLessThan(1e-9);
  expect(toText(appraisal)).toMatch(/^ +\d+\.\d{3} +stable .* 0$/m);
  expect(textOf(plain())).toMatch(/^ +\d+\.\d{3} +stable .* \+\d+\.\d+$/m);
});

test("a feedback that is nothing has no sign", () => {
  const hot = snowy({
    albedo: { law: "rampAlbedo", cold: 0.5, warm: 0.15, frozenBelow: "250 K", openAbove: "260 K" },
  });
  expect(textOf(hot)).toMatch(/albedo +0 +none, f = 0\n/);
});

test("without errors of inputs there is no empty column for them", () => {
  expect(textOf(plain())).not.toContain("K for its errors");
  expect(textOf(snowy())).toContain("K for its errors, + and -");
});

test("a mass outside of the limits has the limits in round numbers", () => {
  expect(flat(plain({ mass: "0.7 jupiterMass" }))).toContain("was computed for 0.1 to 5, so no limit");
});

test("covers have their names and the one that takes the rest, laws without inputs stand in order", () => {
  const ice = { share: { law: "iceShare", frozenBelow: "250 K", openAbove: "270 K" }, albedo: 0.6 };
  const covers = [
    { ...ice, name: "ice" },
    { albedo: 0.06, share: "rest", name: "sea" },
  ];
  const text = textOf(
    plain({ albedo: { covers }, longwave: { law: "budykoEmission" }, heatCapacity: "unknown" }),
  );
  const inputs = text.slice(text.indexOf("\nInputs\n"), text.indexOf("\nStarlight\n"));
  const paths = [...inputs.matchAll(/^ {2}(\S+)/gm)].map(([, path]) => path);
  expect(paths.slice(paths.indexOf("redistribution") + 1)).toEqual([
    "albedo.covers[0].share",
    "albedo.covers[0].share.frozenBelow",
    "albedo.covers[0].share.openAbove",
    "albedo.covers[0].albedo",
    "albedo.covers[0].name",
    "albedo.covers[1].albedo",
    "albedo.covers[1].name",
    "albedo.covers[1].share",
    "longwave",
    "heatCapacity",
  ]);
});

test("a diagram that is not all decided does not pass for one without tipping points", () => {
  const ceiling = {
    law: "ceilingEmission",
    ceiling: "282 W m-2",
    emission: { law: "greyColumnEmission", opticalDepth: 1.2 },
  };
  const steam = plain({
    ...{
      star: { luminosity: "1 solLum" },
      orbit: { semiMajorAxis: "0.93 au" },
      albedo: 0.25,
      longwave: ceiling,
    },
  });
  const { diagram } = appraisePlanet(steam);
  expect(diagram?.complete).toBe(false);
  expect(flat(steam)).toContain(
    "stable at 1400.02 K. No tipping point was found from 0.4 to 2.5 times today's light, but not all of that is decided.",
  );
});
