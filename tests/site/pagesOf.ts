// The site, built once for a test file into a folder of the cache, and what is in its pages.
import fs from "node:fs";
import path from "node:path";
import { buildSite } from "../../.config/site/build.mjs";

/** A built page and what is read from it. */
export interface BuiltPage {
  readonly name: string;
  readonly html: string;
  readonly ids: ReadonlySet<string>;
  /** What `href` and `src` say. */
  readonly links: readonly string[];
}

/** Builds into `node_modules/.cache/<name>`; returns the folder. */
export async function builtSite(name: string): Promise<string> {
  const folder = path.resolve("node_modules/.cache", name);
  await buildSite(folder);
  return folder;
}

export function pagesOf(folder: string): BuiltPage[] {
  const names = fs.readdirSync(folder).filter((name) => name.endsWith(".html"));
  return names.map((name) => {
    const html = fs.readFileSync(path.join(folder, name), "utf8");
    const values = (pattern: RegExp) => [...html.matchAll(pattern)].map((match) => match[1] as string);
    return { name, html, ids: new Set(values(/ id="([^"]+)"/g)), links: values(/ (?:href|src)="([^"]+)"/g) };
  });
}

/** Links of a page that lead nowhere on the site. */
export function brokenLinks(page: BuiltPage, pages: readonly BuiltPage[], folder: string): string[] {
  return page.links.filter((link) => {
    if (/^[a-z]+:/.test(link)) return false;
    const [file = "", id] = link.split("#");
    const target = file === "" ? page : pages.find(({ name }) => name === file);
    if (!target) return !fs.existsSync(path.join(folder, file));
    return id !== undefined && !target.ids.has(decodeURIComponent(id));
  });
}

/** Levels of headings in order: 1 for `h1`. */
export const headingLevels = ({ html }: BuiltPage): number[] =>
  [...html.matchAll(/<h([1-6])[ >]/g)].map((match) => Number(match[1]));
