/** ln(1 + f) − f for |f| ≤ 1/128: Taylor's series to the ninth power. */
export function logSeries(f: number): number {
  const z = f * f;
  const c6 = -1 / 6 + f * (1 / 7) + z * (-1 / 8 + f * (1 / 9));
  return z * (-1 / 2 + f * (1 / 3) + z * (-1 / 4 + f * (1 / 5) + z * c6));
}
