// Cautions that travel with what is said of feedbacks.
import type { Note } from "../states/note.ts";

/** What such a note is about; the list is closed. */
export type FeedbackNoteCode =
  | "sampled-law"
  | "outside-range"
  | "no-feedback-factors"
  | "no-gain"
  | "stability-unknown"
  | "loops-summed"
  | "unstable-branch"
  | "branch-lost"
  | "branch-undecided"
  | "no-regulation"
  | "assessed-feedbacks"
  | "assessed-sensitivity";

/** A caution like those of states: `info` can be ignored, `caution` weakens the numbers or explains a `null`. */
export interface FeedbackNote extends Omit<Note, "code"> {
  readonly code: FeedbackNoteCode;
}

/** A note without a range, about one thing. */
export const feedbackNote = (
  code: FeedbackNoteCode,
  severity: Note["severity"],
  { about, text, value = null, unit = "1", source = null }: Pick<Note, "about" | "text"> & Partial<Note>,
): FeedbackNote => Object.freeze({ code, severity, about, value, range: null, unit, text, source });

/** What the note of a state says of the range of a law; `where`: in front of what it is about. */
export const outsideRange = (note: Note, where: string): FeedbackNote =>
  Object.freeze({ ...note, code: "outside-range", about: `${where}${note.about}` });
