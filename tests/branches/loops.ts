// Loops whose branches are traced.
import * as core from "../../src/index.ts";

const { add, defineLaw, div, exp, inUnit, log, mul, sub } = core;

/** τ = 0.65 + 0.12 ln(C/280) + 0.12 exp(5417(1/288 − 1/T)). */
const vapourAndCarbon = defineLaw({
  name: "vapourAndCarbon",
  about: "Optical depth of carbon dioxide and saturated water vapour.",
  output: { symbol: "τ", unit: "1" },
  inputs: {
    temperature: { symbol: "T", unit: "K", within: [1, 5000] },
    carbon: { symbol: "C", unit: "1", within: [1, 1e6] },
  },
  write: ({ temperature, carbon }) => {
    const vapour = exp(mul(5417, sub(1 / 288, div(1, temperature))));
    return add(add(0.65, mul(0.12, log(div(carbon, 280)))), mul(0.12, vapour));
  },
});

/** Ice and water vapour: four states at 1361 W m⁻², the hottest unstable. */
export const vapourLoop = () =>
  core.closeLoop(({ temperature, given, couple }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const carbon = given("carbon", 280, "1", { within: [1, 1e6] });
    const albedo = core.tanhAlbedo({ temperature, cold: 0.6, warm: 0.3, midpoint: 265, width: 10 });
    const opticalDepth = couple("opticalDepth", vapourAndCarbon({ temperature, carbon }));
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo: couple("albedo", albedo) }) },
      cooling: { longwave: core.greyColumnEmission({ temperature, opticalDepth }) },
      heatCapacity: 4e8,
    };
  });

/** A planet at a distance from its star, with the shape of its ice line as a given. */
export const distantLoop = () =>
  core.closeLoop(({ temperature, given, couple }) => {
    const luminosity = given("luminosity", 3.828e26, "W", { within: [1e20, 1e30] });
    const distance = given("distance", 149597870700, "m", { within: [1e9, 1e13] });
    const width = given("width", 10, "K", { within: [0.5, 100] });
    const albedo = core.tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width });
    const flux = core.stellarFlux({ luminosity, distance });
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo: couple("albedo", albedo) }) },
      cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 4e8,
    };
  });

/** A loop whose net flux is a given formula of temperature and of a parameter p. */
export const formulaLoop = (write: (temperature: core.Quantity, p: core.Quantity) => core.Value) =>
  core.closeLoop(({ temperature, given }) => ({
    heating: { imagined: inUnit(write(inUnit(temperature, "1"), given("p", 0, "1")), "W m-2") },
    cooling: {},
    heatCapacity: 1,
  }));

/** The same with two parameters p and q. */
export const twoGivens = (
  write: (temperature: core.Quantity, p: core.Quantity, q: core.Quantity) => core.Value,
) =>
  core.closeLoop(({ temperature, given }) => {
    const imagined = write(inUnit(temperature, "1"), given("p", 0, "1"), given("q", 0, "1"));
    return { heating: { imagined: inUnit(imagined, "W m-2") }, cooling: {}, heatCapacity: 1 };
  });

/** The ice loop with its albedo as an ordinary function. */
export const sampledLoop = () => {
  const plainAlbedo = core.sampledLaw({
    name: "plainAlbedo",
    output: { symbol: "α", unit: "1", within: [0, 1] },
    inputs: { temperature: { symbol: "T", unit: "K", within: [0, 1e5] }, width: { symbol: "w", unit: "K" } },
    compute: ({ temperature, width }) =>
      core.tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width }),
  });
  return core.closeLoop(({ temperature, given }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const width = given("width", 10, "K", { within: [0.5, 100] });
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo: plainAlbedo({ temperature, width }) }) },
      cooling: { longwave: core.greyEmission({ temperature, emissivity: 0.6 }) },
      heatCapacity: 4e8,
    };
  });
};

/** One of the states of a loop between 150 and 400 K, by rising temperature. */
export const stateOf = <N extends string>(loop: core.Loop<N>, index: number): core.State<N> =>
  core.findStates(loop, { within: [150, 400] }).states[index] as core.State<N>;

/** A planet whose albedo falls from 0.7 at 250 K to 0.3, along a straight line or a parabola. */
export const icyLoop = (law: typeof core.rampAlbedo) =>
  core.closeLoop(({ temperature, given }) => {
    const flux = given("flux", 1361, "W m-2", { within: [0, 1e5] });
    const emissivity = given("emissivity", 0.6, "1", { within: [0.01, 1] });
    const openAbove = given("openAbove", 285, "K", { within: [251, 420] });
    const cold = given("cold", 0.7, "1", { within: [0, 1] });
    const albedo = law({ temperature, cold, warm: 0.3, frozenBelow: 250, openAbove });
    return {
      heating: { sunlight: core.absorbedFlux({ flux, albedo }) },
      cooling: { longwave: core.greyEmission({ temperature, emissivity }) },
      heatCapacity: 4.2e8,
    };
  });
