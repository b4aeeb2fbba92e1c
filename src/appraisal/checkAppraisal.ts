// Refuses what is no appraisal.
import { fail } from "../ground/errors.ts";

const ALLOWED =
  '"thermostead-appraisal-1", as appraisePlanet returns it; a description is appraised first, and all other results are shown by thermostead/chart';

/** Throws `unreadable` or `missing` for a description, another result, or anything else. */
export function checkAppraisal(value: unknown): void {
  if (typeof value !== "object" || value === null)
    fail("unreadable", { path: "appraisal", value, allowed: "what appraisePlanet returns" });
  const { format } = value as { readonly format?: unknown };
  if (format !== "thermostead-appraisal-1")
    fail(format === undefined ? "missing" : "unreadable", {
      path: "appraisal.format",
      value: format,
      allowed: ALLOWED,
    });
}
