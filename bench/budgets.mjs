// The loops of the two populations, closed with the core door that is given.
import { populations } from "./populations.mjs";

/**
 * The writers of the two budgets. The vapour planet uses two laws that a user might write: a column whose optical depth
 * follows saturation, and a logarithmic forcing, here far beyond its published range, as a load for the search.
 */
export function budgetsOf(core) {
  const {
    absorbedFlux,
    add,
    defineLaw,
    div,
    exp,
    greyColumnEmission,
    greyEmission,
    log,
    mul,
    sub,
    tanhAlbedo,
  } = core;

  const temperaturePort = { symbol: "T", unit: "K", within: [1, 5000] };
  const vapourDepth = defineLaw({
    name: "vapourDepth",
    about: "Longwave optical depth of a column with saturated water vapour.",
    output: { symbol: "τ", unit: "1" },
    inputs: {
      temperature: temperaturePort,
      dry: { symbol: "τ_0", unit: "1", within: [0, 100] },
      wet: { symbol: "τ_1", unit: "1", within: [0, 100] },
      latent: { symbol: "L", unit: "K", within: [0, 1e5] },
    },
    write({ temperature, dry, wet, latent }) {
      const warmth = sub(1 / 288, div(1, temperature));
      return add(dry, mul(wet, exp(mul(latent, warmth))));
    },
  });
  const logarithmicForcing = defineLaw({
    name: "logarithmicForcing",
    about: "Reduction of outgoing longwave radiation by CO₂.",
    output: { symbol: "F", unit: "W m-2" },
    inputs: { concentration: { symbol: "C", unit: "1", within: [1, 1e6] } },
    write: ({ concentration }) => mul(5.35, log(div(concentration, 280))),
  });

  const givensOf = (name, given) =>
    Object.fromEntries(
      Object.entries(populations[name].ranges).map(([key, within]) => {
        const unit =
          { flux: "W m-2", internalFlux: "W m-2", midpoint: "K", width: "K", latent: "K" }[key] ?? "1";
        return [key, given(key, (within[0] + within[1]) / 2, unit, { within })];
      }),
    );
  const heatingOf = (temperature, couple, { flux, cold, warm, midpoint, width, internalFlux }) => ({
    sunlight: absorbedFlux({
      flux,
      albedo: couple("albedo", tanhAlbedo({ temperature, cold, warm, midpoint, width })),
    }),
    interior: internalFlux,
  });

  return {
    ice({ temperature, given, couple }) {
      const givens = givensOf("ice", given);
      return {
        heating: heatingOf(temperature, couple, givens),
        cooling: { longwave: greyEmission({ temperature, emissivity: givens.emissivity }) },
        heatCapacity: 4.2e8,
      };
    },
    vapour({ temperature, given, couple }) {
      const givens = givensOf("vapour", given);
      const { dry, wet, latent, concentration } = givens;
      const opticalDepth = couple("opticalDepth", vapourDepth({ temperature, dry, wet, latent }));
      const longwave = greyColumnEmission({ temperature, opticalDepth });
      return {
        heating: heatingOf(temperature, couple, givens),
        cooling: { longwave: sub(longwave, logarithmicForcing({ concentration })) },
        heatCapacity: 4.2e8,
      };
    },
  };
}
