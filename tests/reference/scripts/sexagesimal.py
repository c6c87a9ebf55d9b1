"""Right ascensions and declinations as people write them, read by astropy.coordinates.Angle."""

import random

import astropy
from astropy import units as u
from astropy.coordinates import Angle

from table import emit

RA_FORMS = ["{0:02d} {1:02d} {2}", "{0:02d}:{1:02d}:{2}", "{0}h{1}m{2}s", "{0:02d}h {1:02d}m {2}s", "{0} {1}.{3}", "{0}h{1}m"]
DEC_FORMS = [
    "{s}{0:02d} {1:02d} {2}", "{s}{0:02d}:{1:02d}:{2}", "{s}{0}d{1}m{2}s", "{s}{0}°{1}′{2}″", "{s}{0}°{1:02d}'{2}\"",
    "{s}{0} {1}.{3}", "{s}{0}°{1}′",
]
RA_NAMED = [
    "00 00 00", "00:00:00.0", "23 59 59.9999", "12 00 00", "0h0m0s", "23h59m59.999999s", "0.0", "359.999999", "269.45207696",
    "17h57m48.49803s", "5.25h", "269°27′7.477″", "83d38m", "00 00 00.0001",
]
DEC_NAMED = [
    "-00 30 00", "-00:00:01", "-00 00 00.001", "+00 30 00", "00 30 00", "-0d30m", "-0°0′30″", "−00 30 00", "-0.5", "90", "-90",
    "+90 00 00", "-89 59 59.999", "4.69336497", "+04 41 36.2072", "-0 30", "+12d",
]


def read(text, kind):
    """A bare number, and parts led by a degree mark, are degrees; a right ascension's other parts are hours."""
    text = text.replace("−", "-")
    degrees = kind == "dec" or not any(mark in text for mark in "h: ") or any(mark in text for mark in "d°")
    return Angle(text, unit=u.deg if degrees else u.hourangle).to_value(u.deg)


def texts():
    for text in RA_NAMED:
        yield "ra", text
    for text in DEC_NAMED:
        yield "dec", text
    chance = random.Random(4)

    def seconds():
        places = chance.randint(0, 6)
        return f"{chance.randint(0, 59):02d}" + (f".{chance.randint(0, 10**places - 1):0{places}d}" if places else "")

    for turn in range(120):
        yield "ra", RA_FORMS[turn % len(RA_FORMS)].format(
            chance.randint(0, 23), chance.randint(0, 59), seconds(), chance.randint(0, 999)
        )
        yield "dec", DEC_FORMS[turn % len(DEC_FORMS)].format(
            chance.randint(0, 89) if turn % 4 else 0, chance.randint(0, 59), seconds(), chance.randint(0, 999),
            s=chance.choice("+-−") if turn % 5 else "-",
        )


emit(__file__, ({"kind": kind, "text": text, "expectedDeg": read(text, kind)} for kind, text in texts()), astropy)
