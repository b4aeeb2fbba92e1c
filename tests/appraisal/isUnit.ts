// Whether a text is a unit that a description may hold, or the unit of a pure number.
import { unitFactors } from "../../src/planet/unitText.ts";

export function isUnit(unit: string): boolean {
  if (unit === "1") return true;
  try {
    return unitFactors(unit, "unit").length > 0;
  } catch {
    return false;
  }
}
