// Finds the equilibria of a loop.
import { derivative } from "../graph/derivative.ts";
import { CONSTANT_SET } from "../ground/constants.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange } from "../ground/range.ts";
import { givensAt, inputsOf } from "../loop/inputs.ts";
import type { Givens, Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { type Sampled, scanZeros } from "../search/scanZeros.ts";
import type { Note } from "./note.ts";
import type { FoundStates, State } from "./state.ts";
import { type StateReader, stateReader } from "./stateReader.ts";

/** Where to look, for which parameters, and how hard. */
export interface FindStatesOptions<N extends string = string> {
  /** Lowest and highest temperature, K. */
  readonly within: readonly [number, number];
  /** Values of givens that differ from those the loop was closed with. */
  readonly at?: { readonly [K in Givens<N>]?: number };
  /** How many evaluations of the balance the search may spend; 20,000 unless said. */
  readonly effort?: number;
}

/**
 * Finds the equilibria N(T) = 0 of a loop with one variable in a range of temperature, each with its stability,
 * feedback parameter λ = ∂N/∂T, e-folding time −C/λ and energy ledger.
 *
 * The search samples the balance, follows near-tangent minima and refines every sign change to the precision of the
 * arithmetic. It does not prove that nothing was missed: `proof` is `"sampled"` and `complete` is false. What it cannot
 * decide is listed in `undecided`, never dropped; a search that runs out of `effort` says where it stopped.
 *
 * Throws `out-of-range`, `not-a-number`, `unreadable` (for `within`), `unknown-name`, `several-variables`.
 */
export function findStates<N extends string>(loop: Loop<N>, options: FindStatesOptions<N>): FoundStates<N> {
  checkKeys(options, "findStates", ["within", "at", "effort"]);
  if (loop.variables.length > 1) {
    fail("several-variables", {
      path: "findStates",
      value: loop.variables.map((v) => v.name),
      allowed: "temperature alone",
    });
  }
  const within = checkedRange(options.within, "within", "K", loop.variables[0]?.within);
  const effort = checkedNumber(options.effort ?? 20_000, "effort", "1", [10, 1e9]);
  const givens = givensAt(loop, options.at);
  const { balance, read } = preparedFor(loop);
  const scan = scanZeros(balance(givens), within, effort);
  return Object.freeze({
    states: Object.freeze(scan.crossings.map((c) => read(c, givens) as State<N>)),
    complete: false,
    undecided: scan.doubts,
    proof: "sampled",
    within,
    cost: { evaluations: scan.evaluations },
    notes: searchNotes(
      scan.doubts.some((d) => d.kind === "effort"),
      loop.sampled,
    ),
    constants: CONSTANT_SET,
  });
}

interface Prepared {
  readonly balance: (givens: readonly number[]) => Sampled;
  readonly read: StateReader;
}
const prepared = new WeakMap<Loop, Prepared>();

/** The kernels of a loop, made at its first search. */
function preparedFor(loop: Loop): Prepared {
  const found = prepared.get(loop) ?? { balance: balanceOf(loop), read: stateReader(loop) };
  prepared.set(loop, found);
  return found;
}

/** Rounding of a balance, relative to its largest flow: a few operations for each flow. */
const BALANCE_NOISE = 2e-15;

function balanceOf(loop: Loop): Prepared["balance"] {
  const inputs = inputsOf(loop);
  const slope = derivative(loop.graph, loop.net, inputs[0] as number, inputs);
  const flows = loop.flows.filter((f) => f.sign !== 0).map((f) => f.node);
  const kernel = valueKernel(loop.graph, { inputs, outputs: [loop.net, slope, ...flows] });
  const values = new Float64Array(2 + flows.length);
  return (givens) => {
    const point = Float64Array.of(0, ...givens);
    return {
      at(x, out) {
        point[0] = x;
        kernel(point, values);
        let largest = 0;
        for (let i = 2; i < values.length; i++) largest = Math.max(largest, Math.abs(values[i] as number));
        out[0] = values[0] as number;
        out[1] = values[1] as number;
        out[2] = BALANCE_NOISE * largest;
      },
    };
  };
}

function searchNotes(stopped: boolean, sampledLaw: boolean): Note[] {
  const note = (code: Note["code"], severity: Note["severity"], text: string): Note => ({
    ...{ code, severity, about: "findStates", value: null, range: null, unit: "1", text, source: null },
  });
  const notes = [
    note("sampled-search", "caution", "found by sampling: states that lie close together may be missing"),
  ];
  if (sampledLaw)
    notes.push(
      note("sampled-law", "info", "a law is an ordinary function; its slopes are difference quotients"),
    );
  if (stopped)
    notes.push(note("search-stopped", "caution", "the effort was spent before the range was searched"));
  return notes;
}
