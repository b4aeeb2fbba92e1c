// Proves that a fold comes to a kink of a law in a narrow stretch of the second given, and brackets the place.
import type { Range } from "../ground/range.ts";
import { enumerateZeros } from "../search/enumerateZeros.ts";
import type { ProvedZero } from "../search/enumeration.ts";
import { minus, over, plus, signOfRange, times } from "../search/interval.ts";
import type { BranchEnd } from "./diagram.ts";
import type { ArmOver } from "./kinkSides.ts";
import { pointAt } from "./planeReader.ts";
import { endOf, LINE_EFFORT, middleOf, nearestProved } from "./stretch.ts";
import type { TurnReader } from "./turns.ts";

/**
 * `change`: on one side of the place there is the fold, on the other a corner at the kink. `meet`: on one side there are
 * both, on the other none.
 */
export interface KinkMeeting {
  readonly kind: "change" | "meet";
  /** The values of the second given at which the fold is. */
  readonly fold: "below" | "above";
  readonly end: BranchEnd;
}

/** Where to look. The givens of the reader are set. */
interface Around {
  readonly box: Range;
  readonly parameters: Range;
  readonly givens: readonly number[];
}

const MOST_HALVINGS = 60;

/**
 * Between the kink k(q) and one end of the box λ of that side only rises or only falls with temperature, and has the
 * sign at the end to which it runs away from the kink: so there is one fold where it has the other sign at k(q), and none
 * elsewhere. λ of the other side has one sign. On the path k(q) λ only rises or only falls with q: so this happens once.
 */
export function kinkMeeting(reader: TurnReader, around: Around): KinkMeeting | undefined {
  for (const kink of reader.sides.kinks.keys()) {
    const zero = kinkIn(reader, kink, around.box, around);
    if (!zero) continue;
    const [left, right] = [true, false].map((isLeft) =>
      reader.sides.on([{ kink, less: zero.direction > 0 === isLeft }]),
    );
    if (!left || !right) continue;
    for (const arms of [
      { near: left, other: right, end: 0 },
      { near: right, other: left, end: 1 },
    ] as const) {
      const met = meetingOn(reader, { kink, zero, ...arms }, around);
      if (met) return met;
    }
  }
  return undefined;
}

/** A kink, λ on the side of the fold and on the other, and the end of the box on the side of the fold. */
interface Arms {
  readonly kink: number;
  readonly zero: ProvedZero;
  readonly near: ArmOver;
  readonly other: ArmOver;
  readonly end: 0 | 1;
}

function meetingOn(
  reader: TurnReader,
  { kink, zero, near, other, end }: Arms,
  around: Around,
): KinkMeeting | undefined {
  const { box, parameters } = around;
  const place: Range = zero.bracket;
  const sides = [
    [box[0], place[1]],
    [place[0], box[1]],
  ] as const;
  const slope = signOfRange(near(sides[end], parameters).slope);
  const far = signOfRange(near(pointAt(box[end]), parameters).value);
  const beyond = signOfRange(other(sides[1 - end] as Range, parameters).value);
  if (slope === 0 || beyond === 0 || far !== (end === 0 ? -slope : slope)) return undefined;
  const here = near(place, parameters);
  const moves = (reader.sides.kinks[kink] as (typeof reader.sides.kinks)[number]).over(place, parameters);
  const path = minus(over(moves.drift, moves.slope));
  const drift = signOfRange(plus(here.drift, times(here.slope, path)));
  if (drift === 0) return undefined;
  const kinkAt = (q: number) => kinkIn(reader, kink, box, { ...around, parameters: pointAt(q) })?.bracket;
  /** The sign of λ beside the kink. */
  const signAt = (q: number): number => {
    const bracket = kinkAt(q);
    return bracket ? signOfRange(near(bracket, pointAt(q)).value) : 0;
  };
  const about = crossingOf(parameters, drift, (q) => {
    const bracket = kinkAt(q);
    return bracket ? middleOf(near(pointAt(middleOf(bracket)), pointAt(q)).value) : 0;
  });
  // the fold is there where λ beside the kink has the other sign than at the end of the box
  const fold = drift === far ? "below" : "above";
  const low = nearestProved(about, -1, parameters, (q) => signAt(q) === -drift);
  const high = nearestProved(about, 1, parameters, (q) => signAt(q) === drift);
  if (signAt(low) !== -drift || signAt(high) !== drift) return undefined;
  const bracket = kinkIn(reader, kink, box, { ...around, parameters: [low, high] })?.bracket ?? place;
  const kind = beyond === far ? "meet" : "change";
  return { kind, fold, end: endOf("corner", bracket, [low, high], middleOf(bracket), about) };
}

/** The place of a kink, if there is one inside of a box for all of some values of the second given. */
function kinkIn(reader: TurnReader, kink: number, box: Range, { parameters, givens }: Omit<Around, "box">) {
  const [low, high] = parameters.map((q) => givens.map((v, i) => (i === reader.place ? q : v)));
  reader.sides.set(low as number[], high as number[]);
  const { ends } = reader.sides.kinks[kink] as (typeof reader.sides.kinks)[number];
  const { zeros, undecided } = enumerateZeros(ends, box, { effort: LINE_EFFORT });
  const [zero] = zeros;
  if (!zero || zeros.length > 1 || undecided.length > 0) return undefined;
  return zero.bracket[0] > box[0] && zero.bracket[1] < box[1] ? zero : undefined;
}

/** About where a function passes zero that rises or falls. */
function crossingOf([from, to]: Range, direction: number, at: (q: number) => number): number {
  let [a, b] = [from, to];
  for (let i = 0; i < MOST_HALVINGS; i++) {
    const middle = middleOf([a, b]);
    if (at(middle) * direction < 0) a = middle;
    else b = middle;
  }
  return middleOf([a, b]);
}
