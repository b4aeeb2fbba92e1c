// The temperatures between which a stable state draws the climate to itself.
import { givensAt } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import type { Branch, Diagram } from "./diagram.ts";
import type { TippingMargins } from "./margins.ts";
import { netReader } from "./netReader.ts";

/** Where something comes nearest to a state, and its temperature; null if it is not known what it is. */
interface Edge {
  readonly place: number;
  readonly temperature: number | null;
}

/** Boxes, or samples, that all states at the parameter may cost. */
const EFFORT = 2000;
const SAMPLES = 20_000;

/**
 * The nearest states on both sides at the same givens, or the nearest leaps of the balance through zero: between a stable state
 * and these there is nothing. Null where the nearest is something else that is undecided. They are looked for at this
 * parameter: what is undecided in the diagram says only between which parameters a leap may be.
 */
export function basinOf(
  loop: Loop,
  diagram: Diagram,
  { index, at, temperature }: { index: number; at: number; temperature: number },
): TippingMargins["basin"] {
  const place = loop.givens.findIndex((g) => g.name === diagram.along);
  const net = netReader(loop, place, givensAt(loop, diagram.fixed));
  const own = net.stateOn(diagram.branches[index] as Branch, at)?.bracket ?? [temperature, temperature];
  const { zeros, undecided } = net.enumerate(at, diagram.within, loop.sampled ? SAMPLES : EFFORT);
  if (undecided.some(({ interval: [low, high] }) => low <= own[1] && high >= own[0])) return null;
  const next = (side: 1 | -1): Edge | undefined => {
    const near = side > 0 ? 0 : 1;
    const edges: Edge[] = [
      ...zeros.map(({ at, bracket }) => ({ place: bracket[near], temperature: at })),
      ...undecided.map(({ kind, interval: [low, high] }) => ({
        place: [low, high][near] as number,
        temperature: kind === "jump" ? low + (high - low) / 2 : null,
      })),
    ];
    return edges
      .filter(({ place }) => side * (place - (own[1 - near] as number)) > 0)
      .sort((a, b) => side * (a.place - b.place))[0];
  };
  const [cold, hot] = [next(-1), next(1)];
  if (cold?.temperature === null || hot?.temperature === null) return null;
  return Object.freeze({ coldest: cold?.temperature ?? null, hottest: hot?.temperature ?? null });
}
