// The exceptions of the C++ wrapper: their classes, and that they carry the core's own words.
#include <beamcore.hpp>

#include "checks.h"
#include "jobs.h"

#include <functional>

using namespace beamcore;
using namespace beamcore::literals;

// Whether a call throws exactly the class E, with a first problem of a kind at a path.
template <class E> static bool throws(const std::function<void()> &call, Kind kind,
                                      const std::string &path) {
    try {
        call();
    } catch (const E &error) {
        const bool right = error.kind() == kind && error.path() == path &&
                           std::string(error.what()).find(path) != std::string::npos;
        if (!right) {
            std::fprintf(stderr, "    %s\n", error.what());
        }
        return right;
    } catch (const Error &error) {
        std::fprintf(stderr, "    another class: %s\n", error.what());
        return false;
    }
    std::fprintf(stderr, "    nothing was thrown\n");
    return false;
}

static const Material &c24() {
    static const Material material = timber("C24", ServiceClass::one);
    return material;
}

static Part joist() { return Part{"joist", rectangle(100_mm, 200_mm), c24()}; }

static void classes() {
    CHECK(throws<InputError>([] { steel("S1"); }, Kind::name, "class"));
    CHECK(throws<InputError>([] { Section{Part{"a", rectangle(-1_mm, 1_mm), c24()}}; },
                             Kind::value, "section.parts[\"a\"].outline.rectangle.width"));
    CHECK(throws<InputError>([] { Section(std::vector<Part>{}); }, Kind::missing,
                             "section.parts"));
    CHECK(throws<InputError>([] { Member::simple_span(Section{joist()}, 4_m).check(); },
                             Kind::missing, "actions"));
    CHECK(throws<InputError>(
        [] {
            Member::of_length(Section{joist()}, 4_m)
                .support(Support::pin("left", 0_m))
                .action(permanent("floor").uniform(1_kN_per_m))
                .check();
        },
        Kind::mechanism, "member.supports"));
    CHECK(throws<FileError>([] { Job::open("no such file.toml"); }, Kind::file,
                            "no such file.toml"));
    CHECK(throws<UsageError>([] { steel("S\xff"); }, Kind::utf8, "class_name"));
    CHECK(throws<UsageError>([] { steel(std::string("S275\0x", 6)); }, Kind::utf8, "class_name"));
    CHECK(throws<UsageError>([] { c24().modulus_at(static_cast<Time>(9)); }, Kind::choice, "time"));

    const Response response = Member::simple_span(Section{joist()}, 4_m)
                                  .action(permanent("floor").uniform(1_kN_per_m))
                                  .check()
                                  .solve();
    CHECK(throws<LookupError>([&] { response.deflection("snow", Time::final); }, Kind::lookup,
                              "combination"));
    CHECK(throws<LookupError>([&] { response.stress("permanent", Time::final, "x"); },
                              Kind::lookup, "part"));
    CHECK(throws<InputError>([&] { response.deflection("permanent", Time::final).value(5_m); },
                             Kind::position, "at"));
    CHECK(throws<UsageError>(
        [&] { response.deflection("permanent", Time::final).values_si({}); }, Kind::count,
        "count"));
    const Job heavy = Job::read(JOB_HEAD JOB_MATERIAL JOB_PART JOB_MEMBER JOB_ACTION("1e305 kN/m"),
                                Format::toml);
    try {
        heavy.solve();
        CHECK(!"a result beyond all numbers was accepted");
    } catch (const NumericalError &error) {
        CHECK(error.kind() == Kind::numerical);
    }
}

static void loads_and_limits() {
    CHECK(throws<InputError>([] { category_of_name("Z"); }, Kind::name, "category"));
    CHECK(throws<UsageError>([] { variable("snow", static_cast<Category>(13)); }, Kind::choice,
                             "category"));
    const MemberPlan plan = Member::simple_span(Section{joist()}, 4_m)
                                .action(permanent("floor").uniform(1_kN_per_m));
    CHECK(throws<InputError>(
        [&] { plan.combination({"own", {{"roof", 1.0}}, false}).check(); }, Kind::name,
        "combinations[\"own\"].factors[\"roof\"]"));
    CHECK(throws<LookupError>([&] { plan.check().span("right to left"); }, Kind::lookup, "span"));
    const Response response = plan.check().solve();
    CHECK(throws<InputError>(
        [&] { response.check_limits({Limit::value(Component::instant, -20_mm)}); }, Kind::value,
        "limits[0].value"));
    CHECK(throws<LookupError>(
        [&] { response.deflection_component(Component::total, "permanent", "x"); }, Kind::lookup,
        "span"));
    const Camber camber = response.camber({Shape::parabola, "permanent", Time::final, 1.0, "left",
                                           "right", 1_mm, Rounding::nearest, 0_m, 4});
    CHECK(throws<InputError>([&] { response.readings(camber, {0_m, 5_m, {"joist"}}); },
                             Kind::position, "camber.trestles.right"));
    CHECK(throws<LookupError>([&] { response.remaining("snow", Time::final, camber); },
                              Kind::lookup, "combination"));
}

static void all_problems() {
    try {
        Job::read(JOB_HEAD "colour = 1\n" JOB_MATERIAL JOB_PART JOB_MEMBER JOB_ACTION("2 kN"),
                  Format::toml);
        CHECK(!"a wrong job was accepted");
    } catch (const InputError &error) {
        CHECK(error.problems().size() == 2);
        const Problem &key = error.problems()[0], &unit = error.problems()[1];
        CHECK(key.kind == Kind::key && key.path == "colour" && key.line == 4);
        CHECK(unit.kind == Kind::unit && !unit.found.empty() && !unit.expected.empty());
        const std::string text = error.what();
        CHECK(text.find(key.expected) != std::string::npos);
        CHECK(text.find(unit.found) != std::string::npos);
    }
}

// A long message does not fit the first buffer of the wrapper.
static void a_long_message() {
    const std::string name(3000, 'x');
    try {
        steel(name);
        CHECK(!"a class of this name was found");
    } catch (const InputError &error) {
        CHECK(std::string(error.what()).find(name) != std::string::npos);
    }
    CHECK(c24().named(name).name() == name);
}

int main() {
    classes();
    loads_and_limits();
    all_problems();
    a_long_message();
    return finish();
}
