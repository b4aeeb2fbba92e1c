// The formula of a law on paper, printed from its graph: never typed twice.
import type { Port, Ports } from "../graph/card.ts";
import { type Notation, printNode } from "../graph/print.ts";
import { STEFAN_BOLTZMANN } from "../ground/constants.ts";
import { recordLaw } from "./recordLaw.ts";
import type { Law } from "./types.ts";

/** How a law's formula is printed. */
export interface LawFormulaOptions {
  /** `text` uses the ports' names and is read by common expression parsers; `tex` uses the symbols of the trade. */
  readonly notation: Notation;
  /** How many records a list port is shown with; 2 unless said. */
  readonly rows?: number;
  /** Leaves optional ports out. */
  readonly withoutOptional?: boolean;
}

/** Prints the right-hand side of a law. Wires in lists read `fraction_1`, `fraction_2`, or get an index in TeX. */
export function lawFormula<I extends Ports>(law: Law<I>, options: LawFormulaOptions): string {
  const { notation, rows = 2, withoutOptional = false } = options;
  const shares = (path: string) => (withoutOptional && path.endsWith(".fraction") ? 1 / rows : undefined);
  const { graph, output, inputs } = recordLaw(law, {
    rows: () => rows,
    has: () => !withoutOptional,
    fixed: shares,
  });
  const names = new Map(inputs.map(({ path, port, node }) => [node, wireName(path, port, notation)]));
  return printNode(graph, output, { notation, names, constants: notation === "tex" ? SYMBOLS : NONE });
}

/** The name of a wire on paper. */
export function wireName(path: string, port: Port, notation: Notation): string {
  const [, row, name = path] = /\[(\d+)\]\.(.*)$/.exec(path) ?? [];
  if (notation === "text") return row === undefined ? name : `${name}_${Number(row) + 1}`;
  const symbol = texSymbol(port.symbol);
  return row === undefined ? symbol : `${symbol.replace(/_.*$/, "")}_{${Number(row) + 1}}`;
}

const NONE: ReadonlyMap<number, string> = new Map();
const SYMBOLS: ReadonlyMap<number, string> = new Map([[STEFAN_BOLTZMANN, "\\sigma"]]);

const GREEK: Readonly<Record<string, string>> = {
  α: "\\alpha",
  ε: "\\varepsilon",
  τ: "\\tau",
  ρ: "\\rho",
  σ: "\\sigma",
  "⟨": "\\langle ",
  "⟩": "\\rangle ",
};

/** `T_eff` in TeX is `T_{\mathrm{eff}}`. */
export function texSymbol(symbol: string): string {
  const tex = [...symbol].map((letter) => GREEK[letter] ?? letter).join("");
  return tex.replace(
    /_(.+)$/,
    (_, index: string) => `_{${/^[A-Za-z]{2,}$/.test(index) ? `\\mathrm{${index}}` : index}}`,
  );
}
