// What the report says of limits.
import { ASTRONOMICAL_UNIT } from "../ground/constants.ts";
import type { Appraisal } from "./appraisal.ts";
import { INTERPOLATED } from "./limits.ts";
import { kelvin, type Section, shown } from "./report.ts";
import type { StatedLimit } from "./statedLimit.ts";

const POSITIONS = { nearer: "nearer", farther: "farther", crosses: "crosses it" } as const;

/** Published limits, and those of the planet's own budget. */
export function limitSections({ habitableZone, ownLimits }: Appraisal): Section[] {
  return [
    {
      title: "Published limits of the habitable zone",
      blocks:
        habitableZone.length === 0
          ? []
          : [
              {
                head: ["limit", "M, Earths", "paper", ...HEAD],
                rows: habitableZone.map((limit) => [
                  limit.name.replace(INTERPOLATED, " *"),
                  limit.massEarths === null ? "" : shown(limit.massEarths, 3),
                  (limit.paper?.split(",")[0] ?? "").replace(" et al.", ""),
                  ...numbersOf(limit),
                ]),
                right: [1, 3, 4, 5, 6],
              },
              ...(habitableZone.some(({ name }) => name.endsWith(INTERPOLATED))
                ? ["* interpolated by this library between the masses that the paper has"]
                : []),
              "the planet is nearer to the star than a limit, or farther, or crosses it along its orbit; where something changes, not what lives there",
            ],
    },
    {
      title: "Where the planet's own climates end",
      blocks:
        ownLimits.length === 0
          ? []
          : [
              {
                head: ["limit", "T there, K", ...HEAD.slice(0, -1)],
                rows: ownLimits.map((limit) => [
                  limit.name,
                  limit.temperature === null ? "" : kelvin(limit.temperature),
                  ...numbersOf(limit).slice(0, -1),
                ]),
                right: [1, 2, 3, 4, 5],
              },
            ],
    },
  ];
}

const HEAD = ["S, W m-2", "Earths", "au", "S / limit", "planet"] as const;

const numbersOf = ({ limit, distance, ratio, position }: StatedLimit): string[] => [
  limit.flux.toFixed(1),
  shown(limit.earths, 4),
  distance === null ? "" : shown(distance / ASTRONOMICAL_UNIT, 4),
  shown(ratio, 4),
  POSITIONS[position],
];
