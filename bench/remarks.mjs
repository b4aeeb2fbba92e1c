// What the numbers mean, for docs/performance.md; to be read again when they change.
export const remarks = `## What this says

The grid methods lose states: where two lie between neighbouring places of the grid, neither is seen, and nothing in the
answer shows it. The solver in C loses none here, but it was written for these two budgets and proves nothing. The proved
search is the only one whose counts are known to be right, for any budget, and it is not as fast as was aimed at. Why:

- **What is read costs more.** At a point N and ∂N/∂T are enclosed with their rounding errors, and all that boxes beside the
  point need is kept; that takes as long as five values of N in C. A box between two points then costs a third of it.
- **A proof needs the whole range.** C knows where these budgets turn; we are told by enclosures alone, and split until they
  decide. The shoulders of a tanh help, so icy planets need few boxes. The emission of a column under water vapour is a
  quotient of two quantities that both rise steeply, and is enclosed loosely except over small boxes.
- **About two fifths of the time is not spent in enclosures** but in the search around them. It makes no objects; only where
  exp and tanh are called does the engine put numbers on its heap, some 300 to 700 bytes a planet.
- **The same bits everywhere** cost something: our tanh takes about 1.6 times as long as the built-in one, our exp no more.

Without permission to generate code (a page with a strict policy) everything is 10 to 20 times slower, in the same bits.

A law called with numbers checks every one of them against its range; that is what separates it from the bare formula.

**Size**, gzipped, by consumer of the core door (\`node .config/size.mjs\` measures it): one law 3.00 kB against an aim of 3 kB,
\`closeLoop\`, \`findStates\` and the operations 21.0 kB against an aim of 13 kB. Of the latter, enclosures are 5.0 kB, their
enumeration 4.6, the reading of states with ledgers and notes 3.0, the graph with its derivatives 2.4, the recording of budgets
with reservoirs 2.4, elementary functions 1.2, units and refusals that name what is wrong 1.2. What could still be split off is
small: the interpreter, which pages without permission to generate code need, is 0.35 kB, all sentences together 0.7 kB.

Loops of a new shape need their derivatives, the text of their code, and its compilation, and in a fresh process everything
runs for the first time: of the instructions of a first diagram two fifths go into compiling the library's own functions and the
generated ones, a tenth into collecting garbage, and the rest runs in code that the engine has not optimised. Programs are
therefore written by loops over places, without iterators, spreads and copies; a diagram along a given in which the budget is a
straight line reads one kernel in place of three; and no zero costs a bisection. Together that took a third off it. Times by the
clock suffer most from whatever else the machine does, and from the price of fresh memory: compare them with the processor time
in the line below, which counts the threads that compile.`;
