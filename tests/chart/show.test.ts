// Results show themselves in every form there is, and nothing that is handed to them makes them throw.
import fs from "node:fs";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { appraisePlanet } from "../../src/appraisal/appraisePlanet.ts";
import { show, toHTML, toMarkdown, toSVG, toText, toVegaLite } from "../../src/chart/show.ts";
import { found, HARM, pictures, results, state } from "./cases.ts";
import { all, parsed } from "./svgText.ts";

type Forms = Readonly<Record<string, string>>;
const formsOf = (result: unknown): Forms => {
  const display = show(result)[Symbol.for("Jupyter.display")] as () => Forms;
  return display();
};

const TEXTS = ["text/plain", "text/html", "text/markdown"];
const ALL = [...TEXTS, "image/svg+xml", "application/vnd.vegalite.v5+json"];
const tablesOnly = ["margins", "solutions", "comparison", "columns", "rows"];

describe.each(Object.keys(results))("%s", (name) => {
  const forms = formsOf(results[name]);

  test("has all forms there are, each with something in it", () => {
    expect(Object.keys(forms)).toEqual(tablesOnly.includes(name) ? TEXTS : ALL);
    for (const form of Object.values(forms)) expect(JSON.stringify(form).length).toBeGreaterThan(40);
    for (const type of TEXTS) expect(forms[type]).not.toMatch(/NaN|undefined|\[object/);
  });

  test("is the same after JSON", () => {
    if (name === "columns") return; // typed arrays are not kept by JSON
    expect(formsOf(JSON.parse(JSON.stringify(results[name])))).toEqual(forms);
  });

  test("is well-formed HTML and straight Markdown tables", () => {
    parsed(`<div>${forms["text/html"]}</div>`);
    const rows = (forms["text/markdown"] as string).split("\n").filter((line) => line.startsWith("|"));
    expect(rows.length).toBeGreaterThan(2);
    const cells = rows.map((row) => row.replace(/\\\|/g, "").split("|").length);
    const blocks = (forms["text/markdown"] as string).split("\n\n").filter((block) => block.startsWith("|"));
    for (const block of blocks)
      expect(new Set(block.split("\n").map((r) => r.split("|").length)).size).toBe(1);
    expect(Math.min(...cells)).toBeGreaterThan(2);
  });
});

test("tables have heads with units and rows with numbers", () => {
  const text = toText(found);
  expect(text).toMatch(/temperature \(K\)/);
  expect(text).toMatch(/feedback parameter \(W m⁻² K⁻¹\)/);
  for (const { temperature } of found.states)
    expect(text).toContain(String(Number(temperature.toPrecision(6))));
  expect(toText(state)).toMatch(/imbalance temperature \(W m⁻²\)/);
  expect(toText(state)).toContain(`${state.bracket[0]} to ${state.bracket[1]}`);
  expect(toText(results.feedbacks)).toMatch(/responses flux temperature \(K per unit\)/);
  expect(toText(results.rows)).toMatch(/\| flux +\| 1361 +\| W m⁻² \|/);
});

test("units follow the place of a field: nested parameters have theirs, and columns of a user are not guessed", () => {
  const text = toText({
    proof: "proved",
    inputs: [{ path: "albedo.width", value: 9, unit: "K", within: [0, 1e5] }],
    starlight: { luminosity: 7.656e25, mean: { flux: 900 } },
    equilibrium: { orbit: { ofMeanFlux: 274.65, meanOverTime: 274.32 } },
    solved: { unit: "W", between: [1, 2], folds: [{ at: 1.5, temperature: 255 }] },
  });
  for (const head of ["starlight luminosity (W)", "starlight mean flux (W m⁻²)", "solved between (W)"])
    expect(text).toContain(head);
  expect(text).toContain("equilibrium orbit of mean flux (K)");
  expect(text).toContain("equilibrium orbit mean over time (K)");
  expect(text).toMatch(/solved folds:\n\n\| at \(W\) +\| temperature \(K\)/);
  expect(text).toMatch(/\| within +\|/);
  expect(text).toContain("7.656×10²⁵");
  const columns = toText([{ name: "Orsolne b", luminosity: 0.2, period: 88, temperature: 288 }]);
  expect(columns).toMatch(/luminosity \| period \| temperature \(K\)/);
});

test("long lists are cut, and say so", () => {
  const rows = Array.from({ length: 100 }, (_, i) => ({ name: `n${i}`, value: i }));
  expect(toText(rows)).toContain("values, without 40 more:");
  expect(toText(rows)).not.toContain("n60");
});

describe("an appraisal is known by its fields", () => {
  const appraisal = {
    name: "Orsolne",
    starlight: { mean: { flux: 900, earths: 0.66 } },
    found,
    notes: [{ text: "cool star" }],
  };

  test("with tables of its parts and a picture of its states", () => {
    const forms = formsOf(appraisal);
    expect(Object.keys(forms)).toEqual(ALL);
    expect(forms["text/plain"]).toContain("starlight mean flux (W m⁻²)");
    expect(forms["text/plain"]).toContain("cool star");
  });

  test("also without states", () => {
    expect(Object.keys(formsOf({ ...appraisal, found: null }))).toEqual(TEXTS);
  });
});

describe("the appraisal of the example planet", () => {
  const appraisal = appraisePlanet(JSON.parse(fs.readFileSync("docs/examples/orsolne.json", "utf8")));
  const html = parsed(`<div>${toHTML(appraisal)}</div>`);
  const tables = all(html, "table").map((table) => ({
    title: all(table, "caption")[0]?.text,
    head: all(table, "th").map((cell) => cell.text),
    rows: all(table, "tr").length - 1,
  }));

  test("has one table of its climates, of few columns", () => {
    expect(tables.filter(({ title }) => title?.includes("states"))).toEqual([
      { title: "states", head: expect.any(Array), rows: 3 },
    ]);
    expect(tables.find(({ title }) => title === "states")?.head).toEqual([
      "temperature (K)",
      "albedo",
      "equilibrium temperature (K)",
      "stability",
      "feedback parameter (W m⁻² K⁻¹)",
      "e folding time (s)",
    ]);
    // 165 before; inputs and limits have a dozen
    expect(Math.max(...tables.map(({ head }) => head.length))).toBeLessThan(15);
  });

  test("says how many climates were found, and where it was looked for them", () => {
    expect(all(html, "p").map((line) => line.text)).toContain(
      "States at 50 to 2500 K: 3, proved, undecided: 0",
    );
  });
});

test("pictures show themselves", () => {
  for (const picture of Object.values(pictures)) expect(Object.keys(formsOf(picture))).toEqual(ALL);
});

test("names are words, in HTML and in Markdown", () => {
  const rows = [{ name: HARM, value: HARM, [HARM]: HARM }];
  const html = parsed(`<div>${toHTML(rows)}</div>`);
  expect(all(html, "script")).toEqual([]);
  expect(all(html, "td").map((cell) => cell.text)).toContain(HARM.replace("\u0000\ud800", "  "));
  const markdown = toMarkdown(rows);
  expect(markdown).not.toContain("<");
  expect(markdown).toContain("\\|\\*\\_\\`\\$");
});

const cyclic: Record<string, unknown> = { states: [], within: [1, 2], proof: "proved", undecided: [] };
cyclic.self = cyclic;
const hostile = new Proxy(
  {},
  {
    get: () => {
      throw new Error("no");
    },
    has: () => {
      throw new Error("no");
    },
    ownKeys: () => {
      throw new Error("no");
    },
  },
);
const strange: readonly unknown[] = [
  undefined,
  null,
  0,
  Number.NaN,
  "text",
  Symbol("s"),
  12n,
  () => 1,
  [],
  [1],
  [null],
  {},
  new Map(),
  new Date(Number.NaN),
  cyclic,
  hostile,
  [hostile],
  {
    toJSON: () => {
      throw new Error("no");
    },
  },
  { states: 1, within: 2, proof: 3 },
  { states: [{}], within: [Number.NaN, 1], proof: "proved", undecided: [{}] },
  { reservoirs: [{ name: "a" }], flows: [{ name: "b", from: "a", to: "a", value: Number.NaN }] },
  { branches: [{}], folds: [{}], along: {} },
  { reference: {}, loops: [], through: [] },
  { temperatures: [1], counts: 1, first: 2 },
  { picture: "plot" },
  { picture: "ledger" },
  { picture: 7, title: {} },
  { points: [], within: [], dropped: 0 },
  { rise: 1, fall: 2 },
  { starlight: {}, found: {} },
];

describe("whatever it is handed", () => {
  test.each(strange.map((value, i) => [i, value]))("strange value %d does not throw", (_, value) => {
    const forms = formsOf(value);
    expect(typeof forms["text/plain"]).toBe("string");
    expect(Object.values(forms)).not.toContain(null);
    expect(typeof String(show(value))).toBe("string");
    for (const form of [toHTML, toMarkdown, toText]) expect(typeof form(value)).toBe("string");
    for (const form of [toSVG, toVegaLite]) expect(() => form(value)).not.toThrow();
  });

  test("any JSON does not throw", () => {
    fc.assert(
      fc.property(fc.jsonValue(), (value) => {
        expect(typeof formsOf(value)["text/plain"]).toBe("string");
      }),
      { seed: 20310, numRuns: 300 },
    );
  });

  test("a result with one field broken does not throw, and nothing that is drawn is not finite", () => {
    const broken = [Number.NaN, Number.POSITIVE_INFINITY, null, "x", [], {}, -1e308];
    const known = Object.values(results).filter((r): r is object => !Array.isArray(r));
    fc.assert(
      fc.property(fc.constantFrom(...known), fc.nat(), fc.constantFrom(...broken), (result, at, value) => {
        const keys = Object.keys(result);
        const forms = formsOf({ ...result, [keys[at % keys.length] as string]: value });
        // its words may say what is broken
        expect(String(forms["image/svg+xml"])).not.toMatch(
          / (d|[xy][12]?|width|height)="[^"]*(NaN|Infinity)/,
        );
        const spec = forms["application/vnd.vegalite.v5+json"] ?? null;
        expect(JSON.parse(JSON.stringify(spec))).toEqual(spec);
      }),
      { seed: 20311, numRuns: 400 },
    );
  });

  test("what is not known is JSON, cut short, as plain text only", () => {
    const said = "No result that docs/charts.md lists, as JSON:";
    expect(formsOf({ a: [1, 2] })).toEqual({ "text/plain": `${said}\n\n{  "a": [   1,   2  ] }` });
    expect(toHTML(null)).toBe(`<p>${said}</p>\n<p>null</p>`);
    expect((formsOf("x".repeat(5000))["text/plain"] as string).length).toBeLessThan(2010 + said.length);
    expect(toSVG({ a: 1 })).toBeNull();
    expect(toVegaLite(results.rows)).toBeNull();
  });
});

test("a width that no picture can have becomes the nearest that it can have, or the usual one", () => {
  const widths = [1, 239, 4001, Number.POSITIVE_INFINITY, Number.NaN, "wide", null];
  const drawn = widths.map((width) => {
    const svg = parsed(toSVG(found, { width: width as number }) as string);
    expect(toHTML(found, { width: width as number })).toContain(` width="${svg.attributes.width}"`);
    return svg.attributes.width;
  });
  expect(drawn).toEqual(["240", "240", "4000", "4000", "640", "640", "640"]);
  const display = show(found, { width: 1 })[Symbol.for("Jupyter.display")] as () => Forms;
  expect(Object.keys(display())).toEqual(ALL);
});
