// Shares of a whole among parts that act together, whatever the order in which they are added.

/**
 * The Shapley values of a game: for each of `parts` its mean contribution over all orders in which they can be added.
 * `worth` has the outcome of every subset, a bit for each part. They add up to worth(all) − worth(none).
 * Source: Shapley 1953, Contributions to the Theory of Games II, Princeton, 307.
 */
export function shapleyShares(parts: number, worth: ArrayLike<number>): number[] {
  const weights = orderWeights(parts);
  const shares = new Array<number>(parts).fill(0);
  for (let subset = 0; subset < worth.length; subset++) {
    const weight = weights[sizeOf(subset)] as number;
    for (let part = 0; part < parts; part++) {
      const joined = subset | (1 << part);
      if (joined === subset) continue;
      const gained = (worth[joined] as number) - (worth[subset] as number);
      shares[part] = (shares[part] as number) + weight * gained;
    }
  }
  return shares;
}

/** |S|! (n − |S| − 1)! / n! for |S| from 0 to n − 1: one over n times the number of subsets of that size without the part. */
function orderWeights(parts: number): number[] {
  const weights: number[] = [];
  let choices = 1;
  for (let size = 0; size < parts; size++) {
    weights.push(1 / (parts * choices));
    choices = (choices * (parts - 1 - size)) / (size + 1);
  }
  return weights;
}

function sizeOf(subset: number): number {
  let size = 0;
  for (let rest = subset; rest > 0; rest >>= 1) size += rest & 1;
  return size;
}
