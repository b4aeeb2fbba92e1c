// The doors of the package: src/<door>.ts, what package.json says about each, and how each is imported.
// A new door is one line here, its file in src, and `npm run docs:update`.
import fs from "node:fs";

export const doors = [
  "index", // laws, loops and states; needs no package
  "chart", // pictures and tables of results; needs no package
  "planet", // descriptions of planets; needs mathjs and zod
];

export const specifierOf = (door) => (door === "index" ? "thermostead" : `thermostead/${door}`);

const exportOf = (door) => ({
  import: { types: `./dist/${door}.d.ts`, default: `./dist/${door}.js` },
  require: { types: `./dist/${door}.d.cts`, default: `./dist/${door}.cjs` },
});

/** package.json with the fields that follow from the list of doors. */
export default function packageFile() {
  const text = JSON.parse(fs.readFileSync("package.json", "utf8"));
  const side = doors.filter((door) => door !== "index");
  text.exports = {
    ".": exportOf("index"),
    ...Object.fromEntries(side.map((door) => [`./${door}`, exportOf(door)])),
    "./package.json": "./package.json",
  };
  text.typesVersions = { "*": Object.fromEntries(side.map((door) => [door, [`./dist/${door}.d.cts`]])) };
  return `${JSON.stringify(text, null, 2)}\n`;
}
