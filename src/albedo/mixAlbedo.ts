import { add, max, min, mul, sub, sum } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { fail } from "../ground/errors.ts";
import { compensatedSum } from "../ground/sum.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { albedoPort } from "../law/ports.ts";

/** How far the shares of a complete cover may be from 1. */
const SHARE_TOLERANCE = 1e-12;

/**
 * Albedo of a surface of several covers: α = Σ fᵢαᵢ, or bare + Σ fᵢ(αᵢ − bare) where `bare` is the albedo of the rest.
 * With `bare`, fractions may be quantities and their sum must not exceed 1 (checked in each state); without it they are
 * numbers that sum to 1 within 1e-12. Fractions and albedos between 0 and 1. Errors: as for every law; `shares-not-one`.
 * Source: reflected light adds by area.
 */
export const mixAlbedo = /* @__PURE__ */ defineLaw({
  name: "mixAlbedo",
  about: "Albedo of a surface of several covers, by area.",
  output: /* @__PURE__ */ albedoPort(),
  inputs: {
    covers: {
      each: {
        fraction: { symbol: "f", unit: "1", within: [0, 1], about: "share of the surface" },
        albedo: /* @__PURE__ */ albedoPort(),
      },
    },
    bare: {
      symbol: "α_b",
      unit: "1",
      within: [0, 1],
      about: "albedo of the rest of the surface",
      optional: true,
    },
  },
  demands: {
    covered: {
      unit: "1",
      within: [0, 1.000000000001],
      about: "sum of the fractions",
      write: ({ covers }) => sum(...covers.map((c) => c.fraction)),
    },
  },
  source: "reflected light adds by area",
  write({ covers, bare }) {
    // each fraction stands once, so that an enclosure of the mixture is no wider than it must be
    if (bare !== undefined) {
      const over = covers.map((c) => mul(c.fraction, sub(c.albedo, bare)));
      return asAlbedo(add(bare, sum(...over)));
    }
    checkShares(covers.map((c) => c.fraction));
    return asAlbedo(sum(...covers.map((c) => mul(c.fraction, c.albedo))));
  },
});

/** Rounding must not make a surface darker or brighter than any could be. */
const asAlbedo = (mixed: Value): Value => min(1, max(0, mixed));

function checkShares(fractions: readonly Value[]): void {
  const path = "mixAlbedo.covers";
  const shares = fractions.filter((f): f is number => typeof f === "number");
  if (shares.length < fractions.length) {
    fail("shares-not-one", { path, value: "quantities", allowed: "1; give the albedo of the rest as bare" });
  }
  const total = compensatedSum(shares);
  if (!(Math.abs(total - 1) <= SHARE_TOLERANCE))
    fail("shares-not-one", { path, value: total, allowed: "1 within 1e-12" });
}
