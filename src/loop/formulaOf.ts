// The budget of a loop on paper.
import type { Ports } from "../graph/card.ts";
import { type Notation, printNode } from "../graph/print.ts";
import { checkKeys } from "../ground/names.ts";
import { lawFormula } from "../law/lawFormula.ts";
import type { Law } from "../law/types.ts";
import { checkLoop } from "./checkLoop.ts";
import type { Loop } from "./types.ts";

/** How a formula is printed. */
export interface FormulaOptions {
  /** `text` (plain, read by common expression parsers) unless `tex` is asked for. */
  readonly notation?: Notation;
}

/** The printed budget of a loop: each flow and coupling by name. */
export interface LoopFormula {
  readonly heating: Readonly<Record<string, string>>;
  readonly cooling: Readonly<Record<string, string>>;
  readonly exchange: Readonly<Record<string, string>>;
  readonly couplings: Readonly<Record<string, string>>;
}

/** The formula of a law as text. Throws `unreadable` for what is no law and no loop, `unknown-name`. */
export function formulaOf<I extends Ports>(law: Law<I>, options?: FormulaOptions): string;
/** The formulas of a loop's flows, in which couplings stand by name, and of its couplings. */
export function formulaOf(loop: Loop, options?: FormulaOptions): LoopFormula;
export function formulaOf(of: Law | Loop, options: FormulaOptions = {}): string | LoopFormula {
  const path = "formulaOf";
  checkKeys(options, path, ["notation"]);
  const { notation = "text" } = options;
  if (typeof of === "function" && of.card) return lawFormula(of, { notation });
  checkLoop(of as Loop, path);
  return loopFormula(of as Loop, notation);
}

function loopFormula({ graph, variables, givens, couplings, flows }: Loop, notation: Notation): LoopFormula {
  const named = (name: string) =>
    notation === "tex" ? `\\mathrm{${name.replace(/[\\{}$&#^_%~]/g, "\\$&")}}` : name;
  const names = new Map([...variables, ...givens, ...couplings].map(({ name, node }) => [node, named(name)]));
  const print = (node: number) => printNode(graph, node, { notation, names });
  const side = (sign: 1 | -1 | 0) =>
    Object.fromEntries(flows.filter((f) => f.sign === sign).map((f) => [f.name, print(f.node)]));
  const inside = (node: number) => print((graph.args[node] as readonly number[])[0] as number);
  return Object.freeze({
    heating: side(1),
    cooling: side(-1),
    exchange: side(0),
    couplings: Object.fromEntries(couplings.map((c) => [c.name, inside(c.node)])),
  });
}
