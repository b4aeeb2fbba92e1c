// Cautions on inputs that are allowed and read as they stand, but are most likely slips.
import { SOLAR_LUMINOSITY } from "../ground/constants.ts";
import type { Range } from "../ground/range.ts";
import type { Planet } from "../planet/planetTypes.ts";
import { type AppraisalNote, appraisalNote } from "./appraisalNote.ts";
import { shown } from "./report.ts";

/**
 * From the coolest brown dwarfs to a little above the brightest stars that are known, in solar luminosities. Round numbers that
 * leave all of them room: common practice, no source.
 */
const LUMINOSITIES: Range = [1e-6, 1e7];

/** Luminosities that no star has, and albedos that rise as the ice goes. */
export const unlikelyNotes = (planet: Planet): AppraisalNote[] => [
  ...luminosityNotes(planet),
  ...albedoNotes(planet),
];

function luminosityNotes({ facts }: Planet): AppraisalNote[] {
  const [faintest, brightest] = LUMINOSITIES;
  return facts.stars.flatMap(({ path, luminosity }) => {
    const suns = (luminosity ?? Number.NaN) / SOLAR_LUMINOSITY;
    if (!(suns < faintest) && !(suns > brightest)) return [];
    return [
      appraisalNote({
        ...{ code: "luminosity-of-no-star", severity: "caution", about: `${path}.luminosity` },
        ...{
          value: luminosity,
          unit: "W",
          range: [faintest * SOLAR_LUMINOSITY, brightest * SOLAR_LUMINOSITY],
        },
        text: `${shown(suns, 3)} times that of the Sun, and no star is so ${suns < faintest ? "faint" : "bright"}: is its unit the right one?`,
      }),
    ];
  });
}

/** Every law with two such ports is one of ice: the cold planet is the white one. */
function albedoNotes({ inputs }: Planet): AppraisalNote[] {
  const values = new Map(inputs.map(({ path, value }) => [path, value]));
  return inputs.flatMap(({ path, value: warm }) => {
    const cold = path.endsWith(".warm") ? values.get(path.replace(/warm$/, "cold")) : undefined;
    if (cold === undefined || warm <= cold) return [];
    return [
      appraisalNote({
        ...{ code: "warm-albedo-above-cold", severity: "caution", about: path, value: warm },
        text: `the warm planet reflects more than the cold one, ${shown(cold)}, which ice does not do: are the two exchanged?`,
      }),
    ];
  });
}
