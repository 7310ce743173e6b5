"""The golden cases sandwich-panel and bimetal-strip, in exact fractions.

Shear stiffness by energy, EI^2/int ES(z)^2/(b G) dz (e.g. Gere and Goodno, Mechanics of Materials, from
memory), the integrand a polynomial of degree four in each layer. Free strain of two strips: Timoshenko
1925, J. Opt. Soc. Am. 11, 233 (from memory).
"""

from fractions import Fraction as F

from write_expect import Case, Sums, mm

GPA = F(10**9)


def shear_stiffness(parts: list[tuple[F, F, F, F]], moduli: list[F]) -> F:
    """kGA of rectangles (E, b, h, z) on each other from the lowest upward, with their G."""
    sums = Sums(parts)
    static, total = F(0), F(0)
    for (e, b, h, z), g in zip(parts, moduli):
        # ES of all below z is static + E b ((z - zn)^2 - (z0 - zn)^2)/2, with t = z - z0.
        start = z - h / 2 - sums.z
        c = [static, e * b * start, e * b / 2]
        square = [sum(c[i] * c[k - i] for i in range(3) if 0 <= k - i < 3) for k in range(5)]
        total += sum(term * h ** (k + 1) / (k + 1) for k, term in enumerate(square)) / (b * g)
        static = sum(term * h**k for k, term in enumerate(c))
    assert static == 0
    return sums.ei**2 / total


def sandwich_panel() -> Case:
    case = Case("sandwich-panel", """
Shear coefficient by energy (sandwich_strips.py); w = 5 q L^4/(384 EI) + q L^2/(8 kGA). Rounded values of an independent
script, per mm of width: EI 5.8900e7 N mm2, kGA 210.2 N, w 3.537 + 2.379 mm.""")
    face, core = (70 * GPA, F(1), mm(1)), (GPA / 100, F(1), mm(40))
    parts = [(*face, mm(F(1, 2))), (*core, mm(21)), (*face, mm(F(83, 2)))]
    kga = shear_stiffness(parts, [26 * GPA, GPA / 200, 26 * GPA])
    sums, q, length = Sums(parts), F(1000), F(2)
    bent, slid = 5 * q * length**4 / (384 * sums.ei), q * length**2 / (8 * kga)
    for time in ["initial", "final"]:
        case.exact(f"section.{time}.bending_stiffness_yy_Nm2", sums.ei)
        case.add(f"section.{time}.shear_stiffness_N", kga, "1e-11")
        at = f'combinations["permanent"].{time}'
        case.add(f"{at}.deflection.greatest.value_m", bent + slid, "1e-11")
        case.exact(f"{at}.deflection.greatest.at_m", F(1))
        # The rotation of the section is that of a beam without shear; the slope has V/kGA besides.
        turned = q * length**3 / (24 * sums.ei)
        case.exact(f"{at}.rotation.maximum.value_rad", turned)
        case.add(f"{at}.slope.maximum.value_rad", turned + q * length / (2 * kga), "1e-11")
        stress = 70 * GPA * q * length**2 / 8 * mm(21) / sums.ei
        case.exact(f'{at}.stresses["lower face"].tension.value_Pa', stress)
    at = 'combinations["quasi-permanent"].initial'
    case.add(f"{at}.deflection.greatest.value_m", (3.537 + 2.379) / 1000, "2e-4")
    case.fields(["left", "right"], ["lower face", "core", "upper face"])
    return case


def bimetal_strip() -> Case:
    case = Case("bimetal-strip", """
Free strain of a section: EA eps0 = sum E int eps*, EI kappa = -sum E int z eps*; w = kappa L^2/8 (Timoshenko 1925, from
memory). Rounded value of an independent script: 4.3797e-4 /mm for 80 K.""")
    length, warm = F(1, 5), F(80)
    strips = [(70 * GPA, mm(10), mm(2), F(0), F(23, 10**6)), (210 * GPA, mm(10), mm(1), mm(F(3, 2)), F(12, 10**6))]
    sums = Sums([strip[:4] for strip in strips])
    eps0 = sum(e * b * h * a * warm for e, b, h, _, a in strips) / sums.ea
    kappa = -sum(e * b * h * a * warm * (z - sums.z) for e, b, h, z, a in strips) / sums.ei
    for time in ["initial", "final"]:
        at = f'combinations["permanent"].{time}'
        case.exact(f"{at}.deflection.greatest.value_m", kappa * length**2 / 8)
        case.exact(f"{at}.slope.maximum.value_rad", kappa * length / 2)
        for name, (e, _, h, z, a) in zip(["aluminium", "steel"], strips):
            edges = [e * (eps0 - kappa * (edge - sums.z) - a * warm) for edge in (z - h / 2, z + h / 2)]
            peak = max(map(abs, edges))
            case.exact(f'{at}.stresses["{name}"].tension.value_Pa', max(edges), peak)
            case.exact(f'{at}.stresses["{name}"].compression.value_Pa', min(edges), peak)
    case.add('combinations["quasi-permanent"].initial.deflection.greatest.value_m',
             0.43797 * float(length) ** 2 / 8, "2e-5")
    case.fields(["left", "right"], ["aluminium", "steel"])
    return case
