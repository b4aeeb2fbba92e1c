// What is made for a loop when it is first needed and kept as long as the loop.
import type { Loop } from "../loop/types.ts";

/** Makes a thing for a loop and a name at the first request, and returns the same thing later. */
export function kept<T>(make: (loop: Loop, name: string) => T): (loop: Loop, name?: string) => T {
  const made = new WeakMap<Loop, Map<string, T>>();
  return (loop, name = "") => {
    const things = made.get(loop) ?? new Map<string, T>();
    made.set(loop, things);
    if (!things.has(name)) things.set(name, make(loop, name));
    return things.get(name) as T;
  };
}
