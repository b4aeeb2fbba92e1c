// docs/performance.md, from one run.
import { goalsMet } from "./goals.mjs";
import { remarks } from "./remarks.mjs";
import { tableOf } from "./report.mjs";

const markdown = ([head, ...rows]) => {
  const line = (cells) => `| ${cells.join(" | ")} |`;
  return [line(head), line(head.map((_, i) => (i ? "--:" : "---"))), ...rows.map(line)].join("\n");
};

export function performancePage({ lines, loadBefore, loadAfter }, questions, { rounds, planets }) {
  const goals = goalsMet(questions).map(([what, aim, measured, met]) => [
    what,
    aim,
    measured,
    met ? "yes" : "no",
  ]);
  return `# Performance

Written by \`node bench/run.mjs --write\` from one run. \`npm run bench\` repeats it on your machine; nothing here is
asserted by a test.

${lines.map((line) => `- ${line}`).join("\n")}
- Load of the machine: ${loadBefore.toFixed(1)} before the run, ${loadAfter.toFixed(1)} after it.

## How it is measured

All contestants of a table run in turns, ${rounds} rounds after three that do not count, and the order turns by one place each
round. The ratio is the median of the ratios within a round. Times are processor time of the whole process with all its
threads, except where a line says "by the clock"; a busy machine still makes them longer, less so the ratios. Before
anything is timed, all programs must give the same sums and temperatures. C, NumPy and SciPy run as processes of their own
that time themselves.

The two populations have ${planets} planets each, drawn with fixed seeds, all states wanted between 2.7 and 2000 K.
Icy: flux 900–1800 W m⁻², internal flux 0–2 W m⁻², albedo from 0.55–0.75 to 0.20–0.35 around 255–275 K over a width of
5–25 K, emissivity 0.55–0.70. With vapour: the same heating, emission σT⁴/(1 + ¾τ) with
τ = τ₀ + τ₁·exp(L(1/288 − 1/T)), τ₀ 0.2–0.8, τ₁ 0.05–0.6, L 5200–5600 K, less 5.35 ln(C/280) W m⁻² with C 50–20,000 ppm;
a load for the search, beyond the range in which that forcing was published.

- C: places where N′ changes sign first, then Newton's method kept inside each monotone piece. Written for these two budgets
  (it knows where to look), no proof.
- NumPy: N on a grid of 400 steps for all planets at once, then Newton's method for all changes of sign at once.
- SciPy: the same grid, then \`brentq\` for each change of sign.
- "Wrong counts" are planets whose number of states differs from the proved one.

## Aims

${markdown([["", "aim", "measured", "reached"], ...goals])}

${remarks}

## All tables

${questions.map((question) => [markdown(tableOf(question)), question.note].filter(Boolean).join("\n\n")).join("\n\n")}
`;
}
