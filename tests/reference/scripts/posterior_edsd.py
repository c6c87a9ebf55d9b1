"""Posteriors with an exponentially decreasing space density: r^2 exp(-r/L) times the parallax's likelihood."""

import random

import numpy as np
import scipy

from posterior import summarise
from table import emit


def inputs():
    yield from [(130.23, 0.36, 1350), (10, 1, 1350), (5, 1, 1350), (1, 1, 1350), (-0.4, 0.9, 1350), (0.5, 1, 500)]
    # Two peaks: the error times the length exceeds parallax over error.
    yield from [(20, 5, 1350), (12, 3, 1350), (18, 4, 1350), (15, 3, 1500), (25, 5, 1350), (30, 8, 500), (10, 2.5, 2000)]
    yield from [(0, 1, 1350), (0, 0.001, 10), (100, 0.001, 1350), (1000, 0.01, 1350), (0.01, 10, 100), (-50, 1, 1350)]
    chance = random.Random(6)
    for _ in range(150):
        parallax = 10 ** chance.uniform(-2, 3)
        yield parallax, parallax * 10 ** chance.uniform(-5, 1.5), 10 ** chance.uniform(1, 4.5)
    for _ in range(40):
        yield -(10 ** chance.uniform(-2, 1.5)), 10 ** chance.uniform(-1.5, 1), 10 ** chance.uniform(1, 4)
    for _ in range(40):
        error = 10 ** chance.uniform(0, 1)
        yield error * chance.uniform(3.2, 6), error, 1000 * chance.uniform(4, 40) / error


def cases():
    for parallax, error, length in inputs():
        scale = length / 1000
        log_in_r = lambda r: 2 * np.log(r) - r / scale - (parallax - 1 / r) ** 2 / (2 * error**2)
        nearest = 1 / (max(parallax, 0) + 40 * error + (1 / (error**2 * scale)) ** (1 / 3) / 1e3) / 100
        nearest = min(nearest, scale / 100)
        summary = summarise(log_in_r, nearest, 200 * max(scale, 1 / error))
        yield {
            "parallaxMas": parallax, "errorMas": error, "prior": {"name": "edsd", "lengthPc": length},
            **summary,
        }


emit(__file__, cases(), np, scipy)
