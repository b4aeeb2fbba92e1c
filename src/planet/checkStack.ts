// A layer that is heated must give its heat away.
import { fail } from "../ground/errors.ts";
import { innerEmission } from "./outgoing.ts";
import type { PlanetDescription } from "./planetShape.ts";
import type { Numbers } from "./wire.ts";

/** Throws `out-of-range` for a layer with heat and without emissivity, which has no steady state. */
export function checkStack({ longwave }: PlanetDescription, numbers: Numbers): void {
  const { written, path } = innerEmission(longwave);
  if (!("layers" in written)) return;
  written.layers.forEach((_, i) => {
    const layer = `${path}.layers[${i}]`;
    const heating = numbers(`${layer}.heating`);
    if (heating === 0 || numbers(`${layer}.emissivity`) > 0) return;
    const allowed = `with emissivity 0, as ${layer} has it, only 0`;
    fail("out-of-range", { path: `${layer}.heating`, value: heating, allowed, unit: "W m-2" });
  });
}
