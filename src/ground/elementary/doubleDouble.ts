// Numbers of about 106 bits, held as an unevaluated sum of two doubles: what the tables are computed in.
import { anySumError, productError, sumError } from "./errorFree.ts";

/** high + low, where high is the sum rounded to a double. */
export type DoubleDouble = readonly [high: number, low: number];

function normal(high: number, low: number): DoubleDouble {
  const sum = high + low;
  return [sum, sumError(high, low, sum)];
}

/** p + q, to about 2^-104 of the result for terms of equal sign. */
export function add(p: DoubleDouble, q: DoubleDouble): DoubleDouble {
  const sum = p[0] + q[0];
  return normal(sum, anySumError(p[0], q[0], sum) + (p[1] + q[1]));
}

/** p·q, to about 2^-104 of the result. */
export function multiply(p: DoubleDouble, q: DoubleDouble): DoubleDouble {
  const product = p[0] * q[0];
  return normal(product, productError(p[0], q[0], product) + (p[0] * q[1] + p[1] * q[0]));
}

/** a / b for two doubles, to about 2^-105 of the result. */
export function divide(a: number, b: number): DoubleDouble {
  const quotient = a / b;
  const back = quotient * b;
  return normal(quotient, (a - back - productError(quotient, b, back)) / b);
}

/** √p, to about 2^-104 of the result. */
export function squareRoot(p: DoubleDouble): DoubleDouble {
  const root = Math.sqrt(p[0]);
  const back = root * root;
  return normal(root, (p[0] - back - productError(root, root, back) + p[1]) / (2 * root));
}
