// What is asked of a comparison with held couplings, checked.
import { fail } from "../ground/errors.ts";
import { checkKeys, checkRecord } from "../ground/names.ts";
import { checkedNumber } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";

/** All 4096 choices of 12 couplings take a fraction of a second; a few more would take minutes. */
export const MOST_HELD = 12;

/** Throws `missing` and `too-large`. */
export function checkCount(count: number, loop: Loop): void {
  const known = loop.couplings.map((c) => c.name).join(", ") || "(none)";
  if (count === 0)
    fail("missing", { path: "hold", value: "no name", allowed: `at least one coupling of ${known}` });
  if (count > MOST_HELD)
    fail("too-large", { path: "hold", value: count, allowed: `at most ${MOST_HELD} couplings` });
}

/** The givens after a change; those that are not named keep the values of the state, not those of the loop. */
export function changedGivens(loop: Loop, before: readonly number[], change: unknown): number[] {
  const known = loop.givens.map((g) => g.name);
  const list = known.join(", ") || "(none)";
  if (change === undefined)
    fail("missing", { path: "change", value: change, allowed: `new values of ${list}` });
  checkRecord(change, "change", `new values of ${list}`);
  checkKeys(change, "change", known);
  if (Object.keys(change).length === 0)
    fail("missing", { path: "change", value: "no new value", allowed: `new values of ${list}` });
  return loop.givens.map(({ name, unit, within }, i) =>
    Object.hasOwn(change, name)
      ? checkedNumber((change as Readonly<Record<string, unknown>>)[name], `change.${name}`, unit, within)
      : (before[i] as number),
  );
}
