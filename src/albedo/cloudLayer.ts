// A layer of cloud over a surface: what the laws of its reflected and absorbed light have in common.
import { add, div, mul, sub } from "../graph/operations.ts";
import type { Quantity, Value } from "../graph/quantity.ts";
import { albedoPort } from "../law/ports.ts";

/** Ports of a cloud over a surface. */
export const CLOUD_PORTS = {
  reflectance: { symbol: "R", unit: "1", within: [0, 1], about: "share that the cloud reflects" },
  absorptance: {
    symbol: "a",
    unit: "1",
    within: [0, 1],
    about: "share that the cloud absorbs in one passage",
  },
  surface: /* @__PURE__ */ albedoPort("α", "albedo of the surface below"),
} as const;

interface Layer {
  readonly reflectance: Quantity;
  readonly absorptance: Quantity;
  readonly surface: Quantity;
}

/** The cloud must not take more than all light, and some light must get out from between cloud and surface. */
export const CLOUD_DEMANDS = {
  taken: {
    unit: "1",
    within: [0, 1],
    about: "reflectance + absorptance",
    write: ({ reflectance, absorptance }: Layer) => add(reflectance, absorptance),
  },
  thrownBack: {
    unit: "1",
    within: [0, 0.999999999999],
    about: "reflectance · surface",
    write: ({ reflectance, surface }: Layer) => mul(reflectance, surface),
  },
} as const;

/** T = 1 − R − a: the share that passes the cloud once. */
export const transmittance = ({ reflectance, absorptance }: Layer): Value =>
  sub(1, add(reflectance, absorptance));

/** T/(1 − Rα): light that reaches the surface, thrown to and fro between it and the cloud any number of times. */
export const sunlightBelow = (layer: Layer): Value =>
  div(transmittance(layer), sub(1, mul(layer.reflectance, layer.surface)));
