// What the planet, or its surface, reflects; a coupling where that answers to temperature.
import type { Value } from "../graph/quantity.ts";
import { coverAlbedo } from "./coverAlbedo.ts";
import { isIce } from "./covers.ts";
import type { PlanetDescription } from "./planetShape.ts";
import { answersToTemperature, callWritten, type Sources } from "./wire.ts";

/** The albedo in the field `albedo` or `surface`. */
export function reflection(d: PlanetDescription, field: "albedo" | "surface", from: Sources): Value {
  const written = d[field];
  const name = field === "albedo" ? "albedo" : "surfaceAlbedo";
  if (typeof written !== "object" || "value" in written) return from.wire(field);
  const value =
    "covers" in written ? coverAlbedo(d, written.covers, field, from) : callWritten(written, field, from);
  return isAnswering(written) ? from.couple(name, value) : value;
}

/** Whether an albedo answers to temperature. */
export function isAnswering(written: PlanetDescription["albedo"] | PlanetDescription["surface"]): boolean {
  if (typeof written !== "object" || "value" in written) return false;
  return "covers" in written ? written.covers.some(isIce) : answersToTemperature(written);
}
