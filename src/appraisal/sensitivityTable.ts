// What would change the climates that hold.
import type { StateAppraisal } from "./appraisedState.ts";
import { kelvin, signed, type Table } from "./report.ts";

/** Inputs that move a climate by less than this for 1 % of their value are not worth a line, K. */
const WEAK = 0.001;

/** Inputs by what 1 % more of them does; their errors have a column where there are any. */
export function sensitivityTable(states: readonly StateAppraisal[]): Table[] {
  const rows = states.flatMap(({ state, sensitivities }) => {
    const worth = (sensitivities ?? []).filter(
      ({ perPercent, minus, plus }) => Math.abs(perPercent) >= WEAK || minus !== null || plus !== null,
    );
    return worth.map(({ path, perPercent, minus, plus }, i) => [
      i === 0 ? `at ${kelvin(state.temperature)} K` : "",
      path,
      signed(perPercent, 3),
      [plus, minus].flatMap((error) => (error === null ? [] : [signed(error, 3)])).join(" "),
    ]);
  });
  if (rows.length === 0) return [];
  const head = ["climate", "input", "K for 1 % more", "K for its errors, + and -"];
  const all = { head, rows, right: [2, 3] };
  const hasErrors = rows.some((row) => row[3] !== "");
  return [hasErrors ? all : { head: head.slice(0, 3), rows: rows.map((row) => row.slice(0, 3)), right: [2] }];
}
