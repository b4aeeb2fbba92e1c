// In which direction λ leaps through zero at kinks that lie too close to each other to be told apart.
import type { Range } from "../ground/range.ts";
import type { Sign } from "../search/enclosed.ts";
import { signOfRange } from "../search/interval.ts";
import type { KinkSides } from "./kinkSides.ts";

/** So many kinks may lie together. */
const MOST_TOGETHER = 3;

/** The only place of a kink in its bracket, and whether its difference rises there. */
export interface KinkPlace {
  readonly kink: number;
  readonly bracket: Range;
  readonly direction: 1 | -1;
}

/** Kinks whose brackets touch, and the range that holds them. */
export interface Together {
  readonly bracket: Range;
  readonly places: readonly KinkPlace[];
}

/** Kinks by rising temperature; those whose brackets touch are together. */
export function together(places: readonly KinkPlace[]): Together[] {
  const groups: Together[] = [];
  for (const place of [...places].sort((a, b) => a.bracket[0] - b.bracket[0])) {
    const last = groups.at(-1);
    if (last && place.bracket[0] <= last.bracket[1]) {
      const bracket: Range = [last.bracket[0], Math.max(last.bracket[1], place.bracket[1])];
      groups[groups.length - 1] = { bracket, places: [...last.places, place] };
    } else groups.push({ bracket: place.bracket, places: [place] });
  }
  return groups;
}

/**
 * In which direction λ leaps through zero where some kinks lie together; 0: it keeps its sign; undefined: not proved. Whichever
 * of them comes first, λ goes from that left of all to that right of all, through those between some. Each of these is read
 * all over the bracket, and has one sign there; so λ leaps once if none goes back.
 */
export function leapAt(sides: KinkSides, { bracket, places }: Together, parameters: Range): Sign | undefined {
  const isOnce = new Set(places.map(({ kink }) => kink)).size === places.length;
  if (places.length > MOST_TOGETHER || !isOnce) return undefined;
  const all = (1 << places.length) - 1;
  const signs = Array.from({ length: all + 1 }, (_, passed) => {
    // on the left of a kink whose difference rises the first argument is the lesser one
    const chosen = places.map(({ kink, direction }, i) => {
      const isRight = (passed & (1 << i)) !== 0;
      return { kink, less: direction > 0 !== isRight };
    });
    const value = sides.on(chosen)?.(bracket, parameters).value;
    return value ? signOfRange(value) : 0;
  });
  const [left, right] = [signs[0] as Sign, signs[all] as Sign];
  if (signs.includes(0)) return undefined;
  if (left === right) return signs.every((sign) => sign === left) ? 0 : undefined;
  const goesBack = signs.some((sign, passed) =>
    places.some((_, i) => sign === right && signs[passed | (1 << i)] === left),
  );
  return goesBack ? undefined : (right as 1 | -1);
}
