// What the report of an appraisal says, in order.
import type { Appraisal, StatedLimit } from "./appraisal.ts";
import { climateSections } from "./climateSections.ts";
import { type Report, type Section, shown, type Table, withUnit } from "./report.ts";

const ASTRONOMICAL_UNITS = 149597870700;

/** The report of an appraisal. */
export function reportOf(appraisal: Appraisal): Report {
  const { name, star, caution } = appraisal;
  const title = `${name ?? "A planet"}${star ? `, a planet of ${star}` : ""}`;
  const sections = [
    inputs(appraisal),
    starlight(appraisal),
    equilibrium(appraisal),
    ...climateSections(appraisal),
    limits("Published limits of the habitable zone", appraisal.habitableZone),
    limits("Where the planet's own climates end", appraisal.ownLimits),
    missing(appraisal),
    notes(appraisal),
    sources(appraisal),
  ];
  return { title, sections: sections.filter((s) => s.blocks.length > 0), caution };
}

function inputs({ inputs }: Appraisal): Section {
  const rows = inputs.map(({ path, written, value, unit }) => [path, written, withUnit(value, unit)]);
  return { title: "Inputs", blocks: [{ head: ["input", "as written", "in SI"], rows, right: [] }] };
}

function starlight({ starlight }: Appraisal): Section {
  const { mean, atSemiMajorAxis, periastron, apoastron, eccentricity } = starlight;
  const all = { "at the semi-major axis": atSemiMajorAxis };
  const apart = { "mean over the orbit": mean, "at periastron": periastron, "at apoastron": apoastron };
  const rows = Object.entries(eccentricity > 0 ? { ...all, ...apart } : all).map(([place, s]) => [
    place,
    s.flux.toFixed(1),
    shown(s.earths, 4),
  ]);
  const head = ["stellar flux S, normal to the beam", "W m-2", "Earths (1361 W m-2)"];
  return { title: "Starlight", blocks: [{ head, rows, right: [1, 2] }] };
}

function equilibrium({ equilibrium, starlight }: Appraisal): Section {
  const { described, conventional, places, orbit } = equilibrium;
  const kelvin = (value: number) => value.toFixed(2);
  const rows: string[][] = [];
  if (described) {
    const { value, albedo, redistribution, internalFlux } = described;
    const heat = internalFlux > 0 ? `, internal heat ${shown(internalFlux)} W m-2` : "";
    rows.push([`as described: A = ${shown(albedo)}, f = ${shown(redistribution)}${heat}`, kelvin(value)]);
  }
  for (const { albedo, redistribution, spread, value } of conventional)
    rows.push([`by convention: A = ${albedo}, f = ${redistribution} (${spread})`, kelvin(value)]);
  if (places) {
    rows.push(["substellar point, no transport of heat", kelvin(places.substellar)]);
    rows.push([
      "day side, no transport / complete transport",
      `${kelvin(places.day.still)} / ${kelvin(places.day.spread)}`,
    ]);
    rows.push(["night side, the same", `${kelvin(places.night.still)} / ${kelvin(places.night.spread)}`]);
  }
  if (starlight.eccentricity > 0) {
    rows.push(["of the mean flux, A = 0, f = 0.25", kelvin(orbit.ofMeanFlux)]);
    rows.push(["mean over time of the moment's, A = 0, f = 0.25", kelvin(orbit.meanOverTime)]);
  }
  const table: Table = { head: ["temperature of re-radiation, not of the surface", "K"], rows, right: [1] };
  return { title: "Equilibrium temperatures", blocks: [table] };
}

function limits(title: string, list: readonly StatedLimit[]): Section {
  if (list.length === 0) return { title, blocks: [] };
  const rows = list.map(({ name, paper, massEarths, limit, distance, ratio, temperature }) => [
    `${name}${massEarths === null ? "" : `, ${massEarths} Earth ${massEarths === 1 ? "mass" : "masses"}`}`,
    limit.flux.toFixed(1),
    shown(limit.earths, 4),
    distance === null ? "" : shown(distance / ASTRONOMICAL_UNITS, 4),
    shown(ratio, 4),
    paper?.split(",")[0] ?? (temperature === null ? "" : `at ${temperature.toFixed(2)} K`),
  ]);
  const head = ["limit", "S, W m-2", "Earths", "au", "S planet / S limit", ""];
  return { title, blocks: [{ head, rows, right: [1, 2, 3, 4] }] };
}

const missing = ({ missing }: Appraisal): Section => ({
  title: "Not given",
  blocks: missing.map(({ path, text }) => `${path}: ${text}`),
});

/** The same note on several states is one note. */
function notes({ notes, found, states, constants }: Appraisal): Section {
  const places = new Map<string, string[]>();
  const add = (key: string, place: string | null) =>
    places.set(key, [...(places.get(key) ?? []), ...(place === null ? [] : [place])]);
  const line = (n: { severity: string; about: string; value: number | null; text: string }, value: boolean) =>
    `${n.severity === "info" ? "" : `${n.severity}: `}${n.about}${value && n.value !== null ? ` ${shown(n.value)}` : ""}: ${n.text}`;
  for (const note of notes) add(line(note, true), null);
  for (const note of found?.notes ?? []) add(line(note, false), null);
  for (const { state } of states)
    for (const note of state.notes) add(line(note, false), `${state.temperature.toFixed(2)} K`);
  const lines = [...places].map(([text, at]) => (at.length === 0 ? text : `${text} (at ${at.join(", ")})`));
  return { title: "Notes", blocks: [...lines, `constants: ${constants}`] };
}

const sources = ({ sources, version }: Appraisal): Section => ({
  title: "Sources",
  blocks: [
    ...sources.map(
      ({ of, source, doi }) =>
        `${of.join(", ")}: ${source}${doi && !source.includes(doi) ? `, doi:${doi}` : ""}`,
    ),
    `computed with thermostead ${version}`,
  ],
});
