// The parts of λ as bars.
import type { Feedbacks } from "../feedback/feedbacks.ts";
import { LINE } from "./layout.ts";
import { wrapped } from "./lines.ts";
import { boxOf, extent, layerOf, layersOf, lineOf, type Plot, plotOf, stacked } from "./plot.ts";
import { FEEDBACK, numeral, signed, titled } from "./wording.ts";

/** What feedbacks do to a disturbance. */
export const EFFECTS = {
  counters: { colour: "cool", dash: [6, 4] },
  amplifies: { colour: "warm", open: true },
} as const;

/** Of labels, px: it fits telephones. */
const WIDE = 300;

/**
 * The reference response, every feedback loop and their sum λ, one below the other: each bar begins where the one above
 * ends, so that they add up by eye. Parts that counter a disturbance are full, parts that amplify it are light.
 * W m⁻² K⁻¹.
 *
 * @example toVegaLite(feedbackBars(analyseFeedbacks(loop, state)))
 */
export function feedbackBars<N extends string>(feedbacks: Feedbacks<N>): Plot {
  const { reference, others, feedbackParameter } = feedbacks;
  const parts = [
    { ...reference, through: [`λ₀, ${reference.kind}`] },
    ...feedbacks.loops,
    ...(others ? [{ ...others, through: [`weaker loops: ${others.count}`] }] : []),
    { feedbackParameter, through: ["λ, the sum"] },
  ];
  let [end, height] = [0, 0];
  const bars = parts.map((part, row) => {
    const start = parts[row + 1] ? end : 0;
    end = start + part.feedbackParameter;
    const tip = `${signed(part.feedbackParameter)}  ${part.through.join(" → ")}`;
    height += LINE * wrapped(tip, WIDE, 12).length + 21;
    const box = boxOf([start, end], [27 - height, 16 - height], tip);
    return { ...box, kind: end > start ? "amplifies" : "counters" };
  });
  const domain = extent([0, ...bars.map((bar) => bar.x2 as number)]);
  return plotOf({
    title: `Feedbacks at ${numeral(feedbacks.temperature)} K`,
    x: { title: titled("feedback parameter", FEEDBACK), domain },
    y: { title: "", domain: [-height, 11] },
    height: height + 11,
    layers: [
      layerOf(
        "line",
        lineOf([
          [0, 0],
          [0, -height],
        ]),
        { colour: "faint", width: 1 },
      ),
      ...layersOf("box", bars, EFFECTS, { dash: [1, 0] }),
      layerOf(
        "text",
        bars.flatMap((bar) => {
          const lines = wrapped(bar.tip as string, WIDE, 12);
          return stacked(lines, { x: domain[0], y: bar.y + LINE * lines.length - 10 }, -LINE);
        }),
      ),
    ],
  });
}
