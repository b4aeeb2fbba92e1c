// Leaky layers, the grey columns that they approach, and published budgets.
import {
  blackbodyTemperature,
  greyGroundTemperature,
  greySkinTemperature,
  layeredGroundTemperature,
  leakyStackEmission,
  type PublishedBalance,
  publishedLedger,
} from "../../src/index.ts";
import { publishedBy } from "../ledger/budgets.ts";
import columns from "../reference/computed/grey_columns.json" with { type: "json" };
import layered from "../reference/computed/layered_columns.json" with { type: "json" };
import stacks from "../reference/computed/vi_n_layer.json" with { type: "json" };
import { type Check, halfUnit, ROUNDED, ROUNDING } from "./check.ts";
import { CATLING_KASTING, STEPHENS_2012, TFK_2009, TWO_STREAM } from "./sources.ts";

const stackRows = stacks.cases
  .filter((row) => row.layers.length > 0)
  .map(({ id, inputs, layers, ground, olr }): Check => {
    const extra: readonly string[] | undefined = inputs.layerHeating;
    const list = layers.map(({ sunlight }, i) => ({
      emissivity: Number(inputs.emissivities[i]),
      heating: Number(sunlight) + Number(extra?.[i] ?? 0),
    }));
    const surfaceEmissivity = Number(inputs.groundEmissivity);
    return {
      covers: ["leakyStackEmission"],
      what: `emission over ${layers.length} layers (${id.replace(/^vi-n\d-/, "")}), ground at ${Number(ground.T).toFixed(2)} K`,
      published: Number(olr),
      unit: "W m-2",
      ours: () => leakyStackEmission({ temperature: Number(ground.T), layers: list, surfaceEmissivity }),
      tolerance: Number(olr) * ROUNDING,
      because: ROUNDED,
      source: TWO_STREAM,
      basis: "computed with fractions and mpmath (layer_ledgers.py)",
    };
  });

const byIntegration = {
  unit: "K",
  source: TWO_STREAM,
  basis: "computed with SciPy (grey_columns.py)",
} as const;

const groundRows = columns.rows.map(
  ({ olr, depth, closure, ground }): Check => ({
    ...byIntegration,
    covers: ["greyGroundTemperature", "blackbodyTemperature"],
    what: `ground under a grey column of depth ${depth}, D = ${closure}`,
    published: ground,
    ours: () =>
      greyGroundTemperature({
        effectiveTemperature: blackbodyTemperature({ flux: olr }),
        opticalDepth: depth,
        closure,
      }),
    tolerance: ground * 1e-10,
    because: "the integration asked for 1e-12 in each of about a hundred steps",
  }),
);

const layeredRows = layered.rows.map(
  ({ depth, closure, layers, blanket }): Check => ({
    covers: ["layeredGroundTemperature"],
    what: `T_g⁴/T_e⁴ under ${layers} layers of a column of depth ${depth}, D = ${closure}`,
    published: Number(blanket),
    unit: "1",
    ours: () =>
      layeredGroundTemperature({
        effectiveTemperature: 1,
        opticalDepth: Number(depth),
        closure: Number(closure),
        layers,
      }) ** 4,
    tolerance: Number(blanket) * ROUNDING,
    because: ROUNDED,
    source: TWO_STREAM,
    basis: "computed with mpmath (layered_columns.py)",
  }),
);

const [thinnest] = columns.rows;
const skinRows: readonly Check[] = [
  {
    ...byIntegration,
    covers: ["greySkinTemperature", "blackbodyTemperature"],
    what: "air at the top of a grey column that emits 238.175 W m⁻²",
    published: thinnest?.skin ?? Number.NaN,
    ours: () => greySkinTemperature({ effectiveTemperature: blackbodyTemperature({ flux: 238.175 }) }),
    tolerance: 215 * ROUNDING,
    because: ROUNDED,
  },
  {
    covers: ["greySkinTemperature"],
    what: "skin temperature of the Earth, T_e = 255 K",
    published: 214,
    unit: "K",
    ours: () => greySkinTemperature({ effectiveTemperature: 255 }),
    tolerance: halfUnit(1) + halfUnit(1) * 0.85,
    because: "last digit of both temperatures",
    source: CATLING_KASTING,
    basis: "from memory",
  },
];

const balance = (author: string, place: string): PublishedBalance | undefined =>
  publishedLedger(publishedBy(author).budget).balances.find((b) => b.place === place);

const printedSums = {
  covers: ["publishedLedger"],
  unit: "W m-2",
  basis: "from memory",
  tolerance: 1e-12,
  because: "printed with the digits of its terms: only their sum is rounded",
} as const;

const publishedRows: readonly Check[] = [
  {
    ...printedSums,
    what: "net gain at the top of the atmosphere, from three printed flows",
    published: 0.9,
    ours: () => balance("Trenberth", "top")?.residual ?? Number.NaN,
    source: TFK_2009,
  },
  {
    ...printedSums,
    what: "net gain of the surface, from six printed flows",
    published: 0.6,
    ours: () => balance("Stephens", "surface")?.residual ?? Number.NaN,
    source: STEPHENS_2012,
  },
  {
    ...printedSums,
    what: "error of the net gain of the surface, in quadrature",
    published: 17,
    ours: () => balance("Stephens", "surface")?.error?.[0] ?? Number.NaN,
    tolerance: halfUnit(1),
    because: "half a unit of the last digit",
    source: STEPHENS_2012,
  },
];

export const ledgerRows: readonly Check[] = [
  ...stackRows,
  ...groundRows,
  ...layeredRows,
  ...skinRows,
  ...publishedRows,
];
