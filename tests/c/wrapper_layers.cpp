// The C++ wrapper: layers, joints, members of layers and what they give, simplified methods.
#include <beamcore.hpp>

#include "checks.h"

using namespace beamcore;
using namespace beamcore::literals;

static const Material wood("wood", 11_GPa, 0.0), stone("stone", 31_GPa, 0.0);

// A slab of 600 x 70 mm on a joist of 100 x 220 mm.
static Section slab_on_joist(const Joint &joint) {
    const Part joist = Part{"joist", rectangle(100_mm, 220_mm), wood}.at(0_mm, 110_mm);
    return Section::layered({joist, Part{"slab", rectangle(600_mm, 70_mm), stone}.above(joist)},
                            {Layer{"joist", {"joist"}}, Layer{"slab", {"slab"}}}, {joint});
}

static Joint screws() {
    return Joint::slipping("screws", "joist", "slab", Fasteners{10_kN_per_mm, 2, 1, 150_mm});
}

static void layers_and_joints() {
    const Layer plates = Layer{"plates", {"left", "right"}}.between(0.8_m, 4.2_m);
    CHECK(plates.name() == "plates");
    CHECK(plates.parts() == (std::vector<std::string>{"left", "right"}));
    CHECK(plates.extent().value().from == 0.8_m && plates.extent()->to == 4.2_m);
    CHECK(!Layer("one", {"part"}).extent().has_value());
    const Joint joint = screws()
                            .gap(20_mm)
                            .transverse(SlipModulus::from_N_per_mm2(30))
                            .clearance(0.5_mm)
                            .creep(1.2);
    CHECK(joint.name() == "screws" && joint.lower() == "joist" && joint.upper() == "slab");
    CHECK(joint.kind() == JointKind::slipping && joint.stated_gap() == 20_mm);
    CHECK(joint.transverse_modulus() == SlipModulus::from_N_per_mm2(30));
    CHECK(joint.given_clearance() == 0.5_mm && joint.given_creep() == 1.2);
    CHECK(!screws().given_creep().has_value());
    CHECK(Joint::loose("x", "a", "b").kind() == JointKind::loose);
    try {
        Joint::rigid(std::string("a\0b", 3), "joist", "slab");
        CHECK(!"a name with a NUL was accepted");
    } catch (const UsageError &error) {
        CHECK(error.path() == "name");
    }
}

static void sections() {
    const Section section = slab_on_joist(screws().creep(1.2).clearance(0.5_mm));
    CHECK(section.layers().size() == 2 && section.layers()[1].name() == "slab");
    CHECK(section.joints().size() == 1 && section.joints()[0].name() == "screws");
    CHECK(section.merged_layers().size() == 2);
    const PlacedJoint joint = section.joint("screws");
    CHECK(joint.distance() == 0_mm && near(joint.z().to_mm(), 220.0));
    CHECK(near(joint.width().to_mm(), 100.0) && joint.creep() == 1.2);
    CHECK(joint.creep_basis() == "creep factor of the joint as given");
    CHECK(joint.clearance() == 0.5_mm && joint.places().empty());
    CHECK(near(joint.slip_modulus_at(1_m, Time::final)->to_N_per_mm2(), 400.0 / 3.0 / 2.2));
    CHECK(!joint.transverse_modulus_at(1_m, Time::initial).has_value());
    const Section glued = slab_on_joist(Joint::rigid("glue", "joist", "slab"));
    CHECK(glued.merged_layers() == (std::vector<std::vector<std::string>>{{"joist", "slab"}}));
    CHECK(!glued.joint("glue").slip_modulus_at(1_m, Time::initial).has_value());
    const std::vector<Band> bands{{0_m, 1.5_m, 100_mm}, {4.5_m, 6_m, 100_mm}};
    const Section banded = slab_on_joist(
        Joint::slipping("screws", "joist", "slab", Fasteners{10_kN_per_mm, 1, 1, bands}));
    CHECK(banded.joint("screws").places().size() == 4);
    CHECK(banded.joint("screws").slip_modulus_at(3_m, Time::initial) == SlipModulus::from_si(0.0));
    const Glue glue{Modulus::from_MPa(2), 100_mm, 4_mm};
    const Section soft = slab_on_joist(Joint::slipping("glue", "joist", "slab", glue));
    CHECK(near(soft.joint("glue").slip_modulus_at(1_m, Time::initial)->to_N_per_mm2(), 50.0));
    try {
        section.joint("nails");
        CHECK(!"a joint that is not there was found");
    } catch (const LookupError &error) {
        CHECK(error.path() == "joint");
    }
    const Material birch = Material("birch", 14_GPa, 0.0).shear_modulus(0.7_GPa);
    const Section low{Part{"web", rectangle(100_mm, 200_mm), birch}};
    const Section high{Part{"web", rectangle(100_mm, 300_mm), birch}};
    CHECK(near(low.shear_stiffness(Time::initial).to_kN(), 5.0 / 6.0 * 700.0 * 20.0));
    CHECK(near(low.fastened_shear_stiffness(Time::initial).to_kN(), 5.0 / 6.0 * 700.0 * 20.0));
    CHECK(near(low.between(high, 0.5).part_edges("web").area.to_mm2(), 25000.0));
    CHECK(shear_stiffness_definition().find("5/6") != std::string::npos);
}

// The numbers of tests/c/slips.c.
static void responses() {
    const Section section =
        slab_on_joist(Joint::slipping("screws", "joist", "slab", SlipModulus::from_si(1e9 / 7.5)));
    const Response response = Member::simple_span(section, 6_m)
                                  .anchor({"plate", "screws", 0_m})
                                  .anchor({"notch", "screws", 6_m, 20_kN_per_mm})
                                  .action(permanent("load").uniform(3_kN_per_m))
                                  .check()
                                  .solve();
    const char *pm = "permanent";
    const JointResponse joint = response.joint(pm, Time::initial, "screws");
    CHECK(within(joint.slip.value(0_m).to_mm(), 0.0, 1e-12));
    const Length slip = joint.slip.value(6_m);
    CHECK(near(response.anchor_force(pm, Time::initial, "notch").to_N(), 2e7 * slip.to_m()));
    CHECK(near(joint.flow.value(6_m).to_N_per_m(), slip.to_m() * 1e9 / 7.5));
    CHECK(joint.pressure.value(3_m) > 0_kN_per_m && joint.pressure.value(3_m) < 3_kN_per_m);
    const LayerForces lower = response.layer(pm, Time::initial, "joist");
    const LayerForces upper = response.layer(pm, Time::initial, "slab");
    CHECK(near(lower.axial.value(3_m).to_N(), -upper.axial.value(3_m).to_N()));
    CHECK(near(lower.moment.value(3_m).to_N_m() + upper.moment.value(3_m).to_N_m() +
                   0.145 * lower.axial.value(3_m).to_N(),
               13500.0));
    const CompositeAction action = response.composite_action(pm, Time::initial);
    CHECK(action.rigid < action.deflection && action.deflection < action.loose);
    CHECK(action.degree > 0.9 && action.degree < 1.0 && action.effective_stiffness > 0_N_m2);
    CHECK(response.layer_deflection(pm, Time::initial, "slab").greatest().value ==
          action.deflection);
    CHECK(response.steps(pm, Time::initial) == 1 && response.lifted(pm, Time::initial).empty());
    CHECK(response.axial(pm, Time::initial).greatest().value == 0_kN);
    try {
        response.joint(pm, Time::initial, "nails");
        CHECK(!"a joint that is not there was found");
    } catch (const InputError &error) {
        CHECK(error.kind() == Kind::name && error.path() == "joint");
    }
}

// A force on a slab that slips freely goes to the support that holds it.
static void a_layer_that_is_held() {
    const Section section = slab_on_joist(Joint::loose("paper", "joist", "slab"));
    const Response response = Member::of_length(section, 6_m)
                                  .support(Support::pin("left", 0_m))
                                  .support(Support::roller("right", 6_m).holding("slab", 255_mm))
                                  .action(permanent("load").axial(5_kN, 2_m, 255_mm).on("slab"))
                                  .check()
                                  .solve();
    const Force held = response.layer_reaction("permanent", Time::initial, "right", "slab");
    CHECK(near(held.to_kN(), -5.0));
    CHECK(response.reaction("permanent", Time::initial, "right").along == held);
}

static void a_method_beside_the_exact_solution() {
    const Section section =
        slab_on_joist(Joint::slipping("screws", "joist", "slab", SlipModulus::from_si(1e9 / 7.5)));
    const Member member = Member::simple_span(section, 6_m)
                              .action(permanent("load").uniform(3_kN_per_m))
                              .check();
    CHECK(!member.has_deflections_of_layers() && !member.has_axial_force());
    CHECK(member.entered_layer() == "slab");
    const std::vector<SimplifiedSpan> spans =
        member.solve().simplified("permanent", Time::initial, SimplifiedMethod::gamma);
    const SimplifiedSpan &span = spans.at(0);
    CHECK(spans.size() == 1 && span.span == "left to right" && span.length == 6_m);
    CHECK(span.factors.size() == 2 && within(span.factors[1], 0.27195, 5e-6));
    CHECK(within(span.bending_stiffness.to_N_m2(), 4.53009e6, 5.0) && !span.leaves_out_strains);
    CHECK(within(span.deflection.value.to_mm(), 11.175, 5e-4));
    CHECK(within(span.exact_deflection.value.to_mm(), 11.139, 5e-4) && span.difference > 0.0);
    CHECK(span.joints.size() == 1 && span.joints[0].joint == "screws");
    CHECK(within(std::fabs(span.joints[0].flow.value.to_N_per_mm()), 41.41, 5e-3));
    CHECK(within(std::fabs(span.joints[0].exact_flow.value.to_N_per_mm()), 36.27, 5e-3));
    CHECK(span.layers.size() == 2 && span.layers[1].layer == "slab");
    CHECK(within(span.layers[1].axial.to_MPa(), -1.479, 5e-4));
    CHECK(within(span.layers[1].exact_axial.to_N(), -62906.0, 0.5));
    CHECK(span.warnings.size() == 1);
}

static void simplified_methods() {
    const std::vector<LayerInput> layers{
        LayerInput::rectangle(11_GPa, 100_mm, 220_mm, 110_mm),
        LayerInput::rectangle(31_GPa, 600_mm, 70_mm, 255_mm)};
    const std::vector<SlipModulus> joints{SlipModulus::from_N_per_mm2(133.333)};
    const Gamma gamma(layers, joints, ReferenceLength::span(6_m));
    CHECK(gamma.base_layer() == 0 && gamma.factors()[0] == 1.0);
    CHECK(within(gamma.factors()[1], 0.27195, 5e-6));
    CHECK(within(gamma.arms()[0].to_mm(), -86.132, 5e-4));
    CHECK(within(gamma.bending_stiffness().to_N_m2(), 4.53009e6, 5.0));
    CHECK(within(gamma.stresses(13.5_kN_m)[1].axial.to_MPa(), -1.479, 5e-4));
    CHECK(gamma.axial_forces(13.5_kN_m)[0] > 0_kN);
    const ShearFlow flow = gamma.flows(9_kN)[0];
    CHECK(within(flow.to_N_per_mm(), 41.41, 5e-3));
    CHECK(near(gamma.fastener_forces(9_kN, {75_mm})[0].to_N(), flow.to_N_per_mm() * 75.0));
    CHECK(gamma.shear_stresses(9_kN).size() == 2 && gamma.warnings().size() == 1);
    const SineLayers sine(layers, joints, ReferenceLength::cantilever(3_m));
    CHECK(near(sine.bending_stiffness().si(), gamma.bending_stiffness().si()));
    CHECK(sine.warnings().size() == 2);
    CHECK(near(ReferenceLength::continuous(5_m).length().to_m(), 4.0));
    const EffectiveSpacing spacing = effective_spacing(100_mm, 400_mm);
    CHECK(near(spacing.spacing.to_mm(), 175.0) && spacing.warnings.size() == 1);
    try {
        Gamma(layers, {}, ReferenceLength::span(6_m));
        CHECK(!"two layers without a joint were accepted");
    } catch (const InputError &error) {
        CHECK(error.path() == "joints");
    }
}

int main() {
    layers_and_joints();
    sections();
    responses();
    a_layer_that_is_held();
    a_method_beside_the_exact_solution();
    simplified_methods();
    return finish();
}
