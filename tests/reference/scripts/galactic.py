"""ICRS to Galactic by ERFA's icrs2g (the fixed matrix of Hipparcos vol. 1, 1.5.3), XYZ from it, separations by seps."""

import math
import random

import erfa

from table import emit


def directions():
    """Named places first (poles, origin, wrap of longitude, the Galactic poles and centre), then evenly by chance."""
    yield from [(0, 0), (0, 90), (0, -90), (180, 0), (359.999999, 0), (360, 10), (269.45207696, 4.69336497)]
    for l, b in [(0, 0), (0, 90), (0, -90), (90, 0), (180, 0), (270, 0), (359.9999999, 0), (1e-9, 1e-9), (10, 89.9999)]:
        ra, dec = erfa.g2icrs(math.radians(l), math.radians(b))
        yield math.degrees(ra), math.degrees(dec)
    chance = random.Random(2)
    for _ in range(230):
        yield chance.uniform(0, 360), math.degrees(math.asin(chance.uniform(-1, 1)))


def cases():
    chance = random.Random(3)
    places = [(float(ra), float(dec)) for ra, dec in directions()]
    for at, (ra, dec) in enumerate(places):
        l, b = erfa.icrs2g(math.radians(ra), math.radians(dec))
        distance = 1000 / 548.31 if at == 6 else 10 ** chance.uniform(-1, 5)
        x, y, z = erfa.s2p(l, b, distance)
        near = at % 3 == 1
        other = (ra + chance.uniform(-1e-4, 1e-4), max(-90, min(90, dec + 1e-5))) if near else places[-1 - at]
        separation = erfa.seps(*(math.radians(angle) for angle in (ra, dec, *other)))
        yield {
            "raDeg": ra, "decDeg": dec, "lDeg": math.degrees(l) % 360, "bDeg": math.degrees(b),
            "distance": distance, "x": x, "y": y, "z": z,
            "otherRaDeg": other[0], "otherDecDeg": other[1], "separationDeg": math.degrees(separation),
        }


emit(__file__, cases(), erfa)
