"""Smallest relative objective of each model that SciPy finds by two independent ways, for one curve.

Way 1: many random starts of several methods over all parameters. Way 2: where a model is linear in two parameters once
the others are fixed, these follow in closed form (not below 0), and the one or two others are scanned and polished.
"""
import numpy as np
from scipy import optimize

from curves import INDEX, LONGEST, MODELS, relative

TINY = 1e-15


def projected(a, b):
    """Smallest |p a + q b - 1|^2 with p, q >= 0 for each row of a and b; returns the values, p and q."""
    aa, bb, ab = (a * a).sum(-1), (b * b).sum(-1), (a * b).sum(-1)
    a1, b1, size = a.sum(-1), b.sum(-1), a.shape[-1]
    with np.errstate(all="ignore"):
        det = aa * bb - ab * ab
        p, q = (bb * a1 - ab * b1) / det, (aa * b1 - ab * a1) / det
        alone_a, alone_b = np.maximum(a1 / aa, 0), np.maximum(b1 / bb, 0)
        a_better = aa * alone_a**2 >= bb * alone_b**2
        outside = ~((p >= 0) & (q >= 0))
    p = np.where(outside, np.where(a_better, alone_a, 0), p)
    q = np.where(outside, np.where(a_better, 0, alone_b), q)
    value = ((p[..., None] * a + q[..., None] * b - 1)**2).sum(-1)
    return np.where(np.isfinite(value), value, size), p, q


def basis(model, g, t, index, reduced):
    """The two columns in which the model is linear, over the stress; index and reduced (time times lowest rate): (...)."""
    n, x = np.asarray(index)[..., None], np.asarray(reduced)[..., None] * (g / g.min())
    if model == "herschel-bulkley":
        return np.broadcast_to(1 / t, (g**n).shape), g**n / t
    if model == "sisko":
        return np.broadcast_to(g / t, (g**n).shape), g**n / t
    thinning = 1 / (1 + x**(1 - n)) if model == "cross" else (1 + x * x)**((n - 1) / 2)
    return np.broadcast_to(g / t, thinning.shape), g * thinning / t


def by_projection(model, g, t):
    """Parameters by way 2; None for a model that has none."""
    if model in ("newtonian", "bingham"):
        a, b = g / t, (1 / t if model == "bingham" else 0 * g)
        _, p, q = projected(a[None], b[None])
        return [q[0], p[0]] if model == "bingham" else [p[0]]
    if model not in INDEX:
        return None
    low, high = INDEX[model]
    if model == "power-law":
        def column(n):
            return g**n / t

        def value(n):
            c = column(n)
            return len(g) - c.sum()**2 / (c * c).sum()
        grid = np.linspace(low, high, 400)
        at = min(range(400), key=lambda i: value(grid[i]))
        n = optimize.minimize_scalar(value, bounds=(grid[max(at - 1, 0)], grid[min(at + 1, 399)]), method="bounded",
                                     options={"xatol": TINY}).x
        c = column(n)
        return [c.sum() / (c * c).sum(), n]
    index = np.concatenate([[low], np.linspace(0.01, high, 250)])
    two = model in ("cross", "carreau")
    reduced = np.logspace(-6, np.log10(LONGEST), 160) if two else np.array([1.0])
    ii, rr = (m.ravel() for m in np.meshgrid(index, reduced))
    values, _, _ = projected(*basis(model, g, t, ii, rr))
    best = None
    for at in np.argsort(values)[:400:80]:
        def value(v):
            n, x = min(max(v[0], low), high), min(10**v[1], LONGEST)
            return projected(*basis(model, g, t, n, x))[0]
        start = np.array([ii[at], np.log10(rr[at])])
        simplex = np.array([[0, 0], [0.01 if start[0] < high - 0.02 else -0.01, 0], [0, 0.2 if two else 0.001]])
        found = optimize.minimize(value, start, method="Nelder-Mead", options={
            "xatol": 1e-13, "fatol": 1e-17, "maxiter": 4000, "maxfev": 4000, "initial_simplex": start + simplex})
        if best is None or found.fun < best.fun:
            best = found
    n, x = min(max(best.x[0], low), high), min(10**best.x[1], LONGEST)
    _, p, q = projected(*basis(model, g, t, n, x))
    if two:
        return [float(p + q), float(p), x / g.min(), n]
    return [float(p), float(q), n]


def random_start(model, g, t, rng):
    viscosity = t / g
    kind = {"viscosity": lambda: rng.choice(viscosity) * 10**rng.uniform(-1, 1),
            "consistency": lambda: np.median(t) * 10**rng.uniform(-2, 1),
            "flow_index": lambda: rng.uniform(0.05, 0.95),
            "yield_stress": lambda: t.min() * rng.uniform(0, 1.2),
            "plastic_viscosity": lambda: viscosity.min() * 10**rng.uniform(-2, 1),
            "zero_shear_viscosity": lambda: viscosity.max() * 10**rng.uniform(-0.3, 3),
            "infinite_shear_viscosity": lambda: viscosity.min() * 10**rng.uniform(-4, 0),
            "time_constant": lambda: 10**rng.uniform(-1, 3) / g.min()}
    return np.array([kind[name]() for name in MODELS[model][0]])


def bounds(model, g):
    low, high = [], []
    for name in MODELS[model][0]:
        low.append(INDEX[model][0] if name == "flow_index" else 0)
        high.append(INDEX[model][1] if name == "flow_index" else LONGEST / g.min() if name == "time_constant" else np.inf)
    return np.array(low), np.array(high)


def feasible(model, p):
    """Parameters as the methods below see them: the lower plateau is the upper one's share, from 0 to 1."""
    if model in ("cross", "carreau"):
        return np.array([p[0], p[0] * p[1], p[2], p[3]])
    return p


def polished(model, p, g, t, method="trf"):
    low, high = bounds(model, g)
    inner = np.array(p, float)
    if model in ("cross", "carreau"):
        inner[1] = min(inner[1] / inner[0], 1) if inner[0] > 0 else 0
        high[1] = 1
    inner = np.clip(inner, low, np.where(np.isfinite(high), high, 1e300))
    with np.errstate(all="ignore"):
        found = optimize.least_squares(lambda v: np.nan_to_num(relative(model, feasible(model, v), g, t), nan=1e6, posinf=1e6),
                                       inner, bounds=(low, high), method=method, x_scale="jac", ftol=TINY, xtol=TINY,
                                       gtol=TINY, max_nfev=600)
    return feasible(model, found.x)


def by_random_starts(model, g, t, rng, starts):
    """Parameters by way 1: trust region, dogleg, and Nelder and Mead, L-BFGS-B, Powell in logarithms, each polished."""
    low, high = bounds(model, g)
    best, least = None, np.inf
    for i in range(starts):
        start = random_start(model, g, t, rng)
        if i % 5 == 0:
            end = polished(model, start, g, t)
        elif i % 5 == 1:
            end = polished(model, start, g, t, "dogbox")
        else:
            method = ("Nelder-Mead", "L-BFGS-B", "Powell")[i % 5 - 2]
            top = np.where(np.isfinite(high), high, 1e12)

            def value(v):
                p = np.clip(np.exp(np.clip(v, -60, 60)), low, top)
                if model in ("cross", "carreau"):
                    p[1] = min(p[1], p[0])
                with np.errstate(all="ignore"):
                    s = (relative(model, p, g, t)**2).sum()
                return s if np.isfinite(s) else 1e12
            v = optimize.minimize(value, np.log(np.maximum(start, 1e-20)), method=method).x
            p = np.clip(np.exp(np.clip(v, -60, 60)), low, top)
            if model in ("cross", "carreau"):
                p[1] = min(p[1], p[0])
            end = polished(model, p, g, t)
        s = (relative(model, end, g, t)**2).sum()
        if s < least:
            best, least = end, s
    return best


def smallest(model, g, t, rng, starts=25):
    """Parameters and sum of squares of the smaller of both ways, and how far above it the other one ended."""
    ends = [by_random_starts(model, g, t, rng, starts)]
    other = by_projection(model, g, t)
    if other is not None:
        ends += [np.array(other, float), polished(model, other, g, t)]
    sums = [(relative(model, p, g, t)**2).sum() for p in ends]
    at = int(np.argmin(sums))
    gap = (max(sums[0], min(sums[1:])) / min(sums) - 1) if other is not None else 0
    return ends[at], sums[at], gap


def attained(model, p, g):
    """False where the search ended at a limit that the model may come closer to without end."""
    names = MODELS[model][0]
    at = dict(zip(names, p))
    if "flow_index" in at and at["flow_index"] < 1e-5:
        return False
    return not ("time_constant" in at and at["time_constant"] * g.min() > 0.001 * LONGEST)
