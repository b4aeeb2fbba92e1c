import { add, fourth, max, min, mul, sub } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";

/**
 * Emission that cannot exceed a ceiling until the ground glows: F = min(emission, ceiling) + w·σ·max(0, T⁴ − T_h⁴), in
 * W m⁻². Give the emission without a ceiling, and the ceiling (`RUNAWAY_LIMITS.outgoing`, or a limit of grey
 * theory), in W m⁻² from 0 to 10⁶; temperatures in K from 0 to 10⁵. Above `hotAbove`, 1400 K unless said, the
 * ground shines through the near infrared, and a runaway ends on this hot branch. Its onset is published, its
 * shape is ours: w is the `window`, the share that gets out of what is emitted beyond the onset, 0 to 1, 1
 * unless said. Continuous, with a kink at each end of the ceiling. Errors: as for every law. Source:
 * Goldblatt & Watson 2012, Phil. Trans. R. Soc. A 370, 4197.
 */
export const ceilingEmission = /* @__PURE__ */ defineLaw({
  name: "ceilingEmission",
  about: "Emission that cannot exceed a ceiling until the ground glows.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs: {
    temperature: /* @__PURE__ */ temperaturePort("T", "temperature of the ground"),
    emission: { symbol: "F_0", unit: "W m-2", within: [-1e6, 1e13], about: "emission without a ceiling" },
    ceiling: { symbol: "F_max", unit: "W m-2", within: [0, 1e6], about: "limit of emission" },
    hotAbove: {
      symbol: "T_h",
      unit: "K",
      within: [0, 1e5],
      default: 1400,
      about: "ground temperature where the hot branch begins",
    },
    window: {
      symbol: "w",
      unit: "1",
      within: [0, 1],
      default: 1,
      about: "share that gets out of what the ground emits beyond that",
    },
  },
  source: "Goldblatt & Watson 2012, Phil. Trans. R. Soc. A 370, 4197 (doi:10.1098/rsta.2012.0004)",
  write({ temperature, emission, ceiling, hotAbove, window }) {
    const beyond = max(0, sub(fourth(temperature), fourth(hotAbove)));
    return add(min(emission, ceiling), mul(mul(window, STEFAN_BOLTZMANN), beyond));
  },
});
