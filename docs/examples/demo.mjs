// The appraisal of a described planet, from the package as users import it.
//   node docs/examples/demo.mjs [description.json] [--json]
import fs from "node:fs";
import { ThermosteadError } from "thermostead";
import { appraisePlanet, toText } from "thermostead/planet";

/** The same planet with its albedo a plain number: it cannot answer to the climate. */
function withAlbedoHeld({ description, assumptions, states }) {
  const warmest = states.findLast(({ state }) => state.stability === "stable");
  if (assumptions?.albedo !== null || description.albedo === undefined || !warmest) return "";
  const { albedo } = warmest.state.report;
  const { found, equilibrium, states: left } = appraisePlanet({ ...description, albedo });
  const [low, high] = found.within;
  return [
    "",
    "The same planet with its albedo held as a number",
    `  albedo ${albedo.toFixed(4)}, that of the warmest climate that holds`,
    ...left.map(
      ({ state: { temperature, stability, feedbackParameter } }) =>
        `  T surface ${temperature.toFixed(3)} K, ${stability}, lambda ${feedbackParameter.toFixed(3)} W m-2 K-1`,
    ),
    `  T equilibrium ${equilibrium.described.value.toFixed(2)} K, not of the surface`,
    `  ${found.complete ? "proved" : "not proved"}: no other state between ${low} and ${high} K`,
    "",
  ].join("\n");
}

// a reader such as `head` may close the pipe before the end: that is no failure
process.stdout.on("error", (error) => {
  if (error.code !== "EPIPE") throw error;
});

const args = process.argv.slice(2);
const file = args.find((arg) => !arg.startsWith("--")) ?? new URL("orsolne.json", import.meta.url);
try {
  const unknown = args.find((arg) => arg.startsWith("--") && arg !== "--json");
  if (unknown) throw new Error(`unknown option ${unknown}; known is --json`);
  const appraisal = appraisePlanet(JSON.parse(fs.readFileSync(file, "utf8")));
  const asText = () => toText(appraisal) + withAlbedoHeld(appraisal);
  process.stdout.write(args.includes("--json") ? `${JSON.stringify(appraisal, null, 2)}\n` : asText());
} catch (error) {
  const expected =
    error instanceof ThermosteadError || error.code === "ENOENT" || error instanceof SyntaxError;
  console.error(expected || error.message.startsWith("unknown option") ? error.message : error);
  // the message only names the fields of the other mistakes
  for (const { message } of error.others ?? []) console.error(message);
  process.exitCode = 1;
}
