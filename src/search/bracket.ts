// Two places with proved, opposite signs.
import type { Place, Reader } from "./reader.ts";

/** Shrinks as places with proved signs are read inside it. Made once for a function, and used again and again. */
export class Bracket {
  readonly reader: Reader;
  low: Place;
  high: Place;
  /** The place read last, unless its sign moved an end there. */
  trial: Place;
  /** Places of its own; the ends that it starts from belong to others. */
  readonly #own: readonly [Place, Place, Place];
  #used = 0;

  constructor(reader: Reader) {
    this.reader = reader;
    this.#own = [reader.take(), reader.take(), reader.take()];
    [this.low, this.high, this.trial] = this.#own;
  }

  start(low: Place, high: Place): void {
    this.low = low;
    this.high = high;
    this.#used = 0;
    this.trial = this.#own[0];
  }

  /** Whether the trial lies inside. */
  holdsTrial(): boolean {
    return this.trial.x > this.low.x && this.trial.x < this.high.x;
  }

  /** Reads at the trial, inside; where the sign is proved, the end with that sign moves there. Returns the place read. */
  readTrial(): Place {
    const place = this.reader.readAt(this.trial);
    if (place.sign === 0) return place;
    const below = place.sign === this.low.sign;
    const replaced = below ? this.low : this.high;
    if (below) this.low = place;
    else this.high = place;
    const mine = replaced === this.#own[0] || replaced === this.#own[1] || replaced === this.#own[2];
    this.trial = mine ? replaced : (this.#own[++this.#used] as Place);
    return place;
  }
}
