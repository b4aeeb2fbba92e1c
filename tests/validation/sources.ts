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
export const STEPHENS_2012 = source(
  "Stephens et al.",
  "2012",
  "An update on Earth's energy balance in light of the latest global observations, Nat. Geosci. 5, 691",
  "Fig. B1",
);
export const KT_1997 = source(
  "Kiehl & Trenberth",
  "1997",
  "Earth's annual global mean energy budget, BAMS 78, 197",
  "text",
);
export const CATLING_KASTING = source(
  "Catling & Kasting",
  "2017",
  "Atmospheric Evolution on Inhabited and Lifeless Worlds",
  "skin temperature of a grey atmosphere",
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
export const EKER = source(
  "Eker et al.",
  "2018",
  "Interrelated main-sequence mass–luminosity, mass–radius and mass–effective temperature relations, MNRAS 479, 5491",
  "table 4",
);
export const INCROPERA_BANDS = source(
  "Incropera & DeWitt",
  "2002",
  "Fundamentals of Heat and Mass Transfer, 5th edition",
  "table 12.1",
);
export const BRIGHT_STARS = source(
  "Ducati",
  "2002",
  "Catalogue of stellar photometry in Johnson's 11-colour system, VizieR II/237",
  "V of the components, and of the pair as commonly quoted",
);
export const KEPLER = source("Kepler", "1609", "Astronomia nova", "equal areas in equal times");
export const JI = source(
  "Ji, Chatterjee, Park Coy & Kite",
  "2023",
  "The inner habitable zone boundary for eccentric exoplanets, ApJL 943, L1",
  "abstract",
);
export const STOKES = source(
  "Stokes",
  "1862",
  "On the intensity of the light reflected from or transmitted through a pile of plates, Proc. R. Soc. 11, 545",
  "the sum of reflections between two layers",
);
export const WILD_2015 = source(
  "Wild et al.",
  "2015",
  "The energy balance over land and oceans, Clim. Dyn. 44, 3393",
  "Fig. 1",
);
export const SHIELDS = source(
  "Shields et al.",
  "2013",
  "The effect of host star spectral energy distribution and ice-albedo feedback, Astrobiology 13, 715",
  "two bands of ice",
);
export const SURFACE_ALBEDOS = source(
  "Markvart & Castañer; Tetzlaff; Betts & Ball",
  "undated",
  "Typical surface albedos, as encyclopaedias print them",
  "table",
);
export const JUPITER_HEAT = source(
  "Hanel et al.",
  "1981",
  "Albedo, internal heat, and energy balance of Jupiter, JGR 86, 8705",
  "abstract",
);
export const SATURN_HEAT = source(
  "Hanel et al.",
  "1983",
  "Albedo, internal heat flux, and energy balance of Saturn, Icarus 53, 262",
  "abstract",
);
export const NEPTUNE_HEAT = source(
  "Pearl & Conrath",
  "1991",
  "The albedo, effective temperature, and energy balance of Neptune, JGR 96, 18921",
  "abstract",
);
export const SEAGER = source("Seager", "2010", "Exoplanet Atmospheres", "ch. 3: a Lambert sphere");
export const KOLL_CRONIN = source(
  "Koll & Cronin",
  "2018",
  "Earth's outgoing longwave radiation linear due to H2O greenhouse effect, PNAS 115, 10293",
  "abstract and Fig. 1",
);
export const LOEB_2018 = source(
  "Loeb et al.",
  "2018",
  "CERES EBAF Edition 4.0, J. Climate 31, 895",
  "global means",
);
export const ROBINSON_CATLING = source(
  "Robinson & Catling",
  "2012",
  "An analytic radiative-convective model for planetary atmospheres, ApJ 757, 104",
  "optical depth as a power of pressure",
);
export const CLAUSIUS_CLAPEYRON = source(
  "Clausius; Clapeyron",
  "1850",
  "the relation with a constant latent heat",
  "L = 2.5e6 J/kg, R_v = 461.5 J/kg/K",
);
export const STEAM_TABLES = source("IAPWS", "1997", "Industrial formulation IF97", "saturation line");
export const NAKAJIMA = source(
  "Nakajima, Hayashi & Abe",
  "1992",
  "A study on the runaway greenhouse effect with a one-dimensional model, J. Atmos. Sci. 49, 2256",
  "upper limits of outgoing radiation",
);
export const GOLDBLATT = source(
  "Goldblatt et al.",
  "2013",
  "Low simulated radiation limit for runaway greenhouse climates, Nat. Geosci. 6, 661",
  "abstract",
);
export const LECONTE = source(
  "Leconte et al.",
  "2013",
  "Increased insolation threshold for runaway greenhouse processes on Earth-like planets, Nature 504, 268",
  "abstract",
);
export const GOLDBLATT_WATSON = source(
  "Goldblatt & Watson",
  "2012",
  "The runaway greenhouse, Phil. Trans. R. Soc. A 370, 4197",
  "abstract",
);
export const STANDARD_ATMOSPHERE = source(
  "NOAA, NASA & USAF",
  "1976",
  "U.S. Standard Atmosphere",
  "temperature by geopotential height",
);
export const MYHRE = source(
  "Myhre, Highwood, Shine & Stordal",
  "1998",
  "New estimates of radiative forcing due to well mixed greenhouse gases, GRL 25, 2715",
  "5.35 ln(C/C₀)",
);
export const IPCC_2001 = source(
  "IPCC",
  "2001",
  "Climate Change 2001: The Scientific Basis, chapter 6",
  "Tables 6.1 and 6.2",
);
export const ETMINAN = source(
  "Etminan, Myhre, Highwood & Shine",
  "2016",
  "Radiative forcing of carbon dioxide, methane, and nitrous oxide, GRL 43, 12614",
  "abstract and Table 1",
);
export const AR6_FORCING = source(
  "IPCC; Forster et al.",
  "2021",
  "Climate Change 2021: The Physical Science Basis, chapter 7",
  "§7.3.2, Tables 7.2, 7.8 and 7.SM.1",
);
export const BONY = source(
  "Bony et al.",
  "2006",
  "How well do we understand and evaluate climate change feedback processes?, J. Climate 19, 3445",
  "Planck's response",
);
export const IF97 = source(
  "IAPWS; Wagner et al.",
  "1997",
  "Industrial Formulation 1997 for the thermodynamic properties of water and steam",
  "Tables 35 and 36; triple and critical point",
);
export const NIST_WATER = source(
  "NIST",
  "undated",
  "Chemistry WebBook, water",
  "normal boiling point 99.974 °C",
);
export const WAGNER_PRUSS = source(
  "Wagner & Pruss",
  "1993",
  "International equations for the saturation properties of ordinary water, JPCRD 22, 783",
  "vapour pressure",
);
export const IAPWS_ICE = source(
  "Wagner, Riethmann, Feistel & Harvey",
  "2011",
  "New equations for the sublimation pressure and melting pressure of H₂O ice Ih, JPCRD 40, 043103",
  "sublimation pressure",
);
export const MURPHY_KOOP = source(
  "Murphy & Koop",
  "2005",
  "Review of the vapour pressures of ice and supercooled water for atmospheric applications, QJRMS 131, 1539",
  "Table C1",
);
export const FANALE = source(
  "Fanale et al.; restated by Forget et al.",
  "1982",
  "Mars: the regolith-atmosphere-cap system and climate change, Icarus 50, 381; Icarus 222, 81 (2013)",
  "frost point of CO₂",
);
export const SPAN_WAGNER = source(
  "Span & Wagner",
  "1996",
  "A new equation of state for carbon dioxide, JPCRD 25, 1509",
  "sublimation pressure",
);
export const KOPPARAPU_2013 = source(
  "Kopparapu et al.",
  "2013",
  "Habitable zones around main-sequence stars: new estimates, ApJ 765, 131; erratum ApJ 770, 82",
  "Table 3 and the limits of the Sun, as corrected",
);
export const KOPPARAPU_2014 = source(
  "Kopparapu et al.",
  "2014",
  "Habitable zones around main-sequence stars: dependence on planetary mass, ApJL 787, L29",
  "abstract, Table 1 and the limits of the Sun",
);
export const ANGLADA_ESCUDE = source(
  "Anglada-Escudé et al.",
  "2016",
  "A terrestrial planet candidate in a temperate orbit around Proxima Centauri, Nature 536, 437",
  "Table 1",
);
