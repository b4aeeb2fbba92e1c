#!/bin/sh
# Makes every table again. Needs a Python with NumPy, SciPy, mpmath and Astropy (Debian: python3-scipy python3-mpmath
# python3-astropy). None of the scripts reads the library.
set -e
cd "$(dirname "$0")"
python=${PYTHON:-/usr/bin/python3}
for script in constants orbit_means orbit_times planck_flux planck_bands mass_luminosity grey_columns oblate \
  albedo_forms clouds_ceilings published_budgets exoplanets layer_ledgers layered_columns ramp_tables \
  state_tables cover_tables phase_lines brightening_tables forcing_fits habitable_zone; do
  "$python" "$script.py"
done
cd ../../..
node_modules/.bin/biome format --write --colors=off tests/reference/computed
