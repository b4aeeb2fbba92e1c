/**
 * Sum with Neumaier's (1974) compensation: the error stays near one rounding of the result however many terms there are.
 * Used where a sum is compared with a bound; the recordable `sum` of laws adds plainly from left to right.
 */
export function compensatedSum(terms: Iterable<number>): number {
  let total = 0;
  let lost = 0;
  for (const term of terms) {
    const next = total + term;
    lost += Math.abs(total) >= Math.abs(term) ? total - next + term : term - next + total;
    total = next;
  }
  return total + lost;
}
