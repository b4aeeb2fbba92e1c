// Published budgets of the Earth, as the constructor takes them.
import type { PublishedBudget } from "../../src/index.ts";
import table from "../reference/published_ledgers.json" with { type: "json" };

/** A published budget, with what its flows leave over at each place. */
export interface Published {
  readonly budget: PublishedBudget;
  readonly residuals: Readonly<Record<string, number>>;
}

export const published: readonly Published[] = table.budgets.map(({ residuals, ...budget }) => ({
  budget: budget as unknown as PublishedBudget,
  residuals,
}));

/** The budget of the paper whose citation begins so. */
export function publishedBy(author: string): Published {
  const found = published.find(({ budget }) => budget.source.startsWith(author));
  if (!found) throw new Error(`no budget of ${author}`);
  return found;
}
