// What reading a description gives.
import type { Loop } from "../loop/types.ts";
import type { PlanetAssumptions } from "./assumptions.ts";
import type { PlanetFacts } from "./facts.ts";
import type { PlanetInput } from "./planetInput.ts";
import type { PlanetNote } from "./planetNote.ts";
import type { PlanetDescription } from "./planetShape.ts";
import type { WrittenUnit } from "./writtenUnits.ts";

/**
 * The names of a planet's loop: its givens are the paths of its inputs. A coupling is there where the description lets that
 * quantity answer to temperature.
 */
export type PlanetNames =
  | "variable temperature"
  | "coupling albedo"
  | "coupling surfaceAlbedo"
  | "coupling opticalDepth"
  | `given ${string}`;

/** The equilibrium temperature εσT⁴ = f·S(1 − A) + F_i with all that it depends on. It is not the surface temperature. */
export interface PlanetEquilibriumTemperature {
  /** K. */
  readonly value: number;
  readonly unit: "K";
  readonly albedo: number;
  readonly redistribution: number;
  readonly emissivity: 1;
  /** W m⁻². */
  readonly internalFlux: number;
}

/** A planet that was read: its loop, and what its numbers rest on. */
export interface Planet {
  /** The description as it was given: checked, plain and frozen. */
  readonly description: PlanetDescription;
  /** Ready for `findStates`; every input that counts is a given named by its path. Reports flux, albedo and equilibriumTemperature. */
  readonly loop: Loop<PlanetNames>;
  /** All numeric values of the description in SI. */
  readonly inputs: readonly PlanetInput[];
  /** The units in which they are written: with `units` a diagram is drawn in these. */
  readonly units: readonly WrittenUnit[];
  /** Stellar flux normal to the beam in the mean over the orbit, W m⁻²: S, not S/4. */
  readonly flux: number;
  /** Null where the albedo answers to temperature: then each state has its own, in `report.equilibriumTemperature`. */
  readonly equilibriumTemperature: PlanetEquilibriumTemperature | null;
  readonly assumptions: PlanetAssumptions;
  /** What the description says of star, orbit and body in SI, with null for what it does not. */
  readonly facts: PlanetFacts;
  readonly notes: readonly PlanetNote[];
}
