// Catches the error of a call that must be refused.
import { expect } from "vitest";
import { ThermosteadError } from "../src/ground/errors.ts";

/** Runs a wrong call and returns its error; fails if there is none or if it is not ours. */
export function refusal(call: () => unknown): ThermosteadError {
  let result: unknown;
  try {
    result = call();
  } catch (error) {
    expect(error).toBeInstanceOf(ThermosteadError);
    return error as ThermosteadError;
  }
  throw new Error(`was not refused, gave ${typeof result === "object" ? "an object" : String(result)}`);
}
