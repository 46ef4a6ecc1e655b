"""The bench cases by NumPy and SciPy, as an expert would write them: the smallest size that reaches the same error.

Two ways each: Gauss-Legendre Nystrom with ARPACK on the dense matrix, and an FFT operator on an even grid with ARPACK.
Prints one JSON line: [{case, seconds, error, how}], medians, single process.
"""
import json
import time

import numpy as np
from numpy.polynomial.legendre import leggauss
from scipy.sparse.linalg import LinearOperator, eigs
from scipy.special import erfc

R = 3.8


def median(work, seconds=2.0):
    work()
    times, begun = [], time.perf_counter()
    while len(times) < 7 or (time.perf_counter() - begun < seconds and len(times) < 51):
        t = time.perf_counter()
        result = work()
        times.append(time.perf_counter() - t)
    return float(np.median(times)), result


def nystrom(sigma, n):
    """Dense kernel on n Gauss-Legendre nodes of each half of [0, 1] (the map is smooth, halves cost nothing)."""
    x, w = leggauss(n)
    x, w = (x + 1) / 2, w / 2
    d = (x[:, None] - R * x * (1 - x)) / sigma
    k = np.exp(-0.5 * d * d) / (sigma * np.sqrt(2 * np.pi))
    return x, w, np.sqrt(w)[:, None] * k * np.sqrt(w)


def spectrum_nystrom(sigma, n):
    _, _, a = nystrom(sigma, n)
    v = eigs(a, k=8, which="LM", return_eigenvectors=False, tol=1e-11, v0=np.ones(len(a)))
    return v[np.argsort(-np.abs(v))]


def fft_operator(sigma, n):
    """Even grid with trapezoid weights and Gregory corrections of order 8; mass deposited by an 8-point Lagrange rule."""
    h = 1 / (n - 1)
    x = np.linspace(0, 1, n)
    w = np.full(n, h)
    gregory = np.array([-1 / 12, -1 / 24, -19 / 720, -3 / 160, -863 / 60480, -275 / 24192, -33953 / 3628800])
    delta = np.zeros(8)
    row = np.array([1.0])
    delta[0] += -0.5
    for c in gregory:
        row = np.convolve(row, [1, -1])[: len(row) + 1]
        delta[: len(row)] += c * row
    w[:8] += h * delta
    w[-8:] += h * delta[::-1]
    y = R * x * (1 - x) / h
    base = np.clip(np.floor(y).astype(int) - 5, 0, n - 12)
    k = np.arange(12)
    nodes = base[:, None] + k
    t = y[:, None] - nodes
    weights = np.ones((n, 12))
    for i in range(12):
        for j in range(12):
            if i != j:
                weights[:, i] *= (y - nodes[:, j]) / (k[i] - k[j])
    size = 1 << int(np.ceil(np.log2(n + 9 * sigma / h)))
    q = 2 * np.pi * np.fft.rfftfreq(size, h)
    g = np.exp(-0.5 * (q * sigma) ** 2) / h
    flat = nodes.ravel()

    def step(rho):
        rho = rho.ravel()
        line = np.bincount(flat, ((w * rho)[:, None] * weights).ravel(), minlength=size)
        return np.fft.irfft(np.fft.rfft(line) * g, size)[:n]

    return x, w, step


def spectrum_fft(sigma, n):
    _, _, step = fft_operator(sigma, n)
    v = eigs(LinearOperator((n, n), matvec=step, dtype=float), k=8, which="LM", return_eigenvectors=False, tol=1e-11, v0=np.ones(n))
    return v[np.argsort(-np.abs(v))]


def distance(found, reference):
    return float(max(min(abs(f - r) for r in reference) for f in found[:8]))


def smallest(solve, sigma, sizes, reference, wanted):
    for n in sizes:
        if distance(solve(sigma, n), reference) <= wanted:
            return n
    return None


def exit_rate(sigma, n):
    """1 / mean exit time by positive power sweeps on the dense kernel, plus relaxation time and exponent."""
    x, w, a = nystrom(sigma, n)
    image = R * x * (1 - x)
    leave = 0.5 * erfc((1 - image) / (sigma * np.sqrt(2))) + 0.5 * erfc(image / (sigma * np.sqrt(2)))
    values, vectors = eigs(a, k=2, which="LM", tol=1e-9, v0=np.ones(len(a)))
    order = np.argsort(-np.abs(values))
    u = np.abs(np.real(vectors[:, order[0]]))
    last = 0.0
    for _ in range(200):
        u = a @ u
        u /= np.sum(np.sqrt(w) * u)
        rate = np.sum(np.sqrt(w) * u * leave)
        if abs(rate - last) <= 1e-9 * rate:
            break
        last = rate
    with np.errstate(divide="ignore"):
        log = np.log(np.abs(R * (1 - 2 * x)))
    exponent = np.sum(np.sqrt(w) * u * log)
    return 1 / rate, -1 / np.log(np.abs(values[order[1]]) / np.abs(values[order[0]])), exponent


def main():
    rows = []
    x, w, step = fft_operator(0.01, 1024)
    rho = 6 * x * (1 - x)
    seconds, got = median(lambda: [step(rho) for _ in range(50)][-1])
    xf, wf = leggauss(3000)
    xf, wf = (xf + 1) / 2, wf / 2
    exact = np.array([np.sum(wf * 6 * xf * (1 - xf) * np.exp(-0.5 * ((y - R * xf * (1 - xf)) / 0.01) ** 2)) for y in x]) / (0.01 * np.sqrt(2 * np.pi))
    rows.append(dict(case="step-1d", seconds=seconds / 50, error=float(np.max(np.abs(got - exact)) / np.max(exact)), how="NumPy real FFT, even grid, 12-point deposit"))
    for sigma, dense, even in ((0.01, (300, 400, 500, 600, 800), (512, 768, 1024, 1536, 2048)), (0.001, (2400, 3000, 3600), (4096, 6144, 8192, 12288))):
        reference = spectrum_nystrom(sigma, dense[-1] * 5 // 4)
        for solve, sizes, how in ((spectrum_nystrom, dense, "Gauss-Legendre Nystrom, ARPACK"), (spectrum_fft, even, "FFT operator, ARPACK")):
            n = smallest(solve, sigma, sizes, reference, 1e-10) or sizes[-1]
            seconds, found = median(lambda: solve(sigma, n), 4.0)
            rows.append(dict(case=f"spectrum-1d-{sigma:g}", seconds=seconds, error=distance(found, reference), how=f"{how}, {n} points"))
    sigmas = 3e-3 * (0.4 / 3e-3) ** (np.arange(64) / 63)
    size = lambda s: 2 * int(min(700, max(60, 3 / s)))  # even: no node on the critical point
    begun = time.perf_counter()
    rail = [exit_rate(s, size(s)) for s in sigmas]
    seconds = time.perf_counter() - begun
    fine = [exit_rate(s, 2 * int(0.65 * size(s))) for s in sigmas[::7]]
    error = max(abs(a / b - 1) for p, q in zip(rail[::7], fine) for a, b in zip(p, q))
    rows.append(dict(case="rail-1d", seconds=seconds, error=float(error), how="Gauss-Legendre Nystrom, ARPACK, power sweeps; exponent by plain weights"))
    print(json.dumps(rows))


main()
