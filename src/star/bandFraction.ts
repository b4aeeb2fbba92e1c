import { add, div, max, min, mul, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { longerShare, MEETING, shorterShare } from "./planckShare.ts";

/** hc/k, m K: exact in the SI of 2019, as the nearest double. */
const SECOND_RADIATION_CONSTANT = 0.014387768775039339;
/** λT over hc/k below which the share is less than any double. */
const DARK = 1e-3;
/** Stands for no upper limit, m: less than 10⁻²⁴ of the energy lies beyond at any allowed temperature. */
const LONGEST = 1e6;

/**
 * Share of a black body's energy between two wavelengths: (15/π⁴)∫x³/(eˣ − 1)dx, x = hc/(λkT) from that of `to` to that of
 * `from`. Temperature in K from 1 to 10⁶, wavelengths in m from 0 to 10⁶; `from` is 0 and `to` has no limit
 * unless said, so that a dividing wavelength is given as `to` for what is below it, as `from` for what is
 * above.
 *
 * These are shares of the energy, never of photons. A real star is no black body (an M dwarf least of all): where the
 * shares of its spectrum are known, they are better. Computed from series with all digits, 17 terms in e⁻ˣ for x ≥ 2,
 * 15 of Bernoulli's numbers for x ≤ 2; relative error about 10⁻¹⁵·(1 + x), and more for a narrow band, as its wavelength
 * over its width. Shares below 10⁻³⁰⁰ count as 0.
 * Errors: as for every law; `to` below `from` is out of range.
 * Source: Planck's law; series as in Chang & Rhee 1984, Int. Commun. Heat Mass Transfer 11, 451.
 */
export const bandFraction = /* @__PURE__ */ defineLaw({
  name: "bandFraction",
  about: "Share of a black body's energy between two wavelengths.",
  output: { symbol: "f_λ", unit: "1", within: [0, 1], about: "share of the energy" },
  inputs: {
    temperature: { symbol: "T", unit: "K", within: [1, 1e6], about: "temperature of the black body" },
    from: { symbol: "λ_1", unit: "m", within: [0, LONGEST], default: 0, about: "shortest wavelength" },
    to: { symbol: "λ_2", unit: "m", within: [0, LONGEST], default: LONGEST, about: "longest wavelength" },
  },
  demands: {
    ordered: {
      unit: "m",
      within: [0, LONGEST],
      about: "to − from",
      write: ({ from, to }) => sub(to, from),
    },
  },
  source: "Planck's law; series as in Chang & Rhee 1984, Int. Commun. Heat Mass Transfer 11, 451",
  write({ temperature, from, to }) {
    const reducedFrom = div(1, max(DARK, div(mul(from, temperature), SECOND_RADIATION_CONSTANT)));
    const reducedTo = div(1, max(DARK, div(mul(to, temperature), SECOND_RADIATION_CONSTANT)));
    // the part of the band on either side of the wavelength where the series meet
    const shorter = sub(shorterShare(max(MEETING, reducedTo)), shorterShare(max(MEETING, reducedFrom)));
    const longer = sub(longerShare(min(MEETING, reducedFrom)), longerShare(min(MEETING, reducedTo)));
    return min(1, max(0, add(shorter, longer)));
  },
});
