"""Writes fluids-values.json: values of python3-fluids for the methods that both sides have.

Run with the Python that has the package (Debian: python3-fluids):
    /usr/bin/python3 test/sources/fluids-values.py
"""
import json
import pathlib
import fluids
from fluids import drag, friction, packed_bed


def spread(low, high, per_decade):
    """Powers of ten from low to high, ends included, as exactly representable as repr makes them."""
    n = (high - low) * per_decade
    return [float(f"{10 ** (low + i / per_decade):.6g}") for i in range(n + 1)]


def drag_rows():
    laws = {
        "stokes-1851": (drag.Stokes, 1e9),
        "clift-gauvin-1970": (drag.Clift_Gauvin, 1e9),
        "haider-levenspiel-sphere-1989": (drag.Haider_Levenspiel, 1e9),
        "morrison-2013": (drag.Morrison, 1e9),
        # above 4e5 the package has 0.19 w - 0.49 where the table has 0.1 w - 0.49
        "clift-grace-weber-1978": (drag.Clift, 4e5),
    }
    for method, (law, below) in laws.items():
        for Re in spread(-3, 6, 6):
            if Re < below:
                yield {"method": method, "given": {"Re": Re}, "value": law(Re)}


def fall_rows():
    names = {
        "haider-levenspiel-sphere-1989": "Haider_Levenspiel",
        "clift-gauvin-1970": "Clift_Gauvin",
        "clift-grace-weber-1978": "Clift",
    }
    cases = [
        (d, rhoS, rho, mu)
        for d in (2e-4, 1e-3, 5e-3, 0.0127, 0.0254)
        for rhoS, rho, mu in (
            (2650.0, 1000.0, 1e-3),
            (7850.0, 1000.0, 1e-3),
            (7850.0, 850.0, 0.02),
            (11340.0, 1900.0, 0.2),
        )
    ]
    for law, name in names.items():
        for d, rhoS, rho, mu in cases:
            v = drag.v_terminal(D=d, rhop=rhoS, rho=rho, mu=mu, Method=name)
            # below Re 0.01 the package gives Stokes' velocity whatever the law; above 2e5 the laws end
            if not isinstance(v, float) or not 0.02 < rho * v * d / mu < 2e5:
                continue
            yield {
                "method": "terminal-velocity-sphere",
                "given": {"d": d, "rho": rho, "rhoS": rhoS, "mu": mu, "law": law},
                "value": v,
            }


def bed_rows():
    laws = {
        "ergun-1952": packed_bed.Ergun,
        "carman-1937": packed_bed.Carman,
        "kta-1981": packed_bed.KTA,
        "erdim-2015": packed_bed.Erdim_Akgiray_Demir,
    }
    for method, law in laws.items():
        for d in (5e-4, 3e-3, 0.0254):
            for eps in (0.36, 0.4, 0.47):
                for u, rho, mu in ((1e-4, 1000.0, 1e-3), (0.1, 850.0, 0.01), (4.0, 120.0, 2e-5)):
                    yield {
                        "method": method,
                        "given": {"u": u, "d": d, "eps": eps, "rho": rho, "mu": mu, "D": 0.15},
                        "value": law(dp=d, voidage=eps, vs=u, rho=rho, mu=mu, L=1.0),
                    }


def voidage_rows():
    for d in (0.002, 0.01, 0.02, 0.04, 0.06):
        yield {
            "method": "benyahia-oneill-2005",
            "given": {"d": d, "D": 0.1},
            "value": packed_bed.voidage_Benyahia_Oneil_spherical(Dp=d, Dt=0.1),
        }


def friction_rows():
    for eD in (0.0, 1e-6, 1e-4, 2e-3, 0.05):
        for Re in spread(3, 8, 2):
            given = {"Re": Re, "eD": eD}
            yield {"method": "churchill-1977", "given": given, "value": friction.Churchill_1977(Re, eD)}
            if Re >= 4000:
                yield {"method": "haaland-1983", "given": given, "value": friction.Haaland(Re, eD)}
                yield {
                    "method": "colebrook-white-1939",
                    "given": given,
                    # a given tolerance makes the package solve by iteration, not by the product logarithm
                    "value": friction.Colebrook(Re, eD, tol=1e-14),
                }
    for Re in (1.0, 100.0, 2000.0):
        yield {
            "method": "laminar-friction",
            "given": {"Re": Re, "eD": 0.0},
            "value": friction.friction_factor(Re=Re, eD=0.0),
        }


rows = [*drag_rows(), *fall_rows(), *bed_rows(), *voidage_rows(), *friction_rows()]
out = pathlib.Path(__file__).with_suffix(".json")
with out.open("w") as f:
    head = {"package": "python3-fluids", "version": fluids.__version__}
    f.write('{\n  "package": "%(package)s",\n  "version": "%(version)s",\n  "rows": [\n' % head)
    f.write(",\n".join("    " + json.dumps(r) for r in rows))
    f.write("\n  ]\n}\n")
print(len(rows), "rows")
