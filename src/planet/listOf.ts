// A list in a description, with a limit that keeps its budget small.
import type { ZodMiniType } from "zod/mini";
import { array, maxLength, minLength } from "zod/mini";
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

/** The same for a list that no other check knows to be empty. */
export const filledList = <S extends ZodMiniType>(
  each: S,
  words: string,
  most: number,
  description: string,
) =>
  worded(array(each).check(minLength(1), maxLength(most)), `a list of 1 to ${most} ${words}`, {
    description,
  });
