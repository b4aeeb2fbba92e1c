// The concentrations for which Etminan et al. 2016 ran their radiation code; Meinshausen et al. 2020 fit the same runs.
import type { Range } from "../ground/range.ts";

/** 180 to 2000 ppm. */
export const CO2_RUNS: Range = [180e-6, 2000e-6];
/** 340 to 3500 ppb. */
export const CH4_RUNS: Range = [340e-9, 3500e-9];
/** 200 to 525 ppb. */
export const N2O_RUNS: Range = [200e-9, 525e-9];

/** The base years of the fits: 1750 in Meinshausen et al. 2020 and in AR6. */
export const CO2_BASE: Range = [277.15e-6, 278.3e-6];
/** The same for CH₄. */
export const CH4_BASE: Range = [729.2e-9, 731.41e-9];
/** The same for N₂O. */
export const N2O_BASE: Range = [270.1e-9, 273.87e-9];
