// The cautions of an analysis of feedbacks: why something is null, and what the numbers are not.
import type { Loop } from "../loop/types.ts";
import type { Note } from "../states/note.ts";
import type { Bounded } from "./bounds.ts";
import { type FeedbackNote, feedbackNote, outsideRange } from "./feedbackNote.ts";
import type { KnownSign } from "./signs.ts";

const UNIT = "W m-2 K-1";

/** What an analysis found that may need a caution. */
export interface Found {
  readonly total: Bounded;
  readonly sign: KnownSign;
  readonly reference: Bounded;
  readonly referenceSign: KnownSign;
  /** What the laws refuse at the state, and a heat capacity below 0. */
  readonly refused: readonly Note[];
  /** The feedback loops without which λ has no known sign. */
  readonly undecided: readonly (readonly string[])[];
  /** How many feedback loops there are, and how many are listed one by one. */
  readonly count: number;
  readonly listed: number;
  /** Whether slopes are assessed ones. */
  readonly assessed: boolean;
}

/** The notes of an analysis. */
export function notesOf(loop: Loop, found: Found): FeedbackNote[] {
  const { total, sign, reference, referenceSign, refused, undecided, count, listed, assessed } = found;
  const notes: FeedbackNote[] = [];
  const caution = (code: FeedbackNote["code"], about: string, text: string, value: number, unit: string) =>
    notes.push(feedbackNote(code, "caution", { about, text, value, unit }));
  const why = loop.sampled
    ? "is no larger than the rounding of difference quotients"
    : "has no sign that its bounds prove";
  if (loop.sampled) {
    const text =
      "a law is an ordinary function: its slopes are difference quotients, there are no bounds, and nothing is proved";
    notes.push(feedbackNote("sampled-law", "caution", { about: "feedbackParameter", text }));
  }
  if (sign === 0) {
    const text = `λ ${why}, so nothing is divided by it: times, sensitivities and gain are null`;
    caution("stability-unknown", "feedbackParameter", text, total.value, UNIT);
  }
  if (referenceSign >= 0) {
    const what = referenceSign > 0 || reference.value === 0 ? "does not restore" : why;
    const text = `the reference response ${what}, so that feedback factors and a gain have no meaning`;
    caution("no-feedback-factors", "reference", text, reference.value, UNIT);
  } else if (sign > 0) {
    const text =
      "the feedbacks outweigh the reference response (Σ f ≥ 1), so there is no gain; dT/dp still holds along this unstable branch";
    caution("no-gain", "gain", text, 1 - total.value / reference.value, "1");
  }
  if (sign > 0 && referenceSign >= 0) {
    const text = "an unstable branch: no climate stays on it, though dT/dp still holds along it";
    caution("unstable-branch", "feedbackParameter", text, total.value, UNIT);
  }
  for (const through of undecided) {
    const text = `without this feedback loop λ ${why}, so its times are null`;
    const about = `without ${through.join(" → ")}`;
    notes.push(feedbackNote("stability-unknown", "caution", { about, text }));
  }
  for (const note of refused) notes.push(outsideRange(note, ""));
  if (assessed) {
    const text =
      "best estimates of an assessment: the bounds here are those of the arithmetic, not the ranges that were assessed";
    notes.push(feedbackNote("assessed-feedbacks", "caution", { about: "feedbackParameterRange", text }));
  }
  if (count > listed) {
    const text = `${listed} of ${count} feedback loops are listed, the strongest; the rest is summed in others`;
    notes.push(feedbackNote("loops-summed", "info", { about: "others", text, value: count }));
  }
  return notes;
}
