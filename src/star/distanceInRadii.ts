import { div } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { distancePort, stellarRadiusPort } from "./starPorts.ts";

/**
 * Distance from a star in units of its radius: d/R, as transits give it.
 * Distance in m from 1 to 10²², radius in m from 1 to 10¹⁴. Errors: as for every law. Source: the definition.
 */
export const distanceInRadii = /* @__PURE__ */ defineLaw({
  name: "distanceInRadii",
  about: "Distance from a star in units of its radius.",
  output: { symbol: "d/R", unit: "1", about: "distance in stellar radii" },
  inputs: { distance: /* @__PURE__ */ distancePort(), radius: /* @__PURE__ */ stellarRadiusPort() },
  source: "definition",
  write: ({ distance, radius }) => div(distance, radius),
});
