"""How many EDSD posteriors a second scipy makes: the five quantiles by quad in ln r and brentq, to 1e-6.

Reads [[parallaxMas, errorMas, lengthPc], ...] on stdin, prints one number. The range is handed to scipy found already
(the peak by the cubic, eight curvatures to either side, then as far as the tail goes), so that it does only its own work.
"""

import json
import math
import sys
import time

import numpy as np
from scipy.integrate import quad
from scipy.optimize import brentq


def quantiles(parallax, error, length_pc):
    scale = length_pc / 1000
    log = lambda u: 3 * u - math.exp(u) / scale - (parallax - math.exp(-u)) ** 2 / (2 * error**2)
    roots = np.roots([1 / scale, -3, parallax / error**2, -1 / error**2])
    peaks = sorted(math.log(r.real) for r in roots if abs(r.imag) < 1e-12 and r.real > 0)
    peak = max(log(u) for u in peaks)
    low, high = peaks[0], peaks[-1]
    step = 0.1 / (1 + abs(parallax) / error)
    while log(low) > peak - 30:
        low, step = low - step, step * 1.5
    step = 0.1 / (1 + abs(parallax) / error)
    while log(high) > peak - 30:
        high, step = high + step, step * 1.5
    density = lambda u: math.exp(log(u) - peak)
    total = quad(density, low, high, points=peaks, limit=200)[0]

    def beyond(u, probability):
        inside = [p for p in peaks if p < u] or None
        return quad(density, low, u, points=inside, limit=200)[0] - probability * total

    return [math.exp(brentq(beyond, low, high, args=(q,))) for q in (0.05, 0.16, 0.5, 0.84, 0.95)]


inputs = json.load(sys.stdin)
quantiles(*inputs[0])
start = time.perf_counter()
found = [quantiles(*one) for one in inputs]
seconds = time.perf_counter() - start
json.dump({"perSecond": len(inputs) / seconds, "quantilesKpc": found}, sys.stdout)
