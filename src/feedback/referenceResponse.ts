// What is left of a budget's answer to temperature when the chosen couplings are cut, and what it may be called.
import { coneOf } from "../graph/cone.ts";
import type { Graph } from "../graph/node.ts";
import type { Loop } from "../loop/types.ts";
import { isAssessed } from "./assessedTerm.ts";
import { type Powers, temperaturePowers } from "./temperaturePowers.ts";

/** What the reference response is called, and why. */
export interface ReferenceName {
  readonly kind: "Planck response" | "reference response";
  readonly text: string;
  readonly contains: readonly string[];
  /** True if slopes are assessed ones, and not computed. */
  readonly assessed: boolean;
}

/** A constant plus something that goes as this power. */
const goesAs = (powers: Powers, power: number): boolean =>
  powers !== null && !isFree(powers) && powers.every((n) => n === 0 || n === power);
const isFree = (powers: Powers): boolean => powers?.length === 1 && powers[0] === 0;

/**
 * Names the reference response of a loop: a Planck response only if all that answers directly goes as T⁴, as emission
 * does. Decided from the graph: the powers of temperature in each flow with the chosen couplings held.
 */
export function referenceName(loop: Loop, chosen: readonly number[]): ReferenceName {
  const { graph, couplings } = loop;
  const temperature = (loop.variables[0] as { node: number }).node;
  const powersIn = (list: readonly { readonly node: number }[], held: readonly number[]) =>
    temperaturePowers(
      graph,
      list.map((r) => r.node),
      temperature,
      held,
    );
  const reached = new Set(coneOf(graph, [loop.net], chosen));
  const left = couplings.filter((c) => reached.has(c.node) && !chosen.includes(c.node));
  const answers = powersIn(left, chosen);
  const contained = left.filter((_, i) => !isFree(answers[i] as Powers));
  const contains = contained.map((c) => c.name);
  const flows = loop.flows.filter((f) => f.sign !== 0);
  // what each flow does by itself, with every coupling held
  const powers = powersIn(flows, [...chosen, ...contained.map((c) => c.node)]);
  const direct = flows.flatMap(({ name, node }, i) =>
    isFree(powers[i] as Powers) ? [] : [{ name, node, powers: powers[i] as Powers }],
  );
  const lines = assessedIn(graph, direct);
  const assessed = assessedIn(graph, flows).length > 0;
  const rest = { contains, assessed } as const;
  if (lines.length > 0 && lines.length === direct.length && contains.length === 0) {
    const text = `assessed, not computed: the best estimate, as a straight line in temperature (${namesOf(lines)})`;
    return { kind: "reference response", text, ...rest };
  }
  const reasons = [...containing(contains), ...reasonsOf(direct, lines)];
  if (reasons.length > 0)
    return { kind: "reference response", text: `not a Planck response: ${reasons.join("; ")}`, ...rest };
  const text =
    direct.length > 0
      ? `the fourth power of temperature in ${namesOf(direct)}, with all chosen couplings held`
      : "no flow answers to temperature except through the chosen couplings";
  return { kind: direct.length > 0 ? "Planck response" : "reference response", text, ...rest };
}

interface Direct {
  readonly name: string;
  readonly node: number;
  readonly powers: Powers;
}

/** The flows that are assessed feedbacks. */
const assessedIn = <F extends { readonly node: number }>(graph: Graph, flows: readonly F[]): F[] =>
  flows.filter(({ node }) =>
    coneOf(graph, [node]).some((id) => {
      const meaning = graph.meanings[id];
      return meaning?.kind === "law" && isAssessed(meaning.card);
    }),
  );

const containing = (names: readonly string[]): string[] =>
  names.length > 0
    ? [`it contains ${names.join(", ")}, which ${names.length > 1 ? "were" : "was"} not chosen`]
    : [];

/** Why flows that answer directly are no emission that goes as the fourth power. */
function reasonsOf(direct: readonly Direct[], assessed: readonly Direct[]): string[] {
  const straight = direct.filter((f) => goesAs(f.powers, 1) && !assessed.includes(f));
  const others = direct.filter((f) => !goesAs(f.powers, 4) && !goesAs(f.powers, 1));
  const reasons: string[] = [];
  if (assessed.length > 0)
    reasons.push(`a straight line in temperature (${namesOf(assessed)}) is a best estimate of an assessment`);
  if (straight.length > 0)
    reasons.push(
      `a straight line in temperature (${namesOf(straight)}) already holds the feedbacks that it was fitted with, such as water vapour and lapse rate`,
    );
  if (others.length > 0)
    reasons.push(
      `${namesOf(others)} ${others.length > 1 ? "depend" : "depends"} on temperature otherwise than by its fourth power`,
    );
  return reasons;
}

const namesOf = (flows: readonly Direct[]): string => flows.map((f) => f.name).join(", ");
