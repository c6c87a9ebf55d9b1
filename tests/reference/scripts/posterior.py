"""Quantiles and peaks of a distance's posterior by scipy, for any log density.

In ln r, from the log density less its maximum: adaptive quadrature (QUADPACK) between breakpoints, and brentq for
the quantiles. The peaks are found on a dense grid and polished by a bounded minimiser: no cubic is solved here, so
that they stand independent of the formula under test.
"""

import warnings

import numpy as np
from scipy.integrate import IntegrationWarning, quad
from scipy.optimize import brentq, minimize_scalar

PROBABILITIES = (0.05, 0.16, 0.5, 0.84, 0.95)
GRID = 40001

# Where the error is 1e-5 of the parallax, p - 1/r rounds at 1e-11 of the error and the tail's relative error shows it;
# QUADPACK says so on stderr. The share of the probability there is under exp(-40).
warnings.filterwarnings("ignore", message="The occurrence of roundoff error", category=IntegrationWarning)


def support(log_density, low, high):
    """Where the log density is within 60 of its maximum, and that maximum; the grid is drawn twice to sharpen it."""
    for _ in range(6):
        grid = np.linspace(low, high, GRID)
        values = log_density(grid)
        peak = values.max()
        inside = np.flatnonzero(values > peak - 60)
        low, high = grid[max(inside[0] - 1, 0)], grid[min(inside[-1] + 1, GRID - 1)]
    return low, high, peak


def peaks_of(log_density, low, high, end):
    """Local maxima in [low, high]; the end of the range is one when the density still rises there."""
    grid = np.linspace(low, high, GRID)
    values = log_density(grid)
    inner = np.flatnonzero((values[1:-1] > values[:-2]) & (values[1:-1] >= values[2:])) + 1
    found = []
    for i in inner:
        best = minimize_scalar(
            lambda u: -log_density(u), bounds=(grid[i - 1], grid[i + 1]), method="bounded", options={"xatol": 1e-12}
        )
        found.append(float(best.x))
    if end is not None and values[-1] > values[-2]:
        found.append(end)
    return found


def summarise(log_in_r, nearest, farthest, limit=None):
    """log_in_r: log density of r (an array, kpc). nearest, farthest: a generous range in r, kpc.

    Returns quantiles and peaks in pc, and how many nats each peak lies below the highest (none deeper than 60).
    """
    # Distances are counted from the highest point: a narrow peak far from r = 1 would drown in the rounding of ln r.
    first, last = np.log(nearest), np.log(limit or farthest)
    low, high, _ = support(lambda u: log_in_r(np.exp(u)) + u, first, last)
    grid = np.linspace(low, high, GRID)
    anchor = float(np.exp(grid[(log_in_r(np.exp(grid)) + grid).argmax()]))
    log_of_r = lambda v: log_in_r(anchor * np.exp(v))
    log_of_v = lambda v: log_of_r(v) + v
    first, last = np.log(nearest / anchor), np.log((limit or farthest) / anchor)
    low, high, peak = support(log_of_v, first, last)
    density = lambda v: float(np.exp(log_of_v(v) - peak))
    points = np.linspace(low, high, 65)
    # Relative, and where the tail is nothing but rounding, a ten-thousand-millionth of a piece as high as the peak.
    closeness = {"epsabs": 1e-10 * (points[1] - points[0]), "epsrel": 1e-9, "limit": 200}
    pieces = [quad(density, a, b, **closeness)[0] for a, b in zip(points, points[1:])]
    below = np.concatenate([[0], np.cumsum(pieces)])
    quantiles = []
    for probability in PROBABILITIES:
        wanted = probability * below[-1]
        i = int(np.searchsorted(below, wanted)) - 1
        missing = lambda v: below[i] + quad(density, points[i], v, **closeness)[0] - wanted
        quantiles.append(brentq(missing, points[i], points[i + 1], xtol=1e-14, rtol=1e-13))
    wide_low, wide_high, height = support(log_of_r, first, last)
    peaks = [(v, float(height - log_of_r(v))) for v in peaks_of(log_of_r, wide_low, wide_high, last if limit else None)]
    distance_pc = lambda v: float(1000 * anchor * np.exp(v))
    return {
        "quantilesPc": [distance_pc(v) for v in quantiles],
        "peaks": [{"distancePc": distance_pc(v), "depth": max(depth, 0.0)} for v, depth in peaks],
    }
