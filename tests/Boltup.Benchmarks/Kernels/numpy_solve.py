#!/usr/bin/env python3
"""Times NumPy's batched solve on smooth FRF-like matrices, one BLAS thread.

  OPENBLAS_NUM_THREADS=1 python3 numpy_solve.py N RIGHT_HAND_SIDES LINES REPEATS

Prints the shortest time in seconds. NumPy must use an optimised BLAS (Debian: libopenblas0-pthread); with the reference BLAS it is several
times slower, and the ratios mean nothing.
"""
import sys
import time

import numpy as np


def modal_sum(n, lines):
    rng = np.random.default_rng(n)
    modes = n + 5
    shapes = rng.uniform(-1, 1, (modes, n))
    natural = 20 + 37.0 * np.arange(modes)
    hz = np.linspace(20, 2000, lines)
    weight = 1 / (natural**2 * (1 + 0.02j) - hz[:, None]**2)
    return np.einsum("lm,mi,mj->lij", weight, shapes, shapes)


n, columns, lines, repeats = map(int, sys.argv[1:5])
a = modal_sum(n, lines)
b = np.random.default_rng(1).uniform(-1, 1, (lines, n, columns)) + 0j
np.linalg.solve(a, b)
best = 1e9
for _ in range(repeats):
    start = time.perf_counter()
    np.linalg.solve(a, b)
    best = min(best, time.perf_counter() - start)
print(repr(best), flush=True)
