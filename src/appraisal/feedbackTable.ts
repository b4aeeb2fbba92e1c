// What holds the climates that hold.
import type { StateAppraisal } from "./appraisedState.ts";
import { counted, kelvin, shown, signed, type Table } from "./report.ts";

/** λ of each state as the sum of its parts. */
export function feedbackTable(states: readonly StateAppraisal[]): Table[] {
  const rows = states.flatMap(({ feedbacks }) => {
    if (!feedbacks) return [];
    const { temperature, feedbackParameter, reference, loops, others, gain } = feedbacks;
    return [
      [`at ${kelvin(temperature)} K`, reference.kind, signed(reference.feedbackParameter), ""],
      ...loops.map((loop) => [
        "",
        loop.through.join(" to "),
        signed(loop.feedbackParameter),
        `${loop.effect}${loop.feedbackFactor === null ? "" : `, f = ${shown(loop.feedbackFactor, 4)}`}`,
      ]),
      ...(others ? [["", counted(others.count, "weaker loop"), signed(others.feedbackParameter), ""]] : []),
      ["", "lambda", signed(feedbackParameter), gain === null ? "" : `gain ${shown(gain, 4)}`],
    ];
  });
  return rows.length === 0 ? [] : [{ head: ["climate", "part", "W m-2 K-1", ""], rows, right: [2] }];
}
