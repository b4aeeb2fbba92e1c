// The cautions of a comparison with held couplings.
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import type { PathOutcome } from "../states/followPath.ts";
import type { Note } from "../states/note.ts";
import { type FeedbackNote, type FeedbackNoteCode, feedbackNote, outsideRange } from "./feedbackNote.ts";

/** What a comparison found that may need a caution. */
export interface Compared {
  /** The first with nothing held, the last with everything. */
  readonly outcomes: readonly PathOutcome[];
  readonly regulation: number | null;
  /** Whether the state before lies on an unstable branch. */
  readonly isUnstable: boolean;
  readonly within: Range;
  /** The state after the change, where it arrives. */
  readonly to: { readonly notes: readonly Note[] } | null;
}

/** The notes of a comparison. */
export function comparisonNotes(loop: Loop, compared: Compared): FeedbackNote[] {
  const { outcomes, regulation, isUnstable, within, to } = compared;
  const notes: FeedbackNote[] = [];
  if (loop.sampled) {
    const text = "a law is an ordinary function: branches are followed by sampling, and nothing is proved";
    notes.push(feedbackNote("sampled-law", "caution", { about: "compareHeld", text }));
  }
  const [whole, last] = [outcomes[0] as PathOutcome, outcomes.at(-1) as PathOutcome];
  const bothArrive = whole.outcome === "arrived" && last.outcome === "arrived";
  const nothing = bothArrive ? "no shares" : "no shares and no regulation";
  const missing = (code: FeedbackNoteCode, outcome: PathOutcome["outcome"], what: string) => {
    const count = outcomes.filter((o) => o.outcome === outcome).length;
    const text = `${count} of ${outcomes.length} choices of held couplings ${what}, so there are ${nothing}`;
    if (count > 0) notes.push(feedbackNote(code, "caution", { about: "shares", text, value: count }));
  };
  missing("branch-lost", "lost", "lose their state on the way");
  missing("branch-lost", "left", `leave the range of ${within.join(" to ")} K`);
  missing("branch-lost", "no-response", "leave nothing that answers to temperature");
  missing("branch-undecided", "undecided", "could not be followed with proof all the way");
  if (bothArrive && regulation === null) {
    const text = "ΔT with everything held is not told from 0, so there is no regulation";
    notes.push(feedbackNote("no-regulation", "caution", { about: "regulation", text }));
  }
  if (isUnstable) {
    const text = "an unstable branch: no climate stays on it, though its temperature is well defined";
    const about = "temperatureChange";
    const lambda = whole.outcome === "arrived" ? { value: whole.located.lambda, unit: "W m-2 K-1" } : {};
    notes.push(feedbackNote("unstable-branch", "caution", { about, text, ...lambda }));
  }
  for (const note of to?.notes ?? []) if (note.severity === "invalid") notes.push(outsideRange(note, "to: "));
  return notes;
}
