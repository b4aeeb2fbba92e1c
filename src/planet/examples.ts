// An example of a value for each unit that a port may have, shown in errors and in the JSON Schema.

const EXAMPLES: Readonly<Record<string, string>> = {
  "1": "0.3",
  m: "0.61 au",
  kg: "0.7 solMass",
  s: "12 d",
  "s-1": "0.05 Gyr-1",
  K: "288 K",
  W: "0.42 solLum",
  Pa: "1.1 bar",
  "K m-1": "6.5 K km-1",
  "W m-2": "870 W m-2",
  "W m-2 K-1": "2.1 W m-2 K-1",
  "J m-2 K-1": "4.2e8 J m-2 K-1",
  "J kg-1 K-1": "4000 J kg-1 K-1",
  "kg m-3": "1025 kg m-3",
  "m s-2": "9.8 m s-2",
};

/** A value with this unit as a description writes it; `difference` tells temperatures from their differences. */
export const exampleOf = (unit: string, difference = false): string =>
  difference ? "10 K" : (EXAMPLES[unit] ?? `1 ${unit}`);
