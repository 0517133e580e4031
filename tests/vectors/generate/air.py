#!/usr/bin/env python3
"""Writes ../air/moist-states.json and ../air/oiml-formula.json.

The states are by the open library "CoolProp" for Python (its own code for the moist air of ASHRAE RP-1485), drawn from a
fixed seed; the others evaluate the approximate formula of OIML R 111-1:2004, E.3-1. Run with a Python that has the
library: python3 air.py."""
import json
import math
import pathlib
import random

import CoolProp
from CoolProp.CoolProp import HAPropsSI

random.seed(19510206)
FOLDER = pathlib.Path(__file__).parent / "../air"


def write(name, content, cases):
    rows = ",\n".join("    " + json.dumps(row) for row in cases)
    (FOLDER / name).write_text(json.dumps(content, indent=2)[:-2] + ',\n  "cases": [\n' + rows + "\n  ]\n}\n")


def state(given, words):
    kind = {"relativeHumidity": "R", "dewPoint": "D"}[words]
    arguments = ("T", given["T"], "P", given["p"] * 1e3, kind, given[words])
    fraction = HAPropsSI("psi_w", *arguments)
    per_dry = HAPropsSI("W", *arguments)
    rho = (1 + per_dry) / HAPropsSI("Vda", *arguments)
    return {"rho": float("%.7g" % rho), "x": float("%.6g" % fraction)}


def states():
    for index in range(40):
        T = round(random.uniform(250.0, 365.0), 2)
        p = float("%.4g" % (10 ** random.uniform(math.log10(60.0), math.log10(1000.0))))
        if index % 2 == 0:
            given = {"T": T, "p": p, "relativeHumidity": round(random.uniform(0.05, 0.95), 3)}
            T = max(T, 274.0)
            given["T"] = T
            words, name = "relativeHumidity", "%g %%" % (100 * given["relativeHumidity"])
        else:
            given = {"T": T, "p": p, "dewPoint": round(random.uniform(235.0, T), 2)}
            words, name = "dewPoint", "dew point %g K" % given["dewPoint"]
        try:
            expect = state(given, words)
        except ValueError:
            continue
        if expect["x"] < 0.9:
            yield {"name": "%g K, %g kPa, %s" % (T, p, name), "given": given, "expect": expect}


ABOUT = {
    "T": {"meaning": "temperature", "unit": "K"},
    "p": {"meaning": "absolute pressure", "unit": "kPa"},
    "relativeHumidity": {"meaning": "relative humidity", "unit": ""},
    "dewPoint": {"meaning": "dew point; below 273.16 K the frost point", "unit": "K"},
    "rho": {"meaning": "density of the moist air", "unit": "kg/m3"},
    "x": {"meaning": "mole fraction of water vapour", "unit": ""},
}

write(
    "moist-states.json",
    {
        "source": "CoolProp %s for Python, moist air of ASHRAE RP-1485, states drawn from a fixed seed" % CoolProp.__version__,
        "origin": "independent",
        "subject": "air",
        "about": ABOUT,
        "tolerance": {
            "rho": {"rel": 5e-4, "why": "another equation of state of moist air"},
            "x": {"rel": 2.5e-3, "why": "another enhancement factor"},
        },
    },
    states(),
)

ROWS = [(15, 95000, 0.3), (20, 101325, 0.5), (20, 100000, 0.0), (25, 103000, 0.6), (27, 98000, 0.2)]


def formula():
    for t, p, h in ROWS:
        rho = (0.34848 * p / 100 - 0.009 * 100 * h * math.exp(0.061 * t)) / (273.15 + t)
        yield {
            "name": "%g degC, %g Pa, %g %%" % (t, p, 100 * h),
            "given": {"T": t + 273.15, "p": p / 1e3, "relativeHumidity": h},
            "expect": {"rho": float("%.7g" % rho)},
        }


write(
    "oiml-formula.json",
    {
        "source": "OIML R 111-1:2004, Formula (E.3-1), evaluated",
        "origin": "published",
        "seen": "memory",
        "subject": "air",
        "about": ABOUT,
        "tolerance": {"rho": {"rel": 2e-4, "why": "relative uncertainty that OIML states for the formula"}},
    },
    formula(),
)
