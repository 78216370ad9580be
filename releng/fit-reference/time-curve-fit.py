"""Times scipy.optimize.curve_fit on a file of rheograms: python3 time-curve-fit.py RheogramSet.txt [logarithms|bounds] [EVERY]

For each curve (each EVERY-th; default 1), all eight models under the relative objective (sigma = measured stress), each
with one start computed from the points as a practitioner would, default settings, 95 % intervals from the covariance with
the t quantile. Two ways to keep the parameters within their limits:
  logarithms (default): the logarithms of the parameters are fitted (of n/(1-n) where n is at most 1), which lets curve_fit
      use MINPACK; the fastest way that was found, and it converges on every curve
  bounds: the bounds of curve_fit, for the models that run astray without; much slower, and most fits of Cross and Carreau
      fail on curves without an upper plateau
One pass warms up; of further passes, at least one and for about three seconds, the fastest counts. Prints one line: average
milliseconds a curve for all models, way, curves, fits that failed in a pass, passes.
"""
import sys
import time
import warnings

import numpy as np
from scipy.optimize import curve_fit
from scipy.stats import t as student

from curves import MODELS, rheograms

INFINITE = np.inf
SECONDS = 3
UP_TO_ONE = ("cross", "carreau", "sisko")


def starts(g, t):
    """Start and bounds of each model; None for what curve_fit finds without bounds."""
    low, high = g.argmin(), g.argmax()
    n, k = np.polyfit(np.log(g), np.log(t), 1)
    k = np.exp(k)
    slope, level = np.polyfit(g, t, 1)
    n = min(max(n, 0.05), 0.95)
    level, slope = max(level, 0.1 * t[low]), max(slope, 1e-3 * t[high] / g[high])
    zero, infinite = t[low] / g[low], 0.5 * t[high] / g[high]
    yes = 0.5 * t[low]
    index = max(min(np.log((t[high] - yes) / (t[low] - yes)) / np.log(g[high] / g[low]), 1.5), 0.1)
    plateaus = ([2 * zero, infinite, 1 / g[low], n], ([0, 0, 0, 0], [INFINITE, INFINITE, INFINITE, 1]))
    return {
        "newtonian": ([np.median(t / g)], None),
        "power-law": ([k, n], None),
        "bingham": ([level, slope], None),
        "herschel-bulkley": ([yes, (t[high] - yes) / g[high]**index, index], ([0, 0, 0], [INFINITE, INFINITE, 2])),
        "casson": ([level, slope], ([0, 0], INFINITE)),
        "cross": plateaus,
        "carreau": plateaus,
        "sisko": ([infinite, k, n], ([0, 0, 0], [INFINITE, INFINITE, 1])),
    }


def with_bounds(model, g, t, start, bounds):
    options = {} if bounds is None else {"bounds": bounds}
    p, covariance = curve_fit(MODELS[model][1], g, t, start, sigma=t, **options)
    half = student.ppf(0.975, len(g) - len(p)) * np.sqrt(np.diag(covariance))
    return p - half, p + half


def back(model, v):
    p = np.exp(v)
    if model in UP_TO_ONE:
        p[-1] = p[-1] / (1 + p[-1])
    return p


def with_logarithms(model, g, t, start, _):
    fun = MODELS[model][1]
    v = np.log(start)
    if model in UP_TO_ONE:
        v[-1] -= np.log(1 - start[-1])
    v, covariance = curve_fit(lambda g, *v: fun(g, *back(model, v)), g, t, v, sigma=t)
    half = student.ppf(0.975, len(g) - len(v)) * np.sqrt(np.diag(covariance))
    return back(model, v - half), back(model, v + half)


def one_pass(curves, fit):
    failed = 0
    for g, t in curves:
        for model, (start, bounds) in starts(g, t).items():
            try:
                fit(model, g, t, start, bounds)
            except RuntimeError:  # no convergence within the default number of evaluations
                failed += 1
    return failed


def main(path, way="logarithms", every="1"):
    warnings.simplefilter("ignore")
    fit = {"logarithms": with_logarithms, "bounds": with_bounds}[way]
    curves = list(rheograms(path).values())[::int(every)]
    one_pass(curves[:20], fit)
    least, passes, begin = INFINITE, 0, time.perf_counter()
    while passes == 0 or time.perf_counter() - begin < SECONDS:
        start = time.perf_counter()
        failed = one_pass(curves, fit)
        least = min(least, time.perf_counter() - start)
        passes += 1
    print(f"{1000 * least / len(curves):.3f} ms a curve, {way}, {len(curves)} curves, {failed} fits failed, {passes} passes")


main(*sys.argv[1:])
