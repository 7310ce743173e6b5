"""The golden case slab-strip: creep of concrete by EN 1992-1-1:2004 Annex B (from memory)."""

from fractions import Fraction as F

from write_expect import Case, Sums, mm

GRAVITY = F("9.80665")


def creep_coefficient(f_cm: float, humidity: float, h0: float, t0: float, t: float) -> float:
    """phi(t, t0) for f_cm > 35 MPa and cement class N; MPa, percent, mm, days."""
    a1, a2, a3 = ((35 / f_cm) ** p for p in (0.7, 0.2, 0.5))
    phi_rh = (1 + (1 - humidity / 100) / (0.1 * h0 ** (1 / 3)) * a1) * a2
    b_h = min(1.5 * (1 + (0.012 * humidity) ** 18) * h0 + 250 * a3, 1500 * a3)
    growth = ((t - t0) / (b_h + t - t0)) ** 0.3
    return phi_rh * 16.8 / f_cm**0.5 / (0.1 + t0**0.2) * growth


def slab_strip() -> Case:
    case = Case("slab-strip", """
Transformed section with k_def 0.6 on the timber and phi by EN 1992-1-1:2004 Annex B on the
concrete (from memory), each with its own effective modulus; camber by the parabola
4 c x (L - x)/L^2.""")
    phi = creep_coefficient(38, 55, 140, 28, 18250)
    joist = (F(11_000_000_000), mm(100), mm(220), F(0), F(420))
    slab = (F(33_000_000_000), mm(600), mm(70), mm(145), F(2500))
    soft = {"initial": (F(1), F(1)), "final": (F(8, 5), 1 + F(phi))}
    sums = {}
    for time, factors in soft.items():
        sums[time] = Sums([(e / s, b, h, z) for (e, b, h, z, _), s in zip((joist, slab), factors)])
        case.exact(f"section.{time}.bending_stiffness_yy_Nm2", sums[time].ei)
        case.exact(f"section.{time}.axial_stiffness_N", sums[time].ea)
        case.exact(f"section.{time}.centroid_z_m", sums[time].z, mm(180))
        case.exact(f'section.parts["slab"].{time}.modulus_Pa', slab[0] / factors[1])
    length = F(27, 5)
    dead = sum((rho * b * h for _, b, h, _, rho in (joist, slab)), F(0)) * GRAVITY + 900
    live = F(1700)
    span = 5 * length**4 / 384
    lasting = dead + F(3, 10) * live
    for combination, load in [("quasi-permanent", lasting), ("characteristic", dead + live)]:
        final = span * ((load - lasting) / sums["initial"].ei + lasting / sums["final"].ei)
        at = f'combinations["{combination}"]'
        case.exact(f"{at}.initial.deflection.greatest.value_m", span * load / sums["initial"].ei)
        case.exact(f"{at}.final.deflection.greatest.value_m", final)
        # Stress at the bottom of the joist, from both shares of the load.
        m = length**2 / 8
        parts = [("initial", load - lasting, F(1)), ("final", lasting, F(8, 5))]
        stress = sum((q * m * joist[0] / s * (mm(110) + sums[time].z) / sums[time].ei
                      for time, q, s in parts), F(0))
        case.exact(f'{at}.final.stresses["joist"].tension.value_Pa', stress)
    target = span * lasting / sums["final"].ei
    rise = F(round(target * 1000), 1000)
    case.exact("camber.target_m", target)
    case.exact("camber.rise_m", rise)
    for i in range(7):
        ordinate = 4 * rise * i * (6 - i) / F(36)
        case.exact(f"camber.ordinates[{i}].station_m", length * i / 6, length)
        case.exact(f"camber.ordinates[{i}].ordinate_m", ordinate, rise)
    case.fields(["left", "right"], ["joist", "slab"])
    return case
