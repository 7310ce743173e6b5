"""The golden case angle-forces: unsymmetric bending in exact fractions."""

from fractions import Fraction as F

from odd_section import points, polygon
from write_expect import Case


def angle_forces() -> Case:
    case = Case("angle-forces", """
sigma = N/A - ((M_y I_zz - M_z I_yz) z + (M_z I_yy - M_y I_yz) y)/D, D = I_yy I_zz - I_yz^2 (Gere and Goodno,
unsymmetric bending, from memory), exact fractions. Values of an independent script for M_y = 2 kNm:
inner corner of the toe -103.08, heel +78.13 MPa.""")
    # Placed by the middle of its box: the heel stands at (-50, -50) mm.
    shape = polygon(points((-50, -50), (50, -50), (50, -40), (-40, -40), (-40, 50), (-50, 50)))
    d = shape.iyy * shape.izz - shape.iyz**2
    for name, n, m_y, m_z in [("sagging", F(0), F(2000), F(0)),
                              ("all three", F(12000), F(-1500), F(800))]:
        def stress(corner):
            y, z = corner[0] - shape.y, corner[1] - shape.z
            bending = (m_y * shape.izz - m_z * shape.iyz) * z + (m_z * shape.iyy - m_y * shape.iyz) * y
            return n / shape.area - bending / d

        ranked = sorted(shape.corners, key=stress)
        peak = max(abs(stress(ranked[0])), abs(stress(ranked[-1])))
        for time in ["initial", "final"]:
            at = f'section.forces["{name}"].{time}["angle"]'
            for word, corner in [("greatest", ranked[-1]), ("least", ranked[0])]:
                case.exact(f"{at}.{word}.value_Pa", stress(corner), peak)
                case.exact(f"{at}.{word}.y_m", corner[0], F(1, 20))
                case.exact(f"{at}.{word}.z_m", corner[1], F(1, 20))
        if name == "sagging":
            assert abs(float(stress(ranked[0])) + 103.08e6) < 5e3
            assert abs(float(stress(ranked[-1])) - 78.13e6) < 5e3
    case.fields(["left", "right"], ["angle"])
    return case
