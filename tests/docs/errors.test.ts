// docs/errors.md: one section for each code, each with an example that really throws it.
import fs from "node:fs";
import { describe, expect, test } from "vitest";
import { ERROR_CODES, ThermosteadError } from "../../src/ground/errors.ts";
import { reporting } from "./claims.ts";
import { programsOf } from "./programs.ts";

const text = fs.readFileSync("docs/errors.md", "utf8");
const sections = text.split(/^## /m).slice(1);
const titleOf = (section: string): string => section.slice(0, section.indexOf("\n"));

describe("docs/errors.md", () => {
  test("has one section for each code, in the order of the list, under the name that messages link to", () => {
    expect(sections.map(titleOf)).toEqual([...ERROR_CODES]);
    const { message } = new ThermosteadError("missing", { path: "a", value: undefined, allowed: "b" });
    expect(message).toContain("docs/errors.md#missing");
  });

  // that the messages are what the library says is checked with all other examples
  test.each(sections.map((section) => [titleOf(section), section]))(
    "%s: cause, example, remedy",
    (code, section) => {
      expect(section).toMatch(/^\S+\n\n\S[^`]/);
      expect(section).toMatch(/^Remedy: /m);
      const claims = programsOf(section).flatMap((p) => p.fences.flatMap((f) => reporting(f, 0).claims));
      expect(claims.length).toBeGreaterThan(0);
      for (const { expected } of claims)
        expect(expected).toMatch(new RegExp(`^ThermosteadError: .*#${code}\\)$`));
    },
  );
});
