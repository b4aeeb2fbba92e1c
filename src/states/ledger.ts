// The ledger of a state: reservoirs and the flows between them.
import { deepFreeze } from "../ground/deepFreeze.ts";
import { compensatedSum } from "../ground/sum.ts";
import type { FlowRecord } from "../loop/types.ts";
import type { Note } from "./note.ts";
import type { Ledger } from "./state.ts";

/** Rounding of a few flows, relative to the largest of them. */
const CLOSURE = 1e-12;

/** Reservoirs without bounds, whose storage is not asked: they give and take what the planet needs. */
export const BOUNDLESS: readonly string[] = ["space", "interior"];

/** Makes ledgers from the values of the flows, in order, and the net flux. */
export type LedgerWriter = (flowValues: Float64Array, net: number) => Ledger;

/**
 * The flows of a loop's state between its reservoirs. Storage is not made from the flows: at the surface it is N, a layer
 * without heat capacity stores nothing, space and the interior are not asked. So a ledger that does not close can be seen.
 */
export function ledgerWriter(flows: readonly FlowRecord[]): LedgerWriter {
  const names = [...new Set(["space", "surface", ...flows.flatMap((f) => [f.from, f.to])])];
  return (flowValues, net) => {
    const reservoirs = names.map((name) =>
      Object.freeze({ name, storage: BOUNDLESS.includes(name) ? null : name === "surface" ? net : 0 }),
    );
    const rows = flows.map(({ name, from, to, standardName }, i) =>
      Object.freeze({ name, from, to, value: flowValues[i] as number, standardName }),
    );
    return Object.freeze({ reservoirs: Object.freeze(reservoirs), flows: Object.freeze(rows) });
  };
}

/** Inflow − outflow − storage of a reservoir, W m⁻². */
export function residualOf(ledger: Ledger, reservoir: string): number {
  const storage = ledger.reservoirs.find((r) => r.name === reservoir)?.storage ?? 0;
  return compensatedSum([-storage, ...signedFlows(ledger, reservoir)]);
}

/** A note for every reservoir whose inflow and outflow differ by more than rounding. */
export function openReservoirs(ledger: Ledger): Note[] {
  const notes: Note[] = [];
  for (const { name, storage } of ledger.reservoirs) {
    if (storage === null) continue;
    let bound = 0;
    for (const value of signedFlows(ledger, name)) bound = Math.max(bound, CLOSURE * Math.abs(value));
    const residual = residualOf(ledger, name);
    if (!(Math.abs(residual) <= bound)) notes.push(openNote(name, residual, bound));
  }
  return notes;
}

function openNote(about: string, value: number, bound: number): Note {
  const text =
    "inflow and outflow of this reservoir do not match its storage: a flow is missing or counted twice";
  const rest = { value, range: [-bound, bound] as const, unit: "W m-2", text, source: null };
  return deepFreeze({ code: "open-reservoir", severity: "invalid", about, ...rest });
}

/** What flows in, and what flows out as negative numbers, W m⁻². */
export function signedFlows(ledger: Pick<Ledger, "flows">, reservoir: string): number[] {
  const signed: number[] = [];
  for (const { from, to, value } of ledger.flows) {
    if (to === reservoir) signed.push(value);
    else if (from === reservoir) signed.push(-value);
  }
  return signed;
}
