// What depends on steady inputs alone is computed ahead, in the same bits.
import { describe, expect, test } from "vitest";
import { derivative } from "../../src/graph/derivative.ts";
import { enclosureKernel } from "../../src/reading/enclosureKernel.ts";
import { allowGeneration } from "../../src/reading/generation.ts";
import { randomNumbers, randomPlan, recordPlan } from "../graph/randomGraph.ts";

describe.each([
  ["generated", true],
  ["interpreted", false],
])("%s", (_, generated) => {
  test("a kernel with steady inputs gives the bits of one without, on 1,500 random graphs", () => {
    allowGeneration(generated);
    const random = randomNumbers(5);
    const different: string[] = [];
    let finite = 0;
    for (let k = 0; k < 1500; k++) {
      const plan = randomPlan(random, 4, 3);
      const recorded = recordPlan(plan, 3);
      if (!recorded) continue;
      const { graph, inputs, output } = recorded;
      const [x, y] = inputs as [number, number, number];
      const slope = derivative(graph, output, x, inputs);
      const reading = { inputs, outputs: [output, slope], wide: new Set([x, y]) };
      const whole = enclosureKernel(graph, reading);
      const split = enclosureKernel(graph, { ...reading, steady: new Set(inputs.slice(1)) });
      const [a, b] = [new Float64Array(6), new Float64Array(6)];
      for (let g = 0; g < 2; g++) {
        const low = Float64Array.from({ length: 3 }, () => (random() - 0.3) * 5);
        const high = low.map((v, i) => (i === 1 ? v + random() * 0.2 : v));
        split.prepare(low, high);
        for (let t = 0; t < 3; t++) {
          low[0] = (random() - 0.3) * 5;
          high[0] = low[0] + random() * 0.5;
          whole(low, high, a);
          split(low, high, b);
          if (a.every(Number.isFinite)) finite++;
          if (a.some((v, i) => !Object.is(v, b[i]))) different.push(JSON.stringify(plan));
        }
      }
    }
    allowGeneration(true);
    expect(different.slice(0, 2)).toEqual([]);
    expect(finite).toBeGreaterThan(1500);
  });

  test("claims nothing before it is prepared, nor for steady inputs outside their range", () => {
    allowGeneration(generated);
    const recorded = recordPlan({ op: "add", args: [{ input: 0 }, { input: 1 }] }, 2);
    const { graph, inputs, output } = recorded as NonNullable<typeof recorded>;
    const [x, y] = inputs as [number, number];
    const ranges = new Map([[y, [0, 1] as const]]);
    const kernel = enclosureKernel(graph, {
      ...{ inputs, outputs: [output], wide: new Set([x]), steady: new Set([y]), ranges },
    });
    const out = new Float64Array(3);
    const read = (...at: number[]) => {
      kernel(Float64Array.from(at), Float64Array.from(at), out);
      return [...out];
    };
    const none = [Number.NaN, Number.NaN, Number.NaN];
    expect(read(1, 0.5)).toEqual(none);
    kernel.prepare(Float64Array.of(0, 0.5), Float64Array.of(0, 0.5));
    expect(read(1, 0.5)[0]).toBe(1.5);
    kernel.prepare(Float64Array.of(0, 2), Float64Array.of(0, 2));
    expect(read(1, 2)).toEqual(none);
    allowGeneration(true);
  });
});
