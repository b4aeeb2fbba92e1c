# The six straight lines of Eker et al. 2018 (MNRAS 479, 5491, table 4; coefficients from memory) at some masses.
from mpmath import log10, mp, mpf, nstr

from common import made_by, save

mp.dps = 30
STEPS = (
    ("0.179", "0.45", "2.028", "-0.976"),
    ("0.45", "0.72", "4.572", "-0.102"),
    ("0.72", "1.05", "5.743", "-0.007"),
    ("1.05", "2.4", "4.329", "0.010"),
    ("2.4", "7", "3.967", "0.093"),
    ("7", "31", "2.865", "1.105"),
)
MASSES = ("0.179", "0.3", "0.45", "0.4501", "0.6", "0.72", "0.7201", "0.9", "1", "1.05", "1.0501", "1.8", "2.4", "2.4001", "5", "7", "7.0001", "20", "31")


def luminosity(mass):
    slope, intercept = next((a, b) for _, upper, a, b in STEPS if mpf(mass) <= mpf(upper))
    return 10 ** (mpf(slope) * log10(mpf(mass)) + mpf(intercept))


save(
    "mass_luminosity",
    {
        "title": "Luminosity of main-sequence stars by mass, both in solar units; an edge belongs to the step below it",
        "made": made_by(__file__, "the printed coefficients, 30 digits", "mpmath"),
        "rows": [{"mass": mass, "luminosity": nstr(luminosity(mass), 20)} for mass in MASSES],
    },
)
