"""A door lintel of two timber joists with a steel plate between them: how far does it sink?"""

from beamcore import Member, Part, Section, permanent, rectangle, self_weight, steel, timber
from beamcore import uniform
from beamcore.units import kN, m, mm

c24, s235 = timber("C24", service_class=1), steel("S235")
plate = Part("plate", rectangle(8*mm, 180*mm), s235)
left = Part("left joist", rectangle(47*mm, 195*mm), c24).left_of(plate)
right = Part("right joist", rectangle(47*mm, 195*mm), c24).right_of(plate)

wall = permanent("wall above", self_weight(), uniform(4.5*kN/m))
lintel = Member.simple_span(Section([left, plate, right]), 3.6*m, actions=[wall])

greatest = lintel.solve().deflection("quasi-permanent", "final").greatest
print(f"deflection {greatest.value.to(mm):.2f} mm at {greatest.at.to(m):.2f} m")
