// Sunlight between a cloud and the surface below it, published covers, and full phase to Bond.
import {
  bondAlbedo,
  COVER_ALBEDOS,
  cloudShareAbsorbed,
  cloudyAlbedo,
  iceShare,
  mixAlbedo,
  surfaceShareBelowCloud,
  twoBandAlbedo,
} from "../../src/index.ts";
import forms from "../reference/computed/albedo_forms.json" with { type: "json" };
import computed from "../reference/computed/clouds_ceilings.json" with { type: "json" };
import { type Check, halfUnit, ROUNDED, ROUNDING } from "./check.ts";
import {
  JUPITER_HEAT,
  KAPER_ENGLER,
  NEPTUNE_HEAT,
  SATURN_HEAT,
  SEAGER,
  SHIELDS,
  STOKES,
  SURFACE_ALBEDOS,
  WILD_2015,
} from "./sources.ts";

const cloudRows = computed.clouds.flatMap(({ albedo, ground, cloud, ...layer }) => {
  const over = `R ${layer.reflectance}, a ${layer.absorptance} over α ${layer.surface}`;
  const row = (name: string, what: string, published: string, ours: () => number): Check => ({
    covers: [name],
    what: `${what}, ${over}`,
    published: Number(published),
    unit: "1",
    ours,
    tolerance: Number(published) * ROUNDING,
    because: ROUNDED,
    source: STOKES,
    basis: "computed with fractions (clouds_ceilings.py)",
  });
  return [
    row("cloudyAlbedo", "albedo of a cloudy sky", albedo, () => cloudyAlbedo(layer)),
    row("surfaceShareBelowCloud", "share for the surface", ground, () => surfaceShareBelowCloud(layer)),
    row("cloudShareAbsorbed", "share for the cloud", cloud, () => cloudShareAbsorbed(layer)),
  ];
});

/** One layer fitted to the fluxes that reach the surface and that go back to space; the rest must be in the air. */
const earthRow: Check = {
  covers: ["cloudShareAbsorbed"],
  what: "sunlight in the air, of one layer that sends 185 W m⁻² down and 100 W m⁻² back",
  published: 80,
  unit: "W m-2",
  ours: () => 340 * cloudShareAbsorbed(computed.layerOfTheEarth),
  tolerance: 1e-9,
  because: "the fluxes close; the fit was asked for 1e-13",
  source: WILD_2015,
  basis: "from memory",
};

type Printed = Pick<Check, "what" | "published" | "ours" | "tolerance">;
const covers = (row: Printed): Check => ({
  ...row,
  covers: ["COVER_ALBEDOS"],
  unit: "1",
  because: "another table; it prints two digits",
  source: SURFACE_ALBEDOS,
  basis: "from memory",
});

const bond = (
  planet: string,
  [geometric, phaseIntegral, published]: readonly [number, number, number],
  source: Check["source"],
): Check => ({
  covers: ["bondAlbedo"],
  what: `Bond albedo of ${planet} from geometric albedo and phase integral`,
  published,
  unit: "1",
  ours: () => bondAlbedo({ geometric, phaseIntegral }),
  tolerance: halfUnit(0.001) * (phaseIntegral + 1) + halfUnit(0.01) * geometric,
  because: "last digits of both factors and of the product",
  source,
  basis: "from memory",
});

const iceRows = forms.linear.map(
  ({ T, albedo }): Check => ({
    covers: ["iceShare"],
    what: `albedo of ice (0.6) over sea (0.2) by its share at ${T} K`,
    published: albedo,
    unit: "1",
    ours: () => {
      const fraction = iceShare({ temperature: T, frozenBelow: 255, openAbove: 290 });
      return mixAlbedo({ covers: [{ fraction, albedo: 0.6 }], bare: 0.2 });
    },
    tolerance: ROUNDING,
    because: ROUNDED,
    source: KAPER_ENGLER,
    basis: "computed with NumPy (albedo_forms.py)",
  }),
);

export const cloudsRows: readonly Check[] = [
  ...cloudRows,
  earthRow,
  {
    covers: ["COVER_ALBEDOS", "twoBandAlbedo"],
    what: "bare sea ice in sunlight with 52 % visible light",
    published: 0.538,
    unit: "1",
    ours: () => {
      const { visible, nearInfrared } = COVER_ALBEDOS.seaIce;
      return twoBandAlbedo({ visible, nearInfrared, visibleShare: 0.52 });
    },
    tolerance: 1e-15,
    because: "products of two digits each, exact but for rounding",
    source: SHIELDS,
    basis: "from memory",
  },
  covers({ what: "open ocean", published: 0.06, ours: () => COVER_ALBEDOS.ocean.albedo, tolerance: 0.001 }),
  covers({ what: "desert sand", published: 0.4, ours: () => COVER_ALBEDOS.desert.albedo, tolerance: 0.005 }),
  covers({
    what: "fresh snow, middle of 0.8 to 0.9",
    published: 0.85,
    ours: () => COVER_ALBEDOS.freshSnow.albedo,
    tolerance: 0.005,
  }),
  bond("Jupiter", [0.274, 1.25, 0.343], JUPITER_HEAT),
  bond("Saturn", [0.242, 1.42, 0.342], SATURN_HEAT),
  bond("Neptune", [0.215, 1.35, 0.29], NEPTUNE_HEAT),
  {
    covers: ["bondAlbedo"],
    what: "a Lambert sphere that absorbs nothing, p = 2/3 and q = 3/2",
    published: 1,
    unit: "1",
    ours: () => bondAlbedo({ geometric: 2 / 3, phaseIntegral: 1.5 }),
    tolerance: ROUNDING,
    because: ROUNDED,
    source: SEAGER,
    basis: "from memory",
  },
  ...iceRows,
];
