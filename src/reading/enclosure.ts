// What is known of a node when it is enclosed.
import type { Range } from "../ground/range.ts";

/** 1: at least 0; −1: at most 0; 0: not known. */
export type Sign = 1 | -1 | 0;

/**
 * Bounds of a node as nodes of a second graph, the program that computes them.
 *
 * The node's true values lie in [lo − err, hi + err], taken exactly, and lo ≤ hi. A point has one program node as lo and
 * hi; an exact value has no err. Where lo or hi is NaN or infinite err is so too, so that every test `lo − err > 0` or
 * `hi + err < 0` fails closed; and no rounding can make such a test true, because a difference of doubles has the sign
 * of the exact difference.
 */
export interface Enclosure extends Ends {
  readonly err: number | undefined;
}

/** An enclosure but for its error. */
export interface Ends {
  readonly lo: number;
  readonly hi: number;
  /** Where lo and hi lie for all admitted inputs. */
  readonly within: Range;
}

/** The sign that lo and hi have for all admitted inputs. */
export const signOf = ({ within }: Ends): Sign => (within[0] >= 0 ? 1 : within[1] <= 0 ? -1 : 0);

/** All numbers of a sign. */
export const ofSign = (sign: number): Range => [sign > 0 ? 0 : -Infinity, sign < 0 ? 0 : Infinity];

export const isPoint = (x: Ends): boolean => x.lo === x.hi;
