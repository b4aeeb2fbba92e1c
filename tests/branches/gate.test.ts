// The node through which alone an input reaches another, and in which that other is a straight line.
import { expect, test } from "vitest";
import { gateOf } from "../../src/graph/gate.ts";
import { printNode } from "../../src/graph/print.ts";
import * as core from "../../src/index.ts";
import { distantLoop, formulaLoop, vapourLoop } from "./loops.ts";

function gateText(loop: core.Loop, along: string): string | undefined {
  const { graph, net, variables, givens } = loop;
  const names = new Map([...variables, ...givens].map(({ node, name }) => [node, name]));
  const input = givens.find((g) => g.name === along)?.node as number;
  const gate = gateOf(graph, { target: net, input, unknowns: variables.map((v) => v.node) });
  return gate && printNode(graph, gate.node, { notation: "text", names });
}

test("a flux, an emissivity or a luminosity is its own gate; a distance goes through the flux", () => {
  expect(gateText(vapourLoop(), "flux")).toBe("flux");
  expect(gateText(distantLoop(), "luminosity")).toBe("luminosity");
  expect(gateText(distantLoop(), "distance")).toMatch(/^luminosity \/ \(distance\^2 \* 12\.566/);
});

test("a parameter that enters in two places or inside a curve has none", () => {
  const { add, exp, mul, sub } = core;
  expect(gateText(vapourLoop(), "carbon")).toBeUndefined();
  expect(gateText(distantLoop(), "width")).toBeUndefined();
  expect(
    gateText(
      formulaLoop((t, p) => sub(exp(p), mul(p, t))),
      "p",
    ),
  ).toBeUndefined();
  // twice, but in a straight line
  expect(
    gateText(
      formulaLoop((t, p) => add(sub(p, t), mul(p, t))),
      "p",
    ),
  ).toBe("p");
  // a forcing that depends on the parameter alone
  expect(
    gateText(
      formulaLoop((t, p) => sub(mul(5.35, core.log(p)), t)),
      "p",
    ),
  ).toBe("log(p)");
});
