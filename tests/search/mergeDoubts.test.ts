// Undecided neighbours become one entry, and its counts are worded from what is known at its ends.
import { describe, expect, test } from "vitest";
import { mergeDoubts } from "../../src/search/mergeDoubts.ts";
import type { Stretch } from "../../src/search/stretch.ts";

const stretch = (more: Partial<Stretch>): Stretch => ({
  kind: "fold",
  interval: [0, 1],
  enclosure: [-1, 1],
  signs: [1, 1],
  continuous: true,
  most: 2,
  ...more,
});

describe("neighbours", () => {
  const next = (more: Partial<Stretch>) => stretch({ interval: [1, 3], enclosure: [-3, 0.5], ...more });
  test("of one kind that touch are joined, and hold what both hold", () => {
    expect(mergeDoubts([stretch({}), next({}), stretch({ interval: [3, 4], signs: [1, -1] })])).toEqual([
      { kind: "fold", interval: [0, 4], enclosure: [-3, 1], counts: "1, or an odd number" },
    ]);
  });
  test("of different kinds, or apart, stay apart", () => {
    expect(mergeDoubts([stretch({}), next({ kind: "corner" })]).map((u) => u.kind)).toEqual([
      "fold",
      "corner",
    ]);
    expect(mergeDoubts([stretch({}), next({ interval: [1.5, 3] })]).map((u) => u.interval[0])).toEqual([
      0, 1.5,
    ]);
    expect(mergeDoubts([])).toEqual([]);
  });
  test("are continuous only if both are", () => {
    const [one] = mergeDoubts([stretch({ signs: [1, 0] }), next({ signs: [0, -1], continuous: false })]);
    expect(one?.counts).toBe("0 or more");
  });
});

test.each([
  [{}, "0 or 2"],
  [{ most: 3 }, "0, or an even number"],
  [{ signs: [-1, 1] as const }, "1, or an odd number"],
  [{ kind: "flat", signs: [-1, 1] as const }, "1 or more"],
  [{ kind: "flat" }, "0 or more"],
  [{ signs: [0, 1] as const }, "0, 1 or 2"],
  [{ signs: [0, 1] as const, most: 1 }, "0 or 1"],
  [{ signs: [0, 0] as const, most: Number.POSITIVE_INFINITY }, "0 or more"],
  [{ signs: [-1, 1] as const, continuous: false, most: Number.POSITIVE_INFINITY }, "0 or more"],
] satisfies [Partial<Stretch>, string][])("counts of %o", (more, counts) => {
  expect(mergeDoubts([stretch(more)])[0]?.counts).toBe(counts);
});
