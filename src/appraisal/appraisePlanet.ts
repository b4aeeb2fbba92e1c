// Everything that a paper says of a planet, from its description.

import { CONSTANT_SET } from "../ground/constants.ts";
import { deepFreeze } from "../ground/deepFreeze.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import { VERSION } from "../ground/version.ts";
import { sourcesOf } from "../loop/sourcesOf.ts";
import type { PlanetFacts } from "../planet/facts.ts";
import { plainCopy } from "../planet/plainCopy.ts";
import { readPlanet } from "../planet/readPlanet.ts";
import { alongStar } from "./alongStar.ts";
import type { Appraisal } from "./appraisal.ts";
import { completed, hasBudget as isWhole } from "./completed.ts";
import { equilibriumTemperatures } from "./equilibriumTemperatures.ts";
import { hostOf } from "./hostOf.ts";
import { lawsBeside } from "./lawsBeside.ts";
import { ownLimits, publishedLimits } from "./limits.ts";
import { missingFacts } from "./missingFacts.ts";
import { notesOfAppraisal } from "./notesOfAppraisal.ts";
import { sourcesOfAppraisal } from "./sourcesOfAppraisal.ts";
import { starBrightening } from "./starBrightening.ts";
import { starlightOf } from "./starlightOf.ts";
import { type Climates, statesOfPlanet } from "./statesOfPlanet.ts";

/** Where to look for states, and how hard. */
export interface AppraisePlanetOptions {
  /** Lowest and highest temperature of the surface, K; [50, 2500] unless said. */
  readonly within?: Range;
  /** What each search may spend, as for `findStates` and `traceBranches`. */
  readonly effort?: number;
}

const WITHIN: Range = [50, 2500];
/** What `findStates` takes. */
const [LEAST_EFFORT, MOST_EFFORT] = [10, 1e9];
const CAUTION =
  "These are screening estimates from a zero-dimensional model, with one temperature for the whole planet: no projection and no safety margin. Where a full climate model has been run, trust that model first; for decisions about Earth, the assessments of the responsible authorities.";

/**
 * Everything that is said of a described planet, in one frozen record: flux along the orbit; equilibrium temperatures as
 * described and by the usual conventions; all states with proof, their ledgers, feedback loops and margins as the star
 * brightens or fades; Π and the average over the orbit that it favours; greenhouse warming apart; the position relative to
 * every published limit of the habitable zone, and where the planet's own climates end; water and CO₂ frost at the surface
 * where its pressure is given; assumptions, cautions and sources. It says nothing of life, and gives no score.
 *
 * The description is that of `readPlanet`, and may be incomplete: without `albedo` (or `surface`), `longwave` or
 * `redistribution` there are no states, without `heatCapacity` no times, without an eccentricity the orbit is a circle;
 * `missing` says so. Inputs that contradict each other are noted, and the first is used. All numbers in SI. The record
 * survives `JSON.stringify`; `toText`, `toMarkdown` and `toRows` write it.
 *
 * Throws what `readPlanet` throws, except for contradictions, and what `findStates` throws for `within` and `effort`.
 *
 * @example
 * const appraisal = appraisePlanet({
 *   format: "thermostead-planet-1",
 *   star: { luminosity: "0.42 solLum", effectiveTemperature: "4680 K" },
 *   orbit: { semiMajorAxis: "0.61 au" },
 * });
 * appraisal.equilibrium.conventional[0].value; // A = 0, f = 1/4
 */
export function appraisePlanet(description: unknown, options: AppraisePlanetOptions = {}): Appraisal {
  checkKeys(options, "appraisePlanet", ["within", "effort"]);
  const { within = WITHIN, effort } = options;
  const isObject = typeof description === "object" && description !== null;
  const given = isObject ? plainCopy(description) : description;
  const whole = completed(given);
  const { filled } = whole;
  const hasBudget = isWhole(whole);
  const reading = { contradictions: "note" } as const;
  const planet = readPlanet(whole.description, reading);
  const { facts, loop } = planet;
  // also where there is no budget to search
  checkedRange(within, "within", "K", loop.variables[0]?.within);
  checkedNumber(effort ?? LEAST_EFFORT, "effort", "1", [LEAST_EFFORT, MOST_EFFORT]);
  const starlight = starlightOf(facts);
  const inputs = planet.inputs.filter(({ path }) => !filled.has(fieldOf(path)));
  const star = hasBudget ? alongStar(planet, reading) : null;
  const climates: Climates = hasBudget
    ? statesOfPlanet({ loop, facts, inputs, units: planet.units, star }, { within, effort })
    : { found: null, states: [], leaves: null, diagram: null };
  const { states } = climates;
  const brightening = starBrightening(facts.stars);
  const hasAlbedo = !filled.has("albedo") && !filled.has("surface");
  const hasShare = hasAlbedo && !filled.has("redistribution");
  const { albedo, internalHeat } = planet.assumptions;
  const ground = { flux: facts.meanFlux, albedo: albedo ?? 0, internalFlux: internalHeat };
  const equilibrium = equilibriumTemperatures(
    starlight,
    hasShare ? planet.equilibriumTemperature : null,
    hasAlbedo && albedo !== null ? ground : null,
  );
  const host = hostOf(facts);
  const subject = { effectiveTemperature: host?.effectiveTemperature ?? null, mass: facts.mass };
  const habitableZone = publishedLimits(subject, starlight);
  const used = inputsBeside(facts, habitableZone.length > 0);
  const notes = [
    ...planet.notes.filter(({ code, about }) => {
      if (code === "assumption") return !filled.has(fieldOf(about));
      return code !== "input-unused" || (hasBudget && !used.has(about));
    }),
    ...notesOfAppraisal({ planet, states, hasBudget, brightening }),
  ];
  const laws = sourcesOf(loop).filter(({ law }) => hasBudget || LAWS_OF_LIGHT.includes(law));
  const beside = lawsBeside({ inputs, starlight, equilibrium, habitableZone, states });
  return deepFreeze({
    format: "thermostead-appraisal-1",
    version: VERSION,
    name: planet.description.name ?? null,
    star: host?.name ?? null,
    description: given,
    inputs,
    missing: [...whole.missing, ...missingFacts(planet, { hasBudget })],
    starlight,
    equilibrium,
    ...climates,
    brightening,
    habitableZone,
    ownLimits: ownLimits(states, starlight),
    assumptions: hasShare ? planet.assumptions : null,
    notes,
    sources: sourcesOfAppraisal(laws, beside, inputs, notes),
    constants: CONSTANT_SET,
    caution: CAUTION,
  } satisfies Appraisal) as Appraisal;
}

/** What a loop uses that is not its budget. */
const LAWS_OF_LIGHT: readonly string[] = [
  "stellarLuminosity",
  "stellarFlux",
  "combinedFlux",
  "semiMajorAxis",
];

/** The field of a description to which a path belongs. */
const fieldOf = (path: string): string => path.split(/[.[]/)[0] as string;

/** Inputs that have no part in states but in the rest of an appraisal. */
function inputsBeside(facts: PlanetFacts, hasLimits: boolean): ReadonlySet<string> {
  const stars = facts.stars.map(({ path }) => path);
  return new Set([
    ...(hasLimits
      ? ["mass", ...stars.flatMap((at) => [`${at}.effectiveTemperature`, `${at}.luminosity`])]
      : []),
    ...(facts.surfacePressure === null ? [] : ["atmosphere.pressure"]),
    ...(facts.orbitalPeriod === null ? [] : ["orbit.period", ...stars.map((at) => `${at}.mass`)]),
    ...(facts.rotationPeriod === null ? [] : ["rotation.period"]),
  ]);
}
