// Ports of the forcings. Concentrations are mole fractions in dry air, so that 420 in place of 420e-6 is refused.

import type { Value } from "../graph/quantity.ts";

/** Ports as a formula receives them. */
export type NamedValues<K extends string> = Readonly<Record<K, Value>>;

type Bounds = readonly [number, number];
const CO2: Bounds = [1e-6, 0.1];
const CH4: Bounds = [1e-12, 1e-5];
const N2O: Bounds = [1e-12, 2e-6];

/** CO₂, from 1 ppm to a tenth of the air. */
export const co2Port = (symbol = "C", about = "mole fraction of CO₂ (420 ppm is 420e-6)", within = CO2) =>
  ({ symbol, unit: "1", within, about }) as const;

/** CH₄, up to 10 ppm: above, some of the published fits turn down. */
export const ch4Port = (symbol = "M", about = "mole fraction of CH₄ (1900 ppb is 1900e-9)") =>
  ({ symbol, unit: "1", within: CH4, about }) as const;

/** N₂O, up to 2 ppm. */
export const n2oPort = (symbol = "N", about = "mole fraction of N₂O (330 ppb is 330e-9)") =>
  ({ symbol, unit: "1", within: N2O, about }) as const;

/** A concentration at which the forcing is zero. */
export const referenceOf = (gas: string): string => `mole fraction of ${gas} at which the forcing is zero`;

/** What a forcing law gives. */
export const forcingPort = (gas: string, kind: "adjusted" | "effective") =>
  ({
    symbol: `F_${gas}`,
    unit: "W m-2",
    about: `${kind} radiative forcing, a reduction of cooling`,
  }) as const;

/** Ports of the fits of Meinshausen et al. 2020 for CO₂. */
export const co2Inputs = () =>
  ({
    concentration: co2Port(),
    reference: co2Port("C_0", referenceOf("CO₂")),
    nitrousOxide: n2oPort("N", "mole fraction of N₂O now"),
  }) as const;

/** The same for CH₄. */
export const ch4Inputs = () =>
  ({
    concentration: ch4Port(),
    reference: ch4Port("M_0", referenceOf("CH₄")),
    nitrousOxide: n2oPort("N", "mole fraction of N₂O now"),
  }) as const;

/** The same for N₂O, whose overlaps bend the fit down where CO₂ exceeds a hundredth of the air. */
export const n2oInputs = () =>
  ({
    concentration: n2oPort(),
    reference: n2oPort("N_0", referenceOf("N₂O")),
    co2: co2Port("C", "mole fraction of CO₂ now", [1e-6, 0.01]),
    methane: ch4Port("M", "mole fraction of CH₄ now"),
  }) as const;
