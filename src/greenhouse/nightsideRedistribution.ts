import { div } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";

/**
 * Redistribution factor of the night side of a planet that always shows one side to its star: f = ε/4.
 * The efficiency ε of heat transport is between 0 (a dark, cold night side) and 1 (spread over the whole sphere). It
 * goes into `equilibriumTemperature` or `localAbsorbedFlux`. Errors: as for every law.
 * Source: Cowan & Agol 2011, ApJ 729, 54.
 */
export const nightsideRedistribution = /* @__PURE__ */ defineLaw({
  name: "nightsideRedistribution",
  about: "Redistribution factor of the night side, from the efficiency of heat transport.",
  output: { symbol: "f_n", unit: "1", within: [0, 0.25], about: "redistribution factor of the night side" },
  inputs: {
    transport: { symbol: "ε", unit: "1", within: [0, 1], about: "efficiency of heat transport" },
  },
  source: "Cowan & Agol 2011, ApJ 729, 54 (doi:10.1088/0004-637X/729/1/54)",
  write: ({ transport }) => div(transport, 4),
});
