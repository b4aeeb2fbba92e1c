// Cautions that follow from the whole of a planet, not from one of its numbers.
import type { Planet } from "../planet/planetTypes.ts";
import type { StateAppraisal } from "./appraisal.ts";
import { type AppraisalNote, appraisalNote } from "./appraisalNote.ts";
import { COOLEST_STAR, HOTTEST_STAR, limitsArePublished } from "./limits.ts";

/** Below this effective temperature a star is of class M, K: a convention. */
const COOL_STAR = 3900;
/** Beyond this the flux at periastron is half as large again as the mean, and a circle is a poor likeness: common practice, no source. */
const ECCENTRIC = 0.1;
/** Rotation periods above which the clouds of the day side move the inner limits, s: from about 20 days on (Yang et al. 2014). */
const SLOW_ROTATION = 20 * 86400;

/** The notes that an appraisal adds to those of the planet. */
export function notesOfAppraisal(
  { facts, assumptions, description }: Planet,
  states: readonly StateAppraisal[],
  hasBudget: boolean,
): AppraisalNote[] {
  const notes: AppraisalNote[] = [];
  const caution = (note: Omit<Parameters<typeof appraisalNote>[0], "severity">) =>
    notes.push(appraisalNote({ severity: "caution", ...note }));
  const temperature = facts.stars[0]?.effectiveTemperature ?? null;
  if (
    temperature !== null &&
    temperature < COOL_STAR &&
    hasBudget &&
    typeof description.albedo !== "undefined"
  ) {
    caution({
      ...{ code: "albedo-of-another-star", about: "albedo", value: temperature, unit: "K" },
      text: "under so cool a star snow and ice are darker and air absorbs more than under the Sun: give covers with visible and near-infrared albedo",
      source: "Shields et al. 2013, Astrobiology 13, 715 (doi:10.1089/ast.2012.0961)",
    });
  }
  if (facts.eccentricity > ECCENTRIC) {
    caution({
      ...{ code: "eccentric-orbit", about: "orbit.eccentricity", value: facts.eccentricity },
      text: "the flux changes along the orbit; the published limits are for nearly circular orbits",
    });
  }
  if (temperature !== null && !limitsArePublished(temperature)) {
    caution({
      ...{ code: "star-outside-limits", about: "star.effectiveTemperature", value: temperature, unit: "K" },
      range: [COOLEST_STAR, HOTTEST_STAR],
      text: "no limits of the habitable zone are published for this star",
    });
  }
  const { rotationPeriod, locked } = facts;
  if (locked === true || (rotationPeriod !== null && rotationPeriod > SLOW_ROTATION)) {
    caution({
      ...{
        code: "slow-rotation",
        about: "rotation",
        value: rotationPeriod,
        unit: rotationPeriod === null ? "1" : "s",
      },
      text: "a planet that turns slowly can shield its day side with clouds, which moves the inner limits towards the star",
      source: "Yang et al. 2014, ApJL 787, L2 (doi:10.1088/2041-8205/787/1/L2)",
    });
  }
  for (const { state, averaging } of states) {
    const { favours, thermalInertiaRatio } = averaging;
    if (assumptions.average === null || favours === null || favours === assumptions.average) continue;
    caution({
      ...{ code: "average-not-favoured", about: "orbit.average", value: thermalInertiaRatio },
      text: `the thermal inertia at ${state.temperature.toFixed(2)} K speaks for the mean of the ${favours}`,
    });
  }
  if (!hasBudget) {
    const text = "a part of the budget is not given, so no states were looked for";
    notes.push(appraisalNote({ code: "incomplete-budget", about: "description", text }));
  }
  return notes;
}
