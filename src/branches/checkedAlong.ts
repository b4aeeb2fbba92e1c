// Checks the name of the given along which something is followed.
import { coneOf } from "../graph/cone.ts";
import { fail } from "../ground/errors.ts";
import { failUnknown } from "../ground/names.ts";
import type { GivenRecord, Loop } from "../loop/types.ts";

/** A given, its name, and its place among the loop's inputs. */
export interface Along {
  readonly name: string;
  readonly given: GivenRecord;
  readonly place: number;
}

/** Throws `unknown-name`, and `contradiction` where the budget does not depend on the given or `at` sets it as well. */
export function checkedAlong(
  loop: Loop,
  along: unknown,
  at: Readonly<Record<string, unknown>> | undefined,
  path: string,
): Along {
  const known = loop.givens.map((g) => g.name);
  const index = known.indexOf(along as string);
  if (index < 0) failUnknown(path, String(along), known);
  const given = loop.givens[index] as GivenRecord;
  const reached = new Set(coneOf(loop.graph, [loop.net]));
  if (!reached.has(given.node)) {
    const others = loop.givens.filter((g) => reached.has(g.node)).map((g) => g.name);
    fail("contradiction", {
      path,
      value: given.name,
      allowed: `a given that the budget depends on: ${others.join(", ") || "there is none"}`,
    });
  }
  if (at && Object.hasOwn(at, given.name)) {
    fail("contradiction", {
      path: `at.${given.name}`,
      value: at[given.name],
      allowed: "only other givens here",
    });
  }
  return { name: given.name, given, place: loop.variables.length + index };
}
