// What a reader of an appraisal must know beside the notes of the planet and its states.
import type { PlanetNote } from "../planet/planetNote.ts";

/**
 * What a note of an appraisal is about. `albedo-of-another-star`: one number for the albedo under a cool star.
 * `eccentric-orbit`: the orbit is far from a circle. `average-not-favoured`: the heat capacity does not speak for the average
 * over the orbit that was taken.
 * `star-outside-limits`: no limits are published for such a star. `several-stars`: the limits are for the light of one of them.
 * `mass-outside-limits`: the runaway greenhouse was computed for other masses.
 * `slow-rotation`: the limits are for a planet that turns fast.
 * `luminosity-of-no-star`: a luminosity far from that of any star. `warm-albedo-above-cold`: a planet that grows darker as it
 * freezes. Both are read as they stand.
 * `beyond-table`: a climate ends later than the table of its star's luminosity.
 * `incomplete-budget`: no states, because a part of the budget is not given. `published-temperature`: what a table's
 * temperature may mean.
 */
export type AppraisalNoteCode =
  | "albedo-of-another-star"
  | "eccentric-orbit"
  | "average-not-favoured"
  | "star-outside-limits"
  | "several-stars"
  | "mass-outside-limits"
  | "slow-rotation"
  | "luminosity-of-no-star"
  | "warm-albedo-above-cold"
  | "beyond-table"
  | "incomplete-budget"
  | "published-temperature";

/** A note of an appraisal; its fields are those of a planet's note. */
export type AppraisalNote = Omit<PlanetNote, "code"> & {
  readonly code: PlanetNote["code"] | AppraisalNoteCode;
};

/** A note with what most notes leave open. */
export const appraisalNote = (
  note: Pick<AppraisalNote, "code" | "about" | "text"> & Partial<AppraisalNote>,
): AppraisalNote => ({ severity: "info", value: null, range: null, unit: "1", source: null, ...note });
