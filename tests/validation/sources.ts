// The works that checks are taken from.

/** Where a number was printed, or whose formula a script evaluated. */
export interface Source {
  readonly authors: string;
  readonly year: string;
  readonly title: string;
  readonly where: string;
}

const source = (authors: string, year: string, title: string, where: string): Source => ({
  authors,
  year,
  title,
  where,
});

export const SCIPY = source(
  "NIST/CODATA, as SciPy 1.10.1 carries it",
  "2018",
  "scipy.constants",
  "physical_constants",
);
export const ASTROPY = source("Astropy Project", "2022", "Astropy 5.2.1", "constants and units");
export const IAU_B3 = source(
  "IAU; Prša et al., AJ 152, 41",
  "2015",
  "Resolution B3 on recommended nominal conversion constants",
  "resolution text",
);
export const FACT_SHEETS = source(
  "D. R. Williams, NASA NSSDCA",
  "current edition",
  "Planetary fact sheets",
  "bulk parameters",
);
export const MARS_SHEET_2006 = source(
  "D. R. Williams, NASA NSSDCA",
  "c. 2006",
  "Mars fact sheet, older edition",
  "bulk parameters",
);
export const HEAT_BALANCE = source(
  "NASA Planetary Data System, Atmospheres Node",
  "undated",
  "Heat balance (encyclopedia page)",
  "the two tables",
);
export const PLANET_TABLES = source(
  "N. Strobel",
  "undated",
  "Astronomy Notes: Planet tables",
  "orbital properties",
);
export const LI_2012 = source(
  "Li et al.",
  "2012",
  "Emitted power of Jupiter based on Cassini CIRS and VIMS observations, JGR 117, E11002",
  "abstract",
);
export const LI_2010 = source("Li et al.", "2010", "Saturn's emitted power, JGR 115, E11002", "abstract");
export const TFK_2009 = source(
  "Trenberth, Fasullo & Kiehl",
  "2009",
  "Earth's global energy budget, BAMS 90, 311",
  "Fig. 1 and text",
);
export const KT_1997 = source(
  "Kiehl & Trenberth",
  "1997",
  "Earth's annual global mean energy budget, BAMS 78, 197",
  "text",
);
export const MARSHALL_PLUMB = source(
  "Marshall & Plumb",
  "2008",
  "Atmosphere, Ocean, and Climate Dynamics",
  "§2.3.1–2.3.2",
);
export const JACOB = source("Jacob", "1999", "Introduction to Atmospheric Chemistry", "§7.3.2");
export const INCROPERA = source(
  "Incropera & DeWitt",
  "2002",
  "Fundamentals of Heat and Mass Transfer, 5th edition",
  "example 1.2",
);
export const HARTMANN = source(
  "Hartmann",
  "2016",
  "Global Physical Climatology, 2nd edition",
  "heat capacities",
);
export const GILL = source("Gill", "1982", "Atmosphere–Ocean Dynamics", "§2.3");
export const WILLIAMS_KASTING = source(
  "Williams & Kasting",
  "1997",
  "Habitable planets with high obliquities, Icarus 129, 254",
  "heat capacities",
);
export const PIERREHUMBERT = source(
  "Pierrehumbert",
  "2010",
  "Principles of Planetary Climate",
  "ch. 3 and its script on ice-albedo feedback",
);
export const KAPER_ENGLER = source("Kaper & Engler", "2013", "Mathematics and Climate, SIAM", "ch. 2");
export const SPIEGEL = source(
  "Spiegel, Menou & Scharf",
  "2008",
  "Habitable Climates, ApJ 681, 1609",
  "Table 1, model 2",
);
export const ZALIAPIN_GHIL = source(
  "Zaliapin & Ghil",
  "2010",
  "Another look at climate sensitivity, Nonlin. Processes Geophys. 17, 113",
  "Eqs 11–12",
);
export const BUDYKO = source(
  "Budyko",
  "1969",
  "The effect of solar radiation variations on the climate of the Earth, Tellus 21, 611",
  "ice at 72°, albedos 0.32 and 0.62",
);
export const WATSON_LOVELOCK = source(
  "Watson & Lovelock",
  "1983",
  "Biological homeostasis of the global environment, Tellus 35B, 284",
  "the parabola of growth, 22.5 °C, 0.003265, death rate 0.3",
);
export const NORTH = source(
  "North, Cahalan & Coakley",
  "1981",
  "Energy balance climate models, Rev. Geophys. 19, 91",
  "Eq. 6: 203.3 and 2.09",
);
export const GOUGH = source(
  "Gough",
  "1981",
  "Solar interior structure and luminosity variations, Solar Physics 74, 21",
  "L/L☉ = 1/(1 + (2/5)(1 − t/t☉))",
);
export const QUIRRENBACH = source(
  "Quirrenbach",
  "2022",
  "The equilibrium temperature of planets on eccentric orbits, arXiv:2203.11723",
  "abstract",
);
export const MENDEZ = source(
  "Méndez & Rivera-Valentín",
  "2017",
  "The equilibrium temperature of planets in elliptical orbits, ApJL 837, L1",
  "abstract and temporal averages",
);
export const COWAN_AGOL = source(
  "Cowan & Agol",
  "2011",
  "The statistics of albedo and heat recirculation on hot exoplanets, ApJ 729, 54",
  "§2",
);
export const AGOL = source(
  "Agol et al.",
  "2021",
  "Refining the transit-timing and photometric analysis of TRAPPIST-1, PSJ 2, 1",
  "star and planet tables",
);
export const BENNEKE = source(
  "Benneke et al.",
  "2019",
  "Water vapor and clouds on the habitable-zone sub-Neptune exoplanet K2-18b, ApJL 887, L14",
  "abstract and parameter table",
);
export const HEBB = source("Hebb et al.", "2009", "WASP-12b, ApJ 693, 1920", "parameter table");
export const TORRES = source(
  "Torres, Winn & Holman",
  "2008",
  "Improved parameters for extrasolar transiting planets, ApJ 677, 1324",
  "parameter tables",
);
export const PLANCK_LAW = source(
  "Planck",
  "1901",
  "Über das Gesetz der Energieverteilung im Normalspectrum",
  "the law",
);
export const TWO_STREAM = source(
  "Goody & Yung",
  "1989",
  "Atmospheric Radiation",
  "two-stream equations of a grey atmosphere",
);
