// The tanh ice loop that several tests search.
import * as core from "../../src/index.ts";

/** Three states at the flux of the Sun; folds at 1192.37 and 1674.98 W m⁻² with σ of CODATA 2018. */
export const iceLoop = () =>
  core.closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const emissivity = given("emissivity", 0.6, "1", { within: [0.01, 1] });
    const albedo = core.tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 10 });
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo: couple("albedo", albedo) }) },
      cooling: { longwave: core.greyEmission({ temperature, emissivity }) },
      heatCapacity: 4.2e8,
    };
  });
