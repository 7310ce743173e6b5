// The C++ wrapper: supports, changes of section, hinges, shear, pitch and the loads that go with
// them. Formulas are those of tests/c/shapes.c and imposed.c.
#include <beamcore.hpp>

#include "checks.h"

using namespace beamcore;
using namespace beamcore::literals;

static const char *const PM = "permanent";
static const Material steel_like = Material("steel", 200_GPa, 0.0)
                                       .shear_modulus(80_GPa)
                                       .thermal_expansion(ThermalExpansion::from_per_K(12e-6));
static const double EI = 200e9 * 0.1 * 0.2 * 0.2 * 0.2 / 12.0;

static Section bar(Length height = 200_mm) {
    return Section{Part{"bar", rectangle(100_mm, height), steel_like}};
}

static double deflection(const Response &response, Length at) {
    return response.deflection(PM, Time::initial).value(at).to_m();
}

static void supports() {
    const Support post = Support::roller("post", 1.5_m)
                             .spring(SpringStiffness::from_kN_per_m(1000))
                             .axial_spring(SpringStiffness::from_kN_per_m(2000))
                             .rotational_spring(3000_kN_m_per_rad)
                             .one_way()
                             .at_height(-100_mm)
                             .under({"joist"})
                             .holding("slab", 255_mm);
    CHECK(post.name() == "post" && post.kind() == SupportKind::roller && post.at() == 1.5_m);
    CHECK(post.given_spring() == SpringStiffness::from_kN_per_m(1000));
    CHECK(post.given_axial_spring() == SpringStiffness::from_kN_per_m(2000));
    CHECK(post.given_rotational_spring() == 3000_kN_m_per_rad);
    CHECK(post.is_one_way() && post.given_height() == -100_mm);
    CHECK(post.layers() == std::vector<std::string>{"joist"});
    CHECK(post.held_layers().size() == 1 && post.held_layers()[0].layer == "slab");
    CHECK(post.held_layers()[0].height == 255_mm);
    const Support plain = Support::pin("left", 0_m);
    CHECK(!plain.given_spring().has_value() && !plain.is_one_way() && plain.layers().empty());
}

// What a member tells of itself.
static void members() {
    const Member member = Member::of_length(bar(), 4_m)
                              .support(Support::fixed("wall", 0_m))
                              .support(Support::roller("right", 4_m))
                              .taper(1_m, 2_m, bar(300_mm))
                              .step(3_m, bar(250_mm))
                              .hinge(Hinge::moment(3.5_m))
                              .pitch(0.25_rad)
                              .shear(ShearModel::flexible())
                              .action(permanent("load").uniform(1_kN_per_m))
                              .check();
    CHECK(member.supports().size() == 2 && member.supports()[1].name() == "right");
    CHECK(member.parts() == std::vector<std::string>{"bar"});
    CHECK(member.changes().size() == 2 && member.changes()[0].kind == ChangeKind::taper);
    CHECK(member.changes()[0].from == 1_m && member.changes()[0].to == 2_m);
    CHECK(member.changes()[1].kind == ChangeKind::step && member.changes()[1].from == 3_m);
    CHECK(near(member.section_at(1.5_m).part_edges("bar").top.to_mm(), 125.0));
    CHECK(member.hinges().size() == 1 && member.hinges()[0].kind == HingeKind::moment);
    CHECK(member.hinges()[0].at == 3.5_m && !member.hinges()[0].layer.has_value());
    CHECK(member.pitch() == 0.25_rad && member.shear_model().is_flexible());
    CHECK(!member.shear_model().stiffness().has_value() && member.anchors().empty());
}

static void layers_of_hinges() {
    const Part lower{"lower", rectangle(100_mm, 100_mm), steel_like};
    const Section section = Section::layered(
        {lower, Part{"upper", rectangle(100_mm, 100_mm), steel_like}.above(lower)},
        {Layer{"lower", {"lower"}}, Layer{"upper", {"upper"}}},
        {Joint::slipping("bolts", "lower", "upper", SlipModulus::from_N_per_mm2(50))
             .transverse(SlipModulus::from_N_per_mm2(100))});
    const Member member = Member::simple_span(section, 4_m)
                              .hinge(Hinge::butt("lower", 1_m))
                              .hinge(Hinge::moment_of("upper", 2_m))
                              .anchor({"plate", "bolts", 0_m})
                              .action(permanent("load").uniform(1_kN_per_m).on("upper"))
                              .check();
    CHECK(member.hinges()[0].kind == HingeKind::butt && member.hinges()[0].layer == "lower");
    CHECK(member.hinges()[1].kind == HingeKind::moment && member.hinges()[1].layer == "upper");
    CHECK(member.anchors()[0].name == "plate" && member.anchors()[0].joint == "bolts");
    CHECK(member.anchors()[0].at == 0_m && !member.anchors()[0].stiffness.has_value());
    CHECK(within(member.solve().layer(PM, Time::initial, "lower").axial.value(1_m).to_N(), 0.0,
                 1e-6));
}

static void springs_and_shear() {
    const Action tip = permanent("load").point(5_kN, 4_m);
    const Response sprung =
        Member::of_length(bar(), 4_m)
            .support(Support::fixed("wall", 0_m)
                         .spring(SpringStiffness::from_N_per_m(1e6))
                         .rotational_spring(RotationalStiffness::from_N_m_per_rad(4e6)))
            .action(tip)
            .check()
            .solve();
    CHECK(near(deflection(sprung, 4_m),
               5e3 / 1e6 + 5e3 * 16.0 / 4e6 + 5e3 * 64.0 / (3.0 * EI)));
    CHECK(near(sprung.rotation(PM, Time::initial).value(0_m).to_rad(), 5e3 * 4.0 / 4e6));
    CHECK(near(sprung.curvature(PM, Time::initial).value(0_m).to_per_m(), -5e3 * 4.0 / EI));
    const MemberPlan span = Member::simple_span(bar(), 4_m).action(
        permanent("load").uniform(5_kN_per_m));
    const double kga = 5.0 / 6.0 * 80e9 * 0.02;
    const double w = 5.0 * 5e3 * 256.0 / (384.0 * EI) + 5e3 * 16.0 / (8.0 * kga);
    const Member given = span.shear(ShearModel::given(ShearStiffness::from_N(kga))).check();
    CHECK(near(deflection(given.solve(), 2_m), w));
    CHECK(given.shear_model().stiffness() == ShearStiffness::from_N(kga));
    CHECK(near(deflection(span.shear(ShearModel::flexible()).check().solve(), 2_m), w));
    CHECK(span.shear(ShearModel::rigid()).check().shear_model().is_rigid());
    const Response sheared = Member::of_length(bar(), 4_m)
                                 .support(Support::fixed("wall", 0_m))
                                 .support(Support::roller("right", 4_m))
                                 .hinge(Hinge::shear(1_m))
                                 .action(permanent("load").point(5_kN, 0.5_m))
                                 .check()
                                 .solve();
    CHECK(near(sheared.reaction(PM, Time::initial, "wall").force.to_kN(), 5.0));
}

static void lift_off() {
    const Response response = Member::of_length(bar(), 4_m)
                                  .support(Support::pin("left", 0_m).one_way())
                                  .support(Support::pin("middle", 1_m))
                                  .support(Support::roller("right", 3_m))
                                  .action(permanent("load").point(5_kN, 2_m))
                                  .check()
                                  .solve();
    CHECK(response.lifted(PM, Time::initial) == std::vector<std::string>{"left"});
    CHECK(response.steps(PM, Time::initial) >= 1);
}

// The greatest deflection of a simple span of 4 m under an action.
static double middle(const Action &action) {
    const Response response = Member::simple_span(bar(), 4_m).action(action).check().solve();
    return deflection(response, 2_m);
}

static void loads() {
    const double up = 12e-6 * 30.0 * 16.0 / (8.0 * 0.2);
    CHECK(near(middle(permanent("g").temperature_difference(30_K)), -up));
    const Curvature curvature = Curvature::from_per_m(12e-6 * 30.0 / 0.2);
    const InitialStrain strain{Strain::from_permille(0.1), curvature};
    CHECK(near(middle(permanent("g").free_strain("bar", strain)), up));
    const Draped straight{{{0_m, -60_mm}, {4_m, -60_mm}}};
    CHECK(near(middle(permanent("g").prestress(200_kN, straight)), -12e3 * 16.0 / (8.0 * EI)));
    const Parabolic curved{{{{0_m, 0_mm}, {2_m, -60_mm}, {4_m, 0_mm}}}};
    CHECK(near(middle(permanent("g").prestress(200_kN, curved)),
               -5.0 * 12e3 * 16.0 / (48.0 * EI)));

    const auto roof = [](const Action &action) {
        return Member::simple_span(bar(), 4_m).pitch(0.5_rad).action(action).check().solve();
    };
    const auto right = [](const Response &response) {
        return response.reaction(PM, Time::initial, "right").force.to_kN();
    };
    CHECK(near(right(roof(permanent("g").plan(1.5_kN_per_m))), 3.0 * std::cos(0.5)));
    CHECK(near(right(roof(permanent("g").plan(1.5_kN_per_m, 0_m, 2_m))), 0.75 * std::cos(0.5)));
    const Response pulled = Member::simple_span(bar(), 4_m)
                                .action(permanent("g").axial(3_kN, 4_m, 0_m))
                                .check()
                                .solve();
    CHECK(near(pulled.reaction(PM, Time::initial, "left").along.to_kN(), -3.0));
    CHECK(near(pulled.axial(PM, Time::initial).value(1_m).to_kN(), 3.0));

    const auto held = [](Support left, Support right, const Action &action) {
        return Member::of_length(bar(), 4_m).support(left).support(right).action(action).check()
            .solve();
    };
    const Response turned = held(Support::fixed("left", 0_m), Support::roller("right", 4_m),
                                 permanent("g").imposed_rotation("left", Angle::from_mrad(2.0)));
    CHECK(near(turned.reaction(PM, Time::initial, "left").couple.to_N_m(), 3.0 * EI * 0.002 / 4.0));
    // The end of a cantilever's prop sinks: 3 EI s/L^3.
    const Response sunk = held(Support::fixed("left", 0_m), Support::roller("right", 4_m),
                               permanent("g").settlement("right", 10_mm));
    CHECK(near(sunk.reaction(PM, Time::initial, "right").force.to_N(), -3.0 * EI * 0.01 / 64.0));
    for (const std::vector<std::string> &parts : {std::vector<std::string>{}, {"bar"}}) {
        const Response warm = held(Support::pin("left", 0_m), Support::pin("right", 4_m),
                                   permanent("g").temperature(30_K, parts));
        CHECK(near(warm.axial(PM, Time::initial).value(1_m).to_N(), -200e9 * 0.02 * 12e-6 * 30.0));
    }
    CHECK(permanent("g").on("slab").layer() == "slab" && !permanent("g").layer().has_value());
}

int main() {
    supports();
    members();
    layers_of_hinges();
    springs_and_shear();
    lift_off();
    loads();
    return finish();
}
