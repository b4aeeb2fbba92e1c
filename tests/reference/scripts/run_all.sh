#!/bin/sh
# Makes every table again. Needs a Python with NumPy, SciPy, mpmath and Astropy (Debian: python3-scipy python3-mpmath
# python3-astropy). None of the scripts reads the library.
set -e
cd "$(dirname "$0")"
python=${PYTHON:-/usr/bin/python3}
for script in constants orbit_means planck_flux grey_columns oblate albedo_forms published_budgets exoplanets \
  layer_ledgers ramp_tables state_tables cover_tables; do
  "$python" "$script.py"
done
cd ../../..
node_modules/.bin/biome format --write --colors=off tests/reference/computed
