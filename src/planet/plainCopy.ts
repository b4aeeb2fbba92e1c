// Copies a description as plain data, and stops early at what is too large, too deep or no data at all.
import { fail, ThermosteadError } from "../ground/errors.ts";

const MOST_CHARACTERS = 100_000;
const MOST_VALUES = 5000;
const DEEPEST = 12;

/**
 * A copy made of plain objects, lists, texts, numbers and booleans only; no accessor is called and fields that hold
 * `undefined` are left out. Throws `unreadable`, `too-large`, `reserved-name`.
 */
export function plainCopy(value: unknown): unknown {
  try {
    return new Copier().copy(value, "", 0);
  } catch (error) {
    if (error instanceof ThermosteadError) throw error;
    // a proxy may throw whatever it likes
    return fail("unreadable", { path: "description", value, allowed: "plain data, as JSON.parse gives it" });
  }
}

class Copier {
  #characters = 0;
  #values = 0;

  copy(value: unknown, path: string, depth: number): unknown {
    this.#count(path, typeof value === "string" ? value.length : 0);
    if (depth > DEEPEST) tooLarge(path, "deeper nesting", `at most ${DEEPEST} levels`);
    // JSON does not keep -0; this makes it 0
    if (typeof value === "number") return value + 0;
    if (typeof value === "string" || typeof value === "boolean" || value === null) return value;
    if (typeof value !== "object") return notData(path, value);
    return Array.isArray(value) ? this.#list(value, path, depth) : this.#record(value, path, depth);
  }

  #list(list: readonly unknown[], path: string, depth: number): unknown[] {
    if (list.length > MOST_VALUES)
      tooLarge(path, `a list of ${list.length}`, `at most ${MOST_VALUES} values`);
    return Array.from({ length: list.length }, (_, i) => {
      const at = `${path}[${i}]`;
      return this.copy(dataOf(list, String(i), at), at, depth + 1);
    });
  }

  #record(record: object, path: string, depth: number): Record<string, unknown> {
    const prototype: unknown = Object.getPrototypeOf(record);
    // a plain object of another realm has that realm's Object.prototype, whose own prototype is null
    if (prototype !== null && Object.getPrototypeOf(prototype) !== null) notData(path, record);
    const copied: Record<string, unknown> = {};
    for (const key of Reflect.ownKeys(record)) {
      if (typeof key === "symbol") return notData(path, record);
      const at = path === "" ? key : `${path}.${key}`;
      if (key in Object.prototype) {
        fail("reserved-name", { path: short(at), value: key, allowed: "a field of this format" });
      }
      this.#count(path, key.length);
      const value = dataOf(record, key, at);
      if (value !== undefined) copied[key] = this.copy(value, at, depth + 1);
    }
    return copied;
  }

  #count(path: string, characters: number): void {
    this.#characters += characters;
    this.#values += 1;
    if (this.#characters > MOST_CHARACTERS)
      tooLarge(path, "more text", `at most ${MOST_CHARACTERS} characters`);
    if (this.#values > 2 * MOST_VALUES) tooLarge(path, "more values", `at most ${MOST_VALUES} values`);
  }
}

/** The value of an own field; an accessor is no data. */
function dataOf(owner: object, key: string, path: string): unknown {
  const field = Object.getOwnPropertyDescriptor(owner, key);
  if (field?.get || field?.set) notData(path, field.get ?? field.set);
  return field?.value;
}

function notData(path: string, value: unknown): never {
  const shown = typeof value === "symbol" ? "a symbol" : value;
  return fail("unreadable", {
    path: short(path),
    value: shown,
    allowed: "plain data, as JSON.parse gives it",
  });
}

function tooLarge(path: string, value: string, allowed: string): never {
  return fail("too-large", { path: short(path), value, allowed });
}

const short = (path: string): string =>
  path === "" ? "description" : path.length > 80 ? `${path.slice(0, 77)}...` : path;
