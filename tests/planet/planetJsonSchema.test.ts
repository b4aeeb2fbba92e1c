// The JSON Schema: what it says agrees with the laws, and with what is read.
import { describe, expect, it, test } from "vitest";
import type { Port } from "../../src/graph/card.ts";
import { DESCRIPTION_LAWS, DIFFERENCES, isBound } from "../../src/planet/fieldLaws.ts";
import { planetJsonSchema } from "../../src/planet/planetSchema.ts";

const LAWS = Object.entries(DESCRIPTION_LAWS);

/** All objects inside a value. */
function* objectsIn(value: unknown): Generator<Record<string, unknown>> {
  if (typeof value !== "object" || value === null) return;
  if (!Array.isArray(value)) yield value as Record<string, unknown>;
  for (const inner of Object.values(value)) yield* objectsIn(inner);
}

test("is of the draft 2020-12, plain data, and closed everywhere", () => {
  const schema = planetJsonSchema();
  expect(schema.$schema).toBe("https://json-schema.org/draft/2020-12/schema");
  expect(JSON.parse(JSON.stringify(schema))).toEqual(schema);
  expect(schema.required).toEqual(["format", "orbit", "redistribution", "longwave", "heatCapacity"]);
  expect(schema.oneOf).toEqual([{ required: ["albedo"] }, { required: ["surface"] }]);
  for (const part of objectsIn(schema))
    if (part.type === "object") expect(part.additionalProperties).toBe(false);
});

describe.each(LAWS)("%s", (name, law) => {
  const filled = Object.entries(law.card.inputs).filter(([port]) => !isBound(name, port));
  const values = filled.filter((entry): entry is [string, Port] => !("each" in entry[1]));
  const part = [...objectsIn(planetJsonSchema())].find(
    ({ properties }) => (properties as { law?: { const?: string } } | undefined)?.law?.const === name,
  );
  const properties = part?.properties as Record<string, { anyOf: Record<string, unknown>[] }>;

  it("is named as it is exported, with all its ports but the bound ones", () => {
    expect(law.card.name).toBe(name);
    expect(Object.keys(properties)).toEqual(["law", ...filled.map(([port]) => port)]);
  });
  it("requires what has no default, and has the range of each pure number", () => {
    const required = filled.filter(([, of]) => !("default" in of));
    expect(part?.required).toEqual(["law", ...required.map(([port]) => port)]);
    for (const [port, { unit, within }] of values.filter(
      ([p]) => `${name}.${p}` !== "ceilingEmission.emission",
    )) {
      const [first] = properties[port]?.anyOf ?? [];
      if (unit !== "1") expect(first?.type).toBe("string");
      else expect([first?.minimum, first?.maximum]).toEqual(within);
    }
  });
  // a temperature begins at absolute zero or at what is cold, a width just above 0
  it("marks its temperature differences as such, so that degC is refused for them", () => {
    const differences = values.filter(
      ([, { unit, within = [0, 0] }]) => unit === "K" && 0 < within[0] && within[0] < 1,
    );
    expect(DIFFERENCES.filter((path) => path.startsWith(`${name}.`))).toEqual(
      differences.map(([port]) => `${name}.${port}`),
    );
  });
});
