// Straight lines, depths that scale, clouds in the longwave, ceilings, and height with a lapse rate.
import {
  budykoEmission,
  ceilingEmission,
  cloudyEmission,
  emissionHeight,
  groundBelowEmission,
  heightEmission,
  kollCroninEmission,
  komabayashiIngersollLimit,
  northEmission,
  pressureOpticalDepth,
  RUNAWAY_LIMITS,
  SOLAR_IRRADIANCE,
  simpsonNakajimaLimit,
  vapourOpticalDepth,
} from "../../src/index.ts";
import computed from "../reference/computed/clouds_ceilings.json" with { type: "json" };
import ramps from "../reference/computed/ii_ramp_linear.json" with { type: "json" };
import planck from "../reference/computed/planck_flux.json" with { type: "json" };
import layers from "../reference/computed/vi_n_layer.json" with { type: "json" };
import { type Check, halfUnit, ROUNDED, ROUNDING, SIGMA_DIGITS } from "./check.ts";
import {
  BUDYKO,
  CLAUSIUS_CLAPEYRON,
  GOLDBLATT,
  GOLDBLATT_WATSON,
  KOLL_CRONIN,
  LECONTE,
  LOEB_2018,
  MARSHALL_PLUMB,
  NAKAJIMA,
  NORTH,
  PLANCK_LAW,
  ROBINSON_CATLING,
  STANDARD_ATMOSPHERE,
  STEAM_TABLES,
} from "./sources.ts";

/** Budyko printed kcal cm⁻² per month: 14.0 + 0.14·T − (3.0 + 0.10·T)·n, half covered, in W m⁻² for months of 30 days. */
const BUDYKO_UNIT = (4186.8 * 1e4) / (30 * 86400);
const budykoRows: readonly Check[] = [
  {
    covers: ["budykoEmission"],
    what: "half-cloudy Earth at 0 °C, from 14.0 − 3.0/2 kcal cm⁻² month⁻¹",
    published: 12.5 * BUDYKO_UNIT,
    unit: "W m-2",
    ours: () => budykoEmission({ temperature: 273.15 }),
    tolerance: halfUnit(1),
    because: "202 is printed in whole watts",
    source: BUDYKO,
    basis: "from memory",
  },
  {
    covers: ["budykoEmission"],
    what: "increase with temperature, from 0.14 − 0.10/2 kcal cm⁻² month⁻¹ K⁻¹",
    published: 0.09 * BUDYKO_UNIT,
    unit: "W m-2 K-1",
    ours: () => (budykoEmission({ temperature: 290 }) - budykoEmission({ temperature: 250 })) / 40,
    tolerance: halfUnit(0.01),
    because: "1.45 is printed with two decimals",
    source: BUDYKO,
    basis: "from memory",
  },
];

/** Ice-free and frozen states of the straight-line model: there S(1 − α)/4 is what is emitted, in exact fractions. */
const north = ramps.cases.find((c) => c.id === "ii-b-celsius") as (typeof ramps.cases)[number];
const northRows = ["1361", "1500"].flatMap((S) => {
  const row = north.rows.find((r) => r.S === S) as (typeof north.rows)[number];
  return (row.states as { piece: string; T: string }[])
    .filter((state) => state.piece !== "ramp")
    .map(
      ({ piece, T }): Check => ({
        covers: ["northEmission"],
        what: `North's line at the ${piece === "ice" ? "frozen" : "ice-free"} state of ${S} W m⁻²`,
        published: (Number(S) * (1 - (piece === "ice" ? 0.62 : 0.3))) / 4,
        unit: "W m-2",
        ours: () => northEmission({ temperature: Number(T) + 273.15 }),
        tolerance: 2 ** -42,
        because: "a few last places of a temperature near 300 K, times 2.09",
        source: NORTH,
        basis: "computed with fractions (ramp_tables.py)",
      }),
    );
});

/** One grey layer over the ground: what comes up from below is the clear sky, the layer is a cloud that fills a share. */
const layerRows = layers.cases
  .filter((c) => c.layers.length === 1)
  .flatMap(({ id, inputs, layers: [layer], interfaces, olr }) => {
    const layerEmissivity = Number(inputs.emissivities[0]);
    const clear = Number(interfaces[1]?.longwaveUp);
    const shares = [1, 0.9].filter((share) => layerEmissivity < share || share === 1);
    return shares.map(
      (share): Check => ({
        covers: ["cloudyEmission"],
        what: `above a layer of ε = ${layerEmissivity}, as cloud over ${share} of the sky (${id})`,
        published: Number(olr),
        unit: "W m-2",
        ours: () =>
          cloudyEmission({
            clear,
            share,
            emissivity: layerEmissivity / share,
            temperature: Number(layer?.T),
          }),
        tolerance: clear * ROUNDING,
        because: ROUNDED,
        source: MARSHALL_PLUMB,
        basis: "computed with fractions and mpmath (layer_ledgers.py)",
      }),
    );
  });

const depthRows: readonly Check[] = [
  ...computed.pressure.map(
    ({ pressure, exponent, ratio }): Check => ({
      covers: ["pressureOpticalDepth"],
      what: `optical depth of 2 under 101 325 Pa, at ${pressure} Pa with exponent ${exponent}`,
      published: 2 * Number(ratio),
      unit: "1",
      ours: () => pressureOpticalDepth({ pressure, exponent, referencePressure: 101325, referenceDepth: 2 }),
      tolerance: 2 * Number(ratio) * 16 * ROUNDING,
      because: "a last place of an exponent near 10, and a dozen roundings",
      source: ROBINSON_CATLING,
      basis: "computed with mpmath (clouds_ceilings.py)",
    }),
  ),
  ...computed.vapour.map(
    ({ T, ratio }): Check => ({
      covers: ["vapourOpticalDepth"],
      what: `optical depth of half-saturated vapour at ${T} K, 3 when saturated at 288 K`,
      published: 1.5 * Number(ratio),
      unit: "1",
      ours: () =>
        vapourOpticalDepth({
          temperature: T,
          referenceTemperature: 288,
          referenceDepth: 3,
          humidity: 0.5,
        }),
      tolerance: 1.5 * Number(ratio) * 16 * ROUNDING,
      because: "a last place of L/(R_v·T) near 20, and a dozen roundings",
      source: CLAUSIUS_CLAPEYRON,
      basis: "computed with mpmath (clouds_ceilings.py)",
    }),
  ),
  {
    covers: ["vapourOpticalDepth"],
    what: "vapour at 15 °C over vapour at 0.01 °C: 1705.7 Pa over 611.657 Pa",
    published: 1705.7 / 611.657,
    unit: "1",
    ours: () => vapourOpticalDepth({ temperature: 288.15, referenceTemperature: 273.16, referenceDepth: 1 }),
    tolerance: 0.02,
    because: "the latent heat falls by 1.4 % over 15 K, so that its mean is 0.7 % below 2.5e6 J/kg",
    source: STEAM_TABLES,
    basis: "from memory",
  },
  {
    covers: ["vapourOpticalDepth"],
    what: "boiling at 1 atm with a constant latent heat comes at 368.0 K: 101 325 Pa over 611 Pa",
    published: 101325 / 611,
    unit: "1",
    ours: () => vapourOpticalDepth({ temperature: 368, referenceTemperature: 273.16, referenceDepth: 1 }),
    tolerance: (101325 / 611) * 0.04 * halfUnit(0.1),
    because: "half a unit of the last digit of the temperature, at 4 % a kelvin",
    source: CLAUSIUS_CLAPEYRON,
    basis: "computed with mpmath (clouds_ceilings.py)",
  },
];

const limitRows: readonly Check[] = [
  ...computed.stratosphere.map(
    ({ flux, ...column }): Check => ({
      covers: ["komabayashiIngersollLimit"],
      what: `limit of a grey stratosphere, ${column.absorption} m² kg⁻¹, ${column.gravity} m s⁻², h ${column.humidity}`,
      published: Number(flux),
      unit: "W m-2",
      ours: () => komabayashiIngersollLimit(column),
      tolerance: Number(flux) * 1e-13,
      because: "the table holds 16 digits; a maximum is flat",
      source: NAKAJIMA,
      basis: "computed with SciPy and mpmath (clouds_ceilings.py)",
    }),
  ),
  ...computed.troposphere.map(
    ({ flux, ...column }): Check => ({
      covers: ["simpsonNakajimaLimit"],
      what: `limit of a grey troposphere of steam, ${column.absorption} m² kg⁻¹, ${column.gravity} m s⁻²`,
      published: Number(flux),
      unit: "W m-2",
      ours: () => simpsonNakajimaLimit(column),
      tolerance: Number(flux) * 1e-10,
      because: "twelve places of the rule leave 3e-11 at the lowest depth",
      source: NAKAJIMA,
      basis: "computed with mpmath (clouds_ceilings.py)",
    }),
  ),
  {
    covers: ["komabayashiIngersollLimit"],
    what: "Komabayashi–Ingersoll limit of the standard grey model",
    published: 385,
    unit: "W m-2",
    ours: () => komabayashiIngersollLimit({ absorption: 0.01, gravity: 9.8 }),
    tolerance: halfUnit(1),
    because: "half a unit of the last digit",
    source: NAKAJIMA,
    basis: "from memory",
  },
  {
    covers: ["simpsonNakajimaLimit"],
    what: "asymptotic limit of the troposphere of the standard grey model",
    published: 293,
    unit: "W m-2",
    ours: () => simpsonNakajimaLimit({ absorption: 0.01, gravity: 9.8 }),
    tolerance: 1,
    because: "printed in whole watts, found on a grid of levels with constants of three to four digits",
    source: NAKAJIMA,
    basis: "from memory",
  },
  {
    covers: ["RUNAWAY_LIMITS"],
    what: "runaway limit of outgoing longwave radiation",
    published: 282,
    unit: "W m-2",
    ours: () => RUNAWAY_LIMITS.outgoing.flux,
    tolerance: 0,
    because: "copied",
    source: GOLDBLATT,
    basis: "seen",
  },
  {
    covers: ["RUNAWAY_LIMITS"],
    what: "runaway limit of absorbed sunlight",
    published: 294,
    unit: "W m-2",
    ours: () => RUNAWAY_LIMITS.absorbed.flux,
    tolerance: 0,
    because: "copied",
    source: GOLDBLATT,
    basis: "seen",
  },
  {
    covers: ["RUNAWAY_LIMITS"],
    what: "incident limit over present sunlight",
    published: 1.1,
    unit: "1",
    ours: () => (4 * RUNAWAY_LIMITS.incident.flux) / SOLAR_IRRADIANCE,
    tolerance: halfUnit(0.01),
    because: "half a unit of the last digit",
    source: LECONTE,
    basis: "seen",
  },
];

const glowing = planck.rows.find((row) => row.T === 2566) as (typeof planck.rows)[number];
const onset = planck.rows.find((row) => row.T === 737) as (typeof planck.rows)[number];
const ceilingRows: readonly Check[] = [
  {
    covers: ["ceilingEmission"],
    what: "steam atmosphere over a ground just below 1400 K, emitting the limit and no more",
    published: 282,
    unit: "W m-2",
    ours: () =>
      ceilingEmission({
        temperature: 1399.9,
        emission: 1e5,
        ceiling: RUNAWAY_LIMITS.outgoing.flux,
      }),
    tolerance: 0,
    because: "the limit itself",
    source: GOLDBLATT_WATSON,
    basis: "seen",
  },
  {
    covers: ["ceilingEmission"],
    what: "282 W m⁻² and what a black ground emits at 2566 K beyond 737 K",
    published: Number(glowing.flux) - Number(onset.flux) + 282,
    unit: "W m-2",
    ours: () => ceilingEmission({ temperature: 2566, emission: 1e7, ceiling: 282, hotAbove: 737 }),
    tolerance: Number(glowing.flux) * SIGMA_DIGITS,
    because: "σ of CODATA ends after ten digits",
    source: PLANCK_LAW,
    basis: "computed with mpmath (planck_flux.py)",
  },
];

const LAPSE = 0.0065;
const standard = [
  { height: 5000, T: 255.65 },
  { height: 11000, T: 216.65 },
].flatMap(({ height, T }): Check[] => {
  const shared = { source: STANDARD_ATMOSPHERE, basis: "from memory" as const };
  return [
    {
      ...shared,
      covers: ["emissionHeight"],
      what: `height of ${T} K above 288.15 K at 6.5 K/km`,
      published: height,
      unit: "m",
      ours: () => emissionHeight({ surfaceTemperature: 288.15, emissionTemperature: T, lapseRate: LAPSE }),
      tolerance: halfUnit(0.01) / LAPSE,
      because: "half a unit of the last digit of the temperature",
    },
    {
      ...shared,
      covers: ["groundBelowEmission"],
      what: `ground ${height} m below ${T} K at 6.5 K/km`,
      published: 288.15,
      unit: "K",
      ours: () => groundBelowEmission({ emissionTemperature: T, height, lapseRate: LAPSE }),
      tolerance: halfUnit(0.01),
      because: "half a unit of the last digit",
    },
  ];
});

export const emissionRows: readonly Check[] = [
  ...budykoRows,
  ...northRows,
  {
    covers: ["kollCroninEmission"],
    what: "emission of the present Earth at 288 K",
    published: 240.1,
    unit: "W m-2",
    ours: () => kollCroninEmission({ temperature: 288 }),
    tolerance: 0,
    because: "the point that the line goes through",
    source: LOEB_2018,
    basis: "from memory",
  },
  {
    covers: ["kollCroninEmission"],
    what: "increase with temperature over 60 K",
    published: 2.2,
    unit: "W m-2 K-1",
    ours: () => (kollCroninEmission({ temperature: 290 }) - kollCroninEmission({ temperature: 230 })) / 60,
    tolerance: halfUnit(0.1),
    because: "half a unit of the last digit",
    source: KOLL_CRONIN,
    basis: "from memory",
  },
  ...layerRows,
  ...depthRows,
  ...limitRows,
  ...ceilingRows,
  ...standard,
  {
    covers: ["heightEmission"],
    what: "a ground of 287.5 K that emits from 5 km at 6.5 K/km, as black as 255 K",
    published: Number(planck.rows.find((row) => row.T === 255)?.flux),
    unit: "W m-2",
    ours: () => heightEmission({ temperature: 287.5, lapseRate: LAPSE, height: 5000 }),
    tolerance: 240 * (SIGMA_DIGITS + ROUNDING),
    because: "σ of CODATA ends after ten digits",
    source: PLANCK_LAW,
    basis: "computed with mpmath (planck_flux.py)",
  },
];
