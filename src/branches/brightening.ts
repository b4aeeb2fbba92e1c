// How long a star needs to brighten by a factor.
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber } from "../ground/range.ts";
import { SOLAR_AGE, SOLAR_MASS, SOLAR_PACE, stellarBrightening } from "../star/stellarBrightening.ts";

/** The history of the Sun (Gough 1981), for stars of 0.9 to 1.1 solar masses. */
export interface SunlikeBrightening {
  /** kg. */
  readonly mass: number;
  /** Age today, s; that of the Sun unless said. */
  readonly age?: number;
}

/** A star that brightens by the same amount every second. */
export interface SteadyBrightening {
  /** (dL/dt)/L today, s⁻¹. */
  readonly rate: number;
}

interface TableEntry {
  readonly time: number;
  readonly luminosity: number;
}

/** A star whose luminosity is tabled, straight between the entries. */
export interface TabledBrightening {
  /** By rising time; times in s, luminosities in any one unit. */
  readonly table: readonly TableEntry[];
  /** The time of today in the table, s. */
  readonly now: number;
}

/** How a star brightens. */
export type Brightening = SunlikeBrightening | SteadyBrightening | TabledBrightening;

/** The time until the star has so many times the light of today, s; `null` if it never has, as far as is known. */
export type TimeUntil = (factor: number) => number | null;

/** Checks a brightening and returns the time until a factor above or below 1 is reached. */
export function timeUntil(brightening: Brightening): TimeUntil {
  if (typeof brightening !== "object" || brightening === null)
    fail("unreadable", {
      path: "brightening",
      value: brightening,
      allowed: "{ mass }, { rate } or { table, now }",
    });
  if ("rate" in brightening) return steady(brightening);
  if ("table" in brightening) return tabled(brightening);
  return sunlike(brightening);
}

/** 1 + 0.4(1 − t/t₀) is inversely proportional to luminosity. */
function sunlike(brightening: SunlikeBrightening): TimeUntil {
  checkKeys(brightening, "brightening", ["mass", "age"]);
  const { mass, age = SOLAR_AGE } = brightening;
  const suns = checkedNumber(mass, "brightening.mass", "kg") / SOLAR_MASS;
  if (!(suns >= 0.9 && suns <= 1.1)) {
    const allowed = "0.9 to 1.1 solar masses: the history is the Sun's, another star needs a rate or a table";
    fail("out-of-range", { path: "brightening.mass", value: mass, allowed });
  }
  const now = 1 / stellarBrightening({ age });
  return (factor) => (factor > 1 ? ((now - now / factor) / SOLAR_PACE) * SOLAR_AGE : null);
}

function steady(brightening: SteadyBrightening): TimeUntil {
  checkKeys(brightening, "brightening", ["rate"]);
  const rate = checkedNumber(brightening.rate, "brightening.rate", "s-1", [-1, 1]);
  return (factor) => {
    const time = (factor - 1) / rate;
    // a rate of next to nothing takes longer than a number can say, and one of the other sign never gets there
    return time > 0 && Number.isFinite(time) ? time : null;
  };
}

function tabled(brightening: TabledBrightening): TimeUntil {
  checkKeys(brightening, "brightening", ["table", "now"]);
  const { table } = brightening;
  const path = "brightening.table";
  if (!Array.isArray(table) || table.length < 2)
    fail("unreadable", { path, value: table, allowed: "two or more entries { time, luminosity }" });
  const rows = (table as readonly TableEntry[]).map((row, i) => ({
    time: checkedNumber(row?.time, `${path}[${i}].time`, "s"),
    luminosity: checkedNumber(row?.luminosity, `${path}[${i}].luminosity`, "1", [0, 1e40]),
  }));
  const [first, last] = [rows[0], rows.at(-1)] as [TableEntry, TableEntry];
  rows.slice(1).forEach(({ time }, i) => {
    const before = (rows[i] as TableEntry).time;
    if (!(time > before))
      fail("out-of-range", {
        path: `${path}[${i + 1}].time`,
        value: time,
        allowed: `above ${before}`,
        unit: "s",
      });
  });
  const now = checkedNumber(brightening.now, "brightening.now", "s", [first.time, last.time]);
  const pieces = rows.slice(1).map((to, i) => ({ from: rows[i] as TableEntry, to }));
  const luminosity = luminosityNow({ table: rows, now });
  if (luminosity === 0)
    fail("out-of-range", {
      path: "brightening.now",
      value: now,
      allowed: "a time with a luminosity above 0",
    });
  return (factor) => {
    const wanted = factor * luminosity;
    const short = (at: number) => (factor > 1 ? at < wanted : at > wanted);
    for (const { from, to } of pieces) {
      if (to.time <= now || short(to.luminosity) || from.luminosity === to.luminosity) continue;
      const share = (wanted - from.luminosity) / (to.luminosity - from.luminosity);
      const time = from.time + Math.max(0, share) * (to.time - from.time);
      return Math.max(0, time - now);
    }
    return null;
  };
}

/** The luminosity that a checked table has for today, straight between its entries. */
export function luminosityNow({ table, now }: TabledBrightening): number {
  const next = Math.max(
    1,
    table.findIndex(({ time }) => time >= now),
  );
  const [from, to] = table.slice(next - 1) as unknown as [TableEntry, TableEntry];
  return from.luminosity + ((now - from.time) / (to.time - from.time)) * (to.luminosity - from.luminosity);
}
