// Fields that need or exclude each other: every refusal with its code and its path.
import { describe, expect, it, test } from "vitest";
import { planetSchema } from "../../src/planet/planetSchema.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { refusal } from "../refusal.ts";
import { simple } from "./orsolne.ts";

const over = (fields: object) => simple({ albedo: undefined, surface: 0.3, ...fields });
const covered = (...covers: object[]) => over({ surface: { covers } });
const emitting = (longwave: object, fields: object = {}) => simple({ longwave, ...fields });
const lit = (star: unknown, fields: object = {}) =>
  simple({ star, orbit: { semiMajorAxis: "1 au" }, ...fields });

const sun = { luminosity: "1 solLum" };
const far = { ...sun, distance: "9 au" };
const white = { share: 1, reflectance: 0.5 };
const ice = { share: { law: "iceShare", frozenBelow: "250 K", openAbove: "280 K" }, albedo: 0.6 };
const co2 = { law: "co2AdjustedForcingMyhre", concentration: 560e-6, reference: 280e-6 };
const dry = { law: "pressureOpticalDepth", referencePressure: "1 bar", referenceDepth: 1, exponent: 1 };
const column = (opticalDepth: unknown) => ({ law: "greyColumnEmission", opticalDepth });

type Fault = readonly [what: string, description: unknown, code: string, path: string];

const FAULTS: readonly Fault[] = [
  ["an albedo and a surface", simple({ surface: 0.3 }), "contradiction", "albedo"],
  ["neither", simple({ albedo: undefined }), "missing", "albedo"],
  ["an albedo below clouds that reflect", simple({ clouds: white }), "contradiction", "albedo"],
  [
    "an albedo below air that reflects",
    simple({ atmosphere: { reflectance: 0.1 } }),
    "contradiction",
    "albedo",
  ],
  [
    "an albedo below clouds that absorb",
    simple({ clouds: { share: 1, absorptance: 0.1 } }),
    "contradiction",
    "albedo",
  ],
  [
    "a Bond albedo of a surface",
    over({ surface: { law: "bondAlbedo", geometric: 0.2, phaseIntegral: 1 } }),
    "unknown-name",
    "surface.law",
  ],
  [
    "a geometric albedo that makes more than 1",
    simple({ albedo: { law: "bondAlbedo", geometric: 0.8, phaseIntegral: 1.5 } }),
    "out-of-range",
    "albedo.reflected",
  ],
  ["clouds without a share", over({ clouds: { reflectance: 0.5 } }), "missing", "clouds.share"],
  ["clouds that do nothing", simple({ clouds: { share: 0.5 } }), "missing", "clouds.emissivity"],
  [
    "clouds over a surface that let all light through",
    over({ clouds: { share: 0.5, emissivity: 1, temperature: "250 K" } }),
    "missing",
    "clouds.reflectance",
  ],
  [
    "clouds that only absorb",
    over({ clouds: { share: 0.5, absorptance: 0.1 } }),
    "missing",
    "clouds.reflectance",
  ],
  [
    "clouds without temperature",
    simple({ clouds: { share: 0.5, emissivity: 1 } }),
    "missing",
    "clouds.temperature",
  ],
  [
    "clouds without emissivity",
    simple({ clouds: { share: 0.5, temperature: "250 K" } }),
    "missing",
    "clouds.emissivity",
  ],
  [
    "clouds that take more than all light",
    over({ clouds: { ...white, absorptance: 0.6 } }),
    "out-of-range",
    "clouds.taken",
  ],
  [
    "mirrors above and below",
    over({ surface: 1, clouds: { share: 1, reflectance: 1 } }),
    "out-of-range",
    "clouds.thrownBack",
  ],
  ["air that only absorbs", over({ atmosphere: { absorptance: 0.1 } }), "missing", "atmosphere.reflectance"],
  ["a share of clouds above 1", over({ clouds: { ...white, share: 1.1 } }), "out-of-range", "clouds.share"],
  [
    "a misspelt field of clouds",
    over({ clouds: { ...white, albedo: 0.5 } }),
    "unknown-name",
    "clouds.albedo",
  ],
  [
    "a bare cloud temperature",
    simple({ clouds: { share: 1, emissivity: 1, temperature: 250 } }),
    "unit-mismatch",
    "clouds.temperature",
  ],
  ["ice alone", covered(ice), "shares-not-one", "surface.covers"],
  ["ice twice", covered(ice, ice, { share: "rest", albedo: 0.1 }), "repeated-name", "surface.covers"],
  [
    "shares beside ice that do not sum to 1",
    covered(ice, { share: 0.5, albedo: 0.1 }),
    "shares-not-one",
    "surface.covers",
  ],
  [
    "ice that melts before it freezes",
    covered({ ...ice, share: { ...ice.share, openAbove: "240 K" } }, { share: 1, albedo: 0.1 }),
    "out-of-range",
    "surface.covers[0].share.span",
  ],
  [
    "another law for a share",
    covered({ ...ice, share: { law: "tanhAlbedo" } }),
    "unknown-name",
    "surface.covers[0].share.law",
  ],
  ["one band", covered({ share: 1, visible: 0.3 }), "missing", "surface.covers[0].nearInfrared"],
  [
    "an albedo and bands",
    covered({ share: 1, albedo: 0.3, visible: 0.3 }),
    "unknown-name",
    "surface.covers[0].visible",
  ],
  [
    "bands in light that is not known",
    covered({ share: 1, visible: 0.3, nearInfrared: 0.1 }),
    "missing",
    "star.visibleShare",
  ],
  ["a visible share above 1", lit({ ...sun, visibleShare: 1.1 }), "out-of-range", "star.visibleShare"],
  ["no star in a list", lit([]), "unreadable", "star"],
  ["a dark star in a list", lit([sun, { mass: "1 solMass" }]), "missing", "star[1].luminosity"],
  [
    "a misspelt field in a list",
    lit([sun, { lumniosity: "1 solLum" }]),
    "unknown-name",
    "star[1].lumniosity",
  ],
  ["a value of a star in a list", lit([sun, { luminosity: 1 }]), "unit-mismatch", "star[1].luminosity"],
  ["a distance of the only star", lit({ ...sun, distance: "1 au" }), "unknown-name", "star.distance"],
  ["stars all of which are far", lit([far, far]), "contradiction", "star[0].distance"],
  ["a dark star far away", lit([sun, { distance: "9 au" }]), "missing", "star[1].luminosity"],
  [
    "a mean temperature under a far star",
    lit([sun, far], { orbit: { semiMajorAxis: "1 au", eccentricity: 0.1, average: "temperature" } }),
    "contradiction",
    "orbit.average",
  ],
  [
    "a period around a star without mass",
    lit([{ ...sun, mass: "1 solMass" }, sun], { orbit: { period: "1 yr" } }),
    "missing",
    "star[1].mass",
  ],
  [
    "bands of two stars without their luminosities",
    simple({
      star: [{ visibleShare: 0.5 }, { visibleShare: 0.1 }],
      albedo: { covers: [{ share: 1, visible: 0.3, nearInfrared: 0.1 }] },
    }),
    "missing",
    "star[0].luminosity",
  ],
  [
    "a side without transport",
    simple({ redistribution: { side: "day" } }),
    "missing",
    "redistribution.transport",
  ],
  [
    "another side",
    simple({ redistribution: { transport: 0.5, side: "left" } }),
    "unreadable",
    "redistribution.side",
  ],
  [
    "too much transport",
    simple({ redistribution: { transport: 1.5, side: "day" } }),
    "out-of-range",
    "redistribution.transport",
  ],
  ["no optical depths in a list", emitting(column([])), "unreadable", "longwave.opticalDepth"],
  ["a text as an optical depth", emitting(column("thick")), "not-a-number", "longwave.opticalDepth"],
  ["an optical depth below 0", emitting(column([0.1, -1])), "out-of-range", "longwave.opticalDepth[1]"],
  [
    "an unknown law of optical depth",
    emitting(column({ law: "vapourDepth" })),
    "unknown-name",
    "longwave.opticalDepth.law",
  ],
  [
    "a port of a nested law that is missing",
    emitting(column({ law: "vapourOpticalDepth", referenceDepth: 1 })),
    "missing",
    "longwave.opticalDepth.referenceTemperature",
  ],
  ["pressure that is not known", emitting(column(dry)), "missing", "atmosphere.pressure"],
  [
    "an emission from a height without lapse rate",
    emitting({ law: "heightEmission", height: "5 km" }),
    "missing",
    "atmosphere.lapseRate",
  ],
  [
    "pressure stated twice",
    emitting(column({ ...dry, pressure: "1 bar" }), { atmosphere: { pressure: "1 bar" } }),
    "unknown-name",
    "longwave.opticalDepth.pressure",
  ],
  [
    "a ceiling over nothing",
    emitting({ law: "ceilingEmission", ceiling: "282 W m-2" }),
    "missing",
    "longwave.emission",
  ],
  [
    "a ceiling over a ceiling",
    emitting({ law: "ceilingEmission", ceiling: "282 W m-2", emission: { law: "ceilingEmission" } }),
    "unknown-name",
    "longwave.emission.law",
  ],
  ["no layers", emitting({ law: "leakyStackEmission", layers: [] }), "unreadable", "longwave.layers"],
  [
    "more layers than a list may have",
    emitting({
      law: "leakyStackEmission",
      layers: new Array(101).fill({ emissivity: 1, heating: "0 W m-2" }),
    }),
    "unreadable",
    "longwave.layers",
  ],
  ["more stars than a list may have", lit(new Array(11).fill(sun)), "unreadable", "star"],
  [
    "more covers than a list may have",
    covered(...new Array(101).fill({ share: 0, albedo: 0 })),
    "unreadable",
    "surface.covers",
  ],
  [
    "a layer without heating",
    emitting({ law: "leakyStackEmission", layers: [{ emissivity: 0.5 }] }),
    "missing",
    "longwave.layers[0].heating",
  ],
  [
    "a heated layer that emits nothing",
    emitting({ law: "leakyStackEmission", layers: [{ emissivity: 0, heating: "10 W m-2" }] }),
    "out-of-range",
    "longwave.layers[0].heating",
  ],
  ["no forcing in a list", simple({ forcing: [] }), "unreadable", "forcing"],
  [
    "one gas twice",
    simple({ forcing: [co2, { ...co2, law: "co2AdjustedForcingMyhre" }] }),
    "repeated-name",
    "forcing",
  ],
  [
    "a forcing without its reference",
    simple({ forcing: { ...co2, reference: undefined } }),
    "missing",
    "forcing.reference",
  ],
  [
    "parts per million as they stand",
    simple({ forcing: { ...co2, concentration: 560 } }),
    "out-of-range",
    "forcing.concentration",
  ],
  ["an unknown forcing", simple({ forcing: [{ law: "co2Forcing" }] }), "unknown-name", "forcing[0].law"],
  ["a forcing as a number", simple({ forcing: "4 W m-2" }), "unreadable", "forcing"],
  ["a rotation of which nothing is said", simple({ rotation: {} }), "missing", "rotation.period"],
  ["a locked planet as a text", simple({ rotation: { locked: "yes" } }), "unreadable", "rotation.locked"],
  [
    "a locked planet that turns otherwise",
    simple({ orbit: { flux: "1 W m-2", period: "10 d" }, rotation: { locked: true, period: "1 d" } }),
    "contradiction",
    "rotation.period",
  ],
  [
    "a vacuum as a pressure",
    simple({ atmosphere: { pressure: "0 Pa" } }),
    "out-of-range",
    "atmosphere.pressure",
  ],
  [
    "two pressures",
    simple({
      atmosphere: { pressure: "1 bar" },
      heatCapacity: {
        law: "atmosphereCapacity",
        surfacePressure: "2 bar",
        gravity: "10 m s-2",
        specificHeat: "1000 J kg-1 K-1",
      },
    }),
    "contradiction",
    "heatCapacity.surfacePressure",
  ],
  [
    "a lapse rate in kelvin",
    simple({ atmosphere: { lapseRate: "6.5 K" } }),
    "unit-mismatch",
    "atmosphere.lapseRate",
  ],
  [
    "another word for an unknown heat capacity",
    simple({ heatCapacity: "none" }),
    "unreadable",
    "heatCapacity",
  ],
];

describe("a description is refused for", () => {
  it.each(FAULTS)("%s", (_, description, code, path) => {
    const error = refusal(() => readPlanet(description));
    // a condition that joins ports says in brackets what it joins
    const found = error.path.replace(/ \(.*/, "");
    expect({ code: error.code, path: found }).toEqual({ code, path });
    expect(error.allowed).not.toBe("");
    const result = planetSchema["~standard"].validate(description);
    // other faults are issues of their own
    expect("issues" in result && result.issues[0]?.message).toBe(error.message.replace(/; also: .*/, ""));
  });
});

test("an albedo below clouds is refused in words that say what to write", () => {
  const { message } = refusal(() => readPlanet(simple({ clouds: white })));
  expect(message).toMatch(/^albedo: contradiction, received 0\.3; allowed: surface in its place/);
});

test("a layer that cannot be heated is named with its heat", () => {
  const layers = [
    { emissivity: 0.5, heating: "10 W m-2" },
    { emissivity: 0, heating: "10 W m-2" },
  ];
  const longwave = {
    law: "ceilingEmission",
    ceiling: "300 W m-2",
    emission: { law: "leakyStackEmission", layers },
  };
  expect(refusal(() => readPlanet(simple({ longwave }))).message).toContain(
    "longwave.emission.layers[1].heating: out of range, received 10; allowed: with emissivity 0, as longwave.emission.layers[1] has it, only 0 W m-2",
  );
  const clear = [
    { emissivity: 0.5, heating: "10 W m-2" },
    { emissivity: 0, heating: "0 W m-2" },
  ];
  expect(() => readPlanet(simple({ longwave: { ...longwave.emission, layers: clear } }))).not.toThrow();
});
