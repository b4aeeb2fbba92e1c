// Cautions that travel with a published ledger.
import type { Note } from "../states/note.ts";

/** What such a note is about; the list is closed. */
export type LedgerNoteCode = "residual-beyond-error" | "error-not-stated";

/** A caution like those of states, about the balance of one place. */
export interface LedgerNote extends Omit<Note, "code"> {
  readonly code: LedgerNoteCode;
}
