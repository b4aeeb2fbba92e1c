// The ledgers of all climates that hold, side by side.
import type { StateAppraisal } from "./appraisedState.ts";
import { kelvin, type Table } from "./report.ts";

/** As many climates as stand side by side on a page of text. */
const MOST = 4;

/** One column for each state; the last rows show that what goes in comes out or is stored. */
export const ledgerTable = (states: readonly StateAppraisal[]): Table[] =>
  states.length <= MOST
    ? ledgersOf(states)
    : [...ledgersOf(states.slice(0, MOST)), ...ledgerTable(states.slice(MOST))];

function ledgersOf(states: readonly StateAppraisal[]): Table[] {
  const ledgers = states.map((s) => s.state.ledger);
  const [first] = ledgers;
  if (!first) return [];
  const number = (value: number) => value.toFixed(4).replace(/^-(0\.0*)$/, "$1");
  const flows = first.flows.map(({ name, from, to }, i) => [
    name,
    `${from} to ${to}`,
    ...ledgers.map((ledger) => number(ledger.flows[i]?.value ?? 0)),
  ]);
  const balanced = first.reservoirs.filter((r) => r.storage !== null).map((r) => r.name);
  const sums = balanced.flatMap((name) => {
    const net = ledgers.map(({ flows }) =>
      flows.reduce((sum, f) => sum + (f.to === name ? f.value : f.from === name ? -f.value : 0), 0),
    );
    const stored = ledgers.map((l) => l.reservoirs.find((r) => r.name === name)?.storage ?? 0);
    return [
      [name, "in minus out", ...net.map(number)],
      ["", "stored", ...stored.map(number)],
    ];
  });
  const head = ["flow", "", ...states.map((s) => `at ${kelvin(s.state.temperature)} K`)];
  return [{ head, rows: [...flows, ...sums], right: states.map((_, i) => i + 2) }];
}
