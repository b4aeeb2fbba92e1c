// Reads enclosures into places and pieces, and counts the readings.
import { above, below, bounded, type Ends, type Sign } from "./enclosed.ts";

// Numbers go from array to array: passed to a function or returned, each would be an object to collect.

/** Bounds of a value and a slope, rounded outwards. */
export class Bounds {
  readonly bounds = new Float64Array(4).fill(NaN);
  sign: Sign = 0;
  slopeSign: Sign = 0;

  get low(): number {
    return this.bounds[0] as number;
  }
  get high(): number {
    return this.bounds[1] as number;
  }
  get slopeLow(): number {
    return this.bounds[2] as number;
  }
  get slopeHigh(): number {
    return this.bounds[3] as number;
  }
}

/** A number at which the function has been read. Reused: the search allocates none in its loop. */
export class Place extends Bounds {
  /** The reading itself, x first. */
  readonly end: Float64Array;

  constructor(size = 7) {
    super();
    this.end = new Float64Array(size);
  }

  get x(): number {
    return this.end[0] as number;
  }
  /** Where it is to be read next. */
  set x(x: number) {
    this.end[0] = x;
  }
}

/** What is known of the function over the box read last. */
export class Piece extends Bounds {
  /** The curvature. */
  readonly bends = new Float64Array(2);
  /** Sign of the curvature. */
  bend: Sign = 0;
  defined = false;
  continuous = false;
  /** True if the curvature is finite, as far as it has been read. */
  smooth = false;
}

const NONE = /* @__PURE__ */ new Float64Array(0);

/** A function being searched. */
export class Reader {
  readonly piece = new Piece();
  boxes = 0;
  points = 0;
  readonly #ends: Ends;
  readonly #out = new Float64Array(9);
  readonly #bend = this.#out.subarray(6);
  readonly #free: Place[] = [];
  /** The ends of the box whose curvature is still to be read. */
  #left: Float64Array = NONE;
  #right: Float64Array = NONE;

  constructor(ends: Ends) {
    this.#ends = ends;
  }

  get bendIsDear(): boolean {
    return this.#ends.bendIsDear === true;
  }

  /** A place to be filled by `read`; to be given back. */
  take(): Place {
    return this.#free.pop() ?? new Place(this.#ends.size);
  }

  give(place: Place): void {
    this.#free.push(place);
  }

  /** Reads value and slope at x. */
  read(x: number, into: Place): Place {
    into.x = x;
    return this.readAt(into);
  }

  /** Reads value and slope where the place is. */
  readAt(place: Place): Place {
    const { end, bounds } = place;
    this.points++;
    this.#ends.point(end);
    place.sign = widen(end, this.#ends.at, bounds, 0);
    place.slopeSign = widen(end, this.#ends.at + 3, bounds, 2);
    return place;
  }

  /** Reads value and slope over the box between two places, into a piece of its own if one is given. */
  between(left: Place, right: Place, piece = this.piece): Piece {
    this.#ends.box(left.end, right.end, this.#out);
    this.#fill(piece);
    if (piece === this.piece) {
      this.#left = left.end;
      this.#right = right.end;
    }
    return piece;
  }

  /** Reads also the curvature over the box read last; its places must still be as they were. */
  bend(): Piece {
    if (this.#left.length > 0) {
      this.#ends.bend(this.#left, this.#right, this.#bend);
      this.#fillBend();
    }
    return this.piece;
  }

  #fill(piece: Piece): void {
    const { bounds } = piece;
    this.boxes++;
    piece.sign = widen(this.#out, 0, bounds, 0);
    const slopeSign = widen(this.#out, 3, bounds, 2);
    piece.defined = bounded(bounds[0] as number, bounds[1] as number);
    piece.continuous = piece.defined && bounded(bounds[2] as number, bounds[3] as number);
    piece.slopeSign = piece.continuous ? slopeSign : 0;
    piece.smooth = false;
    piece.bend = 0;
  }

  #fillBend(): void {
    const { piece } = this;
    const { bends } = piece;
    const bend = widen(this.#bend, 0, bends, 0);
    piece.smooth = piece.continuous && bounded(bends[0] as number, bends[1] as number);
    piece.bend = piece.smooth ? bend : 0;
    this.#left = NONE;
  }
}

/** Writes bounds of [lo − err, hi + err], three numbers from place i on, to places j and j + 1; returns their sign. */
function widen(from: Float64Array, i: number, to: Float64Array, j: number): Sign {
  const err = from[i + 2] as number;
  const low = (from[i] as number) - err;
  const high = (from[i + 1] as number) + err;
  to[j] = below(low);
  to[j + 1] = above(high);
  // a difference of doubles has the sign of the exact difference, so the signs need no rounding
  if (!bounded(low, high)) return 0;
  return low > 0 ? 1 : high < 0 ? -1 : 0;
}
