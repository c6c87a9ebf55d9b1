"""Inputs and cases shared by the two priors that end at a limit."""

import random

import numpy as np

from posterior import summarise


def inputs(seed):
    """Limits far beyond the likelihood, across it, and well before it; negative and empty parallaxes."""
    yield from [(130.23, 0.36, 1000), (10, 1, 200), (10, 1, 95), (10, 1, 50), (5, 1, 1000), (4, 1, 600), (1, 1, 5000)]
    yield from [(-0.4, 0.9, 8000), (0, 1, 1000), (0, 0.01, 100), (-30, 1, 500), (20, 5, 700), (100, 0.001, 1000)]
    chance = random.Random(seed)
    for _ in range(120):
        parallax = 10 ** chance.uniform(-2, 3)
        yield parallax, parallax * 10 ** chance.uniform(-5, 1.5), 1000 / parallax * 10 ** chance.uniform(-0.5, 2)
    for _ in range(40):
        parallax = 10 ** chance.uniform(-1, 2)
        error = parallax * 10 ** chance.uniform(-4, -0.7)
        yield parallax, error, 1000 / (parallax + error * chance.uniform(-3, 3))
    for _ in range(40):
        yield -(10 ** chance.uniform(-2, 1.5)), 10 ** chance.uniform(-1.5, 1), 10 ** chance.uniform(1, 4)


def cases(name, power, seed):
    for parallax, error, limit_pc in inputs(seed):
        limit = limit_pc / 1000
        log_in_r = lambda r: power * np.log(r) - (parallax - 1 / r) ** 2 / (2 * error**2)
        nearest = min(1 / (max(parallax, 0) + 60 * error), limit) / 1e9
        summary = summarise(log_in_r, nearest, None, limit)
        yield {
            "parallaxMas": parallax, "errorMas": error, "prior": {"name": name, "limitPc": limit_pc},
            **summary,
        }
