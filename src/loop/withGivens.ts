// The same budget with other values of its givens.
import { checkLoop } from "./checkLoop.ts";
import { givensAt } from "./inputs.ts";
import { shareShape } from "./kept.ts";
import type { Givens, Loop } from "./types.ts";

/**
 * The same loop with other values of some of its givens: for a planet after another, or a new present. Nothing is recorded or
 * compiled again, since loops that differ only in this share everything that was made for one of them. Each value in the unit
 * of its given. Throws `unknown-name` (with the nearest given), `not-a-number`, `out-of-range`, `unreadable`.
 *
 * @example withGivens(loop, { flux: 1400 })
 */
export function withGivens<N extends string>(
  loop: Loop<N>,
  values: { readonly [K in Givens<N>]?: number },
): Loop<N> {
  checkLoop(loop, "withGivens");
  const set = givensAt(loop, values);
  const givens = loop.givens.map((given, i) => ({ ...given, value: set[i] as number }));
  const changed: Loop<N> = Object.freeze({
    ...loop,
    givens,
    toJSON: () => ({
      ...(loop.toJSON() as object),
      givens: givens.map(({ name, value, unit, within }) => ({ name, value, unit, within: within ?? null })),
    }),
  });
  shareShape(changed, loop);
  return changed;
}
