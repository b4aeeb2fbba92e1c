// Ends of climates that come later than a star's table.
import { type AppraisalNote, appraisalNote } from "./appraisalNote.ts";
import type { StateAppraisal } from "./appraisedState.ts";
import { kelvin, shown } from "./report.ts";
import { isBeyondTable, type StarBrightening } from "./starBrightening.ts";

/** One note for every end of a climate that a table does not reach. `about` is the path of the table. */
export function brighteningNotes(
  states: readonly StateAppraisal[],
  brightening: StarBrightening | null,
  about: string,
): AppraisalNote[] {
  const table = brightening?.table;
  if (!table) return [];
  return states.flatMap(({ state, margins }) =>
    (margins ? [margins.rise, margins.fall] : [])
      .filter((margin) => isBeyondTable(margin, brightening))
      .map(({ direction, relative }) => {
        const reached = direction === "rise" ? table.most : table.least;
        const wanted = 1 + (direction === "rise" ? 1 : -1) * (relative ?? 0);
        const comes =
          reached === 1
            ? "until its end the table has no more than today's light"
            : `until its end the table comes to ${shown(reached, 4)} times today's light`;
        return appraisalNote({
          ...{ code: "beyond-table", about, value: table.lasts, unit: "s" },
          text: `${comes}, and the climate at ${kelvin(state.temperature)} K ends at ${shown(wanted, 4)} times: when is not told`,
        });
      }),
  );
}
