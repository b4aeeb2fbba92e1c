// One planet as a whole: read from its description, and appraised, with another luminosity each time.
import fs from "node:fs";
import * as planets from "../dist/planet.js";
import { timed } from "./rounds.mjs";

const APPRAISALS = 400;
const text = fs.readFileSync(new URL("../docs/examples/orsolne.json", import.meta.url), "utf8");

/** The demo planet under a star that is a little brighter each time. */
const described = Array.from({ length: APPRAISALS }, (_, i) => {
  const description = JSON.parse(text);
  description.star.luminosity = { value: 0.2 + 1e-4 * i, unit: "solLum" };
  return description;
});

/** Milliseconds of an appraisal, and of reading alone. */
export function appraisals() {
  const each = (of) => () =>
    timed(APPRAISALS * 1e6, () => described.reduce((total, description) => total + of(description), 0));
  return [
    { name: "appraisePlanet, hot", time: each((d) => planets.appraisePlanet(d).states[0].state.temperature) },
    { name: "readPlanet, hot", time: each((d) => planets.readPlanet(d).flux) },
  ];
}
