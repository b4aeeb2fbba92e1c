// What a paper prints of an energy budget, and what its numbers say together.
import type { Range } from "../ground/range.ts";
import type { Ledger } from "../states/state.ts";
import type { LedgerNote } from "./ledgerNote.ts";

/** The place of the planet's balance against space. */
export const TOP = "top";

/** A printed number, W m⁻², with its error apart from what printing rounded away. */
export interface PublishedValue {
  readonly value: number;
  /** Its error, the same on both sides. Instead of `range`. */
  readonly error?: number;
  /** Lowest and highest value, where the error has two sides. Instead of `error`. */
  readonly range?: Range;
  /** The unit of the last printed digit: 0.1 for 341.3. Half of it may be lost by rounding. */
  readonly lastDigit?: number;
}

/** A printed flow between two reservoirs. */
export interface PublishedFlow extends PublishedValue {
  readonly from: string;
  readonly to: string;
  /** The CF standard name, where there is one. */
  readonly standardName?: string;
}

/** A budget as it was published. */
export interface PublishedBudget {
  /** The paper. */
  readonly source: string;
  /** By name. `space` and `interior` are outside; all other reservoirs are balanced. */
  readonly flows: Readonly<Record<string, PublishedFlow>>;
  /** Heat taken up, as the paper states it: by reservoir, and under `top` for the whole planet. Never made from the flows. */
  readonly storage?: Readonly<Record<string, PublishedValue>>;
}

/** What the printed flows of one place leave over, W m⁻². */
export interface PublishedBalance {
  /** A reservoir, or `top` for the planet against space. */
  readonly place: string;
  /** Inflow − outflow; at the top, what space gives less what it gets. */
  readonly residual: number;
  /** Error of the residual below and above: independent errors in quadrature; `null` where no flow has one. */
  readonly error: Range | null;
  /** Flows without an error, so that `error` is too small. */
  readonly withoutError: readonly string[];
  /** The most that rounding of the printed flows can be in the residual; `null` where no flow says its last digit. */
  readonly rounding: number | null;
  /** The published storage; `null` where there is none. */
  readonly storage: number | null;
  readonly storageError: Range | null;
  /** Residual − storage; `null` where no storage was published. */
  readonly unexplained: number | null;
  /** Errors of residual and storage in quadrature. */
  readonly unexplainedError: Range | null;
}

/** A ledger of published flows, which need not close. */
export interface PublishedLedger extends Ledger {
  readonly source: string;
  readonly flows: readonly (Ledger["flows"][number] & {
    /** Below and above. */
    readonly error: Range | null;
    readonly lastDigit: number | null;
  })[];
  /** `top` first if any flow comes from space, then every reservoir but space and interior. */
  readonly balances: readonly PublishedBalance[];
  readonly notes: readonly LedgerNote[];
}
