// Proves that a corner leaves the range of temperature in a narrow stretch of the second given, and brackets the place.
import type { Range } from "../ground/range.ts";
import type { Loop } from "../loop/types.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import { meet, signOfRange } from "../search/interval.ts";
import type { BranchEnd } from "./diagram.ts";
import { type Line, lineOf } from "./line.ts";
import { endOf, LINE_EFFORT, type Rest, type Stretch } from "./stretch.ts";
import type { TurnReader } from "./turns.ts";

/** The least distance from the end of the range to which a leaving corner is looked at, K. */
const LEAST_MARGIN = 1e-6;

/**
 * Close to the end of the range λ has one sign on one side of the kink and the opposite on the other, so there is a corner
 * where the kink is and nothing elsewhere; the kink has one place at most, and that passes the end at one value.
 */
export function kinkExit(loop: Loop, { place, sides }: TurnReader) {
  const lines = new Map<number, Line>();
  const lineAt = (node: number): Line => {
    const line = lines.get(node) ?? lineOf(loop, node, loop.variables.length + place);
    lines.set(node, line);
    return line;
  };
  return (stretch: Stretch, temperature: number, rest: Rest): BranchEnd | undefined => {
    const { within, parameters, givens } = stretch;
    const cold = temperature - within[0] < within[1] - temperature;
    const edge = cold ? within[0] : within[1];
    const margin = 2 * Math.abs(temperature - edge) + LEAST_MARGIN;
    const near: Range = meet(cold ? [edge, edge + margin] : [edge - margin, edge], within);
    const [low, high] = parameters.map((q) => givens.map((v, i) => (i === place ? q : v)));
    sides.set(low as number[], high as number[]);
    for (const [kink, { node, over }] of sides.kinks.entries()) {
      const signs = [true, false].map((less) => {
        const arm = sides.on([{ kink, less }]);
        return arm ? signOfRange(arm(near, parameters).value) : 0;
      });
      if (signs[0] === 0 || signs[0] !== -(signs[1] as number)) continue;
      if (signOfRange(over(near, parameters).slope) === 0) continue;
      const line = lineAt(node);
      line.values.set([edge, ...givens]);
      const fine = parameters[1] - parameters[0];
      const { zeros, undecided } = enumerateZeros(line.ends, parameters, { effort: LINE_EFFORT, fine });
      const [zero] = zeros;
      if (!zero || zeros.length > 1 || undecided.length > 0 || !rest(stretch, near)) continue;
      return endOf("within", [edge, edge], zero.bracket);
    }
    return undefined;
  };
}
