// The C++ wrapper: materials at full width, outlines, places, stresses at points, sideways freedom,
// initial strains, transformed outlines.
#include <beamcore.hpp>

#include "checks.h"

using namespace beamcore;
using namespace beamcore::literals;

static void values_of_materials() {
    const Material c24 = timber("C24", ServiceClass::one);
    CHECK(c24.mean_density() == 420_kg_per_m3 && c24.density_05() == 350_kg_per_m3);
    CHECK(c24.modulus_05() == 7.4_GPa && !c24.poisson().has_value());
    CHECK(near(c24.shear_modulus_at(Time::final).value().to_MPa(), 690.0 / 1.6));
    CHECK(c24.creep_factor() == 0.6 && c24.creep_basis().find("k_def") != std::string::npos);
    CHECK(c24.origin().find("EN 338") != std::string::npos && c24.overrides().empty());
    const Material own = c24.modulus_override(12_GPa)
                             .fractile_modulus(8_GPa)
                             .shear_modulus(0.7_GPa)
                             .density(450_kg_per_m3)
                             .fractile_density(380_kg_per_m3)
                             .thermal_expansion(ThermalExpansion::from_per_K(4e-6))
                             .creep_override(0.9);
    CHECK(own.overrides().size() == 7 && own.overrides()[0] == "modulus 12 GPa instead of 11 GPa");
    CHECK(own.expansion() == ThermalExpansion::from_per_K(4e-6));
    CHECK(Material("own", 100_GPa, 0.0).poisson_ratio(0.25).shear_modulus_at(Time::initial) ==
          40_GPa);
    CHECK(aluminium("EN AW-6082 T6", 8_mm).modulus_at(Time::initial) == 70_GPa);
}

static void strengths() {
    const Material plate = steel_of_thickness("S275", 20_mm);
    CHECK(plate.strength(Strength::yield) == 265_MPa);
    CHECK(!plate.strength(Strength::design_yield).has_value());
    CHECK(plate.design_factors(MetalFactor{1.0}).strength(Strength::design_yield) == 265_MPa);
    const Material oak("oak", 9.5_GPa, 0.6);
    const TimberStrength strength{30_MPa, 18_MPa, 24_MPa, 4_MPa};
    const Material timber = oak.characteristic_strength(strength);
    CHECK(timber.strength(Strength::bending) == 30_MPa);
    CHECK(!timber.strength(Strength::tension_across).has_value());
    const Material designed = timber.design_factors(TimberFactors{0.8, 1.25, 1.1});
    CHECK(near(designed.strength(Strength::design_bending).value().to_MPa(), 21.12));
    CHECK(near(designed.strength(Strength::design_compression).value().to_MPa(), 15.36));
    const TimberStrength across{30_MPa, 18_MPa, 24_MPa, 4_MPa, AcrossGrain{0.6_MPa, 5_MPa}};
    CHECK(oak.characteristic_strength(across).strength(Strength::compression_across) == 5_MPa);
    const Material metal = oak.characteristic_strength(MetalStrength{200_MPa, 300_MPa});
    CHECK(metal.strength(Strength::ultimate) == 300_MPa);
    CHECK(!oak.characteristic_strength(MetalStrength{200_MPa}).strength(Strength::ultimate));
    CHECK(oak.shear_strength(2.5_MPa).strength(Strength::design_shear) == 2.5_MPa);
    try {
        Section{Part{"part", rectangle(100_mm, 200_mm), timber}};
        CHECK(!"strengths without factors were accepted");
    } catch (const InputError &error) {
        CHECK(error.path() == "materials[\"oak\"].design_factors");
    }
}

static void concretes() {
    CHECK(std::fabs(concrete_mean_modulus(33_MPa).to_MPa() - 31476.0) < 0.5);
    CHECK(concrete_strength_share(28_d, Cement::r) == 1.0);
    CHECK(concrete_modulus_at_age(33_GPa, 28_d, Cement::n) == 33_GPa);
    const ConcreteShrinkage slab{38_MPa, 50.0, 150_mm, 3_d, 50_year, Cement::n};
    CHECK(std::fabs(concrete_shrinkage(slab).to_permille() - 0.49) < 0.005);
    try {
        concrete_mean_modulus(-1_MPa);
        CHECK(!"a negative strength was accepted");
    } catch (const InputError &error) {
        CHECK(error.kind() == Kind::value && error.path() == "mean_strength");
    }
}

static void outlines() {
    const Material s275 = steel("S275");
    const auto area = [&](const Outline &outline) {
        return Section{Part{"part", outline, s275}}.part_edges("part").area.to_mm2();
    };
    CHECK(near(area(i_shape(300_mm, 100_mm, 10_mm, 200_mm, 20_mm, 8_mm)), 7160.0));
    CHECK(near(area(tee(200_mm, 150_mm, 20_mm, 12_mm)), 5160.0));
    CHECK(near(area(channel(100_mm, 40_mm, 8_mm, 6_mm)), 1144.0));
    CHECK(near(area(hollow_box(100_mm, 200_mm, 10_mm, 20_mm)), 7200.0));
    CHECK(near(area(ring(60_mm, 5_mm)) + area(disc(50_mm)), area(disc(60_mm))));
    const Outline square = polygon({{0_mm, 0_mm}, {90_mm, 0_mm}, {90_mm, 90_mm}, {0_mm, 90_mm}});
    const Outline holed = square.hole({{30_mm, 30_mm}, {60_mm, 30_mm}, {30_mm, 60_mm}});
    CHECK(near(area(square), 8100.0) && near(area(holed), 7650.0));
    CHECK(holed.name() == "polygon" && hollow_box(9_mm, 9_mm, 1_mm, 1_mm).name() == "box");
    try {
        disc(20_mm).hole({{0_mm, 0_mm}});
        CHECK(!"a disc was given a hole");
    } catch (const InputError &error) {
        CHECK(error.kind() == Kind::geometry && error.path() == "outline");
        CHECK(std::string(error.what()) == "outline: found disc; expected polygon");
    }

    const Part host{"host", rectangle(100_mm, 200_mm), s275};
    const Part block = Part{"block", rectangle(20_mm, 20_mm), s275}.at(60_mm, 50_mm);
    const Section section{host,
                          Part{"bar", disc(20_mm), s275}.set_into(host, 0_mm, -70_mm).line_mass(
                              3_kg_per_m),
                          block,
                          Part{"image", rectangle(20_mm, 20_mm), s275}.mirror_of(
                              block, MirrorAxis::upright)};
    CHECK(near(section.part_edges("image").left.to_mm(), -70.0));
    CHECK(section.part_edges("host").area < 0.1_m * 0.2_m);
}

// An equal angle: EI_yy = EI_zz, so its axes are turned by 45 degrees.
static void an_angle() {
    const Section section{Part{"leg", angle(100_mm, 100_mm, 10_mm), steel("S275")}};
    const Stiffness stiffness = section.stiffness(Time::initial);
    const Principal principal = section.principal(Time::initial);
    CHECK(near(principal.greater.si() + principal.smaller.si(), 2.0 * stiffness.bending_yy.si()));
    CHECK(near(principal.angle.to_rad(), std::atan(1.0)));
    const SectionForces forces{0_kN, 1_kN_m, 0_kN_m};
    const StressRange range =
        section.stress_extremes("leg", forces, Sideways::free, Time::initial);
    CHECK(range.greatest.value > 0_MPa && range.least.value < 0_MPa);
    CHECK(section.stress_at("leg", range.least.at, forces, Sideways::free, Time::initial) ==
          range.least.value);

    const MemberPlan plan = Member::simple_span(section, 2_m)
                                .action(permanent("load").uniform(2_kN_per_m));
    const Member held = plan.check(), free = plan.sideways(Sideways::free).check();
    CHECK(held.sideways() == Sideways::held && free.sideways() == Sideways::free);
    CHECK(held.solve().sideways("permanent", Time::initial).greatest().value == 0_m);
    const Response response = free.solve();
    const Field<Length> sideways = response.sideways("permanent", Time::initial);
    const double ratio = stiffness.bending_yz.si() / stiffness.bending_zz.si();
    const Length down = response.deflection("permanent", Time::initial).greatest().value;
    CHECK(near(sideways.greatest().value.si(), down.si() * ratio));
    CHECK(near(sideways.value(1_m).si(), down.si() * ratio));
    // q L^2/8 = 1 kN m.
    const StressExtreme extreme =
        response.stress("permanent", Time::initial, "leg").greatest_compression();
    CHECK(near(extreme.value.si(), range.least.value.si()));
    CHECK(extreme.y == range.least.at.y && extreme.z == range.least.at.z);
}

// Equal layers of one material, the lower one longer by d: kappa = 1.5 d/h. And what is kept with
// actions.
static void strains() {
    const Material wood("wood", 10_GPa, 0.0);
    const InitialStrain longer{Strain::from_permille(1.0)};
    const Section section{Part{"lower", rectangle(10_mm, 5_mm), wood}.initial_strain(longer),
                          Part{"upper", rectangle(10_mm, 5_mm), wood}.above("lower")};
    const StrainPlane plane = section.free_plane(Time::initial, Sideways::held);
    CHECK(std::fabs(plane.curvature_y.to_per_m() - 0.15) < 1e-12);
    CHECK(near(plane.axial.to_permille(), 0.5) && plane.curvature_z.to_per_m() == 0.0);
    CHECK(section.initial_strain("lower").axial == longer.axial);
    CHECK(section.initial_strain("upper").axial == Strain::from_si(0.0));

    const Action plain = permanent("load").uniform(1_N_per_m);
    CHECK(!plain.load_duration().has_value() && !plain.start().has_value());
    const Action late = plain.duration(LoadDuration::medium_term).starting(28_d);
    CHECK(late.load_duration() == LoadDuration::medium_term && late.start() == 28_d);
    try {
        Member::simple_span(section, 1_m).action(late).sideways(Sideways::free).check();
        CHECK(!"an initial strain in a member that is free sideways was accepted");
    } catch (const InputError &error) {
        CHECK(error.path() == "section.parts[\"lower\"].initial_strain");
    }
}

// The corners of a steel rectangle as if of timber.
static void transformed_outlines() {
    const Section section{Part{"plate", rectangle(10_mm, 200_mm), steel("S275")},
                          Part{"rod", ring(60_mm, 5_mm), steel("S275")}.right_of("plate"),
                          Part{"joist", rectangle(40_mm, 200_mm), timber("C24", ServiceClass::one)}
                              .left_of("plate")};
    const TransformedSection timbered = section.transformed_to("C24", Time::initial);
    const TransformedPart plate = timbered.part("plate");
    CHECK(plate.loops.size() == 1 && plate.loops[0].size() == 4);
    for (const Point &corner : plate.loops[0]) {
        CHECK(near(std::fabs(corner.y.to_mm()), 5.0 * 210.0 / 11.0));
        CHECK(near(std::fabs(corner.z.to_mm()), 100.0));
    }
    CHECK(timbered.part("rod").loops.size() == 2 && timbered.part("rod").loops[1].size() >= 30);
}

int main() {
    values_of_materials();
    strengths();
    concretes();
    outlines();
    an_angle();
    strains();
    transformed_outlines();
    return finish();
}
