// Makes the analysis of a state's feedbacks from the influences that were read.
import { compensatedSum } from "../ground/sum.ts";
import type { Taken } from "../loop/checkBelongs.ts";
import type { Loop } from "../loop/types.ts";
import { type Bounded, difference, exactly, negative, numberOf, quotient, rangeOf } from "./bounds.ts";
import { disturbanceTimes } from "./disturbanceTimes.ts";
import { notesOf } from "./feedbackNotes.ts";
import type { FeedbackLoop, FeedbackPart, Feedbacks } from "./feedbacks.ts";
import type { Influences } from "./influences.ts";
import type { ReferenceName } from "./referenceResponse.ts";
import { effectOf, signReader } from "./signs.ts";
import { strongestPaths } from "./strongestPaths.ts";

/** More feedback loops than this are not listed one by one. */
const MOST_LOOPS = 64;

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
  const reference = edges.find(isDirect) ?? (loop.sampled ? { value: 0, bounds: null } : exactly(0));
  const paths = strongestPaths(
    edges.filter((e) => !isDirect(e)),
    end,
    MOST_LOOPS,
  );
  const size = paths.strongest.reduce((sum, p) => sum + Math.abs(p.value), Math.abs(reference.value));
  const signOf = signReader(loop.sampled, size);
  const [sign, referenceSign] = [signOf(total), signOf(reference)];
  const isPlanck = name.kind === "Planck response";
  const partOf = partWriter(referenceSign < 0 ? negative(reference) : null);
  const undecided: (readonly string[])[] = [];
  const loops = paths.strongest.map((path): FeedbackLoop<N> => {
    const through = Object.freeze(path.through.map((place) => chosen[place - 1] as string));
    const without = difference(total, path);
    const signWithout = signOf(without);
    if (signWithout === 0) undecided.push(through);
    return Object.freeze({
      through: through as never,
      ...partOf(path),
      effect: effectOf(path, signOf(path)),
      without: Object.freeze({
        feedbackParameter: 0 + without.value,
        feedbackParameterRange: rangeOf(without),
        ...disturbanceTimes(without, heatCapacity, signWithout),
      }),
    });
  });
  const others = othersOf(total, [reference, ...paths.strongest], paths.count - loops.length, partOf);
  const parts = [reference.value, ...loops.map((l) => l.feedbackParameter), others?.feedbackParameter ?? 0];
  const factor = referenceSign < 0 ? difference(exactly(1), quotient(total, reference)) : null;
  const gain = referenceSign < 0 && sign < 0 ? quotient(reference, total) : null;
  const restoring = sign === 0 ? null : negative(total);
  const sensitivity = restoring && quotient(exactly(1), restoring);
  const givens = at.values.subarray(loop.variables.length);
  return Object.freeze({
    temperature: at.values[0] as number,
    givens: record(loop.givens, (i) => givens[i] as number) as Feedbacks<N>["givens"],
    through: Object.freeze([...chosen]) as never,
    feedbackParameter: 0 + total.value,
    feedbackParameterRange: rangeOf(total),
    settledFeedbackParameter: 0 + total.value,
    reference: Object.freeze({
      kind: referenceSign < 0 ? name.kind : "reference response",
      feedbackParameter: 0 + reference.value,
      feedbackParameterRange: rangeOf(reference),
      text: isPlanck && referenceSign >= 0 ? `${name.text}; not known to restore` : name.text,
      contains: Object.freeze([...name.contains]) as never,
    }),
    loops: Object.freeze(loops),
    others,
    residual: compensatedSum([...parts, -total.value]),
    feedbackFactor: numberOf(factor),
    feedbackFactorRange: rangeOf(factor),
    gain: numberOf(gain),
    gainRange: rangeOf(gain),
    sensitivity: numberOf(sensitivity),
    sensitivityRange: rangeOf(sensitivity),
    responses: record(loop.givens, (i, { unit }) => {
      const flux = influences.givens[i] as Bounded;
      const temperature = restoring && quotient(flux, restoring);
      return Object.freeze({
        flux: 0 + flux.value,
        fluxRange: rangeOf(flux),
        temperature: numberOf(temperature),
        temperatureRange: rangeOf(temperature),
        unit,
      });
    }) as Feedbacks<N>["responses"],
    ...disturbanceTimes(total, heatCapacity, sign),
    proved: sign !== 0 && !loop.sampled,
    notes: Object.freeze(
      notesOf(loop, {
        ...{ total, sign, reference, referenceSign, refused: influences.refused },
        undecided,
        count: paths.count,
        listed: loops.length,
        assessed: name.assessed,
      }),
    ),
  });
}

/** Writes the fields that every part of λ has; `under`: −λ₀, where there are factors. */
const partWriter =
  (under: Bounded | null) =>
  (part: Bounded): FeedbackPart => {
    const factor = under && quotient(part, under);
    return {
      feedbackParameter: 0 + part.value,
      feedbackParameterRange: rangeOf(part),
      feedbackFactor: numberOf(factor),
      feedbackFactorRange: rangeOf(factor),
    };
  };

function othersOf(
  total: Bounded,
  listed: readonly Bounded[],
  count: number,
  partOf: (part: Bounded) => FeedbackPart,
): Feedbacks["others"] {
  if (count <= 0) return null;
  const value = compensatedSum([total.value, ...listed.map((p) => -p.value)]);
  const { bounds } = listed.reduce(difference, total);
  return Object.freeze({ count, ...partOf({ value, bounds }) });
}

function record<R extends { readonly name: string }, V>(
  list: readonly R[],
  value: (index: number, r: R) => V,
): Readonly<Record<string, V>> {
  const made: Record<string, V> = {};
  for (let i = 0; i < list.length; i++) made[(list[i] as R).name] = value(i, list[i] as R);
  return Object.freeze(made);
}
