// Band fractions: every row of table ix, the seam of the two series, and what is refused.
import { describe, expect, test } from "vitest";
import { bandFraction, slopesOf } from "../../src/index.ts";
import table from "../reference/computed/ix_planck_bands.json" with { type: "json" };
import { refusal } from "../refusal.ts";

const metres = (micrometres: string) => Number(`${micrometres}e-6`);
/** hc/k, µm K. */
const REDUCING = 14387.76877503934;

test.each(table.rows)("$T K from $from to $to µm", ({ T, from, to, fraction }) => {
  const upper = to === "inf" ? {} : { to: metres(to) };
  const ours = bandFraction({ temperature: Number(T), from: metres(from), ...upper });
  const reduced = REDUCING / (Number(T) * Number(to === "inf" ? from : to));
  // a dozen roundings; four of them, in hc/(λkT), are multiplied by the exponent
  const tolerance = (12 + 4 * reduced) * 2 ** -53;
  expect(Math.abs(ours / Number(fraction) - 1)).toBeLessThanOrEqual(tolerance);
});

test("the table has fourteen temperatures and ten bands", () => {
  expect(table.rows).toHaveLength(140);
});

test("a band hardly wider than the spacing of doubles has no negative share", () => {
  // rounding makes the difference of the shares on either side negative here
  for (const [temperature, from, to] of [
    [538, 0.0000121427, 0.000012142700000000003],
    [453, 0.0000158489, 0.000015848900000000003],
    [389, 0.0000183315, 0.000018331500000000002],
  ] as const)
    expect(bandFraction({ temperature, from, to })).toBe(0);
});

describe("where the two series meet", () => {
  const temperature = 288;
  const seam = REDUCING / 2 / temperature;

  test("the share has no jump and its slope no kink", () => {
    const slope = (to: number) => slopesOf(bandFraction, { temperature, from: 0, to: to * 1e-6 }).slopes.to;
    const share = (to: number) => bandFraction({ temperature, to: to * 1e-6 });
    const [low, high] = [seam * (1 - 1e-12), seam * (1 + 1e-12)];
    expect(share(high) - share(low)).toBeGreaterThan(0);
    // two steps of 10⁻¹², and the roundings of both
    expect(share(high) - share(low)).toBeLessThan(3e-12);
    expect((slope(high) as number) / (slope(low) as number) - 1).toBeCloseTo(0, 10);
  });

  test("a narrow band across it is Planck's law times its width", () => {
    const width = 1e-6;
    const band = { from: seam * (1 - width / 2) * 1e-6, to: seam * (1 + width / 2) * 1e-6 };
    // (15/π⁴)·x³/(eˣ − 1) dx at x = 2, |dx| = 2·width
    const planck = ((15 / Math.PI ** 4) * 8 * 2 * width) / Math.expm1(2);
    // half a dozen roundings of shares near one half, over a share near 4·10⁻⁷
    expect(bandFraction({ temperature, ...band }) / planck - 1).toBeCloseTo(0, 8);
  });
});

test("a far tail of a star keeps its digits", () => {
  // Rayleigh and Jeans: (15/π⁴)·x³/3 beyond a long wavelength, less 3x/8 of it
  const x = REDUCING / (5772 * 1e9);
  const tail = bandFraction({ temperature: 5772, from: 1e3 });
  expect(tail / ((5 / Math.PI ** 4) * x ** 3) - 1).toBeCloseTo(0, 8);
});

describe("limits and refusals", () => {
  test("no limits, no width, and no light", () => {
    expect(bandFraction({ temperature: 5772 })).toBeCloseTo(1, 15);
    expect(bandFraction({ temperature: 5772, from: 5e-7, to: 5e-7 })).toBe(0);
    expect(bandFraction({ temperature: 5772, to: 0 })).toBe(0);
    expect(bandFraction({ temperature: 1, to: 1e-6 })).toBe(0);
  });

  test.each([
    [{ temperature: 5772, from: 2e-6, to: 1e-6 }, "out-of-range", "bandFraction.ordered (to − from)"],
    [{ temperature: 0, to: 1e-6 }, "out-of-range", "bandFraction.temperature"],
    [{ temperature: 5772, from: -1e-6 }, "out-of-range", "bandFraction.from"],
    [{ temperature: 5772, to: Number.POSITIVE_INFINITY }, "not-a-number", "bandFraction.to"],
  ])("%o is refused", (wires, code, path) => {
    const error = refusal(() => bandFraction(wires));
    expect([error.code, error.path]).toEqual([code, path]);
  });
});
