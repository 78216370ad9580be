"""Writes relative-minima.csv: python3 relative-minima.py RheogramSet.txt"""
import sys

import numpy as np

from curves import MODELS, RESOURCES, five, rheograms
from minima import attained, smallest

HEADER = """\
# Smallest sum of ((fitted - measured)/measured)^2 of each model, found with SciPy {scipy} independently of this project's
# code by releng/fit-reference/relative-minima.py in two ways: many random starts of five methods, and a scan that solves
# the linear parameters in closed form. Both ended at the same sum within 1e-6 of it, without cross within 1e-10; casson
# was sought the first way alone. 49, 61, 67, 73, 133: the curves of open-rheograms.csv; the others, each ninth of the set,
# are known by their number alone. All parameters 0 or greater; flow index at most 2 (power-law, herschel-bulkley), at most
# 1 (cross, carreau), below 1 (sisko: stress = mi g + K g^n); upper plateau not below the lower.
# attained = no: the sum falls on without end as the time constant grows (cross, carreau, towards sisko's model) or the
# flow index goes to 0; the value is then that at {longest:g} over the lowest rate, or at 1e-6.
# rms_relative is the root of the sum over the points.
rheogram,points,model,sum_of_squares,rms_relative,attained
"""


def main(path):
    import scipy
    from curves import LONGEST
    chosen = five()
    others = [n for n in rheograms(path) if n not in chosen][3::9][:40]
    curves = rheograms(path)
    worst = {}
    with open(RESOURCES / "relative-minima.csv", "w", encoding="utf-8", newline="\n") as out:
        out.write(HEADER.format(scipy=scipy.__version__, longest=LONGEST))
        for number in list(chosen) + others:
            g, t = curves[number]
            for model in MODELS:
                p, s, gap = smallest(model, g, t, np.random.default_rng(int(number)))
                worst[model] = max(worst.get(model, 0), gap)
                out.write(f"{number},{len(g)},{model},{s:.9e},{(s / len(g))**0.5:.9e},"
                          f"{'yes' if attained(model, p, g) else 'no'}\n")
            out.flush()
    print("largest share by which one way ended above the other:", worst)


main(sys.argv[1])
