// The kinks behind the balance of a loop, and the balance on one side of them.
import { coneOf } from "../graph/cone.ts";
import { replaceNodes } from "../graph/replaceNodes.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";

/** A kink: the difference of two arguments, and every min and max of the two. */
export interface Kink {
  readonly node: number;
  readonly nodes: readonly number[];
}

/** The kinks whose place is a temperature. */
export function kinksOf(loop: Loop): Kink[] {
  const { graph, net } = loop;
  const inputs = inputsOf(loop);
  const found = new Map<number, number[]>();
  for (const id of coneOf(graph, [net], inputs)) {
    if (graph.ops[id] !== "min" && graph.ops[id] !== "max") continue;
    const args = graph.args[id] as readonly [number, number];
    const node = graph.node("sub", [Math.min(...args), Math.max(...args)]);
    found.set(node, [...(found.get(node) ?? []), id]);
  }
  return [...found]
    .filter(([node]) => coneOf(graph, [node], inputs).includes(inputs[0] as number))
    .map(([node, nodes]) => ({ node, nodes }));
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
