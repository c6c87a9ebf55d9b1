"""Posteriors with a uniform distance up to a limit: the parallax's likelihood alone."""

import numpy as np
import scipy

from limited import cases
from table import emit

emit(__file__, cases("uniform-distance", 0, 8), np, scipy)
