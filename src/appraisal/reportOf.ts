// What the report of an appraisal says, in order.
import { ASTRONOMICAL_UNIT, SOLAR_LUMINOSITY } from "../ground/constants.ts";
import type { Appraisal } from "./appraisal.ts";
import { checkAppraisal } from "./checkAppraisal.ts";
import { climateSections } from "./climateSections.ts";
import { inputTable } from "./inputTable.ts";
import { limitSections } from "./limitSections.ts";
import { ECCENTRICITY } from "./missingFacts.ts";
import { noteSections } from "./noteSections.ts";
import { fluxText, kelvin, oneLine, type Report, type Section, shown, type Table } from "./report.ts";
import { summaryOf } from "./summary.ts";

/** The report of an appraisal; every text in it is one line. */
export function reportOf(appraisal: Appraisal): Report {
  checkAppraisal(appraisal);
  const { name, star, caution } = appraisal;
  const sections = [
    inputTable(appraisal),
    starlight(appraisal),
    equilibrium(appraisal),
    ...climateSections(appraisal),
    ...limitSections(appraisal),
    ...noteSections(appraisal),
  ];
  const part = (block: string | Table): string | Table =>
    typeof block === "string" ? oneLine(block) : { ...block, rows: block.rows.map((r) => r.map(oneLine)) };
  return {
    title: oneLine(`${name ?? "A planet"}${star === null ? "" : `, a planet of ${star}`}`),
    summary: summaryOf(appraisal),
    about: oneLine(aboutOf(appraisal)),
    sections: sections
      .filter(({ blocks }) => blocks.length > 0)
      .map(({ title, blocks }) => ({ title, blocks: blocks.map(part) })),
    caution,
  };
}

/** Where the description comes from, and its own notes. */
function aboutOf({ description }: Appraisal): string {
  const { source, notes } = description as { source?: string; notes?: readonly string[] };
  const stopped = (text: string) => (/[.!?]\s*$/.test(text) ? text : `${text}.`);
  return [...(source === undefined ? [] : [source]), ...(notes ?? [])].map(stopped).join(" ");
}

function starlight({ starlight, found, missing }: Appraisal): Section {
  const { luminosity, semiMajorAxis, period, eccentricity } = starlight;
  const isGiven = !missing.some(({ path }) => path === ECCENTRICITY);
  const facts = [
    luminosity === null
      ? ""
      : `luminosity ${shown(luminosity)} W (${shown(luminosity / SOLAR_LUMINOSITY, 4)} of the Sun's)`,
    semiMajorAxis === null ? "" : `semi-major axis ${shown(semiMajorAxis / ASTRONOMICAL_UNIT, 4)} au`,
    period === null ? "" : `orbital period ${shown(period / 86400, 4)} d`,
    eccentricity === 0
      ? `circular orbit${isGiven ? "" : ", as no eccentricity is given"}`
      : `eccentricity ${shown(eccentricity)}`,
  ];
  const { mean, atSemiMajorAxis, periastron, apoastron, companions, taken } = starlight;
  const all = { "at the semi-major axis": atSemiMajorAxis };
  const apart = { "mean over the orbit": mean, "at periastron": periastron, "at apoastron": apoastron };
  const more = companions ? { "of stars that it does not orbit, besides": companions } : {};
  // another flux than the mean has a name of its own, or the ledgers below would seem not to fit
  const used =
    found && fluxText(taken.flux) !== fluxText(mean.flux) ? { "that the climates below have": taken } : {};
  const places = { ...all, ...(eccentricity > 0 ? apart : {}), ...more, ...used };
  const rows = Object.entries(places).map(([place, s]) => [place, fluxText(s.flux), shown(s.earths, 4)]);
  const head = ["stellar flux S, normal to the beam", "W m-2", "Earths (1361 W m-2)"];
  return { title: "Starlight", blocks: [facts.filter(Boolean).join(", "), { head, rows, right: [1, 2] }] };
}

function equilibrium({ equilibrium, starlight, found, states }: Appraisal): Section {
  const { described, conventional, places, orbit } = equilibrium;
  const rows: string[][] = [];
  if (described) {
    const { value, albedo, redistribution, internalFlux } = described;
    const heat = internalFlux > 0 ? `, internal heat ${shown(internalFlux)} W m-2` : "";
    rows.push([`as described: A = ${shown(albedo)}, f = ${shown(redistribution)}${heat}`, kelvin(value)]);
  }
  for (const { albedo, redistribution, spread, value } of conventional)
    rows.push([
      `by convention, at the semi-major axis: A = ${albedo}, f = ${redistribution} (${spread})`,
      kelvin(value),
    ]);
  if (places) {
    const { substellar, day, night } = places;
    rows.push(["substellar point, heat stays where it falls", kelvin(substellar)]);
    rows.push([
      "day side, heat stays / is spread over the planet",
      `${kelvin(day.still)} / ${kelvin(day.spread)}`,
    ]);
    rows.push(["night side, the same", `${kelvin(night.still)} / ${kelvin(night.spread)}`]);
  }
  if (starlight.eccentricity > 0) {
    rows.push(["of the mean flux, A = 0, f = 0.25", kelvin(orbit.ofMeanFlux)]);
    if (orbit.meanOverTime !== null)
      rows.push(["mean over time of the moment's, A = 0, f = 0.25", kelvin(orbit.meanOverTime)]);
  }
  const table: Table = { head: ["temperature of re-radiation, not of the surface", "K"], rows, right: [1] };
  const answers = found !== null && described === null && states.length > 0;
  const below = "as described: with each climate below, because the albedo answers to temperature";
  return { title: "Equilibrium temperatures", blocks: answers ? [table, below] : [table] };
}
