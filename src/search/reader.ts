// Reads enclosures into places and pieces, and counts the readings.
import { above, below, bounded, type Enclosed, type Sign, signOf } from "./enclosed.ts";

/** A number at which the function has been read. Reused: the search allocates none in its loop. */
export class Place {
  x = Number.NaN;
  low = Number.NaN;
  high = Number.NaN;
  slopeLow = Number.NaN;
  slopeHigh = Number.NaN;
  sign: Sign = 0;
  slopeSign: Sign = 0;
}

/** What is known of the function over the box read last. */
export class Piece {
  low = Number.NaN;
  high = Number.NaN;
  slopeLow = Number.NaN;
  slopeHigh = Number.NaN;
  sign: Sign = 0;
  slopeSign: Sign = 0;
  /** Sign of the curvature. */
  bend: Sign = 0;
  defined = false;
  continuous = false;
  smooth = false;
}

const known = /* @__PURE__ */ new WeakMap<Enclosed, Reader>();

/** A function being searched. */
export class Reader {
  readonly piece = new Piece();
  boxes = 0;
  points = 0;
  readonly #f: Enclosed;
  readonly #out = new Float64Array(9);
  readonly #free: Place[] = [];

  constructor(f: Enclosed) {
    this.#f = f;
  }

  /** The reader of a function, with its counts at 0: made once, so that searching a function again allocates no places. */
  static of(f: Enclosed): Reader {
    const reader = known.get(f) ?? new Reader(f);
    known.set(f, reader);
    reader.boxes = 0;
    reader.points = 0;
    return reader;
  }

  /** A place to be filled by `read`; to be given back. */
  take(): Place {
    return this.#free.pop() ?? new Place();
  }

  give(place: Place): void {
    this.#free.push(place);
  }

  /** Reads value and slope at x. */
  read(x: number, into: Place): Place {
    const out = this.#out;
    this.points++;
    this.#f.point(x, out);
    const [lo, hi, err] = [out[0] as number, out[1] as number, out[2] as number];
    const [slopeLo, slopeHi, slopeErr] = [out[3] as number, out[4] as number, out[5] as number];
    into.x = x;
    into.low = below(lo - err);
    into.high = above(hi + err);
    into.slopeLow = below(slopeLo - slopeErr);
    into.slopeHigh = above(slopeHi + slopeErr);
    into.sign = signOf(lo, hi, err);
    into.slopeSign = signOf(slopeLo, slopeHi, slopeErr);
    return into;
  }

  /** Reads a box into `piece`. */
  box(a: number, b: number): Piece {
    const { piece } = this;
    const out = this.#out;
    this.boxes++;
    this.#f.box(a, b, out);
    const [lo, hi, err] = [out[0] as number, out[1] as number, out[2] as number];
    const [slopeLo, slopeHi, slopeErr] = [out[3] as number, out[4] as number, out[5] as number];
    const [bendLo, bendHi, bendErr] = [out[6] as number, out[7] as number, out[8] as number];
    piece.low = below(lo - err);
    piece.high = above(hi + err);
    piece.slopeLow = below(slopeLo - slopeErr);
    piece.slopeHigh = above(slopeHi + slopeErr);
    piece.sign = signOf(lo, hi, err);
    piece.defined = bounded(piece.low, piece.high);
    piece.continuous = piece.defined && bounded(piece.slopeLow, piece.slopeHigh);
    piece.smooth = piece.continuous && bounded(bendLo - bendErr, bendHi + bendErr);
    piece.slopeSign = piece.continuous ? signOf(slopeLo, slopeHi, slopeErr) : 0;
    piece.bend = piece.smooth ? signOf(bendLo, bendHi, bendErr) : 0;
    return piece;
  }
}
