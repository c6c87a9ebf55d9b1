"""Star colours: B-V to temperature (Ballesteros 2012), and a black body on a screen, two ways.

fitted: Planck's law through the observer's published fit (Wyman, Sloan & Shirley 2013), by adaptive quadrature.
tabulated: the same through the observer's table itself (CIE 15:2004, 5 nm, 380-780 nm) by Simpson's rule.
The matrix to sRGB is worked out from the primaries and white of IEC 61966-2-1. Nothing is clipped twice: negative
channels are held at zero and the largest channel is one.
"""

import random

import numpy as np
import scipy
from scipy.constants import c, h, k
from scipy.integrate import quad, simpson

from table import emit

# x-bar, y-bar, z-bar from 380 nm every 5 nm, in millionths.
CIE_1931 = np.array([int(word) for word in """
1368 39 6450   2236 64 10550   4243 120 20050   7650 217 36210   14310 396 67850
23190 640 110200   43510 1210 207400   77630 2180 371300   134380 4000 645600   214770 7300 1039050
283900 11600 1385600   328500 16840 1622960   348280 23000 1747060   348060 29800 1782600   336200 38000 1772110
318700 48000 1744100   290800 60000 1669200   251100 73900 1528100   195360 90980 1287640   142100 112600 1041900
95640 139020 812950   57950 169300 616200   32010 208020 465180   14700 258600 353300   4900 323000 272000
2400 407300 212300   9300 503000 158200   29100 608200 111700   63270 710000 78250   109600 793200 57250
165500 862000 42160   225750 914850 29840   290400 954000 20300   359700 980300 13400   433450 994950 8750
512050 1000000 5750   594500 995000 3900   678400 978600 2750   762100 952000 2100   842500 915400 1800
916300 870000 1650   978600 816300 1400   1026300 757000 1100   1056700 694900 1000   1062200 631000 800
1045600 566800 600   1002600 503000 340   938400 441200 240   854450 381000 190   751400 321000 100
642400 265000 50   541900 217000 30   447900 175000 20   360800 138200 10   283500 107000 0
218700 81600 0   164900 61000 0   121200 44580 0   87400 32000 0   63600 23200 0
46770 17000 0   32900 11920 0   22700 8210 0   15840 5723 0   11359 4102 0
8111 2929 0   5790 2091 0   4109 1484 0   2899 1047 0   2049 740 0
1440 520 0   1000 361 0   690 249 0   476 172 0   332 120 0
235 85 0   166 60 0   117 42 0   83 30 0   59 21 0
42 15 0
""".split()]).reshape(-1, 3) / 1e6
LOBES = [
    [(1.056, 599.8, 37.9, 31.0), (0.362, 442.0, 16.0, 26.7), (-0.065, 501.1, 20.4, 26.2)],
    [(0.821, 568.8, 46.9, 40.5), (0.286, 530.9, 16.3, 31.1)],
    [(1.217, 437.0, 11.8, 36.0), (0.681, 459.0, 26.0, 13.8)],
]
CENTRES = sorted(centre for lobes in LOBES for _, centre, _, _ in lobes)


def to_srgb():
    columns = np.array([(x / y, 1, (1 - x - y) / y) for x, y in ((0.64, 0.33), (0.30, 0.60), (0.15, 0.06))]).T
    white = np.array([0.3127 / 0.3290, 1, (1 - 0.3127 - 0.3290) / 0.3290])
    return np.linalg.inv(columns * np.linalg.solve(columns, white))


def radiance(nm, kelvin):
    return (nm / 555) ** -5 / np.expm1(h * c / (nm * 1e-9 * k * kelvin)) * np.expm1(h * c / (555e-9 * k * kelvin))


def fit(lobes, nm):
    return sum(height * np.exp(-(((nm - at) / np.where(nm < at, blue, red)) ** 2) / 2) for height, at, blue, red in lobes)


def shown(xyz):
    rgb = np.maximum(0, to_srgb() @ xyz)
    return list(rgb / rgb.max())


def fitted(kelvin):
    def channel(lobes):
        return quad(
            lambda nm: float(fit(lobes, nm)) * radiance(nm, kelvin), 360, 830, points=CENTRES, epsabs=0, epsrel=1e-9, limit=200
        )[0]

    return shown([channel(lobes) for lobes in LOBES])


def tabulated(kelvin):
    nm = np.arange(380, 781, 5)
    return shown([simpson(bar * radiance(nm, kelvin), x=nm) for bar in CIE_1931.T])


def cases():
    chance = random.Random(9)
    for bv in [0.65, 0.656, 0, -0.4, 2, -0.3] + [chance.uniform(-0.5, 2.5) for _ in range(220)]:
        yield {"what": "temperature", "bv": bv, "kelvin": 4600 * (1 / (0.92 * bv + 1.7) + 1 / (0.92 * bv + 0.62))}
    for kelvin in [1000, 1900, 2856, 5778, 6504, 10000, 40000, 1e6] + [10 ** chance.uniform(3, 5) for _ in range(220)]:
        yield {"what": "colour", "kelvin": kelvin, "fitted": fitted(kelvin), "tabulated": tabulated(kelvin)}


emit(__file__, cases(), np, scipy)
