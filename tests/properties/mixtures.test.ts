// What holds for any mixture of surfaces.
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { absorbedFlux, mixAlbedo, slopesOf } from "../../src/index.ts";
import { refusal } from "../refusal.ts";
import { settings } from "./settings.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("a mixture of surfaces", () => {
  const cover = fc.record({ fraction: between(0, 1), albedo: between(0, 1) });
  const covers = fc.array(cover, { minLength: 1, maxLength: 8 }).map((list) => {
    const total = list.reduce((sum, c) => sum + c.fraction, 0);
    return list.map((c) => ({ ...c, fraction: total > 1 ? c.fraction / total : c.fraction }));
  });
  /** The sum of eight products. */
  const ROUNDING = 16 * 2 ** -53;

  test("lies between its parts", () => {
    fc.assert(
      fc.property(covers, between(0, 1), (list, bare) => {
        const mixed = mixAlbedo({ covers: list, bare });
        const parts = [bare, ...list.map((c) => c.albedo)];
        expect(mixed).toBeGreaterThanOrEqual(Math.min(...parts) - ROUNDING);
        expect(mixed).toBeLessThanOrEqual(Math.max(...parts) + ROUNDING);
      }),
      settings(300),
    );
  });

  test("has slopes in its shares where the rest is bare, and none where they must sum to 1", () => {
    const covers = [0.3, 0.7].map((fraction) => ({ fraction, albedo: 0.6 }));
    const { slopes } = slopesOf(mixAlbedo, { covers, bare: 0.1 });
    expect(slopes["covers[0].fraction"]).toBeCloseTo(0.5, 12);
    expect(Object.keys(slopesOf(mixAlbedo, { covers }).slopes)).toEqual([
      "covers[0].albedo",
      "covers[1].albedo",
    ]);
  });

  test("of white parts is white, also where its shares sum to more than 1 by rounding", () => {
    const shares = [0.13148891446772115, 0.4219635700938282, 0.4465475154384508];
    expect(shares.reduce((sum, share) => sum + share, 0)).toBeGreaterThan(1);
    expect(mixAlbedo({ covers: shares.map((fraction) => ({ fraction, albedo: 1 })) })).toBe(1);
  });

  test("of shares that miss 1 by more than rounding is refused, with the rest bare or without", () => {
    const halves = (second: number) => [0.5, second].map((fraction) => ({ fraction, albedo: 0.3 }));
    expect(mixAlbedo({ covers: halves(0.5 + 5e-13) })).toBeCloseTo(0.3, 11);
    expect(refusal(() => mixAlbedo({ covers: halves(0.5 + 1e-11) })).code).toBe("out-of-range");
    expect(refusal(() => mixAlbedo({ covers: halves(0.5 - 1e-11) })).code).toBe("shares-not-one");
    expect(refusal(() => mixAlbedo({ covers: halves(0.5 + 1e-11), bare: 0.1 })).code).toBe("out-of-range");
  });

  test("of shares in whole percents is an albedo, however bright its parts", () => {
    const percents = fc
      .array(fc.integer({ min: 0, max: 100 }), { minLength: 1, maxLength: 6 })
      .map((cuts) => [0, ...cuts.sort((a, b) => a - b), 100])
      .map((cuts) => cuts.slice(1).map((cut, i) => (cut - (cuts[i] as number)) / 100));
    fc.assert(
      fc.property(percents, (fractions) => {
        const bright = mixAlbedo({ covers: fractions.map((fraction) => ({ fraction, albedo: 1 })) });
        expect(bright).toBeLessThanOrEqual(1);
        expect(absorbedFlux({ flux: 1361, albedo: bright })).toBeLessThanOrEqual(1361 * ROUNDING);
      }),
      settings(300),
    );
  });

  test("does not depend on the order of its parts", () => {
    fc.assert(
      fc.property(
        covers.chain((list) =>
          fc.tuple(fc.constant(list), fc.shuffledSubarray(list, { minLength: list.length })),
        ),
        between(0, 1),
        ([list, other], bare) => {
          const difference = mixAlbedo({ covers: list, bare }) - mixAlbedo({ covers: other, bare });
          expect(Math.abs(difference)).toBeLessThanOrEqual(ROUNDING);
        },
      ),
      settings(300),
    );
  });

  test("is the same with its last part as the rest of the surface", () => {
    const complete = fc.array(cover, { minLength: 2, maxLength: 8 }).map((list) => {
      const total = list.reduce((sum, c) => sum + c.fraction + 0.01, 0);
      return list.map((c) => ({ ...c, fraction: (c.fraction + 0.01) / total }));
    });
    fc.assert(
      fc.property(complete, (list) => {
        const rest = list.at(-1)?.albedo as number;
        const difference = mixAlbedo({ covers: list }) - mixAlbedo({ covers: list.slice(0, -1), bare: rest });
        expect(Math.abs(difference)).toBeLessThanOrEqual(ROUNDING);
      }),
      settings(300),
    );
  });
});
