/** The closed list of what can go wrong with a call; each code has a section in `docs/errors.md`. */
export const ERROR_CODES = [
  "not-a-number",
  "out-of-range",
  "not-finite",
  "missing",
  "unknown-name",
  "repeated-name",
  "reserved-name",
  "unknown-unit",
  "unit-mismatch",
  "other-loop",
  "foreign-state",
  "not-a-quantity",
  "quantity-as-number",
  "shares-not-one",
  "bad-budget",
  "temperature-unused",
  "coupling-unused",
  "coupling-bypassed",
  "several-variables",
  "contradiction",
  "unreadable",
  "too-large",
] as const;

/** Names an error's kind. */
export type ErrorCode = (typeof ERROR_CODES)[number];

/** What an error says besides its code. */
export interface ErrorDetails {
  /** The field that is wrong, such as `absorbedFlux.albedo`. */
  readonly path: string;
  /** What was received. */
  readonly value: unknown;
  /** What would have been accepted, in words. */
  readonly allowed: string;
  /** The unit in which `value` is read; absent where there is none. */
  readonly unit?: string | undefined;
  /** What else is wrong with the same call, where all of it is looked for; the message names the fields. */
  readonly others?: readonly ThermosteadError[];
}

/**
 * A wrong call: which field, what it received, what is allowed, in which unit. The wording comes from the code, so that
 * one kind of error always reads the same: "absorbedFlux.albedo: out of range, received 1.2; allowed: 0 to 1".
 */
export class ThermosteadError extends Error implements ErrorDetails {
  override readonly name = "ThermosteadError";
  declare readonly code: ErrorCode;
  declare readonly path: string;
  declare readonly value: unknown;
  declare readonly allowed: string;
  declare readonly unit: string | undefined;
  declare readonly others: readonly ThermosteadError[];
  constructor(code: ErrorCode, { path, value, allowed, unit, others = [] }: ErrorDetails) {
    const range = unit && unit !== "1" ? `${allowed} ${unit}` : allowed;
    const more = others.map((other) => `; also: ${other.path}`).join("");
    super(
      `${path}: ${code.replace(/-/g, " ")}, received ${shown(value)}; allowed: ${range} (docs/errors.md#${code})${more}`,
    );
    Object.assign(this, { code, path, value, allowed, unit, others });
  }
}

/** Throws a {@link ThermosteadError}; an expression, so that it can stand where a value is needed. */
export function fail(code: ErrorCode, details: ErrorDetails): never {
  const { stackTraceLimit } = Error;
  // V8 keeps ten frames unless told, and our own would hide the caller's line
  Error.stackTraceLimit = 50;
  const error = new ThermosteadError(code, details);
  Error.stackTraceLimit = stackTraceLimit;
  throw error;
}

function shown(value: unknown): string {
  if (typeof value === "string") return JSON.stringify(value.slice(0, 60));
  if (Array.isArray(value)) return `a list of ${value.length}`;
  if (Object(value) === value) return `a value of type ${typeof value}`;
  return Object.is(value, -0) ? "-0" : String(value);
}
