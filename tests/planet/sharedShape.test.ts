// Descriptions that differ in nothing but numbers share a recorded budget; nothing else may show it.
import { expect, it } from "vitest";
import { findStates } from "../../src/index.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { orsolne, orsolneWith } from "./orsolne.ts";

const statesOf = (description: unknown) => {
  const { loop } = readPlanet(description);
  const { states } = findStates(loop, { within: [50, 1000] });
  return states.map(({ temperature, bracket, feedbackParameter, ledger, givens }) => ({
    ...{ temperature, bracket, feedbackParameter, ledger, givens: Object.entries(givens).sort() },
  }));
};
/** The same description with its fields in another order, so that its budget is recorded for itself. */
const turned = (description: object): object => Object.fromEntries(Object.entries(description).reverse());

it("a planet is what it would be had no other been read before", () => {
  const before = statesOf(orsolne());
  const changes = [
    { albedo: { ...(orsolne().albedo as object), midpoint: "262 K", width: "6 K" } },
    { orbit: { semiMajorAxis: "0.48 au", eccentricity: 0.2, average: "flux" }, name: "another" },
    { internalHeat: "2 W m-2" },
    { redistribution: 0.25 },
  ];
  for (const change of changes) {
    const description = orsolneWith(change);
    expect(statesOf(description)).toEqual(statesOf(turned(description)));
  }
  expect(statesOf(orsolne())).toEqual(before);
});

it("a planet as a whole and a day side do not share the standard names of their flows", () => {
  const names = (redistribution: number) =>
    findStates(readPlanet(orsolneWith({ redistribution })).loop, { within: [50, 1000] })
      .states[0]?.ledger.flows.map((flow) => flow.standardName)
      .filter(Boolean);
  expect(names(0.5)).toEqual([]);
  expect(names(0.25)).toHaveLength(2);
  expect(names(0.5)).toEqual([]);
});
