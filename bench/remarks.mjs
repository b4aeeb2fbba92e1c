// What the numbers mean, for docs/performance.md; to be read again when they change.
export const remarks = `## What this says

The grid methods lose states: where two lie between neighbouring places of the grid, neither is seen, and nothing in the
answer shows it. The solver in C loses none here, but it was written for these two budgets and proves nothing. The proved
search is the only one whose counts are known to be right, for any budget, and it is not as fast as was aimed at. Why:

- **What is read costs more.** One enclosure of N, ∂N/∂T and ∂²N/∂T² with its rounding errors takes as long as five to ten
  values of N in C, and about as many enclosures are read as C reads values.
- **Half of the time is not spent in enclosures** but in the search around them. It makes about 12 kB of garbage for each
  planet, which then has to be collected.
- **The same bits everywhere** cost something: our tanh takes about 1.4 times as long as the built-in one, our exp no more.

Without permission to generate code (a page with a strict policy) everything is 10 to 20 times slower, in the same bits.

A law called with numbers checks every one of them against its range; that is what separates it from the bare formula.

**Size**, gzipped, by consumer of the core door (\`node .config/size.mjs\` measures it): one law 3.13 kB against an aim of 3 kB,
\`closeLoop\`, \`findStates\` and the operations 19.4 kB against an aim of 13 kB. Of the latter, proof is about 6 kB (enclosures
2, enumeration 4), the elementary functions 1.6 kB, the search by sampling 1.2 kB; the rest is the recording of budgets with
reservoirs, units and refusals that name what is wrong, and the reading of states with ledgers and notes.

Loops of a new shape need their derivatives, the text of their code, and its compilation. Times by the clock suffer most from
whatever else the machine does; compare them with the processor time in the line below, which counts the threads that compile.`;
