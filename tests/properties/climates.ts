// Random climates: a loop with an albedo that answers to temperature, alone or under a layer.
import fc from "fast-check";
import {
  absorbedFlux,
  add,
  blackbodyFlux,
  closeLoop,
  div,
  type FoundStates,
  findStates,
  greyEmission,
  mul,
  rampAlbedo,
  sub,
  type Tools,
  tanhAlbedo,
} from "../../src/index.ts";

/** Each number of a climate: its unit, its range in these tests, and the range its given allows. */
const PARTS = {
  flux: ["W m-2", 900, 1800, [0, 1e5]],
  cold: ["1", 0.5, 0.8, [0, 1]],
  warm: ["1", 0.1, 0.4, [0, 1]],
  // between a frozen and an open surface, and half of the span from one to the other
  middle: ["K", 250, 280, [100, 500]],
  width: ["K", 3, 30, [1, 90]],
  emissivity: ["1", 0.5, 0.75, [0, 1]],
  internalFlux: ["W m-2", 0, 2, [0, 1e4]],
  heatCapacity: ["J m-2 K-1", 1e6, 1e9, [0, 1e12]],
} as const;
type Part = keyof typeof PARTS;

/** The numbers of a climate. */
export type Climate = Readonly<Record<Part, number>>;
/** Which law the albedo follows. */
export type Kind = "tanh" | "ramp";

export const climates = fc.record(
  Object.fromEntries(
    Object.entries(PARTS).map(([name, [, min, max]]) => [name, fc.double({ min, max, noNaN: true })]),
  ) as Record<Part, fc.Arbitrary<number>>,
);
export const kinds = fc.constantFrom<Kind>("tanh", "ramp");

/** Somewhere in the middle. */
const PLAIN = Object.fromEntries(
  Object.entries(PARTS).map(([name, [, low, high]]) => [name, (low + high) / 2]),
) as Climate;

/** Below and above every equilibrium of these climates, K. */
export const WITHIN = [60, 700] as const;

function givensOf({ given }: Tools, values: Climate) {
  const one = <K extends Part>(name: K) =>
    given(name, values[name], PARTS[name][0], { within: PARTS[name][3] });
  return {
    flux: one("flux"),
    cold: one("cold"),
    warm: one("warm"),
    middle: one("middle"),
    width: one("width"),
    emissivity: one("emissivity"),
    internalFlux: one("internalFlux"),
    heatCapacity: one("heatCapacity"),
  };
}

function albedoOf(
  kind: Kind,
  { temperature }: Tools,
  { cold, warm, middle, width }: ReturnType<typeof givensOf>,
) {
  return kind === "tanh"
    ? tanhAlbedo({ temperature, cold, warm, midpoint: middle, width })
    : rampAlbedo({ temperature, cold, warm, frozenBelow: sub(middle, width), openAbove: add(middle, width) });
}

/** A surface under sunlight and internal heat that emits to space. */
export const bareLoop = (kind: Kind, values = PLAIN) =>
  closeLoop((tools) => {
    const { temperature, couple } = tools;
    const numbers = givensOf(tools, values);
    const { flux, emissivity, internalFlux, heatCapacity } = numbers;
    return {
      heating: {
        sunlight: absorbedFlux({ flux, albedo: couple("albedo", albedoOf(kind, tools, numbers)) }),
        internal: { value: internalFlux, from: "interior", to: "surface" },
      },
      cooling: { longwave: greyEmission({ temperature, emissivity }) },
      heatCapacity,
    };
  });

/** The same surface under a layer without heat capacity that catches a share of its longwave, `emissivity`. */
export const layeredLoop = (kind: Kind, values = PLAIN) =>
  closeLoop((tools) => {
    const { temperature, couple } = tools;
    const numbers = givensOf(tools, values);
    const { flux, emissivity, internalFlux, heatCapacity } = numbers;
    const upward = blackbodyFlux({ temperature });
    const caught = mul(emissivity, upward);
    const emitted = div(add(caught, internalFlux), 2);
    return {
      heating: {
        sunlight: absorbedFlux({ flux, albedo: couple("albedo", albedoOf(kind, tools, numbers)) }),
        back: { value: emitted, from: "layer", to: "surface" },
      },
      cooling: {
        window: mul(sub(1, emissivity), upward),
        caught: { value: caught, from: "surface", to: "layer" },
      },
      exchange: {
        sunlightInLayer: { value: internalFlux, from: "space", to: "layer" },
        outgoing: { value: emitted, from: "layer", to: "space" },
      },
      heatCapacity,
    };
  });

const bare = { tanh: bareLoop("tanh"), ramp: bareLoop("ramp") };
const layered = { tanh: layeredLoop("tanh"), ramp: layeredLoop("ramp") };

/** All states of a surface alone. */
export const bareStates = (kind: Kind, at: Climate): FoundStates =>
  findStates(bare[kind], { within: WITHIN, at });
/** All states of a surface under a layer. */
export const layeredStates = (kind: Kind, at: Climate): FoundStates =>
  findStates(layered[kind], { within: WITHIN, at });
