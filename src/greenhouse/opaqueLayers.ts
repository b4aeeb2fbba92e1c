import { add, mul, sqrt } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { effectiveTemperaturePort } from "../law/ports.ts";

/**
 * Surface temperature under layers that are transparent to starlight and opaque to longwave: T_s = (N + 1)^¼·T_e, in K.
 * Effective temperature in K from 0 to 10⁵, number of layers from 0 to 10⁴ (any real number is read). Errors:
 * as for every law.
 * Source: Marshall & Plumb 2008, Atmosphere, Ocean, and Climate Dynamics, §2.3.
 */
export const opaqueLayers = /* @__PURE__ */ defineLaw({
  name: "opaqueLayers",
  about: "Surface temperature under layers that are transparent to starlight and opaque to longwave.",
  output: { symbol: "T_s", unit: "K", within: [0, 1.1e6], about: "surface temperature" },
  inputs: {
    effectiveTemperature: /* @__PURE__ */ effectiveTemperaturePort(),
    layers: { symbol: "N", unit: "1", within: [0, 1e4], about: "number of layers" },
  },
  source: "Marshall & Plumb 2008, Atmosphere, Ocean, and Climate Dynamics, §2.3",
  write({ effectiveTemperature, layers }) {
    const fourthRoot = sqrt(sqrt(add(layers, 1)));
    return mul(fourthRoot, effectiveTemperature);
  },
});
