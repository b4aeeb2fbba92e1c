// Enclosures of random graphs hold what 300 bits say, and generated code agrees with the interpreter.
import { afterEach, expect, test } from "vitest";
import { derivative } from "../../src/graph/derivative.ts";
import { enclosureKernel } from "../../src/reading/enclosureKernel.ts";
import { allowGeneration } from "../../src/reading/generation.ts";
import { randomNumbers, randomPlan, recordPlan } from "../graph/randomGraph.ts";
import { toDouble } from "./bigNumber.ts";
import { boundsOf, holds, isKnown } from "./enclosing.ts";
import { exactReading } from "./exactReading.ts";

afterEach(() => allowGeneration(true));

const INPUTS = 3;
const RANGES = [
  [0, 5],
  [-5, 0],
  [-5, 5],
  [0.01, 3],
] as const;
const SPECIAL = [0, -0, 1, -1, 2, 1e-320];

test("value, slope and curvature of 2,500 random graphs, over boxes, points, kinks and ±0", {
  timeout: 120_000,
}, () => {
  const random = randomNumbers(11);
  const faults: string[] = [];
  const seen = { graphs: 0, promises: 0, failures: 0, kinks: 0, undefinedPoints: 0 };
  for (let k = 0; k < 2500; k++) {
    const plan = randomPlan(random, 3 + (k % 3), INPUTS);
    const recorded = recordPlan(plan, INPUTS);
    if (!recorded) continue;
    const { graph, inputs, output } = recorded;
    const slope = derivative(graph, output, inputs[0] as number, inputs);
    const curvature = derivative(graph, slope, inputs[0] as number, inputs);
    const declared = inputs.filter(() => random() < 0.5);
    const ranges = new Map(
      declared.map((id) => [id, RANGES[Math.floor(random() * 4)] as (typeof RANGES)[0]]),
    );
    const wide = new Set(inputs.filter(() => random() < 0.6));
    const reading = { inputs, outputs: [output, slope, curvature], wide, ranges };
    allowGeneration(true);
    const generated = enclosureKernel(graph, reading);
    allowGeneration(false);
    const interpreted = enclosureKernel(graph, reading);
    const [a, b] = [new Float64Array(9), new Float64Array(9)];
    seen.graphs++;
    if (graph.ops.includes("pick")) seen.kinks++;
    for (let t = 0; t < 3; t++) {
      const low = new Float64Array(INPUTS);
      const high = new Float64Array(INPUTS);
      inputs.forEach((id, i) => {
        const [least, greatest] = ranges.get(id) ?? [-5, 5];
        const clamp = (x: number) => Math.min(Math.max(x, least), greatest);
        const special = SPECIAL[Math.floor(random() * SPECIAL.length)] as number;
        low[i] = clamp(random() < 0.2 ? special : least + (greatest - least) * random());
        high[i] = wide.has(id) ? clamp((low[i] as number) + random() * random() * 2) : (low[i] as number);
      });
      generated(low, high, a);
      interpreted(low, high, b);
      const where = `${JSON.stringify(plan)} in [${low}] … [${high}]`;
      for (let i = 0; i < 3; i++) {
        const bounds = boundsOf(a, i);
        const other = boundsOf(b, i);
        if (isKnown(bounds) !== isKnown(other) || (isKnown(bounds) && `${bounds}` !== `${other}`)) {
          faults.push(`two answers, ${bounds} and ${other}: ${where}`);
        }
        if (isKnown(bounds) ? !(bounds[0] <= bounds[1]) || bounds[2] < 0 : bounds[2] < 0) {
          faults.push(`no bounds, ${bounds}: ${where}`);
        }
      }
      for (let j = 0; j < 4; j++) {
        const share = j < 2 ? j : random();
        const point = low.map((x, i) => Math.min(x + ((high[i] as number) - x) * share, high[i] as number));
        const truths = exactReading(graph, reading, point);
        if (truths[0] === null) seen.undefinedPoints++;
        for (let i = 0; i < 3; i++) {
          const bounds = boundsOf(a, i);
          // a slope promises something only where the value does, and a curvature where the slope does
          if (![0, 1, 2].slice(0, i + 1).every((n) => isKnown(boundsOf(a, n)))) {
            seen.failures++;
            continue;
          }
          seen.promises++;
          const truth = truths[i];
          if (!truth || !holds(bounds, truth)) {
            faults.push(`order ${i}: ${truth && toDouble(truth)} not in ${bounds} at ${point}: ${where}`);
          }
        }
      }
    }
  }
  expect(faults.slice(0, 3)).toEqual([]);
  expect(seen.graphs).toBeGreaterThan(1500);
  expect(seen.promises).toBeGreaterThan(30_000);
  expect(Math.min(seen.failures, seen.kinks * 10, seen.undefinedPoints)).toBeGreaterThan(1500);
});
