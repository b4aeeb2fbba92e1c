// The schema of a law in a description: its name and its ports, all taken from its card.
import type { ZodMiniArray, ZodMiniLiteral, ZodMiniObject, ZodMiniOptional, ZodMiniType } from "zod/mini";
import { literal, optional, strictObject } from "zod/mini";
import type { ListPort, Port, Ports } from "../graph/card.ts";
import type { Law } from "../law/types.ts";
import { isBound, isDifference } from "./fieldLaws.ts";
import { filledList } from "./listOf.ts";
import { type ValueSchema, valueSchema } from "./valueSchema.ts";
import { worded } from "./wording.ts";

type Bound<Name> =
  | "temperature"
  | (Name extends "pressureOpticalDepth" ? "pressure" : never)
  | (Name extends "heightEmission" ? "lapseRate" : never);
type Omissible = { readonly default: number } | { readonly optional: true };
type FieldOf<P> = P extends ListPort
  ? ZodMiniArray<ZodMiniObject<Fields<never, P["each"]>>>
  : P extends Omissible
    ? ZodMiniOptional<ValueSchema<P>>
    : ValueSchema<P>;
type Fields<Name, I extends Ports> = { [K in Exclude<keyof I, Bound<Name>>]: FieldOf<I[K]> };
type Replaced<Name, I extends Ports, R> = Omit<Fields<Name, I>, keyof R> & R;
type LawSchema<Name extends string, I extends Ports, R> = ZodMiniObject<
  { law: ZodMiniLiteral<Name> } & { [K in keyof Replaced<Name, I, R>]: Replaced<Name, I, R>[K] }
>;

/** `{ law, …ports }`; ports that a description does not fill are left out, those in `instead` take more than a value. */
export function lawSchema<
  const Name extends string,
  I extends Ports,
  R extends Readonly<Record<string, ZodMiniType>> = Record<never, never>,
>(name: Name, law: Law<I>, instead?: R): LawSchema<Name, I, R> {
  const fields = Object.entries(law.card.inputs)
    .filter(([port]) => !isBound(name, port))
    .map(([port, of]) => [port, instead?.[port] ?? fieldSchema(port, of, isDifference(name, port))] as const);
  const named = worded(literal(name), `"${name}"`);
  const schema = strictObject({ law: named, ...Object.fromEntries(fields) });
  const described = worded(schema, `{ law: "${name}" }`, { description: law.card.about });
  return described as unknown as LawSchema<Name, I, R>;
}

function fieldSchema(name: string, port: Port | ListPort, difference: boolean): ZodMiniType {
  if (!("each" in port)) {
    const schema = valueSchema(port, difference);
    return port.default === undefined ? schema : optional(schema);
  }
  const record = Object.entries(port.each).map(([key, each]) => [key, valueSchema(each)] as const);
  const keys = record.map(([key]) => key).join(", ");
  const shape = worded(strictObject(Object.fromEntries(record)), `{ ${keys} }`);
  return filledList(shape, `{ ${keys} }`, 100, name);
}
