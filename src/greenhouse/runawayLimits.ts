// Published limits beyond which an ocean boils away, by what they limit.

/** A published runaway limit. */
export interface RunawayLimit {
  /** Mean over the whole sphere, W m⁻². */
  readonly flux: number;
  /** What is limited. */
  readonly kind: "outgoing longwave" | "absorbed sunlight" | "incident sunlight";
  readonly about: string;
  readonly source: string;
}

const limit = (
  flux: number,
  kind: RunawayLimit["kind"],
  about: string,
  source: string,
): Readonly<RunawayLimit> => Object.freeze({ flux, kind, about, source });

const STEAM = "Goldblatt et al. 2013, Nature Geoscience 6, 661 (doi:10.1038/ngeo1892)";

/**
 * Published limits of the runaway greenhouse on Earth, means over the whole sphere in W m⁻². They limit different things
 * and do not compare: only `outgoing` is a ceiling of emission (`ceilingEmission`); `absorbed` is after the albedo,
 * `incident` before it, that is a quarter of the stellar flux. Sources: Goldblatt et al. 2013; Leconte et al. 2013.
 */
export const RUNAWAY_LIMITS = /* @__PURE__ */ Object.freeze({
  outgoing: /* @__PURE__ */ limit(282, "outgoing longwave", "what a steam atmosphere can emit", STEAM),
  absorbed: /* @__PURE__ */ limit(294, "absorbed sunlight", "what the planet absorbs at the limit", STEAM),
  incident: /* @__PURE__ */ limit(
    375,
    "incident sunlight",
    "global mean in a model with a circulation, about",
    "Leconte et al. 2013, Nature 504, 268 (doi:10.1038/nature12827)",
  ),
});
