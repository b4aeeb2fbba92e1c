// What an appraisal comes to, in two sentences.
import type { Appraisal } from "./appraisal.ts";
import { changeText } from "./marginLines.ts";
import { counted, kelvin, shown } from "./report.ts";

/** How many climates there are and which of them are stable, and how near the next end of one is. */
export const summaryOf = (appraisal: Appraisal): string =>
  [climates(appraisal), tipping(appraisal)].filter(Boolean).join(" ");

function climates({ found, states, leaves }: Appraisal): string {
  if (found === null) return "No climates were looked for: a part of the budget is not given.";
  const range = `with the surface between ${found.within.join(" and ")} K`;
  if (states.length === 0)
    return found.complete
      ? `No climate ${range}: proved.${beyond(leaves)}`
      : `No climate was found ${range}: not proved.`;
  const stable = states.filter(({ state }) => state.stability === "stable");
  return `${counted(states.length, "climate")} ${range}, ${proofText(found)}: ${stableText(stable)}.`;
}

function beyond(leaves: Appraisal["leaves"]): string {
  if (leaves === null) return "";
  const [flows, where] =
    leaves === "hotter" ? ["gains more than it loses", "above"] : ["loses more than it gains", "below"];
  return ` All over that range the planet ${flows}, so that it goes on to ${leaves} ones: look ${where} it with a wider within.`;
}

function proofText({ proof, states }: NonNullable<Appraisal["found"]>): string {
  if (proof === "sampled") return "found by sampling, not proved";
  if (proof === "partial") return "but not all is decided";
  return `proved to be ${states.length === 1 ? "the only one" : "all"}`;
}

function stableText(stable: Appraisal["states"]): string {
  const [coldest, warmest] = [stable[0], stable.at(-1)].map((at) => at && kelvin(at.state.temperature));
  if (stable.length === 0) return "none is stable";
  if (stable.length === 1) return `stable at ${coldest} K`;
  return `${stable.length} are stable, the coldest at ${coldest} K and the warmest at ${warmest} K`;
}

function tipping({ states, diagram, brightening }: Appraisal): string {
  if (!diagram) return "";
  const ways = states.flatMap(({ state, margins }) =>
    margins ? [margins.rise, margins.fall].map((margin) => ({ state, margins, margin })) : [],
  );
  const size = ({ margin }: (typeof ways)[number]) => Math.abs(margin.relative ?? Number.POSITIVE_INFINITY);
  const [nearest] = ways.filter(({ margin }) => margin.jump).sort((a, b) => size(a) - size(b));
  if (nearest) {
    const { state, margins, margin } = nearest;
    const which = diagram.complete ? "The nearest" : "The nearest known";
    return `${which} tipping point: ${changeText(margins, margin, brightening)}, the climate at ${kelvin(state.temperature)} K ends.`;
  }
  if (ways.length === 0) return "";
  const range = `from ${diagram.between.map((end) => shown(end / diagram.now.at, 4)).join(" to ")} times today's light`;
  return diagram.complete
    ? `No tipping point ${range}.`
    : `No tipping point was found ${range}, but not all of that is decided.`;
}
