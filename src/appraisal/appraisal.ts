// Everything that is said of a described planet. A plain frozen object: it survives `JSON.stringify` and back.
import type { Diagram } from "../branches/diagram.ts";
import type { TippingMargins } from "../branches/margins.ts";
import type { Feedbacks } from "../feedback/feedbacks.ts";
import type { PlanetAssumptions } from "../planet/assumptions.ts";
import type { PlanetInput } from "../planet/planetInput.ts";
import type { PlanetEquilibriumTemperature } from "../planet/planetTypes.ts";
import type { FoundStates, State } from "../states/state.ts";
import type { AppraisalNote } from "./appraisalNote.ts";

/** A stellar flux normal to the beam. */
export interface StatedFlux {
  /** W m⁻²: S, not S/4. */
  readonly flux: number;
  /** In units of the nominal solar irradiance at 1 au, 1361 W m⁻². */
  readonly earths: number;
}

/** The light that reaches the planet. */
export interface Starlight {
  /** W; null where it is neither given nor follows. */
  readonly luminosity: number | null;
  /** Semi-major axis, m. */
  readonly semiMajorAxis: number | null;
  /** Orbital period, s. */
  readonly period: number | null;
  readonly eccentricity: number;
  /** At the distance of the semi-major axis. */
  readonly atSemiMajorAxis: StatedFlux;
  /** The mean over time, S(a)/√(1 − e²). */
  readonly mean: StatedFlux;
  readonly periastron: StatedFlux;
  readonly apoastron: StatedFlux;
}

/** An equilibrium temperature at the semi-major axis, under an albedo and a redistribution that everybody uses. */
export interface ConventionalTemperature {
  readonly albedo: number;
  readonly redistribution: number;
  /** `the whole sphere` or `the day side`. */
  readonly spread: string;
  /** K. */
  readonly value: number;
}

/** Temperatures of re-radiation. None of them is the temperature of a surface below an atmosphere. */
export interface EquilibriumTemperatures {
  /** As described; null where albedo or redistribution are not given, or where the albedo answers to temperature. */
  readonly described: PlanetEquilibriumTemperature | null;
  readonly conventional: readonly ConventionalTemperature[];
  /** For the described albedo, without internal heat: null where that is no number. */
  readonly places: PlaceTemperatures | null;
  /** For the orbit's mean flux, and for its mean temperature with albedo 0 and f = 1/4; they differ where e > 0. */
  readonly orbit: { readonly ofMeanFlux: number; readonly meanOverTime: number };
}

/** Temperatures of places, K, as heat stays where it falls (`still`) or is spread over the planet (`spread`). */
export interface PlaceTemperatures {
  readonly substellar: number;
  readonly day: { readonly still: number; readonly spread: number };
  readonly night: { readonly still: number; readonly spread: number };
}

/** Which average over the orbit suits a state. */
export interface OrbitAveraging {
  /** Π = C/(P·∂OLR/∂T); null where heat capacity or period are not known. */
  readonly thermalInertiaRatio: number | null;
  readonly favours: "flux" | "temperature" | null;
  readonly text: string;
}

/** What water and carbon dioxide do at the surface. */
export interface SurfacePhases {
  /** Pa. */
  readonly pressure: number;
  /** What pure water is at this temperature and pressure. */
  readonly water: "ice" | "liquid" | "vapour" | "supercritical";
  /** Saturation pressure of water at the temperature of the surface, Pa; null outside of the range of the published lines. */
  readonly saturationPressure: number | null;
  /** Where water boils at this pressure, K; null where it does not. */
  readonly boilingTemperature: number | null;
  /** Where carbon dioxide of this pressure freezes, K; null outside of the published range. */
  readonly carbonDioxideFrostPoint: number | null;
  /** Whether the surface is below that; null where it is not known. */
  readonly carbonDioxideFreezes: boolean | null;
}

/** What is said of one state. */
export interface StateAppraisal {
  readonly state: State;
  /** K: with the albedo of this state. It is not the surface temperature. */
  readonly equilibriumTemperature: number;
  /** Temperature of the state less its equilibrium temperature, K. */
  readonly greenhouseWarming: number;
  readonly averaging: OrbitAveraging;
  /** What holds it; null for a state that does not hold. */
  readonly feedbacks: Feedbacks | null;
  /** How far the star may brighten or fade; null for a state that does not hold, and where nothing stands for the star. */
  readonly margins: TippingMargins | null;
  /** Null where no surface pressure is given. */
  readonly surface: SurfacePhases | null;
}

/** A published limit of the habitable zone, or one of the planet's own budget, and where the planet is. */
export interface StatedLimit {
  /** What the limit is, such as `runaway greenhouse`. */
  readonly name: string;
  /** Where it is published; null for a limit of the planet's own budget. */
  readonly paper: string | null;
  readonly doi: string | null;
  /** Mass of the planet for which it was computed, Earth masses. */
  readonly massEarths: number | null;
  /** Flux at the limit. */
  readonly limit: StatedFlux;
  /** Distance at which the star gives this flux, m. */
  readonly distance: number | null;
  /** Mean flux of the planet over the flux of the limit. */
  readonly ratio: number;
  /** K, at the limit; null where none is published. */
  readonly temperature: number | null;
}

/** A field that was left out, and what cannot be said without it. */
export interface MissingField {
  readonly path: string;
  readonly text: string;
}

/** Where a law or a number of the appraisal is published. */
export interface AppraisalSource {
  /** Laws and inputs that rest on it. */
  readonly of: readonly string[];
  readonly source: string;
  readonly doi: string | null;
}

/** What `appraisePlanet` returns. */
export interface Appraisal {
  readonly format: "thermostead-appraisal-1";
  /** Version of this package. */
  readonly version: string;
  readonly name: string | null;
  readonly star: string | null;
  /** The description as it was given. */
  readonly description: unknown;
  readonly inputs: readonly PlanetInput[];
  readonly missing: readonly MissingField[];
  readonly starlight: Starlight;
  readonly equilibrium: EquilibriumTemperatures;
  /** The search for states; null where the description gives no budget. */
  readonly found: FoundStates | null;
  /** By rising temperature. */
  readonly states: readonly StateAppraisal[];
  /** All climates as the star brightens or fades, from a fifth to five times; null where nothing stands for the star. */
  readonly diagram: Diagram | null;
  /** Published limits; empty where the effective temperature is not given or outside of their range. */
  readonly habitableZone: readonly StatedLimit[];
  /** Where the planet's own stable branches end. */
  readonly ownLimits: readonly StatedLimit[];
  readonly assumptions: PlanetAssumptions | null;
  readonly notes: readonly AppraisalNote[];
  readonly sources: readonly AppraisalSource[];
  /** The set of constants. */
  readonly constants: string;
  /** What these numbers are not. */
  readonly caution: string;
}
