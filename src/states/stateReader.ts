// Reads everything about a state of a loop of one variable at a temperature.
import { fail } from "../ground/errors.ts";
import { inputsOf } from "../loop/inputs.ts";
import type { Loop } from "../loop/types.ts";
import { valueKernel } from "../reading/valueKernel.ts";
import { checksOf, notesFrom } from "./checkState.ts";
import { ledgerWriter, openReservoirs } from "./ledger.ts";
import type { Located } from "./located.ts";
import type { State } from "./state.ts";

/** Makes states from temperatures. */
export type StateReader = (located: Located, givens: readonly number[]) => State;

/** Prepares one kernel that reads all that a state holds. */
export function stateReader(loop: Loop): StateReader {
  const { graph, net, heatCapacity, flows, couplings, report, givens } = loop;
  const inputs = inputsOf(loop);
  const checks = checksOf(loop);
  const groups: (readonly Asked[])[] = [
    [
      { name: "net flux", node: net },
      { name: "heatCapacity", node: heatCapacity },
    ],
    ...[flows, couplings, report, checks],
  ];
  const asked = groups.flat();
  const kernel = valueKernel(graph, { inputs, outputs: asked.map((a) => a.node) });
  const all = new Float64Array(asked.length);
  // one view of the kernel's output for each group
  let end = 0;
  const views = groups.map((group) => {
    end += group.length;
    return all.subarray(end - group.length, end);
  });
  const [core, flowValues, coupled, reported, checked] = views as [Values, Values, Values, Values, Values];
  const writeLedger = ledgerWriter(flows);
  return (located, given) => {
    const { at, stability, lambda, slope, imbalance } = located;
    kernel(Float64Array.of(at, ...given), all);
    for (let i = 0; i < all.length; i++) {
      if (!Number.isFinite(all[i])) failAt(asked[i] as Asked, all[i]);
      // JSON does not keep -0; this makes it 0
      (all[i] as number) += 0;
    }
    const [netFlux, capacity] = core as unknown as [number, number];
    const bracket = Object.freeze([located.bracket[0], located.bracket[1]] as const);
    const ledger = writeLedger(flowValues, netFlux);
    const notes = [...notesFrom(checks, checked), ...openReservoirs(ledger)];
    return Object.freeze({
      variables: Object.freeze({ temperature: Object.freeze({ value: at, bracket }) }),
      temperature: at,
      bracket,
      givens: namedValues(givens, given),
      couplings: namedValues(couplings, coupled),
      report: namedValues(report, reported),
      stability,
      eigenvalues: capacity > 0 ? Object.freeze([Object.freeze({ re: lambda / capacity, im: 0 })]) : null,
      feedbackParameter: lambda,
      feedbackParameterRange: slope && Object.freeze([slope[0], slope[1]] as const),
      settledFeedbackParameter: lambda,
      eFoldingTime: stability === "stable" && capacity >= 0 ? -capacity / lambda : null,
      imbalance: Object.freeze({ temperature: imbalance }),
      ledger,
      proved: slope !== null && !notes.some((n) => n.severity === "invalid"),
      notes: Object.freeze(notes),
    });
  };
}

/** No NaN and no infinity leaves in a state. */
const failAt = ({ name: path }: Asked, value: unknown): never =>
  fail("not-finite", { path, value, allowed: "a finite number in every state" });

/** What is read of a state. */
interface Asked {
  readonly name: string;
  readonly node: number;
}
type Values = Float64Array;

function namedValues(
  list: readonly Pick<Asked, "name">[],
  values: ArrayLike<number>,
): Readonly<Record<string, number>> {
  const record: Record<string, number> = {};
  // a given may be -0 as well
  for (let i = 0; i < list.length; i++)
    record[(list[i] as { name: string }).name] = (values[i] as number) + 0;
  return Object.freeze(record);
}
