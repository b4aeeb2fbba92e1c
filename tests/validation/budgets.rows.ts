// Equilibria of published budgets, through the whole chain from laws to states.
import {
  absorbedFlux,
  closeLoop,
  findStates,
  greyColumnEmission,
  greyEmission,
  type Loop,
  linearEmission,
  quadraticAlbedo,
  STEFAN_BOLTZMANN,
  tanhAlbedo,
} from "../../src/index.ts";
import tanhTable from "../reference/computed/i_tanh_albedo.json" with { type: "json" };
import budgets from "../reference/computed/published_budgets.json" with { type: "json" };
import type { Check } from "./check.ts";
import { columnDepth, screenedEmission } from "./ownLaws.ts";
import { KAPER_ENGLER, PIERREHUMBERT, SPIEGEL, ZALIAPIN_GHIL } from "./sources.ts";

type Rest = Pick<Check, "source" | "basis" | "tolerance" | "because">;

/** One row for each equilibrium and one for their number. */
function rows(
  name: string,
  loop: Loop,
  temperatures: readonly number[],
  covers: string[],
  rest: Rest,
): Check[] {
  const states = () => findStates(loop, { within: [100, 500] }).states;
  const all = ["closeLoop", "findStates", ...covers];
  const each = temperatures.map((published, i): Check => {
    const ours = () => states()[i]?.temperature ?? Number.NaN;
    const what = `${name}: equilibrium ${i + 1} of ${temperatures.length}`;
    return { covers: all, what, published, unit: "K", ours, ...rest };
  });
  const count: Check = {
    ...{
      covers: all,
      what: `${name}: number of equilibria`,
      published: temperatures.length,
      unit: "1",
      ...rest,
    },
    ours: () => states().length,
    tolerance: 0,
    because: "a count",
  };
  return [...each, count];
}

const brentq = {
  tolerance: 1e-9,
  because: "the root finder was asked for 1e-12 K, and rounding of the balance moves a flat crossing by more",
} as const;

const kaperEngler = closeLoop(({ temperature }) => {
  const albedo = tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 10 });
  return {
    heating: { sunlight: absorbedFlux({ flux: 1368, albedo }) },
    cooling: { longwave: greyEmission({ temperature, emissivity: 0.6 * (5.67e-8 / STEFAN_BOLTZMANN) }) },
    heatCapacity: 0,
  };
});
const textbook = tanhTable.cases
  .find((c) => c.id === "i-textbook-sigma5.67e-8")
  ?.rows.find((r) => r.S === "1368");

const spiegel = closeLoop(({ temperature }) => {
  const albedo = tanhAlbedo({ temperature, cold: 0.77, warm: 0.28, midpoint: 268, width: 5 });
  const opticalDepth = columnDepth({ temperature });
  return {
    heating: { sunlight: absorbedFlux({ flux: budgets.spiegel.S, albedo }) },
    cooling: { longwave: greyColumnEmission({ temperature, opticalDepth }) },
    heatCapacity: 0,
  };
});

const pierrehumbert = closeLoop(({ temperature }) => {
  const albedo = quadraticAlbedo({ temperature, cold: 0.6, warm: 0.2, frozenBelow: 260, openAbove: 290 });
  return {
    heating: { sunlight: absorbedFlux({ flux: budgets.pierrehumbert.S, albedo }) },
    cooling: { longwave: linearEmission({ temperature, intercept: 113, slope: 2.177, reference: 220 }) },
    heatCapacity: 0,
  };
});

const zaliapinGhil = ({ m, kappa }: { readonly m: number; readonly kappa: number }) =>
  closeLoop(({ temperature }) => {
    const albedo = tanhAlbedo({ temperature, cold: 0.85, warm: 0.15, midpoint: 273, width: 1 / kappa });
    return {
      heating: { sunlight: absorbedFlux({ flux: 4 * 342.5, albedo }) },
      cooling: { longwave: screenedEmission({ temperature, share: m }) },
      heatCapacity: 0,
    };
  });

export const budgetRows: readonly Check[] = [
  ...rows(
    "tanh albedo and emissivity 0.6, S = 1368 W m⁻², σ = 5.67e-8",
    kaperEngler,
    (textbook?.states ?? []).map((s) => Number(s.T)),
    ["tanhAlbedo", "greyEmission"],
    {
      tolerance: 1e-12,
      because: "roundings of the balance over its slope, and the last place of T",
      source: KAPER_ENGLER,
      basis: "computed with mpmath (state_tables.py)",
    },
  ),
  ...rows("model 2, S = 1360 W m⁻²", spiegel, budgets.spiegel.T, ["tanhAlbedo", "greyColumnEmission"], {
    ...brentq,
    source: SPIEGEL,
    basis: "computed with SciPy (published_budgets.py)",
  }),
  ...rows(
    "parabolic albedo and 113 + 2.177·(T − 220), S = 1370 W m⁻²",
    pierrehumbert,
    budgets.pierrehumbert.T,
    ["quadraticAlbedo", "linearEmission"],
    { ...brentq, source: PIERREHUMBERT, basis: "computed with NumPy (published_budgets.py)" },
  ),
  ...budgets.zaliapinGhil.flatMap((given) =>
    rows(`m = ${given.m}, κ = ${given.kappa}`, zaliapinGhil(given), given.T, ["tanhAlbedo", "defineLaw"], {
      ...brentq,
      source: ZALIAPIN_GHIL,
      basis: "computed with SciPy (published_budgets.py)",
    }),
  ),
];
