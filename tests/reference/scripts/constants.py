# The constants as SciPy and Astropy carry them.
import scipy.constants as codata
from astropy import constants as astro

from common import made_by, save

SCIPY = {
    "STEFAN_BOLTZMANN": "Stefan-Boltzmann constant",
    "PLANCK": "Planck constant",
    "SPEED_OF_LIGHT": "speed of light in vacuum",
    "BOLTZMANN": "Boltzmann constant",
    "GAS_CONSTANT": "molar gas constant",
    "GRAVITATION": "Newtonian constant of gravitation",
}
ASTROPY = {
    "STEFAN_BOLTZMANN": "sigma_sb",
    "PLANCK": "h",
    "SPEED_OF_LIGHT": "c",
    "BOLTZMANN": "k_B",
    "GAS_CONSTANT": "R",
    "GRAVITATION": "G",
    "ASTRONOMICAL_UNIT": "au",
    "SOLAR_LUMINOSITY": "L_sun",
    "SOLAR_RADIUS": "R_sun",
    "SOLAR_MASS_PARAMETER": "GM_sun",
    "EARTH_RADIUS": "R_earth",
    "EARTH_MASS_PARAMETER": "GM_earth",
    "JUPITER_RADIUS": "R_jup",
    "JUPITER_MASS_PARAMETER": "GM_jup",
}
save(
    "constants",
    {
        "title": "Constants as two libraries carry them",
        "made": made_by(__file__, "read, not computed", "scipy", "astropy"),
        "scipy": {name: codata.physical_constants[key][0] for name, key in SCIPY.items()},
        "astropy": {name: float(getattr(astro, key).si.value) for name, key in ASTROPY.items()},
    },
)
