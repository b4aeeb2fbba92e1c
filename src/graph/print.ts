// Prints a node as a formula on paper: plain text that common expression parsers read, or TeX.
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

/** The formula of `node`. Shared parts are written out each time they occur. */
export function printNode(g: Graph, node: number, options: PrintOptions): string {
  const known = new Map<number, Printed>();
  const print = (id: number): Printed => {
    const p = known.get(id) ?? printOne(g, id, options, print);
    known.set(id, p);
    return p;
  };
  return print(node).text;
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
