// A caution that travels with a result.

/** What a note is about; the list is closed. */
export type NoteCode =
  | "outside-range"
  | "outside-published"
  | "sampled-law"
  | "sampled-search"
  | "open-reservoir"
  | "search-stopped";

/** A caution: `info` can be ignored, `caution` weakens the number, `invalid` means that it should not be used. */
export interface Note {
  readonly code: NoteCode;
  readonly severity: "info" | "caution" | "invalid";
  /** What it concerns, such as `tanhAlbedo.temperature`. */
  readonly about: string;
  readonly value: number | null;
  readonly range: readonly [number, number] | null;
  readonly unit: string;
  readonly text: string;
  readonly source: string | null;
}

/** A note on a whole search, about no single number. */
export const searchNote = (about: string, code: NoteCode, severity: Note["severity"], text: string): Note =>
  Object.freeze({ code, severity, about, value: null, range: null, unit: "1", text, source: null });
