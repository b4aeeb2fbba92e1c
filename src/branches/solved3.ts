// Solves three linear equations, without proof.

/** Three numbers. */
export type Three = readonly [number, number, number];

/** Cramer's rule. */
export function solved3(rows: readonly [Three, Three, Three], right: Three): Three {
  const det = (m: readonly [Three, Three, Three]) =>
    m[0][0] * (m[1][1] * m[2][2] - m[1][2] * m[2][1]) -
    m[0][1] * (m[1][0] * m[2][2] - m[1][2] * m[2][0]) +
    m[0][2] * (m[1][0] * m[2][1] - m[1][1] * m[2][0]);
  const whole = det(rows);
  const replaced = (column: number) =>
    det(
      rows.map((row, i) => row.map((v, j) => (j === column ? right[i] : v))) as unknown as [
        Three,
        Three,
        Three,
      ],
    );
  return [replaced(0) / whole, replaced(1) / whole, replaced(2) / whole];
}
