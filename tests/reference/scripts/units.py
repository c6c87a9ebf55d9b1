"""Lengths and angles in other units, by astropy.units."""

import itertools
import random

import astropy
from astropy import units as u

from table import emit

LENGTHS = {"pc": u.pc, "ly": u.lyr, "au": u.au, "km": u.km, "m": u.m, "kpc": u.kpc, "Mpc": u.Mpc}
ANGLES = {"deg": u.deg, "arcmin": u.arcmin, "arcsec": u.arcsec, "mas": u.mas, "uas": u.uas, "rad": u.rad}


def cases():
    chance = random.Random(1)
    for what, units in (("length", LENGTHS), ("angle", ANGLES)):
        for start, end in itertools.product(units, units):
            values = [1.0, 10 ** chance.uniform(-9, 9), -(10 ** chance.uniform(-3, 3))]
            for value in values:
                answer = (value * units[start]).to_value(units[end])
                yield {"what": what, "value": value, "from": start, "to": end, "expected": answer}


emit(__file__, cases(), astropy)
