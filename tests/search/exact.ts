// Exact arithmetic of doubles and of polynomials with whole coefficients, by big integers; for the tests of the search.

const SCALE = 1074n;

/** x·2^1074, which is a whole number for every finite double. */
export function whole(x: number): bigint {
  const bits = new DataView(new ArrayBuffer(8));
  bits.setFloat64(0, x);
  const word = bits.getBigUint64(0);
  const exponent = (word >> 52n) & 0x7ffn;
  const fraction = word & 0xfffffffffffffn;
  const size = exponent === 0n ? fraction : (fraction | (1n << 52n)) << (exponent - 1n);
  return word >> 63n ? -size : size;
}

const signOf = (x: bigint): number => (x > 0n ? 1 : x < 0n ? -1 : 0);

/** Coefficients from the constant term upwards. */
export type Polynomial = readonly bigint[];

/** The exact sign of p at a double. */
export function exactSign(p: Polynomial, x: number): number {
  // x = at / 2^down, with as small a denominator as it has
  let at = whole(x);
  let down = SCALE;
  while (at !== 0n && down > 0n && at % 2n === 0n) {
    const many = at % 0x1000000000000n === 0n && down > 48n;
    at = many ? at >> 48n : at >> 1n;
    down -= many ? 48n : 1n;
  }
  const n = BigInt(p.length - 1);
  return signOf(p.reduce((sum, c, i) => sum + ((c * at ** BigInt(i)) << (down * (n - BigInt(i)))), 0n));
}

const trimmed = (p: Polynomial): Polynomial => {
  let n = p.length;
  while (n > 0 && p[n - 1] === 0n) n--;
  return p.slice(0, n);
};
const gcd = (a: bigint, b: bigint): bigint => (b === 0n ? a : gcd(b, a % b));
const primitive = (p: Polynomial): Polynomial => {
  const common = p.reduce((g, c) => gcd(g, c < 0n ? -c : c), 0n);
  return common > 1n ? p.map((c) => c / common) : p;
};

/** −(a mod b), times a positive number. */
function nextInChain(a: Polynomial, b: Polynomial): Polynomial {
  const lead = b.at(-1) as bigint;
  let rest = [...a];
  while (rest.length >= b.length) {
    const top = rest.at(-1) as bigint;
    const shift = rest.length - b.length;
    const down = b.map((c) => c * top * (lead < 0n ? -1n : 1n));
    rest = rest.map(
      (c, i) => c * (lead < 0n ? -lead : lead) - (i >= shift ? (down[i - shift] as bigint) : 0n),
    );
    rest = [...trimmed(rest)];
    if (rest.length === 0) return [];
  }
  return primitive(rest.map((c) => -c));
}

const chains = new WeakMap<Polynomial, readonly Polynomial[]>();
function chainOf(p: Polynomial): readonly Polynomial[] {
  const known = chains.get(p);
  if (known) return known;
  const chain = [trimmed(p), trimmed(p.map((c, i) => c * BigInt(i)).slice(1))];
  for (;;) {
    const next = nextInChain(chain.at(-2) as Polynomial, chain.at(-1) as Polynomial);
    if (next.length === 0) break;
    chain.push(next);
  }
  chains.set(p, chain);
  return chain;
}

/** How many different real zeros p has in (a, b], by Sturm's theorem (1829); p must not vanish at a. */
export function countZeros(p: Polynomial, a: number, b: number): number {
  const changes = (x: number): number => {
    const signs = chainOf(p)
      .map((q) => exactSign(q, x))
      .filter((s) => s !== 0);
    return signs.filter((s, i) => i > 0 && s !== signs[i - 1]).length;
  };
  return changes(a) - changes(b);
}
