#!/usr/bin/env python3
"""Times NumPy's least squares and SVD on smooth FRF-like matrices, one BLAS thread.

  OPENBLAS_NUM_THREADS=1 python3 numpy_inverse.py ROWS COLUMNS LINES REPEATS lstsq|qr|svd

lstsq: np.linalg.lstsq line by line; qr: batched np.linalg.qr and a batched solve with R; svd: batched np.linalg.svd, both factors thin.
Prints the shortest time in seconds. NumPy must use an optimised BLAS (Debian: libopenblas0-pthread).
"""
import sys
import time

import numpy as np


def modal_sum(rows, columns, lines):
    rng = np.random.default_rng(rows)
    modes = rows + 5
    shapes = rng.uniform(-1, 1, (modes, rows))
    natural = 20 + 37.0 * np.arange(modes)
    hz = np.linspace(20, 2000, lines)
    weight = 1 / (natural**2 * (1 + 0.02j) - hz[:, None]**2)
    return np.einsum("lm,mi,mj->lij", weight, shapes, shapes[:, :columns])


def by_lstsq(a, b):
    return [np.linalg.lstsq(y, u, rcond=None)[0] for y, u in zip(a, b)]


def by_qr(a, b):
    q, r = np.linalg.qr(a)
    return np.linalg.solve(r, q.conj().swapaxes(1, 2) @ b)


def by_svd(a, b):
    return np.linalg.svd(a, full_matrices=False)


rows, columns, lines, repeats = map(int, sys.argv[1:5])
work = {"lstsq": by_lstsq, "qr": by_qr, "svd": by_svd}[sys.argv[5]]
a = modal_sum(rows, columns, lines)
b = np.random.default_rng(1).uniform(-1, 1, (lines, rows, 1)) + 0j
work(a, b)
best = 1e9
for _ in range(repeats):
    start = time.perf_counter()
    work(a, b)
    best = min(best, time.perf_counter() - start)
print(repr(best), flush=True)
