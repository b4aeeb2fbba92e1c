// What a loop needs to be searched, made once when it is first needed and kept as long as the loop.
import { fail } from "../ground/errors.ts";
import type { Loop } from "../loop/types.ts";
import type { StateSearch } from "./located.ts";
import { provedSearch } from "./provedSearch.ts";
import { sampledSearch } from "./sampledSearch.ts";
import { type StateReader, stateReader } from "./stateReader.ts";

/** Makes a thing for a loop at the first request, and returns the same thing later. */
function once<T>(make: (loop: Loop) => T): (loop: Loop) => T {
  const made = new WeakMap<Loop, T>();
  return (loop) => {
    let found = made.get(loop);
    if (found === undefined) {
      found = make(loop);
      made.set(loop, found);
    }
    return found;
  };
}

const proved = /* @__PURE__ */ once<StateSearch>(provedSearch);
const sampled = /* @__PURE__ */ once<StateSearch>(sampledSearch);

/** The search of a loop, with proof or by sampling. */
export const searchOf = (loop: Loop, proving: boolean): StateSearch => (proving ? proved : sampled)(loop);

/** The reader of a loop's states. */
export const readerOf: (loop: Loop) => StateReader = /* @__PURE__ */ once(stateReader);

/** Throws `several-variables` for a loop whose states cannot be searched yet. */
export function checkOneVariable(loop: Loop, path: string): void {
  const names = loop.variables.map((v) => v.name);
  if (names.length > 1)
    fail("several-variables", { path, value: names.join(), allowed: "temperature alone" });
}
