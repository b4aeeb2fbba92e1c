// The balance of a loop on one side of its kinks, and which kinks have a place in temperature.
import { coneOf } from "../graph/cone.ts";
import { replaceNodes } from "../graph/replaceNodes.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { type Kink, kinkNodes } from "../states/kinkNodes.ts";

/** The kinks whose place is a temperature. */
export function placedKinks(loop: Loop): Kink[] {
  const inputs = inputsOf(loop);
  return kinkNodes(loop).filter(({ node }) =>
    coneOf(loop.graph, [node], inputs).includes(inputs[0] as number),
  );
}

/** The balance as it is where the first arguments of some kinks are the lesser ones, or not, and as if it went on like that. */
export function withoutKinks(
  { graph, net }: Loop,
  sides: readonly { readonly kink: Kink; readonly less: boolean }[],
): number {
  const chosen = sides.flatMap(({ kink, less }) =>
    kink.nodes.map((id): [number, number] => {
      const args = graph.args[id] as readonly [number, number];
      const [first, second] = [Math.min(...args), Math.max(...args)];
      return [id, (graph.ops[id] === "min") === less ? first : second];
    }),
  );
  // arguments have lower numbers: what is outside goes first
  chosen.sort((a, b) => b[0] - a[0]);
  return chosen.reduce((node, pair) => replaceNodes(graph, node, new Map([pair])), net);
}
