// Text is compiled once for each shape, and what was compiled is kept in a store that does not grow without end.
import { afterAll, expect, test } from "vitest";
import * as core from "../../src/index.ts";
import { readPlanet } from "../../src/planet.ts";
import { compiled } from "../../src/reading/generation.ts";

let made = 0;
const { Function: original } = globalThis;
globalThis.Function = new Proxy(original, {
  construct(target, args, as) {
    made++;
    return Reflect.construct(target, args, as);
  },
});
afterAll(() => {
  globalThis.Function = original;
});

/** How many texts `run` has compiled. */
function compilations(run: () => unknown): number {
  const before = made;
  run();
  return made - before;
}

const within = [150, 400] as const;
const search = (emissivity: number) => {
  const loop = core.closeLoop(({ temperature, given }) => ({
    heating: { sunlight: core.absorbedFlux({ flux: given("flux", 1361, "W m-2"), albedo: 0.3 }) },
    cooling: { longwave: core.greyEmission({ temperature, emissivity }) },
    heatCapacity: 0,
  }));
  return core.findStates(loop, { within }).states.length;
};

test("loops of one shape share their code", () => {
  expect(compilations(() => search(0.6))).toBeGreaterThan(0);
  expect(compilations(() => search(0.61))).toBe(0);
  expect(compilations(() => search(0.62))).toBe(0);
});

test("planets of one shape share their code, and so do all rows of a catalogue", () => {
  const planet = (albedo: number) =>
    readPlanet({
      format: "thermostead-planet-1",
      star: { luminosity: "0.42 solLum" },
      orbit: { semiMajorAxis: "0.61 au", eccentricity: 0 },
      redistribution: "global",
      albedo,
      longwave: { law: "greyEmission", emissivity: 0.6 },
      heatCapacity: "4.2e8 J m-2 K-1",
    }).loop;
  const find = (albedo: number, emissivity: readonly number[]) =>
    core.findStatesFor(planet(albedo), { "longwave.emissivity": emissivity } as never, { within });
  expect(compilations(() => expect(find(0.3, [0.6]).rows).toBe(1))).toBeGreaterThan(0);
  expect(compilations(() => find(0.2, [0.6, 0.61, 0.62]))).toBe(0);
  expect(compilations(() => find(0.1, [0.5]))).toBe(0);
});

test("the store is bounded: what was used least recently is compiled again", () => {
  const text = (i: number) => `return () => ${i}`;
  const read = (i: number) => compilations(() => expect(compiled<() => number>(text(i))()).toBe(i));
  expect(read(0)).toBe(1);
  expect(read(1)).toBe(1);
  for (let i = 2; i < 300; i++) {
    expect(read(i)).toBe(1);
    // what is used again and again stays
    expect(read(1)).toBe(0);
  }
  expect(read(299)).toBe(0);
  expect(read(0)).toBe(1);
});
