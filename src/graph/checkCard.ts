// Whether the card of a law makes sense: when it is first recorded, as laws are defined at import and most are not used.
import { dimensionOf } from "../ground/dimension.ts";
import { checkedRange } from "../ground/range.ts";
import type { LawCard, Ports } from "./card.ts";

const fine = /* @__PURE__ */ new WeakSet<LawCard>();

/** Throws for a port or an output with a unit that is none, or a range that is not two increasing numbers. Looks once at each card. */
export function checkCard(card: LawCard): void {
  if (fine.has(card)) return;
  checkPorts({ output: card.output, ...card.inputs }, card.name);
  fine.add(card);
}

function checkPorts(ports: Ports, law: string): void {
  for (const [name, port] of Object.entries(ports)) {
    const path = `${law}.${name}`;
    if ("each" in port) checkPorts(port.each, path);
    else {
      dimensionOf(port.unit, path);
      const { within, unit } = port;
      // an open end is infinite
      if (within && !(within[0] < within[1])) checkedRange(within, path, unit);
    }
  }
}
