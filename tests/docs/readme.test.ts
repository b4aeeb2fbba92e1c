// What the README must have, and links that lead somewhere.
import fs from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";

const readme = fs.readFileSync("README.md", "utf8");

describe("the README", () => {
  test("opens with the job in one paragraph", () => {
    const [title, job] = readme.split("\n\n");
    expect(title).toBe("# thermostead");
    expect(job).toMatch(/^thermostead /);
    expect((job as string).split(/\s+/).length).toBeLessThan(120);
  });

  test("names the two commands, which exist", () => {
    const { scripts } = JSON.parse(fs.readFileSync("package.json", "utf8"));
    for (const name of ["demo", "test"]) {
      expect(readme).toMatch(new RegExp(`npm (run )?${name}\\b`));
      expect(scripts[name]).toBeTypeOf("string");
    }
  });

  test("has three examples, all of them run", () => {
    const fences = [...readme.matchAll(/^```(\w.*)$/gm)].map((match) => match[1]);
    expect(fences).toEqual(["ts run", "ts run", "ts run"]);
  });

  test("says once what the library does not do", () => {
    expect(readme.match(/screening estimates/g)).toHaveLength(1);
    expect(readme).toContain("## What it does not do");
  });
});

test("docs/decisions.md gives a reason for every package", () => {
  const { dependencies, devDependencies } = JSON.parse(fs.readFileSync("package.json", "utf8"));
  const rows = fs
    .readFileSync("docs/decisions.md", "utf8")
    .split("\n")
    .filter((line) => line.startsWith("| `"));
  const reasoned = rows.flatMap((row) =>
    [...(row.split("|")[1] as string).matchAll(/`([^`]+)`/g)].map((m) => m[1]),
  );
  for (const name of Object.keys({ ...dependencies, ...devDependencies })) expect(reasoned).toContain(name);
});

/** Places in documents of ours that a document links to: `file` or `file#section`. */
function linksOf(file: string): string[] {
  const text = fs.readFileSync(file, "utf8");
  return [...text.matchAll(/\]\(([^)\s]+)\)/g)]
    .map((match) => match[1] as string)
    .filter((link) => !/^[a-z]+:/.test(link));
}

/** The name by which a heading is linked to. */
const slugOf = (heading: string): string =>
  heading
    .toLowerCase()
    .replace(/[^\p{L}\p{N} _-]/gu, "")
    .replaceAll(" ", "-");

function leadsSomewhere(file: string, link: string): boolean {
  const [target = "", section] = link.split("#");
  const goal = target === "" ? file : path.join(path.dirname(file), target);
  if (!fs.existsSync(goal)) return false;
  if (section === undefined) return true;
  const headings = [...fs.readFileSync(goal, "utf8").matchAll(/^#+ (.*)$/gm)].map((m) =>
    slugOf(m[1] as string),
  );
  return headings.includes(section);
}

describe("links", () => {
  const docs = fs.readdirSync("docs").filter((file) => file.endsWith(".md"));
  const files = ["README.md", "DEVELOPERS.md", "CHANGELOG.md", ...docs.map((file) => `docs/${file}`)];
  test.each(files)("of %s lead somewhere", (file) => {
    expect(linksOf(file).filter((link) => !leadsSomewhere(file, link))).toEqual([]);
  });

  test("that lead nowhere are seen", () => {
    expect(leadsSomewhere("README.md", "docs/errors.md#missing")).toBe(true);
    expect(leadsSomewhere("README.md", "docs/errors.md#misssing")).toBe(false);
    expect(leadsSomewhere("README.md", "docs/eror.md")).toBe(false);
  });
});
