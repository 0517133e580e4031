#!/usr/bin/env python3
"""Writes ../iapws/states.json: states of water and steam by the open library "iapws" for Python (its own code for the
same releases). Run with a Python that has it: python3 iapws-states.py. The states are drawn from a fixed seed."""
import json
import pathlib
import random
import warnings

import iapws
from iapws import IAPWS97
from iapws.iapws97 import _PSat_T
from iapws._iapws import _Viscosity

warnings.simplefilter("ignore")
random.seed(20070824)


def draw():
    """A temperature and a pressure inside the formulation, even in T and in the logarithm of p."""
    temperature = random.uniform(273.16, 2273.0)
    if random.random() < 0.75:
        temperature = random.uniform(273.16, 1073.0)
    top = 50 if temperature > 1073.15 else 100
    return round(temperature, 2), float("%.4g" % min(top, 10 ** random.uniform(-3, 2)))


def case(temperature, pressure):
    state = IAPWS97(P=pressure, T=temperature)
    expect = {"rho": state.rho, "w": state.w, "mu": _Viscosity(state.rho, temperature) * 1e6}
    if temperature < 647.096:
        expect["psat"] = _PSat_T(temperature)
    return {
        "name": "%g K, %g MPa" % (temperature, pressure),
        "given": {"T": temperature, "p": pressure},
        "expect": {key: float("%.12g" % value) for key, value in expect.items()},
    }


def in_region_3(temperature, pressure):
    border = 348.05185628969 - 1.1671859879975 * temperature + 0.0010192970039326 * temperature**2
    return 623.15 < temperature <= 863.15 and pressure > border


states = []
while len(states) < 160:
    point = draw()
    if not in_region_3(*point):
        states.append(case(*point))
while len(states) < 200:
    point = round(random.uniform(623.2, 863.0), 2), round(random.uniform(16.6, 100), 2)
    if in_region_3(*point):
        states.append(case(*point))

same = "the same releases in another program: rounding of the 12 digits written here and of the arithmetic of both"
document = {
    "source": "Python library iapws %s, class IAPWS97, and its functions of IAPWS R12-08 and region 4" % iapws.__version__,
    "origin": "independent",
    "subject": "water-state",
    "about": {
        "T": {"meaning": "temperature", "unit": "K"},
        "p": {"meaning": "pressure", "unit": "MPa"},
        "rho": {"meaning": "density", "unit": "kg/m3"},
        "w": {"meaning": "speed of sound", "unit": "m/s"},
        "mu": {"meaning": "dynamic viscosity, mu2 = 1", "unit": "uPa.s"},
        "psat": {"meaning": "saturation pressure at T", "unit": "MPa"},
    },
    "tolerance": {key: {"rel": 1e-11, "why": same} for key in ("rho", "w", "mu", "psat")},
}
head = json.dumps(document, indent=2)
rows = ",\n".join("    " + json.dumps(row) for row in states)
path = pathlib.Path(__file__).parent.parent / "iapws" / "states.json"
path.write_text(head[:-2] + ',\n  "cases": [\n' + rows + "\n  ]\n}\n")
