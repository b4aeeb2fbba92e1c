// The units in which a description has its values.
import { expect, test } from "vitest";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { orsolneWith } from "./orsolne.ts";

test("are those that were written, with their size in the SI", () => {
  const { units, inputs, loop } = readPlanet(
    orsolneWith({
      star: {
        luminosity: { value: 0.2, unit: "solLum", minus: 0.01, plus: 1e-2 },
        mass: { value: 0.72, unit: "solMass" },
        brightening: "0.05 Gyr-1",
      },
      orbit: { semiMajorAxis: "0.46 au", eccentricity: { value: 0.1, plus: 0.1 }, average: "flux" },
      albedo: { law: "tanhAlbedo", cold: 0.6, warm: 0.3, midpoint: "-7 degC", width: "9 K" },
      atmosphere: { pressure: { value: 1.2, unit: "bar" } },
      internalHeat: "80 g.s-3",
      heatCapacity: "4.2e5 kW/m2*s K-1",
      redistribution: "global",
      rotation: { period: "36 h" },
    }),
  );
  expect(units.map(({ name }) => name)).toEqual(inputs.map(({ path }) => path));
  const of = (path: string) => {
    const { unit, size } = units.find(({ name }) => name === path) ?? { unit: "none", size: 0 };
    const { value } = inputs.find((input) => input.path === path) ?? { value: Number.NaN };
    return [unit, size, value / size];
  };
  const near = (value: number) => expect.closeTo(value, 9);
  // the sizes are those of IAU 2012 B2 and 2015 B3, and of the SI
  expect(of("star.luminosity")).toEqual(["solLum", 3.828e26, near(0.2)]);
  expect(of("star.brightening")).toEqual(["Gyr-1", near(0), near(0.05)]);
  expect(of("orbit.semiMajorAxis")).toEqual(["au", 149597870700, near(0.46)]);
  expect(of("orbit.eccentricity")).toEqual(["1", 1, 0.1]);
  expect(of("albedo.midpoint")).toEqual(["K", 1, near(266.15)]);
  expect(of("albedo.width")).toEqual(["K", 1, 9]);
  expect(of("atmosphere.pressure")).toEqual(["bar", 1e5, near(1.2)]);
  expect(of("internalHeat")).toEqual(["g.s-3", 1e-3, near(80)]);
  expect(of("heatCapacity")).toEqual(["kW/m2*s K-1", 1e3, near(4.2e5)]);
  expect(of("redistribution")).toEqual(["1", 1, 0.25]);
  expect(of("rotation.period")).toEqual(["h", 3600, near(36)]);
  for (const { name } of loop.givens) expect(units.map((unit) => unit.name)).toContain(name);
});
