// The parts of λ as bars.
import type { Feedbacks } from "../feedback/feedbacks.ts";
import { around, extent, type Layer, layerOf, type Plot, plotOf } from "./plot.ts";
import { FEEDBACK, numeral, signed, titled } from "./wording.ts";

/** Height of a bar with its label, px. */
const ROW = 36;

/**
 * The reference response, every feedback loop and their sum λ, one below the other: each bar begins where the one above
 * ends, so that they add up by eye. Parts that counter a disturbance are full, parts that amplify it are light.
 * W m⁻² K⁻¹.
 *
 * @example toVegaLite(feedbackBars(analyseFeedbacks(loop, state)))
 */
export function feedbackBars<N extends string>(feedbacks: Feedbacks<N>): Plot {
  const { reference, loops, others, feedbackParameter, temperature } = feedbacks;
  const parts: [string, number][] = [
    [`λ₀, ${reference.kind}`, reference.feedbackParameter],
    ...loops.map((loop): [string, number] => [loop.through.join(" → "), loop.feedbackParameter]),
  ];
  if (others) parts.push([`${others.count} weaker loops`, others.feedbackParameter]);
  let end = 0;
  const bars = [...parts, ["λ, the sum", feedbackParameter] as const].map(([name, value], row) => {
    const x = row === parts.length ? 0 : end;
    end = x + value;
    return { x, x2: end, y: -row - 0.25, y2: -row - 0.55, tip: `${signed(value)}  ${name}` };
  });
  const domain = around(extent(bars.flatMap(({ x, x2 }) => [x, x2])), 0.04);
  const boxes = (name: string, colour: "warm" | "cool", open: boolean): Layer =>
    layerOf(
      "box",
      { colour, open },
      bars.filter(({ x, x2 }) => x2 > x === open),
      name,
    );
  const labels = bars.map(({ tip }, row) => ({ x: domain[0], y: -row - 0.12, text: tip }));
  return plotOf({
    title: `Feedbacks at ${numeral(temperature)} K`,
    x: { title: titled("feedback parameter", FEEDBACK), domain },
    y: { title: "", domain: [-bars.length, 0.3] },
    height: (bars.length + 0.3) * ROW,
    layers: [
      layerOf(
        "line",
        { colour: "faint", width: 1 },
        [0, -bars.length].map((y) => ({ x: 0, y })),
      ),
      boxes("counters", "cool", false),
      boxes("amplifies", "warm", true),
      layerOf("text", { colour: "ink" }, labels),
    ],
  });
}
