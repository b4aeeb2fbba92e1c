// The states of many planets as typed arrays.
import type { ErrorCode } from "../ground/errors.ts";

/** How sure the states of a row are, by the number in `status`. */
export const ROW_STATUS = ["proved", "partial", "sampled", "refused"] as const;

/** The states of all rows, in order of the rows and by rising temperature. */
export interface StateColumns {
  readonly rows: number;
  /** How many states each row has; in bytes unless one has more than 255. */
  readonly counts: Uint8Array | Uint32Array;
  /** Where each row's states begin in the arrays below; one more entry than rows. */
  readonly first: Uint32Array;
  /** K. */
  readonly temperatures: Float64Array;
  /** λ, W m⁻² K⁻¹. */
  readonly feedbackParameters: Float64Array;
  /** −1 stable, 1 unstable, 0 undecided. */
  readonly stability: Int8Array;
  /** Index into `ROW_STATUS` for each row. */
  readonly status: Uint8Array;
  /** Why rows are refused, or what is undecided in them. */
  readonly reasons: readonly {
    readonly row: number;
    readonly code: ErrorCode | "undecided";
    readonly text: string;
  }[];
}

/** A reason for a row that is refused or not wholly decided. */
type Reason = StateColumns["reasons"][number];

/** What is written down of a state; the sign of λ is its stability. */
export interface Found {
  readonly at: number;
  readonly slope: number;
  readonly slopeSign: number;
}

/** Collects the states of rows; its arrays double when they are full, so that a row costs no allocation. */
export class StateCollector {
  #counts: Uint8Array | Uint32Array;
  readonly #first: Uint32Array;
  readonly #status: Uint8Array;
  readonly #reasons: Reason[] = [];
  #temperatures: Float64Array;
  #lambdas: Float64Array;
  #stability: Int8Array;
  #size = 0;
  constructor(rows: number) {
    this.#counts = new Uint8Array(rows);
    this.#first = new Uint32Array(rows + 1);
    this.#status = new Uint8Array(rows);
    const capacity = 3 * rows + 8;
    this.#temperatures = new Float64Array(capacity);
    this.#lambdas = new Float64Array(capacity);
    this.#stability = new Int8Array(capacity);
  }

  /** Adds a row with the first `count` of the states found; rows come in order. */
  add(row: number, status: (typeof ROW_STATUS)[number], found: readonly Found[], count: number): void {
    while (this.#size + count > this.#temperatures.length) this.#grow();
    if (count > 255 && this.#counts instanceof Uint8Array) this.#counts = Uint32Array.from(this.#counts);
    this.#first[row] = this.#size;
    this.#counts[row] = count;
    this.#status[row] = ROW_STATUS.indexOf(status);
    for (let i = 0; i < count; i++) {
      const state = found[i] as Found;
      this.#temperatures[this.#size] = state.at;
      this.#lambdas[this.#size] = state.slope;
      this.#stability[this.#size] = state.slopeSign;
      this.#size++;
    }
    this.#first[row + 1] = this.#size;
  }

  /** Says why a row is refused or not wholly decided. */
  explain(reason: Reason): void {
    this.#reasons.push(Object.freeze(reason));
  }

  columns(): StateColumns {
    return Object.freeze({
      rows: this.#counts.length,
      counts: this.#counts,
      first: this.#first,
      temperatures: this.#temperatures.slice(0, this.#size),
      feedbackParameters: this.#lambdas.slice(0, this.#size),
      stability: this.#stability.slice(0, this.#size),
      status: this.#status,
      reasons: Object.freeze(this.#reasons),
    });
  }

  #grow(): void {
    const length = 2 * this.#temperatures.length;
    this.#temperatures = copied(new Float64Array(length), this.#temperatures);
    this.#lambdas = copied(new Float64Array(length), this.#lambdas);
    this.#stability = copied(new Int8Array(length), this.#stability);
  }
}

function copied<A extends Float64Array | Int8Array>(to: A, from: A): A {
  to.set(from);
  return to;
}
