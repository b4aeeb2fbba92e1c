// The ledger of a state: reservoirs and the flows between them.
import { compensatedSum } from "../ground/sum.ts";
import type { FlowRecord } from "../loop/types.ts";
import type { Note } from "./note.ts";
import type { Ledger } from "./state.ts";

/** Rounding of a few flows, relative to the larger of inflow and outflow. */
const CLOSURE = 1e-12;

/**
 * The flows of a loop's state between its reservoirs. Storage is not made from the flows: at the surface it is N, a layer
 * without heat capacity stores nothing, and space is not asked. So a ledger that does not close can be seen.
 */
export function ledgerOf(flows: readonly FlowRecord[], net: number, read: (node: number) => number): Ledger {
  const names = [...new Set(["space", "surface", ...flows.flatMap((f) => [f.from, f.to])])];
  return {
    reservoirs: names.map((name) => ({
      name,
      storage: name === "space" ? null : name === "surface" ? net : 0,
    })),
    flows: flows.map(({ name, from, to, node, standardName }) => ({
      name,
      from,
      to,
      value: read(node),
      standardName,
    })),
  };
}

/** Inflow − outflow − storage of a reservoir, W m⁻². */
export function residualOf(ledger: Ledger, reservoir: string): number {
  const storage = ledger.reservoirs.find((r) => r.name === reservoir)?.storage ?? 0;
  return compensatedSum([...signedFlows(ledger, reservoir), -storage]);
}

/** A note for every reservoir whose inflow and outflow differ by more than rounding. */
export function openReservoirs(ledger: Ledger): Note[] {
  return ledger.reservoirs.flatMap(({ name, storage }): Note[] => {
    if (storage === null) return [];
    const residual = residualOf(ledger, name);
    const bound = CLOSURE * Math.max(...signedFlows(ledger, name).map(Math.abs), 0);
    if (Math.abs(residual) <= bound) return [];
    const text =
      "inflow and outflow of this reservoir do not match its storage: a flow is missing or counted twice";
    const rest = { value: residual, range: [-bound, bound] as const, unit: "W m-2", text, source: null };
    return [{ code: "open-reservoir", severity: "invalid", about: name, ...rest }];
  });
}

function signedFlows(ledger: Ledger, reservoir: string): number[] {
  const touching = ledger.flows.filter((f) => f.from === reservoir || f.to === reservoir);
  return touching.map((f) => (f.to === reservoir ? f.value : -f.value));
}
