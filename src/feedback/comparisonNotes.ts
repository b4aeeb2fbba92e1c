// The cautions of a comparison with held couplings.
import type { Loop } from "../loop/types.ts";
import type { PathOutcome } from "../states/followPath.ts";
import { type FeedbackNote, type FeedbackNoteCode, feedbackNote } from "./feedbackNote.ts";

/** The notes for the outcomes, the first of them with nothing held; `lost`: how many do not arrive, undecided ones among them. */
export function comparisonNotes(loop: Loop, outcomes: readonly PathOutcome[], lost: number): FeedbackNote[] {
  const notes: FeedbackNote[] = [];
  if (loop.sampled) {
    const text = "a law is an ordinary function: branches are followed by sampling, and nothing is proved";
    notes.push(feedbackNote("sampled-law", "caution", { about: "compareHeld", text }));
  }
  const open = outcomes.filter(({ outcome }) => outcome === "undecided").length;
  const missing = (code: FeedbackNoteCode, count: number, what: string) => {
    const text = `${count} of ${outcomes.length} choices of held couplings ${what}, so there are no shares`;
    if (count > 0) notes.push(feedbackNote(code, "caution", { about: "shares", text, value: count }));
  };
  missing("branch-lost", lost - open, "lose their state on the way");
  missing("branch-undecided", open, "could not be followed with proof all the way");
  const [whole] = outcomes;
  if (whole?.outcome === "arrived" && whole.located.lambda > 0) {
    const text = "an unstable branch: no climate stays on it, though its temperature is well defined";
    const value = whole.located.lambda;
    notes.push(
      feedbackNote("unstable-branch", "caution", {
        about: "temperatureChange",
        text,
        value,
        unit: "W m-2 K-1",
      }),
    );
  }
  return notes;
}
