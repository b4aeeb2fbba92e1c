// The exact errors of sums and products, against exact integers.
import { expect, it } from "vitest";
import { anySumError, productError, sumError, upperHalf } from "../../src/ground/elementary/errorFree.ts";
import { doubles } from "./draws.ts";

const COUNT = 5000;
const first = doubles(40, COUNT, 7);
const second = doubles(40, COUNT, 70);
const pairs = first.map((a, i): [number, number] => [a, second[i] as number]);

/** x·2^500, exactly: every double used here and every product of two is a multiple of 2^-500. */
function exact(x: number): bigint {
  let scaled = x;
  let zeros = 500n;
  while (!Number.isInteger(scaled)) {
    scaled *= 2;
    zeros -= 1n;
  }
  return BigInt(scaled) << zeros;
}

const product = (a: number, b: number): bigint => (exact(a) * exact(b)) >> 500n;

it("a product and its error make the exact product", () => {
  expect(pairs.filter(([a, b]) => exact(a * b) + exact(productError(a, b, a * b)) !== product(a, b))).toEqual(
    [],
  );
});

it("a sum and its error make the exact sum", () => {
  const wrong = pairs.filter(([a, b]) => {
    const [larger, smaller] = Math.abs(a) >= Math.abs(b) ? [a, b] : [b, a];
    const inOrder = exact(a + b) + exact(sumError(larger, smaller, a + b));
    const inAnyOrder = exact(a + b) + exact(anySumError(a, b, a + b));
    return inOrder !== exact(a) + exact(b) || inAnyOrder !== inOrder;
  });
  expect(wrong).toEqual([]);
});

it("the errors are not all nothing", () => {
  expect(pairs.filter(([a, b]) => productError(a, b, a * b) !== 0).length).toBeGreaterThan(COUNT * 0.9);
  expect(pairs.filter(([a, b]) => anySumError(a, b, a + b) !== 0).length).toBeGreaterThan(COUNT * 0.5);
});

it("both halves of a double have at most 26 bits", () => {
  const bitsOf = (x: number): number => exact(Math.abs(x)).toString(2).replace(/0+$/, "").length;
  expect(first.filter((x) => bitsOf(upperHalf(x)) > 26 || bitsOf(x - upperHalf(x)) > 26)).toEqual([]);
});
