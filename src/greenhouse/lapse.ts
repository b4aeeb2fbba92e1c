// Ports of a column whose temperature falls evenly with height.

/** Port: how fast. */
export const LAPSE_RATE = {
  symbol: "Γ",
  unit: "K m-1",
  within: [1e-6, 1],
  about: "decrease of temperature with height",
} as const;

/** Port: from where the planet emits. */
export const EMISSION_HEIGHT = {
  symbol: "z_e",
  unit: "m",
  within: [-1e6, 1e6],
  about: "height from which the planet emits to space",
} as const;
