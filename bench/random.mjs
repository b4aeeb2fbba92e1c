// Random numbers with a fixed seed, made from integer steps and one division, so that every engine draws the same.

/** A stream of numbers in [0, 1) with 53 random bits each (Marsaglia 2003, J. Stat. Softw. 8, 14: xorshift, 13-17-5). */
export function randomNumbers(seed) {
  let state = seed | 0 || 1;
  const bits = () => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return state >>> 0;
  };
  for (let i = 0; i < 20; i++) bits();
  return () => ((bits() >>> 5) * 67108864 + (bits() >>> 6)) / 9007199254740992;
}
