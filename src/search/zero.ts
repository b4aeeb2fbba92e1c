// A zero as the search writes it down.
import type { Sign } from "./enclosed.ts";
import type { ProvedZero } from "./enumeration.ts";

/** A zero that is being closed in, or was; reused by later searches. */
export class Zero {
  at = NaN;
  low = NaN;
  high = NaN;
  size = NaN;
  slope = NaN;
  slopeLow = NaN;
  slopeHigh = NaN;
  direction: 1 | -1 = 1;

  /** The proved sign of the slope over the bracket. */
  get slopeSign(): Sign {
    return this.slopeLow > 0 ? 1 : this.slopeHigh < 0 ? -1 : 0;
  }

  /** The same for good. */
  get proved(): ProvedZero {
    const { at, slopeSign, direction, size, slope } = this;
    const bracket = [this.low, this.high] as const;
    return { at, bracket, slopeSign, direction, size, slope, slopes: [this.slopeLow, this.slopeHigh] };
  }
}
