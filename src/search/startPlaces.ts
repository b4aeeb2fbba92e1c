// Cuts the range before the search starts.
import type { Place } from "./reader.ts";
import { roundoffAt } from "./roundoff.ts";
import type { Search } from "./search.ts";

/** A kink is cut out with this many units in the last place on each side: its place is itself rounded. */
const KINK_UNITS = 6;

/**
 * Puts the places between which the search starts ahead of it, by falling x: both ends of the range, both sides of each kink,
 * and guides. Where the sign at an end or a kink is not proved, the nearest place (from one unit in the last place, three
 * times as far each time) where it is is put there too, or takes the place of the kink's side; so a zero on an end or a kink
 * stays in a small box.
 */
export function startPlaces(search: Search, cuts: readonly number[], guides: ArrayLike<number>): void {
  const { reader, ahead } = search;
  const last = reader.take();
  const first = reader.take();
  last.x = search.to;
  first.x = search.from;
  ahead.push(reader.readAt(last), reader.readAt(first));
  if (first.sign === 0) insert(search, aside(search, search.from, gapAt(search, search.from), 1));
  if (last.sign === 0) insert(search, aside(search, search.to, gapAt(search, search.to), -1));
  for (let i = 0; i < cuts.length; i++) {
    const cut = cuts[i] as number;
    if (!(cut > search.from && cut < search.to)) continue;
    const gap = KINK_UNITS * gapAt(search, cut);
    insert(search, aside(search, cut, gap, 1));
    insert(search, aside(search, cut, gap, -1));
  }
  for (let i = 0; i < guides.length; i++) {
    const guide = reader.take();
    guide.x = guides[i] as number;
    if (guide.x > search.from && guide.x < search.to && reader.readAt(guide).sign !== 0)
      insert(search, guide);
    else reader.give(guide);
  }
}

const gapAt = ({ fine }: Search, x: number): number => Math.max(roundoffAt(x), fine * 1e-17);

/** Puts a place in order, unless there is one at its x, or it lies outside of the range. */
function insert({ reader, ahead }: Search, place: Place): void {
  let i = ahead.length - 1;
  while (i >= 0 && (ahead[i] as Place).x < place.x) i--;
  if (i < 0 || i === ahead.length - 1 || (ahead[i] as Place).x === place.x) {
    reader.give(place);
    return;
  }
  for (let k = ahead.push(place) - 1; k > i + 1; k--) ahead[k] = ahead[k - 1] as Place;
  ahead[i + 1] = place;
}

/** The nearest place beside x, from `gap` on, where the sign is proved; the first one if there is none near. */
function aside({ reader, from, to, fine }: Search, x: number, gap: number, side: 1 | -1): Place {
  const reach = Math.min(fine, (to - from) / 4);
  const place = reader.take();
  for (let g = gap; g < reach; g *= 3) if (reader.read(x + side * g, place).sign !== 0) return place;
  return reader.read(x + side * gap, place);
}
