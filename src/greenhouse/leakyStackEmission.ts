import { fourth, max, min, mul } from "../graph/operations.ts";
import type { Value } from "../graph/quantity.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { outgoingPort, temperaturePort } from "../law/ports.ts";
import type { Body } from "../law/types.ts";
import { EMISSIONS, layerEmissions, reflectance, stackOutgoing, stackStreams } from "./stackStreams.ts";

/** Share of longwave that a layer absorbs, and emits of what a black body would. */
export const layerEmissivityPort = () =>
  ({ symbol: "ε", unit: "1", within: [0, 1], about: "longwave emissivity of a layer" }) as const;

/** Heat put into a layer by anything but longwave. */
export const layerHeatingPort = () =>
  ({
    symbol: "q",
    unit: "W m-2",
    within: [-1e9, 1e9],
    about: "heat put into a layer by anything but longwave",
  }) as const;

/** Emissivity of a surface that reflects what it does not absorb. */
export const surfaceEmissivityPort = () =>
  ({
    symbol: "ε_s",
    unit: "1",
    within: [1e-9, 1],
    default: 1,
    about: "longwave emissivity of the surface",
  }) as const;

const inputs = {
  temperature: /* @__PURE__ */ temperaturePort("T_s", "surface temperature"),
  layers: {
    each: {
      emissivity: /* @__PURE__ */ layerEmissivityPort(),
      heating: /* @__PURE__ */ layerHeatingPort(),
    },
  },
  surfaceEmissivity: /* @__PURE__ */ surfaceEmissivityPort(),
} as const;

type Stack = Body<typeof inputs>;

/**
 * Emission to space of a surface under leaky layers without heat capacity, from the top down. With r = ε/(2 − ε),
 * κ = (1 − ε_s)/ε_s and Q_i the heat put into the layers above interface i by anything but longwave:
 * F = [σT_s⁴ + κQ_N + ½(Q_N + Σ r_i(Q_{i−1} + Q_i))]/(1 + Σ r_i + κ), in W m⁻².
 * A layer absorbs and emits the share ε of longwave, between 0 and 1, and lets the rest through; the surface
 * reflects 1 − ε_s, with ε_s from 10⁻⁹ to 1 (1 unless said). Surface temperature in K from 0 to 10⁵; heating
 * in W m⁻² from −10⁹ to 10⁹: absorbed starlight, convection. The whole column's heating stands in the budget
 * of a loop. Errors: as for every law; `out-of-range` where a layer has no steady state, because it is heated
 * and has ε = 0, or gives away more than it gets. `leakyStackLedger` has all flows. Source: two streams
 * through layers that do not scatter (Goody & Yung 1989, Atmospheric Radiation), summed over the layers.
 */
export const leakyStackEmission = /* @__PURE__ */ defineLaw({
  name: "leakyStackEmission",
  about: "Emission to space of a surface under leaky layers without heat capacity, from the top down.",
  output: /* @__PURE__ */ outgoingPort(),
  inputs,
  demands: {
    hottest: {
      unit: "W m-2",
      within: EMISSIONS,
      about: "σT⁴ of the hottest layer; one of emissivity 0 cannot be heated",
      write: (stack) => emissionsOf(stack).reduce((a, b) => max(a, b)),
    },
    coldest: {
      unit: "W m-2",
      within: EMISSIONS,
      about: "σT⁴ of the coldest layer",
      write: (stack) => emissionsOf(stack).reduce((a, b) => min(a, b)),
    },
  },
  source: "two streams through layers; Goody & Yung 1989, Atmospheric Radiation",
  write: (stack) => outgoingOf(stack),
});

function outgoingOf({ temperature, layers, surfaceEmissivity }: Stack): Value {
  const emission = mul(STEFAN_BOLTZMANN, fourth(temperature));
  return stackOutgoing(layers, { emission, kappa: reflectance(surfaceEmissivity) });
}

const emissionsOf = (stack: Stack): Value[] =>
  layerEmissions(stack.layers, stackStreams(stack.layers, outgoingOf(stack)));
