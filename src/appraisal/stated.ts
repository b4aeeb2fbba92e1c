// A flux in the two units in which it is read.
import { SOLAR_IRRADIANCE } from "../ground/constants.ts";
import type { StatedFlux } from "./appraisedLight.ts";

/** W m⁻², and the same in units of the nominal solar irradiance at 1 au. */
export const statedFlux = (flux: number): StatedFlux => ({ flux, earths: flux / SOLAR_IRRADIANCE });
