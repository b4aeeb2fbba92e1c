// Ports that many laws share, so that a temperature or an albedo has one range everywhere.

/** Temperature of a surface or an atmosphere, K. */
export const temperaturePort = (symbol = "T", about = "temperature") =>
  ({ symbol, unit: "K", within: [0, 1e5], about }) as const;

/** The temperature at which a planet as a whole radiates, K. */
export const effectiveTemperaturePort = () =>
  temperaturePort("T_e", "effective temperature of emission to space");

/** Share of reflected light. */
export const albedoPort = (symbol = "α", about = "Bond albedo") =>
  ({ symbol, unit: "1", within: [0, 1], about }) as const;

/** Stellar flux normal to the beam, W m⁻². */
export const fluxPort = (symbol = "S", about = "stellar flux normal to the beam") =>
  ({ symbol, unit: "W m-2", within: [0, 1e12], about }) as const;

/** Eccentricity of a bound orbit. */
export const eccentricityPort = () =>
  ({ symbol: "e", unit: "1", within: [0, 0.9999], about: "orbital eccentricity" }) as const;

/** Outgoing longwave radiation, W m⁻² of the planet's whole area. */
export const outgoingPort = () =>
  ({ symbol: "F", unit: "W m-2", about: "outgoing longwave radiation" }) as const;
