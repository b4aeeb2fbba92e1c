// The schema of a law in a description: its name and its ports, all taken from its card.
import type { ZodMiniLiteral, ZodMiniObject, ZodMiniOptional } from "zod/mini";
import { literal, optional, strictObject } from "zod/mini";
import type { Port, Ports } from "../graph/card.ts";
import type { Law } from "../law/types.ts";
import { BOUND_PORT } from "./fieldLaws.ts";
import { type ValueSchema, valueSchema } from "./valueSchema.ts";
import { worded } from "./wording.ts";

type Omissible = { readonly default: number } | { readonly optional: true };
type Fields<I extends Ports> = {
  [K in Exclude<keyof I, typeof BOUND_PORT>]: I[K] extends Omissible
    ? ZodMiniOptional<ValueSchema<I[K]>>
    : ValueSchema<I[K]>;
};
type LawSchema<Name extends string, I extends Ports> = ZodMiniObject<
  { law: ZodMiniLiteral<Name> } & Fields<I>
>;

/** `{ law, …ports }` for a law whose ports are all single values; `temperature` is bound by the loop. */
export function lawSchema<const Name extends string, I extends Ports>(
  name: Name,
  law: Law<I>,
): LawSchema<Name, I> {
  const fields = Object.entries(law.card.inputs as Readonly<Record<string, Port>>)
    .filter(([port]) => port !== BOUND_PORT)
    .map(([port, of]) => {
      const schema = valueSchema(of);
      return [port, of.default === undefined ? schema : optional(schema)] as const;
    });
  const named = worded(literal(name), `"${name}"`);
  const schema = strictObject({ law: named, ...Object.fromEntries(fields) });
  return worded(schema, `{ law: "${name}" }`, { description: law.card.about }) as unknown as LawSchema<
    Name,
    I
  >;
}
