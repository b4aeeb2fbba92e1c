// A coupling must reach the budget, and nothing may go round it: otherwise holding it would not hold it.
import type { Graph } from "../graph/node.ts";
import { fail } from "../ground/errors.ts";

/** Throws `coupling-unused` or `coupling-bypassed` for the first coupling at fault. `reached`: the nodes of the budget. */
export function checkCouplings(
  g: Graph,
  couplings: readonly { name: string; node: number }[],
  reached: readonly number[],
): void {
  const used = new Set(reached);
  for (const { name, node } of couplings) {
    const path = `couple("${name}")`;
    if (!used.has(node))
      fail("coupling-unused", {
        path,
        value: name,
        allowed: "the value that couple returned, used in a flow",
      });
    const source = (g.args[node] as readonly number[])[0] as number;
    // only the value of a law: arithmetic such as T − 288 is shared by accident
    if (g.meanings[source]?.kind !== "law") continue;
    const bypass = reached.some(
      (id) => (g.args[id] as readonly number[]).includes(source) && g.meanings[id]?.kind !== "coupling",
    );
    if (bypass)
      fail("coupling-bypassed", { path, value: name, allowed: "only the value that couple returned" });
  }
}
