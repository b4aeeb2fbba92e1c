// Splits the program of a span: what depends on steady inputs alone, what depends on one end, and what needs both.
import { ScalarProgram, type Source, type Step } from "./scalarProgram.ts";

/** What a program has to do with spans: its inputs at place 0 are the two ends, all others are steady. */
interface Span {
  /** The registers of the input at the two ends. */
  readonly left: number;
  readonly right: number;
  /** What an end holds, the input first; it depends on `left` alone. */
  readonly end: readonly number[];
  /** What is computed from both ends. */
  readonly groups: readonly (readonly number[])[];
}

/** A program and what is wanted of it. */
interface Part {
  readonly program: ScalarProgram;
  readonly outputs: readonly number[];
}

/** The parts of a program; together they compute what it does, with the same bits. */
export interface SpanParts {
  /** Registers to be computed first; the other parts read them as data behind the program's own. */
  readonly ahead: readonly number[];
  /** Computes an end from its first number: what is wanted there, and what spans need of it. */
  readonly point: Part;
  /** Compute the groups from two ends. */
  readonly spans: readonly Part[];
}

const [STEADY, LEFT, RIGHT, BOTH] = [0, 1, 2, 3];

/** Splits a program; copies steps at the right end into steps at the left one, because an end serves on both sides. */
export function spanParts(program: ScalarProgram, { left, right, end, groups }: Span): SpanParts {
  const sides = sidesOf(program, left, right);
  // what is copied from the right end depends on the left one
  const sideOf = (id: number): number => sides[id] ?? LEFT;
  const mirrored = mirror(program, sideOf, left, right);
  const near = groups.map((wanted) => frontier(program, wanted, (id) => sideOf(id) !== BOTH));
  const atEnds = near.map((ids) => ids.filter((id) => sideOf(id) !== STEADY));
  const carried = new Set(atEnds.flat().map(mirrored));
  const outputs = [...end, ...[...carried].filter((id) => !end.includes(id))];
  const rest = frontier(program, outputs, (id) => sideOf(id) === STEADY);
  const ahead = [...new Set([...rest, ...near.flat().filter((id) => sideOf(id) === STEADY)])];
  const prepared = ahead.map((id, i): Known => [id, "data", program.data.length + i]);
  const inEnd = (id: number): Known => [
    id,
    sideOf(id) === LEFT ? "low" : "high",
    outputs.indexOf(mirrored(id)),
  ];
  return {
    ahead,
    point: { program: withKnown(program, prepared), outputs },
    spans: groups.map((wanted, i) => ({
      program: withKnown(program, [...prepared, ...(atEnds[i] as number[]).map(inEnd)]),
      outputs: wanted,
    })),
  };
}

/** The ends on which each register depends. */
function sidesOf({ ops, args }: ScalarProgram, left: number, right: number): Uint8Array {
  const sides = new Uint8Array(ops.length);
  sides[left] = LEFT;
  sides[right] = RIGHT;
  for (let id = 0; id < ops.length; id++)
    for (const a of args[id] as readonly number[]) sides[id] = (sides[id] as number) | (sides[a] as number);
  return sides;
}

/** The register that computes from the left end what another does from the right one. */
function mirror(
  program: ScalarProgram,
  sideOf: (id: number) => number,
  left: number,
  right: number,
): (id: number) => number {
  const copies = new Map([[right, left]]);
  const copyOf = (id: number): number => {
    if (sideOf(id) !== RIGHT) return id;
    let copy = copies.get(id);
    if (copy === undefined) {
      copy = program.step(program.ops[id] as Step, ...(program.args[id] as readonly number[]).map(copyOf));
      copies.set(id, copy);
    }
    return copy;
  };
  return copyOf;
}

/** The first registers met on the way from what is wanted to the inputs that are known, sources of the program aside. */
function frontier(
  { ops, args }: ScalarProgram,
  wanted: readonly number[],
  isKnown: (id: number) => boolean,
): number[] {
  const seen = new Set<number>();
  const found: number[] = [];
  const visit = (id: number): void => {
    if (seen.has(id) || ops[id] === "literal" || ops[id] === "data") return;
    seen.add(id);
    if (isKnown(id)) found.push(id);
    else (args[id] as readonly number[]).forEach(visit);
  };
  wanted.forEach(visit);
  return found;
}

/** A register that is read instead of computed. */
type Known = readonly [id: number, from: Source, place: number];

/** A copy of a program in which some registers are known. */
function withKnown(program: ScalarProgram, known: readonly Known[]): ScalarProgram {
  const copy = new ScalarProgram(program);
  for (const [id, from, place] of known) {
    copy.ops[id] = from;
    copy.args[id] = [];
    copy.values[id] = place;
  }
  return copy;
}
