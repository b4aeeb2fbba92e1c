// Which feedbacks hold a state, and how strong each is.
import { checkKeys } from "../ground/names.ts";
import { checkBelongs, type StateLike, type Taken } from "../loop/checkBelongs.ts";
import { couplingsNamed } from "../loop/holdFixed.ts";
import { kept } from "../loop/kept.ts";
import type { Couplings, Loop } from "../loop/types.ts";
import { checkOneVariable } from "../states/prepared.ts";
import type { Feedbacks } from "./feedbacks.ts";
import { type Influences, influencesOf } from "./influences.ts";
import { type ReferenceName, referenceName } from "./referenceResponse.ts";
import { writeFeedbacks } from "./writeFeedbacks.ts";

/** What to look through. */
export interface AnalyseFeedbacksOptions<N extends string = string> {
  /** The couplings to cut; all unless said. */
  readonly through?: readonly Couplings<N>[];
}

/**
 * The feedbacks that act in a state, exactly. Each chosen coupling d is cut and counts as an input; every path
 * temperature → d₁ → … → d_k → net flux is a feedback loop, and its λ_i is the product of the partial derivatives along it.
 * The direct path is the reference response λ₀. By the chain rule λ₀ + Σ λ_i = λ = ∂N/∂T.
 *
 * Feedback factors f_i = λ_i/(−λ₀); gain 1/(1 − Σ f); sensitivities −1/λ and dT/dp = −(∂N/∂p)/λ; times −C/λ. λ in
 * W m⁻² K⁻¹, negative where it restores. Every number has proved bounds over the state's bracket, in the field of its name
 * with `Range`, unless a law is sampled; nothing is divided by what these bounds do not tell from 0. Laws, helper quantities
 * and names that are not couplings change nothing, and a coarser choice of couplings sums a finer one.
 *
 * Throws `unknown-name` (with the nearest coupling), `foreign-state`, `several-variables`, `unreadable`, `missing`,
 * `not-a-number`, `not-finite` (a slope at the state), `out-of-range`. Source: Roe 2009, Annu. Rev. Earth Planet.
 * Sci. 37, 93; the sign of λ is that of the IPCC's sixth report.
 *
 * @example analyseFeedbacks(loop, state).loops // [{ through: ["opticalDepth"], feedbackParameter: 0.683, … }, …]
 */
export function analyseFeedbacks<N extends string>(
  loop: Loop<N>,
  state: StateLike<N>,
  options: AnalyseFeedbacksOptions<N> = {},
): Feedbacks<N> {
  checkKeys(options, "analyseFeedbacks", ["through"]);
  checkOneVariable(loop, "analyseFeedbacks");
  const names = options.through ?? loop.couplings.map((c) => c.name as Couplings<N>);
  const { nodes, chosen, name, read } = preparedFor(loop, couplingsNamed(loop, names, "through"));
  const at = checkBelongs(loop, state, "state");
  const influences = read(at);
  return writeFeedbacks<N>(loop, { at, chosen, end: nodes.length + 1, name, influences });
}

/** What an analysis needs of a loop, for one choice of couplings. */
interface Prepared {
  readonly nodes: readonly number[];
  readonly chosen: readonly string[];
  readonly name: ReferenceName;
  readonly read: (at: Taken) => Influences;
}
const prepared = /* @__PURE__ */ kept(() => new Map<string, Prepared>());

function preparedFor(loop: Loop, couplings: Loop["couplings"]): Prepared {
  const known = prepared(loop);
  const ordered = [...couplings].sort((a, b) => a.node - b.node);
  const nodes = ordered.map((c) => c.node);
  const found = known.get(nodes.join());
  if (found) return found;
  const chosen = ordered.map((c) => c.name);
  const made = { nodes, chosen, name: referenceName(loop, nodes), read: influencesOf(loop, nodes) };
  known.set(nodes.join(), made);
  return made;
}
