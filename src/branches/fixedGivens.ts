// The givens that are held while one changes.
import type { Loop } from "../loop/types.ts";

/** The givens besides one, and their values. */
export const fixedGivens = (loop: Loop, name: string, givens: readonly number[]) =>
  Object.freeze(
    Object.fromEntries(
      loop.givens.flatMap((g, i) => (g.name === name ? [] : [[g.name, givens[i] as number]])),
    ),
  );
