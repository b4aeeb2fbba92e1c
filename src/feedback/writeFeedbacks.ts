// Makes the analysis of a state's feedbacks from the influences that were read.
import { compensatedSum } from "../ground/sum.ts";
import type { Taken } from "../loop/checkBelongs.ts";
import type { Loop } from "../loop/types.ts";
import { type Bounds, differenceOf, excludesZero } from "./bounds.ts";
import { notesOf } from "./feedbackNotes.ts";
import type { DisturbanceTimes, FeedbackLoop, FeedbackPart, Feedbacks } from "./feedbacks.ts";
import type { Bounded, Influences } from "./influences.ts";
import type { ReferenceName } from "./referenceResponse.ts";
import { strongestPaths } from "./strongestPaths.ts";

/** More feedback loops than this are not listed one by one. */
const MOST_LOOPS = 64;
/** λ of a sampled loop below this share of its parts is rounding. */
const SLOPE_NOISE = 1e-12;

/** What was read of a state. */
export interface Read {
  readonly at: Taken;
  readonly chosen: readonly string[];
  /** The place of the net flux. */
  readonly end: number;
  readonly name: ReferenceName;
  readonly influences: Influences;
}

/** Puts together all that is said of the feedbacks in a state. */
export function writeFeedbacks<N extends string>(
  loop: Loop,
  { at, chosen, end, name, influences }: Read,
): Feedbacks<N> {
  const { total, heatCapacity, edges } = influences;
  const isDirect = (e: { from: number; to: number }) => e.from === 0 && e.to === end;
  const reference: Bounded = edges.find(isDirect) ?? { value: 0, bounds: [0, 0] };
  const paths = strongestPaths(
    edges.filter((e) => !isDirect(e)),
    end,
    MOST_LOOPS,
  );
  const partOf = partWriter(reference);
  const size = paths.strongest.reduce((sum, p) => sum + Math.abs(p.value), Math.abs(reference.value));
  const isKnown = signKnown(total, SLOPE_NOISE * size);
  const timesOf = (lambda: Bounded) => disturbanceTimes(lambda, heatCapacity, SLOPE_NOISE * size);
  const loops = paths.strongest.map((path): FeedbackLoop<N> => {
    const rest = {
      value: total.value - path.value,
      bounds: loop.sampled ? null : differenceOf(total.bounds, path.bounds),
    };
    return Object.freeze({
      through: Object.freeze(path.through.map((place) => chosen[place - 1] as string)) as never,
      ...partOf(path),
      effect: path.value > 0 ? "amplifies" : path.value < 0 ? "counters" : "none",
      without: Object.freeze({ feedbackParameter: rest.value, ...timesOf(rest) }),
    });
  });
  const others = othersOf(total, [reference, ...paths.strongest], paths.count - loops.length, partOf);
  const parts = [reference.value, ...loops.map((l) => l.feedbackParameter), others?.feedbackParameter ?? 0];
  const factor = reference.value < 0 ? 1 - total.value / reference.value : null;
  const gain = factor !== null && isKnown && total.value < 0 ? reference.value / total.value : null;
  const givens = at.values.subarray(loop.variables.length);
  return Object.freeze({
    temperature: at.values[0] as number,
    givens: record(loop.givens, (i) => givens[i] as number) as Feedbacks<N>["givens"],
    through: Object.freeze([...chosen]) as never,
    feedbackParameter: total.value,
    feedbackParameterRange: frozen(total.bounds),
    settledFeedbackParameter: total.value,
    reference: Object.freeze({
      kind: reference.value < 0 ? name.kind : "reference response",
      feedbackParameter: reference.value,
      feedbackParameterRange: loop.sampled ? null : frozen(reference.bounds),
      text: name.text,
      contains: Object.freeze([...name.contains]) as never,
    }),
    loops: Object.freeze(loops),
    others,
    residual: compensatedSum([...parts, -total.value]),
    feedbackFactor: factor,
    gain,
    sensitivity: isKnown ? -1 / total.value : null,
    responses: record(loop.givens, (i, { unit }) => {
      const flux = 0 + (influences.givens[i] as number);
      return Object.freeze({ flux, temperature: isKnown ? 0 - flux / total.value : null, unit });
    }) as Feedbacks<N>["responses"],
    ...timesOf(total),
    proved: isKnown && !loop.sampled,
    notes: Object.freeze(
      notesOf(loop, { reference, total, isKnown, count: paths.count, listed: loops.length }),
    ),
  });
}

const frozen = (bounds: Bounds): Bounds => bounds && Object.freeze([0 + bounds[0], 0 + bounds[1]] as const);

/** The fields that every part of λ has. Adding 0 turns −0, which JSON does not keep, into 0. */
const partWriter =
  (reference: Bounded) =>
  ({ value, bounds }: Bounded): FeedbackPart => ({
    feedbackParameter: 0 + value,
    feedbackParameterRange: frozen(bounds),
    feedbackFactor: reference.value < 0 ? 0 + value / -reference.value : null,
  });

function othersOf(
  total: Bounded,
  listed: readonly Bounded[],
  count: number,
  partOf: (part: Bounded) => FeedbackPart,
): Feedbacks["others"] {
  if (count <= 0) return null;
  const value = compensatedSum([total.value, ...listed.map((p) => -p.value)]);
  const bounds = listed.reduce<Bounds>((rest, p) => differenceOf(rest, p.bounds), total.bounds);
  return Object.freeze({ count, ...partOf({ value, bounds }) });
}

/** True if λ has a sign: a proved one, or for a sampled loop one beyond rounding. */
const signKnown = ({ value, bounds }: Bounded, noise: number): boolean =>
  bounds ? excludesZero(bounds) : Math.abs(value) > noise;

function disturbanceTimes(lambda: Bounded, heatCapacity: number, noise: number): DisturbanceTimes {
  if (!(heatCapacity >= 0) || !signKnown(lambda, noise)) return { eFoldingTime: null, growthTime: null };
  const time = heatCapacity / Math.abs(lambda.value);
  return lambda.value < 0
    ? { eFoldingTime: time, growthTime: null }
    : { eFoldingTime: null, growthTime: time };
}

function record<R extends { readonly name: string }, V>(
  list: readonly R[],
  value: (index: number, r: R) => V,
): Readonly<Record<string, V>> {
  return Object.freeze(Object.fromEntries(list.map((r, i) => [r.name, value(i, r)])));
}
