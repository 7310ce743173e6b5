// The C++ wrapper: every class.
#include <beamcore.hpp>

#include "checks.h"
#include "jobs.h"

using namespace beamcore;
using namespace beamcore::literals;

static void materials() {
    const Material c24 = timber("C24", ServiceClass::two);
    CHECK(c24.modulus_at(Time::initial) == 11_GPa);
    CHECK(near(c24.modulus_at(Time::final).to_GPa(), 11.0 / 1.8));
    CHECK(c24.named("joists").name() == "joists" && c24.name() == "C24");
    CHECK(near(concrete("C30/37", 2.0).modulus_at(Time::final).to_GPa(), 11.0));
    const ConcreteCreep creep{38_MPa, 50.0, 150_mm, 28_d, 18250_d, Cement::n};
    const double phi =
        concrete("C30/37", creep).modulus_at(Time::initial).si() /
            concrete("C30/37", creep).modulus_at(Time::final).si() - 1.0;
    CHECK(std::fabs(phi - 2.4542) < 1e-4);
    CHECK(bc_abi_version(nullptr) == BC_ERROR_NULL && !version().empty());
}

static void sections() {
    const Part plate{"plate", rectangle(10_mm, 200_mm), steel("S275")};
    const Material c24 = timber("C24", ServiceClass::one);
    const Part left{"left", rectangle(40_mm, 200_mm), c24};
    const Section section{left.left_of(plate), plate,
                          Part{"right", rectangle(40_mm, 200_mm), c24}.right_of("plate")};
    const Stiffness stiffness = section.stiffness(Time::initial);
    const double i_over_b = 0.2 * 0.2 * 0.2 / 12.0;
    CHECK(near(stiffness.bending_yy.to_N_m2(), (11e9 * 0.08 + 210e9 * 0.01) * i_over_b));
    CHECK(near(stiffness.axial.to_N(), (11e9 * 0.08 + 210e9 * 0.01) * 0.2));
    CHECK(std::fabs(stiffness.centroid_y.to_m()) < 1e-15 && stiffness.centroid_z == 0_m);
    CHECK(stiffness.bending_zz > 0_N_m2 && stiffness.bending_yz == 0_N_m2);
    CHECK(section.part_share(Time::final, "plate").modulus == 210_GPa);
    CHECK(section.part_edges("right").area == 0.04_m * 0.2_m);
    CHECK(near(section.part_edges("right").left.to_mm(), 5.0));
    CHECK(near(section.line_mass().value().si(), 7850.0 * 0.002 + 420.0 * 0.016));
    const TransformedSection steel_section = section.transformed_to("S275", Time::initial);
    CHECK(steel_section.reference_modulus() == 210_GPa && steel_section.centroid_z() == 0_m);
    CHECK(near(steel_section.second_moment().si() * 210e9, stiffness.bending_yy.si()));
    CHECK(near(steel_section.area().si() * 210e9, stiffness.axial.si()));
    CHECK(near(steel_section.part("left").ratio, 11.0 / 210.0));
    CHECK(near(steel_section.part("left").width.to_mm(), 40.0 * 11.0 / 210.0));
    const double edge = -210e9 * 1e3 * 0.1 / stiffness.bending_yy.si();
    CHECK(near(steel_section.stress("plate", 100_mm, 1_kN_m).si(), edge));

    CHECK(section.notes().empty());
    const Section apart{left, Part{"far", rectangle(1_mm, 1_mm), c24}.at(1_m, 0_m)};
    CHECK(apart.notes().size() == 1 && apart.notes()[0].find("\"far\"") != std::string::npos);
}

static Response solved() {
    const Part joist{"joist", rectangle(100_mm, 200_mm),
                     timber("C24", ServiceClass::one).timber_strength(14_MPa, 8_MPa, 12_MPa)};
    const Member member = Member::of_length(Section{joist}, 4_m)
                              .support(Support::pin("left", 0_m))
                              .support(Support::roller("right", 4_m))
                              .action(permanent("floor").point(6_kN, 1_m))
                              .check();
    CHECK(member.length() == 4_m && member.notes().empty());
    CHECK(member.combinations().size() == 5 && member.combinations()[1].name == "quasi-permanent");
    return member.solve(); // The member may go; the response keeps what it needs.
}

static void responses() {
    const Response response = solved();
    const Field<Moment> moment = response.moment("permanent", Time::initial);
    CHECK(near(moment.greatest().value.to_kN_m(), 6.0 * 1.0 * 3.0 / 4.0));
    CHECK(moment.greatest().at == 1_m && moment.maximum().at == 1_m);
    CHECK(std::fabs(moment.minimum().value.to_N_m()) < 1e-9);
    CHECK(near(moment.value(2_m).to_kN_m(), 3.0));
    const Sides<Force> shear = response.shear("permanent", Time::initial).sides(1_m);
    CHECK(near(shear.left.to_kN(), 4.5) && near(shear.right.to_kN(), -1.5));
    const auto values = moment.values_si({0.5, 1.0}, Side::left);
    CHECK(values.size() == 2 && near(values[0], 2250.0) && near(values[1], 4500.0));
    CHECK(response.slope("permanent", Time::initial).value(0_m) > Angle::from_rad(0.0));
    CHECK(near(response.reaction("permanent", Time::initial, "left").force.to_kN(), 4.5));

    const PartStress stress = response.stress("permanent", Time::initial, "joist");
    const double edge = 4500.0 * 0.1 * 12.0 / (0.1 * 0.008);
    CHECK(near(stress.greatest_tension().value.si(), edge));
    CHECK(near(stress.greatest_compression().z.to_mm(), 100.0));
    CHECK(near(stress.bottom().value(1_m).si(), edge) && near(stress.top().value(1_m).si(), -edge));
    CHECK(stress.centroid().value(1_m) == 0_Pa);
    const auto used = response.utilisation("fundamental", Time::initial, "joist");
    CHECK(used.has_value() && near(used->value, 1.35 * edge / 14e6) && used->at == 1_m);
    CHECK(response.stations().size() == 3 && response.stations()[1] == 1_m);
    CHECK(response.residual() < 1e-12);

    const Camber camber = response.camber(
        {Shape::parabola, "quasi-permanent", Time::final, 1.0, "left", "right", 5_mm,
         Rounding::down, 0_m, 4});
    CHECK(camber.rise() <= camber.target() && camber.target() - camber.rise() < 5_mm);
    CHECK(camber.chord().from == 0_m && camber.chord().to == 4_m);
    CHECK(camber.ordinates().size() == 5 && camber.ordinates()[2].ordinate == camber.rise());
    CHECK(camber.ordinates()[1].station == 1_m);
    CHECK(camber.ordinate(2_m) == camber.rise());
}

// A roof with an overhang to the left, under snow and wind.
static Member roof() {
    const Part beam{"beam", rectangle(100_mm, 200_mm), timber("C24", ServiceClass::one)};
    const Action snow = variable("snow", Category::snow).area(2_kN_per_m2, 1.5_m);
    const Action wind = variable("wind", combination_factors(category_of_name("wind")))
                            .area(-1_kN_per_m2, 1.5_m, 1_m, 5_m)
                            .favourable();
    CHECK(wind.is_favourable() && !snow.is_favourable());
    return Member::of_length(Section{beam}, 5_m)
        .support(Support::pin("left", 1_m))
        .support(Support::roller("right", 5_m))
        .action(permanent("roof").trapezoidal(1_kN_per_m, 2_kN_per_m, 0_m, 5_m).couple(1_kN_m, 5_m))
        .action(snow)
        .action(wind)
        .partial_factors({1.2, 0.9, 1.6})
        .combination({"collapse", {{"snow", 2.0}}, true})
        .check();
}

static void combinations_and_spans() {
    const Member member = roof();
    const auto combinations = member.combinations();
    CHECK(combinations.size() == 6 && combinations[4].name == "fundamental");
    CHECK(combinations[4].kind == CombinationKind::fundamental && combinations[4].is_ultimate);
    CHECK((combinations[4].factors == std::vector<double>{1.2, 1.6, 0.0}));
    CHECK(combinations[5].kind == CombinationKind::own_ultimate);
    CHECK((combinations[5].factors == std::vector<double>{0.0, 2.0, 0.0}));
    CHECK(member.partial_factors().permanent_favourable == 0.9);
    const auto spans = member.spans();
    CHECK(spans.size() == 2 && spans[0].name == "before left" && spans[0].is_cantilever);
    CHECK(spans[1].from == 1_m && spans[1].length() == 4_m);
    CHECK(!member.span("left to right").is_cantilever);

    // The whole of it stands on its supports: 5 (1 + 2)/2 kN of the roof, 3 kN/m of snow.
    const Response response = member.solve();
    const auto force = [&](const char *support) {
        return response.reaction("characteristic", Time::initial, support).force.to_kN();
    };
    CHECK(near(force("left") + force("right"), 7.5 + 15.0));
}

static void limits() {
    const Response response = roof().solve();
    const Camber camber =
        response.camber({Shape::arc_through_middle, "permanent", Time::final, 1.0, "left", "right",
                         1_mm, Rounding::up, 1_mm, 4});
    CHECK(camber.shape() == Shape::arc_through_middle);
    const double rise = camber.rise().to_m();
    CHECK(near(camber.radius().value().to_m(), (4.0 + rise * rise) / (2.0 * rise)));
    CHECK(!response
               .camber({Shape::mirror, "permanent", Time::final, 1.0, "left", "right", 1_mm,
                        Rounding::up, 1_mm, 4})
               .radius()
               .has_value());

    const std::string span = "left to right";
    const auto total = response.deflection_component(Component::total, "characteristic", span);
    const auto sag = response.span_deflection("characteristic", Time::final, span);
    CHECK(near(total.greatest().value.si(), sag.value(total.greatest().at).si()));
    const auto left = response.remaining("characteristic", Time::final, camber);
    const auto remaining =
        response.deflection_component(Component::remaining, "characteristic", span, camber);
    CHECK(near(left.value(3_m).si(), remaining.value(3_m).si()));
    // An arc is taken off as polynomials, which follow it to some nanometres.
    CHECK(std::fabs(left.value(3_m).si() - (sag.value(3_m).si() - rise)) < 1e-9);

    const auto checks = response.check_limits({Limit::span_over(Component::total, 200.0)});
    CHECK(checks.size() == 2 && checks[0].span == "before left" && checks[1].span == span);
    CHECK(checks[1].component == Component::total && checks[1].combination == "characteristic");
    CHECK(checks[1].allowed == 20_mm && checks[1].found.value == total.greatest().value);
    CHECK(near(checks[1].utilisation, std::fabs(total.greatest().value.to_mm()) / 20.0));
    const auto readings = response.readings(camber, {1_m, 5_m, {"beam"}});
    CHECK(readings.size() == 5 && readings[2].lying == camber.ordinates()[2].ordinate);
    CHECK(readings[1].station == 1_m && readings[2].standing < readings[2].lying);
}

static void jobs() {
    const Job job = Job::read(JOB, Format::toml);
    const Outcome outcome = Job::read(job.text(Format::json), Format::json).solve();
    const double sag =
        outcome.number("combinations[\"permanent\"].initial.deflection.greatest.value_m");
    CHECK(near(sag, 5.0 * 2e3 * 256.0 / (384.0 * 11e9 * 0.1 * 0.008 / 12.0)));
    CHECK(outcome.text("beamcore") == version());
    CHECK(outcome.json().front() == '{' && outcome.summary().find("joist") != std::string::npos);
    CHECK(Job::schema().find("$schema") != std::string::npos);
    CHECK(Outcome::schema().find("$schema") != std::string::npos);
}

int main() {
    try {
        materials();
        sections();
        responses();
        combinations_and_spans();
        limits();
        jobs();
    } catch (const Error &error) {
        std::fprintf(stderr, "%s\n", error.what());
        return EXIT_FAILURE;
    }
    return finish();
}
