"""Writes ../pitot/rules-circular.json, rules-rectangular.json and bias.json: points of each rule by another way.

The means over rings and strips are integrated numerically and the equal-weight nodes are found as roots of the whole
polynomial in mpmath at 40 digits; the core has closed forms and halves in the square. Run: python3 traverse.py
"""
import json
import pathlib

from mpmath import exp, log, mp, mpf, polyroots, quad, sqrt

mp.dps = 40
FOLDER = pathlib.Path(__file__).parent.parent / "pitot"
WHY = "the rules are exact; rounding of a double alone"


def mean(f, inner, outer):
    """Mean over the area between two shares of it, by quadrature over the area."""
    return quad(lambda a: f(1 - sqrt(a)), [inner, (inner + outer) / 2, outer]) / (outer - inner)


def nodes(n):
    """Equal-weight nodes on (0, 1), from the moments by Newton's identities."""
    p = [mpf(n)] + [mpf(n) / (k + 1) if k % 2 == 0 else mpf(0) for k in range(1, n + 1)]
    e = [mpf(1)]
    for k in range(1, n + 1):
        e.append(sum((-1) ** (i - 1) * e[k - i] * p[i] for i in range(1, k + 1)) / k)
    roots = polyroots([(-1) ** k * e[k] for k in range(n + 1)], maxsteps=500, extraprec=400)
    assert all(abs(mp.im(root)) < mpf(10) ** -20 for root in roots)
    return sorted((1 + mp.re(root)) / 2 for root in roots)


def log_linear(n):
    y = []
    if n % 2:
        y.append(exp(mean(log, 1 - mpf(1) / n, mpf(1))))
    for ring in range(n // 2):
        inner, outer = mpf(2 * ring) / n, mpf(2 * ring + 2) / n
        m, g = mean(lambda d: d, inner, outer), exp(mean(log, inner, outer))
        y += [m - sqrt(m * m - g * g), m + sqrt(m * m - g * g)]
    return sorted(y)


def log_tchebycheff(n):
    inner = [1 - sqrt(a * (n - 1) / n) for a in nodes(n - 1)]
    return sorted([exp(mean(log, 1 - mpf(1) / n, mpf(1)))] + inner)


def equal_area(n):
    return sorted(1 - sqrt(mpf(2 * i + 1) / (2 * n)) for i in range(n))


def rectangular(n):
    wall = exp(quad(log, [0, mpf(1) / n]) * n)  # mean of ln y over the strip
    return [wall] + [(1 + x * (n - 2)) / n for x in nodes(n - 2)] + [1 - wall]


RULES = {"log-linear": (log_linear, range(2, 11)), "log-tchebycheff": (log_tchebycheff, [3, 4, 5, 6, 7, 8, 10]),
         "equal-area": (equal_area, range(1, 13))}


def bias(y, n):
    truth = 2 * mpf(n) ** 2 / ((n + 1) * (2 * n + 1))
    return sum(d ** (mpf(1) / n) for d in y) / len(y) / truth - 1


def write(name, subject, about, cases):
    tolerance = {field: {"abs": 2e-13 if field.startswith("bias") else 2e-14, "why": WHY}
                 for field in sorted({f for c in cases for f in c["expect"]})}
    head = {"source": "The defining rules of ISO 3966 and Method 1, by quadrature and polynomial roots in mpmath",
            "origin": "independent", "seen": "derived", "subject": subject, "about": about, "tolerance": tolerance}
    text = json.dumps(head, indent=2)[:-2]
    rows = ",\n".join("    " + json.dumps(case) for case in cases)
    (FOLDER / name).write_text(f'{text},\n  "cases": [\n{rows}\n  ]\n}}\n')


def main():
    FOLDER.mkdir(exist_ok=True)
    rule = {"rule": {"meaning": "rule", "unit": "code"}}
    circular, biases = [], []
    for key, (found, counts) in RULES.items():
        for n in counts:
            y = found(n)
            circular.append({"name": f"{key}, {n} on a radius", "given": {"rule": key, "perRadius": n},
                             "expect": {f"y{i + 1}": float(d / 2) for i, d in enumerate(y)}})
            biases.append({"name": f"{key}, {n} on a radius", "given": {"rule": key, "perRadius": n},
                           "expect": {"bias7": float(bias(y, 7)), "bias10": float(bias(y, 10))}})
    place = {"meaning": "distance from the wall over the diameter, point by point", "unit": "1"}
    per = {"perRadius": {"meaning": "points on a radius", "unit": "1"}}
    write("rules-circular.json", "traverse-circular", {**rule, **per, **{f"y{i}": place for i in range(1, 13)}}, circular)
    meaning = {"bias7": {"meaning": "mean on a 1/7-power profile over the true one, less 1", "unit": "1"},
               "bias10": {"meaning": "the same on a 1/10-power profile", "unit": "1"}}
    write("bias.json", "traverse-bias", {**rule, **per, **meaning}, biases)
    sides = [{"name": f"{n} on a line", "given": {"perLine": n},
              "expect": {f"x{i + 1}": float(x) for i, x in enumerate(rectangular(n))}} for n in (3, 4, 5, 6, 7, 8, 9, 11)]
    side = {"meaning": "distance from the wall over the side, point by point", "unit": "1"}
    write("rules-rectangular.json", "traverse-rectangular",
          {"perLine": {"meaning": "points on a line", "unit": "1"}, **{f"x{i}": side for i in range(1, 12)}}, sides)


main()
