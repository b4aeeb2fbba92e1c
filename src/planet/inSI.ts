// Converts to SI with the Unit of mathjs. It is only ever given names of our table and integer powers: nothing is evaluated.
import { create, type FactoryFunctionMap, UnitDependencies } from "mathjs";
import { fail } from "../ground/errors.ts";
import { exampleOf } from "./examples.ts";
import { UNITS } from "./units.ts";
import { type UnitFactor, unitFactors } from "./unitText.ts";

type UnitClass = ReturnType<typeof unitClass>;
let known: UnitClass | undefined;

/** The Unit of mathjs with the units of this format added; an instance of our own, so that nobody else's is changed. */
function unitClass() {
  const { Unit } = create(UnitDependencies as FactoryFunctionMap);
  for (const [name, { size, si, own }] of Object.entries(UNITS)) {
    if (own) Unit.createUnitSingle(name, { definition: `${size} ${si}` });
  }
  return Unit;
}

/** What a port needs to know of a value's unit. */
export interface Wanted {
  /** The coherent SI unit. */
  readonly unit: string;
  /** True for a temperature difference, which has no zero point. */
  readonly difference: boolean;
}

/** A unit in SI: its size, and its zero point, which only temperatures have. */
interface Scale {
  readonly size: number;
  readonly zero: number;
}

/** The scales that were asked for before: there are few, and a catalogue asks for them thousands of times. */
const scales = /* @__PURE__ */ new Map<string, Scale>();
const MOST_SCALES = 500;

/** Converts a number in a unit to SI. Throws `unit-mismatch`, `unknown-unit`, `unreadable`, `not-a-number`. */
export function inSI(value: number, unitText: string, wanted: Wanted, path: string): number {
  const key = `${unitText}|${wanted.unit}|${wanted.difference}`;
  const scale = scales.get(key) ?? scaleOf(unitText, wanted, path);
  if (scales.size < MOST_SCALES) scales.set(key, scale);
  const converted = value * scale.size + scale.zero;
  if (!Number.isFinite(converted)) {
    fail("not-a-number", { path, value, allowed: "that stays finite when converted to", unit: wanted.unit });
  }
  return converted;
}

function scaleOf(unitText: string, wanted: Wanted, path: string): Scale {
  const factors = unitFactors(unitText, path);
  checkCelsius(factors, unitText, wanted, path);
  known ??= unitClass();
  const target = plainText(unitFactors(wanted.unit, path));
  const [one, none] = [new known(1, plainText(factors)), new known(0, plainText(factors))];
  if (!one.equalBase(new known(1, target))) mismatch(unitText, wanted, path);
  const zero = none.toNumber(target);
  return { size: zero === 0 ? one.toNumber(target) : 1, zero };
}

/** Throws `unit-mismatch` with an example of what fits. */
export function mismatch(value: unknown, { unit, difference }: Wanted, path: string): never {
  const degrees = difference ? " (a difference, never degC)" : "";
  return fail("unit-mismatch", {
    path,
    value,
    allowed: `${unit}${degrees}, as in "${exampleOf(unit, difference)}"`,
  });
}

/** A degree Celsius has a zero point of its own, so it stands alone and only where a temperature is meant. */
function checkCelsius(factors: readonly UnitFactor[], unitText: string, wanted: Wanted, path: string): void {
  if (!factors.some((f) => f.name === "degC")) return;
  if (wanted.unit !== "K" || wanted.difference || factors.length > 1 || factors[0]?.exponent !== 1)
    mismatch(unitText, wanted, path);
}

const plainText = (factors: readonly UnitFactor[]): string =>
  factors.map(({ name, exponent }) => `${name}^${exponent}`).join(" ");
