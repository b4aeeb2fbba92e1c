// 10⁵ values of our elementary functions, at inputs made from + − × ÷ only.
import { randomNumbers } from "../../bench/random.mjs";
import { cos, sin } from "../../src/ground/elementary/cosSin.ts";
import { exp } from "../../src/ground/elementary/exp.ts";
import { expm1 } from "../../src/ground/elementary/expm1.ts";
import { log } from "../../src/ground/elementary/log.ts";
import { log1p } from "../../src/ground/elementary/log1p.ts";
import { power } from "../../src/ground/elementary/power.ts";
import { tanh } from "../../src/ground/elementary/tanh.ts";
import { Fingerprint } from "./fingerprint.ts";

const VALUES_EACH = 12_500;
/** Values under one fingerprint, so that a difference is found to within so many. */
const BLOCK = 250;

type Random = () => number;

const between = (low: number, high: number) => (random: Random) => low + (high - low) * random();

/** From about 2^-`most` to 2^`most`, evenly in the exponent. */
const magnitude = (most: number) => (random: Random) => {
  let size = 1 + random();
  const steps = Math.floor((2 * random() - 1) * most);
  for (let i = 0; i < steps; i++) size *= 2;
  for (let i = 0; i > steps; i--) size /= 2;
  return size;
};
const eitherSign = (size: (random: Random) => number) => (random: Random) =>
  random() < 0.5 ? -size(random) : size(random);
const small = (random: Random) => eitherSign(magnitude(50))(random) / 2e15;

/** Each function with the inputs it is read at, taken in turn. */
const readings: Record<string, { of: (x: number, y: number) => number; at: ((random: Random) => number)[] }> =
  {
    exp: { of: exp, at: [between(-746, 710), between(-1, 1), between(15, 25), eitherSign(magnitude(60))] },
    log: { of: log, at: [magnitude(1040), between(0.9, 1.1), between(0, 1000), magnitude(3)] },
    tanh: { of: tanh, at: [between(-20, 20), between(-1, 1), eitherSign(magnitude(40)), between(-0.1, 0.1)] },
    expm1: {
      of: expm1,
      at: [between(-40, 40), between(-1, 1), eitherSign(magnitude(60)), between(-745, 710)],
    },
    log1p: { of: log1p, at: [between(-1, 1), magnitude(60), small, between(0, 1e4)] },
    power: { of: power, at: [between(0, 10), magnitude(20), between(0.9, 1.1), magnitude(200)] },
    cos: { of: cos, at: [between(-7, 7), between(-1e6, 1e6), between(-0.8, 0.8), eitherSign(magnitude(19))] },
    sin: { of: sin, at: [between(-7, 7), between(-1e6, 1e6), between(-0.8, 0.8), eitherSign(magnitude(19))] },
  };

/** Fingerprints by block, `exp 0–249` and so on. */
export function elementaryValues(): { count: number; prints: Record<string, string> } {
  const prints: Record<string, string> = {};
  let count = 0;
  for (const [name, { of, at }] of Object.entries(readings)) {
    const random = randomNumbers(name.length * 7919 + name.charCodeAt(0));
    for (let start = 0; start < VALUES_EACH; start += BLOCK) {
      const print = new Fingerprint();
      for (let i = 0; i < BLOCK; i++) {
        const x = (at[i % at.length] as (random: Random) => number)(random);
        print.number(of(x, 40 * random() - 20));
        count++;
      }
      prints[`${name}, values ${start}–${start + BLOCK - 1}`] = print.text;
    }
  }
  return { count, prints };
}
