// The schema of descriptions in the two standards that tools read.
import { toJSONSchema } from "zod/mini";
import { checkedPlanet } from "./checkedPlanet.ts";
import { faultsIn } from "./faults.ts";
import { keysOf } from "./keysOf.ts";
import { PLANET_FORMAT, PLANET_SHAPE, type PlanetDescription } from "./planetShape.ts";
import { KEYWORDS } from "./wording.ts";

/** A fault as Standard Schema reports it. */
interface SchemaIssue {
  readonly message: string;
  readonly path: readonly (string | number)[];
}

/** A checker in the form of Standard Schema version 1. */
export interface PlanetSchema {
  readonly "~standard": {
    readonly version: 1;
    readonly vendor: "thermostead";
    validate(
      value: unknown,
    ): { readonly value: PlanetDescription } | { readonly issues: readonly SchemaIssue[] };
    /** Never set: carries the types. */
    readonly types?: { readonly input: PlanetDescription; readonly output: PlanetDescription };
  };
}

/** Checks a description by all the rules of `readPlanet`, for tools that take a Standard Schema; it never throws. */
export const planetSchema: PlanetSchema = {
  "~standard": {
    version: 1,
    vendor: "thermostead",
    validate(value) {
      try {
        return { value: checkedPlanet(value, "refuse").description };
      } catch (error) {
        return { issues: faultsIn(error).map(({ message, path }) => ({ message, path: keysOf(path) })) };
      }
    },
  },
};

/** The shape of a description as a JSON Schema (2020-12), for editors and other languages; units are checked by `readPlanet` only. */
export function planetJsonSchema(): Record<string, unknown> {
  const schema = toJSONSchema(PLANET_SHAPE, { target: "draft-2020-12", metadata: KEYWORDS });
  return { title: `Planet description, ${PLANET_FORMAT}`, ...schema };
}
