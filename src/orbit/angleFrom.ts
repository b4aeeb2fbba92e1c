// The angle between the directions of an ellipse: an arctangent made from our own sine and cosine.
import { cos, sin } from "../ground/elementary/cosSin.ts";

const QUARTER_TURN = 1.5707963267948966;

/** Lengths of the two legs of a right triangle, neither below 0 and not both 0. */
export interface Legs {
  readonly along: number;
  readonly across: number;
}

/**
 * The angle between 0 and π/2 whose tangent is across/along, rad, the same bits on every engine.
 *
 * A guess g within 0.0007 (a polynomial fitted to the arctangent), then what is left of the angle from its tangent
 * (t·cos g − sin g)/(cos g + t·sin g) by the arctangent's series, which leaves out less than 2·10⁻¹⁷. Error below 2 ulp,
 * measured against mpmath, not proved.
 */
export function angleFrom({ along, across }: Legs): number {
  if (across > along) return QUARTER_TURN - angleFrom({ along: across, across: along });
  const t = across / along;
  const guess = t * (0.995354 - t * t * (0.288679 - t * t * 0.079331));
  const [c, s] = [cos(guess), sin(guess)];
  const d = (t * c - s) / (c + t * s);
  return guess + d * (1 - (d * d) / 3);
}
