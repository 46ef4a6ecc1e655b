"""Reference values for typed formulas: Nystrom's method on composite Gauss-Legendre nodes, dense eigenvalues of NumPy.

    python3 tests/published/nystrom.py > tests/published/typed-formulas.json

Needs numpy and scipy. Every number is computed on two grids; `shift` is the largest difference between them.
Method: K. E. Atkinson, The Numerical Solution of Integral Equations of the Second Kind, Cambridge 1997, section 4.1.
"""
import json
import sys

import numpy as np
from scipy.special import erfc

ROOT = np.sqrt(2.0)


def panels(cuts, width, steep):
    """Edges between the cuts, none wider than `width`; a ladder towards cuts where the slope is unbounded."""
    edges = []
    for a, b in zip(cuts[:-1], cuts[1:]):
        part = [a]
        lows = [a + (b - a) * 0.25**k for k in range(24, 0, -1)] if a in steep else []
        highs = [b - (b - a) * 0.25**k for k in range(1, 25)] if b in steep else []
        for e in lows + highs + [b]:
            n = max(1, int(np.ceil((e - part[-1]) / width)))
            part += list(part[-1] + (e - part[-1]) * np.arange(1, n + 1) / n)
        edges += part[:-1]
    return np.array(edges + [cuts[-1]])


def nodes(edges, order):
    t, w = np.polynomial.legendre.leggauss(order)
    half = np.diff(edges)[:, None] / 2
    return (edges[:-1, None] + half * (1 + t)).ravel(), (half * w).ravel()


def images(low, high, ends, sigma):
    """(sign, shift) of the places on the line that stand for a position of the domain."""
    length = high - low
    turns = int(np.ceil(9 * sigma / length)) + 2
    if ends == "periodic":
        return [(1, m * length) for m in range(-turns, turns + 1)]
    a, b = ends
    if a == b == "reflecting":
        return [(s, (0 if s > 0 else 2 * low) + 2 * m * length) for m in range(-turns, turns + 1) for s in (1, -1)]
    if a == "reflecting":
        return [(1, 0), (-1, 2 * low)]
    if b == "reflecting":
        return [(1, 0), (-1, 2 * high)]
    return [(1, 0)]


def fold(y, low, high, ends):
    """Maps whose images overshoot a reflecting end are mirrored before the noise: symmetric noise commutes with it."""
    if ends == "periodic":
        return low + np.mod(y - low, high - low)
    a, b = ends
    if a == b == "reflecting":
        u = np.mod(y - low, 2 * (high - low))
        return low + np.minimum(u, 2 * (high - low) - u)
    if a == "reflecting":
        return np.where(y < low, 2 * low - y, y)
    if b == "reflecting":
        return np.where(y > high, 2 * high - y, y)
    return y


def kernel(x, y, case, sigma):
    total = np.zeros((len(x), len(y)))
    for sign, shift in images(case["from"], case["to"], case["ends"], sigma):
        total += np.exp(-0.5 * ((sign * x[:, None] + shift - y[None, :]) / sigma) ** 2)
    return total / (sigma * np.sqrt(2 * np.pi))


def solve(case, order, width):
    f, slope, sigma = case["f"], case["slope"], case["sigma"]
    low, high, ends = case["from"], case["to"], case["ends"]
    cuts = sorted({low, high, *case["breaks"]})
    x, w = nodes(panels(cuts, width, case.get("steep", [])), order)
    y = fold(f(x), low, high, ends)
    K = kernel(x, y, case, sigma) * w[None, :]
    values, vectors = np.linalg.eig(K)
    top = np.argsort(-np.abs(values))
    values, vectors = values[top], vectors[:, top]
    rho = vectors[:, 0].real
    rho /= np.sum(w * rho)
    mean = np.sum(w * x * rho)
    out = {
        "eigenvalues": values[:7],
        "mean": mean,
        "variance": np.sum(w * (x - mean) ** 2 * rho),
    }
    # ln|F'| on panels graded towards every point where the slope vanishes or is unbounded
    singular = case["critical"] + case.get("steep", [])
    g, gw = nodes(panels(sorted({*cuts, *singular}), width, singular), 24)
    at = kernel(g, y, case, sigma) @ (w * rho) / values[0].real
    out["lyapunov"] = np.sum(gw * np.log(np.maximum(np.abs(slope(g)), 1e-300)) * at)
    if "absorbing" in ends:
        pull = kernel(x, y, case, sigma).T * w[None, :]
        tau = np.linalg.solve(np.eye(len(x)) - pull, np.ones(len(x)))
        out["meanTime"] = 1 / exit_rate(w, rho, y, case, sigma)
        start = fold(np.array([f(np.array([case["start"]]))[0]]), low, high, ends)
        out["meanTimeFrom"] = 1 + np.sum(kernel(x, start, case, sigma)[:, 0] * w * tau)
    return out


def exit_rate(w, rho, y, case, sigma):
    """Probability of leaving per step, from the two tails: nothing is subtracted."""
    low, high, (a, b) = case["from"], case["to"], case["ends"]
    tail = lambda d: 0.5 * erfc(d / (sigma * ROOT))
    below = tail(y - low) if a == "absorbing" else tail(y + high - 2 * low)
    above = tail(high - y) if b == "absorbing" else tail(2 * high - low - y)
    return np.sum(w * rho * (below + above))


def cubic(p):
    return lambda x: p["a"] * x - p["b"] * x**3


CASES = [
    dict(id="sine", formula="a*sin(b*x)", parameters=dict(a=1.7, b=2.3), sigma=0.13, start=0.4, ends=("absorbing", "absorbing"),
         f=lambda x: 1.7 * np.sin(2.3 * x), slope=lambda x: 1.7 * 2.3 * np.cos(2.3 * x), breaks=[],
         critical=[-np.pi / 4.6, np.pi / 4.6], **{"from": -1.9, "to": 1.9}),
    dict(id="exponential", formula="x*exp(r*(1 - x))", parameters=dict(r=2.6), sigma=0.17, ends=("reflecting", "reflecting"),
         f=lambda x: x * np.exp(2.6 * (1 - x)), slope=lambda x: (1 - 2.6 * x) * np.exp(2.6 * (1 - x)), breaks=[],
         critical=[1 / 2.6], **{"from": 0.0, "to": 3.5}),
    dict(id="tanh", formula="a*tanh(b*x) - c*x", parameters=dict(a=2.1, b=1.3, c=0.35), sigma=0.42, start=-0.6,
         ends=("reflecting", "absorbing"), f=lambda x: 2.1 * np.tanh(1.3 * x) - 0.35 * x,
         slope=lambda x: 2.73 / np.cosh(1.3 * x) ** 2 - 0.35, breaks=[],
         critical=[s * np.arccosh(np.sqrt(2.73 / 0.35)) / 1.3 for s in (-1, 1)], **{"from": -2.2, "to": 1.9}),
    dict(id="cubic", formula="a*x - b*x^3", parameters=dict(a=2.3, b=0.9), sigma=0.08, start=0.1, ends=("absorbing", "absorbing"),
         f=cubic(dict(a=2.3, b=0.9)), slope=lambda x: 2.3 - 2.7 * x**2, breaks=[],
         critical=[-np.sqrt(2.3 / 2.7), np.sqrt(2.3 / 2.7)], **{"from": -1.6, "to": 1.6}),
    dict(id="conditional", formula="x < c ? x/c : s*(1 - x)^2", parameters=dict(c=0.37, s=2.2), sigma=0.06,
         ends=("reflecting", "reflecting"), f=lambda x: np.where(x < 0.37, x / 0.37, 2.2 * (1 - x) ** 2),
         slope=lambda x: np.where(x < 0.37, 1 / 0.37, -4.4 * (1 - x)), breaks=[0.37], critical=[1.0], **{"from": 0.0, "to": 1.0}),
    dict(id="corner", formula="1 - a*abs(x)", parameters=dict(a=1.7), sigma=0.07, start=0.2, ends=("absorbing", "reflecting"),
         f=lambda x: 1 - 1.7 * np.abs(x), slope=lambda x: -1.7 * np.sign(x), breaks=[0.0], critical=[], **{"from": -0.9, "to": 1.1}),
    dict(id="circle", formula="x + w - k*sin(2*pi*x)^3", parameters=dict(w=0.28, k=0.11), sigma=0.04, ends="periodic",
         f=lambda x: x + 0.28 - 0.11 * np.sin(2 * np.pi * x) ** 3,
         slope=lambda x: 1 - 0.11 * 6 * np.pi * np.sin(2 * np.pi * x) ** 2 * np.cos(2 * np.pi * x), breaks=[],
         critical="roots", **{"from": 0.0, "to": 1.0}),
    dict(id="skew-tent", formula="min(a*x, b*(1 - x))", parameters=dict(a=1.8, b=2.6), sigma=0.05, ends="periodic",
         f=lambda x: np.minimum(1.8 * x, 2.6 * (1 - x)), slope=lambda x: np.where(x < 2.6 / 4.4, 1.8, -2.6), breaks=[2.6 / 4.4],
         critical=[], **{"from": 0.0, "to": 1.0}),
    dict(id="root", formula="1 - a*sqrt(abs(x))", parameters=dict(a=1.6), sigma=0.12, ends=("reflecting", "reflecting"),
         f=lambda x: 1 - 1.6 * np.sqrt(np.abs(x)), slope=lambda x: -0.8 * np.sign(x) / np.sqrt(np.abs(x)), breaks=[0.0],
         critical=[], steep=[0.0], **{"from": -1.0, "to": 1.0}),
    dict(id="erf", formula="s*erf(x) + c*cos(x)", parameters=dict(s=-1.4, c=0.6), sigma=0.3, start=0.0, ends=("absorbing", "absorbing"),
         f=lambda x: -1.4 * (1 - erfc(x)) + 0.6 * np.cos(x),
         slope=lambda x: -2.8 / np.sqrt(np.pi) * np.exp(-x * x) - 0.6 * np.sin(x), breaks=[], critical="roots",
         **{"from": -2.5, "to": 2.5}),
]


def roots(slope, low, high):
    x = np.linspace(low, high, 20001)
    s = slope(x)
    found = []
    for i in np.nonzero(s[:-1] * s[1:] < 0)[0]:
        a, b = x[i], x[i + 1]
        for _ in range(60):
            m = (a + b) / 2
            a, b = (m, b) if slope(np.array([m]))[0] * s[i] > 0 else (a, m)
        found.append((a + b) / 2)
    return found


def reference(case):
    if case["critical"] == "roots":
        case["critical"] = roots(case["slope"], case["from"], case["to"])
    # a source sees noise narrowed by the slope
    probe = np.linspace(case["from"], case["to"], 999)[1:-1]
    steepest = min(20.0, np.max(np.abs(case["slope"](probe)))) if "steep" not in case else 3.0
    width = case["sigma"] * min(1.5, 6 / steepest)
    one, two = solve(case, 20, width), solve(case, 24, 0.8 * width)
    shift = 0.0
    for key, a in one.items():
        b = two[key]
        if np.ndim(a):
            d = max(min(abs(p - q) for q in b) for p in a[:6])
        else:
            d = abs(a - b) / max(1.0, abs(b))
        shift = max(shift, float(d))
    values = two["eigenvalues"]
    count = 6 if abs(values[5].imag) < 1e-9 or abs(values[5] - values[4].conjugate()) < 1e-9 else 5
    ends = case["ends"] if isinstance(case["ends"], str) else list(case["ends"])
    out = {k: case[k] for k in ("id", "formula", "parameters", "sigma", "from", "to")}
    out["ends"] = ends
    out["eigenvalues"] = [[float(v.real), float(v.imag) if abs(v.imag) > 1e-13 else 0] for v in values[:count]]
    for key in ("mean", "variance", "lyapunov", "meanTime", "meanTimeFrom"):
        if key in two:
            out[key] = float(two[key])
    if "start" in case:
        out["start"] = case["start"]
    out["shift"] = float(f"{shift:.1e}")
    return out


json.dump([reference(c) for c in CASES], sys.stdout, indent=2)
print()
