// What the numbers mean, for docs/performance.md; to be read again when they change.
export const remarks = `## What this says

The grid methods lose states: where two lie between neighbouring places of the grid, neither is seen, and nothing in the
answer shows it. The solver in C loses none here, but it was written for these two budgets and proves nothing. The proved
search is the only one whose counts are known to be right, for any budget, and it is not as fast as was aimed at. Why:

- **What is read costs more.** At a point N and ∂N/∂T are enclosed with their rounding errors, and all that boxes beside the
  point need is kept; that takes as long as three or four values of N in C. A box between two points then costs a third of it.
- **A proof needs the whole range.** C knows where these budgets turn; we are told by enclosures alone, and split until they
  decide. The shoulders of a tanh help, so icy planets need few boxes. The emission of a column under water vapour is a
  quotient of two quantities that both rise steeply, and is enclosed loosely except over small boxes.
- **About two fifths of the time is not spent in enclosures** but in the search around them. It makes no objects; only where
  exp and tanh are called does the engine put numbers on its heap, some 300 to 700 bytes a planet.
- **The same bits everywhere** cost something: our tanh takes about 1.6 times as long as the built-in one, our exp no more.

Without permission to generate code (a page with a strict policy) everything is 10 to 20 times slower, in the same bits.

A law called with numbers checks every one of them against its range; that is what separates it from the bare formula.

**Size**, gzipped, by consumer of the core door (\`node .config/size.mjs\` measures it): one law 3.11 kB against an aim of 3 kB,
\`closeLoop\`, \`findStates\` and the operations 22.3 kB against an aim of 13 kB. Of the latter, proof is about 8 kB (enclosures
3.5, enumeration 4.5), the elementary functions 1.6 kB, the search by sampling 1.2 kB; the rest is the recording of budgets with
reservoirs, units and refusals that name what is wrong, and the reading of states with ledgers and notes.

Loops of a new shape need their derivatives, the text of their code, and its compilation. Times by the clock suffer most from
whatever else the machine does, and this run was made on a busy one: compare them with the processor time in the line below,
which counts the threads that compile. Ends that serve several boxes cost more when they are prepared than they did before, as
the program of all enclosures is split in four; a search before the engine has optimised it
then takes a sixth of the time it took.`;
