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
  /** Of all stars that the planet orbits together, W; null where it is neither given nor follows. */
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
  /** What stars that it does not orbit add, at their distances; in none of the fluxes above. Null where there are none. */
  readonly companions: StatedFlux | null;
}

/** An equilibrium temperature for the flux at the semi-major axis, under an albedo and a redistribution that everybody uses. */
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
  /** As described; null where albedo or redistribution are not given, or where the albedo answers to temperature: see each state. */
  readonly described: PlanetEquilibriumTemperature | null;
  readonly conventional: readonly ConventionalTemperature[];
  /** For the described albedo, flux and internal heat: null where the albedo is no number. */
  readonly places: PlaceTemperatures | null;
  /**
   * Of the orbit's mean flux, and the mean over time of the temperature of the moment, with albedo 0 and f = 1/4; they differ
   * where e > 0. The second is null where stars shine that the planet does not orbit.
   */
  readonly orbit: { readonly ofMeanFlux: number; readonly meanOverTime: number | null };
}

/**
 * Temperatures of re-radiation of places of a planet that keeps one side to its star, K, where no heat is transported
 * (`still`) and where it is spread over the whole planet (`spread`).
 */
export interface PlaceTemperatures {
  /** Under the star, without transport of heat: f = 1. */
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
  /** What pure water is at this temperature and pressure. Ice is taken to melt at the triple point. */
  readonly water: "ice" | "liquid" | "vapour" | "supercritical";
  /** Saturation pressure of water at the temperature of the surface, Pa; null outside of the range of the published lines. */
  readonly saturationPressure: number | null;
  /** Where water boils at this pressure, K; null where it does not. */
  readonly boilingTemperature: number | null;
  /** Where carbon dioxide freezes if the whole pressure is its own, K; less of it freezes colder. Null outside of the range. */
  readonly carbonDioxideFrostPoint: number | null;
  /** Whether the surface is below that; null where that is not known. */
  readonly carbonDioxideFreezes: boolean | null;
}

/** How the temperature of a climate answers to an input, to first order along the branch: −(∂N/∂p)/λ. */
export interface Sensitivity {
  /** The input, such as `albedo.warm`. */
  readonly path: string;
  /** Its unit. */
  readonly unit: string;
  /** K for one more of its unit. */
  readonly perUnit: number;
  /** K for 1 % more of its value. */
  readonly perPercent: number;
  /** K that its lower and its upper error make, with their signs; null where none is given. */
  readonly minus: number | null;
  readonly plus: number | null;
}

/** What is said of one state. */
export interface StateAppraisal {
  readonly state: State;
  /** K: with the albedo of this state. It is not the surface temperature. */
  readonly equilibriumTemperature: number;
  /** Temperature of the state less its equilibrium temperature, K. */
  readonly greenhouseWarming: number;
  /** With the albedo of this state; null where that is beyond 0 and 1, which a note says. */
  readonly places: PlaceTemperatures | null;
  readonly averaging: OrbitAveraging;
  /** What holds it; null for a state that does not hold. */
  readonly feedbacks: Feedbacks | null;
  /** What would change it, by size of the change for 1 %; null for a state that does not hold. */
  readonly sensitivities: readonly Sensitivity[] | null;
  /**
   * How far the star may brighten or fade; null for a state that does not hold, where no one given stands for the star, and
   * where the diagram does not decide its branch.
   */
  readonly margins: TippingMargins | null;
  /** Null where no surface pressure is given. */
  readonly surface: SurfacePhases | null;
}

/**
 * A published limit of the habitable zone, or one of the planet's own budget, and where the planet is. What a planet is like
 * there does not follow.
 */
export interface StatedLimit {
  /** What the limit is, such as `runaway greenhouse`. */
  readonly name: string;
  /** Which edge of the zone; null for a limit of the planet's own budget. */
  readonly edge: "inner" | "outer" | null;
  /** Where it is published; null for a limit of the planet's own budget. */
  readonly paper: string | null;
  readonly doi: string | null;
  /** Mass of the planet for which it was computed, Earth masses. */
  readonly massEarths: number | null;
  /** Flux at the limit. */
  readonly limit: StatedFlux;
  /** Distance at which the star gives this flux, m; null where its luminosity is not known. */
  readonly distance: number | null;
  /** Mean flux of the planet over the flux of the limit. */
  readonly ratio: number;
  /** Whether the planet gets more light than at the limit, less, or one after the other along its orbit. */
  readonly position: "nearer" | "farther" | "crosses";
  /** K, at the limit; null where none is published. */
  readonly temperature: number | null;
}

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
  /** All climates as the star brightens or fades, from a fifth to five times; null where nothing stands for the star. */
  readonly diagram: Diagram | null;
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
