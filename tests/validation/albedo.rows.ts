// Albedo curves and mixtures.
import { mixAlbedo, quadraticAlbedo, rampAlbedo, stepAlbedo, tanhAlbedo } from "../../src/index.ts";
import forms from "../reference/computed/albedo_forms.json" with { type: "json" };
import { type Check, ROUNDED, ROUNDING } from "./check.ts";
import { BUDYKO, KAPER_ENGLER, PIERREHUMBERT, SPIEGEL } from "./sources.ts";

type Point = { readonly T: number; readonly albedo: string | number };
type Curve = Pick<Check, "covers" | "source" | "basis" | "tolerance" | "because"> & {
  readonly name: string;
  readonly ours: (temperature: number) => number;
};

const along = (points: readonly Point[], { name, ours, ...rest }: Curve): Check[] =>
  points.map(({ T, albedo }) => ({
    ...rest,
    what: `${name} at ${T} K`,
    published: Number(albedo),
    unit: "1",
    ours: () => ours(T),
  }));

const rounded = { tolerance: ROUNDING, because: ROUNDED };

export const albedoRows: readonly Check[] = [
  ...along(forms.kaperEngler, {
    ...rounded,
    name: "0.5 − 0.2·tanh((T − 265)/10)",
    covers: ["tanhAlbedo"],
    ours: (temperature) => tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 10 }),
    source: KAPER_ENGLER,
    basis: "computed with mpmath (albedo_forms.py)",
  }),
  ...along(forms.spiegel, {
    ...rounded,
    name: "0.525 − 0.245·tanh((T − 268)/5)",
    covers: ["tanhAlbedo"],
    ours: (temperature) => tanhAlbedo({ temperature, cold: 0.77, warm: 0.28, midpoint: 268, width: 5 }),
    source: SPIEGEL,
    basis: "computed with mpmath (albedo_forms.py)",
  }),
  ...along(forms.linear, {
    ...rounded,
    name: "0.6 to 0.2 along a straight line between 255 and 290 K",
    covers: ["rampAlbedo"],
    ours: (temperature) =>
      rampAlbedo({ temperature, cold: 0.6, warm: 0.2, frozenBelow: 255, openAbove: 290 }),
    source: KAPER_ENGLER,
    basis: "computed with NumPy (albedo_forms.py)",
  }),
  ...along(forms.pierrehumbert, {
    tolerance: 1e-12,
    because: "the fitted parabola loses three digits in a T² near 10⁵",
    name: "0.6 to 0.2 along a parabola between 260 and 290 K",
    covers: ["quadraticAlbedo"],
    ours: (temperature) =>
      quadraticAlbedo({ temperature, cold: 0.6, warm: 0.2, frozenBelow: 260, openAbove: 290 }),
    source: PIERREHUMBERT,
    basis: "computed with NumPy (albedo_forms.py)",
  }),
  ...(
    [
      [-10.01, 0.62],
      [-10, 0.32],
      [15, 0.32],
    ] as const
  ).map(
    ([celsius, albedo]): Check => ({
      covers: ["stepAlbedo"],
      what: `ice below −10 °C, at ${celsius} °C`,
      published: albedo,
      unit: "1",
      ours: () =>
        stepAlbedo({ temperature: 273.15 + celsius, cold: 0.62, warm: 0.32, threshold: 273.15 - 10 }),
      tolerance: 1e-15,
      because: "printed digits of both albedos; one rounding",
      source: BUDYKO,
      basis: "from memory",
    }),
  ),
  ...forms.caps.map(
    ({ edge, open, ice, albedo }): Check => ({
      covers: ["mixAlbedo"],
      what: `sphere with ice (${ice}) poleward of ${edge}°, open (${open}) elsewhere`,
      published: albedo,
      unit: "1",
      ours: () =>
        mixAlbedo({ covers: [{ fraction: Math.sin((edge * Math.PI) / 180), albedo: open }], bare: ice }),
      tolerance: 1e-12,
      because: "quadrature over the sphere",
      source: BUDYKO,
      basis: "computed with SciPy (albedo_forms.py)",
    }),
  ),
];
