/** The closed list of what can go wrong with a call, with one wording each. */
const WORDING = {
  "not-a-number": "must be a finite number",
  "out-of-range": "must lie between",
  "not-finite": "gave a value that is not a finite number, but needs",
  missing: "is required",
  "unknown-name": "is not a name known here; it must be one of",
  "repeated-name": "is given twice; each name may stand once among",
  "reserved-name": "cannot serve as a name; allowed is",
  "unknown-unit": "has a unit that cannot be read; known are",
  "unit-mismatch": "must have the unit",
  "other-loop": "belongs to another loop; allowed is",
  "not-a-quantity": "must be a number or a quantity of this loop",
  "quantity-as-number": "is a quantity and not yet a number; use",
  "shares-not-one": "must sum to",
  "bad-budget": "is not a budget; needed is",
  "temperature-unused": "does not depend on its temperature; needed is",
  "coupling-unused": "is coupled but does not reach the budget; use",
  "coupling-bypassed": "is also used without its coupling; use",
  "several-variables": "is not available for a loop with several variables; needed is",
  contradiction: "contradicts another input; allowed is",
  unreadable: "cannot be read; needed is",
  "too-large": "is too large; allowed is",
} as const;

/** Names an error's kind; the list is closed and each code has a section in `docs/errors.md`. */
export type ErrorCode = keyof typeof WORDING;

/** All error codes, in the order of the documentation. */
export const ERROR_CODES = /* @__PURE__ */ Object.keys(WORDING) as readonly ErrorCode[];

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
}

/** A wrong call: which field, what it received, what is allowed, in which unit. */
export class ThermosteadError extends Error implements ErrorDetails {
  override readonly name = "ThermosteadError";
  readonly code: ErrorCode;
  readonly path: string;
  readonly value: unknown;
  readonly allowed: string;
  readonly unit: string | undefined;
  constructor(code: ErrorCode, { path, value, allowed, unit }: ErrorDetails) {
    const range = unit && unit !== "1" ? `${allowed} ${unit}` : allowed;
    super(
      `${path}: ${`${WORDING[code]} ${range}`.trimEnd()}, received ${shown(value)} (docs/errors.md#${code})`,
    );
    this.code = code;
    this.path = path;
    this.value = value;
    this.allowed = allowed;
    this.unit = unit;
  }
}

/** Throws a {@link ThermosteadError}; an expression, so that it can stand where a value is needed. */
export function fail(code: ErrorCode, details: ErrorDetails): never {
  throw new ThermosteadError(code, details);
}

function shown(value: unknown): string {
  if (typeof value === "string")
    return JSON.stringify(value.length > 60 ? `${value.slice(0, 57)}...` : value);
  if (Array.isArray(value)) return `a list of ${value.length}`;
  if (typeof value === "object" && value !== null) return "an object";
  return typeof value === "function" ? "a function" : Object.is(value, -0) ? "-0" : String(value);
}
