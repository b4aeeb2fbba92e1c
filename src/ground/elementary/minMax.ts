// The lesser and the greater of two numbers.

/** The lesser of a and b; NaN if either is. Of two zeros the second. Any range and unit; throws nothing. */
export function min(a: number, b: number): number {
  return a < b ? a : b <= a ? b : NaN;
}

/** The greater of a and b; NaN if either is. Of two zeros the second. Any range and unit; throws nothing. */
export function max(a: number, b: number): number {
  return a > b ? a : b >= a ? b : NaN;
}
