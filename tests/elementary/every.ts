// The elementary functions by name, all taking a list of arguments.
import { cos, sin } from "../../src/ground/elementary/cosSin.ts";
import { exp } from "../../src/ground/elementary/exp.ts";
import { expm1 } from "../../src/ground/elementary/expm1.ts";
import { log } from "../../src/ground/elementary/log.ts";
import { log1p } from "../../src/ground/elementary/log1p.ts";
import { power } from "../../src/ground/elementary/power.ts";
import { tanh } from "../../src/ground/elementary/tanh.ts";

export type Evaluate = (x: number[]) => number;

const one =
  (of: (x: number) => number): Evaluate =>
  (x) =>
    of(x[0] as number);

export const every: Record<string, Evaluate> = {
  exp: one(exp),
  log: one(log),
  tanh: one(tanh),
  expm1: one(expm1),
  log1p: one(log1p),
  cos: one(cos),
  sin: one(sin),
  power: (x) => power(x[0] as number, x[1] as number),
};
