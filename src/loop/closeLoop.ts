// Closes an energy budget by its own temperature.
import { coneOf } from "../graph/cone.ts";
import { fail } from "../ground/errors.ts";
import { checkKeys } from "../ground/names.ts";
import { checkCouplings } from "./checkCouplings.ts";
import { BudgetRecorder } from "./recordBudget.ts";
import { flowsOf, netOf } from "./recordFlows.ts";
import type { Budget, Loop, Tools } from "./types.ts";

/**
 * Records an energy budget as a loop: N(T) = Σ heating − Σ cooling with C dT/dt = N.
 *
 * `write` is called once, with tools to declare what the budget depends on, and returns the flows in W m⁻² of the
 * planet's whole area. Units are checked where they are connected. Variables, givens and couplings share one set of names;
 * flows and `report` have their own.
 *
 * Throws `unreadable`, `bad-budget`, `unknown-name`, `repeated-name`, `reserved-name`, `unit-mismatch`, `temperature-unused`,
 * `coupling-unused`, `coupling-bypassed`, `other-loop`, `not-a-number`, `out-of-range`.
 *
 * @example
 * const loop = closeLoop(({ temperature, given }) => ({
 *   heating: { sunlight: absorbedFlux({ flux: given("flux", 1361, "W m-2"), albedo: 0.3 }) },
 *   cooling: { longwave: greyEmission({ temperature, emissivity: 0.61 }) },
 *   heatCapacity: 4.2e8,
 * }));
 */
export function closeLoop<const N extends string>(write: (tools: Tools) => Budget<N>): Loop<N> {
  if (typeof write !== "function")
    fail("unreadable", { path: "closeLoop", value: write, allowed: "a function" });
  const recorder = new BudgetRecorder();
  const budget = checkedBudget(write(recorder.tools()));
  const { graph, temperature, givens, couplings } = recorder;
  const flows = flowsOf(recorder, budget);
  const net = netOf(graph, flows);
  const heatCapacity = recorder.wanted(budget.heatCapacity, "heatCapacity", "J m-2 K-1", [
    0,
    Number.MAX_VALUE,
  ]);
  const variables = recorder.variablesWith(net, budget.rates ?? {});
  const report = Object.entries(budget.report ?? {}).map(([name, value]) => recorder.reported(name, value));
  const roots = [...variables.map((v) => v.rate), heatCapacity, ...flows.map((f) => f.node)];
  const reached = coneOf(graph, roots);
  if (!coneOf(graph, [net]).includes(temperature)) {
    fail("temperature-unused", {
      path: "budget",
      value: flows.map((f) => f.name).join(),
      allowed: "a flow that depends on it",
    });
  }
  checkCouplings(graph, couplings, reached);
  const laws = reached.map((id) => graph.meanings[id]);
  const sampled = laws.some((m) => m?.kind === "law" && m.card.sampled);
  const toJSON = () => ({
    variables: variables.map(({ name, unit, within }) => ({ name, unit, within })),
    givens: givens.map(({ name, value, unit, within }) => ({ name, value, unit, within: within ?? null })),
    couplings: couplings.map((c) => c.name),
    flows: flows.map(({ name, from, to }) => ({ name, from, to })),
    report: report.map((r) => r.name),
  });
  return Object.freeze({
    graph,
    net,
    heatCapacity,
    variables,
    givens,
    couplings,
    flows,
    report,
    sampled,
    toJSON,
  });
}

const FIELDS = ["heating", "cooling", "exchange", "heatCapacity", "rates", "report"];

function checkedBudget<N extends string>(budget: Budget<N>): Budget<N> {
  const path = "budget";
  const value = budget instanceof Promise ? "a promise" : budget;
  if (typeof value !== "object" || value === null) {
    fail("bad-budget", { path, value, allowed: "{ heating, cooling, heatCapacity }" });
  }
  checkKeys(budget, path, FIELDS);
  for (const side of ["heating", "cooling", "exchange", "rates", "report"] as const) {
    const record = budget[side];
    const optional = side !== "heating" && side !== "cooling";
    if (record === undefined && optional) continue;
    if (typeof record !== "object" || record === null || Array.isArray(record)) {
      fail("bad-budget", { path: `${path}.${side}`, value: record, allowed: "an object with named entries" });
    }
  }
  return budget;
}
