"""Writes a table of reference cases: its maker, the versions of the libraries it came from, and the cases.

Each script prints its table; with --write it replaces the committed one (../tables/<name>.json).
"""

import json
import math
import pathlib
import platform
import sys

TABLES = pathlib.Path(__file__).resolve().parent.parent / "tables"


def versions(*modules):
    found = {"python": platform.python_version()}
    found.update({module.__name__: module.__version__ for module in modules})
    return found


def plain(value):
    """Python floats in full (repr gives every double back); infinities as words, which JSON has no numbers for."""
    if isinstance(value, dict):
        return {key: plain(item) for key, item in value.items()}
    if isinstance(value, (list, tuple)):
        return [plain(item) for item in value]
    if isinstance(value, (str, bool, int)) or value is None:
        return value
    number = float(value)
    if math.isnan(number):
        raise ValueError("a reference is never NaN")
    return number if math.isfinite(number) else ("Infinity" if number > 0 else "-Infinity")


def emit(script, cases, *modules):
    name = pathlib.Path(script).stem
    rows = ",\n".join("  " + json.dumps(plain(case)) for case in cases)
    head = json.dumps({"script": f"{name}.py", "versions": versions(*modules)})[:-1]
    text = f'{head}, "cases": [\n{rows}\n]}}\n'
    if "--write" in sys.argv:
        (TABLES / f"{name}.json").write_text(text)
    else:
        sys.stdout.write(text)
