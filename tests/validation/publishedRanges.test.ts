// The ranges that sources state for their own fits, beside those that the cards of the laws show.
import { expect, test } from "vitest";
import * as door from "../../src/index.ts";

const laws: ReadonlyMap<string, unknown> = new Map(Object.entries(door));
const PPM = 1e-6;
const PPB = 1e-9;

/** Etminan et al. 2016, Table 1, and for its runs Meinshausen et al. 2020: 180 to 2000 ppm, 340 to 3500 and 200 to 525 ppb. */
const CO2 = [180 * PPM, 2000 * PPM];
const CH4 = [340 * PPB, 3500 * PPB];
const N2O = [200 * PPB, 525 * PPB];
/** 1750 in AR6, Table 2.2, and in Meinshausen et al. 2020, Table 3; the fits belong to one or the other. */
const CO2_1750 = [277.15 * PPM, 278.3 * PPM];
const CH4_1750 = [729.2 * PPB, 731.41 * PPB];
const N2O_1750 = [270.1 * PPB, 273.87 * PPB];

// all from memory
test.each<[string, Record<string, number[]>]>([
  ["co2AdjustedForcingEtminan", { concentration: CO2, reference: CO2, meanNitrousOxide: N2O }],
  ["ch4AdjustedForcingEtminan", { concentration: CH4, reference: CH4, meanNitrousOxide: N2O }],
  ["n2oAdjustedForcingEtminan", { concentration: N2O, reference: N2O, meanCo2: CO2, meanMethane: CH4 }],
  ...(["co2AdjustedForcingMeinshausen", "co2EffectiveForcingAr6"] as const).map(
    (law): [string, Record<string, number[]>] => [
      law,
      { concentration: CO2, reference: CO2_1750, nitrousOxide: N2O },
    ],
  ),
  ...(["ch4AdjustedForcingMeinshausen", "ch4EffectiveForcingAr6"] as const).map(
    (law): [string, Record<string, number[]>] => [
      law,
      { concentration: CH4, reference: CH4_1750, nitrousOxide: N2O },
    ],
  ),
  ...(["n2oAdjustedForcingMeinshausen", "n2oEffectiveForcingAr6"] as const).map(
    (law): [string, Record<string, number[]>] => [
      law,
      { concentration: N2O, reference: N2O_1750, co2: CO2, methane: CH4 },
    ],
  ),
  // Myhre et al. 1998: carbon dioxide to 1000 ppm, methane to 5 ppm
  ["co2AdjustedForcingMyhre", { concentration: [0, 1000 * PPM] }],
  ["ch4AdjustedForcingMyhre", { concentration: [0, 5 * 1000 * PPB] }],
  // Murphy & Koop 2005, eq. 7: above 110 K
  ["saturationPressureIce", { temperature: [110, 273.16] }],
])("%s covers what its source covers", (name, ranges) => {
  const { card } = laws.get(name) as typeof door.co2EffectiveForcingAr6;
  const published = card.published as Readonly<Record<string, readonly number[]>>;
  expect(Object.keys(published).sort()).toEqual(Object.keys(ranges).sort());
  for (const [port, [low, high]] of Object.entries(ranges)) {
    // a product of decimals is rounded
    expect(published[port]?.[0]).toBeCloseTo(low as number, 15);
    expect(published[port]?.[1]).toBeCloseTo(high as number, 15);
  }
});

test("covers reflect within what the textbook's table prints for them", () => {
  // Marshall & Plumb 2008, Table 2.2, in percent, from memory
  const percent: Readonly<Record<string, readonly [number, number]>> = {
    ...{ ocean: [2, 10], forest: [6, 18], city: [14, 18], grass: [7, 25], soil: [10, 20] },
    ...{ desert: [35, 45], oldSnow: [40, 60], freshSnow: [75, 95] },
  };
  for (const [name, [low, high]] of Object.entries(percent)) {
    const { albedo, range } = door.COVER_ALBEDOS[name as "ocean"];
    expect(range, name).toEqual([low / 100, high / 100]);
    expect(albedo, name).toBeCloseTo((low + high) / 200, 12);
  }
});
