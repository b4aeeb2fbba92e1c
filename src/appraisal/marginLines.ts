// How far the climates that hold are from an end of their branches, in words.
import type { Jump } from "../branches/diagram.ts";
import type { Margin, TippingMargins } from "../branches/margins.ts";
import type { Range } from "../ground/range.ts";
import type { Appraisal } from "./appraisal.ts";
import type { StateAppraisal } from "./appraisedState.ts";
import { duration, kelvin, shown } from "./report.ts";
import { isBeyondTable, type StarBrightening } from "./starBrightening.ts";

/** How far the star may brighten or fade before a state is lost, what comes then, and whether there is a way back. */
export function marginLines(
  states: readonly StateAppraisal[],
  { diagram, brightening }: Pick<Appraisal, "diagram" | "brightening">,
): string[] {
  if (!diagram) return [];
  const lines = states.flatMap(({ state, margins }) => {
    const at = `at ${kelvin(state.temperature)} K: `;
    if (!margins) return [`${at}its branch is not decided`];
    const basin = margins.basin ? basinText(margins.basin) : "";
    const ends = [margins.rise, margins.fall].map((margin) => marginText(margins, margin, brightening));
    const all = [...ends, basin];
    return all.filter(Boolean).map((text) => at + text);
  });
  const { along, proof, between, gaps, now } = diagram;
  const range = (ends: Range) =>
    `from ${ends.map((end) => shown(end / now.at, 4)).join(" to ")} times today's`;
  const none = gaps.map(
    ({ parameters, too }) =>
      `${range(parameters)}, no climate in the searched range${too ? `: too ${too}` : ""}`,
  );
  return [...lines, ...none, `followed: ${along} ${range(between)}, all else fixed; diagram: ${proof}`];
}

/** What changes, how far and when, such as "if the star fades by 11.86 %". */
export function changeText(
  { along }: TippingMargins,
  margin: Margin,
  brightening: StarBrightening | null,
): string {
  const by = ` by ${(100 * (margin.relative ?? 0)).toFixed(2)} %`;
  return turnText(along, margin.direction) + by + whenText(margin, brightening);
}

function whenText(margin: Margin, brightening: StarBrightening | null): string {
  if (margin.time !== null) return `, in ${duration(margin.time)}`;
  const table = brightening?.table;
  if (!table || !isBeyondTable(margin, brightening)) return "";
  return `, beyond the star's table, which ends ${table.lasts === 0 ? "today" : `in ${duration(table.lasts)}`}`;
}

function turnText(along: string, direction: Margin["direction"]): string {
  const light = along.endsWith("luminosity") ? "star" : "flux";
  const verbs = light === "star" ? (["brightens", "fades"] as const) : (["rises", "falls"] as const);
  return `if the ${light} ${verbs[direction === "rise" ? 0 : 1]}`;
}

function jumpText({ to, leaves, returnsAt, noReturn }: Jump, at: number): string {
  if (!to && !leaves) return "; where it goes from there is not known";
  const next = to ? `jumps to ${kelvin(to.temperature)} K` : `leaves the searched range, ${leaves}`;
  const unknown = noReturn ? "there is no way back" : "whether there is a way back is not known";
  const back = returnsAt === null ? unknown : `the way back is at ${shown(returnsAt / at, 4)} times today's`;
  return ` and ${next}; ${back}`;
}

function marginText(margins: TippingMargins, margin: Margin, brightening: StarBrightening | null): string {
  const { along, at } = margins;
  const { direction, end, jump } = margin;
  const by = changeText(margins, margin, brightening);
  if (jump) {
    return `${by}, it ends in a ${end.kind} at ${kelvin(end.temperature)} K${jumpText(jump, at)}`;
  }
  if (end.kind === "between")
    return `${turnText(along, direction)}, no end ${direction === "rise" ? "up" : "down"} to ${shown(end.at / at, 4)} times today's`;
  if (end.kind === "within") return `${by}, it leaves the searched range at ${kelvin(end.temperature)} K`;
  if (end.kind === "undecided")
    return `${turnText(along, direction)}, ${undecidedText(end, { at, direction })}`;
  return `${by}, it ends in a ${end.kind} point at ${kelvin(end.temperature)} K`;
}

/** An undecided end is a box: how far the branch surely goes, and between which temperatures nothing is proved. */
function undecidedText(
  { atBracket, temperatureBracket }: Margin["end"],
  { at, direction }: { at: number; direction: Margin["direction"] },
): string {
  const near = atBracket[direction === "rise" ? 0 : 1] / at;
  const nothing = `nothing is proved between ${temperatureBracket.map(kelvin).join(" and ")} K`;
  return `${nothing}, from ${shown(near, 4)} times today's on`;
}

function basinText({ coldest, hottest }: { coldest: number | null; hottest: number | null }): string {
  const edges = [
    coldest === null ? "" : `below ${kelvin(coldest)} K`,
    hottest === null ? "" : `above ${kelvin(hottest)} K`,
  ].filter(Boolean);
  return edges.length === 0 ? "" : `pushed ${edges.join(" or ")}, it goes to another climate`;
}
