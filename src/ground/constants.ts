// Constants as plain numbers, one name each; `constantsTable.ts` holds their papers.

/** Stefan–Boltzmann constant σ, W m⁻² K⁻⁴: the ten digits that CODATA 2018 prints, taken as exact. */
export const STEFAN_BOLTZMANN = 5.670374419e-8;
/** Planck constant h, J s (exact in the SI of 2019). */
export const PLANCK = 6.62607015e-34;
/** Speed of light in vacuum c, m s⁻¹ (exact). */
export const SPEED_OF_LIGHT = 299792458;
/** Boltzmann constant k, J K⁻¹ (exact in the SI of 2019). */
export const BOLTZMANN = 1.380649e-23;
/** Molar gas constant R, J mol⁻¹ K⁻¹ (the ten digits that CODATA 2018 prints). */
export const GAS_CONSTANT = 8.314462618;
/** Newtonian constant of gravitation G, m³ kg⁻¹ s⁻² (CODATA 2018). */
export const GRAVITATION = 6.6743e-11;
/** Astronomical unit, m (exact, IAU 2012 Resolution B2). */
export const ASTRONOMICAL_UNIT = 149597870700;
/** Nominal solar luminosity, W (IAU 2015 Resolution B3). */
export const SOLAR_LUMINOSITY = 3.828e26;
/** Nominal solar radius, m (IAU 2015 Resolution B3). */
export const SOLAR_RADIUS = 6.957e8;
/** Nominal solar mass parameter GM, m³ s⁻² (IAU 2015 Resolution B3). */
export const SOLAR_MASS_PARAMETER = 1.3271244e20;
/** Nominal solar effective temperature, K (IAU 2015 Resolution B3). */
export const SOLAR_EFFECTIVE_TEMPERATURE = 5772;
/** Nominal total solar irradiance at 1 au, W m⁻² (IAU 2015 Resolution B3). */
export const SOLAR_IRRADIANCE = 1361;
/** Nominal terrestrial equatorial radius, m (IAU 2015 Resolution B3). */
export const EARTH_RADIUS = 6.3781e6;
/** Nominal terrestrial mass parameter GM, m³ s⁻² (IAU 2015 Resolution B3). */
export const EARTH_MASS_PARAMETER = 3.986004e14;
/** Nominal jovian equatorial radius, m (IAU 2015 Resolution B3). */
export const JUPITER_RADIUS = 7.1492e7;
/** Nominal jovian mass parameter GM, m³ s⁻² (IAU 2015 Resolution B3). */
export const JUPITER_MASS_PARAMETER = 1.2668653e17;

/** Names the set of constants in every result. */
export const CONSTANT_SET = "CODATA 2018, IAU 2012 B2, IAU 2015 B3";
