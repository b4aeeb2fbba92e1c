import { describe, expect, it } from "vitest";
import {
  absorbedFlux,
  analyseFeedbacks,
  closeLoop,
  findStates,
  greyEmission,
  holdFixed,
  type Loop,
  tanhAlbedo,
  traceBranches,
  withGivens,
} from "../../src/index.ts";
import { kept } from "../../src/loop/kept.ts";
import { refusal } from "../refusal.ts";

const closed = (flux: number, emissivity: number) =>
  closeLoop(({ temperature, given, couple }) => ({
    heating: {
      sunlight: absorbedFlux({
        flux: given("flux", flux, "W m-2", { within: [0, 1e5] }),
        albedo: couple("albedo", tanhAlbedo({ temperature, cold: 0.7, warm: 0.3, midpoint: 265, width: 10 })),
      }),
    },
    cooling: {
      longwave: greyEmission({
        temperature,
        emissivity: given("emissivity", emissivity, "1", { within: [0, 1] }),
      }),
    },
    heatCapacity: 4e8,
  }));

/** Everything that can be asked of a loop, as text. */
function answers<N extends string>(loop: Loop<N>): string {
  const found = findStates(loop, { within: [150, 400] });
  const [state] = found.states;
  if (!state) throw new Error("no state");
  const along = { along: "flux" as never, between: [800, 2000], within: [150, 400] } as const;
  return JSON.stringify([
    loop,
    found,
    analyseFeedbacks(loop, state),
    traceBranches(loop, along),
    findStates(holdFixed(loop, ["albedo" as never], state), { within: [150, 400] }),
  ]);
}

describe("withGivens", () => {
  it("gives what a loop closed with these values gives, to the bit", () => {
    const first = closed(1361, 0.6);
    const before = answers(first);
    const changed = withGivens(first, { flux: 1400 });
    expect(answers(changed)).toBe(answers(closed(1400, 0.6)));
    expect(answers(withGivens(changed, { emissivity: 0.62 }))).toBe(answers(closed(1400, 0.62)));
    expect(answers(first)).toBe(before);
  });

  it("shares what was made for a loop with all that come of it, one after the other", () => {
    const made: Loop[] = [];
    const thing = kept((loop) => made.push(loop));
    const first = closed(1361, 0.6);
    const second = withGivens(first, { flux: 1400 });
    const things = [first, second, withGivens(second, { emissivity: 0.62 })].map((loop) => thing(loop));
    expect(things).toEqual([1, 1, 1]);
    expect(thing(closed(1361, 0.6))).toBe(2);
  });

  it("refuses names and values that the loop does not allow", () => {
    const loop = closed(1361, 0.6);
    expect(refusal(() => withGivens(loop, { flix: 1 } as never))).toMatchObject({ code: "unknown-name" });
    expect(refusal(() => withGivens(loop, { emissivity: 1.5 }))).toMatchObject({ code: "out-of-range" });
    expect(refusal(() => withGivens(loop, { flux: Number.NaN }))).toMatchObject({ code: "not-a-number" });
  });
});
