import { mix, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { REDISTRIBUTION_GLOBAL, REDISTRIBUTION_INSTANT } from "./equilibriumTemperature.ts";

/**
 * Redistribution factor of the day side of a planet that always shows one side to its star: f = 2/3 − (5/12)ε.
 * The efficiency ε of heat transport is between 0 (heat leaves where it falls, seen from the star) and 1 (spread over
 * the whole sphere, f = 1/4). It goes into `equilibriumTemperature` or `localAbsorbedFlux`. Errors: as for every law.
 * Source: Cowan & Agol 2011, ApJ 729, 54.
 */
export const daysideRedistribution = /* @__PURE__ */ defineLaw({
  name: "daysideRedistribution",
  about: "Redistribution factor of the day side, from the efficiency of heat transport.",
  output: { symbol: "f_d", unit: "1", within: [0.25, 1], about: "redistribution factor of the day side" },
  inputs: {
    transport: { symbol: "ε", unit: "1", within: [0, 1], about: "efficiency of heat transport" },
  },
  source: "Cowan & Agol 2011, ApJ 729, 54 (doi:10.1088/0004-637X/729/1/54)",
  write: ({ transport }) => mix(REDISTRIBUTION_GLOBAL, REDISTRIBUTION_INSTANT, sub(1, transport)),
});
