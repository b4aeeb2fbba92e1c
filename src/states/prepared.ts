// What a loop needs to be searched, made once when it is first needed and kept as long as the loop.
import { fail } from "../ground/errors.ts";
import { checkLoop } from "../loop/checkLoop.ts";
import { kept } from "../loop/kept.ts";
import type { Loop } from "../loop/types.ts";
import { type StateReader, stateReader } from "./stateReader.ts";

/** The reader of a loop's states. */
export const readerOf: (loop: Loop) => StateReader = /* @__PURE__ */ kept(stateReader);

/** Throws `unreadable` for what is no loop, and `several-variables` for a loop whose states cannot be searched yet. */
export function checkOneVariable(loop: Loop, path: string): void {
  checkLoop(loop, path);
  const names = loop.variables.map((v) => v.name);
  if (names.length > 1)
    fail("several-variables", { path, value: names.join(), allowed: "temperature alone" });
}
