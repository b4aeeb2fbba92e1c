// The heat balance of planets: printed absorbed and internal flux to the printed temperatures, and what flattening does.
import {
  absorbedFlux,
  blackbodyTemperature,
  equilibriumTemperature,
  REDISTRIBUTION_GLOBAL,
  STEFAN_BOLTZMANN,
} from "../../src/index.ts";
import oblate from "../reference/computed/oblate.json" with { type: "json" };
import { type Check, halfUnit } from "./check.ts";
import { HEAT_BALANCE } from "./sources.ts";

const redistribution = REDISTRIBUTION_GLOBAL;

/** Absorbed and internal flux, and both temperatures, of the heat-balance page. */
const BALANCES = [
  ["Venus", 163.6539, 231.89, 0, 231.89],
  ["Earth", 237.4147, 254.49, 0.062, 254.51],
  ["Mars", 110.4476, 210.18, 0, 210.18],
  ["Jupiter", 8.1233, 109.45, 5.44, 124.42],
  ["Saturn", 2.3814, 80.54, 2.01, 93.85],
  ["Uranus", 0.641, 58.01, 0.042, 58.94],
] as const;

/** The page's temperatures all follow from σ = 5.660·10⁻⁸ (±0.001): with today's σ they are 0.046 % lower. */
const OLD_SIGMA = ((5.661e-8 / STEFAN_BOLTZMANN) ** 0.25 - (5.659e-8 / STEFAN_BOLTZMANN) ** 0.25) / 2;
const toTheirs = (5.66e-8 / STEFAN_BOLTZMANN) ** -0.25;
const SIGMA_NOTE = "last digit, and the page's σ = 5.660(1)e-8, from which all its temperatures follow";

const balanceRows = BALANCES.flatMap(([name, absorbed, Teq, internal, Teff]): Check[] => {
  // absorbed flux as a beam on a sphere that reflects nothing
  const beam = { flux: 4 * absorbed, albedo: 0, redistribution };
  const row = (
    what: string,
    published: number,
    ours: () => number,
    covers: string[],
    step: number,
  ): Check => ({
    covers,
    what: `${name}: ${what} (rescaled to the page's σ)`,
    published,
    unit: "K",
    ours: () => ours() * toTheirs,
    tolerance:
      halfUnit(0.01) + published * OLD_SIGMA + (published * halfUnit(step)) / (4 * (absorbed + internal)),
    because: SIGMA_NOTE,
    source: HEAT_BALANCE,
    basis: "seen",
  });
  const step = name === "Uranus" ? 0.001 : 0.0001;
  const rows = [
    row(
      "equilibrium temperature from the absorbed flux",
      Teq,
      () => equilibriumTemperature(beam),
      ["equilibriumTemperature"],
      step,
    ),
  ];
  if (internal > 0) {
    const withInternal = () => equilibriumTemperature({ ...beam, internalFlux: internal });
    const coarse = internal < 1 ? 0.001 : 0.01;
    rows.push(
      row("effective temperature with internal heat", Teff, withInternal, ["equilibriumTemperature"], coarse),
    );
    const emitted = () => blackbodyTemperature({ flux: absorbed + internal });
    rows.push(row("temperature of the emitted flux", Teff, emitted, ["blackbodyTemperature"], coarse));
  }
  return rows;
});

/** Flux, Bond albedo, and absorbed flux that the page prints for the flattened planet. */
const FLATTENED = [
  ["Jupiter", 50.616, 0.343, 8.1233, 0.0001, oblate.rows.jupiter.factor],
  ["Saturn", 15.0117, 0.342, 2.3814, 0.0001, oblate.rows.saturn.factor],
  ["Uranus", 3.6917, 0.3, 0.641, 0.001, oblate.rows.uranus.factor],
] as const;

const flattenedRows = FLATTENED.map(
  ([name, flux, albedo, published, step, factor]): Check => ({
    covers: ["absorbedFlux"],
    what: `${name}: absorbed flux of a flattened planet (S(1 − A)/4 times its shadow over a quarter of its area, ${factor.toFixed(5)})`,
    published,
    unit: "W m-2",
    ours: () => absorbedFlux({ flux, albedo }) * factor,
    // radii to 1 km in 7·10⁴ move the factor by 10⁻⁵
    tolerance: halfUnit(step) + published * 1e-5,
    because: "last digit, and radii known to about a kilometre",
    source: HEAT_BALANCE,
    basis: "seen",
  }),
);

export const heatBalanceRows: readonly Check[] = [
  {
    covers: ["absorbedFlux"],
    what: "Venus: absorbed flux from flux and Bond albedo",
    published: 163.6539,
    unit: "W m-2",
    ours: () => absorbedFlux({ flux: 2618.4628, albedo: 0.75 }),
    tolerance: halfUnit(0.0001) + halfUnit(0.0001) / 16,
    because: "last digit of both fluxes",
    source: HEAT_BALANCE,
    basis: "seen",
  },
  ...balanceRows,
  ...flattenedRows,
];
