import { div, fourth, mul, sub, sum } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { logDepth, STEAM_ABSORPTION, STEAM_GRAVITY, VAPOUR_TEMPERATURE } from "./greySteam.ts";

/**
 * Gauss's rule for ∫₀^∞ e^(−t)·f(ln t) dt: places u = ln t and weights, from the moments Γ⁽ᵏ⁾(1). Twelve places leave
 * 3·10⁻¹¹ at the lowest optical depth that the ports allow, 2·10⁻¹⁴ on Earth.
 */
const RULE = [
  [-35.574494934100706, 3.74201941257998e-15],
  [-26.96557854286019, 1.4027014992259412e-11],
  [-20.631522637432813, 6.131502619849088e-9],
  [-15.601138632969317, 7.588451840545607e-7],
  [-11.495975110955309, 3.779831163321243e-5],
  [-8.120300635419545, 0.0009079664239773564],
  [-5.359950695940417, 0.01159669863972881],
  [-3.1449587207282774, 0.08086030695071775],
  [-1.419510154738647, 0.28556494769707264],
  [-0.10393184160258163, 0.41962869700260236],
  [0.9145752853429169, 0.18745933948755875],
  [1.7637846966977222, 0.013943480495991705],
] as const;

/**
 * What a grey, saturated troposphere of pure steam emits when so warm that the ground is out of sight:
 * F = ∫₀^∞ σT⁴·e^(−t) dt with t = D·k·p*(T)/g the slant optical depth above, D = 3/2, p* = 1.4·10¹¹ Pa·exp(−5250.5 K/T).
 * In W m⁻²; absorption coefficient k in m² kg⁻¹ from 10⁻⁴ to 10, gravity in m s⁻² from 0.1 to 100. With 0.01
 * m² kg⁻¹ and 9.8 m s⁻² it is 293.5 W m⁻². A ceiling for `ceilingEmission`. Errors: as for every law.
 * Source: Simpson 1928; Nakajima, Hayashi & Abe 1992, J. Atmos. Sci. 49, 2256.
 */
export const simpsonNakajimaLimit = /* @__PURE__ */ defineLaw({
  name: "simpsonNakajimaLimit",
  about: "What a grey, saturated troposphere of steam emits when the ground is out of sight.",
  output: { symbol: "F_max", unit: "W m-2", about: "limit of outgoing longwave radiation" },
  inputs: { absorption: STEAM_ABSORPTION, gravity: STEAM_GRAVITY },
  source: "Simpson 1928; Nakajima, Hayashi & Abe 1992, J. Atmos. Sci. 49, 2256",
  write({ absorption, gravity }) {
    const whole = logDepth(absorption, gravity);
    const parts = RULE.map(([u, weight]) => {
      const temperature = div(VAPOUR_TEMPERATURE, sub(whole, u));
      return mul(weight, fourth(temperature));
    });
    return mul(STEFAN_BOLTZMANN, sum(...parts));
  },
});
