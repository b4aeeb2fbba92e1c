// What the printed flows of one place leave over, with errors, rounding and storage apart.
import type { Range } from "../ground/range.ts";
import { compensatedSum } from "../ground/sum.ts";
import { signedFlows } from "../states/ledger.ts";
import { type PublishedBalance, type PublishedLedger, TOP } from "./published.ts";
import type { Printed } from "./readPublished.ts";

/** A balance, and what rounding of flows and storage together can do to it (0 where no last digit is known). */
export interface FoundBalance {
  readonly balance: PublishedBalance;
  readonly rounding: number;
}

/** The balance of a reservoir, or of the top. */
export function balanceOf(
  place: string,
  flows: PublishedLedger["flows"],
  stored: Printed | undefined,
): FoundBalance {
  const reservoir = place === TOP ? "space" : place;
  const touching = flows.filter((flow) => flow.from === reservoir || flow.to === reservoir);
  const sign = place === TOP ? -1 : 1;
  const residual = compensatedSum(signedFlows({ flows }, reservoir).map((value) => sign * value));
  const isGain = (flow: { readonly to: string }) => (flow.to === reservoir) === (place !== TOP);
  const errors = touching.flatMap((flow) => (flow.error ? [turned(flow.error, isGain(flow))] : []));
  const storageError = stored?.error ?? null;
  const allErrors = storageError ? [...errors, turned(storageError, false)] : errors;
  const rounding = roundingOf(touching);
  return {
    rounding: (rounding ?? 0) + (stored?.lastDigit ?? 0) / 2,
    balance: {
      place,
      residual,
      error: inQuadrature(errors),
      withoutError: touching.filter((flow) => flow.error === null).map((flow) => flow.name),
      rounding,
      storage: stored?.value ?? null,
      storageError,
      unexplained: stored ? residual - stored.value : null,
      unexplainedError: stored ? inQuadrature(allErrors) : null,
    },
  };
}

/** The error of a number that is added, or of one that is taken away: then below and above change places. */
const turned = ([below, above]: Range, isGain: boolean): Range => (isGain ? [below, above] : [above, below]);

function inQuadrature(errors: readonly Range[]): Range | null {
  if (errors.length === 0) return null;
  const size = (side: 0 | 1) => Math.sqrt(compensatedSum(errors.map((error) => error[side] * error[side])));
  return [size(0), size(1)];
}

function roundingOf(flows: readonly Pick<Printed, "lastDigit">[]): number | null {
  const digits = flows.flatMap(({ lastDigit }) => (lastDigit === null ? [] : [lastDigit]));
  return digits.length === 0 ? null : compensatedSum(digits) / 2;
}
