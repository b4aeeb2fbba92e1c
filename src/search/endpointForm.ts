// Bounds between two places, from the values there and the slope between.

/** Well above the roundoff of the few operations below, relative to the terms they add. */
const SLACK = 2e-15;

/**
 * A lower bound of a function over a stretch of the given width: at its ends it is at least `left` and `right`, and its
 * slope lies in [fall, rise]. The two straight lines that fall from the ends as steeply as allowed meet at the bound
 * (the end-point, or linear boundary value, form). NaN where a bound is not a number.
 */
export function leastBetween(
  { left, right }: { left: number; right: number },
  { fall, rise }: { fall: number; rise: number },
  width: number,
): number {
  if (fall >= 0 && rise >= fall) return left;
  if (rise <= 0 && fall <= rise) return right;
  const span = rise - fall;
  const share = rise / span;
  const other = -fall / span;
  const drop = share * fall * width;
  const size = share * Math.abs(left) + other * Math.abs(right) - drop;
  return share * left + other * right + drop - SLACK * size - 1e-300;
}

/** The upper bound, in the same way. */
export function greatestBetween(
  { left, right }: { left: number; right: number },
  { fall, rise }: { fall: number; rise: number },
  width: number,
): number {
  return -leastBetween({ left: -left, right: -right }, { fall: -rise, rise: -fall }, width);
}
