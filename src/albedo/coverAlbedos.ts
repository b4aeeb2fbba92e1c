// What surfaces of the Earth reflect, as published.
import type { Range } from "../ground/range.ts";

/** Published albedos of one kind of cover. */
export interface CoverAlbedo {
  /** Share of sunlight reflected: as printed, or the middle of the range where only that is printed. */
  readonly albedo: number;
  /** Lowest and highest value that the source calls typical. */
  readonly range: Range;
  /** Share of light below 0.7 µm reflected, where published. */
  readonly visible?: number;
  /** Share of light above 0.7 µm reflected, where published. */
  readonly nearInfrared?: number;
  readonly source: string;
  /** Where the two bands were published. */
  readonly bandSource?: string;
}

const TEXTBOOK = "Marshall & Plumb 2008, Atmosphere, Ocean, and Climate Dynamics, Table 2.2";
const ENERGY_TABLE =
  "Markvart & Castañer 2003, Practical Handbook of Photovoltaics, as encyclopaedias print it";
const FORESTS = "Betts & Ball 1997, JGR 102, 28901, and others, as encyclopaedias print them";
const SEA_ICE = "Briegleb et al. 2004, NCAR/TN-463, as in Shields et al. 2013, Astrobiology 13, 715";

const cover = (albedo: number, range: Range, source: string): CoverAlbedo =>
  Object.freeze({ albedo, range: Object.freeze(range), source });

type Bands = Required<Pick<CoverAlbedo, "visible" | "nearInfrared">>;
const banded = (whole: CoverAlbedo, bands: Bands, bandSource: string) =>
  Object.freeze({ ...whole, ...bands, bandSource });

/**
 * Typical albedos of covers of the Earth in sunlight, pure numbers. Ice and snow also in two bands, split at 0.7 µm: a
 * redder star sees them darker (`twoBandAlbedo`). The two bands of sea ice are those of bare cold ice, which make 0.538
 * of sunlight with 52 % visible light. Sources: Marshall & Plumb 2008; Markvart & Castañer 2003; Betts & Ball 1997;
 * Briegleb et al. 2004; Shields et al. 2013.
 */
export const COVER_ALBEDOS = /* @__PURE__ */ Object.freeze({
  ocean: /* @__PURE__ */ cover(0.06, [0.02, 0.1], TEXTBOOK),
  forest: /* @__PURE__ */ cover(0.12, [0.06, 0.18], TEXTBOOK),
  coniferForest: /* @__PURE__ */ cover(0.115, [0.08, 0.15], FORESTS),
  deciduousForest: /* @__PURE__ */ cover(0.165, [0.15, 0.18], FORESTS),
  grass: /* @__PURE__ */ cover(0.16, [0.07, 0.25], TEXTBOOK),
  soil: /* @__PURE__ */ cover(0.15, [0.1, 0.2], TEXTBOOK),
  city: /* @__PURE__ */ cover(0.16, [0.14, 0.18], TEXTBOOK),
  desert: /* @__PURE__ */ cover(0.4, [0.35, 0.45], TEXTBOOK),
  seaIce: /* @__PURE__ */ banded(
    /* @__PURE__ */ cover(0.6, [0.5, 0.7], ENERGY_TABLE),
    { visible: 0.73, nearInfrared: 0.33 },
    SEA_ICE,
  ),
  oldSnow: /* @__PURE__ */ cover(0.5, [0.4, 0.6], TEXTBOOK),
  freshSnow: /* @__PURE__ */ banded(
    /* @__PURE__ */ cover(0.85, [0.75, 0.95], TEXTBOOK),
    { visible: 0.96, nearInfrared: 0.68 },
    SEA_ICE,
  ),
});
