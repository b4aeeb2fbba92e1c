// Splits the program of a span: what depends on steady inputs alone, what depends on one end, and what needs both.
import type { Known, ScalarProgram, Source, Step } from "./scalarProgram.ts";

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

/** What is wanted of a program, and what of it is read instead of computed. */
interface Part {
  readonly outputs: readonly number[];
  readonly known: Known;
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
  const outputs = new Places(end);
  for (const ids of near) for (const id of ids) if (sideOf(id) !== STEADY) outputs.add(mirrored(id));
  const ahead = new Places(frontier(program, outputs.list, (id) => sideOf(id) === STEADY));
  for (const ids of near) for (const id of ids) if (sideOf(id) === STEADY) ahead.add(id);
  const prepared = new Map(
    ahead.list.map((id, i) => [id, { from: "data" as const, place: program.data.length + i }]),
  );
  const fromEnds = (ids: readonly number[]): Known => {
    const known = new Map<number, { from: Source; place: number }>(prepared);
    for (const id of ids) {
      const side = sideOf(id);
      const from = side === LEFT ? "low" : "high";
      if (side !== STEADY) known.set(id, { from, place: outputs.placeOf(mirrored(id)) });
    }
    return known;
  };
  return {
    ahead: ahead.list,
    point: { outputs: outputs.list, known: prepared },
    spans: groups.map((wanted, i) => ({ outputs: wanted, known: fromEnds(near[i] as number[]) })),
  };
}

/** Registers in the order of their first mention. */
class Places {
  readonly list: number[];
  readonly #places = new Map<number, number>();

  constructor(ids: readonly number[]) {
    this.list = [...ids];
    ids.forEach((id, i) => {
      if (!this.#places.has(id)) this.#places.set(id, i);
    });
  }

  add(id: number): void {
    if (!this.#places.has(id)) this.#places.set(id, this.list.push(id) - 1);
  }

  placeOf = (id: number): number => this.#places.get(id) as number;
}

/** The ends on which each register depends. */
function sidesOf({ ops, args }: ScalarProgram, left: number, right: number): Uint8Array {
  const sides = new Uint8Array(ops.length);
  sides[left] = LEFT;
  sides[right] = RIGHT;
  for (let id = 0; id < ops.length; id++) {
    const read = args[id] as readonly number[];
    let side = sides[id] as number;
    for (let i = 0; i < read.length; i++) side |= sides[read[i] as number] as number;
    sides[id] = side;
  }
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
      copy = program.again(program.ops[id] as Step, (program.args[id] as readonly number[]).map(copyOf));
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
  const seen = new Uint8Array(ops.length);
  const found: number[] = [];
  const visit = (id: number): void => {
    if (seen[id] || ops[id] === "literal" || ops[id] === "data") return;
    seen[id] = 1;
    if (isKnown(id)) found.push(id);
    else visitAll(args[id] as readonly number[]);
  };
  const visitAll = (ids: readonly number[]): void => {
    for (let i = 0; i < ids.length; i++) visit(ids[i] as number);
  };
  visitAll(wanted);
  return found;
}
