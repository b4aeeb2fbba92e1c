// Loops of many shapes, so that each is new to a process that is warm: bits choose how the interior heat is written down.
import { budgetsOf } from "./budgets.mjs";

/** How many shapes there are; each makes code of its own. */
export const SHAPES = 256;

/** The budget of a population in one of its shapes. */
export function shapedBudget(core, name, shape) {
  const write = budgetsOf(core)[name];
  return (tools) => {
    const budget = write(tools);
    let interior = budget.heating.interior;
    for (let bit = 1; bit < SHAPES; bit *= 2)
      interior = (shape & bit) === 0 ? core.add(interior, 0) : core.mul(interior, 1);
    return { ...budget, heating: { ...budget.heating, interior } };
  };
}
