// Every comparison with the outside.
import { albedoRows } from "./albedo.rows.ts";
import { biosphereRows } from "./biosphere.rows.ts";
import { budgetRows } from "./budgets.rows.ts";
import type { Check } from "./check.ts";
import { constantRows } from "./constants.rows.ts";
import { exoplanetRows } from "./exoplanets.rows.ts";
import { heatRows } from "./heat.rows.ts";
import { heatBalanceRows } from "./heatBalance.rows.ts";
import { longwaveRows } from "./longwave.rows.ts";
import { orbitRows } from "./orbits.rows.ts";
import { planetRows } from "./planets.rows.ts";
import { starRows } from "./stars.rows.ts";

/** By subject, in the order in which they are printed. */
export const subjects: Readonly<Record<string, readonly Check[]>> = {
  Constants: constantRows,
  "Planets of the solar system": planetRows,
  "Heat balance of planets": heatBalanceRows,
  "Stars and their light": starRows,
  "Planets of other stars": exoplanetRows,
  Orbits: orbitRows,
  Albedo: albedoRows,
  Longwave: longwaveRows,
  "Heat capacity": heatRows,
  Plants: biosphereRows,
  "Equilibria of published budgets": budgetRows,
};

export const rows: readonly Check[] = Object.values(subjects).flat();
