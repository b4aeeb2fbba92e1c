// Ports that many laws share, so that a temperature has one range everywhere.

/** Temperature of a surface or an atmosphere. */
export const TEMPERATURE = { symbol: "T", unit: "K", within: [0, 1e5], about: "temperature" } as const;
/** Share of reflected light. */
export const ALBEDO = { symbol: "α", unit: "1", within: [0, 1], about: "Bond albedo" } as const;
/** Stellar flux normal to the beam. */
export const FLUX = {
  symbol: "S",
  unit: "W m-2",
  within: [0, 1e12],
  about: "stellar flux normal to the beam",
} as const;
/** Emissivity of a grey surface. */
export const EMISSIVITY = { symbol: "ε", unit: "1", within: [0, 1], about: "emissivity" } as const;
/** Orbital eccentricity of a bound orbit. */
export const ECCENTRICITY = {
  symbol: "e",
  unit: "1",
  within: [0, 0.9999],
  about: "orbital eccentricity",
} as const;
/** A flux that a law gives, W m⁻² of the planet's whole area unless said. */
export const OUTGOING = { symbol: "F", unit: "W m-2", about: "outgoing longwave radiation" } as const;
