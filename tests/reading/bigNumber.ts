// Arithmetic in 300 bits on whole numbers: what tests compare enclosures with. It shares no code with the library.

/** m·2^e. */
export interface Real {
  readonly m: bigint;
  readonly e: number;
}
/** `null`: not defined. */
export type Big = Real | null;

const BITS = 300;
const length = (m: bigint): number => (m < 0n ? -m : m).toString(16).length * 4;
const shift = (m: bigint, by: number): bigint => (by >= 0 ? m << BigInt(by) : m >> BigInt(-by));

function big(m: bigint, e: number, most = BITS): Real {
  const extra = length(m) - most;
  return extra > 0 ? { m: shift(m, -extra), e: e + extra } : { m, e };
}

/** A finite double, exactly. */
export function fromDouble(x: number): Real {
  const bits = new DataView(new ArrayBuffer(8));
  bits.setFloat64(0, x);
  const word = bits.getBigUint64(0);
  const exponent = Number((word >> 52n) & 0x7ffn);
  const fraction = word & 0xfffffffffffffn;
  const m = exponent === 0 ? fraction : fraction | 0x10000000000000n;
  return { m: word >> 63n ? -m : m, e: Math.max(exponent, 1) - 1075 };
}

/** A number as it is written, such as 6.02e23. */
export function fromDecimal(text: string): Real {
  const [digits = "", exponent = "0"] = text.split("e");
  const [whole = "", fraction = ""] = digits.split(".");
  const tens = Number(exponent) - fraction.length;
  const m = { m: BigInt(whole + fraction), e: 0 };
  const power = { m: 10n ** BigInt(Math.abs(tens)), e: 0 };
  return tens < 0 ? (div(m, power) as Real) : mul(m, power);
}

/** About the nearest double, for messages and first guesses. */
export function toDouble(x: Real): number {
  const extra = length(x.m) - 64;
  const [m, e] = extra > 0 ? [Number(shift(x.m, -extra)), x.e + extra] : [Number(x.m), x.e];
  return m * 2 ** Math.max(e, -1000) * 2 ** Math.min(e + 1000, 0);
}

type One = (a: Real) => Big;
type Two = (a: Real, b: Real) => Big;

export const neg = (a: Real): Real => ({ m: -a.m, e: a.e });
/** Exact for doubles, whose sums need no more than 2100 bits. */
export function add(a: Real, b: Real): Real {
  if (a.m === 0n) return b;
  if (b.m === 0n) return a;
  const [high, low] = a.e >= b.e ? [a, b] : [b, a];
  if (high.e - low.e > 4000) return high;
  return big(shift(high.m, high.e - low.e) + low.m, low.e, 4000);
}
export const sub = (a: Real, b: Real): Real => add(a, neg(b));
export const mul = (a: Real, b: Real): Real => big(a.m * b.m, a.e + b.e);
export function div(a: Real, b: Real): Big {
  if (b.m === 0n) return null;
  const by = BITS + 8 + length(b.m);
  return big(shift(a.m, by) / b.m, a.e - b.e - by);
}
export const less = (a: Real, b: Real): boolean => sub(a, b).m < 0n;

export const sqrt: One = (a) => {
  if (a.m <= 0n) return a.m < 0n ? null : a;
  const by = 2 * BITS + (a.e & 1);
  return big(wholeRoot(shift(a.m, by)), (a.e - by) / 2);
};
function wholeRoot(n: bigint): bigint {
  let x = 1n << BigInt(length(n) / 2 + 1);
  for (;;) {
    const y = (x + n / x) >> 1n;
    if (y >= x) return x;
    x = y;
  }
}

const one = fromDouble(1);
const int = (n: number): Real => fromDouble(n);
const halves = (a: Real, n: number): Real => ({ m: a.m, e: a.e - n });
/** Taylor's series of e^(x/2^n), squared n times. */
export const exp: One = (x) => {
  const n = Math.max(0, length(x.m) + x.e) + 12;
  if (n > 40) return null;
  const part = halves(x, n);
  let term: Real = one;
  let total: Real = one;
  for (let k = 1; k < 40; k++) {
    term = div(mul(term, part), int(k)) as Real;
    total = add(total, term);
  }
  for (let k = 0; k < n; k++) total = mul(total, total);
  return total;
};
/** Halley's iteration on e^y = x. */
export const log: One = (x) => {
  if (x.m <= 0n) return null;
  const lengthOfX = length(x.m);
  let y = fromDouble(Math.log(toDouble({ m: x.m, e: -lengthOfX })) + (x.e + lengthOfX) * Math.LN2);
  for (let i = 0; i < 4; i++) {
    const power = exp(y) as Real;
    y = add(y, mul(int(2), div(sub(x, power), add(x, power)) as Real));
  }
  return y;
};
export const tanh: One = (x) => {
  if (x.m === 0n) return x;
  if (length(x.m) + x.e < -90) return sub(x, div(mul(x, mul(x, x)), int(3)) as Real);
  if (length(x.m) + x.e > 20) return x.m > 0n ? one : neg(one);
  const power = exp(mul(int(2), x)) as Real;
  return div(sub(power, one), add(power, one));
};
export const min: Two = (a, b) => (less(a, b) ? a : b);
export const max: Two = (a, b) => (less(a, b) ? b : a);
