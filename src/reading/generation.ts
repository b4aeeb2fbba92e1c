// Turns text into functions where the host allows it, and keeps a bounded store of them.
import { exp } from "../ground/elementary/exp.ts";
import { log } from "../ground/elementary/log.ts";
import { tanh } from "../ground/elementary/tanh.ts";

const STORE_LIMIT = 256;
const store = new Map<string, unknown>();
let allowed: boolean | undefined;

/** False where `new Function` is forbidden, as on a page with a strict content security policy. */
export function mayGenerate(): boolean {
  if (allowed === undefined) {
    try {
      allowed = new Function("return true")() === true;
    } catch {
      allowed = false;
    }
  }
  return allowed;
}

/** Forbids (false) or asks the host again (true): the interpreter must give the same bits, and tests compare both. */
export function allowGeneration(value: boolean): void {
  allowed = value ? undefined : false;
}

/**
 * The function that `text` returns, compiled once for each text. Constants are data and not in the text, so that all
 * loops of one shape share one function. The text is made from operation names and counters only, never from users' names.
 */
export function compiled<F>(text: string): F {
  let found = store.get(text);
  if (found === undefined) {
    found = new Function("exp", "log", "tanh", "sqrt", "abs", text)(exp, log, tanh, Math.sqrt, Math.abs);
  } else {
    store.delete(text);
  }
  store.set(text, found);
  if (store.size > STORE_LIMIT) store.delete(store.keys().next().value as string);
  return found as F;
}
