// The complete diagram of temperature against one parameter.
import { checkKeys } from "../ground/names.ts";
import { checkedNumber, checkedRange, type Range } from "../ground/range.ts";
import { givensAt } from "../loop/inputs.ts";
import { kept } from "../loop/kept.ts";
import type { Givens, Loop } from "../loop/types.ts";
import { checkOneVariable } from "../states/prepared.ts";
import { checkedAlong } from "./checkedAlong.ts";
import type { Curve } from "./curve.ts";
import type { Diagram, UndecidedStretch } from "./diagram.ts";
import { diagramOf, type Parts, type Task } from "./diagramOf.ts";
import { gateCurve } from "./gateCurve.ts";
import { impliedCurve } from "./impliedCurve.ts";
import { type NetReader, netReader } from "./netReader.ts";
import { partsInColumns } from "./partsInColumns.ts";
import { partsOnCurve } from "./partsOnCurve.ts";
import { sampledCurve } from "./sampledCurve.ts";
import type { ZeroReader } from "./zeroReader.ts";

/** Along which parameter, where to look, and how hard. */
export interface TraceBranchesOptions<N extends string = string> {
  /** The given that changes. */
  readonly along: Givens<N>;
  /** Its lowest and highest value. */
  readonly between: Range;
  /** Lowest and highest temperature, K. */
  readonly within: Range;
  /** Values of other givens that differ from those the loop was closed with. */
  readonly at?: { readonly [K in Givens<N>]?: number };
  /** How many boxes may be enclosed; 20,000 unless said. */
  readonly effort?: number;
  /** How far a straight line between two points of a branch may miss it, as a share of the parameter's range; 0.002 unless said. */
  readonly tolerance?: number;
}

const lines = /* @__PURE__ */ kept(gateCurve);
const implied = /* @__PURE__ */ kept(impliedCurve);
const sampled = /* @__PURE__ */ kept(sampledCurve);

/**
 * The complete diagram of temperature against one given: every branch with its stability and ranges, every fold and corner
 * fold with brackets in both coordinates, the jumps of a slow rise and fall, and the parameters without a state. Nothing is
 * traced from a start, so a branch that hangs together with no other is found like any other.
 *
 * The given is followed to the node through which alone it reaches the budget and in which the budget is a straight line,
 * N = a(T) + b(T)·g (the flux for a distance, the forcing for a concentration; found from the graph). Then g = −a(T)/b(T)
 * gives one parameter for each temperature, a fold is a zero of λ along this curve, and all of them are enumerated with
 * proof. With `complete: true` the number of states at any parameter outside of the folds' brackets is the number of branches
 * whose range holds it.
 *
 * Temperatures in K, λ in W m⁻² K⁻¹, the parameter in its own unit. Throws `unknown-name`, `out-of-range`, `not-a-number`,
 * `unreadable`, `missing`, `several-variables`, and `contradiction` for a given that the budget does not depend on or that
 * is set in `at` as well.
 *
 * @example traceBranches(loop, { along: "flux", between: [900, 1900], within: [150, 400] }).folds
 */
export function traceBranches<N extends string>(
  loop: Loop<N>,
  options: TraceBranchesOptions<N>,
): Diagram<Givens<N>> {
  const path = "traceBranches";
  checkKeys(options, path, ["along", "between", "within", "at", "effort", "tolerance"]);
  checkOneVariable(loop, path);
  const { name, place, given } = checkedAlong(loop, options.along, options.at, path);
  const within = checkedRange(options.within, "within", "K", loop.variables[0]?.within);
  const between = checkedRange(options.between, "between", given.unit, given.within);
  const task: Task = {
    ...{ name, place: place - loop.variables.length, within, between, givens: givensAt(loop, options.at) },
    effort: checkedNumber(options.effort ?? 20_000, "effort", "1", [10, 1e9]),
    tolerance: checkedNumber(options.tolerance ?? 0.002, "tolerance", "1", [1e-6, 1]),
  };
  const net = netReader(loop, task.place, task.givens);
  const curve = curveOf(loop, task);
  const reader = curve?.reader?.() ?? net;
  return diagramOf(loop, task, reader, partsOf(loop, task, { curve, reader, net })) as Diagram<Givens<N>>;
}

/** What there is to read a loop along its parameter. */
interface Readers {
  readonly curve: Curve | undefined;
  readonly reader: ZeroReader;
  readonly net: NetReader;
}

/** The parts of a diagram, on a curve if there is one. */
function partsOf(loop: Loop, task: Task, { curve, reader, net }: Readers): Parts {
  const onCurve = curve && partsOnCurve(curve, task, reader);
  const has = (kind: UndecidedStretch["kind"]) => onCurve?.undecided.some((u) => u.kind === kind);
  if (onCurve && !has("level") && !has("other")) return onCurve;
  const inColumns = partsInColumns(loop, task, net);
  if (!onCurve) return inColumns;
  // a state on a level does not answer to the parameter and lies on no curve; any other place that is open on the curve is
  // no wider than rounding, and says more than a stretch of parameters would
  const open = inColumns.undecided.length > 0 && !has("level");
  return open || inColumns.branches.length === 0 ? onCurve : inColumns;
}

/** The first kind of curve that the loop is proved to have, its givens set. */
function curveOf(loop: Loop, { name, givens, between, within }: Task): Curve | undefined {
  for (const make of loop.sampled ? [sampled] : [lines, implied]) {
    const curve = make(loop, name);
    if (curve?.set(givens, between, within)) return curve;
  }
  return undefined;
}
