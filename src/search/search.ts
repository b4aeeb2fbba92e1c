// A search under way, and what its parts share.
import { Bracket } from "./bracket.ts";
import type { Ends } from "./enclosed.ts";
import type { UndecidedStretch } from "./enumeration.ts";
import { mergeDoubts } from "./mergeDoubts.ts";
import { type Place, Reader } from "./reader.ts";
import { refineProved } from "./refineProved.ts";
import type { Stretch } from "./stretch.ts";
import { Zero } from "./zero.ts";

const known = /* @__PURE__ */ new WeakMap<Ends, Search>();

/** A function being searched: what is read and what is found, from left to right. Its parts are used again by later searches. */
export class Search {
  readonly reader: Reader;
  readonly doubts: Stretch[] = [];
  /** Places still to pass, from right to left. */
  readonly ahead: Place[] = [];
  from = NaN;
  to = NaN;
  /** A length over which the function changes little; sets how far boxes are halved. */
  fine = NaN;
  /** How many zeros there are; later ones in `zeros` are left over. */
  found = 0;
  readonly zeros: Zero[] = [];
  readonly #bracket: Bracket;

  private constructor(f: Ends) {
    this.reader = new Reader(f);
    this.#bracket = new Bracket(this.reader);
  }

  /** The search of a function, made once. */
  static of(f: Ends): Search {
    let search = known.get(f);
    if (!search) {
      search = new Search(f);
      known.set(f, search);
    }
    return search;
  }

  /** True if nothing is in doubt. */
  get decided(): boolean {
    return this.doubts.length === 0;
  }

  get undecided(): readonly UndecidedStretch[] {
    return mergeDoubts(this.doubts);
  }

  start(from: number, to: number, fine: number): void {
    this.from = from;
    this.to = to;
    this.fine = fine;
    this.found = 0;
    if (this.doubts.length > 0) this.doubts.length = 0;
    if (this.ahead.length > 0) this.ahead.length = 0;
    this.reader.boxes = 0;
    this.reader.points = 0;
  }

  /** Adds the zero between two places, if their proved signs differ; at most one is known to be there. */
  addZero(left: Place, right: Place): void {
    if (left.sign === right.sign) return;
    if (this.found === this.zeros.length) this.zeros.push(new Zero());
    refineProved(this.#bracket, left, right, this.zeros[this.found++] as Zero);
  }
}
