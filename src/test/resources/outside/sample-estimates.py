# Makes sample-estimates.csv: estimates of sample runs by SciPy, for comparison. D in m2/s, contents in %.
# Made with Debian's python3-scipy 1.10.1. Run from the top of the repository:
#   python3 src/test/resources/outside/sample-estimates.py > src/test/resources/outside/sample-estimates.csv
# The test that stopped early: initial slope of content on the root of time, in % / s^0.5, with ln D and the start content free.
# Limits: profile likelihood, S(x) = S (1 + F/nu) with F the 95 % point of F(1, nu); standard error of D from that of ln D.
import numpy as np
from scipy.optimize import brentq, least_squares, minimize_scalar
from scipy.special import erfc
from scipy.stats import f as fdist
import scipy

def G(tau):
    tau = np.asarray(tau, float)
    out = np.zeros_like(tau)
    lo = (tau > 0) & (tau < 0.2)
    t = tau[lo]
    s = 1 / np.sqrt(np.pi) * np.ones_like(t)
    for n in range(1, 8):
        x = n / np.sqrt(t)
        s += 2 * (-1) ** n * (np.exp(-x * x) / np.sqrt(np.pi) - x * erfc(x))
    out[lo] = 2 * np.sqrt(t) * s
    hi = tau >= 0.2
    m = np.arange(1, 60, 2)[:, None]
    out[hi] = 1 - (8 / (m * m * np.pi ** 2) * np.exp(-m * m * np.pi ** 2 * tau[hi] / 4)).sum(0)
    return out

def read(name):
    rows, dry, time, mass = [], None, {"min": 60, "h": 3600, "d": 86400}, {"mg": 1e-3, "g": 1.0}
    for line in open("sample-runs/" + name, encoding="utf-8"):
        if line.startswith("# dry mass"):
            dry = float(line.split(":")[1].split()[0]) * mass[line.split()[-1]]
        elif line.startswith("time"):
            units = [c.split("[")[1].split("]")[0] for c in line.strip().split(",")[:2]]
        elif line[0].isdigit():
            rows.append([float(v) for v in line.split(",")[:2]])
    a = np.array(rows)
    return a[:, 0] * time[units[0]], (a[:, 1] * mass[units[1]] - dry) / dry * 100

def run(name, paths, fixed_start=None):
    t, y = read(name)
    def curve(p):
        left = 1
        for L in paths:
            left = left * (1 - G(np.exp(p[0]) * t / L ** 2))
        start = p[2] if fixed_start is None else fixed_start
        return start + (p[1] - start) * (1 - left)
    p0 = [np.log(0.05 * (2 * paths[0]) ** 2 / t[np.argmin(abs(y - y[0] - 0.5 * (y[-1] - y[0])))]), y[-1], y[0]]
    if fixed_start is not None:
        p0 = p0[:2]
    tight = dict(xtol=1e-15, ftol=1e-15, gtol=1e-15, x_scale="jac", jac="3-point")
    def fit(held=None, x=None, start=None):
        free = [i for i in range(len(p0)) if i != held]
        def full(q):
            p = np.array(start if start is not None else p0, float)
            p[free] = q
            if held is not None:
                p[held] = x
            return p
        r = least_squares(lambda q: curve(full(q)) - y, np.array(start if start is not None else p0)[free], **tight)
        return full(r.x), 2 * r.cost, r.jac
    p, S, J = fit()
    nu = len(y) - len(p)
    se = np.sqrt(np.diag(np.linalg.inv(J.T @ J)) * S / nu)
    target = S * (1 + fdist.ppf(0.95, 1, nu) / nu)
    names = ["diffusivity", "equilibriumContent", "startContent"]
    for k in range(len(p)):
        g = lambda x: fit(k, x, p)[1] - target
        low = brentq(g, p[k] - 8 * se[k], p[k], xtol=1e-12)
        high = brentq(g, p[k], p[k] + 8 * se[k], xtol=1e-12)
        v, e = p[k], se[k]
        if k == 0:
            v, low, high = np.exp(v), np.exp(low), np.exp(high)
            e = v * e
        print(",".join([name, "" if fixed_start is None else repr(fixed_start), names[k]] + ["%.9g" % x for x in (v, e, low, high)]))

def run_slope(name, L):
    t, y = read(name)
    def rises(lnd):
        """Content per initial slope; the root of time alone where D tends to 0."""
        if lnd == -np.inf:
            return np.sqrt(t)
        return G(np.exp(lnd) * t / L ** 2) / (2 * np.sqrt(np.exp(lnd) / np.pi) / L)
    def solved(lnd, held={}):
        """Sum of squares with ln D held, and perhaps slope (1) or start (2); the rest solved linearly."""
        columns = {1: rises(lnd), 2: np.ones(len(t))}
        r = y - sum((held[k] * columns[k] for k in held), np.zeros(len(t)))
        a = np.array([columns[k] for k in (1, 2) if k not in held]).T
        c = np.linalg.lstsq(a, r, rcond=None)[0]
        return ((r - a @ c) ** 2).sum(), c
    def best(held={}):
        grid = np.linspace(np.log(1e-15), np.log(1e-11), 200)
        i = int(np.argmin([solved(x, held)[0] for x in grid]))
        far = solved(-np.inf, held)[0]
        if 0 < i < len(grid) - 1:
            r = minimize_scalar(lambda x: solved(x, held)[0], bracket=tuple(grid[i - 1:i + 2]), options=dict(xtol=1e-12))
            if r.fun < far:
                return r.fun, r.x
        return far, -np.inf
    lnd = best()[1]
    p = np.array([lnd, *solved(lnd)[1]])
    r = least_squares(lambda q: q[2] + q[1] * rises(q[0]) - y, p, xtol=1e-15, ftol=1e-15, gtol=1e-15, x_scale="jac", jac="3-point")
    p, S, nu = r.x, 2 * r.cost, len(y) - 3
    scale = np.linalg.norm(r.jac, axis=0)
    se = np.sqrt(np.diag(np.linalg.inv((r.jac / scale).T @ (r.jac / scale))) * S / nu) / scale
    target = S * (1 + fdist.ppf(0.95, 1, nu) / nu)
    for k, title in ((1, "initialSlope"), (2, "startContent")):
        g = lambda x: best({k: x})[0] - target
        row = (p[k], se[k], brentq(g, p[k] - 8 * se[k], p[k], xtol=1e-13), brentq(g, p[k], p[k] + 8 * se[k], xtol=1e-13))
        print(",".join([name, "", title] + ["%.9g" % x for x in row]))

print("# Source: SciPy %s, recipe in sample-estimates.py." % scipy.__version__)
print("file,fixedStart,parameter,value,standardError,low,high")
run("01-both-faces.csv", [2.03e-3 / 2])
run("01-both-faces.csv", [2.03e-3 / 2], 0.0)
run("02-drying.csv", [1.52e-3 / 2])
run("05-bare-edges.csv", [4e-3 / 2, 20e-3 / 2, 20e-3 / 2])
run_slope("04-stopped-early.csv", 3.10e-3 / 2)
