// What rounding takes away from one sum or one product, exactly.

/**
 * The upper 26 bits of x, so that x − upperHalf(x) fits in 26 bits too (Veltkamp's splitting).
 * Valid for |x| below 2^996.
 */
export function upperHalf(x: number): number {
  const spread = x * 134217729; // 2^27 + 1
  return spread - (spread - x);
}

/** a·b − product, exactly, where product is a * b as rounded (Dekker 1971, Numer. Math. 18, 224). */
export function productError(a: number, b: number, product: number): number {
  const a1 = upperHalf(a);
  const a2 = a - a1;
  const b1 = upperHalf(b);
  const b2 = b - b1;
  return a2 * b2 - (product - a1 * b1 - a2 * b1 - a1 * b2);
}

/** a + b − sum, exactly, where sum is a + b as rounded and |a| ≥ |b| (Dekker 1971). */
export function sumError(a: number, b: number, sum: number): number {
  return b - (sum - a);
}

/** a + b − sum, exactly, whichever of the two is larger (Knuth, TAOCP vol. 2, section 4.2.2). */
export function anySumError(a: number, b: number, sum: number): number {
  const b1 = sum - a;
  return a - (sum - b1) + (b - b1);
}
