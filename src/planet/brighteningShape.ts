// The shape of a star's brightening: a rate, or a table of its luminosity.
import type { output } from "zod/mini";
import { array, maxLength, minLength, number, optional, strictObject, string, union } from "zod/mini";
import type { Port } from "../graph/card.ts";
import { exampleOf } from "./examples.ts";
import { BRIGHTENING_PORTS, STAR_PORTS } from "./fieldPorts.ts";
import { LONGEST_UNIT } from "./unitText.ts";
import { aboutOf, measuredSchema, sourceSchema } from "./valueSchema.ts";
import { worded } from "./wording.ts";

/** More entries than tracks of stars have; two are a line. */
const ROWS = [2, 1000] as const;

/** Numbers of one unit. `unit` says in words which. */
function column(port: Port, unit: string) {
  const [fewest, most] = ROWS;
  const numbers = array(worded(number(), "a number")).check(minLength(fewest), maxLength(most));
  const value = worded(numbers, `a list of ${fewest} to ${most} numbers`);
  const described = strictObject({
    value,
    unit: worded(string(), unit, { maxLength: LONGEST_UNIT }),
    source: optional(sourceSchema()),
  });
  return worded(described, "{ value, unit }: a list of numbers and their one unit", aboutOf(port));
}

const [rate, described] = measuredSchema(STAR_PORTS.brightening).def.options;
const [moment, describedMoment] = measuredSchema(BRIGHTENING_PORTS.now).def.options;

const table = worded(
  strictObject({
    time: column(BRIGHTENING_PORTS.time, 'a unit of time, as in "Gyr"'),
    luminosity: column(
      BRIGHTENING_PORTS.luminosity,
      'a unit of power, as in "solLum", or "1" for shares of any one luminosity',
    ),
    now: worded(
      union([moment, describedMoment]),
      'the time of today in the table, as in "4.6 Gyr"',
      aboutOf(BRIGHTENING_PORTS.now),
    ),
  }),
  "{ time, luminosity, now }",
  { description: "luminosity of the star by rising time, straight between the entries" },
);

/** What `star.brightening` may be. */
export const brighteningShape = worded(
  union([rate, described, table]),
  `a number with its unit, as in "${exampleOf(STAR_PORTS.brightening.unit)}", or a table { time, luminosity, now }`,
  aboutOf(STAR_PORTS.brightening),
);

/** The luminosity of a star by time, as it is written. */
export type BrighteningTable = output<typeof table>;

/** A column of it. */
export type BrighteningColumn = BrighteningTable["time"];
