// A ledger from the numbers of a paper, which need not close.
import { deepFreeze } from "../ground/deepFreeze.ts";
import { balanceOf } from "./balanceOf.ts";
import { notesOf } from "./notesOf.ts";
import type { PublishedBudget, PublishedLedger } from "./published.ts";
import { readPublished } from "./readPublished.ts";

/**
 * The ledger of a published budget: its flows between reservoirs, and for the top and every reservoir what they leave over.
 * Residual (inflow − outflow), error (of independent errors, in quadrature), rounding (Σ half a last digit) and storage are
 * kept apart; storage is only what the paper states, never a difference of flows. What residual and storage do not
 * explain by their errors, or by rounding if that is larger, carries the note `residual-beyond-error`.
 *
 * All in W m⁻² of the planet's whole area. Light on its way may be a reservoir too (sunlight: from space, to the air, the
 * ground and back), so that flows which a paper took from different sources need not be made to agree.
 *
 * Throws `missing`, `not-a-number`, `out-of-range` (an error below 0, a range without the value), `contradiction` (an
 * error and a range), `unknown-name` (a storage of no reservoir), `reserved-name` (a reservoir called `top`),
 * `bad-budget` (no flow, or one that ends where it begins), `unreadable`. Source: errors add as in JCGM 100:2008, §5.1.
 */
export function publishedLedger(budget: PublishedBudget): PublishedLedger {
  const { source, reservoirs, places, flows, storage } = readPublished(budget);
  const found = places.map((place) => balanceOf(place, flows, storage.get(place)));
  return deepFreeze({
    source,
    reservoirs: reservoirs.map((name) => ({ name, storage: storage.get(name)?.value ?? null })),
    flows,
    balances: found.map(({ balance }) => balance),
    notes: found.flatMap(({ balance, rounding }) => notesOf(balance, rounding, source)),
  });
}
