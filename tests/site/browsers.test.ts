// The live page in real browsers, from the file system: it loads, follows edits, shows what is wrong beside the field, and
// fits a small screen.
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { engines } from "../../.config/engines/engines.mjs";
import { openPage } from "./livePage.mjs";
import { builtSite, pagesOf } from "./pagesOf.ts";

/** Firefox reports that the library asked whether it may generate code, which it may not; the library then interprets. */
const isAsking = (message: string): boolean => /blocked a JavaScript eval/.test(message);

let folder: string;
beforeAll(async () => {
  folder = await builtSite("site-browsers");
});

describe.each(["chromium", "firefox"] as const)("in %s", (name) => {
  const command = engines[name].find();
  if (!command) console.log(`no ${name} on this machine: the site is not tested in it`);
  let page: Awaited<ReturnType<typeof openPage>>;
  beforeAll(async () => {
    if (command) page = await openPage(name, command, folder);
  });
  afterAll(() => page?.close());

  test.runIf(command)("it draws the first planet by itself", async () => {
    await page.show(1200, 900);
    await page.open("live.html");
    await page.untilStatus("3 states between 50 and 600 K, proved.");
    expect(await page.textOf("#states")).toContain("287.3");
    expect(await page.labelsOf("figure svg")).toEqual(["Energy flows", "Temperature along star.luminosity"]);
    expect(await page.textOf("#appraisal")).toMatch(/^Orsolne, a planet of Talvar\n/);
    expect(await page.scrollsSideways()).toBe(false);
  });

  test.runIf(command)("an edit redraws it", async () => {
    await page.typeOver('"warm": 0.28', '"warm": 0.6');
    await page.untilStatus("One state");
    expect(await page.textsOf("#choice label")).toHaveLength(1);
    await page.typeOver('"warm": 0.6', '"warm": 0.28');
    await page.untilStatus("3 states");
    expect(await page.textsOf("#choice label")).toHaveLength(3);
  });

  test.runIf(command)("bad input is shown beside its line, and goes when it is mended", async () => {
    await page.typeOver('"cold": 0.62', '"cold": 1.62');
    await page.untilStatus("problem in line 15");
    expect(await page.textOf("#problem")).toBe(
      "Line 15 albedo.cold: out of range, received 1.62; allowed: 0 to 1 About “out of range”",
    );
    expect(await page.attributeOf("#problem a", "href")).toBe("errors.html#out-of-range");
    expect(await page.attributeOf("#text", "aria-invalid")).toBe("true");
    const [mark, problem, area] = [
      await page.boxOf("#mark"),
      await page.boxOf("#problem"),
      await page.boxOf("#text"),
    ];
    expect(Math.abs(problem.top - mark.top)).toBeLessThan(3);
    expect(problem.left).toBeGreaterThan(area.right - 1);
    await page.click("#problem button");
    expect(await page.selected()).toBe('    "cold": 1.62,');
    await page.type('    "cold": 0.62');
    await page.untilProblem('Line 15 not JSON here: "," or "}" wanted');
    await page.type(",");
    await page.untilStatus("3 states");
    expect(await page.isVisible("#problem")).toBe(false);
    expect(await page.attributeOf("#text", "aria-invalid")).toBe("false");
  });

  test.runIf(command)("of several faults each is shown beside its field", async () => {
    await page.typeOver('"cold": 0.62', '"cold": 1.62');
    await page.typeOver('"redistribution": "global"', '"redistribution": 7');
    await page.untilRemarks(2);
    const said = await page.textsOf("#margin > div");
    const expected = [
      [12, "redistribution: out of range, received 7; allowed: 0.25 to 1 About"],
      [15, "albedo.cold: out of range, received 1.62; allowed: 0 to 1 About"],
    ];
    for (const [line, words] of expected)
      expect(said.filter((text: string) => text.startsWith(`Line ${line} ${words}`))).toHaveLength(1);
    expect(said.join()).not.toMatch(/docs\/|also:/);
    const [first, second] = await page.boxesOf("#margin > div");
    expect(Math.max(first.top, second.top)).toBeGreaterThanOrEqual(Math.min(first.bottom, second.bottom));
    await page.typeOver('"cold": 1.62', '"cold": 0.62');
    await page.untilRemarks(1);
    await page.typeOver('"redistribution": 7', '"redistribution": "global"');
    await page.untilStatus("3 states");
    expect(await page.isVisible("#problem")).toBe(false);
  });

  test.runIf(command)("markup in a name stays a name", async () => {
    await page.typeOver('"Orsolne"', '"<img src=x onerror=alert(1)>"');
    await page.untilAppraisal("<img src=x");
    expect(await page.textsOf("main img")).toEqual([]);
  });

  test.runIf(command)("the keyboard alone reaches every field, and every planet is drawn", async () => {
    await page.focus("#planets");
    const order: string[] = [];
    for (let i = 0; i < 4; i++) {
      order.push(await page.focused());
      await page.press("Tab");
    }
    expect(order).toEqual(["planets", "hottest", "text", "wide"]);
    const planets: string[] = await page.textsOf("#planets option");
    expect(planets.length).toBeGreaterThan(3);
    for (const planet of planets) {
      await page.choose("#planets", planet);
      const [own = ""] = planet.split(":");
      await page.untilAppraisal(own);
      expect(await page.textOf("#status"), own).toMatch(/proved\.$|^No states without redistribution/);
    }
  });

  test.runIf(command)("a small screen needs no sideways scrolling, with a problem or without", async () => {
    await page.show(360, 740);
    await page.open("live.html");
    await page.untilStatus("3 states");
    expect(await page.scrollsSideways()).toBe(false);
    await page.typeOver('"cold": 0.62', '"cold": 1.62');
    await page.untilStatus("problem in line 15");
    expect(await page.scrollsSideways()).toBe(false);
    // there is no room beside the line, so the problem stays in sight below it
    const [mark, problem] = [await page.boxOf("#mark"), await page.boxOf("#problem")];
    expect(mark.top).toBeGreaterThan(0);
    expect(problem.top).toBeGreaterThan(mark.bottom);
    expect(problem.bottom).toBeLessThanOrEqual(740);
    for (const part of ["#problem", "#ledger svg", "#diagram svg"]) {
      expect((await page.boxOf(part)).right, part).toBeLessThanOrEqual(360);
    }
    // all pages share their styles, so one browser may look at all of them and the other at those with wide parts
    const wide = ["laws.html", "validation.html", "api-thermostead.html"];
    const files = name === "chromium" ? pagesOf(folder).map((built) => built.name) : wide;
    for (const file of files) {
      await page.open(file);
      expect(await page.scrollsSideways(), file).toBe(false);
    }
  });

  test.runIf(command)("nothing complains on its console", () => {
    expect(page.complaints.filter((message: string) => !isAsking(message))).toEqual([]);
  });
});
