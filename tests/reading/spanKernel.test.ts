// Enclosures over spans between ends: the bits of whole boxes, from what each end has computed once.
import { describe, expect, test } from "vitest";
import { derivative } from "../../src/graph/derivative.ts";
import { enclosureKernel } from "../../src/reading/enclosureKernel.ts";
import { allowGeneration } from "../../src/reading/generation.ts";
import { spanKernel } from "../../src/reading/spanKernel.ts";
import { randomNumbers, randomPlan, recordPlan } from "../graph/randomGraph.ts";

describe.each([
  ["generated", true],
  ["interpreted", false],
])("%s", (_, generated) => {
  test("ends and spans have the bits of points and boxes, on 1,500 random graphs", () => {
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
      const atEnds = [output, derivative(graph, output, x, inputs)];
      const bend = derivative(graph, atEnds[1] as number, x, inputs);
      const wide = new Set([y]);
      const spans = spanKernel(graph, { inputs, atEnds, over: [atEnds, [bend]], wide, ranges: new Map() });
      const point = enclosureKernel(graph, { inputs, outputs: atEnds, wide });
      const box = enclosureKernel(graph, { inputs, outputs: [...atEnds, bend], wide: new Set([x, y]) });
      const ends = [0, 1, 2].map(() => new Float64Array(spans.size));
      const [a, b] = [new Float64Array(9), new Float64Array(9)];
      const compare = (count: number) => {
        if (a.subarray(0, count).every(Number.isFinite)) finite++;
        for (let i = 0; i < count; i++) if (!Object.is(a[i], b[i])) different.push(JSON.stringify(plan));
      };
      for (let g = 0; g < 2; g++) {
        const low = Float64Array.from({ length: 3 }, () => (random() - 0.3) * 5);
        const high = low.map((v, i) => (i === 1 ? v + random() * 0.2 : v));
        spans.prepare(low, high);
        ends.forEach((end, i) => {
          end[0] = i > 0 ? (ends[i - 1]?.[0] as number) + random() * 0.5 : (random() - 0.3) * 5;
          spans.point(end);
          low[0] = end[0];
          point(low, high, a);
          b.set(end.subarray(1, 7));
          compare(6);
        });
        for (let i = 0; i < 2; i++) {
          const [left, right] = [ends[i], ends[i + 1]] as [Float64Array, Float64Array];
          low[0] = left[0] as number;
          high[0] = right[0] as number;
          box(low, high, a);
          spans.over[0]?.(left, right, b);
          spans.over[1]?.(left, right, b.subarray(6));
          compare(9);
        }
      }
    }
    allowGeneration(true);
    expect(different.slice(0, 2)).toEqual([]);
    expect(finite).toBeGreaterThan(1500);
  });

  test("claims nothing before it is prepared, outside of ranges, nor between ends out of order", () => {
    allowGeneration(generated);
    const recorded = recordPlan({ op: "add", args: [{ input: 0 }, { input: 1 }] }, 2);
    const { graph, inputs, output } = recorded as NonNullable<typeof recorded>;
    const [x, y] = inputs as [number, number];
    const ranges = new Map([
      [x, [-1, 1] as const],
      [y, [0, 1] as const],
    ]);
    const spans = spanKernel(graph, { inputs, atEnds: [output], over: [[output]], wide: new Set(), ranges });
    const end = (at: number) => {
      const made = new Float64Array(spans.size).fill(7);
      made[0] = at;
      spans.point(made);
      return made;
    };
    const over = (a: Float64Array, b: Float64Array) => {
      const out = new Float64Array(3).fill(7);
      spans.over[0]?.(a, b, out);
      return [...out];
    };
    const prepare = (at: number) => spans.prepare(Float64Array.of(0, at), Float64Array.of(0, at));
    const none = [Number.NaN, Number.NaN, Number.NaN];
    expect([...end(1).subarray(1, 4)]).toEqual(none);
    prepare(0.5);
    const [a, b] = [end(-1), end(1)];
    expect([a[1], b[1]]).toEqual([-0.5, 1.5]);
    expect(over(a, b).slice(0, 2)).toEqual([-0.5, 1.5]);
    expect(over(b, a)).toEqual(none);
    for (const outside of [-1.5, 1.5, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect([...end(outside).subarray(1)].every(Number.isNaN)).toBe(true);
      expect(over(a, end(outside))).toEqual(none);
      expect(over(end(outside), b)).toEqual(none);
    }
    prepare(2);
    expect(over(a, b)).toEqual(none);
    expect([...end(1).subarray(1, 4)]).toEqual(none);
    allowGeneration(true);
  });
});
