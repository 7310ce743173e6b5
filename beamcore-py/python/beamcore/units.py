"""Units to multiply numbers with: ``225 * mm``, ``6.5 * kN / m``, ``8e6 * mm**4``."""

from beamcore._units import *
from beamcore._units import __all__ as __all__
