// The zeros of a function that is read at once.
import { type Enclosed, endsOf } from "../../src/search/enclosed.ts";
import { type EnumerationOptions, enumerateZeros } from "../../src/search/enumerateZeros.ts";

export const zerosOf = (f: Enclosed, range: readonly [number, number], options: EnumerationOptions) =>
  enumerateZeros(endsOf(f), range, options);
