"""Posteriors with a uniform space density up to a limit: r^2 times the parallax's likelihood."""

import numpy as np
import scipy

from limited import cases
from table import emit

emit(__file__, cases("uniform-density", 2, 7), np, scipy)
