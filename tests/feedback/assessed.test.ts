// Assessed feedbacks as laws of temperature, against the numbers of the IPCC's sixth report.
import { describe, expect, test } from "vitest";
import { analyseFeedbacks } from "../../src/feedback/analyseFeedbacks.ts";
import { assessedLoop } from "../../src/feedback/assessedLoop.ts";
import { assessedResponse } from "../../src/feedback/assessedResponse.ts";
import { AR6_FEEDBACKS, type FeedbackAssessment } from "../../src/feedback/assessment.ts";
import { compareHeld } from "../../src/feedback/compareHeld.ts";
import { sourcesOf } from "../../src/index.ts";
import { holdFixed } from "../../src/loop/holdFixed.ts";
import { findStates } from "../../src/states/findStates.ts";
import ar6 from "../reference/ar6_feedbacks.json" with { type: "json" };
import { refusal } from "../refusal.ts";

test("the exported assessment is the printed one", () => {
  const { planck, net, ...feedbacks } = ar6.feedbacks;
  const { unit, ...sensitivity } = ar6.sensitivity;
  expect(JSON.parse(JSON.stringify(AR6_FEEDBACKS))).toMatchObject({
    reference: planck,
    feedbacks,
    sensitivity,
  });
  expect(unit).toBe("K");
  const sum = Object.values(feedbacks).reduce((total, f) => total + f.best, planck.best);
  expect(sum).toBeCloseTo(net.best, 12);
});

describe("as a loop", () => {
  const loop = assessedLoop(AR6_FEEDBACKS);
  const [state] = findStates(loop, { within: [200, 400] }).states;
  if (!state) throw new Error("no state");

  test("λ is the net feedback, and every part is its law", () => {
    const found = analyseFeedbacks(loop, state);
    expect(found.feedbackParameter).toBeCloseTo(ar6.feedbacks.net.best, 12);
    expect(found.reference.feedbackParameter).toBeCloseTo(ar6.feedbacks.planck.best, 12);
    for (const { through, feedbackParameter } of found.loops)
      expect(feedbackParameter).toBeCloseTo(AR6_FEEDBACKS.feedbacks[through[0] as "cloud"].best, 12);
    // a straight line, whatever it stands for; but none that was fitted with water vapour in it
    expect(found.reference).toMatchObject({
      kind: "reference response",
      text: "assessed, not computed: the best estimate, as a straight line in temperature (reference)",
    });
    expect(found.notes).toMatchObject([{ code: "assessed-feedbacks", about: "feedbackParameterRange" }]);
    const some = analyseFeedbacks(loop, state, { through: ["cloud"] }).reference;
    expect(some.text).toMatch(
      /^not a Planck response: it contains waterVapourAndLapseRate, surfaceAlbedo, .*, which were not chosen/,
    );
    expect(some.text).not.toContain("fitted");
    expect(sourcesOf(loop)).toMatchObject([{ law: "assessedFeedback", source: AR6_FEEDBACKS.source }]);
    expect(found.loops.find((l) => l.through[0] === "biogeophysicalAndBiogeochemical")?.effect).toBe(
      "counters",
    );
  });

  test("holding clouds only leaves −1.58", () => {
    const held = holdFixed(loop, ["cloud"], state);
    expect(analyseFeedbacks(held, state).feedbackParameter).toBeCloseTo(-1.58, 12);
  });

  test("no answer depends on the reference temperature", () => {
    const cold = assessedLoop(AR6_FEEDBACKS, { temperature: 255 });
    const [other] = findStates(cold, { within: [200, 400] }).states;
    const change = { forcing: 3.93 };
    const [a, b] = [
      compareHeld(loop, { from: state, change, hold: ["cloud"] }),
      compareHeld(cold, { from: other as typeof state, change, hold: ["cloud"] }),
    ];
    expect(a.temperatureChange).toBeCloseTo(b.temperatureChange ?? Number.NaN, 11);
    expect(a.shares?.cloud).toBeCloseTo(b.shares?.cloud ?? Number.NaN, 11);
  });
});

describe("as a response", () => {
  const forcing = ar6.forcingOfDoubling.best;
  const answer = assessedResponse(AR6_FEEDBACKS, { forcing });

  test("3.93 W m⁻² gives 3.388 K, with a note that the assessed sensitivity is 3.0 K", () => {
    expect(answer.response.temperatureChange).toBeCloseTo(3.388, 3);
    expect(answer.response.temperatureChange).toBeCloseTo(forcing / 1.16, 10);
    expect(answer.notes).toMatchObject([
      { code: "assessed-sensitivity", value: ar6.sensitivity.best, unit: "K" },
    ]);
    expect(answer.notes[0]?.text).toContain("3 K, likely 2.5 to 4 K");
  });

  test("without all feedbacks it is Planck's alone, and the shares make up the rest", () => {
    const { temperatureChange, temperatureChangeHeld, shares, evaluations } = answer.response;
    expect(temperatureChangeHeld).toBeCloseTo(forcing / 3.22, 10);
    const sum = Object.values<number>(shares as never).reduce((total, x) => total + x, 0);
    expect(sum).toBeCloseTo((temperatureChange ?? 0) - (temperatureChangeHeld ?? 0), 11);
    expect(evaluations).toBe(16);
    expect(shares?.biogeophysicalAndBiogeochemical).toBeLessThan(0);
  });

  test("some of them, and a forcing that cools", () => {
    const some = assessedResponse(AR6_FEEDBACKS, { forcing: -3.93, hold: ["cloud"] }).response;
    expect(some.temperatureChangeHeld).toBeCloseTo(-3.93 / 1.58, 10);
    expect(some.regulation).toBeCloseTo(1 - 1.58 / 1.16, 10);
  });

  test("an assessment without a sensitivity has no note", () => {
    const own = { reference: { best: -3 }, feedbacks: { ice: { best: 1 } }, source: "invented" };
    expect(assessedResponse(own, { forcing: 4 })).toMatchObject({
      response: { to: { temperature: 290 } },
      notes: [],
    });
  });

  test("what is wrong is refused", () => {
    const bad = (assessment: unknown, options: unknown = { forcing: 1 }) =>
      refusal(() => assessedResponse(assessment as never, options as never));
    expect(bad(AR6_FEEDBACKS, { forcing: Number.NaN })).toMatchObject({
      code: "not-a-number",
      path: "forcing",
    });
    expect(bad(AR6_FEEDBACKS, { forcing: 1, hold: ["clouds"] }).allowed).toContain("nearest: cloud");
    expect(bad({ reference: { best: -1 } })).toMatchObject({ code: "unreadable", path: "feedbacks" });
    const cancelling = { reference: { best: -1 }, feedbacks: { ice: { best: 1 } }, source: "" };
    expect(bad(cancelling)).toMatchObject({ code: "out-of-range", path: "feedbacks", value: 0 });
    // the other sign convention
    const turned = { reference: { best: 3.2 }, feedbacks: { ice: { best: -1 } }, source: "" };
    expect(bad(turned)).toMatchObject({ code: "out-of-range", path: "reference.best", value: 3.2 });
    expect(bad({ ...cancelling, source: undefined })).toMatchObject({ code: "unreadable", path: "source" });
    expect(bad({ ...cancelling, feedbacks: {} })).toMatchObject({ code: "missing", path: "feedbacks" });
    const many = Object.fromEntries(Array.from({ length: 13 }, (_, i) => [`f${i}`, { best: 0.01 }]));
    const thirteen = { reference: { best: -1 }, feedbacks: many, source: "" };
    expect(bad(thirteen)).toMatchObject({ code: "too-large", path: "feedbacks", value: 13 });
    expect(
      assessedResponse(thirteen as FeedbackAssessment<"f0">, { forcing: 1, hold: ["f0"] }).response
        .evaluations,
    ).toBe(2);
  });
});
