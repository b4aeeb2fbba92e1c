// Numbers of about 106 bits, held as an unevaluated sum of two doubles (Dekker 1971).
import { productError, sumError } from "./errorFree.ts";

/** high + low, where high is the sum rounded to a double. */
export type DoubleDouble = readonly [high: number, low: number];

function normal(high: number, low: number): DoubleDouble {
  const sum = high + low;
  return [sum, sumError(high, low, sum)];
}

/** p·q, to about 2^-104 of the result. */
export function multiply(p: DoubleDouble, q: DoubleDouble): DoubleDouble {
  const product = p[0] * q[0];
  return normal(product, productError(p[0], q[0], product) + (p[0] * q[1] + p[1] * q[0]));
}

/** √p, to about 2^-104 of the result. */
export function squareRoot(p: DoubleDouble): DoubleDouble {
  const root = Math.sqrt(p[0]);
  const square = root * root;
  return normal(root, (p[0] - square - productError(root, root, square) + p[1]) / (2 * root));
}
