// The units of a description, each with its one meaning. `docs/planet.md` shows the same table.
import {
  ASTRONOMICAL_UNIT,
  EARTH_MASS_PARAMETER,
  EARTH_RADIUS,
  GRAVITATION,
  JUPITER_MASS_PARAMETER,
  JUPITER_RADIUS,
  SOLAR_LUMINOSITY,
  SOLAR_MASS_PARAMETER,
  SOLAR_RADIUS,
} from "../ground/constants.ts";

/** What a unit means. */
export interface UnitMeaning {
  /** The same in SI: `size` times `si`. */
  readonly size: number;
  readonly si: string;
  readonly meaning: string;
  /** True where the unit is named for this format; the other names are those of the SI. */
  readonly own?: true;
}

const DAY = 86400;
const JULIAN_YEAR = 365.25 * DAY;
const IAU_B3 = "IAU 2015 Resolution B3, nominal";

/** Every unit that a description may use. Prefixes are part of the name: those listed and no other. */
export const UNITS: Readonly<Record<string, UnitMeaning>> = {
  m: { size: 1, si: "m", meaning: "metre" },
  km: { size: 1e3, si: "m", meaning: "kilometre" },
  au: { size: ASTRONOMICAL_UNIT, si: "m", meaning: "astronomical unit, IAU 2012 Resolution B2", own: true },
  solRad: { size: SOLAR_RADIUS, si: "m", meaning: `solar radius, ${IAU_B3}`, own: true },
  earthRad: { size: EARTH_RADIUS, si: "m", meaning: `equatorial radius of Earth, ${IAU_B3}`, own: true },
  jupiterRad: {
    size: JUPITER_RADIUS,
    si: "m",
    meaning: `equatorial radius of Jupiter, ${IAU_B3}`,
    own: true,
  },
  kg: { size: 1, si: "kg", meaning: "kilogram" },
  g: { size: 1e-3, si: "kg", meaning: "gram" },
  solMass: {
    size: SOLAR_MASS_PARAMETER / GRAVITATION,
    si: "kg",
    meaning: `solar mass: GM of ${IAU_B3}, over G of CODATA 2018`,
    own: true,
  },
  earthMass: {
    size: EARTH_MASS_PARAMETER / GRAVITATION,
    si: "kg",
    meaning: `mass of Earth: GM of ${IAU_B3}, over G of CODATA 2018`,
    own: true,
  },
  jupiterMass: {
    size: JUPITER_MASS_PARAMETER / GRAVITATION,
    si: "kg",
    meaning: `mass of Jupiter: GM of ${IAU_B3}, over G of CODATA 2018`,
    own: true,
  },
  s: { size: 1, si: "s", meaning: "second" },
  min: { size: 60, si: "s", meaning: "minute of 60 s" },
  h: { size: 3600, si: "s", meaning: "hour of 3600 s" },
  d: { size: DAY, si: "s", meaning: "day of 86400 s", own: true },
  yr: { size: JULIAN_YEAR, si: "s", meaning: "Julian year of 365.25 d", own: true },
  Myr: { size: 1e6 * JULIAN_YEAR, si: "s", meaning: "million Julian years", own: true },
  Gyr: { size: 1e9 * JULIAN_YEAR, si: "s", meaning: "thousand million Julian years", own: true },
  K: { size: 1, si: "K", meaning: "kelvin" },
  degC: { size: 1, si: "K", meaning: "degree Celsius: T + 273.15 K, a temperature and never a difference" },
  J: { size: 1, si: "J", meaning: "joule" },
  W: { size: 1, si: "W", meaning: "watt" },
  kW: { size: 1e3, si: "W", meaning: "kilowatt" },
  solLum: { size: SOLAR_LUMINOSITY, si: "W", meaning: `solar luminosity, ${IAU_B3}`, own: true },
  Pa: { size: 1, si: "Pa", meaning: "pascal" },
  hPa: { size: 100, si: "Pa", meaning: "hectopascal" },
  kPa: { size: 1e3, si: "Pa", meaning: "kilopascal" },
  bar: { size: 1e5, si: "Pa", meaning: "bar of 100000 Pa" },
  atm: { size: 101325, si: "Pa", meaning: "standard atmosphere of 101325 Pa" },
};
