// The closed form, and N(T) of the icy planet with and without its slope, as several programs compute them.
import { budgetsOf } from "./budgets.mjs";
import { timed } from "./rounds.mjs";

const ROWS = 1024; // a ring of planets, so that no input is a constant
const temperatureAt = (i) => 200 + (i & 127);
const SIGMA = 5.670374419e-8;

// Each kernel gets a loop with code of its own: one that several kernels share calls them indirectly, which costs more
// than what is measured.
const loopOver = (kernel, points, out) =>
  new Function(
    "kernel, points, out, temperatureAt",
    `return (n) => {
      let total = 0;
      for (let i = 0; i < n; i++) {
        const point = points[i & ${ROWS - 1}];
        point[0] = temperatureAt(i);
        kernel(point, out);
        total += out[0] + out[1];
      }
      return total;
    }`,
  )(kernel, points, out, temperatureAt);

/** Contestants by question; each has `total(n)`, a sum over n evaluations to check, and `time()`. */
export function evaluations(core, columns, c, count) {
  const { flux, internalFlux, cold, warm, midpoint, width, emissivity } = columns;
  const contestant = (name, total) => ({ name, total, time: () => timed(count, () => total(count)) });
  const inC = (word) =>
    c && {
      name: "C -O3",
      total: async (n) => (await c.time(`${word} ${n}`)).results[0],
      time: async () => (await c.time(`${word} ${count}`)).each,
    };

  const loop = core.closeLoop(budgetsOf(core).ice);
  const inputs = core.inputsOf(loop);
  const slopes = core.slopeNodes(loop.graph, { inputs, outputs: [loop.net], wrt: [inputs[0]] });
  const points = Array.from({ length: ROWS }, (_, row) =>
    Float64Array.of(0, ...loop.givens.map((given) => columns[given.name][row])),
  );
  const reading = (generating, nodes) => {
    core.allowGeneration(generating);
    const kernel = core.valueKernel(loop.graph, { inputs, outputs: [loop.net, ...nodes] });
    core.allowGeneration(true);
    const out = new Float64Array(2);
    return loopOver(kernel, points, out);
  };

  const { equilibriumTemperature } = core;
  return {
    "closed form: the equilibrium temperature": [
      inC("closed"),
      contestant("our law, all checks", (n) => {
        let total = 0;
        for (let i = 0; i < n; i++) {
          const row = i & (ROWS - 1);
          total += equilibriumTemperature({
            flux: flux[row],
            albedo: cold[row],
            redistribution: 0.25,
            emissivity: emissivity[row],
            internalFlux: internalFlux[row],
          });
        }
        return total;
      }),
      contestant("JavaScript by hand", (n) => {
        let total = 0;
        for (let i = 0; i < n; i++) {
          const row = i & (ROWS - 1);
          const heating = 0.25 * flux[row] * (1 - cold[row]) + internalFlux[row];
          total += Math.sqrt(Math.sqrt(heating / (emissivity[row] * SIGMA)));
        }
        return total;
      }),
    ].filter(Boolean),

    "N(T) of an icy planet": [
      inC("residual"),
      contestant("our generated code", reading(true, [])),
      contestant("our interpreter", reading(false, [])),
      contestant("JavaScript by hand, Math.tanh", (n) => {
        let total = 0;
        for (let i = 0; i < n; i++) {
          const row = i & (ROWS - 1);
          const x = temperatureAt(i);
          const open = (1 + Math.tanh((x - midpoint[row]) / width[row])) / 2;
          const albedo = cold[row] + (warm[row] - cold[row]) * open;
          const emitted = emissivity[row] * SIGMA * (x * x * (x * x));
          total += (flux[row] * (1 - albedo)) / 4 + internalFlux[row] - emitted;
        }
        return total;
      }),
    ].filter(Boolean),

    "N(T) and ∂N/∂T of an icy planet": [
      inC("slope"),
      contestant("our generated code", reading(true, slopes)),
      contestant("our interpreter", reading(false, slopes)),
    ].filter(Boolean),
  };
}
