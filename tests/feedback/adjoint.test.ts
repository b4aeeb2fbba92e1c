// Slopes by one sweep backwards are those of the forward rules, on random graphs.
import { expect, test } from "vitest";
import { adjoint } from "../../src/graph/adjoint.ts";
import { derivative } from "../../src/graph/derivative.ts";
import { valueKernel } from "../../src/reading/valueKernel.ts";
import { randomNumbers, randomPlan, recordPlan } from "../graph/randomGraph.ts";

test("600 random graphs: the same slopes in every input, and zero where there is none", () => {
  const random = randomNumbers(41);
  let compared = 0;
  for (let i = 0; i < 600; i++) {
    const recorded = recordPlan(randomPlan(random, 6, 3), 3);
    if (!recorded) continue;
    const { graph, inputs, output } = recorded;
    let slopes: number[];
    let forward: number[];
    try {
      slopes = adjoint(graph, output, inputs);
      forward = inputs.map((x) => derivative(graph, output, x, inputs));
    } catch {
      // a constant part of a derivative is not finite: refused in both
      continue;
    }
    const kernel = valueKernel(graph, { inputs, outputs: [...slopes, ...forward] });
    const out = new Float64Array(6);
    for (let k = 0; k < 5; k++) {
      kernel(
        Float64Array.from({ length: 3 }, () => 0.2 + 2 * random()),
        out,
      );
      for (let j = 0; j < 3; j++) {
        const [a, b] = [out[j] as number, out[j + 3] as number];
        if (!Number.isFinite(a) || !Number.isFinite(b)) continue;
        compared++;
        // products in another order: roundings of a few dozen operations, magnified where terms cancel
        expect(Math.abs(a - b)).toBeLessThanOrEqual(1e-9 * Math.max(1e-6, Math.abs(b)));
      }
    }
  }
  expect(compared).toBeGreaterThan(3000);
});
