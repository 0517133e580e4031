#!/usr/bin/env python3
"""Writes ../other-gases/states.json: gases by the open library "CoolProp" for Python
(the reference equations of state). Run with a Python that has it: python3 other-gases.py. Fixed seed."""
import json
import pathlib
import random

import CoolProp
from CoolProp.CoolProp import PropsSI

random.seed(19931107)  # not that of the states on which the stated spread of other-gas.ts was found
FOLDER = pathlib.Path(__file__).parent / "../other-gases"
NAMES = {
    "ammonia": "Ammonia",
    "ethylene": "Ethylene",
    "propylene": "Propylene",
    "chlorine": "Chlorine",
    "sulfur-dioxide": "SulfurDioxide",
    "nitrous-oxide": "NitrousOxide",
    "neon": "Neon",
    "1-butene": "1-Butene",
    "methanol": "Methanol",
    "ethanol": "Ethanol",
    "dimethyl-ether": "DimethylEther",
    "benzene": "Benzene",
    "toluene": "Toluene",
    "hydrogen-chloride": "HydrogenChloride",
    "cyclohexane": "CycloHexane",
}


def cases(gas, fluid):
    """Eight states of one gas with a density up to 0.3 of the critical one, not within 5 % of condensing."""
    Tc, rhoc, M = PropsSI("Tcrit", fluid), PropsSI("rhocrit", fluid), PropsSI("M", fluid)
    count = 0
    while count < 8:
        T = round(random.uniform(max(0.75 * Tc, 230.0), min(1.6 * max(Tc, 230.0), PropsSI("Tmax", fluid), 900.0)), 1)
        p = float("%.4g" % (10 ** random.uniform(4.5, 7.0)))
        if T < Tc and p > 0.95 * PropsSI("P", "T", T, "Q", 1, fluid):
            continue
        rho = PropsSI("D", "T", T, "P", p, fluid)
        if rho > 0.3 * rhoc:
            continue
        w = PropsSI("A", "T", T, "P", p, fluid)
        count += 1
        place = "near" if rho <= 0.05 * rhoc else "dense"
        alcohol = " of an alcohol" if "anol" in gas else ""
        yield {
            "name": "%s at %g K, %g MPa" % (gas, T, p / 1e6),
            "given": {"gas": gas, "T": T, "p": p / 1e6},
            "expect": {
                "rho, %s%s" % (place, alcohol): float("%.6g" % rho),
                "kappa, %s%s" % (place, alcohol): float("%.6g" % (w * w * rho / p)),
                **viscosity(fluid, T, rho),
            },
        }


def viscosity(fluid, T, rho):
    """Where the library has a correlation of its own for the gas."""
    try:
        return {"mu": float("%.6g" % (PropsSI("V", "T", T, "D", rho, fluid) * 1e6))}
    except ValueError:
        return {}


def about():
    columns = {
        "gas": {"meaning": "gas", "unit": ""},
        "T": {"meaning": "temperature", "unit": "K"},
        "p": {"meaning": "absolute pressure", "unit": "MPa"},
    }
    for place in ("near", "dense"):
        words = "up to 0.05 of the critical density" if place == "near" else "up to 0.3 of the critical density"
        for alcohol in ("", " of an alcohol"):
            columns["rho, %s%s" % (place, alcohol)] = {"meaning": "density%s, %s" % (alcohol, words), "unit": "kg/m3"}
            columns["kappa, %s%s" % (place, alcohol)] = {"meaning": "isentropic exponent%s, %s" % (alcohol, words), "unit": ""}
    columns["mu"] = {"meaning": "dynamic viscosity", "unit": "uPa.s"}
    return columns


def main():
    why = "uncertainty shown beside the figure: 0.5 %% and 0.16 of the reduced density%s, at the end of its range"
    content = {
        "source": "CoolProp %s for Python, reference equations of state, states drawn from another seed than those on which the stated spread was found" % CoolProp.__version__,
        "origin": "independent",
        "subject": "other-gas",
        "about": about(),
        "tolerance": {
            "rho, near": {"rel": 0.013, "why": why % ""},
            "rho, dense": {"rel": 0.053, "why": why % ""},
            "rho, near of an alcohol": {"rel": 0.043, "why": why % ", 3 % more for alcohols"},
            "rho, dense of an alcohol": {"rel": 0.083, "why": why % ", 3 % more for alcohols"},
            "kappa, near": {"rel": 0.016, "why": "error of the cubic equation found for the isentropic exponent"},
            "kappa, dense": {"rel": 0.04, "why": "error of the cubic equation found for the isentropic exponent"},
            "kappa, near of an alcohol": {"rel": 0.016, "why": "the same for an alcohol"},
            "kappa, dense of an alcohol": {"rel": 0.2, "why": "the same for an alcohol"},
            "mu": {"rel": 0.15, "why": "uncertainty shown beside the figure"},
        },
    }
    FOLDER.mkdir(exist_ok=True)
    rows = [json.dumps(row) for gas, fluid in NAMES.items() for row in cases(gas, fluid)]
    text = json.dumps(content, indent=2)[:-2] + ',\n  "cases": [\n' + ",\n".join("    " + row for row in rows)
    (FOLDER / "states.json").write_text(text + "\n  ]\n}\n")


main()
