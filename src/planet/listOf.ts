// A list in a description, with a limit that keeps its budget small.
import type { ZodMiniType } from "zod/mini";
import { array, maxLength } from "zod/mini";
import { worded } from "./wording.ts";

/** The schema of a list. `words` say what it holds. */
export const listOf = <S extends ZodMiniType>(
  each: S,
  words: string,
  most: number,
  keywords: Readonly<Record<string, unknown>> = {},
) =>
  worded(array(each).check(maxLength(most)), `a list of ${words}, at most ${most}`, {
    minItems: 1,
    ...keywords,
  });
