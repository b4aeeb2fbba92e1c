// What a reader of a planet must know: assumptions, and inputs that agree or are not used.
import type { Range } from "../ground/range.ts";

/**
 * What a planet's note is about. `assumption`: holds for every number of this planet. `inputs-agree`: two inputs say the
 * same within 2 %, and the first is used. `inputs-contradict`: they do not, and the first is used all the same, as was asked.
 * `input-unused`: nothing depends on this input. `counted-twice`: two inputs may stand for the same thing, and both count.
 */
export type PlanetNoteCode =
  | "assumption"
  | "inputs-agree"
  | "inputs-contradict"
  | "input-unused"
  | "counted-twice";

/** A note of a planet; its fields are those of a state's note. */
export interface PlanetNote {
  readonly code: PlanetNoteCode;
  readonly severity: "info" | "caution";
  /** What it concerns, such as `star.radius`. */
  readonly about: string;
  readonly value: number | null;
  readonly range: Range | null;
  readonly unit: string;
  readonly text: string;
  readonly source: string | null;
}

/** A note with what most notes leave open. */
export const planetNote = (
  note: Pick<PlanetNote, "code" | "about" | "text"> & Partial<PlanetNote>,
): PlanetNote => ({ severity: "info", value: null, range: null, unit: "1", source: null, ...note });
