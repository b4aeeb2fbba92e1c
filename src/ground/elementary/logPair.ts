// The logarithm to about 66 bits, for powers.
import { productError, sumError } from "./errorFree.ts";
import { logParts, reduceLog } from "./logReduction.ts";
import { LN2_HIGH, LN2_LOW, logHigh, logLow } from "./logTable.ts";

/**
 * ln x = returned value + logParts[1] for finite x > 0, right to about 2^-66 of itself.
 * As in log, but with f²/2 to its last bit.
 */
export function logPair(x: number): number {
  const cell = reduceLog(x, 0);
  const f = logParts[0] as number;
  const fTail = logParts[1] as number;
  const e = cell >> 7;
  const j = cell & 127;
  const square = f * f;
  const half = square / 2;
  const halfTail = productError(f, f, square) / 2 + f * fTail;
  const c6 = -1 / 6 + f * (1 / 7 + f * (-1 / 8 + f * (1 / 9 + f * (-1 / 10))));
  const cubic = f * square * (1 / 3 + f * (-1 / 4 + f * (1 / 5 + f * c6)));
  const base = e * LN2_HIGH + (logHigh[j] as number);
  const first = base + f;
  const second = first - half;
  const small = cubic + (fTail - halfTail + (e * LN2_LOW + (logLow[j] as number)));
  const rest = sumError(base, f, first) + (sumError(first, -half, second) + small);
  const upper = second + rest;
  logParts[1] = sumError(second, rest, upper);
  return upper;
}
