// An appraisal as flat rows with units, for tables of many planets.
import type { Appraisal } from "./appraisal.ts";
import type { PlaceTemperatures } from "./appraisedLight.ts";
import { checkAppraisal } from "./checkAppraisal.ts";
import { isBeyondTable } from "./starBrightening.ts";

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
 * planets. What is not known has no row. Ledgers, branches and notes stay in the appraisal itself. Throws `unreadable` or
 * `missing` for what is no appraisal.
 */
export function toRows(appraisal: Appraisal): AppraisalRow[] {
  checkAppraisal(appraisal);
  const rows: AppraisalRow[] = [];
  const add = (name: string, value: number | string | null | undefined, unit = "1") => {
    if (value !== null && value !== undefined) rows.push({ name, value, unit });
  };
  add("version", appraisal.version);
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
    limits.forEach(({ name, paper, massEarths, limit, distance, ratio, position, temperature }, i) => {
      add(`${list}[${i}].name`, name);
      add(`${list}[${i}].paper`, paper);
      add(`${list}[${i}].massEarths`, massEarths);
      add(`${list}[${i}].flux`, limit.flux, "W m-2");
      add(`${list}[${i}].distance`, distance, "m");
      add(`${list}[${i}].ratio`, ratio);
      add(`${list}[${i}].position`, position);
      add(`${list}[${i}].temperature`, temperature, "K");
    });
  }
  return rows;
}

type Add = (name: string, value: number | string | null | undefined, unit?: string) => void;

function starlightRows({ starlight }: Appraisal, add: Add): void {
  const { mean, atSemiMajorAxis, periastron, apoastron, companions, taken } = starlight;
  add("starlight.luminosity", starlight.luminosity, "W");
  add("starlight.semiMajorAxis", starlight.semiMajorAxis, "m");
  add("starlight.period", starlight.period, "s");
  for (const [name, stated] of Object.entries({
    atSemiMajorAxis,
    mean,
    periastron,
    apoastron,
    companions,
    taken,
  })) {
    add(`starlight.${name}.flux`, stated?.flux, "W m-2");
    add(`starlight.${name}.earths`, stated?.earths);
  }
}

function equilibriumRows({ equilibrium }: Appraisal, add: Add): void {
  const { described, conventional, places, orbit } = equilibrium;
  add("equilibrium.described", described?.value, "K");
  for (const { albedo, redistribution, value } of conventional)
    add(`equilibrium.conventional.albedo=${albedo}.redistribution=${redistribution}`, value, "K");
  placeRows("equilibrium.places", places, add);
  add("equilibrium.orbit.ofMeanFlux", orbit.ofMeanFlux, "K");
  add("equilibrium.orbit.meanOverTime", orbit.meanOverTime, "K");
}

function placeRows(path: string, places: PlaceTemperatures | null, add: Add): void {
  add(`${path}.substellar`, places?.substellar, "K");
  for (const side of ["day", "night"] as const) {
    add(`${path}.${side}.still`, places?.[side].still, "K");
    add(`${path}.${side}.spread`, places?.[side].spread, "K");
  }
}

function stateRows({ states, brightening }: Appraisal, i: number, add: Add): void {
  const at = states[i];
  if (!at) return;
  const { state, equilibriumTemperature, greenhouseWarming, places, averaging, feedbacks } = at;
  const { sensitivities, margins, surface } = at;
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
  placeRows(`states[${i}].places`, places, add);
  own("thermalInertiaRatio", averaging.thermalInertiaRatio);
  own("favours", averaging.favours);
  own("referenceResponse", feedbacks?.reference.feedbackParameter, "W m-2 K-1");
  for (const loop of feedbacks?.loops ?? [])
    own(`feedback.${loop.through.join(">")}`, loop.feedbackParameter, "W m-2 K-1");
  own("gain", feedbacks?.gain);
  for (const { path, perPercent, minus, plus } of sensitivities ?? []) {
    own(`sensitivity.${path}.perPercent`, perPercent, "K");
    own(`sensitivity.${path}.minus`, minus, "K");
    own(`sensitivity.${path}.plus`, plus, "K");
  }
  for (const side of ["rise", "fall"] as const) {
    const margin = margins?.[side];
    if (!margin?.jump) continue;
    own(`margins.${side}.relative`, margin.relative);
    own(`margins.${side}.temperature`, margin.end.temperature, "K");
    own(`margins.${side}.time`, margin.time, "s");
    own(
      `margins.${side}.laterThan`,
      isBeyondTable(margin, brightening) ? brightening?.table?.lasts : null,
      "s",
    );
    own(`margins.${side}.after`, margin.after?.temperature, "K");
  }
  own("water", surface?.water);
  own("saturationPressure", surface?.saturationPressure, "Pa");
  own("boilingTemperature", surface?.boilingTemperature, "K");
  own("carbonDioxideFrostPoint", surface?.carbonDioxideFrostPoint, "K");
}
