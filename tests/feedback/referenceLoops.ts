// The budgets of the table `feedback_parts`, as loops.
import * as core from "../../src/index.ts";
import { warmLoop } from "./warmLoop.ts";

const { add, div, exp, inUnit, log, mul, sub, tanh } = core;

/** A chain temperature → vapour → cloud → albedo, and a heat capacity that changes with temperature. */
export const chainLoop = () =>
  core.closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const cloudiness = given("cloudiness", 0.5, "1", { within: [0, 1] });
    const ground = given("ground", 0.25, "W m-2", { within: [0, 1e3] });
    const T = inUnit(temperature, "1");
    const vapour = couple("vapour", exp(div(sub(T, 288), 16)));
    const cloud = couple("cloud", mul(cloudiness, tanh(div(vapour, 2))));
    const ice = sub(0.375, mul(0.125, tanh(div(sub(T, 268), 8))));
    const albedo = couple("albedo", add(ice, mul(0.0625, cloud)));
    const opticalDepth = add(0.5, mul(0.25, vapour));
    return {
      heating: {
        sunlight: core.absorbedFlux({ flux, albedo }),
        ground,
        glow: inUnit(mul(8, cloud), "W m-2"),
      },
      cooling: { longwave: core.greyColumnEmission({ temperature, opticalDepth }) },
      heatCapacity: inUnit(mul(134217728, add(1, mul(0.5, tanh(div(sub(T, 270), 16))))), "J m-2 K-1"),
    };
  });

/** A straight outgoing radiation whose slope, and the heat capacity, are givens. */
export const straightLoop = () =>
  core.closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1365, "W m-2", { within: [0, 1e5] });
    const slope = given("slope", 2, "W m-2 K-1", { within: [0.1, 10] });
    const carbonDioxide = given("carbonDioxide", 400, "1", { within: [1, 1e5] });
    const heatCapacity = given("capacity", 536870912, "J m-2 K-1", { within: [0, 1e12] });
    const open = add(1, exp(div(sub(inUnit(temperature, "1"), 262), 4)));
    const albedo = couple("albedo", add(0.3, div(0.3125, open)));
    const warmth = sub(temperature, 273.15);
    const carbon = inUnit(mul(5.35, log(div(carbonDioxide, 280))), "W m-2");
    const clear = add(inUnit(210, "W m-2"), mul(slope, warmth));
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
      cooling: { clear, carbon: core.neg(carbon) },
      heatCapacity,
    };
  });

export const referenceLoops = { column: warmLoop, chain: chainLoop, straight: straightLoop } as const;
