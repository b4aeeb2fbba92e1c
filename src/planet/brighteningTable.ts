// A star whose luminosity is tabled: its columns as values of a description, what they must fulfil, and what they hold.
import { luminosityNow, type TabledBrightening } from "../branches/brightening.ts";
import type { Port } from "../graph/card.ts";
import { fail } from "../ground/errors.ts";
import type { BrighteningColumn, BrighteningTable } from "./brighteningShape.ts";
import { faultsOf } from "./faults.ts";
import { BRIGHTENING_PORTS, RELATIVE_LUMINOSITY } from "./fieldPorts.ts";
import { inSI } from "./inSI.ts";
import { type PlanetInput, readInput } from "./planetInput.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { type DescribedStar, starsOf } from "./stars.ts";
import type { Way } from "./ways.ts";
import type { Numbers } from "./wire.ts";

/** Whether a brightening is a table; true also for one of which a part is missing. */
export const isTable = (brightening: unknown): brightening is BrighteningTable =>
  typeof brightening === "object" &&
  brightening !== null &&
  ("time" in brightening || "luminosity" in brightening);

/** The values of a table, each under the path at which it stands. */
export const tableReadings = (path: string, table: BrighteningTable): (() => PlanetInput)[] => [
  ...columnReadings(`${path}.time`, BRIGHTENING_PORTS.time, table.time),
  ...columnReadings(`${path}.luminosity`, luminosityPort(table), table.luminosity),
  // left out only where its shape is wrong
  ...(table.now === undefined ? [] : [() => readInput(`${path}.now`, BRIGHTENING_PORTS.now, table.now)]),
];

/** Luminosities may be shares of any one. */
const luminosityPort = ({ luminosity }: BrighteningTable): Port =>
  luminosity?.unit === "1" ? RELATIVE_LUMINOSITY : BRIGHTENING_PORTS.luminosity;

/** A column has one unit, so that a wrong one is one error. Parts are left out where their shape is wrong. */
function columnReadings(path: string, port: Port, column: Partial<BrighteningColumn> = {}) {
  const { value: values = [], unit, source } = column;
  if (unit === undefined) return [];
  const [wrong] = faultsOf(() => {
    if (port.unit !== "1") inSI(1, unit, { unit: port.unit, difference: false }, `${path}.unit`);
  });
  if (wrong) {
    return [
      (): PlanetInput => {
        throw wrong;
      },
    ];
  }
  return (values as readonly (number | undefined)[]).flatMap((value, i) =>
    value === undefined ? [] : [() => readInput(`${path}.value[${i}]`, port, { value, unit, source })],
  );
}

/** The tables of a description. Throws `contradiction` or `out-of-range` for one that cannot be read along its time. */
export function checkTables(d: PlanetDescription, inputs: readonly PlanetInput[]): void {
  for (const { path, star } of starsOf(d))
    if (isTable(star.brightening)) checkTable(`${path}.brightening`, star.brightening, inputs);
}

function checkTable(path: string, { time, luminosity }: BrighteningTable, inputs: readonly PlanetInput[]) {
  const [rows, others] = [time.value.length, luminosity.value.length];
  if (others !== rows)
    fail("contradiction", {
      path: `${path}.luminosity.value`,
      value: `${others} values`,
      allowed: `${rows}, one for each time`,
    });
  const times = inputs.filter((input) => input.path.startsWith(`${path}.time.`));
  const [first, last] = [times[0], times.at(-1)] as [PlanetInput, PlanetInput];
  times.slice(1).forEach((at, i) => {
    const before = times[i] as PlanetInput;
    if (at.value <= before.value)
      fail("out-of-range", {
        path: at.path,
        value: at.written,
        allowed: `a time above the one before it, ${before.written}`,
      });
  });
  const now = inputs.find((input) => input.path === `${path}.now`) as PlanetInput;
  if (now.value < first.value || now.value > last.value)
    fail("out-of-range", {
      path: now.path,
      value: now.written,
      allowed: `the time of today inside the table, ${first.written} to ${last.written}`,
    });
}

/** The table of a star in SI, as `tippingMargins` takes it; luminosities in W, or shares as they are written. */
export function tableOf({ path, star }: DescribedStar, numbers: Numbers): TabledBrightening | null {
  const { brightening } = star;
  if (!isTable(brightening)) return null;
  const at = `${path}.brightening`;
  const table = brightening.time.value.map((_, i) => ({
    time: numbers(`${at}.time.value[${i}]`),
    luminosity: numbers(`${at}.luminosity.value[${i}]`),
  }));
  return { table, now: numbers(`${at}.now`) };
}

/** The luminosity that a table has for today, W; none where its luminosities are shares. */
export function tableWays(star: DescribedStar, numbers: Numbers): Way[] {
  const { brightening } = star.star;
  if (!isTable(brightening) || brightening.luminosity.unit === "1") return [];
  const table = tableOf(star, numbers);
  if (!table) return [];
  const instead = 'luminosities as shares of any one, with the unit "1"';
  return [{ uses: [`${star.path}.brightening`], of: () => luminosityNow(table), instead }];
}
