// What the proof is made of: enclosures of N at points, and over boxes of temperature between two of them.
import { budgetsOf } from "./budgets.mjs";
import { timed } from "./rounds.mjs";

const ENDS = 128;

/** The same enclosures as generated code and by the interpreter. */
export function enclosures(core, name, columns, count) {
  const loop = core.closeLoop(budgetsOf(core)[name]);
  const givens = loop.givens.map((given) => columns[given.name][0]);
  const contestant = (title, read, out) => ({
    name: title,
    time: () =>
      timed(count, () => {
        let total = 0;
        for (let i = 0; i < count; i++) {
          read(i & (ENDS - 1));
          total += out[0];
        }
        return total;
      }),
  });
  const readings = (how) => {
    const { net, set } = core.enclosedBalance(loop);
    set(givens, givens);
    const { size, point, box, bend } = net;
    const ends = Array.from({ length: ENDS + 4 }, (_, i) => {
      const end = new Float64Array(size);
      end[0] = 200 + i;
      point(end);
      return end;
    });
    const out = new Float64Array(6);
    return [
      contestant(`point: N, ∂N/∂T, ${how}`, (i) => point(ends[i]), ends[0]),
      contestant(`box of 4 K between points: N, ∂N/∂T, ${how}`, (i) => box(ends[i], ends[i + 4], out), out),
      contestant(`the same box: ∂²N/∂T², ${how}`, (i) => bend(ends[i], ends[i + 4], out), out),
    ];
  };
  const generated = readings("generated code");
  core.allowGeneration(false);
  const interpreted = readings("interpreter");
  core.allowGeneration(true);
  return [...generated, ...interpreted];
}
