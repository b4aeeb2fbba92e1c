import { add, div, fourth, log, mul, product, sub } from "../graph/operations.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { logDepth, STEAM_ABSORPTION, STEAM_GRAVITY, VAPOUR_TEMPERATURE } from "./greySteam.ts";

/** 4 + ln 4. */
const FOUR_AND_ITS_LOGARITHM = 5.386294361119891;
/** Each step of Newton's doubles the digits: from the first guess four reach 2⁻⁵³ everywhere in the ranges. */
const STEPS = 4;

/**
 * The most that a grey stratosphere can let out above a moist troposphere: the largest 2σT⁴/(1 + Dτ) over all tropopause
 * temperatures T, where τ = h·k·p*(T)/g is the optical depth of the vapour above, D = 3/2, p* = 1.4·10¹¹ Pa·exp(−5250.5 K/T).
 * In W m⁻²; absorption coefficient k in m² kg⁻¹ from 10⁻⁴ to 10, gravity in m s⁻² from 0.1 to 100, relative
 * humidity h at the tropopause from 0.01 to 1 (1 unless said). With 0.01 m² kg⁻¹ and 9.8 m s⁻² it is 385 W
 * m⁻². The limit of the troposphere (`simpsonNakajimaLimit`) is usually lower. Errors: as for every law.
 * Source: Komabayashi 1967; Ingersoll 1969; Nakajima, Hayashi & Abe 1992, J. Atmos. Sci. 49, 2256.
 */
export const komabayashiIngersollLimit = /* @__PURE__ */ defineLaw({
  name: "komabayashiIngersollLimit",
  about: "The most that a grey stratosphere can let out above a moist troposphere.",
  output: { symbol: "F_max", unit: "W m-2", about: "limit of outgoing longwave radiation" },
  inputs: {
    absorption: STEAM_ABSORPTION,
    gravity: STEAM_GRAVITY,
    humidity: {
      symbol: "h",
      unit: "1",
      within: [0.01, 1],
      default: 1,
      about: "relative humidity at the tropopause",
    },
  },
  source: "Komabayashi 1967; Ingersoll 1969; Nakajima, Hayashi & Abe 1992, J. Atmos. Sci. 49, 2256",
  write({ absorption, gravity, humidity }) {
    // with x = 5250.5 K/T the largest flux is where Dτ·(x − 4) = 4, that is y − ln y = target for y = x − 4
    const target = sub(logDepth(mul(humidity, absorption), gravity), FOUR_AND_ITS_LOGARITHM);
    let y = add(target, log(target));
    for (let i = 0; i < STEPS; i++) y = div(mul(y, add(log(y), sub(target, 1))), sub(y, 1));
    const x = add(y, 4);
    const tropopause = div(VAPOUR_TEMPERATURE, x);
    return product(2, STEFAN_BOLTZMANN, fourth(tropopause), div(y, x));
  },
});
