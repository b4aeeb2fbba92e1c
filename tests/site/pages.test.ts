// The site as files: all pages are there, all links lead somewhere, nothing in them needs a server or breaks their policy.
import fs from "node:fs";
import path from "node:path";
import zlib from "node:zlib";
import { beforeAll, describe, expect, test } from "vitest";
import { doors, specifierOf } from "../../.config/doors.mjs";
import { exportsOf } from "../../.config/site/exportsOf.mjs";
import { type BuiltPage, brokenLinks, builtSite, headingLevels, pagesOf } from "./pagesOf.ts";

let folder: string;
let pages: BuiltPage[];
beforeAll(async () => {
  folder = await builtSite("site-pages");
  pages = pagesOf(folder);
});

const pageNamed = (name: string): BuiltPage => pages.find((page) => page.name === name) as BuiltPage;
const sizeOf = (file: string): number =>
  zlib.gzipSync(fs.readFileSync(path.join(folder, file)), { level: 9 }).length;

describe("the pages", () => {
  test("are those of all documents, of all doors, and the live one", () => {
    const documents = fs
      .readdirSync("docs")
      .filter((name) => name.endsWith(".md") && name !== "api-report.md");
    const manual = [...documents, "CHANGELOG.md", "DEVELOPERS.md"].map((name) =>
      name.toLowerCase().slice(0, -3),
    );
    const api = doors.map((door: string) => `api-${specifierOf(door).replace("/", "-")}`);
    const names = [...manual, ...api, "index", "live"].map((name) => `${name}.html`);
    expect(pages.map(({ name }) => name).sort()).toEqual(names.sort());
  });

  test("have the whole of their documents: headings, tables, code, formulas", () => {
    const count = (text: string, pattern: RegExp) => [...text.matchAll(pattern)].length;
    const files = fs.readdirSync("docs").filter((name) => name.endsWith(".md") && name !== "api-report.md");
    for (const file of files) {
      const text = fs.readFileSync(`docs/${file}`, "utf8");
      const prose = text.replace(/^```.*?^```$/gms, "");
      const body = (pageNamed(file.replace(".md", ".html")).html.split("<main")[1] as string).split(
        "</main>",
      )[0];
      const found = [/<h[1-6]/g, /<table>/g, /<math/g].map((pattern) => count(body as string, pattern));
      const wanted = [count(prose, /^#{1,6} /gm), count(prose, /^\| :?-+/gm), count(text, /^```math$/gm)];
      expect(found, file).toEqual(wanted);
      const fences = count(text, /^```(?!math)\w/gm);
      expect(count(body as string, /<pre/g), file).toBeGreaterThanOrEqual(fences);
    }
  });

  test("link to what is there", () => {
    expect(
      pages.flatMap((page) => brokenLinks(page, pages, folder).map((link) => `${page.name}: ${link}`)),
    ).toEqual([]);
    const planted = {
      ...pageNamed("index.html"),
      links: ["gone.html", "laws.html#gone", "laws.html#absorbedflux"],
    };
    expect(brokenLinks(planted, pages, folder)).toEqual(["gone.html", "laws.html#gone"]);
  });

  test("are in one language, with one title each and headings that leave out no level", () => {
    for (const page of pages) {
      expect(page.html, page.name).toContain('<html lang="en">');
      expect(page.html, page.name).toMatch(/<title>[^<]+<\/title>/);
      const levels = headingLevels(page);
      expect(
        levels.filter((level) => level === 1),
        page.name,
      ).toHaveLength(1);
      const leaps = levels.filter((level, i) => i > 0 && level > (levels[i - 1] as number) + 1);
      expect(leaps, page.name).toEqual([]);
    }
  });

  test("forbid themselves everything but files of the site, and hold no code or style", () => {
    for (const { name, html, links } of pages) {
      expect(html, name).toContain(
        `<meta http-equiv="Content-Security-Policy" content="default-src 'none'; script-src 'self'; style-src 'self';`,
      );
      expect(html, name).not.toMatch(/<script(?![^>]* src=)/);
      expect(html, name).not.toMatch(/<style|<[a-z][^>]* (style|on[a-z]+)="/);
      expect(
        links.filter((link) => link.startsWith("http")),
        name,
      ).toEqual([]);
    }
    const scripted = pages.filter(({ html }) => html.includes("<script")).map(({ name }) => name);
    expect(scripted).toEqual(["live.html"]);
  });

  test("have a label for every field", () => {
    const { html } = pageNamed("live.html");
    const fields = [...html.matchAll(/<(?:select|textarea|input)[^>]* id="(\w+)"/g)].map((match) => match[1]);
    expect(fields).toEqual(["planets", "hottest", "text"]);
    for (const field of fields) expect(html).toContain(`<label for="${field}"`);
  });
});

describe("the reference", () => {
  test.each(doors.map((door: string) => [door]))(
    "of %s has every export with a signature and words",
    (door) => {
      const { html } = pageNamed(`api-${specifierOf(door).replace("/", "-")}.html`);
      const sections = new Map(
        html
          .split('<section class="entry" aria-labelledby="')
          .slice(1)
          .map((text) => [text.slice(0, text.indexOf('"')), text]),
      );
      const names = exportsOf(door).map(({ name }: { name: string }) => name);
      expect(names.length).toBeGreaterThan(20);
      expect([...sections.keys()].sort()).toEqual([...names].sort());
      for (const [name, text] of sections) {
        expect(text, name).toMatch(
          /<pre tabindex="0"><code>[\s\S]{4,}?<\/code><\/pre>\n<p>[\s\S]{8,}?<p class="source">src\//,
        );
      }
    },
  );

  test("has everything that the built package exports", async () => {
    for (const door of doors) {
      const built = await import(/* @vite-ignore */ path.resolve("dist", `${door}.js`));
      const names = exportsOf(door).map(({ name }: { name: string }) => name);
      expect(Object.keys(built).filter((name) => !names.includes(name))).toEqual([]);
    }
  });

  test("writes laws by their ports, functions without their bodies, types as they are", () => {
    const { html } = pageNamed("api-thermostead.html");
    expect(html).toContain("<code>absorbedFlux({ flux, albedo }) → W m-2</code>");
    expect(html).toMatch(/<code>function findStates&lt;[^{}]*&gt;\(/);
    expect(html).toContain("<code>type Range = ");
    expect(html).toContain('<a href="errors.html#out-of-range"><code>out-of-range</code></a>');
  });
});

// gzipped bytes; the limits are what there is today and a little, so that nothing grows unnoticed
describe("sizes", () => {
  test("the first paint of the live page needs at most 120 kB, and in fact a tenth of it", () => {
    const { html } = pageNamed("live.html");
    const needed = [...html.matchAll(/<(?:link|script)[^>]* (?:href|src)="([^"]+)"/g)].map(
      (match) => match[1] as string,
    );
    expect(needed.sort()).toEqual([
      "assets/icon.svg",
      "assets/live.css",
      "assets/live.js",
      "assets/site.css",
    ]);
    const bytes = ["live.html", ...needed].map(sizeOf).reduce((a, b) => a + b);
    expect(bytes).toBeLessThan(12_000);
  });

  test("what is loaded after it", () => {
    expect(sizeOf("assets/library.js")).toBeLessThan(180_000);
  });

  test("no page of the manual is heavy", () => {
    const heavy = pages.filter(({ name }) => sizeOf(name) > 60_000).map(({ name }) => name);
    expect(heavy).toEqual([]);
  });
});

describe("colours", () => {
  const css = fs.readFileSync(".config/site/assets/site.css", "utf8");
  const schemes = [...css.matchAll(/:root \{([^}]*)\}/g)].map((match) =>
    Object.fromEntries(
      [...(match[1] as string).matchAll(/--(\w+): (#\w+);/g)].map(([, name, colour]) => [
        name,
        colour as string,
      ]),
    ),
  );

  /** Relative luminance (WCAG 2.2). */
  function luminance(colour: string): number {
    const digits =
      colour.length === 4 ? [...colour.slice(1)].map((d) => d + d) : colour.slice(1).match(/../g);
    const [r = 0, g = 0, b = 0] = (digits as string[]).map((pair) => {
      const share = Number.parseInt(pair, 16) / 255;
      return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
    });
    return 0.2126 * r + 0.7152 * g + 0.0722 * b;
  }
  const contrast = (a: string, b: string): number => {
    const [low = 0, high = 0] = [luminance(a), luminance(b)].sort((x, y) => x - y);
    return (high + 0.05) / (low + 0.05);
  };

  test("of all words stand out by 4.5 to 1 at least, light and dark", () => {
    expect(contrast("#000", "#fff")).toBeCloseTo(21, 10);
    expect(schemes).toHaveLength(2);
    for (const scheme of schemes) {
      for (const words of ["ink", "faint", "link", "warm"]) {
        for (const ground of ["paper", "tint"]) {
          expect(
            contrast(scheme[words] as string, scheme[ground] as string),
            `${words} on ${ground}`,
          ).toBeGreaterThan(4.5);
        }
      }
    }
  });
});
