"""Writes ../units/pint.json: SI values of the units of the table, from the definitions that Pint carries.

Run with Pint 0.19 or later: python3 units.py. Columns of water at 20 degC, 60 degF and 68 degF are left out: Pint
rounds the density of water to six digits.
"""
import json
import pathlib
from fractions import Fraction

import pint

registry = pint.UnitRegistry(non_int_type=Fraction)

# Spelling of the unit here, spelling in Pint, SI unit.
PRESSURES = [
    ("Pa", "pascal"), ("hPa", "hectopascal"), ("kPa", "kilopascal"), ("MPa", "megapascal"), ("mbar", "millibar"),
    ("bar", "bar"), ("kgf/cm2", "kilogram_force / centimeter**2"), ("atm", "standard_atmosphere"),
    ("mmH2O", "centimeter_H2O / 10"), ("mmHg", "millimeter_Hg"), ("psi", "pound_force_per_square_inch"),
    ("inH2O", "inch * conventional_water * standard_gravity"), ("ftH2O", "foot_H2O"), ("inHg", "inch_Hg"),
]
VOLUME_FLOWS = [
    ("m3/s", "meter**3 / second"), ("m3/min", "meter**3 / minute"), ("m3/h", "meter**3 / hour"),
    ("m3/d", "meter**3 / day"), ("L/s", "liter / second"), ("L/min", "liter / minute"), ("L/h", "liter / hour"),
    ("ft3/s", "foot**3 / second"), ("ft3/min", "foot**3 / minute"), ("ft3/h", "foot**3 / hour"),
    ("ft3/d", "foot**3 / day"), ("gal/min", "US_liquid_gallon / minute"), ("gal/h", "US_liquid_gallon / hour"),
    ("bbl/d", "oil_barrel / day"),
]
MEASURES = {
    "length": ("meter", [("mm", "millimeter"), ("cm", "centimeter"), ("m", "meter"), ("um", "micrometer"),
                         ("in", "inch"), ("ft", "foot"), ("uin", "microinch")]),
    "pressure difference": ("pascal", PRESSURES),
    "absolute pressure": ("pascal", [(f"{ours}(a)", theirs) for ours, theirs in PRESSURES]),
    "gauge pressure": ("pascal", [(f"{ours}(g)", theirs) for ours, theirs in PRESSURES]),
    "mass flow": ("kilogram / second", [
        ("kg/s", "kilogram / second"), ("kg/min", "kilogram / minute"), ("kg/h", "kilogram / hour"),
        ("g/s", "gram / second"), ("t/h", "metric_ton / hour"), ("t/d", "metric_ton / day"),
        ("lb/s", "pound / second"), ("lb/min", "pound / minute"), ("lb/h", "pound / hour"),
        ("klb/h", "1000 * pound / hour")]),
    "volume flow": ("meter**3 / second", VOLUME_FLOWS),
    "base volume flow": ("meter**3 / second", [(f"base {ours}", theirs) for ours, theirs in VOLUME_FLOWS]),
    "density": ("kilogram / meter**3", [
        ("kg/m3", "kilogram / meter**3"), ("g/cm3", "gram / centimeter**3"), ("kg/L", "kilogram / liter"),
        ("lb/ft3", "pound / foot**3"), ("lb/gal", "pound / US_liquid_gallon")]),
    "dynamic viscosity": ("pascal * second", [
        ("mPa.s", "millipascal * second"), ("uPa.s", "micropascal * second"), ("Pa.s", "pascal * second"),
        ("cP", "centipoise"), ("lb/(ft.s)", "pound / foot / second")]),
    "kinematic viscosity": ("meter**2 / second", [
        ("mm2/s", "millimeter**2 / second"), ("m2/s", "meter**2 / second"), ("cSt", "centistokes"),
        ("ft2/s", "foot**2 / second")]),
    "velocity": ("meter / second", [
        ("m/s", "meter / second"), ("m/min", "meter / minute"), ("ft/s", "foot / second"), ("ft/min", "foot / minute")]),
    "acceleration": ("meter / second**2", [("m/s2", "meter / second**2"), ("ft/s2", "foot / second**2")]),
    "power": ("watt", [("W", "watt"), ("kW", "kilowatt"), ("MW", "megawatt"), ("hp", "horsepower")]),
    "current": ("ampere", [("mA", "milliampere"), ("A", "ampere")]),
    "voltage": ("volt", [("V", "volt"), ("mV", "millivolt")]),
    "molar mass": ("kilogram / mole", [
        ("g/mol", "gram / mole"), ("kg/kmol", "kilogram / kilomole"), ("kg/mol", "kilogram / mole")]),
    "temperature difference": ("kelvin", [("K", "kelvin"), ("degF", "delta_degF"), ("degR", "degR")]),
}
TEMPERATURES = [("0", "degC"), ("100", "degC"), ("85", "degC"), ("32", "degF"), ("60", "degF"), ("-459.67", "degF"),
                ("212", "degF"), ("491.67", "degR"), ("300", "kelvin")]

cases = []
for measure, (si, units) in MEASURES.items():
    for ours, theirs in units:
        factor = registry.parse_expression(theirs).to(registry.parse_units(si)).magnitude
        given = {"number": "1", "unit": ours, "measure": measure}
        cases.append({"name": f"1 {ours}, {measure}", "given": given, "expect": {"si": float(factor)}})
for number, theirs in TEMPERATURES:
    ours = "K" if theirs == "kelvin" else theirs
    kelvin = registry.Quantity(Fraction(number), theirs).to("kelvin").magnitude
    given = {"number": number, "unit": ours, "measure": "temperature"}
    cases.append({"name": f"{number} {ours}", "given": given, "expect": {"si": float(kelvin)}})

lines = ",\n".join(f"    {json.dumps(case)}" for case in cases)
about = {
    "number": {"meaning": "the number written", "unit": ""},
    "unit": {"meaning": "spelling of the unit in a file", "unit": ""},
    "measure": {"meaning": "what is measured", "unit": ""},
    "si": {"meaning": "value in the coherent SI unit", "unit": "SI"},
}
tolerance = {"si": {"rel": 0, "why": "exact fractions rounded once to a double: the same double"}}
head = {"source": f"Pint {pint.__version__}, definitions of its default registry", "origin": "independent",
        "subject": "units", "about": about, "tolerance": tolerance}
text = json.dumps(head, indent=2, ensure_ascii=False)[:-2] + ',\n  "cases": [\n' + lines + "\n  ]\n}\n"
pathlib.Path(__file__).parent.parent.joinpath("units", "pint.json").write_text(text)
