// What would change a climate: the inputs it answers to, and what their errors make of it.
import type { Feedbacks } from "../feedback/feedbacks.ts";
import type { PlanetInput } from "../planet/planetInput.ts";
import type { Sensitivity } from "./appraisedState.ts";

/** How temperature answers to every input along the branch, to first order; what acts most comes first. Without −0. */
export function sensitivitiesOf(
  { givens, responses }: Feedbacks,
  inputs: readonly PlanetInput[],
): Sensitivity[] {
  const list = inputs.flatMap(({ path, minus, plus }): Sensitivity[] => {
    const response = responses[path];
    const value = givens[path];
    if (response === undefined || response.temperature === null || value === undefined) return [];
    const { temperature: slope, unit } = response;
    const errorOf = (width: number | null, sign: number) =>
      width === null ? null : 0 + sign * slope * width;
    return [
      {
        path,
        unit,
        perUnit: slope,
        perPercent: 0 + (slope * value) / 100,
        minus: errorOf(minus, -1),
        plus: errorOf(plus, 1),
      },
    ];
  });
  return list.sort((a, b) => Math.abs(b.perPercent) - Math.abs(a.perPercent));
}
