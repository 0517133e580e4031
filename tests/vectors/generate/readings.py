"""Writes what the closed formulas of ../reading come to, each by itself in 50 digits, into the vectors that ask for it.

Run: python3 readings.py. A file keeps its given figures; its expected ones are rounded to ten digits.
"""
import json
import pathlib
from decimal import Decimal, getcontext

getcontext().prec = 50
FOLDER = pathlib.Path(__file__).parent.parent / "reading"


def square_root(given):
    return {"to": 4 + 4 * (given["from"] - 4).sqrt()}


def linear(given):
    return {"to": 4 + (given["from"] - 4) ** 2 / 16}


def span_error(given):
    """A share of the span at a share of the flow: the differential falls with the square of the flow."""
    relative = given["percent"] / 100 / given["fraction"] ** 2
    return {"dpPercent": 100 * relative, "flowPercent": 50 * relative, "exactPercent": 100 * ((1 + relative).sqrt() - 1)}


def wrong_bore(given):
    def section(d):
        return d**2 / (1 - (d / given["D"]) ** 4).sqrt()

    return {"error": section(given["d_entered"]) / section(given["d_true"]) - 1}


def wrong_density(given):
    mass = (given["rho_entered"] / given["rho_true"]).sqrt()
    return {"mass": mass - 1, "volume": mass * given["rho_true"] / given["rho_entered"] - 1}


def wrong_leg(given):
    return {"error": (1 + given["extra"] / given["dp"]).sqrt() - 1}


def compensation(given):
    """Densities in proportion to p/T."""
    mass = ((given["p"] / given["T"]) / (given["p_d"] / given["T_d"])).sqrt()
    return {"mass": mass, "volume": 1 / mass}


FORMULAS = {
    "root-of-linear-8": square_root,
    "root-of-linear-12": square_root,
    "linear-of-root-12": linear,
    "span-error": span_error,
    "wrong-bore": wrong_bore,
    "wrong-density": wrong_density,
    "missing-water-in-leg": wrong_leg,
    "compensation": compensation,
}

for name, formula in FORMULAS.items():
    path = FOLDER / f"{name}.json"
    file = json.loads(path.read_text())
    for case in file["cases"]:
        given = {key: value if isinstance(value, str) else Decimal(str(value)) for key, value in case["given"].items()}
        case["expect"] = {key: float(f"{value:.9e}") for key, value in formula(given).items()}
    for key in file["tolerance"]:
        file["tolerance"][key] = {"rel": 1e-9, "why": "closed formula, written with ten digits"}
    path.write_text(json.dumps(file, indent=2, ensure_ascii=False) + "\n")
