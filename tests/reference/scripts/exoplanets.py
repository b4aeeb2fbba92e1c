# Flux and equilibrium temperature of published planets in Astropy's units and constants.
import numpy as np
from astropy import constants as const, units as u

from common import made_by, save


def luminosity(radius, temperature):
    return (4 * np.pi * (radius * u.R_sun) ** 2 * const.sigma_sb * (temperature * u.K) ** 4).to(u.W)


def planet(name, radius, temperature, axis, albedo, redistribution):
    light = luminosity(radius, temperature)
    flux = (light / (4 * np.pi * (axis * u.au) ** 2)).to(u.W / u.m**2)
    balance = ((redistribution * flux * (1 - albedo)) / const.sigma_sb) ** 0.25
    inputs = {"radius": radius, "temperature": temperature, "axis": axis, "albedo": albedo, "redistribution": redistribution}
    return {"name": name, **inputs, "luminosity": light.value, "flux": flux.value, "T": balance.to(u.K).value}


save(
    "exoplanets",
    {
        "title": "Luminosity (W), flux (W m^-2) and equilibrium temperature (K)",
        "made": made_by(__file__, "Astropy's units and constants", "astropy"),
        "rows": [
            planet("TRAPPIST-1 e", 0.1192, 2566, 0.02925, 0, 1 / 4),
            planet("K2-18 b", 0.4445, 3457, 0.1591, 0.3, 1 / 4),
            planet("HD 189733 b", 0.805, 4875, 0.03099, 0, 1 / 2),
            planet("55 Cnc e", 0.943, 5196, 0.01544, 0, 2 / 3),
        ],
    },
)
