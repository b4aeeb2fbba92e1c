// What is said of the light of a planet and of what it makes of it without an atmosphere.
import type { PlanetEquilibriumTemperature } from "../planet/planetTypes.ts";

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
  /** 0 where none is given, which `missing` says. */
  readonly eccentricity: number;
  /** At the distance of the semi-major axis. */
  readonly atSemiMajorAxis: StatedFlux;
  /** The mean over time, S(a)/√(1 − e²). */
  readonly mean: StatedFlux;
  readonly periastron: StatedFlux;
  readonly apoastron: StatedFlux;
  /** What stars that it does not orbit add, at their distances; in none of the fluxes above. Null where there are none. */
  readonly companions: StatedFlux | null;
  /**
   * What the climates have: that of all stars, in the average over the orbit that the description asks for. For the mean of the
   * temperature it is the flux that gives it, with a constant albedo.
   */
  readonly taken: StatedFlux;
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
