// The units in which the values of a description are written, for those who show them to its author.
import { inSI } from "./inSI.ts";
import type { PlanetInput } from "./planetInput.ts";

/** In which unit a value is written. */
export interface WrittenUnit {
  /** The path of the input, which is the name of a given. */
  readonly name: string;
  /** As in the description, such as `au`; that of the SI where the written one has a zero point of its own. */
  readonly unit: string;
  /** One of it in the SI. */
  readonly size: number;
}

/** The units of all inputs. */
export const writtenUnits = (inputs: readonly PlanetInput[]): WrittenUnit[] =>
  inputs.map(({ path: name, unit, written }) => {
    // the unit stands last, after the number and its errors
    const own = unit === "1" ? undefined : / ([A-Za-z].*)$/.exec(written)?.[1];
    // a degree Celsius stands alone
    if (own === undefined || own === unit || own === "degC") return { name, unit, size: 1 };
    return { name, unit: own, size: inSI(1, own, { unit, difference: false }, name) };
  });
