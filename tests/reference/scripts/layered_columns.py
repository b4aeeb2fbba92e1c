# A grey column cut into equal layers of one temperature each, by elimination of the balances of all layers: no closed form.
#
# A layer of depth tau/N lets exp(-D tau/N) of the longwave through; nothing but the ground is heated from outside.
from mpmath import exp, lu_solve, matrix, mp, mpf, nstr

from common import made_by, save

mp.dps = 40


def blanket(depth, closure, n):
    """sigma T^4 of the ground over what leaves at the top."""
    passing = exp(-mpf(closure) * mpf(depth) / n)
    e = [1 - passing] * n + [mpf(1)]
    # what body j emits to one side and body k absorbs, per sigma T^4 of j; the ground (n) emits upwards only
    def exchange(j, k):
        return e[j] * e[k] * passing ** (abs(j - k) - 1)

    balances = matrix(n + 1, n + 1)
    for k in range(n + 1):
        for j in range(n + 1):
            balances[k, j] = -exchange(j, k) if j != k else (2 if k < n else 1) * e[k]
    heating = matrix([mpf(0)] * n + [mpf(1)])
    return lu_solve(balances, heating)[n]


rows = []
for depth, closure in (("0.5", "1.5"), ("2", "1.5"), ("4", "2"), ("20", "1.66")):
    for n in (1, 2, 5, 20):
        rows.append({"depth": depth, "closure": closure, "layers": n, "blanket": nstr(blanket(depth, closure, n), 24)})
save(
    "layered_columns",
    {
        "title": "Fourth power of ground temperature over effective temperature, under N equal grey layers",
        "made": made_by(__file__, "linear balances of all layers, solved with 40 digits", "mpmath"),
        "rows": rows,
    },
)
