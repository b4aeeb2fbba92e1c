// Text, Markdown and rows of an appraisal.
import { describe, expect, it, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { toMarkdown } from "../../src/appraisal/toMarkdown.ts";
import { toRows } from "../../src/appraisal/toRows.ts";
import { toText } from "../../src/appraisal/toText.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { refusal } from "../refusal.ts";
import { isUnit } from "./isUnit.ts";
import { plain, snowy, without } from "./planets.ts";

const eccentric = { semiMajorAxis: "0.46 au", eccentricity: 0.4 };
const planets: readonly (readonly [string, unknown])[] = [
  ["with everything", snowy({ mass: "2 earthMass", rotation: { locked: true } })],
  ["with one climate", plain({ atmosphere: { pressure: "300 bar" } })],
  ["with star and orbit alone", { format: "thermostead-planet-1", star: plain().star, orbit: eccentric }],
  [
    "with long names and wide errors",
    snowy({
      star: {
        luminosity: {
          value: 0.20000000000000001,
          unit: "solLum",
          minus: 0.0123456789012,
          plus: 0.0234567890123,
        },
      },
      albedo: {
        covers: Array.from({ length: 12 }, (_, i) => ({
          name: "a name that is longer than any cover on a map of any planet needs to be",
          share:
            i === 11
              ? "rest"
              : {
                  value: 0.01,
                  minus: 0.00123456789012345,
                  plus: 0.00123456789012345,
                  source: "x".repeat(90),
                },
          albedo: { value: 0.3123456789012345, minus: 0.0123456789012345, plus: 0.0123456789012345 },
        })),
      },
      longwave: {
        law: "ceilingEmission",
        ceiling: {
          value: 290.1234567890123,
          unit: "W m-2",
          minus: 1.23456789012345,
          plus: 1.23456789012345,
        },
        emission: {
          law: "greyColumnEmission",
          opticalDepth: { value: 0.9123456789012345, minus: 0.01234567890123456, plus: 0.01234567890123456 },
        },
      },
    }),
  ],
  ["with a flux alone", { format: "thermostead-planet-1", orbit: { flux: "12 W m-2" } }],
  ["without a climate", plain({ orbit: { semiMajorAxis: "900 au" } })],
  ["without a longwave", without(snowy(), "longwave")],
];

describe.each(planets)("of a planet %s", (_, description) => {
  const appraisal = appraisePlanet(description);
  const text = toText(appraisal);

  test("text is plain, and of at most 80 columns outside of tables, 100 in them", () => {
    expect(text).not.toMatch(/undefined|NaN|Infinity|null|\[object/);
    expect(text.endsWith("\n")).toBe(true);
    const lines = text.split("\n").map((line) => [...line].length);
    // a table is told by gaps of two spaces between columns
    const prose = text.split("\n").filter((line) => !/\S {2,}\S/.test(line));
    expect(Math.max(...prose.map((line) => [...line].length))).toBeLessThanOrEqual(80);
    expect(Math.max(...lines)).toBeLessThanOrEqual(100);
    expect(text).not.toMatch(/ \n/);
  });

  test("every section of the text is in the Markdown", () => {
    const markdown = toMarkdown(appraisal);
    const titles = text
      .split("\n")
      .filter((line, i, all) => line !== "" && all[i - 1] === "" && /^\S/.test(line));
    for (const title of titles.slice(0, -1)) expect(markdown).toContain(`\n## ${title}\n`);
    expect(markdown).toContain("screening estimates");
    for (const row of markdown.split("\n").filter((line) => line.startsWith("|")))
      expect(row.endsWith(" |")).toBe(true);
  });

  test("rows are flat, finite, each with a unit and a name of its own", () => {
    const rows = toRows(appraisal);
    expect(new Set(rows.map(({ name }) => name)).size).toBe(rows.length);
    for (const row of rows) {
      expect(Object.keys(row)).toEqual(["name", "value", "unit"]);
      expect(row.name).toMatch(/^\S+$/);
      expect(isUnit(row.unit), row.unit).toBe(true);
      if (typeof row.value === "number") expect(Number.isFinite(row.value), row.name).toBe(true);
      else expect([typeof row.value, row.unit]).toEqual(["string", "1"]);
    }
  });
});

describe("text", () => {
  const text = toText(appraisePlanet(snowy({ mass: "2 earthMass", source: "invented", notes: ["A note."] })));
  it.each([
    ["where the description comes from", /^invented\. A note\.$/m],
    ["laws and inputs with units", /^ {2}albedo +tanhAlbedo\n {2}albedo\.cold +0\.62$/m],
    [
      "the note on an average without its number as the average's",
      /orbit\.average: the time-mean of the flux.*\(eccentricity\s+0\.08\)/s,
    ],
    ["errors of inputs", /star\.luminosity +0\.2 \+0\.02 -0\.01 solLum/],
    ["the mean flux", /mean over the orbit +1290\.7/],
    ["temperatures by convention", /A = 0\.3, f = 0\.5 \(the day side\) +298\.52/],
    ["climates", /^ +245\.996 +stable +-1\.736 .* 216\.23 +\+29\.76$/m],
    ["the proof", /proved: no other state between 50 and 2500 K/],
    ["the ledger", /sunlight +space to surface +123\.8871 +231\.4210/],
    ["loops with sign and strength", /albedo +\+0\.2794 +amplifies, f = 0\.1386/],
    ["what would change a climate", /at 246\.00 K +orbit\.semiMajorAxis +-1\.43$/m],
    ["what an error makes", /star\.luminosity +\+0\.714 +\+7\.14 -3\.57/],
    ["that there is no end", /if the star fades, no end down to 0\.4 times today/],
    ["the basin", /pushed above 263\.66 K, it goes to another climate/],
    ["the average", /thermal time \/ orbital period = \d/],
    ["water", /287\.57 +120000 +liquid +377\.93 +196\.27 +no/],
    ["published limits", /runaway greenhouse +5 +Kopparapu 2014 +1441\.5 .* crosses it/],
    [
      "the limit for its own mass",
      /runaway greenhouse \* +2 +Kopparapu 2014[\s\S]*\* interpolated by this library/,
    ],
    ["own limits", /fold of the climate at 246\.00 K, star brighter +255\.81/],
    ["assumptions", /^Assumptions$/m],
    ["constants", /constants: CODATA 2018/],
    ["sources with a DOI", /doi:10\.1088\/0004-637X\/729\/1\/54/],
  ])("has %s", (_, pattern) => {
    expect(text).toMatch(pattern);
  });

  test("has margins, with the time to the fold, what comes then and the way back", () => {
    const told =
      "if the star brightens by 8.99 %, in 2.00 Gyr, it ends in a fold at 255.81 K and jumps to 294.04 K; the way back is at 0.881 times today's";
    expect(text.replace(/\s+/g, " ")).toContain(told);
  });

  const ceiling = { law: "ceilingEmission", ceiling: "280 W m-2" };
  const under = (emission: object, description = plain) =>
    toText(appraisePlanet(description({ longwave: { ...ceiling, emission } }))).replace(/\s+/g, " ");

  test("has laws inside of laws", () => {
    const north = { law: "northEmission" };
    const depth = [0.4, { law: "vapourOpticalDepth", referenceTemperature: "288 K", referenceDepth: 0.8 }];
    const told = (longwave: object) => toText(appraisePlanet(plain({ longwave })));
    const capped = told({ ...ceiling, emission: north });
    expect(capped).toMatch(
      /longwave +ceilingEmission\n.*longwave\.ceiling.*\n.*longwave\.emission +northEmission\n/,
    );
    expect(told({ law: "greyColumnEmission", opticalDepth: depth })).toMatch(
      /longwave\.opticalDepth\[1\] +vapourOpticalDepth\n +longwave\.opticalDepth\[1\]\./,
    );
    const covers = [
      { share: { law: "iceShare", frozenBelow: "250 K", openAbove: "280 K" }, albedo: 0.6 },
      { share: "rest", albedo: 0.2 },
    ];
    expect(toText(appraisePlanet(plain({ albedo: { covers } })))).toMatch(
      /albedo\.covers\[0\]\.share +iceShare\n/,
    );
  });

  test("has inputs in notes as they are written, and long times in days", () => {
    const slow = (rotation: object, orbit: object = plain().orbit as object) =>
      toText(appraisePlanet(plain({ rotation, orbit }))).replace(/\s+/g, " ");
    expect(slow({ locked: true }, { period: "134.3 d" })).toContain(
      "rotation 134.3 d: a planet that keeps one side to its star",
    );
    const mass = toText(appraisePlanet(plain({ mass: "10 earthMass" }))).replace(/\s+/g, " ");
    expect(mass).toContain("mass 10 earthMass: 10 Earths: the runaway greenhouse was computed for 0.1 to 5");
    const contrary = plain({
      orbit: { semiMajorAxis: { value: 0.46, unit: "au", plus: 0.01 }, period: "20 d" },
    });
    expect(toText(appraisePlanet(contrary)).replace(/\s+/g, " ")).toContain(
      "orbit.period and star.mass (20 d and 0.72 solMass) give another semi-major axis than orbit.semiMajorAxis (0.46 +0.01 au), which is used:",
    );
  });

  test("says that there is no way back only where that is known", () => {
    // the way back leads through a stretch that is not decided: under a ceiling
    expect(under({ law: "greyColumnEmission", opticalDepth: 0.9 }, snowy)).toContain(
      "jumps to 1400.00 K; whether there is a way back is not known",
    );
    const short = appraisePlanet(snowy({ star: { luminosity: "0.25 solLum" } }));
    const [climate] = short.states.filter(({ margins }) => margins?.fall.jump);
    const fall = climate?.margins?.fall as NonNullable<NonNullable<typeof climate>["margins"]>["fall"];
    const jump = { ...fall.jump, returnsAt: null };
    const said = (noReturn: boolean) => {
      const margins = { ...climate?.margins, fall: { ...fall, jump: { ...jump, noReturn } } };
      const states = [{ ...climate, margins }];
      return toText({ ...short, states } as unknown as typeof short).replace(/\s+/g, " ");
    };
    expect(said(true)).toContain("K; there is no way back");
    expect(said(false)).toContain("K; whether there is a way back is not known");
  });

  test("has the bounds of what is not decided at an end, never a number in the middle", () => {
    expect(under({ law: "greyEmission", emissivity: 0.62 })).toContain(
      "if the star brightens, nothing is proved between 298.74 and 1400.00 K, from 1.245 times today's on",
    );
  });

  test("says along the star where there is no climate, and why", () => {
    const far = appraisePlanet(plain({ orbit: { semiMajorAxis: "0.9 au" } }), { within: [220, 400] });
    expect(toText(far)).toMatch(
      /from 0\.4 to 1\.\d+ times today's, no climate in the searched range: too cold/,
    );
  });

  test("says that a circular orbit has one average", () => {
    const orbit = { semiMajorAxis: "0.46 au", eccentricity: 0 };
    expect(toText(appraisePlanet(plain({ orbit })))).toContain(
      "the orbit is a circle, so that all averages are the same",
    );
  });

  test("names the climates of a note once", () => {
    const law = { law: "budykoEmission" };
    const told = toText(appraisePlanet(snowy({ longwave: law })));
    expect(told).toMatch(/budykoEmission\.temperature:? .*\(at [\d., K]+\)/s);
  });
});

describe("the summary on top", () => {
  const summaryOf = (description: unknown, options = {}) => {
    const appraisal = appraisePlanet(description, options);
    const [, rest = ""] =
      toText(appraisal)
        .split(/^(?=Inputs$)/m, 1)[0]
        ?.split(/\n(.*)/s) ?? [];
    const told = rest.trim().replace(/\n/g, " ");
    // the same words stand below the title of the Markdown
    expect(toMarkdown(appraisal).split("\n\n")[1]).toBe(told);
    return told;
  };

  it.each([
    [
      "several climates, and the nearest of the two tipping points",
      snowy({ name: undefined, star: { luminosity: "0.2 solLum" } }),
      "3 climates with the surface between 50 and 2500 K, proved to be all: 2 are stable, the coldest at 246.00 K and the warmest at 287.57 K. The nearest tipping point: if the star brightens by 8.99 %, the climate at 246.00 K ends.",
    ],
    [
      "one climate without a tipping point",
      plain(),
      "1 climate with the surface between 50 and 2500 K, proved to be the only one: stable at 285.16 K. No tipping point from 0.4 to 2.5 times today's light.",
    ],
    [
      "the other tipping point where the star is fainter",
      snowy({ star: { luminosity: "0.178 solLum" } }),
      "3 climates with the surface between 50 and 2500 K, proved to be all: 2 are stable, the coldest at 238.44 K and the warmest at 276.80 K. The nearest tipping point: if the star fades by 1.01 %, the climate at 276.80 K ends.",
    ],
    [
      "no climate",
      plain({ orbit: { semiMajorAxis: "900 au" } }),
      "No climate with the surface between 50 and 2500 K: proved. All over that range the planet loses more than it gains, so that it goes on to colder ones: look below it with a wider within.",
    ],
    [
      "no budget",
      without(plain(), "longwave"),
      "No climates were looked for: a part of the budget is not given.",
    ],
    [
      "a light of several stars, of which nothing is told",
      plain({ star: [{ luminosity: "0.1 solLum" }, { luminosity: "0.1 solLum" }] }),
      "1 climate with the surface between 50 and 2500 K, proved to be the only one: stable at 285.22 K.",
    ],
  ])("says %s", (_, description, told) => {
    expect(summaryOf(description)).toBe(told);
  });

  test("claims no proof where there is none", () => {
    const leap = { law: "stepAlbedo", cold: 0.6, warm: 0.3, threshold: "265 K" };
    expect(summaryOf(plain({ albedo: leap }))).toContain("K, but not all is decided: ");
    const least = "No climate was found with the surface between 264 and 266 K: not proved.";
    expect(summaryOf(plain({ albedo: leap }), { within: [264, 266] })).toBe(least);
  });
});

describe("markup and steering characters in names have no effect", () => {
  const name = "<script>alert(1)</script> | *b* `c` [d](javascript:e) &amp; # $x$ ~f~ \\ _g_";
  const star = { ...(snowy().star as object), name: "A\u001b[31m\nb\u202ec\u0000" };
  const hostile = appraisePlanet(
    snowy({ name, star, source: "1. https://example.org www.example.org a@example.org", notes: ["- x"] }),
  );

  test("Markdown escapes them", () => {
    const markdown = toMarkdown(hostile);
    const [title, , about] = markdown.split("\n\n") as [string, string, string];
    expect(title).toBe(
      "# &lt;script&gt;alert(1)&lt;/script&gt; \\| \\*b\\* \\`c\\` \\[d\\](javascript:e) &amp;amp; \\# \\$x\\$ \\~f\\~ \\\\ \\_g\\_, a planet of A \\[31m b c",
    );
    expect(about).toBe("&#8203;1. https&#58;//example.org www&#46;example.org a&#64;example.org. - x.");
  });

  test("numbers in tables stay as they are", () => {
    const markdown = toMarkdown(hostile);
    expect(markdown).toMatch(/\| 245\.996 \| stable \| -1\.736 \|/);
    expect(markdown).not.toMatch(/\\\d/);
  });

  test("text is on one line, without them", () => {
    const text = toText(hostile);
    const [title] = text.split("\n");
    for (const steering of ["\u001b", "\u0000", "\u202e"]) expect(text).not.toContain(steering);
    expect(title).toBe("<script>alert(1)</script> | *b* `c` [d](javascript:e) &amp; # $x$ ~f~ \\ _g_, a");
  });

  test("a word without end is broken", () => {
    const long = toText(appraisePlanet(plain({ name: "x".repeat(500) })));
    const lines = long.split("\n").slice(0, 7);
    expect(lines.join("")).toContain("x".repeat(500));
    for (const line of lines) expect(line.length).toBeLessThanOrEqual(80);
  });
});

describe("what is no appraisal is refused in words that say what is", () => {
  const { loop } = readPlanet(plain());
  const cases: readonly (readonly [string, unknown, string, string, unknown])[] = [
    ["nothing", null, "unreadable", "appraisal", null],
    ["a text", "appraisal", "unreadable", "appraisal", "appraisal"],
    ["a description", plain(), "unreadable", "appraisal.format", "thermostead-planet-1"],
    ["a loop", loop, "missing", "appraisal.format", undefined],
  ];
  it.each(cases)("%s", (_, value, code, path, received) => {
    for (const written of [toText, toMarkdown, toRows]) {
      const error = refusal(() => written(value as never));
      expect(error).toMatchObject({ code, path, value: received });
      expect(error.allowed).toContain("appraisePlanet returns");
    }
  });

  test("and one from JSON is read", () => {
    const appraisal = appraisePlanet(snowy());
    const again = JSON.parse(JSON.stringify(appraisal));
    for (const written of [toText, toMarkdown, toRows]) expect(written(again)).toEqual(written(appraisal));
  });
});

describe("sources", () => {
  test("keep a DOI with parentheses whole, and find several", () => {
    const { sources } = appraisePlanet(snowy());
    const of = (law: string) => sources.find((source) => source.of.includes(law))?.dois;
    expect(of("co2FrostPoint")).toEqual(["10.1016/0019-1035(82)90131-2", "10.1016/j.icarus.2012.10.019"]);
    expect(of("equilibriumTemperature")).toEqual(["10.1086/591964", "10.1088/0004-637X/729/1/54"]);
    expect(of("stellarFlux")).toEqual([]);
  });

  test("of inputs are read in any form", () => {
    const albedo = { value: 0.3, source: "see https://doi.org/10.1234/ab.cd-5. And (doi:10.5555/x(1)y)" };
    const { sources } = appraisePlanet(plain({ albedo }));
    expect(sources.find(({ of }) => of.includes("albedo"))?.dois).toEqual([
      "10.1234/ab.cd-5",
      "10.5555/x(1)y",
    ]);
  });
});
