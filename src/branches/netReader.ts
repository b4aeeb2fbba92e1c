// Reads N of a loop at parameters and temperatures.
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import type { Kernel } from "../reading/readingOf.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import type { Sign } from "../search/enclosed.ts";
import { balanceOf, type EnclosedBalance } from "../states/enclosedBalance.ts";
import type { Located } from "../states/located.ts";
import { enumerateBalance, located } from "../states/provedSearch.ts";
import { sampling } from "../states/sampledSearch.ts";
import type { Branch } from "./diagram.ts";
import { nearest, reachOf, type StatesAt, type ZeroReader, zeroOn, zeroReader } from "./zeroReader.ts";

/** A loop along one of its givens, the others set. */
export interface NetReader extends ZeroReader {
  /** λ, not proved. */
  feedback(parameter: number, temperature: number): number;
  /** The state of a branch at a parameter inside its range; undefined where none is found. */
  stateOn(branch: Branch, parameter: number): Located | undefined;
  /** All states at a parameter, by rising temperature; undefined where they are not proved to be all. */
  statesAt(parameter: number, within: Range): Located[] | undefined;
}

/** Evaluations that it may cost in a sampled loop. */
const SAMPLES = 2000;
/** Boxes that finding all states at a parameter may cost. */
const ALL_EFFORT = 2000;
const SIGNS = { stable: -1, unstable: 1, undecided: 0 } as const;

/** The reader of a loop; `place` is that of the parameter among the givens. */
export function netReader(loop: Loop, place: number, givens: readonly number[]): NetReader {
  const set = [...givens];
  const out = new Float64Array(1);
  const read = (kernel: Kernel, parameter: number, temperature: number): number => {
    set[place] = parameter;
    kernel(Float64Array.of(temperature, ...set), out);
    return out[0] as number;
  };
  const feedback = (parameter: number, temperature: number) =>
    read(valuesOf(loop).slope, parameter, temperature);
  const states = (parameter: number, within: Range, effort: number): StatesAt => {
    set[place] = parameter;
    const { located, undecided, cost } = sampling.searchOf(loop)(set, within, effort);
    const zeros = located.map(({ at, bracket, stability }) => ({ at, bracket, slopeSign: SIGNS[stability] }));
    return { zeros, undecided, ...cost };
  };
  if (loop.sampled) {
    const stateOn = (branch: Branch, parameter: number): Located | undefined => {
      set[place] = parameter;
      const { located } = sampling.searchOf(loop)(set, reachOf(branch), SAMPLES);
      return nearest(located, branch, parameter);
    };
    return {
      ...{ feedback, stateOn, enumerate: states, statesAt: () => undefined },
      sign: (parameter, temperature) => Math.sign(read(valuesOf(loop).net, parameter, temperature)) as Sign,
      temperatureOn: (branch, parameter) => stateOn(branch, parameter)?.at,
    };
  }
  const at = (parameter: number): EnclosedBalance => {
    const balance = balanceOf(loop);
    set[place] = parameter;
    balance.set(set, set);
    return balance;
  };
  return {
    ...zeroReader({ at, sign: () => 1 }),
    feedback,
    stateOn(branch, parameter) {
      const zero = zeroOn(at(parameter), branch, { parameter, sign: 1 });
      return zero && located(zero);
    },
    statesAt(parameter, within) {
      const { zeros, undecided } = enumerateBalance(at(parameter), within, ALL_EFFORT);
      return undecided.length === 0 ? zeros.map(located) : undefined;
    },
  };
}

const valuesOf = /* @__PURE__ */ kept((loop) => {
  const inputs = inputsOf(loop);
  const slope = derivative(loop.graph, loop.net, inputs[0] as number, inputs);
  const kernel = (output: number) => valueKernel(loop.graph, { inputs, outputs: [output] });
  return { net: kernel(loop.net), slope: kernel(slope) };
});
