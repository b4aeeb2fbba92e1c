// Everything that a paper says of a planet, from its description.

import { CONSTANT_SET } from "../ground/constants.ts";
import { deepFreeze } from "../ground/deepFreeze.ts";
import { checkKeys } from "../ground/names.ts";
import type { Range } from "../ground/range.ts";
import { VERSION } from "../ground/version.ts";
import { sourcesOf } from "../loop/sourcesOf.ts";
import { readPlanet } from "../planet/readPlanet.ts";
import { alongStar } from "./alongStar.ts";
import type { Appraisal } from "./appraisal.ts";
import { completed } from "./completed.ts";
import { equilibriumTemperatures } from "./equilibriumTemperatures.ts";
import { lawsBeside } from "./lawsBeside.ts";
import { ownLimits, publishedLimits } from "./limits.ts";
import { notesOfAppraisal } from "./notesOfAppraisal.ts";
import { sourcesOfAppraisal } from "./sourcesOfAppraisal.ts";
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
const CAUTION =
  "These are screening estimates from a zero-dimensional model, with one temperature for the whole planet: no projection and no safety margin. Where a full climate model has been run, trust that model first; for decisions about Earth, the assessments of the responsible authorities.";

/**
 * Everything that is said of a described planet, in one frozen record: flux along the orbit; equilibrium temperatures as
 * described and by the usual conventions; all states with proof, their ledgers, feedback loops and margins as the star
 * brightens or fades; Π and the average over the orbit that it favours; greenhouse warming apart; the position relative to
 * every published limit of the habitable zone, and where the planet's own climates end; water and CO₂ frost at the surface
 * where its pressure is given; assumptions, cautions and sources. It says nothing of life, and gives no score.
 *
 * The description is that of `readPlanet`, and may be incomplete: without `albedo`, `longwave` or `redistribution` there
 * are no states, without `heatCapacity` no times; `missing` says so. Inputs that contradict each other are noted, and the
 * first is used. All numbers in SI. The record survives `JSON.stringify`; `toText`, `toMarkdown` and `toRows` write it.
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
  const { description: whole, missing, hasBudget } = completed(description);
  const reading = { contradictions: "note" } as const;
  const planet = readPlanet(whole, reading);
  const { facts, assumptions } = planet;
  const starlight = starlightOf(facts);
  const star = hasBudget ? alongStar(planet, reading) : null;
  const loop = (star?.planet ?? planet).loop;
  const climates: Climates = hasBudget
    ? statesOfPlanet({ loop, facts, star }, { within, effort })
    : { found: null, states: [], diagram: null };
  const albedoIsNumber = hasBudget && assumptions.albedo !== null;
  const ground = { albedo: assumptions.albedo ?? 0, internalFlux: assumptions.internalHeat };
  const temperature = facts.stars[0]?.effectiveTemperature ?? null;
  const absent = new Set(missing.map(({ path }) => path));
  const inputs = planet.inputs.filter(({ path }) => !absent.has(path.split(/[.[]/)[0] as string));
  const habitableZone = publishedLimits(temperature, starlight);
  const equilibrium = equilibriumTemperatures(
    starlight,
    hasBudget ? planet.equilibriumTemperature : null,
    albedoIsNumber ? ground : null,
  );
  const { states } = climates;
  const used = [
    ...(habitableZone.length > 0 ? ["star.effectiveTemperature"] : []),
    ...(facts.surfacePressure === null ? [] : ["atmosphere.pressure"]),
    ...(facts.orbitalPeriod === null ? [] : ["orbit.period", "star.mass"]),
    ...(facts.rotationPeriod === null ? [] : ["rotation.period"]),
  ];
  return deepFreeze({
    format: "thermostead-appraisal-1",
    version: VERSION,
    name: planet.description.name ?? null,
    star: facts.stars[0]?.name ?? null,
    description,
    inputs,
    missing,
    starlight,
    equilibrium,
    ...climates,
    habitableZone,
    ownLimits: ownLimits(states, starlight),
    assumptions: hasBudget ? assumptions : null,
    notes: [
      ...planet.notes.filter((note) => counts(note, { hasBudget, used })),
      ...notesOfAppraisal(planet, states, hasBudget),
    ],
    sources: sourcesOfAppraisal(
      hasBudget ? sourcesOf(loop) : [],
      lawsBeside({ starlight, equilibrium, habitableZone, states }),
      inputs,
    ),
    constants: CONSTANT_SET,
    caution: CAUTION,
  } satisfies Appraisal) as Appraisal;
}

/** Leaves out what is said of a budget that is not there, and of inputs that have no part in states but in the appraisal. */
function counts(
  { code, about }: Appraisal["notes"][number],
  { hasBudget, used }: { hasBudget: boolean; used: readonly string[] },
): boolean {
  if (code === "assumption") return hasBudget;
  return code !== "input-unused" || (hasBudget && !used.includes(about));
}
