// An appraisal as flat rows with units, for tables of many planets.
import type { Appraisal } from "./appraisal.ts";

/** One number, or one word, of an appraisal. */
export interface AppraisalRow {
  /** What it is: a path without spaces, such as `states[2].temperature`. */
  readonly name: string;
  readonly value: number | string;
  /** Coherent SI; `1` for pure numbers and words. */
  readonly unit: string;
}

/**
 * The numbers of an appraisal as flat rows `{ name, value, unit }` in SI: for a data frame, a CSV file or a table of many
 * planets. What is not known has no row. Ledgers, branches and notes stay in the appraisal itself.
 */
export function toRows(appraisal: Appraisal): AppraisalRow[] {
  const rows: AppraisalRow[] = [];
  const add = (name: string, value: number | string | null | undefined, unit = "1") => {
    if (value !== null && value !== undefined) rows.push({ name, value, unit });
  };
  add("name", appraisal.name);
  add("star", appraisal.star);
  for (const { path, value, unit, minus, plus } of appraisal.inputs) {
    add(path, value, unit);
    add(`${path}.minus`, minus, unit);
    add(`${path}.plus`, plus, unit);
  }
  starlightRows(appraisal, add);
  equilibriumRows(appraisal, add);
  add("found.proof", appraisal.found?.proof);
  add("found.states", appraisal.found?.states.length);
  for (const i of appraisal.states.keys()) stateRows(appraisal, i, add);
  for (const [list, limits] of [
    ["habitableZone", appraisal.habitableZone],
    ["ownLimits", appraisal.ownLimits],
  ] as const) {
    limits.forEach(({ name, paper, massEarths, limit, distance, ratio }, i) => {
      add(`${list}[${i}].name`, name);
      add(`${list}[${i}].paper`, paper);
      add(`${list}[${i}].massEarths`, massEarths);
      add(`${list}[${i}].flux`, limit.flux, "W m-2");
      add(`${list}[${i}].distance`, distance, "m");
      add(`${list}[${i}].ratio`, ratio);
    });
  }
  return rows;
}

type Add = (name: string, value: number | string | null | undefined, unit?: string) => void;

function starlightRows({ starlight }: Appraisal, add: Add): void {
  const { mean, atSemiMajorAxis, periastron, apoastron } = starlight;
  add("starlight.luminosity", starlight.luminosity, "W");
  add("starlight.semiMajorAxis", starlight.semiMajorAxis, "m");
  add("starlight.period", starlight.period, "s");
  for (const [name, stated] of Object.entries({ mean, atSemiMajorAxis, periastron, apoastron })) {
    add(`starlight.${name}.flux`, stated.flux, "W m-2");
    add(`starlight.${name}.earths`, stated.earths);
  }
}

function equilibriumRows({ equilibrium }: Appraisal, add: Add): void {
  const { described, conventional, places, orbit } = equilibrium;
  add("equilibrium.described", described?.value, "K");
  for (const { albedo, redistribution, value } of conventional)
    add(`equilibrium.albedo=${albedo},redistribution=${redistribution}`, value, "K");
  add("equilibrium.substellar", places?.substellar, "K");
  for (const side of ["day", "night"] as const) {
    add(`equilibrium.${side}.still`, places?.[side].still, "K");
    add(`equilibrium.${side}.spread`, places?.[side].spread, "K");
  }
  add("equilibrium.ofMeanFlux", orbit.ofMeanFlux, "K");
  add("equilibrium.meanOverTime", orbit.meanOverTime, "K");
}

function stateRows({ states }: Appraisal, i: number, add: Add): void {
  const at = states[i];
  if (!at) return;
  const { state, equilibriumTemperature, greenhouseWarming, averaging, feedbacks, margins, surface } = at;
  const own = (name: string, value: number | string | null | undefined, unit?: string) =>
    add(`states[${i}].${name}`, value, unit);
  own("temperature", state.temperature, "K");
  own("bracket[0]", state.bracket[0], "K");
  own("bracket[1]", state.bracket[1], "K");
  own("stability", state.stability);
  own("feedbackParameter", state.feedbackParameter, "W m-2 K-1");
  own("eFoldingTime", state.eFoldingTime, "s");
  for (const [name, value] of Object.entries(state.couplings)) own(`couplings.${name}`, value);
  own("equilibriumTemperature", equilibriumTemperature, "K");
  own("greenhouseWarming", greenhouseWarming, "K");
  own("thermalInertiaRatio", averaging.thermalInertiaRatio);
  own("referenceResponse", feedbacks?.reference.feedbackParameter, "W m-2 K-1");
  for (const loop of feedbacks?.loops ?? [])
    own(`feedback.${loop.through.join(">")}`, loop.feedbackParameter, "W m-2 K-1");
  own("gain", feedbacks?.gain);
  for (const side of ["rise", "fall"] as const) {
    const margin = margins?.[side];
    if (!margin?.jump) continue;
    own(`margins.${side}.relative`, margin.relative);
    own(`margins.${side}.temperature`, margin.end.temperature, "K");
    own(`margins.${side}.time`, margin.time, "s");
    own(`margins.${side}.after`, margin.after?.temperature, "K");
  }
  own("water", surface?.water);
  own("saturationPressure", surface?.saturationPressure, "Pa");
}
