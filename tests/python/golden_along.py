"""The golden cases `rafter`, `lift-off` and `haunched-beam` through the typed way."""

from collections.abc import Iterator

from golden_layers import states

from beamcore import (
    Hinge, Material, Member, Part, Quantity, Response, Section, axial, partial, permanent, pin,
    plan, prestress, rectangle, roller, settlement, step, taper, temperature_difference, uniform,
    variable,
)
from beamcore.units import GPa, K, deg, kN, m, mm, rad

Found = Iterator[tuple[str, float]]


def rafter() -> Member:
    wood = Material("wood", 11*GPa, creep_factor=0.6)
    section = Section([Part("rafter", rectangle(80*mm, 220*mm), wood)])
    tendon = prestress(10*kN, draped=[(0*m, -50*mm), (5*m, "-50 mm")])
    return Member(
        section, 5*m, [pin("foot", 0*m, height=0*mm), roller("top", 5*m)],
        [
            permanent("roof", uniform(0.4*kN/m), axial(-6*kN, at=5*m, height=0*mm)),
            permanent("tendon", tendon),
            variable("snow", plan(1.5*kN/m), psi_0=0.5, psi_1=0.2, psi_2=0),
        ],
        pitch=20*deg,
    )


def of_rafter(response: Response) -> Found:
    for combination, time, at in states():
        greatest = response.axial(combination, time).greatest.value
        yield f"{at}.axial.greatest.value_N", greatest.si
        along = response.reaction(combination, time, "foot").along
        yield f'{at}.reactions["foot"].along_N', along.si


def lift_off() -> Member:
    wood = Material("wood", 11*GPa, creep_factor=0)
    section = Section([Part("beam", rectangle(100*mm, 240*mm), wood)])
    supports = [roller("post", 0*m, one_way=True), pin("middle", 3*m), roller("end", 8*m)]
    return Member(section, 8*m, supports, [
        permanent("weight", uniform(1.2*kN/m)),
        variable("load", partial(4*kN/m, 3*m, 8*m), psi_0=0.7, psi_1=0.5, psi_2=0),
    ])


def of_lift_off(response: Response) -> Found:
    for combination, time, at in states():
        yield f"{at}.steps", response.steps(combination, time)
        loaded = combination in ("characteristic", "fundamental")
        assert response.lifted(combination, time) == (("post",) if loaded else ())


def haunched_beam() -> Member:
    glulam = Material("glulam", 11.6*GPa, creep_factor=0.6)
    glulam = glulam.with_values(shear_modulus=0.65*GPa, thermal_expansion=5e-6/K)

    def section(height: Quantity, z: Quantity) -> Section:
        return Section([Part("beam", rectangle(140*mm, height), glulam).at(0*mm, z)])

    main, deep = section(360*mm, 0*mm), section(600*mm, -120*mm)
    supports = [pin("wall", 0*m, rotational_spring=4000*kN*m/rad),
                roller("column", 6*m, spring=8*kN/mm), roller("end", 10*m)]
    return Member(
        main, 10*m, supports,
        [
            permanent("load", uniform(4*kN/m)),
            permanent("sinking", settlement(supports[1], 5*mm)),
            variable("sun", temperature_difference(15*K), psi_0=0.6, psi_1=0.5, psi_2=0),
        ],
        shear="flexible", changes=[taper(4*m, 6*m, deep), step(6*m, main)],
        hinges=[Hinge.moment(8*m)],
    )


def of_haunched_beam(response: Response) -> Found:
    for combination, time, at in states():
        rotation = response.rotation(combination, time).greatest.value
        yield f"{at}.rotation.greatest.value_rad", rotation.si
