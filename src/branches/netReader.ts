// Reads N of a loop at parameters and temperatures.

import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import type { Kernel } from "../reading/readingOf.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import type { Sign } from "../search/enclosed.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import type { DoubtKind } from "../search/enumeration.ts";
import type { Located } from "../states/located.ts";
import { enumerateBalance, located } from "../states/provedSearch.ts";
import { sampling } from "../states/sampledSearch.ts";
import { balanceOf } from "./balanceOf.ts";
import { signAt } from "./criticals.ts";
import type { Branch, BranchEnd, BranchPoint } from "./diagram.ts";

/** A loop along one of its givens, the others set. */
export interface NetReader {
  /** All states at a parameter. */
  enumerate(parameter: number, within: Range, effort: number): StatesAt;
  /** The sign of N, proved unless the loop is sampled. */
  sign(parameter: number, temperature: number): Sign;
  /** λ, not proved. */
  feedback(parameter: number, temperature: number): number;
  /** The state of a branch at a parameter inside its range; undefined where none is found. */
  stateOn(branch: Branch, parameter: number): Located | undefined;
}

/** The states at a parameter, and what is undecided there. */
export interface StatesAt {
  readonly zeros: readonly { readonly at: number; readonly bracket: Range; readonly slopeSign: Sign }[];
  readonly undecided: readonly { readonly interval: Range; readonly kind: DoubtKind }[];
  readonly boxes: number;
  readonly points: number;
}

/** Boxes that finding a state on its branch may cost. */
const ON_BRANCH = 200;
/** Evaluations that it may cost in a sampled loop. */
const SAMPLES = 2000;
/** Relative to the temperature. */
const LEAST_REACH = 1e-9;
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
    return {
      feedback,
      enumerate: states,
      sign: (parameter, temperature) => Math.sign(read(valuesOf(loop).net, parameter, temperature)) as Sign,
      stateOn(branch, parameter) {
        set[place] = parameter;
        const { located } = sampling.searchOf(loop)(set, reachOf(branch), SAMPLES);
        return nearest(located, branch, parameter);
      },
    };
  }
  const balance = balanceOf(loop);
  const at = (parameter: number) => {
    set[place] = parameter;
    balance.set(set, set);
  };
  return {
    feedback,
    enumerate(parameter, within, effort) {
      at(parameter);
      return enumerateBalance(balance, within, effort);
    },
    sign(parameter, temperature) {
      at(parameter);
      return signAt(balance.net, temperature);
    },
    stateOn(branch, parameter) {
      at(parameter);
      const { zeros } = enumerateZeros(balance.net, reachOf(branch), { effort: ON_BRANCH });
      const zero = nearest(zeros, branch, parameter);
      return zero && located(zero);
    },
  };
}

const valuesOf = /* @__PURE__ */ kept((loop) => {
  const inputs = inputsOf(loop);
  const slope = derivative(loop.graph, loop.net, inputs[0] as number, inputs);
  const kernel = (output: number) => valueKernel(loop.graph, { inputs, outputs: [output] });
  return { net: kernel(loop.net), slope: kernel(slope) };
});

/**
 * The temperatures of a branch with the brackets of its ends. Beyond a fold its neighbour begins; on other sides a little more,
 * because a branch may keep its temperature.
 */
function reachOf({ temperatures: [cold, hot], low, high }: Branch): Range {
  const ends = [low, high];
  const [from, to] = [
    Math.min(cold, ...ends.map((e) => e.temperatureBracket[0])),
    Math.max(hot, ...ends.map((e) => e.temperatureBracket[1])),
  ];
  const slackAt = (side: 0 | 1, x: number): number =>
    ends.some((e) => isTurn(e) && e.temperatureBracket[side] === x) ? 0 : LEAST_REACH * hot;
  return [from - slackAt(0, from), to + slackAt(1, to)];
}

const isTurn = ({ kind }: BranchEnd): boolean => kind === "fold" || kind === "corner";

/** The one nearest to where the points of a branch say that it is. */
function nearest<Z extends { readonly at: number }>(
  zeros: readonly Z[],
  { points }: Branch,
  parameter: number,
): Z | undefined {
  if (zeros.length < 2) return zeros[0];
  const after = Math.max(
    1,
    points.findIndex((p) => p.at >= parameter),
  );
  const [a, b] = [points[after - 1], points[after]] as [BranchPoint, BranchPoint];
  const share = b.at > a.at ? (parameter - a.at) / (b.at - a.at) : 0;
  const guess = a.temperature + share * (b.temperature - a.temperature);
  return zeros.reduce((x, y) => (Math.abs(y.at - guess) < Math.abs(x.at - guess) ? y : x));
}
