// Finds the zeros of N along one of its givens at a temperature.
import { coneOf } from "../graph/cone.ts";
import { derivative } from "../graph/derivative.ts";
import type { Range } from "../ground/range.ts";
import { inputsOf, rangesOf } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { type EnclosureKernel, enclosureKernel } from "../reading/enclosureKernel.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { above, below, signOf } from "../search/enclosed.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import type { DoubtKind } from "../search/enumeration.ts";
import { scanZeros } from "../search/scanZeros.ts";
import { lineOf } from "./line.ts";
import { sampledLine } from "./sampledLine.ts";
import type { Solution, Solutions } from "./solutions.ts";

/** The range of the unknown in units of the length over which a search takes its function to change little. */
const FINE_PARTS = 30;
const KINK_EFFORT = 60;
/** Rounding of a balance, relative to its largest flow. */
const NOISE = 2e-15;

/** Zeros of N along the unknown, for values of all inputs. */
type Solver = (values: ArrayLike<number>, within: Range, effort: number) => Found;
type Found = Pick<Solutions, "undecided" | "cost"> & {
  readonly zeros: readonly { readonly at: number; readonly bracket: Range }[];
};

/** Finds values of a given, and reads the state that belongs to each. */
export const solversOf = /* @__PURE__ */ kept((loop, name) => {
  const place = 1 + loop.givens.findIndex((g) => g.name === name);
  return { solve: loop.sampled ? sampled(loop, place) : enclosed(loop, place), judge: judgeOf(loop, place) };
});

function enclosed(loop: Loop, place: number): Solver {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const line = lineOf(loop, net, place);
  const argumentsOf = (...ops: string[]) =>
    coneOf(graph, [net], inputs)
      .filter((id) => ops.includes(graph.ops[id] as string))
      .map((id) => graph.args[id] as readonly number[]);
  const leaps = argumentsOf("step").map((args) => lineOf(loop, args[0] as number, place));
  const bends = argumentsOf("min", "max").map((args) => lineOf(loop, graph.node("sub", args), place));
  const kinks = [...leaps, ...bends];
  const box = new Float64Array(9);
  /** Whether a zero may lie on a leap, as at a temperature that is its threshold: what is on one side is none on the other. */
  const isAmidLeap = ({ bracket }: { readonly bracket: Range }) =>
    leaps.some((leap) => {
      leap.box(...bracket, box);
      return signOf(box[0] as number, box[1] as number, box[2] as number) === 0;
    });
  return (values, within, effort) => {
    const fine = (within[1] - within[0]) / FINE_PARTS;
    const cuts: number[] = [];
    for (const kink of kinks) {
      kink.values.set(values);
      for (const { bracket } of enumerateZeros(kink.ends, within, { effort: KINK_EFFORT, fine }).zeros)
        cuts.push(...bracket);
    }
    line.values.set(values);
    const { zeros, undecided, boxes, points } = enumerateZeros(line.ends, within, { effort, fine, cuts });
    const doubts = [
      ...undecided,
      ...zeros.filter(isAmidLeap).map(({ bracket }) => ({ interval: bracket, kind: "jump" as const })),
    ].sort((a, b) => a.interval[0] - b.interval[0]);
    return {
      zeros: zeros.filter((zero) => !isAmidLeap(zero)),
      undecided: doubts.map(plain),
      cost: { boxes, points },
    };
  };
}

function sampled(loop: Loop, place: number): Solver {
  const line = sampledLine(loop, loop.net, place, NOISE);
  return (values, within, effort) => {
    line.values.set(values);
    const { crossings, doubts, evaluations } = scanZeros(line, within, effort);
    return { zeros: crossings, undecided: doubts.map(plain), cost: { boxes: 0, points: evaluations } };
  };
}

const plain = ({ interval, kind }: { readonly interval: Range; readonly kind: DoubtKind }) =>
  Object.freeze({ interval: Object.freeze([interval[0], interval[1]] as const), kind });

/** Reads λ at a solution: its proved sign over the bracket, or its plain sign for a sampled law. */
function judgeOf(loop: Loop, place: number) {
  const inputs = inputsOf(loop);
  const slope = derivative(loop.graph, loop.net, inputs[0] as number, inputs);
  const read = valueKernel(loop.graph, { inputs, outputs: [slope] });
  const wide = new Set([inputs[place] as number]);
  const ranges = rangesOf(loop);
  const bounds: EnclosureKernel | undefined = loop.sampled
    ? undefined
    : enclosureKernel(loop.graph, { inputs, outputs: [slope], wide, ranges });
  const out = new Float64Array(3);
  return (values: readonly number[], { at, bracket }: { at: number; bracket: Range }): Solution => {
    const [low, high] = bracket.map((p) => Float64Array.from(values, (v, i) => (i === place ? p : v)));
    read(
      Float64Array.from(values, (v, i) => (i === place ? at : v)),
      out,
    );
    // adding 0 turns -0, which JSON does not keep, into 0
    const feedbackParameter = 0 + (out[0] as number);
    bounds?.(low as Float64Array, high as Float64Array, out);
    const sign = bounds
      ? signOf(below(out[0] as number), above(out[1] as number), out[2] as number)
      : Math.sign(feedbackParameter);
    const stability = sign < 0 ? "stable" : sign > 0 ? "unstable" : "undecided";
    return Object.freeze({
      value: at,
      bracket: Object.freeze([bracket[0], bracket[1]] as const),
      stability,
      feedbackParameter,
    });
  };
}
