// The climate of a described planet on one screen, from the packages as users import them.
//   node docs/examples/demo.mjs [description.json] [--json]
import fs from "node:fs";
import {
  analyseFeedbacks,
  findStates,
  formulaOf,
  sourcesOf,
  ThermosteadError,
  tippingMargins,
} from "thermostead";
import { readPlanet } from "thermostead/planet";
import { pageOf } from "./page.mjs";

/** Surface temperatures among which states are looked for, K. */
const within = [50, 1000];

/** Everything that is printed, as data. */
function climateOf(description) {
  const planet = readPlanet(description);
  const found = findStates(planet.loop, { within });
  const stable = found.states.filter((state) => state.stability === "stable");
  const warmest = stable.at(-1);
  return {
    planet,
    found,
    feedbacks: stable.map((state) => analyseFeedbacks(planet.loop, state)),
    margins: marginsOf(planet, stable),
    formula: formulaOf(planet.loop),
    sources: sourcesOf(planet.loop),
    fixed:
      planet.assumptions.albedo === null && warmest ? withAlbedo(description, warmest.report.albedo) : null,
  };
}

/** How far each stable state is from the end of its branch as the star brightens or fades between a fifth and five times. */
function marginsOf({ loop, inputs, description }, states) {
  const inputAt = (path) => inputs.find((input) => input.path === path)?.value;
  const along = ["star.luminosity", "orbit.flux"].find((name) => loop.givens.some((g) => g.name === name));
  if (!along) return [];
  const now = inputAt(along);
  const rate = inputAt("star.brightening");
  const options = { along, within, between: [now / 5, now * 5] };
  if (description.star?.brightening !== undefined) options.brightening = { rate };
  return states.map((state) => tippingMargins(loop, state, options));
}

/** The same planet with its albedo a plain number: it cannot answer to the climate. */
function withAlbedo(description, albedo) {
  const planet = readPlanet({ ...description, albedo });
  return { albedo, planet, found: findStates(planet.loop, { within }) };
}

const args = process.argv.slice(2);
const file = args.find((arg) => !arg.startsWith("--")) ?? new URL("orsolne.json", import.meta.url);
try {
  const unknown = args.find((arg) => arg.startsWith("--") && arg !== "--json");
  if (unknown) throw new Error(`unknown option ${unknown}; known is --json`);
  const climate = climateOf(JSON.parse(fs.readFileSync(file, "utf8")));
  console.log(args.includes("--json") ? JSON.stringify(climate, null, 2) : pageOf(climate));
} catch (error) {
  const expected =
    error instanceof ThermosteadError || error.code === "ENOENT" || error instanceof SyntaxError;
  console.error(expected || error.message.startsWith("unknown option") ? error.message : error);
  process.exitCode = 1;
}
