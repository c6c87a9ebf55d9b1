"""Distances by inversion with their ranges, by astropy's parallax equivalency; regimes by exact decimal fractions."""

import random
from decimal import Decimal
from fractions import Fraction

import astropy
import numpy as np
import scipy
from astropy import units as u
from scipy.stats import norm

from table import emit


def measurements():
    """Decimal texts, as sources print them: the limits of the regimes are met exactly by some."""
    yield from [("130.23", "0.36"), ("10", "1"), ("5", "1"), ("1", "1"), ("-0.4", "0.9"), ("0.5", "1"), ("5.95", "0.85"),
                ("379.21", "1.58"), ("548.31", "0.5"), ("0", "0.1"), ("0.7", "0.07"), ("0.7", "0.14"), ("1e-5", "1e-6")]
    chance = random.Random(5)
    for _ in range(60):
        parallax = Decimal(chance.randint(1, 99999)) / 1000
        for ratio in ("0.1", "0.2"):
            yield str(parallax), str(parallax * Decimal(ratio))
    for _ in range(140):
        parallax = round(10 ** chance.uniform(-2, 3), 4)
        yield str(parallax), f"{parallax * 10 ** chance.uniform(-5, 0.5):.6g}"
    for _ in range(20):
        yield f"{-(10 ** chance.uniform(-2, 2)):.5g}", f"{10 ** chance.uniform(-2, 1):.4g}"


def regime(parallax, error):
    p, s = Fraction(Decimal(parallax)), Fraction(Decimal(error))
    if p <= 0 or s / p > Fraction(1, 5):
        return "prior-led"
    return "firm" if s / p <= Fraction(1, 10) else "wide"


def distance_pc(parallax_mas):
    return (parallax_mas * u.mas).to_value(u.pc, equivalencies=u.parallax()) if parallax_mas > 0 else float("inf")


def cases():
    for parallax, error in measurements():
        p, s = float(parallax), float(error)
        case = {"parallaxMas": p, "errorMas": s, "regime": regime(parallax, error), "pc": None, "ly": None, "au": None}
        if p > 0:
            ends = [p, p + s, p - s, p + norm.ppf(0.95) * s, p - norm.ppf(0.95) * s]
            case["pc"] = [distance_pc(end) for end in ends]
            case["ly"] = [(pc * u.pc).to_value(u.lyr) for pc in case["pc"]]
            case["au"] = [(pc * u.pc).to_value(u.au) for pc in case["pc"]]
        yield case


emit(__file__, cases(), astropy, np, scipy)
