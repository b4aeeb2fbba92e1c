// Several checks of one thing: all are made, and what they find is thrown together.
import { fail, ThermosteadError } from "../ground/errors.ts";

/** More of them are not carried: whoever has so many has another format in mind. */
const MOST = 20;

/** An error and its others, each by itself. What is no error of ours is thrown on. */
export function faultsIn(error: unknown): ThermosteadError[] {
  if (!(error instanceof ThermosteadError)) throw error;
  const { code, path, value, allowed, unit, others } = error;
  if (others.length === 0) return [error];
  return [new ThermosteadError(code, { path, value, allowed, unit }), ...others];
}

/** What a check throws; nothing where it finds nothing. */
export function faultsOf(check: () => unknown): ThermosteadError[] {
  try {
    check();
    return [];
  } catch (error) {
    return faultsIn(error);
  }
}

/** Makes all checks and returns what they give. Throws the first error with those after it as its `others`. */
export function allOf<T extends readonly unknown[]>(checks: { readonly [K in keyof T]: () => T[K] }): T {
  const results: unknown[] = [];
  failAll(checks.flatMap((check) => faultsOf(() => results.push(check()))));
  return results as unknown as T;
}

/** Throws the first error with the others, one for each field; nothing where there is none. */
export function failAll(faults: readonly ThermosteadError[]): void {
  const [first, ...others] = faults.filter(
    ({ path }, i) => faults.findIndex((fault) => fault.path === path) === i,
  );
  if (!first) return;
  if (others.length === 0) throw first;
  const { code, path, value, allowed, unit } = first;
  fail(code, { path, value, allowed, unit, others: others.slice(0, MOST) });
}
