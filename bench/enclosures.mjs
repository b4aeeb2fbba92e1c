// What the proof is made of: enclosures of N over boxes of temperature and at points.
import { budgetsOf } from "./budgets.mjs";
import { timed } from "./rounds.mjs";

/** The same enclosures as generated code and by the interpreter. */
export function enclosures(core, name, columns, count) {
  const loop = core.closeLoop(budgetsOf(core)[name]);
  const givens = loop.givens.map((given) => columns[given.name][0]);
  const out = new Float64Array(9);
  const contestant = (title, read) => ({
    name: title,
    time: () =>
      timed(count, () => {
        let total = 0;
        for (let i = 0; i < count; i++) {
          read(200 + (i & 127));
          total += out[0];
        }
        return total;
      }),
  });
  const readings = (how) => {
    const { net, set } = core.enclosedBalance(loop);
    set(givens, givens);
    return [
      contestant(`box of 4 K: N, ∂N/∂T, ∂²N/∂T², ${how}`, (x) => net.box(x, x + 4, out)),
      contestant(`point: N, ∂N/∂T, ${how}`, (x) => net.point(x, out)),
    ];
  };
  const generated = readings("generated code");
  core.allowGeneration(false);
  const interpreted = readings("interpreter");
  core.allowGeneration(true);
  return [...generated, ...interpreted];
}
