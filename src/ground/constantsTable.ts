// The papers of the constants: value, unit, uncertainty, source and set of each.
import * as c from "./constants.ts";

/** One constant with its provenance. */
export interface ConstantRecord {
  readonly name: string;
  readonly symbol: string;
  readonly value: number;
  readonly unit: string;
  /** Standard uncertainty in `unit`; 0 where the value is exact by definition or adopted as printed. */
  readonly uncertainty: number;
  readonly source: string;
  readonly set: string;
}

const CODATA = "CODATA 2018 (Tiesinga et al. 2021, Rev. Mod. Phys. 93, 025010)";
const NOMINAL = "IAU 2015 Resolution B3 (Prša et al. 2016, AJ 152, 41)";
const row = (
  name: string,
  symbol: string,
  value: number,
  unit: string,
  source: string,
  set: string,
  uncertainty = 0,
): ConstantRecord => Object.freeze({ name, symbol, value, unit, uncertainty, source, set });

/** All constants of the library with unit, uncertainty and source. */
export const CONSTANTS: readonly ConstantRecord[] = /* @__PURE__ */ (() =>
  Object.freeze([
    row("STEFAN_BOLTZMANN", "σ", c.STEFAN_BOLTZMANN, "W m-2 K-4", CODATA, "CODATA 2018"),
    row("PLANCK", "h", c.PLANCK, "J s", CODATA, "CODATA 2018"),
    row("SPEED_OF_LIGHT", "c", c.SPEED_OF_LIGHT, "m s-1", CODATA, "CODATA 2018"),
    row("BOLTZMANN", "k", c.BOLTZMANN, "J K-1", CODATA, "CODATA 2018"),
    row("GAS_CONSTANT", "R", c.GAS_CONSTANT, "J mol-1 K-1", CODATA, "CODATA 2018"),
    row("GRAVITATION", "G", c.GRAVITATION, "m3 kg-1 s-2", CODATA, "CODATA 2018", 1.5e-15),
    row("ASTRONOMICAL_UNIT", "au", c.ASTRONOMICAL_UNIT, "m", "IAU 2012 Resolution B2", "IAU 2012 B2"),
    row("SOLAR_LUMINOSITY", "L☉", c.SOLAR_LUMINOSITY, "W", NOMINAL, "IAU 2015 B3"),
    row("SOLAR_RADIUS", "R☉", c.SOLAR_RADIUS, "m", NOMINAL, "IAU 2015 B3"),
    row("SOLAR_MASS_PARAMETER", "GM☉", c.SOLAR_MASS_PARAMETER, "m3 s-2", NOMINAL, "IAU 2015 B3"),
    row("SOLAR_EFFECTIVE_TEMPERATURE", "Teff☉", c.SOLAR_EFFECTIVE_TEMPERATURE, "K", NOMINAL, "IAU 2015 B3"),
    row("SOLAR_IRRADIANCE", "S☉", c.SOLAR_IRRADIANCE, "W m-2", NOMINAL, "IAU 2015 B3"),
    row("EARTH_RADIUS", "R⊕", c.EARTH_RADIUS, "m", NOMINAL, "IAU 2015 B3"),
    row("EARTH_MASS_PARAMETER", "GM⊕", c.EARTH_MASS_PARAMETER, "m3 s-2", NOMINAL, "IAU 2015 B3"),
    row("JUPITER_RADIUS", "R♃", c.JUPITER_RADIUS, "m", NOMINAL, "IAU 2015 B3"),
    row("JUPITER_MASS_PARAMETER", "GM♃", c.JUPITER_MASS_PARAMETER, "m3 s-2", NOMINAL, "IAU 2015 B3"),
  ]))();
