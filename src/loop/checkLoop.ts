// Whether a value is a loop at all.
import { fail } from "../ground/errors.ts";
import type { Loop } from "./types.ts";

/** Throws `unreadable` for what is no loop. */
export function checkLoop(loop: Loop, path: string): void {
  if (!Array.isArray((loop as Loop | undefined)?.variables)) {
    const allowed = "a loop, as closeLoop returns it and readPlanet holds it";
    fail("unreadable", { path, value: loop, allowed });
  }
}
