// The live page in a browser, and what a test does to it. Functions given to the page run there, with its `document`.
import path from "node:path";
import { pathToFileURL } from "node:url";
import puppeteer from "puppeteer-core";

const CHROMIUM_FLAGS = [
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];
const LAUNCHERS = {
  chromium: (executablePath) => puppeteer.launch({ executablePath, args: CHROMIUM_FLAGS }),
  firefox: (executablePath) => puppeteer.launch({ browser: "firefox", executablePath, headless: true }),
};

/** Starts a browser, `chromium` or `firefox`, with one empty page. */
export async function openPage(kind, command, folder) {
  const browser = await LAUNCHERS[kind](command);
  const page = await browser.newPage();
  const complaints = [];
  page.on("console", (message) => {
    if (["error", "warn"].includes(message.type())) complaints.push(message.text());
  });
  page.on("pageerror", (error) => complaints.push(error.message));
  page.on("requestfailed", (request) => complaints.push(request.url()));
  const saysIn = (selector) => (words) =>
    page.waitForFunction((s, w) => document.querySelector(s)?.textContent.includes(w), {}, selector, words);
  const asked = (selector, read) => page.$eval(selector, read);

  return {
    close: () => browser.close(),
    /** What the page said on its console that it should not. */
    complaints,
    show: (width, height) => page.setViewport({ width, height }),
    open: (file) => page.goto(pathToFileURL(path.join(folder, file)).href),
    press: (key) => page.keyboard.press(key),
    type: (keys) => page.keyboard.type(keys),
    click: (selector) => page.click(selector),
    focus: (selector) => page.focus(selector),
    choose: (selector, value) => page.select(selector, value),
    untilStatus: saysIn("#status"),
    untilProblem: saysIn("#problem"),
    untilAppraisal: saysIn("#appraisal"),
    /** Waits for so many problems beside the description. */
    untilRemarks: (count) =>
      page.waitForFunction(
        (n) => document.querySelectorAll("#margin > .problem:not([hidden])").length === n,
        {},
        count,
      ),
    textOf: (selector) => asked(selector, (element) => element.textContent),
    attributeOf: (selector, name) => page.$eval(selector, (element, key) => element.getAttribute(key), name),
    textsOf: (selector) => page.$$eval(selector, (all) => all.map((element) => element.textContent)),
    labelsOf: (selector) => page.$$eval(selector, (all) => all.map((e) => e.getAttribute("aria-label"))),
    isVisible: (selector) => asked(selector, (element) => element.checkVisibility()),
    boxOf: (selector) =>
      asked(selector, (element) => {
        const { left, right, top, bottom } = element.getBoundingClientRect();
        return { left, right, top, bottom };
      }),
    boxesOf: (selector) =>
      page.$$eval(selector, (all) =>
        all.map((element) => {
          const { top, bottom } = element.getBoundingClientRect();
          return { top, bottom };
        }),
      ),
    focused: () => page.evaluate(() => document.activeElement.id || document.activeElement.className),
    scrollsSideways: () => page.evaluate(() => document.documentElement.scrollWidth > window.innerWidth),
    selected: () => asked("#text", (area) => area.value.slice(area.selectionStart, area.selectionEnd)),
    /** Selects a part of the description and types over it. */
    async typeOver(part, keys) {
      await page.focus("#text");
      const select = (area, words) => {
        const at = area.value.indexOf(words);
        area.setSelectionRange(at, at + words.length);
      };
      await page.$eval("#text", select, part);
      await page.keyboard.type(keys);
    },
  };
}
