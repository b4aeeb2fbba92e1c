// Writes the arithmetic of enclosures as steps of a scalar program.
import type { Range } from "../ground/range.ts";
import { type Enclosure, type Ends, isPoint, signOf } from "./enclosure.ts";
import { ScalarProgram } from "./scalarProgram.ts";

/** Above 2^-53 = 1.11e-16: + − × ÷ √ are wrong by at most this part of their result. Rounding the product is covered. */
const HALF_ULP = 1.2e-16;
/** Above 2^-52 = 2.22e-16: our exp, log and tanh are wrong by less than an ulp, at most this part of their result. */
const ULP = 2.5e-16;
/** 1 + 2^-43: fewer than 1024 roundings, each at most 2^-53, take less than this from an error. */
const SLACK = 1.0000000000001137;
/** Two errors with as many stay below that number when they are multiplied. */
const MOST_ROUNDINGS = 500;
/** Far above what underflow can take from a result and from the terms of its error, 2^-1075 = 2.5e-324 each. */
const TINY = 1e-300;

type Bound = number | undefined;

/** The steps from which rules are made. Equal steps are one, so that the two bounds of a point cost nothing twice. */
export class EnclosureWriter extends ScalarProgram {
  readonly #constants = new Map<number, number>();
  /** The register of a constant, known by its node. */
  constant(node: number, value: number): number {
    let id = this.#constants.get(node);
    if (id === undefined) {
      id = this.datum(value);
      this.#constants.set(node, id);
    }
    return id;
  }

  neg(a: number): number {
    return this.step("neg", a);
  }
  add(a: number, b: number): number {
    return this.step("add", a, b);
  }
  sub(a: number, b: number): number {
    return this.step("sub", a, b);
  }
  mul(a: number, b: number): number {
    return this.step("mul", a, b);
  }
  /** c where a < b, else d (so also where one is NaN). */
  pick(a: number, b: number, c: number, d: number): number {
    if (c === d) return c;
    return this.#rounded(this.choose(a, b, c, d), Math.max(this.#roundings(c), this.#roundings(d)));
  }
  least(a: number, b: number): number {
    return this.pick(a, b, a, b);
  }
  greatest(a: number, b: number): number {
    return this.pick(b, a, a, b);
  }
  /** An error where a < b, else NaN. */
  provided(a: number, b: number, error: Bound): number {
    return this.pick(a, b, error ?? this.literal(0), this.literal(NaN));
  }

  // Arithmetic of errors, of which an absent one is zero. Nothing in it is negative, so its own roundings add up to a share of
  // the result; they are counted, and made good where an error is compared, or handed out.

  readonly #counts: number[] = [];
  #roundings(id: number): number {
    return this.#counts[id] ?? 0;
  }
  #rounded(id: number, count: number): number {
    if (count > MOST_ROUNDINGS) return this.mul(id, this.literal(SLACK));
    if (count > this.#roundings(id)) this.#counts[id] = count;
    return id;
  }

  sum(a: Bound, b: Bound): Bound {
    if (a === undefined || b === undefined) return a ?? b;
    return this.#rounded(this.add(a, b), 1 + Math.max(this.#roundings(a), this.#roundings(b)));
  }
  times(a: Bound, b: Bound): Bound {
    if (a === undefined || b === undefined) return undefined;
    return this.#rounded(this.mul(a, b), 1 + this.#roundings(a) + this.#roundings(b));
  }
  /** By a reciprocal, which several errors may share; a subnormal one is rounded like four. */
  over(a: Bound, b: number): Bound {
    if (a === undefined) return a;
    const inverse = this.step("div", this.literal(1), b);
    return this.times(a, this.#rounded(inverse, 4 + this.#roundings(b)));
  }
  /** What is certainly left. */
  less(a: number, b: Bound): number {
    return b === undefined ? a : this.#rounded(this.sub(a, this.widened(b) as number), 1);
  }
  /** An error with the roundings of its own arithmetic. */
  widened(a: Bound): Bound {
    return a === undefined || this.#roundings(a) === 0 ? a : this.mul(a, this.literal(SLACK));
  }

  /** An upper bound of the size of lo and hi. */
  size(x: Ends): number {
    const sign = signOf(x);
    if (sign) return sign > 0 ? x.hi : this.neg(x.lo);
    const low = this.step("abs", x.lo);
    return isPoint(x) ? low : (this.sum(low, this.step("abs", x.hi)) as number);
  }

  /** The result of an operation with its own rounding, `unit` of its size. */
  rounded(lo: number, hi: number, err: Bound, within: Range, unit = HALF_ULP): Enclosure {
    const sum = this.roundedSum(lo, hi, err, within, unit).err;
    return { lo, hi, err: this.sum(sum, this.literal(TINY)), within };
  }

  /** The same of sums and differences, which are exact wherever underflow could come in. */
  roundedSum(lo: number, hi: number, err: Bound, within: Range, unit = HALF_ULP): Enclosure {
    const own = this.times(this.literal(unit), this.size({ lo, hi, within }));
    return { lo, hi, err: this.sum(err, own), within };
  }

  /** A value of our own functions. They need not keep the order of two arguments, so it is restored. */
  approximate(
    op: "exp" | "log" | "tanh",
    a: Enclosure,
    within: Range,
    error: (value: Ends, err: Bound) => Bound,
  ): Enclosure {
    const first = this.step(op, a.lo);
    const second = this.step(op, a.hi);
    const lo = this.least(first, second);
    const hi = this.greatest(first, second);
    return this.rounded(lo, hi, error({ lo, hi, within }, a.err), within, ULP);
  }
}
