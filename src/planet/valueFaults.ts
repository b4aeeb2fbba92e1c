// What is wrong with the values of a description whose shape is wrong elsewhere.
import type { ThermosteadError } from "../ground/errors.ts";
import { faultsOf } from "./faults.ts";
import { keysOf } from "./keysOf.ts";
import { planetInputs } from "./planetInputs.ts";
import type { PlanetDescription } from "./planetShape.ts";

type Keys = readonly (string | number)[];

/** The errors of all values that can be read beside the errors of the shape. */
export function valueFaultsBeside(faults: readonly ThermosteadError[], plain: unknown): ThermosteadError[] {
  const wrong = faults.map(({ path }) => keysOf(path));
  const rest = wrong.reduce((description, keys) => without(description, placeOf(keys)), plain);
  if (rest === undefined) return [];
  const found = faultsOf(() => planetInputs(rest as PlanetDescription));
  return found.filter(({ path }) => !wrong.some((keys) => meet(keys, keysOf(path))));
}

/** Without the name of its law nothing in a place can be read. */
const placeOf = (keys: Keys): Keys => (keys.at(-1) === "law" ? keys.slice(0, -1) : keys);

/** A copy in which the value at a place is undefined. */
function without(value: unknown, [key, ...rest]: Keys): unknown {
  if (key === undefined) return undefined;
  if (Array.isArray(value)) return value.map((each, i) => (i === key ? without(each, rest) : each));
  if (typeof value !== "object" || value === null || !Object.hasOwn(value, key)) return value;
  return { ...value, [key]: without((value as Record<Keys[number], unknown>)[key], rest) };
}

/** Whether one of two places lies in the other. */
const meet = (a: Keys, b: Keys): boolean => a.slice(0, b.length).join() === b.slice(0, a.length).join();
