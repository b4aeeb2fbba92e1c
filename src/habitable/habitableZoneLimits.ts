// The published limits of the habitable zone: what each stands for, which paper, which coefficients.
import { deepFreeze } from "../ground/deepFreeze.ts";
import { coefficientsOf, type FiveNumbers, type HabitableZoneCoefficients } from "./fluxPolynomial.ts";
import { RUNAWAY_2014 } from "./runawayCoefficients.ts";

/** One published limit. */
export interface HabitableZoneLimit {
  readonly name:
    | "recent Venus"
    | "runaway greenhouse"
    | "moist greenhouse"
    | "maximum greenhouse"
    | "early Mars";
  /** Which edge of the zone it is. */
  readonly edge: "inner" | "outer";
  /** Computed with a climate model, or inferred from what a planet of the solar system looks like. */
  readonly basis: "climate model" | "solar system";
  /** The planet's mass in Earth masses; only 0.1, 1 and 5 were computed. */
  readonly massEarths: 0.1 | 1 | 5;
  readonly paper: string;
  readonly year: 2013 | 2014;
  readonly doi: string;
  /** What `habitableZoneFlux` needs besides the star. */
  readonly coefficients: HabitableZoneCoefficients;
}

const PAPERS = {
  2013: {
    paper: "Kopparapu et al. 2013, ApJ 765, 131, erratum ApJ 770, 82",
    doi: "10.1088/0004-637X/770/1/82",
  },
  2014: { paper: "Kopparapu et al. 2014, ApJL 787, L29", doi: "10.1088/2041-8205/787/2/L29" },
} as const;

type Subject = Pick<HabitableZoneLimit, "name" | "massEarths">;

const limit = (
  year: HabitableZoneLimit["year"],
  { name, massEarths }: Subject,
  numbers: FiveNumbers,
): HabitableZoneLimit => ({
  name,
  edge: name === "maximum greenhouse" || name === "early Mars" ? "outer" : "inner",
  basis: name === "recent Venus" || name === "early Mars" ? "solar system" : "climate model",
  massEarths,
  ...PAPERS[year],
  year,
  coefficients: coefficientsOf(numbers),
});

const earth = (name: HabitableZoneLimit["name"]): Subject => ({ name, massEarths: 1 });
const runaway = (massEarths: HabitableZoneLimit["massEarths"]): Subject => ({
  name: "runaway greenhouse",
  massEarths,
});

const limits = (): HabitableZoneLimit[] => [
  limit(2013, earth("recent Venus"), [1.7763, 1.4335e-4, 3.3954e-9, -7.6364e-12, -1.195e-15]),
  limit(2013, earth("runaway greenhouse"), [1.0385, 1.2456e-4, 1.4612e-8, -7.6345e-12, -1.7511e-15]),
  limit(2013, earth("moist greenhouse"), [1.0146, 8.1884e-5, 1.9394e-9, -4.3618e-12, -6.826e-16]),
  limit(2013, earth("maximum greenhouse"), [0.3507, 5.9578e-5, 1.6707e-9, -3.0058e-12, -5.1925e-16]),
  limit(2013, earth("early Mars"), [0.3207, 5.4471e-5, 1.5275e-9, -2.1709e-12, -3.8282e-16]),
  limit(2014, earth("recent Venus"), [1.776, 2.136e-4, 2.533e-8, -1.332e-11, -3.097e-15]),
  limit(2014, runaway(5), RUNAWAY_2014[5]),
  limit(2014, runaway(1), RUNAWAY_2014[1]),
  limit(2014, runaway(0.1), RUNAWAY_2014[0.1]),
  limit(2014, earth("maximum greenhouse"), [0.356, 6.171e-5, 1.698e-9, -3.198e-12, -5.575e-16]),
  limit(2014, earth("early Mars"), [0.32, 5.547e-5, 1.526e-9, -2.874e-12, -5.011e-16]),
];

/**
 * Every published limit, from the star outwards within each paper: 2013 as corrected by its erratum (Earth masses only), and
 * 2014, where the runaway greenhouse was computed for 0.1, 1 and 5 Earth masses. Flux by `habitableZoneFlux`, distance by
 * `habitableZoneDistance`. The models have a cloudless Earth that turns fast on a nearly circular orbit: where a planet turns
 * slowly, clouds move the inner limits towards the star; where the orbit is eccentric, the mean flux stands for it at best.
 * A limit is where a model or a planet changed; it says nothing of life.
 * As published, the polynomials of 2013 for the runaway and the moist greenhouse cross: between 3659 and 5027 K the runaway
 * lies outside the moist greenhouse, by at most 0.7 % of the flux.
 * Source: Kopparapu et al. 2013, Table 3 as in the erratum; Kopparapu et al. 2014, Table 1.
 */
export const HABITABLE_ZONE_LIMITS: readonly HabitableZoneLimit[] = /* @__PURE__ */ deepFreeze(
  /* @__PURE__ */ limits(),
);
