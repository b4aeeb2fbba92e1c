// What must be said of a published balance: that it is open, or that its error is not known.
import { deepFreeze } from "../ground/deepFreeze.ts";
import type { LedgerNote } from "./ledgerNote.ts";
import type { PublishedBalance } from "./published.ts";

/** The notes of a balance. `rounding`: of flows and storage together. */
export function notesOf(balance: PublishedBalance, rounding: number, source: string): LedgerNote[] {
  const { place, withoutError, unexplainedError, error } = balance;
  const rest = { about: place, unit: "W m-2", source };
  const notes: LedgerNote[] = [];
  const left = balance.unexplained ?? balance.residual;
  const [below, above] = unexplainedError ?? error ?? [0, 0];
  // what is left is too much if it lies above 0 by more than its error below, and too little the other way
  const range = [0 - Math.max(above, rounding), Math.max(below, rounding)] as const;
  const isBounded = (unexplainedError ?? error) !== null || rounding > 0;
  if (isBounded && !(left >= range[0] && left <= range[1])) {
    const text =
      balance.unexplained === null
        ? "inflow and outflow differ by more than their errors and rounding allow, and no storage was published"
        : "inflow, outflow and the published storage disagree by more than their errors and rounding allow";
    notes.push({ code: "residual-beyond-error", severity: "caution", value: left, range, text, ...rest });
  }
  if (withoutError.length > 0) {
    const text = `no error is stated for ${withoutError.join(", ")}, so that the error of this residual is too small`;
    notes.push({ code: "error-not-stated", severity: "info", value: null, range: null, text, ...rest });
  }
  return notes.map(deepFreeze);
}
