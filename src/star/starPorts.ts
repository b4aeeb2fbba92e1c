// Ports that laws of starlight share.

/** Luminosity of a star, W. */
export const luminosityPort = () =>
  ({ symbol: "L", unit: "W", within: [0, 1e40], about: "luminosity of the star" }) as const;

/** Distance from a star, m. */
export const distancePort = () =>
  ({ symbol: "d", unit: "m", within: [1, 1e22], about: "distance from the star" }) as const;

/** Radius of a star, m. */
export const stellarRadiusPort = () =>
  ({ symbol: "R", unit: "m", within: [1, 1e14], about: "radius of the star" }) as const;
