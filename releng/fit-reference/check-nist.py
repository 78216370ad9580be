"""Solves the NIST sets in the test resources with SciPy from both starting points and prints the digits that agree."""
import csv

import numpy as np
from scipy.optimize import least_squares

from curves import RESOURCES

FUNCTIONS = {name: getattr(np, name) for name in ("exp", "cos", "sin", "log", "pi")} | {"atan": np.arctan}


def rows(name):
    with open(RESOURCES / name, encoding="utf-8") as file:
        return list(csv.DictReader(line for line in file if not line.startswith("#")))


def digits(found, certified):
    return -np.log10(np.max(np.maximum(np.abs(found / certified - 1), 1e-16)))


def covariance(jacobian):
    inverse = np.linalg.inv(np.linalg.qr(jacobian / (scale := np.linalg.norm(jacobian, axis=0)), mode="r"))
    return inverse @ inverse.T / np.outer(scale, scale)


def main():
    certified = rows("nist-certified.csv")
    for s in rows("nist-sets.csv"):
        own = [r for r in certified if r["set"] == s["set"]]
        value, deviation = (np.array([float(r[c]) for r in own]) for c in ("certified", "standard_deviation"))
        points = rows(f"nist/{s['set']}.csv")
        x = {c: np.array([float(r[c]) for r in points]) for c in points[0] if c != "y"}
        y = np.array([float(r["y"]) for r in points])
        left, _, formula = s["model"].rpartition("=")
        y = np.log(y) if left else y
        code = compile(formula.replace("^", "**"), s["set"], "eval")

        def model(b):
            return eval(code, FUNCTIONS | x | {f"b{i + 1}": v for i, v in enumerate(b)})

        def residual(b):
            with np.errstate(all="ignore"):
                return np.nan_to_num(y - model(b), nan=1e10, posinf=1e10, neginf=-1e10)

        def jacobian(b):  # derivatives by a complex step, exact to rounding
            with np.errstate(all="ignore"):
                step = 1e-30 * np.maximum(np.abs(b), 1e-300)
                steps = np.diag(step) * 1j
                return np.nan_to_num(np.array([-model(b + d).imag / h for d, h in zip(steps, step)]).T)

        words = []
        for column in ("start1", "start2"):
            begin = np.array([float(r[column]) for r in own])
            end = least_squares(residual, begin, jac=jacobian, method="lm", x_scale="jac", ftol=1e-15, xtol=1e-15,
                                gtol=1e-15, max_nfev=100_000)
            scale = 2 * end.cost / (len(y) - len(value))
            errors = np.sqrt(scale * np.diag(covariance(jacobian(end.x))))
            residual_digits = digits(np.array([2 * end.cost]), float(s["residual_sum_of_squares"]))
            words.append(f"{column} parameters {digits(end.x, value):4.1f} deviations {digits(errors, deviation):4.1f} "
                         f"residual {residual_digits:4.1f}")
        print(f"{s['set']:9}", "; ".join(words))


main()
