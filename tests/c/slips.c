// Members of layers that slip: joints, layers, composite action, anchors, holds, fields.
#include "chain.h"

static const double L = 6.0, Q = 3e3, K = 1e9 / 7.5;
static const char *PM = "permanent";
static char text[1000];
static int64_t length;

static bc_joint *slipping(void) {
    bc_joint *joint = NULL;
    DONE(bc_joint_slipping("screws", "joist", "slab", K, &joint));
    return joint;
}

static bc_plan *floor_of(bc_joint *joint) {
    bc_section *section = slab_on_joist(joint);
    bc_plan *plan = NULL;
    DONE(bc_plan_simple_span(section, L, &plan));
    bc_section_free(section);
    return plan;
}

static bc_action *uniform(void) {
    bc_action *action = nothing();
    CHANGE(bc_action, action, bc_action_with_uniform(action, Q, &made));
    return action;
}

static bc_field *joint_field(const bc_response *r, int32_t which) {
    bc_field *field = NULL;
    DONE(bc_response_joint_field(r, which, PM, BC_TIME_INITIAL, "screws", &field));
    return field;
}

static bc_field *layer_field(const bc_response *r, int32_t which, const char *layer) {
    bc_field *field = NULL;
    DONE(bc_response_layer_field(r, which, PM, BC_TIME_INITIAL, layer, &field));
    return field;
}

// The value of a field at a place, which is freed.
static double at(bc_field *field, double x) {
    double value = NAN;
    DONE(bc_field_values(field, BC_SIDE_RIGHT, &x, 1, &value));
    bc_field_free(field);
    return value;
}

// The closed form for two layers of one modulus each: w'''' with slip, solved apart from this
// library to the digits given.
static void a_slab_on_a_joist(void) {
    bc_response *r = solved(floor_of(slipping()), uniform());
    double value, place;
    bc_field *field = NULL;
    DONE(bc_response_field(r, BC_FIELD_DEFLECTION, PM, BC_TIME_INITIAL, &field));
    DONE(bc_field_extreme(field, BC_EXTREME_GREATEST, &value, &place));
    CHECK(within(value, 11.139e-3, 5e-7) && near(place, 3.0));
    int32_t count = 0;
    DONE(bc_field_station_count(field, &count));
    CHECK(count == 2);
    DONE(bc_field_station(field, 1, &place));
    CHECK(place == L);
    bc_field_free(field);
    CHECK(within(at(layer_field(r, BC_LAYER_FIELD_AXIAL, "joist"), 3.0), 62906.0, 0.5));
    CHECK(within(at(layer_field(r, BC_LAYER_FIELD_AXIAL, "slab"), 3.0), -62906.0, 0.5));
    CHECK(within(at(joint_field(r, BC_JOINT_FIELD_FLOW), L), 36270.0, 5.0));
    CHECK(within(at(joint_field(r, BC_JOINT_FIELD_SLIP), L), 0.272e-3, 5e-7));
    // Moments and N d make up M.
    const double own = at(layer_field(r, BC_LAYER_FIELD_MOMENT, "joist"), 3.0) +
                       at(layer_field(r, BC_LAYER_FIELD_MOMENT, "slab"), 3.0);
    CHECK(near(own + 0.145 * at(layer_field(r, BC_LAYER_FIELD_AXIAL, "joist"), 3.0),
               Q * L * L / 8.0));
    CHECK(at(layer_field(r, BC_LAYER_FIELD_DEFLECTION, "slab"), 3.0) ==
          value_at(r, BC_FIELD_DEFLECTION, 3.0));
    CHECK(value_at(r, BC_FIELD_AXIAL, 3.0) == 0.0);
    // A load from above passes the joint but for what the slab bears in bending.
    const double pressure = at(joint_field(r, BC_JOINT_FIELD_PRESSURE), 3.0);
    CHECK(pressure > 0.0 && pressure < Q);

    double degree, ei, w, loose, rigid;
    DONE(bc_response_composite_action(r, PM, BC_TIME_INITIAL, &degree, &ei, &place, &w, &loose,
                                      &rigid));
    // EI0 1.50772e12 and EIinf 5.79829e12 N mm2.
    const double load = 5.0 * Q * L * L * L * L / 384.0;
    CHECK(within(load / loose, 1.50772e6, 5.0) && within(load / rigid, 5.79829e6, 5.0));
    CHECK(near(degree, (loose - w) / (loose - rigid)) && near(place, 3.0));
    CHECK(near(ei, load / w));
    int32_t steps = 0;
    DONE(bc_response_steps(r, PM, BC_TIME_INITIAL, &steps));
    CHECK(steps == 1);
    FAILS(bc_response_joint_field(r, BC_JOINT_FIELD_SLIP, PM, BC_TIME_INITIAL, "nails", &field),
          BC_ERROR_NAME, "joint");
    bc_response_free(r);
}

// A clearance of 0.5 mm: 16.652 mm, solved apart from this library.
static void clearance(void) {
    bc_joint *joint = slipping();
    CHANGE(bc_joint, joint, bc_joint_with_clearance(joint, 5e-4, &made));
    bc_response *r = solved(floor_of(joint), uniform());
    int32_t steps = 0;
    CHECK(within(value_at(r, BC_FIELD_DEFLECTION, 3.0), 16.652e-3, 5e-7));
    DONE(bc_response_steps(r, PM, BC_TIME_INITIAL, &steps));
    CHECK(steps > 1);
    bc_response_free(r);
}

// A stiff anchor at one end stops the slip there; an elastic one bears stiffness x slip.
static void anchors(void) {
    bc_plan *plan = floor_of(slipping());
    CHANGE(bc_plan, plan, bc_plan_with_anchor(plan, "plate", "screws", 0.0, &made));
    CHANGE(bc_plan, plan, bc_plan_with_elastic_anchor(plan, "notch", "screws", L, 2e7, &made));
    bc_action *load = uniform();
    CHANGE(bc_plan, plan, bc_plan_with_action(plan, load, &made));
    bc_action_free(load);
    bc_member *member = NULL;
    bc_response *r = NULL;
    int32_t count = 0, has_value = -1;
    double place = -1.0, stiffness = -1.0, force = 0.0;
    DONE(bc_plan_check(plan, &member));
    DONE(bc_member_anchor_count(member, &count));
    CHECK(count == 2);
    DONE(bc_member_anchor_name(member, 1, text, (int64_t)sizeof text, &length));
    CHECK(strcmp(text, "notch") == 0);
    DONE(bc_member_anchor_joint(member, 1, text, (int64_t)sizeof text, &length));
    CHECK(strcmp(text, "screws") == 0);
    DONE(bc_member_anchor(member, 0, &place, &has_value, &stiffness));
    CHECK(place == 0.0 && has_value == 0 && stiffness == -1.0);
    DONE(bc_member_anchor(member, 1, &place, &has_value, &stiffness));
    CHECK(place == L && has_value == 1 && stiffness == 2e7);
    DONE(bc_member_solve(member, &r));
    CHECK(within(at(joint_field(r, BC_JOINT_FIELD_SLIP), 0.0), 0.0, 1e-15));
    DONE(bc_response_anchor_force(r, PM, BC_TIME_INITIAL, "plate", &force));
    CHECK(force < -1e3);
    DONE(bc_response_anchor_force(r, PM, BC_TIME_INITIAL, "notch", &force));
    const double slip = at(joint_field(r, BC_JOINT_FIELD_SLIP), L);
    CHECK(slip > 0.0 && within(force, 2e7 * slip, 1e-9 * fabs(force)));
    FAILS(bc_response_anchor_force(r, PM, BC_TIME_INITIAL, "bolt", &force), BC_ERROR_LOOKUP,
          "anchor");
    bc_response_free(r);
    bc_member_free(member);
    bc_plan_free(plan);
}

// A butt joint of the slab: no axial force there.
static void butt(void) {
    bc_plan *plan = floor_of(slipping());
    CHANGE(bc_plan, plan, bc_plan_with_butt_joint(plan, "slab", 2.0, &made));
    bc_response *r = solved(plan, uniform());
    CHECK(within(at(layer_field(r, BC_LAYER_FIELD_AXIAL, "slab"), 2.0), 0.0, 1e-6));
    CHECK(at(layer_field(r, BC_LAYER_FIELD_AXIAL, "slab"), 3.0) < -1e4);
    bc_response_free(r);
}

// A slab loose on a joist, with deflections of their own; the supports carry the joist only, and
// the slab has a hinge.
static void deflections_of_their_own(void) {
    bc_joint *joint = NULL;
    DONE(bc_joint_loose("paper", "joist", "slab", &joint));
    CHANGE(bc_joint, joint, bc_joint_with_transverse(joint, 1e8, &made));
    bc_section *section = slab_on_joist(joint);
    bc_plan *plan = NULL;
    const char *bearing[] = {"joist"};
    DONE(bc_plan_of_length(section, L, &plan));
    for (int i = 0; i < 2; ++i) {
        bc_support *support = NULL;
        DONE(bc_support_new(i == 0 ? "left" : "right", i == 0 ? BC_SUPPORT_PIN : BC_SUPPORT_ROLLER,
                            i * L, &support));
        CHANGE(bc_support, support, bc_support_under(support, bearing, 1, &made));
        CHANGE(bc_plan, plan, bc_plan_on_support(plan, support, &made));
        bc_support_free(support);
    }
    CHANGE(bc_plan, plan, bc_plan_with_layer_hinge(plan, "slab", 2.0, &made));
    bc_action *action = uniform();
    CHANGE(bc_action, action, bc_action_on(action, "slab", &made));
    bc_response *r = solved(plan, action);
    double force = 0.0, couple = 0.0;
    DONE(bc_response_reaction(r, PM, BC_TIME_INITIAL, "left", &force, &couple));
    CHECK(within(force, Q * L / 2.0, 1e-6));
    const double peak = Q * L * L / 8.0;
    CHECK(within(at(layer_field(r, BC_LAYER_FIELD_MOMENT, "slab"), 2.0), 0.0, 1e-9 * peak));
    const double slab = at(layer_field(r, BC_LAYER_FIELD_DEFLECTION, "slab"), 2.0);
    const double joist = at(layer_field(r, BC_LAYER_FIELD_DEFLECTION, "joist"), 2.0);
    CHECK(joist > 0.0 && slab > joist);
    bc_response_free(r);
    bc_section_free(section);
}

// A slab that slips freely is held along the member by the right support: a force on it goes there.
static void a_layer_that_is_held(void) {
    bc_joint *joint = NULL;
    DONE(bc_joint_loose("paper", "joist", "slab", &joint));
    bc_section *section = slab_on_joist(joint);
    bc_plan *plan = NULL;
    bc_support *support = NULL;
    double force = 0.0;
    DONE(bc_plan_of_length(section, L, &plan));
    bc_section_free(section);
    CHANGE(bc_plan, plan, bc_plan_with_support(plan, "left", BC_SUPPORT_PIN, 0.0, &made));
    DONE(bc_support_new("right", BC_SUPPORT_ROLLER, L, &support));
    CHANGE(bc_support, support, bc_support_holding(support, "slab", 0.255, &made));
    CHANGE(bc_plan, plan, bc_plan_on_support(plan, support, &made));
    bc_support_free(support);
    bc_action *action = nothing();
    CHANGE(bc_action, action, bc_action_with_axial(action, 5e3, 2.0, 0.255, &made));
    CHANGE(bc_action, action, bc_action_on(action, "slab", &made));
    bc_response *r = solved(plan, action);
    DONE(bc_response_layer_reaction(r, PM, BC_TIME_INITIAL, "right", "slab", &force));
    double along = 0.0;
    DONE(bc_response_reaction_along(r, PM, BC_TIME_INITIAL, "right", &along));
    CHECK(within(force, along, 1e-9));
    double left = 0.0;
    DONE(bc_response_reaction_along(r, PM, BC_TIME_INITIAL, "left", &left));
    CHECK(within(left + along, -5e3, 1e-6));
    FAILS(bc_response_layer_reaction(r, PM, BC_TIME_INITIAL, "left", "slab", &force),
          BC_ERROR_LOOKUP, "layer");
    bc_response_free(r);
}

int main(void) {
    a_slab_on_a_joist();
    clearance();
    anchors();
    butt();
    deflections_of_their_own();
    a_layer_that_is_held();
    return finish();
}
