// Table vi: layers over a ground. Opaque layers are a law; one leaky layer is a loop with a second reservoir.
import { describe, expect, test } from "vitest";
import {
  add,
  blackbodyFlux,
  blackbodyTemperature,
  closeLoop,
  div,
  findStates,
  mul,
  opaqueLayers,
  type State,
} from "../../src/index.ts";
import table from "../reference/computed/vi_n_layer.json" with { type: "json" };
import { of } from "./table.ts";

/** A fourth root and a few products: a dozen roundings of a temperature below 512 K, whose last place is 2⁻⁴⁴ K. */
const CLOSE = 12 * 2 ** -44;

const opaque = table.cases.filter((c) => /^vi-n\d-(opaque|bare)$/.test(c.id));

test.each(opaque)("$id by law", ({ inputs, layers, ground, olr }) => {
  const effectiveTemperature = blackbodyTemperature({ flux: Number(olr) });
  const surface = opaqueLayers({ effectiveTemperature, layers: layers.length });
  expect(Number(inputs.groundEmissivity)).toBe(1);
  expect(Math.abs(surface - Number(ground.T))).toBeLessThanOrEqual(CLOSE);
});

test("opaque layers from none to six are in the table", () => {
  expect(opaque.map((c) => c.layers.length)).toEqual([0, 1, 2, 3, 4, 5, 6]);
});

const single = table.cases.filter((c) => c.layers.length === 1 && c.inputs.groundEmissivity === "1");

describe.each(single)("$id by loop", ({ inputs, layers, ground, olr }) => {
  const emissivity = Number(inputs.emissivities[0]);
  const inLayer = Number(layers[0]?.sunlight);
  const loop = closeLoop(({ temperature }) => {
    const upward = blackbodyFlux({ temperature });
    const caught = mul(emissivity, upward);
    const given = div(add(caught, inLayer), 2);
    return {
      heating: {
        sunlight: Number(ground.sunlight),
        back: { value: given, from: "layer", to: "surface" },
      },
      cooling: {
        window: mul(1 - emissivity, upward),
        caught: { value: caught, from: "surface", to: "layer" },
      },
      exchange: {
        absorbed: { value: inLayer, from: "space", to: "layer" },
        outgoing: { value: given, from: "layer", to: "space" },
      },
      heatCapacity: 1e7,
      report: { layer: blackbodyTemperature({ flux: div(given, emissivity) }) },
    };
  });
  const found = findStates(loop, { within: [100, 500] });
  const state = found.states[0] as State;

  test("ground and layer have the temperatures of the table", () => {
    expect(found.states).toHaveLength(1);
    expect(Math.abs(state.temperature - Number(ground.T))).toBeLessThanOrEqual(CLOSE);
    expect(Math.abs(of(state.report, "layer") - Number(layers[0]?.T))).toBeLessThanOrEqual(CLOSE);
    expect(state.stability).toBe("stable");
  });

  test("every flow is that of the table, and both reservoirs balance", () => {
    const flow = Object.fromEntries(state.ledger.flows.map(({ name, value }) => [name, value]));
    // fluxes below 1024 W m⁻², a dozen roundings each
    const places = 10;
    expect(of(flow, "caught")).toBeCloseTo(Number(layers[0]?.longwaveAbsorbed), places);
    expect(of(flow, "back") + of(flow, "outgoing")).toBeCloseTo(Number(layers[0]?.longwaveEmitted), places);
    expect(of(flow, "back")).toBeCloseTo(Number(ground.longwaveAbsorbed), places);
    expect(of(flow, "caught") + of(flow, "window")).toBeCloseTo(Number(ground.longwaveEmitted), places);
    expect(of(flow, "window") + of(flow, "outgoing")).toBeCloseTo(Number(olr), places);
    expect(state.notes).toEqual([]);
  });
});

test("single layers are in the table", () => {
  expect(single.map((c) => c.id)).toEqual([
    "vi-n1-opaque",
    "vi-n1-grey0.6",
    "vi-n1-classic0.78",
    "vi-n1-all-sw-in-layer",
  ]);
});
