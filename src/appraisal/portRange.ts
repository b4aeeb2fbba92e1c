// Ranges of the ports of laws: the ends of what a law covers are written with the law and nowhere else.
import type { LawCard } from "../graph/card.ts";
import type { Range } from "../ground/range.ts";

/** As much of a law as tells its ranges. */
export interface Carded {
  readonly card: Pick<LawCard, "inputs">;
}

/** The range of a port; nothing is in the range of a port without one. */
export const rangeOf = ({ card }: Carded, port: string): Range =>
  (card.inputs as Readonly<Record<string, { readonly within?: Range }>>)[port]?.within ?? [0, -1];

/** Whether a law takes this value at this port. */
export function takes(law: Carded, port: string, value: number): boolean {
  const [low, high] = rangeOf(law, port);
  return value >= low && value <= high;
}
