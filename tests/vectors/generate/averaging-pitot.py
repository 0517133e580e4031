"""Writes ../pitot/averaging-equation.json: the flow of an averaging pitot from its equation, at 40 digits.

q_m = K e A sqrt(2 dp rho) with e = 1 - a dp/(kappa p1), and A the area of the pipe or what a bar of width w leaves of
it. The differential given stands among the figures that are expected too: the core finds it again from the flow.
Run: python3 averaging-pitot.py
"""
import json
import pathlib
import random

from mpmath import mp, mpf, pi, sqrt

mp.dps = 40
TARGET = pathlib.Path(__file__).resolve().parent.parent / "pitot" / "averaging-equation.json"
draw = random.Random(47)
ABOUT = {
    "D": ("pipe bore", "m"), "w": ("width of the bar; the area of the pipe counts where there is none", "m"),
    "K": ("flow coefficient", "1"), "dp": ("differential pressure", "Pa"), "rho": ("density", "kg/m3"),
    "mu": ("dynamic viscosity", "Pa.s"), "p1": ("upstream absolute pressure", "Pa"),
    "kappa": ("isentropic exponent; a liquid where there is none", "1"), "a": ("expansion number", "1"),
    "q_m": ("mass flow", "kg/s"), "Re": ("pipe Reynolds number", "1"), "epsilon": ("expansibility factor", "1"),
}


def digits(value, count=4):
    """The value with as many significant digits as a case shows."""
    return float(f"{value:.{count}g}")


def spread(low, high):
    return digits(low * (high / low) ** draw.random())


def case(gas, clear):
    bore = spread(0.05, 2.0)
    given = {"D": bore, "K": digits(draw.uniform(0.45, 0.95))}
    if clear:
        given["w"] = digits(draw.uniform(0.02, 0.15) * bore)
    if gas:
        pressure = spread(9e4, 5e6)
        given |= {"dp": digits(pressure * spread(2e-4, 0.1)), "rho": spread(0.5, 60.0), "mu": spread(9e-6, 4e-5),
                  "p1": pressure, "kappa": digits(draw.uniform(1.05, 1.67), 3), "a": digits(draw.uniform(0.0, 0.4), 3)}
    else:
        given |= {"dp": spread(50.0, 3e4), "rho": spread(650.0, 1300.0), "mu": spread(1e-4, 3e-2)}
    exact = {name: mpf(value) for name, value in given.items()}
    area = pi / 4 * exact["D"] ** 2 - exact.get("w", mpf(0)) * exact["D"]
    factor = 1 - exact["a"] * exact["dp"] / (exact["kappa"] * exact["p1"]) if gas else mpf(1)
    flow = exact["K"] * factor * area * sqrt(2 * exact["dp"] * exact["rho"])
    reynolds = 4 * flow / (pi * exact["mu"] * exact["D"])
    expect = {"q_m": float(flow), "Re": float(reynolds), "epsilon": float(factor), "dp": given["dp"]}
    return given, expect


cases = [case(gas, clear) for gas in (False, True) for clear in (False, True) for _ in range(8)]
head = {
    "source": "Equation of the averaging pitot, evaluated with 40 digits",
    "origin": "independent",
    "subject": "averaging-pitot",
    "about": {name: dict(zip(("meaning", "unit"), about)) for name, about in ABOUT.items()},
    "tolerance": {name: {"rel": 1e-13, "why": "the equation is exact; rounding of doubles alone"}
                  for name in ("q_m", "Re", "epsilon", "dp")},
}
lines = [json.dumps({"name": f"{n + 1}", "given": given, "expect": expect}) for n, (given, expect) in enumerate(cases)]
text = json.dumps(head, indent=2)[:-2] + ',\n  "cases": [\n    ' + ",\n    ".join(lines) + "\n  ]\n}\n"
TARGET.write_text(text)
