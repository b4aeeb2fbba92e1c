// Prints a node as a formula on paper: plain text that common expression parsers read, or TeX.
import { coneOf } from "./cone.ts";
import type { Graph } from "./node.ts";
import type { Op } from "./op.ts";

/** How a formula is written down. */
export type Notation = "text" | "tex";

/** What a printer needs to know besides the graph. */
export interface PrintOptions {
  readonly notation: Notation;
  /** Nodes printed by name instead of being written out. */
  readonly names: ReadonlyMap<number, string>;
  /** Constants printed by a symbol, by value. */
  readonly constants?: ReadonlyMap<number, string>;
}

interface Printed {
  readonly text: string;
  /** ½ negative number, 1 sum, 2 product, 4 power, 5 atom: a part of lower rank than its place needs gets parentheses. */
  readonly rank: number;
}

/** A formula longer than this many operations, written out, is broken into named steps. */
const LONGEST = 60;
/** A shared part smaller than this is written out wherever it occurs. */
const SMALLEST_STEP = 4;

/**
 * The formula of `node`. Shared parts are written out each time they occur, unless that becomes too long: then they are
 * named first, one step a line (`s1 = ...`), and the last line is the formula.
 */
export function printNode(g: Graph, node: number, options: PrintOptions): string {
  const named = new Map(options.names);
  const lines: string[] = [];
  const printer = (id: number): Printed => printOne(g, id, { ...options, names: named }, printer);
  const steps = stepsOf(g, node, options);
  steps.forEach((id, i) => {
    const text = printer(id).text;
    const name = options.notation === "tex" ? `s_{${i + 1}}` : `s${i + 1}`;
    lines.push(`${name} = ${text}`);
    named.set(id, name);
  });
  lines.push(printer(node).text);
  return lines.join(options.notation === "tex" ? " \\\\ " : "\n");
}

/** The shared parts to be named, each after those it needs; none when the formula is short enough. */
function stepsOf(g: Graph, node: number, { names }: PrintOptions): number[] {
  const cone = coneOf(g, [node], names.keys());
  const size = new Map<number, number>();
  const uses = new Map<number, number>();
  for (const id of cone) {
    const args = names.has(id) ? [] : (g.args[id] as readonly number[]);
    size.set(
      id,
      args.reduce((total, a) => total + (size.get(a) as number), 1),
    );
    for (const a of new Set(args)) uses.set(a, (uses.get(a) ?? 0) + 1);
  }
  if ((size.get(node) as number) <= LONGEST) return [];
  const shared = (id: number) => (uses.get(id) as number) > 1 && (size.get(id) as number) >= SMALLEST_STEP;
  return cone.filter((id) => id !== node && shared(id) && !names.has(id) && g.ops[id] !== "mean");
}

function printOne(g: Graph, id: number, options: PrintOptions, print: (id: number) => Printed): Printed {
  const name = options.names.get(id);
  if (name !== undefined) return { text: name, rank: 5 };
  const op = g.ops[id] as Op;
  const args = g.args[id] as readonly number[];
  const tex = options.notation === "tex";
  if (op === "const") return printNumber(g.values[id] as number, options);
  if (op === "mean") return print(args[0] as number);
  if (op === "mul" && args[0] === args[1]) return printPower(g, args[0] as number, 2, tex, print);
  const parts = args.map(print);
  const at = (i: number, rank: number) => wrapped(parts[i] as Printed, rank, tex);
  switch (op) {
    case "add":
      return { text: `${at(0, 1)} + ${at(1, 1)}`, rank: 1 };
    case "sub":
      return { text: `${at(0, 1)} - ${at(1, 2)}`, rank: 1 };
    case "mul":
      return { text: `${at(0, 2)} ${tex ? "\\, " : "* "}${at(1, 3)}`, rank: 2 };
    case "div":
      if (tex) return { text: `\\frac{${at(0, 0)}}{${at(1, 0)}}`, rank: 4 };
      return { text: `${at(0, 2)} / ${at(1, 3)}`, rank: 2 };
    case "neg":
      return { text: `-${at(0, 3)}`, rank: 1 };
    case "sqrt":
      return { text: tex ? `\\sqrt{${at(0, 0)}}` : `sqrt(${at(0, 0)})`, rank: 5 };
    case "step":
      // Iverson's bracket: 1 where it is true, else 0
      return { text: tex ? `\\left[${at(0, 0)} \\ge 0\\right]` : `(${at(0, 0)} >= 0)`, rank: 5 };
    default:
      return { text: printCall(g, id, op, parts, tex), rank: 5 };
  }
}

function printCall(g: Graph, id: number, op: Op, parts: readonly Printed[], tex: boolean): string {
  const list = parts.map((p) => p.text).join(", ");
  const name = op === "call" ? `f${g.values[id]}` : op;
  if (!tex) return `${name}(${list})`;
  return `${op === "call" ? `f_{${g.values[id]}}` : `\\${name === "log" ? "ln" : name}`}\\left(${list}\\right)`;
}

/** Squares of squares read as one power: ((x²)²) is x⁴. */
function printPower(
  g: Graph,
  base: number,
  power: number,
  tex: boolean,
  print: (id: number) => Printed,
): Printed {
  const args = g.args[base] as readonly number[];
  if (g.ops[base] === "mul" && args[0] === args[1])
    return printPower(g, args[0] as number, power * 2, tex, print);
  const text = wrapped(print(base), 5, tex);
  return { text: tex ? `${text}^{${power}}` : `${text}^${power}`, rank: 4 };
}

function printNumber(value: number, { notation, constants }: PrintOptions): Printed {
  const symbol = constants?.get(value);
  if (symbol !== undefined) return { text: symbol, rank: 5 };
  const rank = value < 0 || Object.is(value, -0) ? 0.5 : 5;
  const text = Object.is(value, -0) ? "-0" : String(value);
  if (notation === "text" || !text.includes("e")) return { text, rank };
  const [digits, exponent] = text.split("e") as [string, string];
  return { text: `${digits}\\times 10^{${Number(exponent)}}`, rank: Math.min(rank, 2) };
}

function wrapped(part: Printed, rank: number, tex: boolean): string {
  if (part.rank >= rank) return part.text;
  return tex ? `\\left(${part.text}\\right)` : `(${part.text})`;
}
