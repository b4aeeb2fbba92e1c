// What is made for a loop when it is first needed and kept as long as the loop. Loops that differ in nothing but the values
// of their givens have one shape, and share it.
import type { Loop } from "./types.ts";

const origins = /* @__PURE__ */ new WeakMap<Loop, Loop>();

/** Says that a loop differs from another only in the values of its givens. */
export function shareShape(loop: Loop, other: Loop): void {
  origins.set(loop, shapeOf(other));
}

const shapeOf = (loop: Loop): Loop => origins.get(loop) ?? loop;

/**
 * Makes a thing for a loop and a name at the first request, and returns the same thing later. What is made must not depend on
 * the values of givens.
 */
export function kept<T>(make: (loop: Loop, name: string) => T): (loop: Loop, name?: string) => T {
  const made = new WeakMap<Loop, Map<string, T>>();
  return (loop, name = "") => {
    const shape = shapeOf(loop);
    const things = made.get(shape) ?? new Map<string, T>();
    made.set(shape, things);
    if (!things.has(name)) things.set(name, make(shape, name));
    return things.get(name) as T;
  };
}
