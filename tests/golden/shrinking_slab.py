"""The golden case shrinking-slab: free curvature of two layers in exact fractions, and its
restraint by the middle support from the force method."""

from fractions import Fraction as F

from write_expect import Case, Sums, mm


def shrinking_slab() -> Case:
    case = Case("shrinking-slab", """
Free strain of a section: EA eps0 = sum E int eps*, EI kappa = -sum E int z eps* (Timoshenko 1925, from
memory). Two equal spans L: the middle support gives R = 3 kappa EI/L against a free curvature kappa
(force method: kappa (2L)^2/8 = R (2L)^3/(48 EI)), and 5 q L/4 under a uniform load.""")
    length, q = F(4), F(1000)
    strain, bow = F(-3, 10_000), F(5, 10_000)
    joist = (F(11_000_000_000), mm(120), mm(240), F(0))
    slab = (F(31_000_000_000), mm(500), mm(60), mm(150))
    for time, softs in [("initial", (F(1), F(1))), ("final", (F(8, 5), F(3)))]:
        parts = [(e / s, b, h, z) for (e, b, h, z), s in zip((joist, slab), softs)]
        sums = Sums(parts)
        e, b, h, z = parts[1]
        area, second = b * h, b * h**3 / 12
        eps0 = e * area * strain / sums.ea
        kappa = -e * (area * strain * (z - sums.z) - bow * second) / sums.ei
        middle = 3 * kappa * sums.ei / length
        at = f'combinations["permanent"].{time}'
        case.exact(f"section.{time}.bending_stiffness_yy_Nm2", sums.ei)
        case.exact(f'{at}.reactions["middle"].force_N', 5 * q * length / 4 + middle)
        end = 3 * q * length / 8 - middle / 2
        case.exact(f'{at}.reactions["left"].force_N', end, q * length)
        moments = [F(0), end * length - q * length**2 / 2]
        if 0 < end / q < length:
            moments.append(end**2 / (2 * q))
        case.exact(f"{at}.moment.minimum.value_Nm", min(moments), max(map(abs, moments)))
        for i, name in enumerate(["joist", "slab"]):
            e, b, h, z = parts[i]
            stresses = []
            for edge in (z - h / 2, z + h / 2):
                own = strain - bow * (edge - z) if name == "slab" else F(0)
                for m in moments:
                    plane = eps0 - (kappa + m / sums.ei) * (edge - sums.z)
                    stresses.append(e * (plane - own))
            peak = max(map(abs, stresses))
            case.exact(f'{at}.stresses["{name}"].tension.value_Pa', max(stresses), peak)
            case.exact(f'{at}.stresses["{name}"].compression.value_Pa', min(stresses), peak)
    case.fields(["left", "middle", "right"], ["joist", "slab"])
    return case
