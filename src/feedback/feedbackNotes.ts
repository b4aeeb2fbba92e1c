// The cautions of an analysis of feedbacks: why something is null, and what the numbers are not.
import type { Loop } from "../loop/types.ts";
import { type FeedbackNote, feedbackNote } from "./feedbackNote.ts";
import type { Bounded } from "./influences.ts";

const UNIT = "W m-2 K-1";

/** The notes of an analysis. `count`: how many feedback loops there are; `listed`: how many are listed one by one. */
export function notesOf(
  loop: Loop,
  {
    reference,
    total,
    isKnown,
    count,
    listed,
  }: { reference: Bounded; total: Bounded; isKnown: boolean; count: number; listed: number },
): FeedbackNote[] {
  const notes: FeedbackNote[] = [];
  if (loop.sampled) {
    const text = "a law is an ordinary function: its slopes are difference quotients, and nothing is proved";
    notes.push(feedbackNote("sampled-law", "caution", { about: "feedbackParameter", text }));
  }
  if (!isKnown) {
    const text =
      "λ cannot be told from 0, so nothing is divided by it: times, sensitivities and gain are null";
    const about = "feedbackParameter";
    notes.push(feedbackNote("stability-unknown", "caution", { about, text, value: total.value, unit: UNIT }));
  }
  if (!(reference.value < 0)) {
    const text =
      "the reference response does not restore, so that feedback factors and a gain have no meaning";
    const about = "reference";
    const { value } = reference;
    notes.push(feedbackNote("no-feedback-factors", "caution", { about, text, value, unit: UNIT }));
  } else if (isKnown && total.value > 0) {
    const text =
      "the feedbacks outweigh the reference response (Σ f ≥ 1), so there is no gain; dT/dp still holds along this unstable branch";
    notes.push(
      feedbackNote("no-gain", "caution", { about: "gain", text, value: 1 - total.value / reference.value }),
    );
  }
  if (count > listed) {
    const text = `${listed} of ${count} feedback loops are listed, the strongest; the rest is summed in others`;
    notes.push(feedbackNote("loops-summed", "info", { about: "others", text, value: count }));
  }
  return notes;
}
