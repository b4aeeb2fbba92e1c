// Every comparison with the outside.
import { albedoRows } from "./albedo.rows.ts";
import { biosphereRows } from "./biosphere.rows.ts";
import { budgetRows } from "./budgets.rows.ts";
import type { Check } from "./check.ts";
import { cloudsRows } from "./clouds.rows.ts";
import { constantRows } from "./constants.rows.ts";
import { emissionRows } from "./emissions.rows.ts";
import { exoplanetRows } from "./exoplanets.rows.ts";
import { forcingRows } from "./forcing.rows.ts";
import { forcingFitRows } from "./forcingFits.rows.ts";
import { habitableRows } from "./habitable.rows.ts";
import { heatRows } from "./heat.rows.ts";
import { heatBalanceRows } from "./heatBalance.rows.ts";
import { ledgerRows } from "./ledgers.rows.ts";
import { longwaveRows } from "./longwave.rows.ts";
import { orbitShelfRows } from "./orbitShelf.rows.ts";
import { orbitRows } from "./orbits.rows.ts";
import { planetRows } from "./planets.rows.ts";
import { starShelfRows } from "./starShelf.rows.ts";
import { starRows } from "./stars.rows.ts";
import { waterRows } from "./water.rows.ts";

/** By subject, in the order in which they are printed. */
export const subjects: Readonly<Record<string, readonly Check[]>> = {
  Constants: constantRows,
  "Planets of the solar system": planetRows,
  "Heat balance of planets": heatBalanceRows,
  "Stars and their light": [...starRows, ...starShelfRows],
  "Planets of other stars": exoplanetRows,
  Orbits: [...orbitRows, ...orbitShelfRows],
  Albedo: albedoRows,
  "Covers and clouds": cloudsRows,
  Longwave: longwaveRows,
  "Layers and ledgers": ledgerRows,
  "Emission, its limits and its height": emissionRows,
  Forcing: [...forcingRows, ...forcingFitRows],
  "Water and frost": waterRows,
  "Habitable zone": habitableRows,
  "Heat capacity": heatRows,
  Plants: biosphereRows,
  "Equilibria of published budgets": budgetRows,
};

export const rows: readonly Check[] = Object.values(subjects).flat();
