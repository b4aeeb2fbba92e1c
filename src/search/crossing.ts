// Where a function changes sign, to the precision of the arithmetic; nothing is proved.

const MOST_STEPS = 120;

/**
 * The place between two of opposite signs where f changes sign: false position with the weight of an end that stays halved
 * (the Illinois method, Dowell & Jarratt 1971), and a bisection in every third step, so that a leap is found as well.
 */
export function crossing(f: (x: number) => number, from: number, to: number): number {
  let [a, b] = [from, to];
  let fa = f(a);
  let fb = f(b);
  for (let i = 0; i < MOST_STEPS; i++) {
    const middle = a + (b - a) / 2;
    const secant = b - (fb * (b - a)) / (fb - fa);
    const inside = secant > Math.min(a, b) && secant < Math.max(a, b);
    const c = inside && i % 3 !== 2 ? secant : middle;
    if (c === a || c === b) break;
    const fc = f(c);
    if (fc === 0 || Number.isNaN(fc)) return c;
    if (fc > 0 === fb > 0) fa /= 2;
    else [a, fa] = [b, fb];
    [b, fb] = [c, fc];
  }
  return b;
}
