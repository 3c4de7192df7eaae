"""Times in python3-fluids what test/bench/physics.bench.ts times here; prints µs per call.

    /usr/bin/python3 test/sources/fluids-speed.py
"""
import timeit
import fluids
from fluids.drag import v_terminal
from fluids.packed_bed import Ergun, KTA

CALLS = 1000
scale = [1 + i * 1e-4 for i in range(CALLS)]


def each(run):
    def loop():
        total = 0.0
        for x in scale:
            total += run(x)
        return total

    best = min(timeit.repeat(loop, number=1, repeat=7))
    return best / CALLS * 1e6


print("python3-fluids", fluids.__version__)
print("Ergun %.3f" % each(lambda x: Ergun(dp=0.02, voidage=0.4, vs=0.2 * x, rho=1000.0, mu=1e-3)))
print("KTA %.3f" % each(lambda x: KTA(dp=0.02, voidage=0.4, vs=0.2 * x, rho=1000.0, mu=1e-3)))
for name in ("Haider_Levenspiel", "Clift", None):
    for d in (1e-4, 1e-3, 2e-2):
        t = each(lambda x: v_terminal(D=d * x, rhop=7850.0, rho=1000.0, mu=1e-3, Method=name))
        print("v_terminal, %s, d %g m: %.3f" % (name or "default", d, t))
