// Cuts the range before the search starts.
import type { Place, Reader } from "./reader.ts";
import { roundoffAt } from "./roundoff.ts";

/** A kink is cut out with this many units in the last place on each side: its place is itself rounded. */
const KINK_UNITS = 8;

/**
 * The places between which the search starts, by rising x: both ends of the range and both sides of each kink. Where the
 * sign at such a place is not proved, the nearest place (from one unit in the last place, three times as far each time)
 * where it is follows the end, or takes the place of the kink's side; so a zero on an end or a kink stays in a small box.
 */
export function startPlaces(
  reader: Reader,
  [from, to]: readonly [number, number],
  { cuts, fine }: { cuts: readonly number[]; fine: number },
): Place[] {
  const places: Place[] = [reader.read(from, reader.take())];
  const end = reader.read(to, reader.take());
  const add = (place: Place): void => {
    if (place.x > (places.at(-1) as Place).x && place.x < end.x) places.push(place);
    else reader.give(place);
  };
  const reach = Math.min(fine, (to - from) / 4);
  const aside = (x: number, gap: number, side: 1 | -1): Place => {
    const place = reader.take();
    for (let g = gap; g < reach; g *= 3) if (reader.read(x + side * g, place).sign !== 0) return place;
    return reader.read(x + side * gap, place);
  };
  const gapAt = (x: number): number => Math.max(roundoffAt(x), fine * 1e-17);
  if (places[0]?.sign === 0) add(aside(from, gapAt(from), 1));
  for (const cut of cuts.filter((c) => c > from && c < to).sort((a, b) => a - b)) {
    const gap = KINK_UNITS * gapAt(cut);
    add(aside(cut, gap, -1));
    add(aside(cut, gap, 1));
  }
  if (end.sign === 0) add(aside(to, gapAt(to), -1));
  places.push(end);
  return places;
}
