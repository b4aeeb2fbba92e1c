// Everything that is said of a described planet. A plain frozen object: it survives `JSON.stringify` and back.
import type { Diagram } from "../branches/diagram.ts";
import type { PlanetAssumptions } from "../planet/assumptions.ts";
import type { PlanetInput } from "../planet/planetInput.ts";
import type { WrittenUnit } from "../planet/writtenUnits.ts";
import type { FoundStates } from "../states/state.ts";
import type { AppraisalNote } from "./appraisalNote.ts";
import type { EquilibriumTemperatures, Starlight } from "./appraisedLight.ts";
import type { StateAppraisal } from "./appraisedState.ts";
import type { StarBrightening } from "./starBrightening.ts";
import type { StatedLimit } from "./statedLimit.ts";

/** What is not given and does not follow, and what cannot be said without it. */
export interface MissingField {
  readonly path: string;
  readonly text: string;
}

/** Where a law or a number of the appraisal is published. */
export interface AppraisalSource {
  /** Laws, inputs and cautions that rest on it. */
  readonly of: readonly string[];
  readonly source: string;
  /** All that stand in it, without `doi:`. */
  readonly dois: readonly string[];
}

/** A diagram, and the units in which the description has its givens; a luminosity that it does not have is in `solLum`. */
export type AppraisedDiagram = Diagram & {
  readonly units: readonly WrittenUnit[];
  /**
   * Where the planet is on it: today's value of `along`, in `unit`, and the temperatures of the climates that hold there, K.
   * A star that is told by radius and temperature has its luminosity here, which is no given of the states.
   */
  readonly now: { readonly at: number; readonly temperatures: readonly number[] };
};

/** What `appraisePlanet` returns. */
export interface Appraisal {
  readonly format: "thermostead-appraisal-1";
  /** Version of this package. */
  readonly version: string;
  readonly name: string | null;
  readonly star: string | null;
  /** The description as it was given, copied. */
  readonly description: unknown;
  readonly inputs: readonly PlanetInput[];
  readonly missing: readonly MissingField[];
  readonly starlight: Starlight;
  readonly equilibrium: EquilibriumTemperatures;
  /** The search for states; null where the description gives no budget. */
  readonly found: FoundStates | null;
  /** By rising temperature. */
  readonly states: readonly StateAppraisal[];
  /**
   * Where the temperature goes from anywhere in the searched range if there is no climate in it, which is proved; null where
   * there is one, or nothing is proved.
   */
  readonly leaves: "hotter" | "colder" | null;
  /** All climates as the star brightens or fades, from 0.4 to 2.5 times today's, also where there is none today; null where nothing stands for the star, or it gives no light. */
  readonly diagram: AppraisedDiagram | null;
  /** How the star brightens or fades, on which the times of margins rest; null where that is not described, or several shine. */
  readonly brightening: StarBrightening | null;
  /** Published limits; empty where the effective temperature is not given or outside of their range. */
  readonly habitableZone: readonly StatedLimit[];
  /** Where the planet's own stable branches end. */
  readonly ownLimits: readonly StatedLimit[];
  /** Null where albedo or redistribution are not given. */
  readonly assumptions: PlanetAssumptions | null;
  readonly notes: readonly AppraisalNote[];
  readonly sources: readonly AppraisalSource[];
  /** The set of constants. */
  readonly constants: string;
  /** What these numbers are not. */
  readonly caution: string;
}
