// What surfaces and columns emit, and the ground below them.
import {
  blackbodyFlux,
  equilibriumTemperature,
  greyColumnEmission,
  greyEmission,
  linearEmission,
  opaqueLayers,
  REDISTRIBUTION_GLOBAL,
} from "../../src/index.ts";
import columns from "../reference/computed/grey_columns.json" with { type: "json" };
import ramps from "../reference/computed/ii_ramp_linear.json" with { type: "json" };
import budgets from "../reference/computed/published_budgets.json" with { type: "json" };
import layers from "../reference/computed/vi_n_layer.json" with { type: "json" };
import { type Check, halfUnit, ROUNDED, ROUNDING } from "./check.ts";
import { INCROPERA, JACOB, KT_1997, MARSHALL_PLUMB, NORTH, SPIEGEL, TWO_STREAM } from "./sources.ts";

const columnRows = columns.rows.map(
  ({ olr, depth, closure, ground }): Check => ({
    covers: ["greyColumnEmission"],
    what: `grey column of depth ${depth}, D = ${closure}, over a ground of ${ground.toFixed(2)} K`,
    published: olr,
    unit: "W m-2",
    ours: () => greyColumnEmission({ temperature: ground, opticalDepth: depth, closure }),
    tolerance: olr * 1e-10,
    because: "the integration asked for 1e-12 in each of about a hundred steps",
    source: TWO_STREAM,
    basis: "computed with SciPy (grey_columns.py)",
  }),
);

const spiegelRows = budgets.spiegel.olr.map(
  ({ T, olr }): Check => ({
    covers: ["greyColumnEmission"],
    what: `emission with depth 0.79 (T/273)³ at ${T} K`,
    published: olr,
    unit: "W m-2",
    ours: () => greyColumnEmission({ temperature: T, opticalDepth: 0.79 * (T / 273) ** 3 }),
    tolerance: olr * ROUNDING,
    because: ROUNDED,
    source: SPIEGEL,
    basis: "computed with SciPy (published_budgets.py)",
  }),
);

/** Ice-free and frozen states of the straight-line model: there S(1 − α)/4 is what is emitted, in exact fractions. */
const north = ramps.cases.find((c) => c.id === "ii-b-celsius") as (typeof ramps.cases)[number];
const linearRows = ["1361", "1500"].flatMap((S) => {
  const row = north.rows.find((r) => r.S === S) as (typeof north.rows)[number];
  const states = (row.states as { piece: string; T: string; onCorner: boolean }[]).filter(
    (s) => s.piece !== "ramp",
  );
  return states.map(
    ({ piece, T }): Check => ({
      covers: ["linearEmission"],
      what: `203.3 + 2.09·T at the ${piece === "ice" ? "frozen" : "ice-free"} state of ${S} W m⁻²`,
      published: (Number(S) * (1 - (piece === "ice" ? 0.62 : 0.3))) / 4,
      unit: "W m-2",
      ours: () =>
        linearEmission({ temperature: Number(T) + 273.15, intercept: 203.3, slope: 2.09, reference: 273.15 }),
      tolerance: 2 ** -42,
      because: "a few last places of a temperature near 300 K, times 2.09",
      source: NORTH,
      basis: "computed with fractions (ramp_tables.py)",
    }),
  );
});

const layerRows = layers.cases
  .filter((c) => /opaque$/.test(c.id))
  .map(
    ({ layers: list, ground }): Check => ({
      covers: ["opaqueLayers", "equilibriumTemperature"],
      what: `ground under ${list.length} opaque layers, S = 1361 W m⁻², A = 0.3`,
      published: Number(ground.T),
      unit: "K",
      ours: () =>
        opaqueLayers({
          effectiveTemperature: equilibriumTemperature({
            flux: 1361,
            albedo: 0.3,
            redistribution: REDISTRIBUTION_GLOBAL,
          }),
          layers: list.length,
        }),
      tolerance: Number(ground.T) * ROUNDING,
      because: ROUNDED,
      source: MARSHALL_PLUMB,
      basis: "computed with fractions and mpmath (layer_ledgers.py)",
    }),
  );

export const longwaveRows: readonly Check[] = [
  {
    covers: ["greyEmission"],
    what: "steam pipe at 473 K, emissivity 0.8",
    published: 2270,
    unit: "W m-2",
    ours: () => greyEmission({ temperature: 473, emissivity: 0.8 }),
    tolerance: halfUnit(10),
    because: "printed with three digits",
    source: INCROPERA,
    basis: "from memory",
  },
  {
    covers: ["blackbodyFlux"],
    what: "irradiation from walls at 298 K",
    published: 447,
    unit: "W m-2",
    ours: () => blackbodyFlux({ temperature: 298 }),
    tolerance: halfUnit(1),
    because: "half a unit of the last digit",
    source: INCROPERA,
    basis: "from memory",
  },
  {
    covers: ["blackbodyFlux"],
    what: "surface at 15 °C, taken as 288 K",
    published: 390,
    unit: "W m-2",
    ours: () => blackbodyFlux({ temperature: 288 }),
    tolerance: halfUnit(1),
    because: "half a unit of the last digit",
    source: KT_1997,
    basis: "from memory",
  },
  {
    covers: ["opaqueLayers"],
    what: "ground under one opaque layer, T_e = 255 K",
    published: 303,
    unit: "K",
    ours: () => opaqueLayers({ effectiveTemperature: 255, layers: 1 }),
    tolerance: halfUnit(1) + halfUnit(1) * 1.19,
    because: "last digit of both temperatures",
    source: MARSHALL_PLUMB,
    basis: "seen",
  },
  {
    covers: ["opaqueLayers"],
    what: "ground over effective temperature, one opaque layer",
    published: 1.19,
    unit: "1",
    ours: () => opaqueLayers({ effectiveTemperature: 255, layers: 1 }) / 255,
    tolerance: halfUnit(0.01),
    because: "half a unit of the last digit",
    source: MARSHALL_PLUMB,
    basis: "seen",
  },
  {
    covers: ["equilibriumTemperature"],
    what: "ground under a layer of absorptivity 0.77 (an effective emissivity of 1 − 0.77/2), T_e = 255 K",
    published: 288,
    unit: "K",
    ours: () =>
      equilibriumTemperature({
        flux: 4 * blackbodyFlux({ temperature: 255 }),
        albedo: 0,
        redistribution: REDISTRIBUTION_GLOBAL,
        emissivity: 1 - 0.77 / 2,
      }),
    tolerance: halfUnit(1) + halfUnit(1) * 1.13,
    because: "last digit of both temperatures",
    source: JACOB,
    basis: "from memory",
  },
  ...layerRows,
  ...columnRows,
  ...spiegelRows,
  ...linearRows,
];
