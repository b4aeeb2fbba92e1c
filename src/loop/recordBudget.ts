// Keeps the books while a budget is written: which names are taken, which nodes they stand for.
import { Graph } from "../graph/node.ts";
import { Quantity } from "../graph/quantity.ts";
import { dimensionOf } from "../ground/dimension.ts";
import { fail } from "../ground/errors.ts";
import { checkedName, failUnknown } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import type { GivenRecord, Named, Tools, VariableRecord } from "./types.ts";

/** Temperatures that a loop may be asked about, K. */
const TEMPERATURES: Range = [0, 1e5];

/** Records what the tools of a budget declare. */
export class BudgetRecorder {
  readonly graph = new Graph();
  readonly temperature = this.graph.input({ kind: "variable", name: "temperature" }, dimensionOf("K"));
  readonly givens: GivenRecord[] = [];
  readonly couplings: { name: string; node: number }[] = [];
  readonly #open = new Map<string, Omit<VariableRecord, "rate">>();
  readonly #taken = new Set(["temperature"]);

  /** The tools that the writer of the budget is given. */
  tools(): Tools {
    const { graph } = this;
    const quantity = (id: number) => new Quantity<never>(graph, id);
    return {
      temperature: quantity(this.temperature),
      given: (name, value, unit, { within } = {}) => {
        this.#claim(name, "given");
        const dimension = dimensionOf(unit);
        const range = within && checkedRange(within, `${name}.within`, unit);
        const node = graph.input({ kind: "given", name }, dimension);
        this.givens.push({ name, node, value: checkedNumber(value, name, unit, range), unit, within: range });
        return quantity(node);
      },
      variable: (name, { within, unit = "1" }) => {
        this.#claim(name, "variable");
        const node = graph.input({ kind: "variable", name }, dimensionOf(unit));
        this.#open.set(name, { name, node, unit, within: checkedRange(within, `${name}.within`, unit) });
        return quantity(node);
      },
      couple: (name, value) => {
        this.#claim(name, "coupling");
        const of = graph.lift(value, name);
        const node = graph.mean(of, { kind: "coupling", name }, graph.dimensions[of]);
        this.couplings.push({ name, node });
        return quantity(node);
      },
    };
  }

  /** The node of a value that must have this unit. */
  wanted(value: unknown, path: string, unit: string, within?: Range): number {
    if (!(value instanceof Quantity)) return this.graph.constant(checkedNumber(value, path, unit, within));
    return this.#withUnit(value, path, unit);
  }

  /** Temperature, whose rate is N, and the declared variables with theirs. */
  variablesWith(net: number, rates: Named<unknown>): VariableRecord[] {
    for (const name of Object.keys(rates)) {
      if (!this.#open.has(name)) failUnknown(`rates.${name}`, name, [...this.#open.keys()]);
    }
    const others = [...this.#open.values()].map((v): VariableRecord => {
      const path = `rates.${v.name}`;
      if (!Object.hasOwn(rates, v.name))
        fail("missing", { path, value: undefined, allowed: `in ${v.unit} per second` });
      return { ...v, rate: this.#withUnit(rates[v.name], path, `${v.unit} s-1`) };
    });
    return [
      { name: "temperature", node: this.temperature, unit: "K", within: TEMPERATURES, rate: net },
      ...others,
    ];
  }

  /** A quantity that is only read. */
  reported(name: string, value: unknown): { name: string; node: number } {
    checkedName(name, `report.${name}`);
    const of = this.graph.lift(value, `report.${name}`);
    return { name, node: this.graph.mean(of, { kind: "report", name }, this.graph.dimensions[of]) };
  }

  #withUnit(value: unknown, path: string, unit: string): number {
    const node = this.graph.lift(value, path);
    this.graph.checkUnit(node, unit, path);
    return node;
  }

  #claim(name: unknown, kind: string): void {
    checkedName(name, kind);
    if (this.#taken.has(name as string)) {
      fail("repeated-name", {
        path: `${kind} ${name}`,
        value: name,
        allowed: "each name once among variables, givens and couplings",
      });
    }
    this.#taken.add(name as string);
  }
}
