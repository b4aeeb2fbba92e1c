// Proves that a balance only rises, or only falls, with a parameter wherever it can vanish.
import type { Range } from "../ground/range.ts";
import { signOfRange } from "../search/interval.ts";

/** Reads N and ∂N/∂p over a box of temperature and parameter. */
export interface BoxReader {
  enclose(temperatures: Range, parameters: Range): void;
  net(): Range;
  answer(): Range;
}

const MOST_HALVINGS = 12;
const MOST_PARAMETER_HALVINGS = 3;

/** The sign of ∂N/∂p wherever N can vanish in a box; 0 where it is not proved to be one. A box without zeros has either. */
export function provedMonotone(reader: BoxReader, temperatures: Range, parameters: Range): 1 | -1 | 0 {
  const found = over(reader, temperatures, parameters, MOST_HALVINGS);
  return found === "none" ? 1 : found;
}

type Found = 1 | -1 | 0 | "none";

function over(reader: BoxReader, t: Range, p: Range, left: number): Found {
  const here = across(reader, t, p, MOST_PARAMETER_HALVINGS);
  if (here !== 0 || left === 0) return here;
  const middle = t[0] + (t[1] - t[0]) / 2;
  const cold = over(reader, [t[0], middle], p, left - 1);
  return cold === 0 ? 0 : both(cold, over(reader, [middle, t[1]], p, left - 1));
}

function across(reader: BoxReader, t: Range, p: Range, left: number): Found {
  reader.enclose(t, p);
  if (signOfRange(reader.net()) !== 0) return "none";
  const sign = signOfRange(reader.answer());
  if (sign !== 0 || left === 0) return sign;
  const middle = p[0] + (p[1] - p[0]) / 2;
  const less = across(reader, t, [p[0], middle], left - 1);
  return less === 0 ? 0 : both(less, across(reader, t, [middle, p[1]], left - 1));
}

function both(a: Found, b: Found): Found {
  if (a === "none") return b;
  return b === "none" || a === b ? a : 0;
}
