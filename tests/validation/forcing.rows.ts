// Forcings of the well-mixed greenhouse gases.
import {
  ch4AdjustedForcingEtminan,
  ch4AdjustedForcingMeinshausen,
  ch4AdjustedForcingMyhre,
  ch4EffectiveForcingAr6,
  closeLoop,
  co2AdjustedForcingEtminan,
  co2AdjustedForcingMeinshausen,
  co2AdjustedForcingMyhre,
  co2EffectiveForcingAr6,
  findStates,
  forcedEmission,
  linearEmission,
  n2oAdjustedForcingEtminan,
  n2oAdjustedForcingMeinshausen,
  n2oAdjustedForcingMyhre,
  n2oEffectiveForcingAr6,
} from "../../src/index.ts";
import { type Check, halfUnit } from "./check.ts";
import { AR6_FORCING, BONY, ETMINAN, IPCC_2001, MYHRE } from "./sources.ts";

/** Mole fractions of 1750 and 2019 in AR6, Table 2.2 (from memory). */
const C = { before: 278.3e-6, now: 409.9e-6 };
const M = { before: 729.2e-9, now: 1866.3e-9 };
const N = { before: 270.1e-9, now: 332.1e-9 };
/** Those of 1750 and 1998 in IPCC 2001, Table 6.1. */
const OLD = { co2: [278e-6, 365e-6], ch4: [700e-9, 1745e-9], n2o: [270e-9, 314e-9] } as const;

const co2 = { concentration: C.now, reference: C.before, nitrousOxide: N.now };
const ch4 = { concentration: M.now, reference: M.before, nitrousOxide: N.now };
const n2o = { concentration: N.now, reference: N.before, co2: C.now, methane: M.now };
const doubled = { concentration: 2 * C.before, reference: C.before, nitrousOxide: N.before };

const hundredth = { tolerance: halfUnit(0.01), because: "half a unit of the last digit" } as const;
const memory = { unit: "W m-2", ...hundredth, basis: "from memory" } as const;

/** Warming that restores the balance after CO₂ is doubled, where emission rises by 3.2 W m⁻² K⁻¹. */
function doublingWarmsBy(): number {
  const loop = closeLoop(({ temperature, given }) => {
    const clear = linearEmission({ temperature, intercept: 240, slope: 3.2, reference: 288 });
    const concentration = given("co2", 556e-6, "1");
    const forcing = co2AdjustedForcingMyhre({ concentration, reference: 278e-6 });
    return {
      heating: { sunlight: 240 },
      cooling: { longwave: forcedEmission({ clear, forcing }) },
      heatCapacity: 0,
    };
  });
  return (findStates(loop, { within: [200, 400] }).states[0]?.temperature ?? Number.NaN) - 288;
}

export const forcingRows: readonly Check[] = [
  {
    covers: ["co2AdjustedForcingMyhre"],
    what: "adjusted forcing of a doubling of CO₂, Myhre 1998",
    published: 3.71,
    ours: () => co2AdjustedForcingMyhre({ concentration: 2e-4, reference: 1e-4 }),
    source: MYHRE,
    ...memory,
    basis: "seen",
  },
  {
    covers: ["co2AdjustedForcingMyhre"],
    what: "adjusted forcing of CO₂, 1750 to 1998",
    published: 1.46,
    ours: () => co2AdjustedForcingMyhre({ concentration: OLD.co2[1], reference: OLD.co2[0] }),
    source: IPCC_2001,
    ...memory,
  },
  {
    covers: ["ch4AdjustedForcingMyhre"],
    what: "adjusted forcing of CH₄, 1750 to 1998",
    published: 0.48,
    ours: () =>
      ch4AdjustedForcingMyhre({
        concentration: OLD.ch4[1],
        reference: OLD.ch4[0],
        nitrousOxideReference: OLD.n2o[0],
      }),
    source: IPCC_2001,
    ...memory,
  },
  {
    covers: ["n2oAdjustedForcingMyhre"],
    what: "adjusted forcing of N₂O, 1750 to 1998",
    published: 0.15,
    ours: () =>
      n2oAdjustedForcingMyhre({
        concentration: OLD.n2o[1],
        reference: OLD.n2o[0],
        methaneReference: OLD.ch4[0],
      }),
    source: IPCC_2001,
    ...memory,
  },
  {
    covers: ["co2AdjustedForcingEtminan"],
    what: "adjusted forcing of a doubling of CO₂, Etminan 2016",
    published: 3.8,
    ours: () =>
      co2AdjustedForcingEtminan({ concentration: 556e-6, reference: 278e-6, meanNitrousOxide: 270e-9 }),
    source: ETMINAN,
    ...memory,
  },
  {
    covers: ["ch4AdjustedForcingEtminan"],
    what: "adjusted forcing of CH₄, 1750 to 2011, shortwave included",
    published: 0.61,
    ours: () =>
      ch4AdjustedForcingEtminan({ concentration: 1803e-9, reference: 722e-9, meanNitrousOxide: 297e-9 }),
    source: ETMINAN,
    ...memory,
  },
  {
    covers: ["n2oAdjustedForcingEtminan"],
    what: "effective forcing of N₂O, 1750 to 2019, from the fit of Etminan 2016 and +7 %",
    published: 0.21,
    ours: () =>
      1.07 *
      n2oAdjustedForcingEtminan({
        concentration: N.now,
        reference: N.before,
        meanCo2: (C.before + C.now) / 2,
        meanMethane: (M.before + M.now) / 2,
      }),
    source: AR6_FORCING,
    ...memory,
  },
  {
    covers: ["co2AdjustedForcingMeinshausen"],
    what: "adjusted forcing of a doubling of CO₂",
    published: 3.75,
    ours: () => co2AdjustedForcingMeinshausen(doubled),
    source: AR6_FORCING,
    ...memory,
  },
  {
    covers: ["co2EffectiveForcingAr6"],
    what: "effective forcing of a doubling of CO₂",
    published: 3.93,
    ours: () => co2EffectiveForcingAr6(doubled),
    source: AR6_FORCING,
    ...memory,
  },
  {
    covers: ["co2EffectiveForcingAr6"],
    what: "effective forcing of CO₂, 1750 to 2019",
    published: 2.16,
    ours: () => co2EffectiveForcingAr6(co2),
    source: AR6_FORCING,
    ...memory,
  },
  {
    covers: ["ch4EffectiveForcingAr6"],
    what: "effective forcing of CH₄, 1750 to 2019",
    published: 0.54,
    ours: () => ch4EffectiveForcingAr6(ch4),
    source: AR6_FORCING,
    ...memory,
  },
  {
    covers: ["n2oEffectiveForcingAr6"],
    what: "effective forcing of N₂O, 1750 to 2019",
    published: 0.21,
    ours: () => n2oEffectiveForcingAr6(n2o),
    source: AR6_FORCING,
    ...memory,
  },
  {
    covers: [
      "co2AdjustedForcingMeinshausen",
      "ch4AdjustedForcingMeinshausen",
      "n2oAdjustedForcingMeinshausen",
    ],
    what: "effective forcing of the three gases, 1750 to 2019, as adjusted ones with +5, −14 and +7 %",
    published: 2.91,
    ours: () =>
      1.05 * co2AdjustedForcingMeinshausen(co2) +
      0.86 * ch4AdjustedForcingMeinshausen(ch4) +
      1.07 * n2oAdjustedForcingMeinshausen(n2o),
    source: AR6_FORCING,
    ...memory,
    tolerance: 3 * halfUnit(0.01),
    because: "half a unit of the last digit of each of three terms",
  },
  {
    covers: ["forcedEmission", "closeLoop", "findStates", "linearEmission"],
    what: "warming by a doubling of CO₂ with Planck's response only",
    published: 1.2,
    unit: "K",
    ours: doublingWarmsBy,
    tolerance: halfUnit(0.1),
    because: "half a unit of the last digit",
    source: BONY,
    basis: "from memory",
  },
];
