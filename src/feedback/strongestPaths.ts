// The paths from temperature to the net flux, strongest first, without walking all of them.
import { type Bounded, exactly, product } from "./bounds.ts";
import type { Influence } from "./influences.ts";

/** A path through couplings, and the product of its influences. */
export interface Path extends Bounded {
  readonly through: readonly number[];
}

/** The strongest paths, and how many there are in all. */
export interface Paths {
  readonly strongest: readonly Path[];
  readonly count: number;
}

/**
 * The `most` paths from place 0 to place `end` with the largest products, in order. Influences run from lower to higher places,
 * except that any may run to `end`. At each place only its `most` strongest beginnings can be part of the answer, because
 * going on multiplies all of them alike; so a graph with very many paths is no trouble.
 */
export function strongestPaths(edges: readonly Influence[], end: number, most: number): Paths {
  const paths: Path[][] = Array.from({ length: end + 1 }, () => []);
  const counts = new Float64Array(end + 1);
  paths[0] = [{ through: [], ...exactly(1) }];
  counts[0] = 1;
  for (let place = 1; place <= end; place++) {
    const here: Path[] = [];
    for (const edge of edges) {
      if (edge.to !== place) continue;
      counts[place] = (counts[place] as number) + (counts[edge.from] as number);
      for (const path of paths[edge.from] as Path[]) here.push(goOn(path, edge, end));
    }
    paths[place] = here.sort(strongerFirst).slice(0, most);
  }
  return { strongest: paths[end] as Path[], count: counts[end] as number };
}

function goOn(path: Path, edge: Influence, end: number): Path {
  return {
    through: edge.to === end ? path.through : [...path.through, edge.to],
    ...(edge.from === 0 ? { value: edge.value, bounds: edge.bounds } : product(path, edge)),
  };
}

/** By strength; of equal ones the shorter first. */
const strongerFirst = (a: Path, b: Path): number =>
  Math.abs(b.value) - Math.abs(a.value) || a.through.length - b.through.length;
