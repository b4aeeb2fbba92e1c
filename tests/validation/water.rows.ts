// Saturation over water and ice, and the frost point of CO₂.
import {
  co2FrostPoint,
  saturationPressureIce,
  saturationPressureLiquid,
  saturationTemperature,
} from "../../src/index.ts";
import lines from "../reference/computed/phase_lines.json" with { type: "json" };
import { type Check, halfUnit, ROUNDED, ROUNDING } from "./check.ts";
import { FANALE, IAPWS_ICE, IF97, MURPHY_KOOP, NIST_WATER, SPAN_WAGNER, WAGNER_PRUSS } from "./sources.ts";

const script = "phase_lines.py" as const;
const printed = { because: "half a unit of the last digit", basis: "from memory" } as const;

const liquid = (T: number, published: number, step: number): Check => ({
  covers: ["saturationPressureLiquid"],
  what: `saturation pressure of water at ${T} K`,
  published,
  unit: "Pa",
  ours: () => saturationPressureLiquid({ temperature: T }),
  tolerance: halfUnit(step),
  source: IF97,
  ...printed,
});

const boiling = (pressure: number, published: number, source: Check["source"], step: number): Check => ({
  covers: ["saturationTemperature"],
  what: `boiling point of water at ${pressure} Pa`,
  published,
  unit: "K",
  ours: () => saturationTemperature({ pressure }),
  tolerance: halfUnit(step),
  source,
  ...printed,
});

const ice = (T: number, published: number, step: number): Check => ({
  covers: ["saturationPressureIce"],
  what: `vapour pressure of ice at ${T} K, as the fit's authors print it`,
  published,
  unit: "Pa",
  ours: () => saturationPressureIce({ temperature: T }),
  tolerance: halfUnit(step),
  source: MURPHY_KOOP,
  ...printed,
});

export const waterRows: readonly Check[] = [
  liquid(300, 3536.58941, 1e-5),
  liquid(500, 2638897.76, 1e-2),
  liquid(600, 12344314.6, 0.1),
  liquid(273.16, 611.657, 1e-3),
  liquid(647.096, 22.064e6, 1e3),
  boiling(1e5, 372.755919, IF97, 1e-6),
  boiling(1e6, 453.035632, IF97, 1e-6),
  boiling(1e7, 584.149488, IF97, 1e-6),
  boiling(101325, 373.124, NIST_WATER, 1e-3),
  ...lines.liquid.map(
    ({ T, p }): Check => ({
      covers: ["saturationPressureLiquid"],
      what: `saturation pressure of water at ${T} K, the scientific line`,
      published: p,
      unit: "Pa",
      ours: () => saturationPressureLiquid({ temperature: T }),
      tolerance: 2.5e-4 * p,
      because: "0.025 %, by which the industrial and the scientific line of water may differ",
      source: WAGNER_PRUSS,
      basis: `computed with ${script}`,
    }),
  ),
  {
    covers: ["saturationPressureIce"],
    what: "vapour pressure of ice at its triple point",
    published: 611.657,
    unit: "Pa",
    ours: () => saturationPressureIce({ temperature: 273.16 }),
    tolerance: halfUnit(1e-3),
    source: IAPWS_ICE,
    ...printed,
  },
  ice(150, 6.106e-6, 1e-9),
  ice(180, 0.0053975, 1e-7),
  ice(210, 0.70202, 1e-5),
  ice(240, 27.272, 1e-3),
  ice(273.15, 611.154, 1e-3),
  ...lines.ice.map(
    ({ T, p }): Check => ({
      covers: ["saturationPressureIce"],
      what: `vapour pressure of ice at ${T} K`,
      published: p,
      unit: "Pa",
      ours: () => saturationPressureIce({ temperature: T }),
      tolerance: (T < 200 ? 4e-3 : 1e-3) * p,
      because: "0.1 % between two assessments of ice, 0.4 % below 200 K, where its heat is known less well",
      source: IAPWS_ICE,
      basis: `computed with ${script}`,
    }),
  ),
  ...lines.fanale.map(
    ({ p, T }): Check => ({
      covers: ["co2FrostPoint"],
      what: `frost point of CO₂ at ${p} Pa, by the published line`,
      published: T,
      unit: "K",
      ours: () => co2FrostPoint({ pressure: p }),
      tolerance: ROUNDING * T,
      because: ROUNDED,
      source: FANALE,
      basis: `computed with ${script}`,
    }),
  ),
  ...lines.dryIce.map(
    ({ p, T }): Check => ({
      covers: ["co2FrostPoint"],
      what: `frost point of CO₂ at ${p} Pa`,
      published: T,
      unit: "K",
      ours: () => co2FrostPoint({ pressure: p }),
      tolerance: 1,
      because: "1 K, by which a straight line of ln p in 1/T misses the measured one",
      source: SPAN_WAGNER,
      basis: `computed with ${script}`,
    }),
  ),
];
