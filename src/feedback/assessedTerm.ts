// The straight line that an assessed feedback is, as a law: so it keeps its source, and is known for what it is.
import type { LawCard } from "../graph/card.ts";
import { inUnit, mul, sub } from "../graph/operations.ts";
import { defineLaw } from "../law/defineLaw.ts";
import { temperaturePort } from "../law/ports.ts";

const NAME = "assessedFeedback";

/** Whether a law is such a line. */
export const isAssessed = ({ name }: LawCard): boolean => name === NAME;

/** What is kept by a feedback that was assessed, F = λ(T − T₀), W m⁻²: what is not radiated, so that cooling is its opposite. */
export const assessedTerm = (source: string) =>
  defineLaw({
    name: NAME,
    about: "Heat kept by a feedback that was assessed, as a straight line in temperature.",
    output: { symbol: "F", unit: "W m-2" },
    inputs: {
      temperature: temperaturePort(),
      feedbackParameter: { symbol: "λ", unit: "W m-2 K-1", within: [-1e3, 1e3], about: "as assessed" },
      reference: temperaturePort("T_0", "temperature that it is counted from"),
    },
    source,
    write: ({ temperature, feedbackParameter, reference }) =>
      inUnit(mul(feedbackParameter, sub(temperature, reference)), "W m-2"),
  });
