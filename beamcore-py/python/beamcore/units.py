"""Units to multiply numbers with: ``225 * mm``, ``6.5 * kN / m``, ``12e-6 / K``."""

from beamcore._units import *

__all__ = [
    "m", "mm", "cm", "inch", "ft", "N", "kN", "MN", "lbf", "kip", "plf", "psf", "Pa", "kPa", "MPa",
    "psi", "ksi", "GPa", "permille", "rad", "mrad", "deg", "kg", "t", "lb", "s", "h", "day",
    "year", "K", "degF",
]
