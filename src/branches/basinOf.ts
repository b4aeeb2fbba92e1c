// The temperatures between which a stable state draws the climate to itself.
import { holds } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import type { Branch, Diagram } from "./diagram.ts";
import type { TippingMargins } from "./margins.ts";
import { stateOn } from "./statesOnDiagram.ts";

/** Where something comes nearest to a state, and its temperature; null if it is not known what it is. */
interface Edge {
  readonly place: number;
  readonly temperature: number | null;
}

/**
 * The nearest states on both sides at the same givens, or the nearest leaps of the balance through zero: between a stable state
 * and these there is nothing. Null where the nearest is something else that is undecided.
 */
export function basinOf(
  loop: Loop,
  diagram: Diagram,
  { index, at, temperature }: { index: number; at: number; temperature: number },
): TippingMargins["basin"] {
  const { branches, undecided } = diagram;
  const next = (side: 1 | -1): Edge | undefined => {
    const edges: Edge[] = undecided
      .filter(({ parameters }) => holds(parameters, at))
      .map(({ kind, temperatures: [low, high] }) => ({
        place: side > 0 ? low : high,
        temperature: kind === "jump" ? low + (high - low) / 2 : null,
      }));
    for (let i = index + side; i >= 0 && i < branches.length; i += side) {
      const branch = branches[i] as Branch;
      const place = holds(branch.parameters, at)
        ? stateOn(loop, diagram, branch, at)?.temperature
        : undefined;
      if (place !== undefined) edges.push({ place, temperature: place });
    }
    return edges
      .filter(({ place }) => side * (place - temperature) > 0)
      .sort((a, b) => side * (a.place - b.place))[0];
  };
  const [cold, hot] = [next(-1), next(1)];
  if (cold?.temperature === null || hot?.temperature === null) return null;
  return Object.freeze({ coldest: cold?.temperature ?? null, hottest: hot?.temperature ?? null });
}
