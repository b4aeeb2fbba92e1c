# A grey column in radiative equilibrium, integrated downwards through its two streams: no closed form used.
from scipy.constants import Stefan_Boltzmann as sigma
from scipy.integrate import solve_ivp

from common import made_by, save


def temperatures(olr, depth, closure):
    """Streams along optical depth t: dU/dt = D(U - B), dW/dt = D(B - W), and B = (U + W)/2 where no heat piles up."""

    def change(_, streams):
        up, down = streams
        source = (up + down) / 2
        return [closure * (up - source), closure * (source - down)]

    run = solve_ivp(change, [0, depth], [olr, 0], method="DOP853", rtol=1e-12, atol=1e-9)
    skin, ground = (run.y[0, 0] + run.y[1, 0]) / 2, run.y[0, -1]
    return {"ground": (ground / sigma) ** 0.25, "skin": (skin / sigma) ** 0.25}


rows = []
for depth, closure in ((0, 1.5), (0.5, 1.5), (1, 1.5), (2, 1.5), (4, 1.5), (1, 2), (3, 2), (10, 1.66), (100, 1.5)):
    rows.append({"olr": 238.175, "depth": depth, "closure": closure, **temperatures(238.175, depth, closure)})
save(
    "grey_columns",
    {
        "title": "Ground temperature under a grey column that emits a given flux to space, and skin temperature at its top, K",
        "made": made_by(__file__, "two streams integrated downwards with an explicit Runge-Kutta method", "scipy"),
        "rows": rows,
    },
)
