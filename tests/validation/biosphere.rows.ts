// Plants: growth and steady cover by temperature.
import { parabolicCover, steadyCover } from "../../src/index.ts";
import table from "../reference/computed/iv_plant_cover.json" with { type: "json" };
import { type Check, ROUNDED, ROUNDING } from "./check.ts";
import { WATSON_LOVELOCK } from "./sources.ts";

/** The paper's Celsius is K − 273, and its k is one over the half-width squared. */
const parabola = (celsius: string) => ({
  temperature: Number(celsius) + 273,
  best: 295.5,
  halfWidth: Math.sqrt(1 / 0.003265),
});
const computed = {
  unit: "1",
  source: WATSON_LOVELOCK,
  basis: "computed with mpmath (cover_tables.py)",
} as const;

export const biosphereRows: readonly Check[] = [
  {
    covers: ["steadyCover"],
    what: "steady cover at the best temperature",
    published: 0.7,
    unit: "1",
    ours: () => steadyCover({ ...parabola("22.5"), deathRate: 0.3, available: 1 }),
    tolerance: ROUNDING,
    because: ROUNDED,
    source: WATSON_LOVELOCK,
    basis: "from memory",
  },
  ...table.curve.flatMap(({ celsius, growth, cover }): Check[] => [
    {
      ...computed,
      covers: ["parabolicCover"],
      what: `growth rate 1 − 0.003265·(22.5 − ${celsius})², as a cover`,
      published: Number(growth),
      ours: () => parabolicCover({ ...parabola(celsius), most: 1 }),
      tolerance: ROUNDING,
      because: ROUNDED,
    },
    {
      ...computed,
      covers: ["steadyCover"],
      what: `steady cover at ${celsius} °C with a death rate of 0.3`,
      published: Number(cover),
      ours: () => steadyCover({ ...parabola(celsius), deathRate: 0.3, available: 1 }),
      tolerance: ROUNDING,
      because: ROUNDED,
    },
  ]),
];
