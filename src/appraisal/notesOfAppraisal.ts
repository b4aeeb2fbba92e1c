// Cautions that follow from the whole of a planet, not from one of its numbers.
import { EARTH_MASS_PARAMETER, GRAVITATION } from "../ground/constants.ts";
import { interpolatedRunawayFlux } from "../habitable/interpolatedRunawayFlux.ts";
import { hasBands } from "../planet/bands.ts";
import { COOL_STAR } from "../planet/coolStar.ts";
import type { Planet } from "../planet/planetTypes.ts";
import { type AppraisalNote, appraisalNote } from "./appraisalNote.ts";
import type { StateAppraisal } from "./appraisedState.ts";
import { brighteningNotes } from "./brighteningNotes.ts";
import { hostOf } from "./hostOf.ts";
import { limitsArePublished, PUBLISHED_STARS } from "./limits.ts";
import { rangeOf, takes } from "./portRange.ts";
import { shown } from "./report.ts";
import type { StarBrightening } from "./starBrightening.ts";
import { unlikelyNotes } from "./unlikelyNotes.ts";

/** From here on the flux at periastron is half as large again as at apoastron, and a circle is a poor likeness; no source. */
const ECCENTRIC = 0.1;
/** Rotation periods above which the clouds of the day side move the inner limits, s: from about 20 days on (Yang et al. 2014). */
const SLOW_ROTATION = 20 * 86400;

const EARTH_MASS = EARTH_MASS_PARAMETER / GRAVITATION;

/** What is known of a planet when its notes are written. */
export interface Noted {
  readonly planet: Planet;
  readonly states: readonly StateAppraisal[];
  readonly hasBudget: boolean;
  readonly brightening: StarBrightening | null;
}

/** The notes that an appraisal adds to those of the planet. */
export const notesOfAppraisal = (noted: Noted): AppraisalNote[] => [
  ...starNotes(noted),
  ...massNotes(noted),
  ...orbitNotes(noted),
  ...rotationNotes(noted),
  ...unlikelyNotes(noted.planet),
  ...brighteningNotes(
    noted.states,
    noted.brightening,
    `${noted.planet.facts.stars[0]?.path ?? "star"}.brightening`,
  ),
  ...(noted.hasBudget
    ? []
    : [
        appraisalNote({
          ...{ code: "incomplete-budget", about: "description" },
          text: "a part of the budget is not given, so no states were looked for",
        }),
      ]),
];

const caution = (note: Omit<Parameters<typeof appraisalNote>[0], "severity">): AppraisalNote =>
  appraisalNote({ severity: "caution", ...note });

function starNotes({ planet: { facts, description } }: Noted): AppraisalNote[] {
  const notes: AppraisalNote[] = [];
  const host = hostOf(facts);
  const temperature = host?.effectiveTemperature ?? null;
  const about = `${host?.path ?? "star"}.effectiveTemperature`;
  const star = { about, value: temperature, unit: "K" };
  if (temperature !== null && temperature < COOL_STAR && !hasBands(description))
    notes.push(
      caution({
        ...{ code: "albedo-of-another-star", ...star },
        text: "an albedo like Earth's, 0.3, belongs to the light of the Sun: under so cool a star snow and ice are darker and air absorbs more; covers may have a visible and a near-infrared albedo",
        source: "Shields et al. 2013, Astrobiology 13, 715 (doi:10.1089/ast.2012.0961)",
      }),
    );
  if (temperature !== null && !limitsArePublished(temperature))
    notes.push(
      caution({
        ...{ code: "star-outside-limits", ...star, range: PUBLISHED_STARS },
        text: `no limits of the habitable zone are published for this star: they are for ${PUBLISHED_STARS.join(" to ")} K`,
      }),
    );
  if (facts.stars.length > 1)
    notes.push(
      appraisalNote({
        ...{ code: "several-stars", about: "star" },
        text: "published limits are those for the light of the first star that the planet orbits, and no one given stands for all the light, so that how far it may grow or fade is not told",
      }),
    );
  return notes;
}

/** The mass acts on nothing but the limit that is interpolated for it. */
function massNotes({ planet: { facts } }: Noted): AppraisalNote[] {
  const { mass } = facts;
  const temperature = hostOf(facts)?.effectiveTemperature ?? null;
  if (mass === null || !limitsArePublished(temperature) || takes(interpolatedRunawayFlux, "mass", mass))
    return [];
  const range = rangeOf(interpolatedRunawayFlux, "mass");
  const earths = (kg: number) => shown(kg / EARTH_MASS, 3);
  return [
    appraisalNote({
      ...{ code: "mass-outside-limits", about: "mass", value: mass, unit: "kg", range },
      text: `${earths(mass)} Earths: the runaway greenhouse was computed for ${range.map((kg) => shown(kg / EARTH_MASS, 2)).join(" to ")}, so no limit is interpolated for this mass`,
    }),
  ];
}

function orbitNotes({ planet: { facts, assumptions }, states }: Noted): AppraisalNote[] {
  const { eccentricity } = facts;
  if (eccentricity === 0) return [];
  const notes: AppraisalNote[] = [];
  if (eccentricity > ECCENTRIC)
    notes.push(
      caution({
        ...{ code: "eccentric-orbit", about: "orbit.eccentricity", value: eccentricity },
        text: "the flux changes much along the orbit; the published limits are for nearly circular orbits",
      }),
    );
  for (const { state, averaging } of states) {
    const { favours, thermalInertiaRatio } = averaging;
    if (thermalInertiaRatio === null || favours === assumptions.average) continue;
    const at = `thermal time / orbital period = ${shown(thermalInertiaRatio, 4)} at ${state.temperature.toFixed(2)} K`;
    notes.push(
      caution({
        ...{ code: "average-not-favoured", about: "orbit.average" },
        text: favours
          ? `${at} speaks for the mean of the ${favours}`
          : `${at} is between the cases: neither average is a good guide`,
      }),
    );
  }
  return notes;
}

function rotationNotes({ planet: { facts } }: Noted): AppraisalNote[] {
  const { rotationPeriod, locked } = facts;
  const turns = locked ? "keeps one side to its star" : "turns slowly";
  if (locked !== true && (rotationPeriod === null || rotationPeriod <= SLOW_ROTATION)) return [];
  return [
    caution({
      ...{ code: "slow-rotation", about: "rotation", value: rotationPeriod },
      unit: rotationPeriod === null ? "1" : "s",
      text: `a planet that ${turns} can shield its day side with clouds, which moves the inner limits towards the star`,
      source: "Yang et al. 2014, ApJL 787, L2 (doi:10.1088/2041-8205/787/1/L2)",
    }),
  ];
}
