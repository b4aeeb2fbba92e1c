// What is said of one climate.
import type { TippingMargins } from "../branches/margins.ts";
import type { Feedbacks } from "../feedback/feedbacks.ts";
import type { State } from "../states/state.ts";
import type { PlaceTemperatures } from "./appraisedLight.ts";

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
