// The flows of a budget: who gives whom how much, and their sum.
import type { Graph } from "../graph/node.ts";
import { add, neg, sub } from "../graph/operations.ts";
import { Quantity } from "../graph/quantity.ts";
import { dimensionOf } from "../ground/dimension.ts";
import { fail } from "../ground/errors.ts";
import { checkedName, checkKeys } from "../ground/names.ts";
import { checkReductions } from "./checkReductions.ts";
import type { BudgetRecorder } from "./recordBudget.ts";
import type { Budget, FlowRecord } from "./types.ts";

/** Each side of a budget: its sign in N, and between which reservoirs its flows go unless said (an exchange must say). */
const SIDES = [
  { side: "heating", sign: 1, from: "space", to: "surface" },
  { side: "cooling", sign: -1, from: "surface", to: "space" },
  { side: "exchange", sign: 0, from: "", to: "" },
] as const;

/** All flows of a budget in the order in which they were written. */
export function flowsOf(recorder: BudgetRecorder, budget: Budget): FlowRecord[] {
  const flows: FlowRecord[] = [];
  for (const { side, sign, ...ends } of SIDES) {
    for (const [name, flow] of Object.entries(budget[side] ?? {})) {
      const path = `${side}.${name}`;
      checkedName(name, path);
      if (flows.some((f) => f.name === name))
        fail("repeated-name", { path, value: name, allowed: "each flow's name once" });
      const written = flowOf(recorder, flow, path, ends);
      checkReductions(recorder.graph, written.node, sign, path);
      flows.push({ name, sign, ...written });
    }
  }
  return flows;
}

/** N = Σ heating − Σ cooling, each summed from left to right. */
export function netOf(graph: Graph, flows: readonly FlowRecord[]): number {
  const total = (sign: 1 | -1) => {
    const terms = flows.filter((f) => f.sign === sign).map((f) => new Quantity(graph, f.node));
    return terms.length === 0 ? undefined : terms.reduce((sum, term) => add(sum, term));
  };
  const heating = total(1);
  const cooling = total(-1);
  if (!heating && !cooling)
    fail("bad-budget", { path: "budget", value: "no flows", allowed: "at least one flow" });
  if (!cooling) return (heating as Quantity).id;
  return heating ? sub(heating, cooling).id : neg(cooling).id;
}

type Ends = { readonly from: string; readonly to: string };

function flowOf(
  recorder: BudgetRecorder,
  flow: unknown,
  path: string,
  ends: Ends,
): Omit<FlowRecord, "name" | "sign"> {
  let written: { value?: unknown; from?: unknown; to?: unknown; standardName?: unknown } = { value: flow };
  if (typeof flow === "object" && flow !== null && !(flow instanceof Quantity)) {
    checkKeys(flow, path, ["value", "from", "to", "standardName"]);
    written = flow;
  }
  const node = recorder.wanted(written.value, path, "W m-2");
  const from = checkedName(written.from ?? ends.from, `${path}.from`);
  const to = checkedName(written.to ?? ends.to, `${path}.to`);
  if (from === to)
    fail("bad-budget", { path, value: from, allowed: "a flow between two different reservoirs" });
  const meaning = { kind: "flow", name: path } as const;
  const { standardName } = written;
  return {
    node: recorder.graph.mean(node, meaning, dimensionOf("W m-2")),
    from,
    to,
    standardName: standardName === undefined ? null : checkedName(standardName, `${path}.standardName`),
  };
}
