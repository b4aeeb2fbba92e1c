// Two places with proved, opposite signs.
import type { Sign } from "./enclosed.ts";
import type { Place, Reader } from "./reader.ts";

/** Shrinks as places with proved signs are read inside it. */
export class Bracket {
  low: Place;
  high: Place;
  /** The place read last, unless its sign moved an end there. */
  trial: Place;
  readonly below: Sign;
  readonly #reader: Reader;
  readonly #ends: readonly [Place, Place];

  constructor(reader: Reader, low: Place, high: Place) {
    this.#reader = reader;
    this.#ends = [low, high];
    this.low = low;
    this.high = high;
    this.below = low.sign;
    this.trial = reader.take();
  }

  holds(x: number): boolean {
    return x > this.low.x && x < this.high.x;
  }

  middle(): number {
    return this.low.x + (this.high.x - this.low.x) / 2;
  }

  /** Reads at x, inside; where the sign is proved, the end with that sign moves to x. Returns the sign. */
  read(x: number): Sign {
    const place = this.#reader.read(x, this.trial);
    if (place.sign === 0) return 0;
    const below = place.sign === this.below;
    const replaced = below ? this.low : this.high;
    if (below) this.low = place;
    else this.high = place;
    this.trial = this.#ends.includes(replaced) ? this.#reader.take() : replaced;
    return place.sign;
  }

  close(): void {
    for (const place of [this.trial, this.low, this.high])
      if (!this.#ends.includes(place)) this.#reader.give(place);
  }
}
