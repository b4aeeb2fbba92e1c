// The loop of the acceptance case: ice albedo, water vapour and carbon dioxide in one column.
import * as core from "../../src/index.ts";
import { defineLaw } from "../../src/law/defineLaw.ts";

const optical = /* @__PURE__ */ defineLaw({
  name: "moistDepth",
  about: "Longwave optical depth with carbon dioxide and saturated water vapour.",
  output: { symbol: "τ", unit: "1" },
  inputs: {
    temperature: { symbol: "T", unit: "K", within: [1, 5000] },
    carbonDioxide: { symbol: "C", unit: "1", within: [1, 1e5], about: "in parts per million" },
  },
  write({ temperature, carbonDioxide }) {
    const doublings = core.log(core.div(carbonDioxide, 280));
    const vapour = core.exp(core.mul(5417, core.sub(core.div(1, 288), core.div(1, temperature))));
    return core.add(core.add(0.65, core.mul(0.12, doublings)), core.mul(0.12, vapour));
  },
});

/** α = 0.45 − 0.15 tanh((T − 265)/10), τ = 0.65 + 0.12 ln(C/280) + 0.12 exp(5417(1/288 − 1/T)), OLR = σT⁴/(1 + ¾τ). */
export const warmLoop = () =>
  core.closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const carbonDioxide = given("carbonDioxide", 280, "1", { within: [1, 1e5] });
    const ice = { cold: 0.6, warm: 0.3, midpoint: 265, width: 10 };
    const albedo = couple("albedo", core.tanhAlbedo({ temperature, ...ice }));
    const opticalDepth = couple("opticalDepth", optical({ temperature, carbonDioxide }));
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
      cooling: { longwave: core.greyColumnEmission({ temperature, opticalDepth }) },
      heatCapacity: 4.2e8,
    };
  });
