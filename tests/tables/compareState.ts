// Compares what a search found with a row of a reference table.
import { expect } from "vitest";
import type { FoundStates, State } from "../../src/states/state.ts";
import { nearest, of, type ReferenceRow, type ReferenceState } from "./table.ts";

/** One rounding of a double, relative. */
const U = 2 ** -53;
/**
 * Roundings of the balance at one temperature, relative to the sum of its terms. Every input of a case is rounded once
 * to a double (a scaled emissivity three times), and each term takes fewer than a dozen operations after that.
 */
const ROUNDINGS = 16;

/** What a case of a table tells about a state of ours. */
export interface Reading {
  /** Sum of the sizes of the terms of N, W m⁻². */
  readonly size: number;
  /** The parts of λ, by the names in the table. */
  readonly parts: Readonly<Record<string, number>>;
  /** The part over which factors are taken. */
  readonly reference: string;
}

/** How far T and λ may lie from a reference, from the roundings above alone. */
export function tolerancesOf(reference: ReferenceState, { size, parts }: Reading) {
  const lambda = Math.abs(Number(reference.lambda));
  const temperature = (ROUNDINGS * U * size) / lambda + 2 * U * 512;
  const steepness = Object.values(parts).reduce((sum, part) => sum + Math.abs(part), 0);
  const bend = Math.abs(Number(reference.curvature ?? 0));
  return { temperature, slope: 2 * ROUNDINGS * U * steepness + 2 * bend * temperature };
}

/** Notes besides that of a temperature outside the range a law was published for, which the tables leave on purpose. */
const notesOf = ({ notes }: State) => notes.filter((note) => note.code !== "outside-published");

/** Expects exactly the equilibria of a row. `zero`: what our temperatures have above those of the table. */
export function expectRow(
  found: FoundStates,
  row: ReferenceRow,
  zero: number,
  read: (state: State) => Reading,
): void {
  expect(found.undecided).toEqual([]);
  expect(found.states.map((s) => s.temperature)).toHaveLength(row.states.length);
  row.states.forEach((reference, i) => {
    expectState(found.states[i] as State, reference, zero, read);
  });
  expectProof(found);
}

/** Expects one equilibrium: temperature, λ, stability, every part of λ, every feedback factor and dT/dS. */
export function expectState(
  state: State,
  reference: ReferenceState,
  zero: number,
  read: (state: State) => Reading,
): void {
  const reading = read(state);
  const tolerance = tolerancesOf(reference, reading);
  const T = nearest(reference.T) + zero;
  expect(Math.abs(state.temperature - T)).toBeLessThanOrEqual(tolerance.temperature);
  expect(state.bracket[0]).toBeLessThanOrEqual(T + tolerance.temperature);
  expect(state.bracket[1]).toBeGreaterThanOrEqual(T - tolerance.temperature);
  expect(state.stability).toBe(reference.stable ? "stable" : "unstable");
  expect({ proved: state.proved, notes: notesOf(state) }).toEqual({ proved: true, notes: [] });
  const [least, most] = state.feedbackParameterRange ?? [Number.NaN, Number.NaN];
  expect(least).toBeLessThanOrEqual(Number(reference.lambda) + tolerance.slope);
  expect(most).toBeGreaterThanOrEqual(Number(reference.lambda) - tolerance.slope);
  expect(Math.abs(state.feedbackParameter - Number(reference.lambda))).toBeLessThanOrEqual(tolerance.slope);
  expect(Object.keys(reading.parts).sort()).toEqual(Object.keys(reference.parts).sort());
  const under = of(reading.parts, reading.reference);
  for (const [name, part] of Object.entries(reading.parts)) {
    expect(Math.abs(part - Number(reference.parts[name])), name).toBeLessThanOrEqual(tolerance.slope);
    if (name === reading.reference) continue;
    const factor = Number(reference.factors[name]);
    const allowed = (tolerance.slope * (1 + Math.abs(factor))) / Math.abs(under);
    expect(Math.abs(part / -under - factor), name).toBeLessThanOrEqual(allowed + U);
  }
  const absorbedShare = (1 - of(state.couplings, "albedo")) / 4;
  const response = absorbedShare / -state.feedbackParameter;
  // dT/dS = (1 − α)/4/(−λ): the albedo moves by (slope of N by albedo part) δT, λ by its own tolerance
  const share = absorbedShare + Math.abs(of(reading.parts, "albedo")) * tolerance.temperature;
  const allowed =
    (2 * share * (tolerance.slope / Math.abs(state.feedbackParameter) + 8 * U)) /
    Math.abs(state.feedbackParameter);
  expect(Math.abs(response - Number(reference.dTdS))).toBeLessThanOrEqual(allowed);
}

/** The list is proved to be all there is, in brackets no wider than promised and with the budget closed as promised. */
function expectProof({ proof, complete, states }: FoundStates): void {
  expect({ proof, complete }).toEqual({ proof: "proved", complete: true });
  for (const { bracket, temperature, imbalance, ledger } of states) {
    expect(bracket[1] - bracket[0]).toBeLessThanOrEqual(1e-11);
    expect(bracket[0]).toBeLessThanOrEqual(temperature);
    expect(bracket[1]).toBeGreaterThanOrEqual(temperature);
    const heating = ledger.flows.reduce((sum, f) => sum + (f.to === "surface" ? Math.abs(f.value) : 0), 0);
    expect(of(imbalance, "temperature")).toBeLessThanOrEqual(Math.max(5e-12, 2e-14 * heating));
  }
}
