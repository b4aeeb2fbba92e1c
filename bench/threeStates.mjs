// A smooth loop with three states, searched again and again.
import { WITHIN } from "./populations.mjs";
import { timed } from "./rounds.mjs";

/** The loop; also that of the branches. */
export const threeStatesLoop = (core) =>
  core.closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [900, 1800] });
    const albedo = core.tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 10 });
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo: couple("albedo", albedo) }) },
      cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 4.2e8,
    };
  });

export function threeStates(core) {
  const loop = threeStatesLoop(core);
  const search = () => {
    const { states } = core.findStates(loop, { within: WITHIN });
    if (states.length !== 3) throw new Error(`${states.length} states instead of three`);
    return states[2].temperature;
  };
  const time = () => {
    return timed(500, () => {
      let total = 0;
      for (let i = 0; i < 500; i++) total += search();
      return total;
    });
  };
  return [{ name: "findStates, proved", time }];
}
