"""Writes reference-intervals.csv: standard errors and profile intervals of the five curves under the relative objective.

Profile interval: all values of a parameter for which the least sum of squares over the other parameters stays below
S (1 + F/(N - p)), F the 95 % quantile of F(1, N - p).
"""
import numpy as np
import scipy
from scipy import optimize, stats

from curves import INDEX, MODELS, RESOURCES, five, relative
from minima import by_projection, polished, random_start

HEADER = f"""\
# 95 % intervals of the parameters of the five curves of open-rheograms.csv under the relative objective, sum of
# ((fitted - measured)/measured)^2, computed with SciPy {scipy.__version__} independently of this project's code by
# releng/fit-reference/intervals.py. standard_error: root of the diagonal of s^2 (J'J)^-1, J the derivatives of
# fitted/measured, s^2 the least sum over N - p. low_t, high_t: value -+ t quantile (N - p) times the standard error.
# low_profile, high_profile: where the least sum over the other parameters is S (1 + F/(N - p)), F the 95 % quantile of
# F(1, N - p); empty: not reached before the parameter's limit (0). Cross and Carreau are not here: these curves show no
# upper plateau, so that the least sum is approached and not attained (relative-minima.csv).
rheogram,model,parameter,value,standard_error,low_t,high_t,low_profile,high_profile
"""
TIGHT = {"x_scale": "jac", "ftol": 1e-15, "xtol": 1e-15, "gtol": 1e-15, "max_nfev": 500}


def jacobian(model, p, g, t):
    """Central differences with one step of extrapolation; about eleven digits."""
    columns = []
    for i in range(len(p)):
        def slope(h):
            up, down = p.copy(), p.copy()
            up[i] += h
            down[i] -= h
            return (relative(model, up, g, t) - relative(model, down, g, t)) / (2 * h)
        h = 1e-3 * p[i]
        a, b, c = slope(h), slope(h / 2), slope(h / 4)
        ab, bc = (4 * b - a) / 3, (4 * c - b) / 3
        columns.append((16 * bc - ab) / 15)
    return np.array(columns).T


def least_with(model, i, fixed, start, g, t):
    """Least sum over the other parameters, parameter i held; and where."""
    rest = [j for j in range(len(start)) if j != i]
    if not rest:
        return (relative(model, np.array([fixed]), g, t)**2).sum(), np.array([fixed])
    names = MODELS[model][0]
    low = [INDEX[model][0] if names[j] == "flow_index" else 0 for j in rest]
    high = [INDEX[model][1] if names[j] == "flow_index" else np.inf for j in rest]

    def full(v):
        p = np.empty(len(start))
        p[i] = fixed
        p[rest] = v
        return p
    starts = [start[rest]] + [random_start(model, g, t, np.random.default_rng(k))[rest] for k in range(2)]
    ends = []
    for s in starts:
        s = np.clip(s, np.array(low) + 1e-12, np.minimum(high, 1e12) - 1e-12)
        ends.append(optimize.least_squares(lambda v: relative(model, full(v), g, t), s, bounds=(low, high), **TIGHT))
    best = min(ends, key=lambda e: e.cost)
    return 2 * best.cost, full(best.x)


def end(model, i, p, g, t, threshold, up):
    """Where the profile meets the threshold above or below the best value; NaN at the limit."""
    limit = INDEX[model][up] if MODELS[model][0][i] == "flow_index" else (np.inf if up else 0.0)
    near, start, step = p[i], p.copy(), 0.002 * p[i]
    while True:
        far = near + step if up else near - step
        stop = far >= limit if up else far <= limit
        far = limit if stop else far
        s, where = least_with(model, i, far, start, g, t)
        if s > threshold:
            break
        if stop:
            return float("nan")
        near, start, step = far, where, 1.5 * step
    return optimize.brentq(lambda v: least_with(model, i, v, start, g, t)[0] / threshold - 1, *sorted((near, far)),
                           xtol=1e-13, rtol=1e-13)


def shown(value):
    return "" if np.isnan(value) else f"{value:.8g}"


def main():
    with open(RESOURCES / "reference-intervals.csv", "w", encoding="utf-8", newline="\n") as out:
        out.write(HEADER)
        for number, (g, t) in five().items():
            for model in ("newtonian", "power-law", "bingham", "herschel-bulkley", "casson", "sisko"):
                first = by_projection(model, g, t) or random_start(model, g, t, np.random.default_rng(1))
                p = polished(model, polished(model, first, g, t), g, t)
                least = (relative(model, p, g, t)**2).sum()
                freedom = len(g) - len(p)
                errors = np.sqrt(np.diag(np.linalg.inv((j := jacobian(model, p, g, t)).T @ j)) * least / freedom)
                threshold = least * (1 + stats.f.ppf(0.95, 1, freedom) / freedom)
                q = stats.t.ppf(0.975, freedom)
                for i, name in enumerate(MODELS[model][0]):
                    low, high = (end(model, i, p, g, t, threshold, up) for up in (0, 1))
                    out.write(f"{number},{model},{name},{p[i]:.8g},{errors[i]:.8g},{p[i] - q * errors[i]:.8g},"
                              f"{p[i] + q * errors[i]:.8g},{shown(low)},{shown(high)}\n")
                out.flush()


main()
