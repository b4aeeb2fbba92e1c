// The logarithm behind log and log1p.
import { sumError } from "./errorFree.ts";
import { logParts, reduceLog } from "./logReduction.ts";
import { logSeries } from "./logSeries.ts";
import { LN2_HIGH, LN2_LOW, logHigh, logLow } from "./logTable.ts";

/** ln(x + tail) for finite x > 0 and |tail| up to half an ulp of x, to 0.514 ulp. */
export function logOfSum(x: number, tail: number): number {
  const cell = reduceLog(x, tail);
  const f = logParts[0] as number;
  const e = cell >> 7;
  const j = cell & 127;
  const base = e * LN2_HIGH + (logHigh[j] as number);
  const sum = base + f;
  const rest = logSeries(f) + ((logParts[1] as number) + (e * LN2_LOW + (logLow[j] as number)));
  return sum + (sumError(base, f, sum) + rest);
}
