#!/usr/bin/env python3
"""Writes ../gas-viscosity/pure-states.json: viscosity of pure gases by the open library "CoolProp" for Python (its own
code for the same papers). Run with a Python that has it: python3 gas-viscosity.py. The states are drawn from a fixed seed."""
import json
import pathlib
import random

import CoolProp
from CoolProp.CoolProp import PropsSI

random.seed(19951102)
NAMES = {
    "nitrogen": "Nitrogen",
    "oxygen": "Oxygen",
    "argon": "Argon",
    "air": "Air",
    "carbon-dioxide": "CarbonDioxide",
    "hydrogen": "Hydrogen",
    "ethane": "Ethane",
    "propane": "n-Propane",
}


def cases(gas, fluid):
    """Ten states of one gas above its critical temperature, even in T and in the logarithm of p."""
    low = max(PropsSI("Tcrit", fluid) * 1.02, 230.0)
    for _ in range(10):
        T = round(random.uniform(low, 600.0), 1)
        p = 10 ** random.uniform(4.0, 7.5)
        rho = float("%.6g" % (PropsSI("Dmolar", "T", T, "P", p, fluid) / 1e3))
        eta = PropsSI("V", "T", T, "Dmolar", rho * 1e3, fluid) * 1e6
        yield {
            "name": "%s at %g K, %g mol/dm3" % (gas, T, rho),
            "given": {"gas": gas, "T": T, "rho": rho},
            "expect": {"eta": float("%.9g" % eta)},
        }


def main():
    content = {
        "source": "CoolProp %s for Python, states drawn from a fixed seed" % CoolProp.__version__,
        "origin": "independent",
        "subject": "gas-viscosity-reference",
        "about": {
            "gas": {"meaning": "component, or dry air", "unit": ""},
            "T": {"meaning": "temperature", "unit": "K"},
            "rho": {"meaning": "molar density", "unit": "mol/dm3"},
            "eta": {"meaning": "dynamic viscosity", "unit": "uPa.s"},
        },
        "tolerance": {
            "eta": {"rel": 2e-6, "why": "same correlations; the library has other digits of molar mass and gas constant"}
        },
    }
    text = json.dumps(content, indent=2)[:-2] + ',\n  "cases": [\n'
    rows = [json.dumps(row) for gas, fluid in NAMES.items() for row in cases(gas, fluid)]
    path = pathlib.Path(__file__).parent / "../gas-viscosity/pure-states.json"
    path.write_text(text + ",\n".join("    " + row for row in rows) + "\n  ]\n}\n")


main()
