// What the live page says beside a field: the fault of this field alone, without what only a reader of the manual needs.
import { expect, test } from "vitest";
import { faultText } from "../../.config/site/live/faultText.mjs";
import { ERROR_CODES, type ThermosteadError } from "../../src/ground/errors.ts";
import { readPlanet } from "../../src/planet/readPlanet.ts";
import { snowy } from "../appraisal/planets.ts";
import { refusal } from "../refusal.ts";

test("of two faults each has a text of its own", () => {
  const wrong = snowy({ redistribution: 7, internalHeat: "-3 W m-2" });
  const error = refusal(() => readPlanet(wrong)) as ThermosteadError;
  expect(error.others).toHaveLength(1);
  expect(error.message).toContain("; also: ");
  const texts = [error, ...error.others].map(faultText);
  expect(ERROR_CODES).toContain(error.code);
  for (const text of texts) expect(text).toMatch(/^[\w.]+: [\w ]+, received .*; allowed: (?!.*(docs|also))/);
  expect(texts.map((text) => text.split(":")[0]).sort()).toEqual(["internalHeat", "redistribution"]);
});

test("a text without what is left out stays as it is", () => {
  expect(faultText({ message: "other words", code: "missing", others: [] })).toBe("other words");
});
