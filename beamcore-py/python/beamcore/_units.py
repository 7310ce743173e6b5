# Generated from the units table of beamcore; do not edit.
"""Units to multiply numbers with: ``225 * mm``, ``6.5 * kN / m``, ``8e6 * mm**4``."""

from typing import Final

from beamcore._core import Unit

__all__ = [
    "m",
    "mm",
    "cm",
    "inch",
    "ft",
    "N",
    "kN",
    "MN",
    "lbf",
    "kip",
    "plf",
    "Pa",
    "kPa",
    "MPa",
    "psi",
    "ksi",
    "GPa",
    "psf",
    "permille",
    "rad",
    "mrad",
    "deg",
    "kg",
    "t",
    "lb",
    "s",
    "h",
    "day",
    "year",
    "K",
    "degF",
]

m: Final[Unit] = Unit("m")
mm: Final[Unit] = Unit("mm")
cm: Final[Unit] = Unit("cm")
inch: Final[Unit] = Unit("in")
ft: Final[Unit] = Unit("ft")
N: Final[Unit] = Unit("N")
kN: Final[Unit] = Unit("kN")
MN: Final[Unit] = Unit("MN")
lbf: Final[Unit] = Unit("lbf")
kip: Final[Unit] = Unit("kip")
plf: Final[Unit] = Unit("plf")
Pa: Final[Unit] = Unit("Pa")
kPa: Final[Unit] = Unit("kPa")
MPa: Final[Unit] = Unit("MPa")
psi: Final[Unit] = Unit("psi")
ksi: Final[Unit] = Unit("ksi")
GPa: Final[Unit] = Unit("GPa")
psf: Final[Unit] = Unit("psf")
permille: Final[Unit] = Unit("permille")
rad: Final[Unit] = Unit("rad")
mrad: Final[Unit] = Unit("mrad")
deg: Final[Unit] = Unit("deg")
kg: Final[Unit] = Unit("kg")
t: Final[Unit] = Unit("t")
lb: Final[Unit] = Unit("lb")
s: Final[Unit] = Unit("s")
h: Final[Unit] = Unit("h")
day: Final[Unit] = Unit("d")
year: Final[Unit] = Unit("year")
K: Final[Unit] = Unit("K")
degF: Final[Unit] = Unit("degF")
