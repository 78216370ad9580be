"""Measured flow curves and the fluid models, for the reference scripts beside this file. Independent of the product's code.

Parameters stand in the order in which the case table lists them. Sisko: stress = mi g + K g^n.
"""
import csv
import pathlib

import numpy as np

RESOURCES = (pathlib.Path(__file__).resolve().parents[2]
             / "bundles/stirwright.rheology.tests/resources/stirwright/rheology")


def five():
    """The five curves that lie in the repository: {number: (rates 1/s, stresses Pa)}."""
    with open(RESOURCES / "open-rheograms.csv", encoding="utf-8") as file:
        rows = list(csv.reader(line for line in file if not line.startswith("#")))
    columns = [np.array([float(row[i]) for row in rows[1:]]) for i in range(len(rows[0]))]
    return {number: (columns[0], columns[i]) for i, number in enumerate(rows[0]) if i}


def rheograms(path):
    """All curves of a file of open rheograms: number, tab, name, tab, 1; then rate, tab, stress; an empty line ends one."""
    curves = {}
    for block in pathlib.Path(path).read_text(encoding="utf-8").split("\n\n"):
        lines = [line for line in block.splitlines() if line.strip()]
        if lines:
            points = [[float(cell.replace(",", ".")) for cell in line.split("\t")[:2]] for line in lines[1:]]
            rates, stresses = np.array(points).T
            curves[lines[0].split("\t")[0]] = (rates, stresses)
    return curves


MODELS = {
    "newtonian": (("viscosity",), lambda g, m: m * g),
    "power-law": (("consistency", "flow_index"), lambda g, k, n: k * g**n),
    "bingham": (("yield_stress", "plastic_viscosity"), lambda g, ty, m: ty + m * g),
    "herschel-bulkley": (("yield_stress", "consistency", "flow_index"), lambda g, ty, k, n: ty + k * g**n),
    "casson": (("yield_stress", "plastic_viscosity"), lambda g, ty, m: (np.sqrt(ty) + np.sqrt(m * g))**2),
    "cross": (("zero_shear_viscosity", "infinite_shear_viscosity", "time_constant", "flow_index"),
              lambda g, m0, mi, t, n: g * (mi + (m0 - mi) / (1 + (t * g)**(1 - n)))),
    "carreau": (("zero_shear_viscosity", "infinite_shear_viscosity", "time_constant", "flow_index"),
                lambda g, m0, mi, t, n: g * (mi + (m0 - mi) * (1 + (t * g)**2)**((n - 1) / 2))),
    "sisko": (("infinite_shear_viscosity", "consistency", "flow_index"), lambda g, mi, k, n: mi * g + k * g**n),
}

# Least and greatest flow index of the models that have one; 1e-6 stands for "greater than 0".
INDEX = {"power-law": (1e-6, 2), "herschel-bulkley": (1e-6, 2), "cross": (1e-6, 1), "carreau": (1e-6, 1),
         "sisko": (1e-6, 1 - 1e-6)}
# Longest time constant times lowest measured rate that is searched. Beyond it a plateau at low rates is out of sight, and
# what is left of Cross's and Carreau's models is Sisko's, which they then only approach.
LONGEST = 1e8


def relative(model, parameters, rates, stresses):
    """(fitted - measured) / measured."""
    return MODELS[model][1](rates, *parameters) / stresses - 1
