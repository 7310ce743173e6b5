/*
 * beamcore: a calculation core for beams of more than one material. C ABI.
 *
 * Generated from the Rust source; do not edit.
 *
 * STATUS. Every function returns an int32_t status, BC_OK (0) when it is done, else BC_ERROR_...
 * The exceptions are the functions that free a handle, which return nothing, and the plain
 * functions at the end (bc_plain_...), which return a double, NaN when they fail.
 * Numbers of statuses never change; new ones may come.
 *
 * RESULTS. Places for results come last and their names end in _out. Nothing is written to them
 * when a function fails, except the length of a text that did not fit (see TEXTS).
 *
 * ERRORS. A function that fails leaves its error with the thread that called it, until the next
 * failure in that thread: bc_error_text gives it as one text, the functions bc_error_problem_...
 * one by one, for all that is wrong with an input is reported at once. Reading the error does not
 * change it. A successful call does not clear it.
 *
 * BAD ARGUMENTS. NULL where a pointer is needed, text that is not UTF-8, NaN, infinity, counts
 * below zero and unknown constants are answered with a status. Choices are int32_t constants
 * (BC_TIME_...); they start at 1, so that a forgotten 0 is an error. A yes or no (is_...) is 1 or
 * 0. An empty list (count 0, its pointer may then be NULL) is judged as what it means: a member
 * without supports is BC_ERROR_MISSING. The only handle that may be NULL is a camber where a
 * function says so.
 *
 * OWNERSHIP. A handle (bc_part * and its like) that a function gives out is the caller's, who frees
 * it once with the free function of its type; freeing NULL does nothing. Handles never change:
 * bc_action_with_point and its like give a new handle and leave the old one as it is. Handles do
 * not depend on one another and are freed in any order: a section keeps what it needs of its parts.
 * Texts and lists passed in are copied; they need to live only until the function returns.
 *
 * THREADS. Handles may be used by several threads at once and freed by any thread, once nobody
 * uses them. The library starts no threads.
 *
 * TEXTS. Texts passed in are UTF-8 and end with a NUL. A text given out is written to a buffer of
 * the caller, of capacity bytes, with a closing NUL; length_out is its length in bytes without the
 * NUL, and is written even when the buffer is too small (BC_ERROR_BUFFER; the buffer is then left
 * as it is). To ask for the length, pass NULL with capacity 0.
 *
 * UNITS. All numbers are SI; the unit stands at the end of a parameter's name: width_m, load_N,
 * load_N_per_m, load_N_per_m2, modulus_Pa, moment_Nm, stiffness_Nm2, second_moment_m4, age_s,
 * modulus_N_per_m2, stiffness_N_per_m, stiffness_Nm_per_rad, pitch_rad, change_K, curvature_per_m.
 *
 * SIGNS. x runs left to right, z up; a section is drawn as seen against x, with y to the right.
 * Deflection and loads are positive downward, couples clockwise, the slope is dw/dx, the shear
 * force V = dM/dx, a positive (sagging) moment stretches the bottom, tension is positive, forces of
 * supports, cambers and readings are positive upward. A movement sideways is positive towards
 * positive y. Forces along the member are positive to the right, settlements downward, rotations
 * clockwise, changes of temperature where warmer. The slip of a joint is the displacement along x
 * of its upper layer minus that of its lower one; its flow bears the same sign.
 *
 * PANICS. A fault inside the library is caught and reported as BC_ERROR_PANIC; the caller is never
 * aborted by it.
 *
 * VERSIONS. bc_version gives the version of the library as a text, bc_abi_version the number of
 * this binding, which is BC_ABI_VERSION in the header; where the two differ, header and library do
 * not belong together.
 */

#ifndef BEAMCORE_H
#define BEAMCORE_H

#include <stdint.h>

// The version of this binding that the header describes; it grows with each incompatible change,
// and is the number of the shared library's name.
#define BC_ABI_VERSION 0

// Done.
#define BC_OK 0

// A number outside what is possible: negative size, NaN, infinity.
#define BC_ERROR_VALUE 1

// A name that nothing bears: a part, material, support, strength class.
#define BC_ERROR_NAME 2

// A key that the document does not know.
#define BC_ERROR_KEY 3

// A unit that is missing, unknown or of another kind of quantity.
#define BC_ERROR_UNIT 4

// Two things of one name, or two supports at one place.
#define BC_ERROR_DUPLICATE 5

// Parts that overlap, or places that refer to each other in a circle.
#define BC_ERROR_GEOMETRY 6

// Something that must be given is not.
#define BC_ERROR_MISSING 7

// A member, or a piece of it, that is free to move.
#define BC_ERROR_MECHANISM 8

// A support or load that lies outside the member, or a stretch without length.
#define BC_ERROR_POSITION 9

// A text that is not a document: broken or truncated TOML or JSON, a value of a wrong type.
#define BC_ERROR_SYNTAX 10

// A document of a version that this library does not read.
#define BC_ERROR_VERSION 11

// A file that cannot be read.
#define BC_ERROR_FILE 12

// A result that was asked for and that does not exist.
#define BC_ERROR_LOOKUP 13

// A calculation that did not reach its accuracy.
#define BC_ERROR_NUMERICAL 14

// A pointer that must not be NULL is NULL.
#define BC_ERROR_NULL 100

// A text is not UTF-8.
#define BC_ERROR_UTF8 101

// The library itself failed; the call had no effect. Please report the text of the error.
#define BC_ERROR_PANIC 102

// The buffer is too small; the length that is needed was written to length_out.
#define BC_ERROR_BUFFER 103

// An int32_t that stands for a choice is none of its constants.
#define BC_ERROR_CHOICE 104

// A count that is negative, or zero where something must be there, or an index past the end.
#define BC_ERROR_COUNT 105

// Time: the day the load comes on, every material with its short-term modulus.
#define BC_TIME_INITIAL 1

// Time: the end of the life, the quasi-permanent share of the load with effective moduli.
#define BC_TIME_FINAL 2

// Cement: hardens slowly.
#define BC_CEMENT_S 1

// Cement: hardens normally.
#define BC_CEMENT_N 2

// Cement: hardens rapidly.
#define BC_CEMENT_R 3

// Place of a part: at smaller y than the other, touching it, centred on its height.
#define BC_PLACE_LEFT_OF 1

// Place of a part: at greater y than the other, touching it, centred on its height.
#define BC_PLACE_RIGHT_OF 2

// Place of a part: at greater z than the other, touching it, centred on its width.
#define BC_PLACE_ABOVE 3

// Place of a part: at smaller z than the other, touching it, centred on its width.
#define BC_PLACE_BELOW 4

// Support: holds the deflection and the displacement along the axis.
#define BC_SUPPORT_PIN 1

// Support: holds the deflection only.
#define BC_SUPPORT_ROLLER 2

// Support: holds the deflection, the displacement along the axis and the rotation.
#define BC_SUPPORT_FIXED 3

// Rounding: to the nearest step, halves away from zero.
#define BC_ROUNDING_NEAREST 1

// Rounding: to the step below in magnitude.
#define BC_ROUNDING_DOWN 2

// Rounding: to the step above in magnitude.
#define BC_ROUNDING_UP 3

// Field: deflection in m, positive downward.
#define BC_FIELD_DEFLECTION 1

// Field: slope dw/dx in rad.
#define BC_FIELD_SLOPE 2

// Field: shear force V = dM/dx in N.
#define BC_FIELD_SHEAR 3

// Field: moment in N m, positive where it stretches the bottom.
#define BC_FIELD_MOMENT 4

// Field: axial force in N, tension positive.
#define BC_FIELD_AXIAL 5

// Field: rotation of the section in rad, positive clockwise; with shear it is not the slope.
#define BC_FIELD_ROTATION 6

// Field: curvature in 1/m, positive sagging, with its free part.
#define BC_FIELD_CURVATURE 7

// Extreme: the value of greatest magnitude, with its sign.
#define BC_EXTREME_GREATEST 1

// Extreme: the algebraically greatest value.
#define BC_EXTREME_MAXIMUM 2

// Extreme: the algebraically least value.
#define BC_EXTREME_MINIMUM 3

// Side of a place along the member: just left of it.
#define BC_SIDE_LEFT 1

// Side of a place along the member: just right of it.
#define BC_SIDE_RIGHT 2

// Fibre of a part: its bottom edge.
#define BC_FIBRE_BOTTOM 1

// Fibre of a part: its own centroid.
#define BC_FIBRE_CENTROID 2

// Fibre of a part: its top edge.
#define BC_FIBRE_TOP 3

// Sign of a stress: tension, positive.
#define BC_STRESS_TENSION 1

// Sign of a stress: compression, negative.
#define BC_STRESS_COMPRESSION 2

// Format of a document: TOML, for documents that are written by hand.
#define BC_FORMAT_TOML 1

// Format of a document: JSON, for documents that are written by programs.
#define BC_FORMAT_JSON 2

// Category A: homes.
#define BC_CATEGORY_DOMESTIC 1

// Category B: offices.
#define BC_CATEGORY_OFFICE 2

// Category C: where people gather.
#define BC_CATEGORY_CONGREGATION 3

// Category D: shops.
#define BC_CATEGORY_SHOPPING 4

// Category E: storage.
#define BC_CATEGORY_STORAGE 5

// Category F: traffic of vehicles up to 30 kN.
#define BC_CATEGORY_LIGHT_TRAFFIC 6

// Category G: traffic of vehicles from 30 kN to 160 kN.
#define BC_CATEGORY_HEAVY_TRAFFIC 7

// Category H: roofs that are only walked on for upkeep.
#define BC_CATEGORY_ROOF 8

// Category: snow at 1000 m above the sea or lower.
#define BC_CATEGORY_SNOW 9

// Category: snow above 1000 m, and everywhere in Finland, Iceland, Norway, Sweden.
#define BC_CATEGORY_SNOW_HIGH 10

// Category: wind.
#define BC_CATEGORY_WIND 11

// Category: temperature, not fire.
#define BC_CATEGORY_TEMPERATURE 12

// Duration of an action: more than ten years.
#define BC_DURATION_PERMANENT 1

// Duration of an action: six months to ten years.
#define BC_DURATION_LONG 2

// Duration of an action: a week to six months.
#define BC_DURATION_MEDIUM 3

// Duration of an action: less than a week.
#define BC_DURATION_SHORT 4

// Duration of an action: moments.
#define BC_DURATION_INSTANTANEOUS 5

// Combination: permanent actions only.
#define BC_COMBINATION_PERMANENT 1

// Combination: quasi-permanent, EN 1990:2002 eq. 6.16b.
#define BC_COMBINATION_QUASI_PERMANENT 2

// Combination: characteristic, EN 1990:2002 eq. 6.14b.
#define BC_COMBINATION_CHARACTERISTIC 3

// Combination: frequent, EN 1990:2002 eq. 6.15b.
#define BC_COMBINATION_FREQUENT 4

// Combination: fundamental, EN 1990:2002 eq. 6.10; design strengths are compared under it.
#define BC_COMBINATION_FUNDAMENTAL 5

// Combination of one's own that looks at deflections.
#define BC_COMBINATION_OWN 6

// Combination of one's own under which design strengths are compared.
#define BC_COMBINATION_OWN_ULTIMATE 7

// Component of the deflection, w_inst: characteristic combination, initial.
#define BC_COMPONENT_INSTANT 1

// Component of the deflection, w_1: permanent actions, initial.
#define BC_COMPONENT_PERMANENT 2

// Component of the deflection, w_2: what creep adds under permanent actions only.
#define BC_COMPONENT_CREEP 3

// Component of the deflection, w_3: what variable actions add, with the creep under their
// quasi-permanent part.
#define BC_COMPONENT_VARIABLE 4

// Component of the deflection, w_tot = w_1 + w_2 + w_3.
#define BC_COMPONENT_TOTAL 5

// Component of the deflection, w_max = w_tot - w_c: what is left after the camber w_c.
#define BC_COMPONENT_REMAINING 6

// Shape of a camber: a parabola with the rise of the deflection line at the middle of the chord.
#define BC_SHAPE_PARABOLA 1

// Shape of a camber: the mirror image of the deflection line, scaled to the rounded rise.
#define BC_SHAPE_MIRROR 2

// Shape of a camber: a circular arc with the rise of the deflection line at the middle.
#define BC_SHAPE_ARC_THROUGH_MIDDLE 3

// Shape of a camber: the circular arc whose greatest gap to the deflection line is least.
#define BC_SHAPE_ARC_LEAST_GAP 4

// Axis of a mirror image: the upright axis y = 0; left and right change.
#define BC_MIRROR_UPRIGHT 1

// Axis of a mirror image: the level axis z = 0; top and bottom change.
#define BC_MIRROR_LEVEL 2

// Sideways: held, as by a floor; bends about the level axis only.
#define BC_SIDEWAYS_HELD 1

// Sideways: free; also bends about the upright axis where there is no axis of symmetry.
#define BC_SIDEWAYS_FREE 2

// Design strength of timber: bending, f_m,d.
#define BC_STRENGTH_DESIGN_BENDING 1

// Design strength of timber: tension along the grain, f_t,0,d.
#define BC_STRENGTH_DESIGN_TENSION 2

// Design strength of timber: compression along the grain, f_c,0,d.
#define BC_STRENGTH_DESIGN_COMPRESSION 3

// Design strength of metal: yield, f_y,d.
#define BC_STRENGTH_DESIGN_YIELD 4

// Design strength: shear, f_v,d of timber or f_y,d/sqrt(3) of metal, unless it was given.
#define BC_STRENGTH_DESIGN_SHEAR 5

// Characteristic strength of timber: bending, f_m,k.
#define BC_STRENGTH_BENDING 6

// Characteristic strength of timber: tension along the grain, f_t,0,k.
#define BC_STRENGTH_TENSION 7

// Characteristic strength: compression, f_c,0,k of timber along the grain, f_ck of concrete.
#define BC_STRENGTH_COMPRESSION 8

// Characteristic strength of timber: shear, f_v,k.
#define BC_STRENGTH_SHEAR 9

// Characteristic strength of timber: tension across the grain, f_t,90,k.
#define BC_STRENGTH_TENSION_ACROSS 10

// Characteristic strength of timber: compression across the grain, f_c,90,k.
#define BC_STRENGTH_COMPRESSION_ACROSS 11

// Characteristic strength of metal: yield f_y, or 0.2 % proof f_o.
#define BC_STRENGTH_YIELD 12

// Characteristic strength of metal: ultimate in tension, f_u.
#define BC_STRENGTH_ULTIMATE 13

// Mean strength of concrete: compression, f_cm.
#define BC_STRENGTH_MEAN_COMPRESSION 14

// Mean strength of concrete: tension, f_ctm.
#define BC_STRENGTH_MEAN_TENSION 15

// Joint: without slip; the two layers are one piece.
#define BC_JOINT_RIGID 1

// Joint: with slip in proportion to the flow.
#define BC_JOINT_SLIPPING 2

// Joint: the layers slip freely and share their deflection only.
#define BC_JOINT_LOOSE 3

// Field of a joint: slip in m, displacement along x of the upper layer minus the lower one's.
#define BC_JOINT_FIELD_SLIP 1

// Field of a joint: flow in N/m, with the sign of the slip.
#define BC_JOINT_FIELD_FLOW 2

// Field of a joint: pressure of the layers above on those below in N/m, negative where they would
// part.
#define BC_JOINT_FIELD_PRESSURE 3

// Field of a layer: axial force in N, tension positive.
#define BC_LAYER_FIELD_AXIAL 1

// Field of a layer: moment about its own centroid in N m, positive where it stretches the bottom.
#define BC_LAYER_FIELD_MOMENT 2

// Field of a layer: deflection in m, positive downward; that of the member unless a transverse
// modulus gives the layer one of its own.
#define BC_LAYER_FIELD_DEFLECTION 3

// Change of the section: another one from a place on.
#define BC_CHANGE_STEP 1

// Change of the section: linear between two places.
#define BC_CHANGE_TAPER 2

// Hinge: no moment passes.
#define BC_HINGE_MOMENT 1

// Hinge: no shear force passes.
#define BC_HINGE_SHEAR 2

// Hinge: one layer is butted, no axial force of it passes.
#define BC_HINGE_BUTT 3

// Shear deformation: left out.
#define BC_SHEAR_RIGID 1

// Shear deformation: with kGA of each section, from the energy of its shear stress.
#define BC_SHEAR_FLEXIBLE 2

// Shear deformation: with the kGA that is given (bc_plan_with_given_shear).
#define BC_SHEAR_GIVEN 3

// Length of the simplified methods: a single span L, l = L.
#define BC_LENGTH_SPAN 1

// Length of the simplified methods: a span L of several, l = 0.8 L.
#define BC_LENGTH_CONTINUOUS 2

// Length of the simplified methods: a cantilever of length L, l = 2 L.
#define BC_LENGTH_CANTILEVER 3

// Simplified method: gamma, EN 1995-1-1:2004 Annex B, for two or three layers.
#define BC_METHOD_GAMMA 1

// Simplified method: sine layers, for any number of layers.
#define BC_METHOD_SINE_LAYERS 2

// An action: loads that act together, from one cause.
typedef struct bc_action bc_action;

// A camber: a rise over a chord between two supports, with its ordinates.
typedef struct bc_camber bc_camber;

// Checks: limits compared with the results of a member.
typedef struct bc_checks bc_checks;

// A comparison: what a simplified method gives for each span, beside the exact solution.
typedef struct bc_comparison bc_comparison;

// A field: a quantity along the member, in its SI unit.
typedef struct bc_field bc_field;

// A job: all inputs of a calculation as one document, read and found without fault.
typedef struct bc_job bc_job;

// A joint: what holds two layers together along the member.
typedef struct bc_joint bc_joint;

// A layer: the parts that act as one piece, without slip between them.
typedef struct bc_layer bc_layer;

// What the simplified methods know of a layer.
typedef struct bc_layer_input bc_layer_input;

// A limit of a component of the deflection.
typedef struct bc_limit bc_limit;

// A material: elastic values, density, creep and design strengths of one stuff.
typedef struct bc_material bc_material;

// A member that has passed all checks and is ready to be solved.
typedef struct bc_member bc_member;

// An outcome: all results of a job, with its inputs, what was assumed and what was not checked.
typedef struct bc_outcome bc_outcome;

// An outline: the shape of a part with its sizes, without a place. It has a point by which a part
// is placed: the middle of its bounding box, or the origin of the coordinates of a polygon.
// Corners are sharp. The sizes are checked when a part of the outline is used in a section.
typedef struct bc_outline bc_outline;

// A part: one piece of one material, with a name that addresses its results.
typedef struct bc_part bc_part;

// A plan of a member: everything given, nothing checked yet. bc_plan_check makes a member of it.
typedef struct bc_plan bc_plan;

// Readings: what a tape shows at the stations of a camber when the member is measured.
typedef struct bc_readings bc_readings;

// A response: the solved member.
typedef struct bc_response bc_response;

// A section: parts in layers with joints between them, each at its place.
typedef struct bc_section bc_section;

// Layers by a simplified method: the gamma method, or sine layers.
typedef struct bc_simplified bc_simplified;

// A support: where a member is held, and how. What it holds is rigid unless a spring is given.
typedef struct bc_support bc_support;

#ifdef __cplusplus
extern "C" {
#endif // __cplusplus

// The version of the library, as in "0.1.0".
int32_t bc_version(char *buffer, int64_t capacity, int64_t *length_out);

// The version of the binding in the library that is running; compare it with BC_ABI_VERSION.
int32_t bc_abi_version(int32_t *version_out);

// The name of a status in one word, for example "Value"; an empty text for an unknown number.
int32_t bc_status_name(int32_t status, char *buffer, int64_t capacity, int64_t *length_out);

// Whether a status says that the input is at fault (1) or not (0: done, a file, a look-up, the
// calculation itself, or a wrong use of this binding).
int32_t bc_status_is_input(int32_t status, int32_t *is_input_out);

// The status of the last call that failed in this thread; BC_OK if none did.
int32_t bc_error_status(int32_t *status_out);

// The whole text of the last error of this thread: a line for each problem, in the form
// "path: found ...; expected ...". Empty if no call failed in this thread.
int32_t bc_error_text(char *buffer, int64_t capacity, int64_t *length_out);

// The path of the field, or the name of the parameter, at which the first problem stands. Empty
// if no call failed in this thread.
int32_t bc_error_path(char *buffer, int64_t capacity, int64_t *length_out);

// The number of problems in the last error of this thread; 0 if no call failed.
int32_t bc_error_problem_count(int32_t *count_out);

// The kind of a problem, as a status. Problems are counted from 0.
int32_t bc_error_problem_kind(int32_t index, int32_t *kind_out);

// The line of the document, counted from 1, at which a problem stands; 0 where there is no
// document or no single line.
int32_t bc_error_problem_line(int32_t index, int64_t *line_out);

// The path of the field, or the name of the parameter, of a problem.
int32_t bc_error_problem_path(int32_t index, char *buffer, int64_t capacity, int64_t *length_out);

// What was found at the place of a problem.
int32_t bc_error_problem_found(int32_t index, char *buffer, int64_t capacity, int64_t *length_out);

// What would be right at the place of a problem.
int32_t bc_error_problem_expected(int32_t index,
                                  char *buffer,
                                  int64_t capacity,
                                  int64_t *length_out);

// Solid or glued laminated timber of a strength class ("C24", "GL28h"), in service class 1, 2
// or 3: E, mean density and creep factor of the class.
int32_t bc_material_timber(const char *class_name,
                           int32_t service_class,
                           bc_material **material_out);

// Structural steel of a class ("S275"): E and density; no creep.
int32_t bc_material_steel(const char *class_name, bc_material **material_out);

// Concrete of a class ("C30/37") with its creep factor phi as a number: E_cm and density.
int32_t bc_material_concrete(const char *class_name,
                             double creep_factor,
                             bc_material **material_out);

// Concrete of a class with its creep factor calculated: mean strength f_cm, relative humidity in
// percent (50 means 50 %), notional size h0 = 2 A/u, the ages at which the load comes on and at
// which the creep is asked for, and the cement (BC_CEMENT_...).
int32_t bc_material_concrete_with_creep(const char *class_name,
                                        double mean_strength_Pa,
                                        double relative_humidity_percent,
                                        double notional_size_m,
                                        double age_at_loading_s,
                                        double age_at_end_s,
                                        int32_t cement,
                                        bc_material **material_out);

// A material by its values: name, modulus of elasticity E and creep factor (0 for none). The
// values are checked when the material is used in a section.
int32_t bc_material_new(const char *name,
                        double modulus_Pa,
                        double creep_factor,
                        bc_material **material_out);

// The same material under another name.
int32_t bc_material_named(const bc_material *material,
                          const char *name,
                          bc_material **material_out);

// The same material with a mean density, from which self-weight follows.
int32_t bc_material_with_density(const bc_material *material,
                                 double density_kg_per_m3,
                                 bc_material **material_out);

// The same material with design strengths of timber along the grain: bending f_m,d, tension
// f_t,0,d and compression f_c,0,d.
int32_t bc_material_with_timber_strength(const bc_material *material,
                                         double bending_Pa,
                                         double tension_Pa,
                                         double compression_Pa,
                                         bc_material **material_out);

// The same material with the design yield strength f_y,d of a metal.
int32_t bc_material_with_metal_strength(const bc_material *material,
                                        double yield_Pa,
                                        bc_material **material_out);

// The modulus at a time: E at first, E/(1 + creep factor) at the end.
int32_t bc_material_modulus(const bc_material *material, int32_t time, double *modulus_Pa_out);

// The name of a material, by which results and errors speak of it.
int32_t bc_material_name(const bc_material *material,
                         char *buffer,
                         int64_t capacity,
                         int64_t *length_out);

// Frees a material; NULL is allowed.
void bc_material_free(bc_material *material);

// Structural steel of a class ("S275") with the yield and ultimate strengths of a nominal
// thickness as characteristic strengths.
int32_t bc_material_steel_of_thickness(const char *class_name,
                                       double thickness_m,
                                       bc_material **material_out);

// Aluminium of an alloy and temper ("EN AW-6082 T6") as an extruded profile of a thickness, with
// its proof and ultimate strengths away from welds as characteristic strengths.
int32_t bc_material_aluminium(const char *class_name,
                              double thickness_m,
                              bc_material **material_out);

// The same material with another mean modulus of elasticity E. The fractile of the modulus and a
// given shear modulus stay as they are.
int32_t bc_material_with_modulus(const bc_material *material,
                                 double modulus_Pa,
                                 bc_material **material_out);

// The same material with a 5 % fractile of the modulus of elasticity, E_05.
int32_t bc_material_with_fractile_modulus(const bc_material *material,
                                          double modulus_Pa,
                                          bc_material **material_out);

// The same material with a mean shear modulus G; it replaces the shear modulus or Poisson's ratio
// of a class.
int32_t bc_material_with_shear_modulus(const bc_material *material,
                                       double modulus_Pa,
                                       bc_material **material_out);

// The same material with a Poisson's ratio nu, so that G = E/(2 (1 + nu)); it replaces the shear
// modulus or Poisson's ratio of a class. Not for timber.
int32_t bc_material_with_poisson_ratio(const bc_material *material,
                                       double ratio,
                                       bc_material **material_out);

// The same material with a 5 % fractile of the density, rho_k.
int32_t bc_material_with_fractile_density(const bc_material *material,
                                          double density_kg_per_m3,
                                          bc_material **material_out);

// The same material with a thermal expansion alpha, positive where warmth lengthens it.
int32_t bc_material_with_thermal_expansion(const bc_material *material,
                                           double expansion_per_K,
                                           bc_material **material_out);

// The same material with another creep factor (0 for no creep).
int32_t bc_material_with_creep_factor(const bc_material *material,
                                      double creep_factor,
                                      bc_material **material_out);

// The same material with characteristic strengths of timber along the grain: bending f_m,k,
// tension f_t,0,k, compression f_c,0,k and shear f_v,k. Stresses are compared with design
// strengths only: see bc_material_with_timber_factors.
int32_t bc_material_with_characteristic_timber(const bc_material *material,
                                               double bending_Pa,
                                               double tension_Pa,
                                               double compression_Pa,
                                               double shear_Pa,
                                               bc_material **material_out);

// The same material with characteristic strengths of timber along the grain and, last, across it:
// tension f_t,90,k and compression f_c,90,k.
int32_t bc_material_with_characteristic_timber_across(const bc_material *material,
                                                      double bending_Pa,
                                                      double tension_Pa,
                                                      double compression_Pa,
                                                      double shear_Pa,
                                                      double tension_across_Pa,
                                                      double compression_across_Pa,
                                                      bc_material **material_out);

// The same material with the characteristic strength of a metal: yield f_y, or 0.2 % proof f_o.
int32_t bc_material_with_characteristic_metal(const bc_material *material,
                                              double yield_Pa,
                                              bc_material **material_out);

// The same material with the characteristic strengths of a metal, last the ultimate one in
// tension, f_u.
int32_t bc_material_with_characteristic_metal_ultimate(const bc_material *material,
                                                       double yield_Pa,
                                                       double ultimate_Pa,
                                                       bc_material **material_out);

// The same material with the factors that make design strengths of the characteristic ones of
// timber: k_mod, the partial factor gamma_M, the size factor k_h and the factor of load sharing
// k_sys; the last two are 1 where there is none.
int32_t bc_material_with_timber_factors(const bc_material *material,
                                        double k_mod,
                                        double gamma_m,
                                        double k_h,
                                        double k_sys,
                                        bc_material **material_out);

// The same material with the partial factor that makes the design strength of the characteristic
// one of a metal: gamma_M0 of steel, gamma_M1 of aluminium.
int32_t bc_material_with_metal_factor(const bc_material *material,
                                      double gamma_m,
                                      bc_material **material_out);

// The same material with a design shear strength, as f_v,d of timber.
int32_t bc_material_with_shear_strength(const bc_material *material,
                                        double shear_Pa,
                                        bc_material **material_out);

// A strength (BC_STRENGTH_...) of a material. Where it is not known, or is one of another stuff,
// has_value_out is 0 and the strength is left as it is.
int32_t bc_material_strength(const bc_material *material,
                             int32_t strength,
                             int32_t *has_value_out,
                             double *strength_Pa_out);

// The 5 % fractile of the modulus of elasticity, E_05. Where it is not known, has_value_out is 0 and
// the modulus is left as it is.
int32_t bc_material_fractile_modulus(const bc_material *material,
                                     int32_t *has_value_out,
                                     double *modulus_Pa_out);

// The shear modulus at a time: G at first, G/(1 + creep factor) at the end, with G as given, else
// E/(2 (1 + nu)). Where it is not known, has_value_out is 0 and the modulus is left as it is.
int32_t bc_material_shear_modulus(const bc_material *material,
                                  int32_t time,
                                  int32_t *has_value_out,
                                  double *modulus_Pa_out);

// Poisson's ratio nu. Where it is not given, has_value_out is 0 and the ratio is left as it is.
int32_t bc_material_poisson_ratio(const bc_material *material,
                                  int32_t *has_value_out,
                                  double *ratio_out);

// The mean density rho_mean. Where it is not known, has_value_out is 0 and the density is left as it
// is.
int32_t bc_material_density(const bc_material *material,
                            int32_t *has_value_out,
                            double *density_kg_per_m3_out);

// The 5 % fractile of the density, rho_k. Where it is not known, has_value_out is 0 and the density
// is left as it is.
int32_t bc_material_fractile_density(const bc_material *material,
                                     int32_t *has_value_out,
                                     double *density_kg_per_m3_out);

// The thermal expansion alpha. Where it is not known, has_value_out is 0 and the expansion is left as
// it is.
int32_t bc_material_thermal_expansion(const bc_material *material,
                                      int32_t *has_value_out,
                                      double *expansion_per_K_out);

// The creep factor, 0 for no creep.
int32_t bc_material_creep_factor(const bc_material *material, double *creep_factor_out);

// Where the creep factor comes from.
int32_t bc_material_creep_basis(const bc_material *material,
                                char *buffer,
                                int64_t capacity,
                                int64_t *length_out);

// The standard, edition and class that the values come from; an empty text if they were given one
// by one.
int32_t bc_material_origin(const bc_material *material,
                           char *buffer,
                           int64_t capacity,
                           int64_t *length_out);

// The number of values of the class that were overridden; 0 without a class.
int32_t bc_material_override_count(const bc_material *material, int32_t *count_out);

// A value of the class that was overridden, as in "density 450 kg/m3 instead of 420 kg/m3".
// Overrides are counted from 0.
int32_t bc_material_override(const bc_material *material,
                             int32_t index,
                             char *buffer,
                             int64_t capacity,
                             int64_t *length_out);

// A rectangle, width along y and height along z.
int32_t bc_outline_rectangle(double width_m, double height_m, bc_outline **outline_out);

// A full disc: a round bar.
int32_t bc_outline_disc(double diameter_m, bc_outline **outline_out);

// A round tube of an outer diameter, its wall thinner than half of it.
int32_t bc_outline_ring(double diameter_m, double wall_thickness_m, bc_outline **outline_out);

// Two flanges joined by a web in their middle; the height is overall.
int32_t bc_outline_i_shape(double height_m,
                           double top_width_m,
                           double top_thickness_m,
                           double bottom_width_m,
                           double bottom_thickness_m,
                           double web_thickness_m,
                           bc_outline **outline_out);

// A flange on top of a web in its middle; the height is overall.
int32_t bc_outline_tee(double height_m,
                       double width_m,
                       double flange_thickness_m,
                       double web_thickness_m,
                       bc_outline **outline_out);

// A web on the left with two equal flanges to the right; height and width are overall.
int32_t bc_outline_channel(double height_m,
                           double width_m,
                           double flange_thickness_m,
                           double web_thickness_m,
                           bc_outline **outline_out);

// An upright leg on the left and a level leg at the bottom, of one thickness, with the heel at the
// bottom left; height and width are overall.
int32_t bc_outline_angle(double height_m,
                         double width_m,
                         double thickness_m,
                         bc_outline **outline_out);

// A rectangular tube of two upright sides and two level plates; width and height are overall.
int32_t bc_outline_box(double width_m,
                       double height_m,
                       double side_thickness_m,
                       double plate_thickness_m,
                       bc_outline **outline_out);

// The word for the shape in documents: rectangle, polygon, disc, ring, i_shape, tee, channel,
// angle or box.
int32_t bc_outline_name(const bc_outline *outline,
                        char *buffer,
                        int64_t capacity,
                        int64_t *length_out);

// Frees an outline; NULL is allowed.
void bc_outline_free(bc_outline *outline);

// A polygon through points (y, z), in its own coordinates: y to the right, z up. The loop closes
// by itself and may be given in either direction.
int32_t bc_outline_polygon(const double *y_m,
                           const double *z_m,
                           int32_t point_count,
                           bc_outline **outline_out);

// The same polygon with one more hole, given by its points as the polygon is. Other outlines than
// polygons have no holes: they are BC_ERROR_GEOMETRY.
int32_t bc_outline_with_hole(const bc_outline *outline,
                             const double *y_m,
                             const double *z_m,
                             int32_t point_count,
                             bc_outline **outline_out);

// A part of an outline, the point by which the outline is placed at y = 0, z = 0. The values are
// checked when the part is used in a section.
int32_t bc_part_new(const char *name,
                    const bc_outline *outline,
                    const bc_material *material,
                    bc_part **part_out);

// A rectangular part, width along y and height along z, with its middle at y = 0, z = 0. The
// values are checked when the part is used in a section.
int32_t bc_part_rectangle(const char *name,
                          double width_m,
                          double height_m,
                          const bc_material *material,
                          bc_part **part_out);

// The same part with the point by which its outline is placed at (y, z): the middle of its bounding
// box, or the origin of the coordinates of a polygon.
int32_t bc_part_at(const bc_part *part, double y_m, double z_m, bc_part **part_out);

// The same part touching another one of the section: place is BC_PLACE_...
int32_t bc_part_beside(const bc_part *part,
                       int32_t place,
                       const char *other_name,
                       bc_part **part_out);

// The name of a part.
int32_t bc_part_name(const bc_part *part, char *buffer, int64_t capacity, int64_t *length_out);

// Frees a part; NULL is allowed.
void bc_part_free(bc_part *part);

// The same part as the mirror image of another one about an axis (BC_MIRROR_...): at the mirrored
// place, with its own outline mirrored.
int32_t bc_part_mirror_of(const bc_part *part,
                          const char *other_name,
                          int32_t axis,
                          bc_part **part_out);

// The same part set into another one, its host, at (y, z): it displaces the host exactly, and must
// lie wholly within it.
int32_t bc_part_set_into(const bc_part *part,
                         const char *host_name,
                         double y_m,
                         double z_m,
                         bc_part **part_out);

// The same part with a mass per length of its own, instead of density x area.
int32_t bc_part_with_line_mass(const bc_part *part, double line_mass_kg_per_m, bc_part **part_out);

// A section of parts, joined rigidly as one layer named "section". All that is wrong with them is
// reported at once; no part at all is BC_ERROR_MISSING.
int32_t bc_section_new(const bc_part *const *parts, int32_t part_count, bc_section **section_out);

// EA, the sum of E A over the parts, at a time.
int32_t bc_section_axial_stiffness(const bc_section *section,
                                   int32_t time,
                                   double *axial_stiffness_N_out);

// The elastic centroid at a time.
int32_t bc_section_centroid(const bc_section *section,
                            int32_t time,
                            double *y_m_out,
                            double *z_m_out);

// The bending stiffness at a time about the axes through the elastic centroid: yy about the
// horizontal one, zz about the upright one, and the mixed term yz.
int32_t bc_section_bending_stiffness(const bc_section *section,
                                     int32_t time,
                                     double *yy_Nm2_out,
                                     double *zz_Nm2_out,
                                     double *yz_Nm2_out);

// The modulus of a part at a time and its share in the bending stiffness yy; the shares of all
// parts sum to 1.
int32_t bc_section_part_share(const bc_section *section,
                              int32_t time,
                              const char *part,
                              double *modulus_Pa_out,
                              double *share_out);

// The edges of a part at its place, and its area.
int32_t bc_section_part_edges(const bc_section *section,
                              const char *part,
                              double *left_m_out,
                              double *right_m_out,
                              double *bottom_m_out,
                              double *top_m_out,
                              double *area_m2_out);

// Mass per length of the section. Where a part has no density, has_value_out is 0 and the mass
// is left as it is.
int32_t bc_section_line_mass(const bc_section *section,
                             int32_t *has_value_out,
                             double *line_mass_kg_per_m_out);

// The number of notes on a section, for example on parts that do not touch.
int32_t bc_section_note_count(const bc_section *section, int32_t *count_out);

// A note on a section. Notes are counted from 0.
int32_t bc_section_note(const bc_section *section,
                        int32_t index,
                        char *buffer,
                        int64_t capacity,
                        int64_t *length_out);

// Frees a section; NULL is allowed.
void bc_section_free(bc_section *section);

// A layer over the whole length of the member, of the parts of these names. It is checked when it
// is used in a section.
int32_t bc_layer_new(const char *name,
                     const char *const *part_names,
                     int32_t part_count,
                     bc_layer **layer_out);

// The same layer, there only from one place along the member to another, from the left end. What
// is set into a host displaces it over the whole length all the same.
int32_t bc_layer_between(const bc_layer *layer, double from_m, double to_m, bc_layer **layer_out);

// The name of a layer.
int32_t bc_layer_name(const bc_layer *layer, char *buffer, int64_t capacity, int64_t *length_out);

// The number of parts of a layer.
int32_t bc_layer_part_count(const bc_layer *layer, int32_t *count_out);

// The name of a part of a layer. Parts are counted from 0.
int32_t bc_layer_part_name(const bc_layer *layer,
                           int32_t index,
                           char *buffer,
                           int64_t capacity,
                           int64_t *length_out);

// From where to where along the member a layer is there. Where it is there over the whole length,
// has_value_out is 0 and the places are left as they are.
int32_t bc_layer_extent(const bc_layer *layer,
                        int32_t *has_value_out,
                        double *from_m_out,
                        double *to_m_out);

// Frees a layer; NULL is allowed.
void bc_layer_free(bc_layer *layer);

// A joint without slip between two layers, given by their names. The slip of a joint is the
// displacement along x of its upper layer minus that of its lower one; of layers side by side
// either may be called the upper one, which only fixes that sign. Joints are checked when they are
// used in a section.
int32_t bc_joint_rigid(const char *name,
                       const char *lower,
                       const char *upper,
                       bc_joint **joint_out);

// A joint in which the two layers slip freely; they share their deflection only.
int32_t bc_joint_loose(const char *name,
                       const char *lower,
                       const char *upper,
                       bc_joint **joint_out);

// A joint that slips in proportion to the flow, with its slip modulus k: force per length of the
// joint and slip.
int32_t bc_joint_slipping(const char *name,
                          const char *lower,
                          const char *upper,
                          double slip_modulus_N_per_m2,
                          bc_joint **joint_out);

// A joint of fasteners in rows along the member, at one spacing: k = rows planes K/spacing, with K
// the slip modulus of one fastener in one shear plane, force per slip.
int32_t bc_joint_of_fasteners(const char *name,
                              const char *lower,
                              const char *upper,
                              double stiffness_N_per_m,
                              int32_t rows,
                              int32_t planes,
                              double spacing_m,
                              bc_joint **joint_out);

// A joint of fasteners as bc_joint_of_fasteners, with a spacing of its own in each band along the
// member (three lists of one length: where a band begins and ends, from the left end, and its
// spacing). There are no fasteners outside of the bands.
int32_t bc_joint_of_fasteners_in_bands(const char *name,
                                       const char *lower,
                                       const char *upper,
                                       double stiffness_N_per_m,
                                       int32_t rows,
                                       int32_t planes,
                                       const double *band_from_m,
                                       const double *band_to_m,
                                       const double *band_spacing_m,
                                       int32_t band_count,
                                       bc_joint **joint_out);

// A joint of a soft layer of glue: k = G width/thickness, with its shear modulus G, the width of
// the glue line across the member and the thickness of the glue.
int32_t bc_joint_of_glue(const char *name,
                         const char *lower,
                         const char *upper,
                         double shear_modulus_Pa,
                         double width_m,
                         double thickness_m,
                         bc_joint **joint_out);

// The same joint across a gap: the clear distance between the two layers, which must agree with
// their places to 0.1 mm. It must be stated where the layers do not touch.
int32_t bc_joint_with_gap(const bc_joint *joint, double gap_m, bc_joint **joint_out);

// The same joint with a modulus square to the member, force per length that one length of
// difference between the deflections makes: the two layers then have a deflection each.
int32_t bc_joint_with_transverse(const bc_joint *joint,
                                 double modulus_N_per_m2,
                                 bc_joint **joint_out);

// The same slipping joint with a clearance, as of bolts in wider holes: it carries nothing until
// the slip, in either sense, has used it up.
int32_t bc_joint_with_clearance(const bc_joint *joint, double clearance_m, bc_joint **joint_out);

// The same joint with a creep factor of its own: at the end its moduli are divided by
// (1 + factor). Without it, the factor follows from wood-based layers; beside any other material
// it must be given.
int32_t bc_joint_with_creep_factor(const bc_joint *joint,
                                   double creep_factor,
                                   bc_joint **joint_out);

// The kind of a joint (BC_JOINT_...).
int32_t bc_joint_kind(const bc_joint *joint, int32_t *kind_out);

// Frees a joint; NULL is allowed.
void bc_joint_free(bc_joint *joint);

// The name of a joint.
int32_t bc_joint_name(const bc_joint *joint, char *buffer, int64_t capacity, int64_t *length_out);

// The name of the lower layer of a joint.
int32_t bc_joint_lower(const bc_joint *joint, char *buffer, int64_t capacity, int64_t *length_out);

// The name of the upper layer of a joint.
int32_t bc_joint_upper(const bc_joint *joint, char *buffer, int64_t capacity, int64_t *length_out);

// The gap that was stated. Where none was, has_value_out is 0 and the gap is left as it is.
int32_t bc_joint_gap(const bc_joint *joint, int32_t *has_value_out, double *gap_m_out);

// The modulus square to the member that was given. Where none was, has_value_out is 0 and the
// modulus is left as it is.
int32_t bc_joint_transverse(const bc_joint *joint,
                            int32_t *has_value_out,
                            double *modulus_N_per_m2_out);

// The clearance that was given. Where none was, has_value_out is 0 and the clearance is left as
// it is.
int32_t bc_joint_clearance(const bc_joint *joint, int32_t *has_value_out, double *clearance_m_out);

// The creep factor that was given. Where none was, has_value_out is 0 and the factor is left as it
// is; what follows then is told by bc_section_joint_creep_factor.
int32_t bc_joint_creep_factor(const bc_joint *joint,
                              int32_t *has_value_out,
                              double *creep_factor_out);

// A section of parts in layers, with joints between the layers. All that is wrong is reported at
// once.
int32_t bc_section_layered(const bc_part *const *parts,
                           int32_t part_count,
                           const bc_layer *const *layers,
                           int32_t layer_count,
                           const bc_joint *const *joints,
                           int32_t joint_count,
                           bc_section **section_out);

// The section whose every size and place lies at a share of the way from one section's (0) to
// another's (1), as along a taper. The two must be alike: the same parts of the same materials and
// shapes, placed in the same ways, in the same layers and joints.
int32_t bc_section_between(const bc_section *section,
                           const bc_section *other,
                           double share,
                           bc_section **section_out);

// The shear stiffness kGA at a time of a section whose parts are glued over their whole height, so
// that they act as one layer, bent about the level axis:
// kGA = EI^2/int [ES(z)^2/(sum of b_i G_i)] dz. It is worked out exactly, for edges that are level
// or upright.
int32_t bc_section_shear_stiffness(const bc_section *section,
                                   int32_t time,
                                   double *shear_stiffness_N_out);

// The shear stiffness kGA at a time of a section whose parts stand side by side, with their
// centroids at one height, and are only fastened to each other:
// 1/kGA = sum of (EI_i/EI)^2/kGA_i.
int32_t bc_section_fastened_shear_stiffness(const bc_section *section,
                                            int32_t time,
                                            double *shear_stiffness_N_out);

// What is meant by kGA, in words, for definitions of the shear coefficient differ.
int32_t bc_shear_stiffness_definition(char *buffer, int64_t capacity, int64_t *length_out);

// The number of layers of a section; of a section without layers, one named "section".
int32_t bc_section_layer_count(const bc_section *section, int32_t *count_out);

// A layer of a section as it was given. Layers are counted from 0.
int32_t bc_section_layer(const bc_section *section, int32_t index, bc_layer **layer_out);

// The number of joints of a section.
int32_t bc_section_joint_count(const bc_section *section, int32_t *count_out);

// A joint of a section as it was given. Joints are counted from 0.
int32_t bc_section_joint(const bc_section *section, int32_t index, bc_joint **joint_out);

// The number of merged layers of a section: layers that rigid joints hold together count once.
int32_t bc_section_merged_layer_count(const bc_section *section, int32_t *count_out);

// The number of layers in a merged layer. Merged layers are counted from 0.
int32_t bc_section_merged_layer_size(const bc_section *section, int32_t index, int32_t *count_out);

// The name of a layer in a merged layer. Both are counted from 0.
int32_t bc_section_merged_layer_name(const bc_section *section,
                                     int32_t index,
                                     int32_t layer_index,
                                     char *buffer,
                                     int64_t capacity,
                                     int64_t *length_out);

// Where a joint lies in its section: the clear distance of its two layers (zero where they touch),
// the z of the middle of the contact or gap, and the length of the contact line in the section, or
// of what faces across the gap.
int32_t bc_section_joint_place(const bc_section *section,
                               const char *joint,
                               double *distance_m_out,
                               double *z_m_out,
                               double *width_m_out);

// The slip modulus of a joint at a place along the member and a time: k on the first day and
// k/(1 + creep factor) at the end; zero of a loose joint, outside of all bands and where one of
// the layers is not there. Of a rigid joint has_value_out is 0 and the modulus is left as it is.
int32_t bc_section_joint_slip_modulus(const bc_section *section,
                                      const char *joint,
                                      double at_m,
                                      int32_t time,
                                      int32_t *has_value_out,
                                      double *modulus_N_per_m2_out);

// The modulus of a joint square to the member at a place along it and a time. Where the two layers
// share their deflection, has_value_out is 0 and the modulus is left as it is.
int32_t bc_section_joint_transverse_modulus(const bc_section *section,
                                            const char *joint,
                                            double at_m,
                                            int32_t time,
                                            int32_t *has_value_out,
                                            double *modulus_N_per_m2_out);

// The creep factor of a joint, given or found: at the end its moduli are divided by (1 + factor).
int32_t bc_section_joint_creep_factor(const bc_section *section,
                                      const char *joint,
                                      double *creep_factor_out);

// Where the creep factor of a joint comes from, in words.
int32_t bc_section_joint_creep_basis(const bc_section *section,
                                     const char *joint,
                                     char *buffer,
                                     int64_t capacity,
                                     int64_t *length_out);

// The clearance of a joint; zero unless it was given.
int32_t bc_section_joint_clearance(const bc_section *section,
                                   const char *joint,
                                   double *clearance_m_out);

// The number of stations of a joint: places along the member where one of its moduli changes, the
// ends of its bands and of its layers.
int32_t bc_section_joint_station_count(const bc_section *section,
                                       const char *joint,
                                       int32_t *count_out);

// A station of a joint. Stations are counted from 0, from the left.
int32_t bc_section_joint_station(const bc_section *section,
                                 const char *joint,
                                 int32_t index,
                                 double *at_m_out);

// The principal bending stiffnesses at a time, the greater and the smaller one, and the angle from
// the level axis to the axis of the greater one, positive from y towards z.
int32_t bc_section_principal(const bc_section *section,
                             int32_t time,
                             double *greater_Nm2_out,
                             double *smaller_Nm2_out,
                             double *angle_rad_out);

// The stress in a part at a point (y, z) under section forces, tension positive: an axial force
// (tension positive), a moment about the level axis (positive where it stretches the bottom) and
// one about the upright axis (positive where it stretches the side of negative y). A section that
// is held sideways (BC_SIDEWAYS_...) bends about the level axis only.
int32_t bc_section_stress_at(const bc_section *section,
                             int32_t time,
                             int32_t sideways,
                             const char *part,
                             double y_m,
                             double z_m,
                             double axial_N,
                             double moment_y_Nm,
                             double moment_z_Nm,
                             double *stress_Pa_out);

// The algebraically greatest (BC_STRESS_TENSION) or least (BC_STRESS_COMPRESSION) stress in a part
// under section forces, tension positive, with its point; forces as for bc_section_stress_at.
int32_t bc_section_stress_extreme(const bc_section *section,
                                  int32_t time,
                                  int32_t sideways,
                                  const char *part,
                                  double axial_N,
                                  double moment_y_Nm,
                                  double moment_z_Nm,
                                  int32_t sign,
                                  double *value_Pa_out,
                                  double *y_m_out,
                                  double *z_m_out);

// The same part with an initial strain, which it bears from the first day: about its own centroid
// (y_i, z_i), axial_strain - curvature_y (z - z_i) - curvature_z (y - y_i), positive where the part
// alone would grow longer; shrinkage is negative. axial_strain is a ratio: 0.001 is 1 mm in 1 m.
// The values are checked when the part is used in a section.
int32_t bc_part_with_initial_strain(const bc_part *part,
                                    double axial_strain,
                                    double curvature_y_per_m,
                                    double curvature_z_per_m,
                                    bc_part **part_out);

// The initial strain that a part bears, as bc_part_with_initial_strain takes it; zeros where none
// was given. Of a mirror image it is mirrored too.
int32_t bc_section_part_initial_strain(const bc_section *section,
                                       const char *part,
                                       double *axial_strain_out,
                                       double *curvature_y_per_m_out,
                                       double *curvature_z_per_m_out);

// The plane of strain that a section takes freely at a time under the initial strains of its
// parts: the strain at the elastic centroid (a ratio), the curvature about the level axis, positive
// where the bottom grows longer than the top, and about the upright axis, positive where the side
// of negative y grows longer. A section that is held sideways (BC_SIDEWAYS_...) bends about the
// level axis only.
int32_t bc_section_free_plane(const bc_section *section,
                              int32_t time,
                              int32_t sideways,
                              double *axial_strain_out,
                              double *curvature_y_per_m_out,
                              double *curvature_z_per_m_out);

// The section at a time as if made of one of its materials: the modulus of that material, and
// area, centroid and second moment of area about the horizontal axis of the transformed section.
int32_t bc_section_transformed(const bc_section *section,
                               int32_t time,
                               const char *material,
                               double *reference_modulus_Pa_out,
                               double *area_m2_out,
                               double *centroid_z_m_out,
                               double *second_moment_m4_out);

// One part of the transformed section: its modular ratio n = E/E_ref and its width n b.
int32_t bc_section_transformed_part(const bc_section *section,
                                    int32_t time,
                                    const char *material,
                                    const char *part,
                                    double *ratio_out,
                                    double *width_m_out);

// The stress in the real material of a part at height z under a moment (positive sagging),
// tension positive.
int32_t bc_section_transformed_stress(const bc_section *section,
                                      int32_t time,
                                      const char *material,
                                      const char *part,
                                      double z_m,
                                      double moment_Nm,
                                      double *stress_Pa_out);

// The number of loops of the outline of a part of the transformed section.
int32_t bc_section_transformed_loop_count(const bc_section *section,
                                          int32_t time,
                                          const char *material,
                                          const char *part,
                                          int32_t *count_out);

// The number of corners of a loop. Loops are counted from 0.
int32_t bc_section_transformed_corner_count(const bc_section *section,
                                            int32_t time,
                                            const char *material,
                                            const char *part,
                                            int32_t index,
                                            int32_t *count_out);

// The corners (y, z) of a loop: widths are multiplied about the part's own centroid, arcs are given
// by chords of at most 12 degrees. The places must have room for capacity numbers each; less room
// than there are corners is BC_ERROR_COUNT.
int32_t bc_section_transformed_corners(const bc_section *section,
                                       int32_t time,
                                       const char *material,
                                       const char *part,
                                       int32_t index,
                                       int32_t capacity,
                                       double *y_m_out,
                                       double *z_m_out);

// The category (BC_CATEGORY_...) of a word of documents: "A" to "H", "snow", "snow_high", "wind"
// or "temperature".
int32_t bc_category_of_name(const char *name, int32_t *category_out);

// The recommended combination factors of a category (BC_CATEGORY_...), EN 1990:2002 Table A1.1:
// psi_0 beside another variable action, psi_1 frequent, psi_2 quasi-permanent.
int32_t bc_category_factors(int32_t category,
                            double *psi_0_out,
                            double *psi_1_out,
                            double *psi_2_out);

// A permanent action, without loads yet.
int32_t bc_action_permanent(const char *name, bc_action **action_out);

// A variable action with its combination factors, without loads yet.
int32_t bc_action_variable(const char *name,
                           double psi_0,
                           double psi_1,
                           double psi_2,
                           bc_action **action_out);

// A variable action of a category (BC_CATEGORY_...), with the recommended combination factors of
// the category, without loads yet.
int32_t bc_action_variable_of_category(const char *name, int32_t category, bc_action **action_out);

// The same action, known to relieve what is being checked: a permanent action gets its smaller
// partial factor, a variable one is left out. Without this, an action is taken as unfavourable.
int32_t bc_action_favourable(const bc_action *action, bc_action **action_out);

// The same action with the weight of the section, over the whole member.
int32_t bc_action_with_self_weight(const bc_action *action, bc_action **action_out);

// The same action with a line load over the whole member, positive downward.
int32_t bc_action_with_uniform(const bc_action *action,
                               double load_N_per_m,
                               bc_action **action_out);

// The same action with a line load between two places, positive downward.
int32_t bc_action_with_partial(const bc_action *action,
                               double load_N_per_m,
                               double from_m,
                               double to_m,
                               bc_action **action_out);

// The same action with a point load, positive downward.
int32_t bc_action_with_point(const bc_action *action,
                             double load_N,
                             double at_m,
                             bc_action **action_out);

// The same action with a line load that changes linearly between two places, positive downward;
// a triangular load where one of its ends is zero.
int32_t bc_action_with_trapezoidal(const bc_action *action,
                                   double load_from_N_per_m,
                                   double load_to_N_per_m,
                                   double from_m,
                                   double to_m,
                                   bc_action **action_out);

// The same action with a load per area of floor or roof over the whole member, positive downward:
// line load = load x tributary width.
int32_t bc_action_with_area(const bc_action *action,
                            double load_N_per_m2,
                            double tributary_width_m,
                            bc_action **action_out);

// The same action with a load per area of floor or roof between two places, positive downward.
int32_t bc_action_with_partial_area(const bc_action *action,
                                    double load_N_per_m2,
                                    double tributary_width_m,
                                    double from_m,
                                    double to_m,
                                    bc_action **action_out);

// The same action with a couple, positive clockwise with x to the right and z up.
int32_t bc_action_with_couple(const bc_action *action,
                              double couple_Nm,
                              double at_m,
                              bc_action **action_out);

// Whether an action is favourable (1) or not (0).
int32_t bc_action_is_favourable(const bc_action *action, int32_t *is_favourable_out);

// The name of an action.
int32_t bc_action_name(const bc_action *action,
                       char *buffer,
                       int64_t capacity,
                       int64_t *length_out);

// Frees an action; NULL is allowed.
void bc_action_free(bc_action *action);

// The same action with its duration (BC_DURATION_...), by which the engineer chooses k_mod. It is
// kept with the action; no result depends on it.
int32_t bc_action_with_duration(const bc_action *action, int32_t duration, bc_action **action_out);

// The same action with its start, counted from the first day of the member. It is kept with the
// action; the final state takes the creep of the whole life. The value is checked when the action
// is used in a member.
int32_t bc_action_starting(const bc_action *action, double start_s, bc_action **action_out);

// The duration of an action (BC_DURATION_...). Where it was not said, has_value_out is 0 and the
// duration is left as it is.
int32_t bc_action_duration(const bc_action *action, int32_t *has_value_out, int32_t *duration_out);

// The start of an action, counted from the first day of the member. Where it was not said,
// has_value_out is 0 and the start is left as it is.
int32_t bc_action_start(const bc_action *action, int32_t *has_value_out, double *start_s_out);

// The same action with all its loads entering the layer of this name; without it, they enter the
// layer that bc_member_entered_layer tells. It matters where layers have deflections of their own,
// for the pressure in joints, and where forces act along the member.
int32_t bc_action_on(const bc_action *action, const char *layer, bc_action **action_out);

// The layer that the loads of an action enter. Where none was named, has_value_out is 0 and the
// other results are left as they are.
int32_t bc_action_layer(const bc_action *action,
                        int32_t *has_value_out,
                        char *buffer,
                        int64_t capacity,
                        int64_t *length_out);

// The same action with a line load per length of the plan, as snow on a pitched member, over the
// whole member; positive downward. Other line loads count per length of the member.
int32_t bc_action_with_plan_load(const bc_action *action,
                                 double load_N_per_m,
                                 bc_action **action_out);

// The same action with a line load per length of the plan between two places along the member.
int32_t bc_action_with_partial_plan_load(const bc_action *action,
                                         double load_N_per_m,
                                         double from_m,
                                         double to_m,
                                         bc_action **action_out);

// The same action with a force along the member, positive to the right, at a height z of the
// section.
int32_t bc_action_with_axial(const bc_action *action,
                             double load_N,
                             double at_m,
                             double height_m,
                             bc_action **action_out);

// The same action with a tendon that pulls its two anchors towards each other (a positive force is
// tension) and presses on the member where it turns: straight between its points, the first and
// last of which are the anchors; two points make a straight tendon. Places along the member and
// heights z of the section are two lists of one length, from the left.
int32_t bc_action_with_draped_tendon(const bc_action *action,
                                     double force_N,
                                     const double *at_m,
                                     const double *height_m,
                                     int32_t point_count,
                                     bc_action **action_out);

// The same action with a tendon as bc_action_with_draped_tendon, along the parabola through three
// points, the first and last of which are the anchors.
int32_t bc_action_with_parabolic_tendon(const bc_action *action,
                                        double force_N,
                                        const double *at_m,
                                        const double *height_m,
                                        int32_t point_count,
                                        bc_action **action_out);

// The same action with a support that sinks, positive downward.
int32_t bc_action_with_settlement(const bc_action *action,
                                  const char *support,
                                  double settlement_m,
                                  bc_action **action_out);

// The same action with a support that turns the section with it, positive clockwise.
int32_t bc_action_with_imposed_rotation(const bc_action *action,
                                        const char *support,
                                        double rotation_rad,
                                        bc_action **action_out);

// The same action with a change of temperature, positive where warmer, of the parts of these
// names; of none means of all. Each strains by its thermal expansion.
int32_t bc_action_with_temperature(const bc_action *action,
                                   double change_K,
                                   const char *const *part_names,
                                   int32_t part_count,
                                   bc_action **action_out);

// The same action with a top of the section that is warmer than its bottom by a difference,
// linearly between them, with the mean over the height unchanged.
int32_t bc_action_with_temperature_difference(const bc_action *action,
                                              double difference_K,
                                              bc_action **action_out);

// The same action with a free strain of a part: moisture, shrinkage, a built-in curvature, a
// locked strain. Its numbers are those of bc_part_with_initial_strain.
int32_t bc_action_with_free_strain(const bc_action *action,
                                   const char *part,
                                   double axial_strain,
                                   double curvature_y_per_m,
                                   double curvature_z_per_m,
                                   bc_action **action_out);

// A support of a kind (BC_SUPPORT_...) at a place from the left end. It is checked when it is used
// in a member (bc_plan_on_support).
int32_t bc_support_new(const char *name,
                       int32_t support_kind,
                       double at_m,
                       bc_support **support_out);

// The same support, holding the deflection by a spring instead of rigidly.
int32_t bc_support_with_spring(const bc_support *support,
                               double stiffness_N_per_m,
                               bc_support **support_out);

// The same support with a spring along the axis: of a pin or a fixed support in place of its rigid
// hold, of a roller in addition.
int32_t bc_support_with_axial_spring(const bc_support *support,
                                     double stiffness_N_per_m,
                                     bc_support **support_out);

// The same support with a spring against rotation: of a fixed support in place of its rigid hold,
// of a pin or roller in addition.
int32_t bc_support_with_rotational_spring(const bc_support *support,
                                          double stiffness_Nm_per_rad,
                                          bc_support **support_out);

// The same support, which can push up but not pull down: the member may lift off it.
int32_t bc_support_one_way(const bc_support *support, bc_support **support_out);

// The same support with its hold along the axis at a height z of the section, on the first of the
// layers that bear on it. Without it, all layers together are held at the elastic centroid of the
// section at the left end.
int32_t bc_support_at_height(const bc_support *support, double z_m, bc_support **support_out);

// The same support as a bearing of the layers of these names only; without it (or of none), of
// all. Its hold along the axis, if it has one, is then on the first of them.
int32_t bc_support_under(const bc_support *support,
                         const char *const *layer_names,
                         int32_t layer_count,
                         bc_support **support_out);

// The same support, holding a layer along the member by itself, at a height of the section.
int32_t bc_support_holding(const bc_support *support,
                           const char *layer,
                           double height_m,
                           bc_support **support_out);

// Frees a support; NULL is allowed.
void bc_support_free(bc_support *support);

// The name of a support.
int32_t bc_support_name(const bc_support *support,
                        char *buffer,
                        int64_t capacity,
                        int64_t *length_out);

// The kind of a support (BC_SUPPORT_...).
int32_t bc_support_kind(const bc_support *support, int32_t *kind_out);

// The place of a support, from the left end.
int32_t bc_support_place(const bc_support *support, double *at_m_out);

// The spring under a support. Where none was given, has_value_out is 0 and the stiffness is left
// as it is.
int32_t bc_support_spring(const bc_support *support,
                          int32_t *has_value_out,
                          double *stiffness_N_per_m_out);

// The spring of a support along the axis. Where none was given, has_value_out is 0 and the
// stiffness is left as it is.
int32_t bc_support_axial_spring(const bc_support *support,
                                int32_t *has_value_out,
                                double *stiffness_N_per_m_out);

// The spring of a support against rotation. Where none was given, has_value_out is 0 and the
// stiffness is left as it is.
int32_t bc_support_rotational_spring(const bc_support *support,
                                     int32_t *has_value_out,
                                     double *stiffness_Nm_per_rad_out);

// Whether the member may lift off a support (1) or not (0).
int32_t bc_support_is_one_way(const bc_support *support, int32_t *is_one_way_out);

// The height of the hold of a support along the axis. Where none was given, has_value_out is 0 and
// the height is left as it is.
int32_t bc_support_height(const bc_support *support, int32_t *has_value_out, double *z_m_out);

// The number of layers that bear on a support by name; none means all.
int32_t bc_support_layer_count(const bc_support *support, int32_t *count_out);

// The name of a layer that bears on a support. Layers are counted from 0.
int32_t bc_support_layer_name(const bc_support *support,
                              int32_t index,
                              char *buffer,
                              int64_t capacity,
                              int64_t *length_out);

// The number of layers that a support holds along the member by themselves.
int32_t bc_support_held_layer_count(const bc_support *support, int32_t *count_out);

// The name of a layer that a support holds by itself. Layers are counted from 0.
int32_t bc_support_held_layer_name(const bc_support *support,
                                   int32_t index,
                                   char *buffer,
                                   int64_t capacity,
                                   int64_t *length_out);

// The height at which a support holds a layer by itself. Layers are counted from 0.
int32_t bc_support_held_layer_height(const bc_support *support,
                                     int32_t index,
                                     double *height_m_out);

// A plan of a member of the given length, without supports yet.
int32_t bc_plan_of_length(const bc_section *section, double length_m, bc_plan **plan_out);

// A plan of a member on two supports at its ends: a pin "left" and a roller "right".
int32_t bc_plan_simple_span(const bc_section *section, double span_m, bc_plan **plan_out);

// The same plan with one more support: a name, a kind (BC_SUPPORT_...) and a place from the left
// end.
int32_t bc_plan_with_support(const bc_plan *plan,
                             const char *name,
                             int32_t support_kind,
                             double at_m,
                             bc_plan **plan_out);

// The same plan with one more action.
int32_t bc_plan_with_action(const bc_plan *plan, const bc_action *action, bc_plan **plan_out);

// The same plan with other partial factors for the fundamental combination than the recommended
// ones: of permanent actions that are unfavourable and favourable, and of variable actions.
int32_t bc_plan_with_partial_factors(const bc_plan *plan,
                                     double permanent,
                                     double permanent_favourable,
                                     double variable,
                                     bc_plan **plan_out);

// The same plan with one more combination, of one's own: the names of actions and their factors
// (two lists of one length; an action that is not named has the factor 0), and whether design
// strengths are compared under it (1) or not (0).
int32_t bc_plan_with_combination(const bc_plan *plan,
                                 const char *name,
                                 const char *const *action_names,
                                 const double *factors,
                                 int32_t factor_count,
                                 int32_t is_ultimate,
                                 bc_plan **plan_out);

// The same plan of a member that is held sideways or free to move (BC_SIDEWAYS_...); without this
// it is held.
int32_t bc_plan_with_sideways(const bc_plan *plan, int32_t sideways, bc_plan **plan_out);

// Checks a plan and makes the member; all that is wrong is reported at once.
int32_t bc_plan_check(const bc_plan *plan, bc_member **member_out);

// Frees a plan; NULL is allowed.
void bc_plan_free(bc_plan *plan);

// The same plan with one more support, described on its own (bc_support_new).
int32_t bc_plan_on_support(const bc_plan *plan, const bc_support *support, bc_plan **plan_out);

// The same plan with another section from a place on, to the right of all changes before.
int32_t bc_plan_with_step(const bc_plan *plan,
                          double at_m,
                          const bc_section *section,
                          bc_plan **plan_out);

// The same plan with a section that changes linearly between two places, to the right of all
// changes before, to a like one: the same parts, shapes and materials with other sizes.
int32_t bc_plan_with_taper(const bc_plan *plan,
                           double from_m,
                           double to_m,
                           const bc_section *section,
                           bc_plan **plan_out);

// The same plan with a hinge through all layers: no moment passes.
int32_t bc_plan_with_moment_hinge(const bc_plan *plan, double at_m, bc_plan **plan_out);

// The same plan with a hinge in one layer, which must have a deflection of its own: no moment of
// it passes.
int32_t bc_plan_with_layer_hinge(const bc_plan *plan,
                                 const char *layer,
                                 double at_m,
                                 bc_plan **plan_out);

// The same plan with a shear release: no shear force passes.
int32_t bc_plan_with_shear_hinge(const bc_plan *plan, double at_m, bc_plan **plan_out);

// The same plan with a butt joint of one layer: no axial force of it passes; its curvature goes on
// with that of the others.
int32_t bc_plan_with_butt_joint(const bc_plan *plan,
                                const char *layer,
                                double at_m,
                                bc_plan **plan_out);

// The same plan with an anchor, which stops the slip of a joint at a place, as an end plate or a
// notch does. Its name addresses its force.
int32_t bc_plan_with_anchor(const bc_plan *plan,
                            const char *name,
                            const char *joint,
                            double at_m,
                            bc_plan **plan_out);

// The same plan with an anchor that yields in proportion to its force: stiffness is force per
// slip.
int32_t bc_plan_with_elastic_anchor(const bc_plan *plan,
                                    const char *name,
                                    const char *joint,
                                    double at_m,
                                    double stiffness_N_per_m,
                                    bc_plan **plan_out);

// The same plan with shear deformation left out (BC_SHEAR_RIGID, also without this) or taken with
// kGA of each section (BC_SHEAR_FLEXIBLE).
int32_t bc_plan_with_shear(const bc_plan *plan, int32_t shear_model, bc_plan **plan_out);

// The same plan with shear deformation by the kGA that is given, the same all along the member and
// its life.
int32_t bc_plan_with_given_shear(const bc_plan *plan, double shear_stiffness_N, bc_plan **plan_out);

// The same plan of a member that rises to the right by an angle. Its length and all places are
// measured along it, gravity loads act downward, supports hold the vertical movement (a pin the
// level one too), and the deflection is square to the member.
int32_t bc_plan_with_pitch(const bc_plan *plan, double pitch_rad, bc_plan **plan_out);

// A member of the given length. Each support has a name, a kind (BC_SUPPORT_...) and a place
// from the left end; the three lists are of one length. All that is wrong is reported at once.
// Partial factors and combinations of one's own need a plan (bc_plan_of_length).
int32_t bc_member_new(const bc_section *section,
                      double length_m,
                      const char *const *support_names,
                      const int32_t *support_kinds,
                      const double *support_at_m,
                      int32_t support_count,
                      const bc_action *const *actions,
                      int32_t action_count,
                      bc_member **member_out);

// A member on two supports at its ends: a pin "left" and a roller "right".
int32_t bc_member_simple_span(const bc_section *section,
                              double span_m,
                              const bc_action *const *actions,
                              int32_t action_count,
                              bc_member **member_out);

// Solves a member for each action at each time.
int32_t bc_member_solve(const bc_member *member, bc_response **response_out);

// The length of a member.
int32_t bc_member_length(const bc_member *member, double *length_m_out);

// The number of combinations of the actions of a member.
int32_t bc_member_combination_count(const bc_member *member, int32_t *count_out);

// The name of a combination, by which results are addressed. Combinations are counted from 0.
int32_t bc_member_combination_name(const bc_member *member,
                                   int32_t index,
                                   char *buffer,
                                   int64_t capacity,
                                   int64_t *length_out);

// The number of notes on a member, for example on places that were merged.
int32_t bc_member_note_count(const bc_member *member, int32_t *count_out);

// A note on a member. Notes are counted from 0.
int32_t bc_member_note(const bc_member *member,
                       int32_t index,
                       char *buffer,
                       int64_t capacity,
                       int64_t *length_out);

// Frees a member; NULL is allowed.
void bc_member_free(bc_member *member);

// The section just right of a place (at the right end, just left of it).
int32_t bc_member_section_at(const bc_member *member, double at_m, bc_section **section_out);

// The number of parts of all sections along a member, each name once.
int32_t bc_member_part_count(const bc_member *member, int32_t *count_out);

// The name of a part of a member. Parts are counted from 0, in the order in which they come first
// from the left.
int32_t bc_member_part_name(const bc_member *member,
                            int32_t index,
                            char *buffer,
                            int64_t capacity,
                            int64_t *length_out);

// The number of supports of a member.
int32_t bc_member_support_count(const bc_member *member, int32_t *count_out);

// A support of a member. Supports are counted from 0, in the order given.
int32_t bc_member_support(const bc_member *member, int32_t index, bc_support **support_out);

// The number of changes of the section along a member.
int32_t bc_member_change_count(const bc_member *member, int32_t *count_out);

// A change of the section: its kind (BC_CHANGE_...) and where it begins and ends, which of a step
// is one place. Changes are counted from 0, from the left; bc_member_section_at gives the section
// after it.
int32_t bc_member_change(const bc_member *member,
                         int32_t index,
                         int32_t *change_kind_out,
                         double *from_m_out,
                         double *to_m_out);

// The number of hinges of a member.
int32_t bc_member_hinge_count(const bc_member *member, int32_t *count_out);

// What a hinge releases (BC_HINGE_...) and its place. Hinges are counted from 0, in the order
// given.
int32_t bc_member_hinge(const bc_member *member,
                        int32_t index,
                        int32_t *hinge_kind_out,
                        double *at_m_out);

// The layer that a hinge is in. Where it goes through all layers, has_value_out is 0 and the other
// results are left as they are.
int32_t bc_member_hinge_layer(const bc_member *member,
                              int32_t index,
                              int32_t *has_value_out,
                              char *buffer,
                              int64_t capacity,
                              int64_t *length_out);

// How the shear deformation of a member is taken (BC_SHEAR_...).
int32_t bc_member_shear(const bc_member *member, int32_t *shear_model_out);

// The kGA that was given. Where none was, has_value_out is 0 and the stiffness is left as it is.
int32_t bc_member_given_shear(const bc_member *member,
                              int32_t *has_value_out,
                              double *shear_stiffness_N_out);

// The pitch of a member. Where it has none, has_value_out is 0 and the pitch is left as it is.
int32_t bc_member_pitch(const bc_member *member, int32_t *has_value_out, double *pitch_rad_out);

// Whether layers have deflections of their own, by transverse moduli of their joints (1), or share
// one (0).
int32_t bc_member_has_deflections_of_layers(const bc_member *member, int32_t *has_deflections_out);

// Whether axial force takes part (1) or not (0): more than one support holds the axis, something
// acts along the member, or it is pitched.
int32_t bc_member_has_axial_force(const bc_member *member, int32_t *has_axial_force_out);

// The layer that loads of actions without a named layer enter: the highest one where all layers
// share one deflection, else the first.
int32_t bc_member_entered_layer(const bc_member *member,
                                char *buffer,
                                int64_t capacity,
                                int64_t *length_out);

// The kind (BC_COMBINATION_...) of a combination. Combinations are counted from 0.
int32_t bc_member_combination_kind(const bc_member *member, int32_t index, int32_t *kind_out);

// Whether design strengths are compared under a combination (1) or not (0).
int32_t bc_member_combination_is_ultimate(const bc_member *member,
                                          int32_t index,
                                          int32_t *is_ultimate_out);

// The number of actions of a member, which is the number of factors of each combination.
int32_t bc_member_action_count(const bc_member *member, int32_t *count_out);

// The factor of an action in a combination. Both are counted from 0, actions in the order given.
int32_t bc_member_combination_factor(const bc_member *member,
                                     int32_t index,
                                     int32_t action_index,
                                     double *factor_out);

// The partial factors of the fundamental combination: of permanent actions that are unfavourable
// and favourable, and of variable actions.
int32_t bc_member_partial_factors(const bc_member *member,
                                  double *permanent_out,
                                  double *permanent_favourable_out,
                                  double *variable_out);

// An extreme (BC_EXTREME_...) of a field (BC_FIELD_...) and its place, found from the roots of
// the field; the leftmost of equals. The value is in the SI unit of the field.
int32_t bc_response_extreme(const bc_response *response,
                            int32_t field,
                            const char *combination,
                            int32_t time,
                            int32_t extreme,
                            double *value_out,
                            double *at_m_out);

// The values of a field at count places, in the SI unit of the field. A shear force jumps at a
// point load or support: side (BC_SIDE_...) says which of the two values is meant. x_m and
// values_out may be the same list.
int32_t bc_response_values(const bc_response *response,
                           int32_t field,
                           const char *combination,
                           int32_t time,
                           int32_t side,
                           const double *x_m,
                           int32_t count,
                           double *values_out);

// The number of stations: the ends of the member, supports, point loads and ends of line loads.
int32_t bc_response_station_count(const bc_response *response, int32_t *count_out);

// The place of a station. Stations are counted from 0, from the left.
int32_t bc_response_station(const bc_response *response, int32_t index, double *at_m_out);

// The reaction of a support: force positive upward, couple positive clockwise with x to the right
// and z up (zero unless the support holds the rotation).
int32_t bc_response_reaction(const bc_response *response,
                             const char *combination,
                             int32_t time,
                             const char *support,
                             double *force_N_out,
                             double *couple_Nm_out);

// What is left of equilibrium and continuity in the solution, relative to its greatest terms.
int32_t bc_response_residual(const bc_response *response, double *residual_out);

// Frees a response; NULL is allowed.
void bc_response_free(bc_response *response);

// A field (BC_FIELD_...) of a member under a combination at a time.
int32_t bc_response_field(const bc_response *response,
                          int32_t field,
                          const char *combination,
                          int32_t time,
                          bc_field **field_out);

// A field (BC_JOINT_FIELD_...) of a joint that is not rigid, under a combination at a time. Loads
// that name no layer are taken to enter from above.
int32_t bc_response_joint_field(const bc_response *response,
                                int32_t joint_field,
                                const char *combination,
                                int32_t time,
                                const char *joint,
                                bc_field **field_out);

// A field (BC_LAYER_FIELD_...) of a layer, with the layers that rigid joints hold to it, under a
// combination at a time.
int32_t bc_response_layer_field(const bc_response *response,
                                int32_t layer_field,
                                const char *combination,
                                int32_t time,
                                const char *layer,
                                bc_field **field_out);

// An extreme (BC_EXTREME_...) of a field and its place; the leftmost of equals.
int32_t bc_field_extreme(const bc_field *field,
                         int32_t extreme,
                         double *value_out,
                         double *at_m_out);

// The values of a field at count places; where it jumps, side (BC_SIDE_...) says which of the two
// values is meant. x_m and values_out may be the same list.
int32_t bc_field_values(const bc_field *field,
                        int32_t side,
                        const double *x_m,
                        int32_t count,
                        double *values_out);

// The number of stations of a field: the places where its pieces meet.
int32_t bc_field_station_count(const bc_field *field, int32_t *count_out);

// The place of a station of a field. Stations are counted from 0, from the left.
int32_t bc_field_station(const bc_field *field, int32_t index, double *at_m_out);

// Frees a field; NULL is allowed.
void bc_field_free(bc_field *field);

// The composite action of a member of layers, seen at the place of its greatest deflection: its
// degree (w loose - w)/(w loose - w rigid), 0 where the joints do nothing and 1 where they do not
// slip; the bending stiffness with which a member without slip would deflect as much; the place;
// the deflection there, with all joints loose, and with all of them rigid.
int32_t bc_response_composite_action(const bc_response *response,
                                     const char *combination,
                                     int32_t time,
                                     double *degree_out,
                                     double *effective_stiffness_Nm2_out,
                                     double *at_m_out,
                                     double *deflection_m_out,
                                     double *loose_m_out,
                                     double *rigid_m_out);

// The level force of a support on the member, positive to the right; zero where no axial force
// takes part.
int32_t bc_response_reaction_along(const bc_response *response,
                                   const char *combination,
                                   int32_t time,
                                   const char *support,
                                   double *force_N_out);

// The force with which a support holds a layer along the member by itself, positive to the right.
int32_t bc_response_layer_reaction(const bc_response *response,
                                   const char *combination,
                                   int32_t time,
                                   const char *support,
                                   const char *layer,
                                   double *force_N_out);

// The number of one-way supports that the member leaves under a combination.
int32_t bc_response_lifted_count(const bc_response *response,
                                 const char *combination,
                                 int32_t time,
                                 int32_t *count_out);

// The name of a support that the member leaves under a combination. They are counted from 0.
int32_t bc_response_lifted_name(const bc_response *response,
                                const char *combination,
                                int32_t time,
                                int32_t index,
                                char *buffer,
                                int64_t capacity,
                                int64_t *length_out);

// How many linear solutions a combination took: one, unless the member may lift off supports or
// its joints have clearance.
int32_t bc_response_steps(const bc_response *response,
                          const char *combination,
                          int32_t time,
                          int32_t *count_out);

// The number of anchors of a member.
int32_t bc_member_anchor_count(const bc_member *member, int32_t *count_out);

// The name of an anchor. Anchors are counted from 0, in the order given.
int32_t bc_member_anchor_name(const bc_member *member,
                              int32_t index,
                              char *buffer,
                              int64_t capacity,
                              int64_t *length_out);

// The name of the joint whose slip an anchor stops.
int32_t bc_member_anchor_joint(const bc_member *member,
                               int32_t index,
                               char *buffer,
                               int64_t capacity,
                               int64_t *length_out);

// The place of an anchor, and its stiffness. Where it lets no slip at all, has_value_out is 0 and
// the stiffness is left as it is.
int32_t bc_member_anchor(const bc_member *member,
                         int32_t index,
                         double *at_m_out,
                         int32_t *has_value_out,
                         double *stiffness_N_per_m_out);

// The force of an anchor: with which it pulls the upper layer of its joint to the left; it bears
// the sign of the slip that it stops.
int32_t bc_response_anchor_force(const bc_response *response,
                                 const char *combination,
                                 int32_t time,
                                 const char *anchor,
                                 double *force_N_out);

// The greatest tension or compression (BC_STRESS_...) in a part, tension positive, with its
// place along the member and the point (y, z) of the section where it stands; where the member is
// held sideways, y is the middle of the part, for then all points of one height are stressed alike.
int32_t bc_response_stress(const bc_response *response,
                           const char *combination,
                           int32_t time,
                           const char *part,
                           int32_t sign,
                           double *value_Pa_out,
                           double *at_m_out,
                           double *y_m_out,
                           double *z_m_out);

// The stresses at count places along a fibre (BC_FIBRE_...) of a part, tension positive; where
// they jump, side (BC_SIDE_...) says which of the two values is meant.
int32_t bc_response_stress_values(const bc_response *response,
                                  const char *combination,
                                  int32_t time,
                                  const char *part,
                                  int32_t fibre,
                                  int32_t side,
                                  const double *x_m,
                                  int32_t count,
                                  double *values_Pa_out);

// The greatest utilisation of a part, stress over design strength, and its place along the
// member. Where the material has no design strengths, has_value_out is 0 and the other results
// are left as they are.
int32_t bc_response_utilisation(const bc_response *response,
                                const char *combination,
                                int32_t time,
                                const char *part,
                                int32_t *has_value_out,
                                double *value_out,
                                double *at_m_out);

// Whether a member is held sideways or free (BC_SIDEWAYS_...).
int32_t bc_member_sideways(const bc_member *member, int32_t *sideways_out);

// An extreme (BC_EXTREME_...) of the movement sideways, positive towards positive y, and its
// place; zero unless the member is free sideways and its section has no axis of symmetry.
int32_t bc_response_sideways_extreme(const bc_response *response,
                                     const char *combination,
                                     int32_t time,
                                     int32_t extreme,
                                     double *value_m_out,
                                     double *at_m_out);

// The movement sideways at count places, positive towards positive y.
int32_t bc_response_sideways_values(const bc_response *response,
                                    const char *combination,
                                    int32_t time,
                                    const double *x_m,
                                    int32_t count,
                                    double *values_m_out);

// The number of spans of a member: between neighbouring supports, and the overhangs.
int32_t bc_member_span_count(const bc_member *member, int32_t *count_out);

// The name of a span, by which results are addressed: "A to B" between the supports A and B,
// "before A" and "beyond B" for overhangs. Spans are counted from 0, from the left.
int32_t bc_member_span_name(const bc_member *member,
                            int32_t index,
                            char *buffer,
                            int64_t capacity,
                            int64_t *length_out);

// The ends of a span from the left end of the member, and whether one of them is free (1) or both
// are supported (0).
int32_t bc_member_span(const bc_member *member,
                       const char *span,
                       double *from_m_out,
                       double *to_m_out,
                       int32_t *is_cantilever_out);

// An extreme (BC_EXTREME_...) of the deflection of one span, positive downward, and its place:
// between two supports from the chord through them, of an overhang from its support.
int32_t bc_response_span_extreme(const bc_response *response,
                                 const char *combination,
                                 int32_t time,
                                 const char *span,
                                 int32_t extreme,
                                 double *value_m_out,
                                 double *at_m_out);

// The deflections of one span at count places, from the left end of the member.
int32_t bc_response_span_values(const bc_response *response,
                                const char *combination,
                                int32_t time,
                                const char *span,
                                const double *x_m,
                                int32_t count,
                                double *values_m_out);

// An extreme (BC_EXTREME_...) of a component (BC_COMPONENT_...) of the deflection of a span and
// its place, under a characteristic combination or one of one's own; the camber counts for
// BC_COMPONENT_REMAINING, and is NULL where there is none.
int32_t bc_response_component_extreme(const bc_response *response,
                                      int32_t component,
                                      const char *combination,
                                      const char *span,
                                      const bc_camber *camber,
                                      int32_t extreme,
                                      double *value_m_out,
                                      double *at_m_out);

// The values of a component of the deflection of a span at count places, from the left end of the
// member; parameters as for bc_response_component_extreme.
int32_t bc_response_component_values(const bc_response *response,
                                     int32_t component,
                                     const char *combination,
                                     const char *span,
                                     const bc_camber *camber,
                                     const double *x_m,
                                     int32_t count,
                                     double *values_m_out);

// The camber of a shape (BC_SHAPE_...) against the deflection of a combination at a time: fraction
// (1 is all of it) of the deflection over the chord from one support to another, its rise rounded
// (BC_ROUNDING_...) to whole steps and made zero where it is less than least_m, with ordinates at
// the ends of equal divisions of the chord.
int32_t bc_camber_new(const bc_response *response,
                      int32_t shape,
                      const char *combination,
                      int32_t time,
                      double fraction,
                      const char *from_support,
                      const char *to_support,
                      double step_m,
                      int32_t rounding,
                      double least_m,
                      int32_t divisions,
                      bc_camber **camber_out);

// The shape (BC_SHAPE_...) of a camber.
int32_t bc_camber_shape(const bc_camber *camber, int32_t *shape_out);

// The radius of an arc, negative where it hangs. For other shapes and for no rise, has_value_out
// is 0 and the radius is left as it is.
int32_t bc_camber_radius(const bc_camber *camber, int32_t *has_value_out, double *radius_m_out);

// The rise before rounding: of the deflection at the middle of the chord, or of the best arc.
int32_t bc_camber_target(const bc_camber *camber, double *target_m_out);

// The rise at the middle of the chord, rounded; positive upward; zero where it would be less than
// the least worth building.
int32_t bc_camber_rise(const bc_camber *camber, double *rise_m_out);

// The places of the chord's ends, from the left end of the member.
int32_t bc_camber_chord(const bc_camber *camber, double *from_m_out, double *to_m_out);

// The number of ordinates, one more than the divisions.
int32_t bc_camber_ordinate_count(const bc_camber *camber, int32_t *count_out);

// An ordinate: its distance from the left end of the chord and the height above the chord,
// positive upward. Ordinates are counted from 0, from the left.
int32_t bc_camber_ordinate(const bc_camber *camber,
                           int32_t index,
                           double *station_m_out,
                           double *ordinate_m_out);

// The height above the chord at a place of the member, positive upward.
int32_t bc_camber_ordinate_at(const bc_camber *camber, double at_m, double *ordinate_m_out);

// Frees a camber; NULL is allowed.
void bc_camber_free(bc_camber *camber);

// An extreme (BC_EXTREME_...) of the line that remains after a camber and its place: deflection
// less camber, positive below the straight line.
int32_t bc_response_remaining_extreme(const bc_response *response,
                                      const char *combination,
                                      int32_t time,
                                      const bc_camber *camber,
                                      int32_t extreme,
                                      double *value_m_out,
                                      double *at_m_out);

// The heights of the line that remains after a camber at count places, positive below the
// straight line.
int32_t bc_response_remaining_values(const bc_response *response,
                                     const char *combination,
                                     int32_t time,
                                     const bc_camber *camber,
                                     const double *x_m,
                                     int32_t count,
                                     double *values_m_out);

// The readings to expect at the stations of a camber, with the named parts there, lying and
// standing on two trestles, whose places are given from the left end of the member.
int32_t bc_response_readings(const bc_response *response,
                             const bc_camber *camber,
                             double left_trestle_m,
                             double right_trestle_m,
                             const char *const *part_names,
                             int32_t part_count,
                             bc_readings **readings_out);

// The number of readings, one for each ordinate of the camber.
int32_t bc_readings_count(const bc_readings *readings, int32_t *count_out);

// A reading, from the chord through the ends of the design chord, positive upward: its distance
// from the left end of the chord, the height with the member lying on its side, and the height
// with the member standing on the trestles. Readings are counted from 0, from the left.
int32_t bc_readings_reading(const bc_readings *readings,
                            int32_t index,
                            double *station_m_out,
                            double *lying_m_out,
                            double *standing_m_out);

// Frees readings; NULL is allowed.
void bc_readings_free(bc_readings *readings);

// A limit of a component (BC_COMPONENT_...): the length of each span over a number, under every
// characteristic combination. The length of an overhang is its own.
int32_t bc_limit_span_over(int32_t component, double number, bc_limit **limit_out);

// A limit of a component (BC_COMPONENT_...): a length, whatever the span, under every
// characteristic combination.
int32_t bc_limit_value(int32_t component, double value_m, bc_limit **limit_out);

// The same limit for one span only.
int32_t bc_limit_in_span(const bc_limit *limit, const char *span, bc_limit **limit_out);

// The same limit under one combination only.
int32_t bc_limit_under(const bc_limit *limit, const char *combination, bc_limit **limit_out);

// Frees a limit; NULL is allowed.
void bc_limit_free(bc_limit *limit);

// Compares limits with the results, one check per limit and span, each under the combination that
// uses it most. The camber counts for BC_COMPONENT_REMAINING, and is NULL where there is none.
int32_t bc_response_check_limits(const bc_response *response,
                                 const bc_limit *const *limits,
                                 int32_t limit_count,
                                 const bc_camber *camber,
                                 bc_checks **checks_out);

// The number of checks.
int32_t bc_checks_count(const bc_checks *checks, int32_t *count_out);

// The component (BC_COMPONENT_...) of a check. Checks are counted from 0, limit by limit and
// within each from the left.
int32_t bc_checks_component(const bc_checks *checks, int32_t index, int32_t *component_out);

// The name of the span of a check.
int32_t bc_checks_span(const bc_checks *checks,
                       int32_t index,
                       char *buffer,
                       int64_t capacity,
                       int64_t *length_out);

// The name of the combination of a check: the one that gives the greatest value.
int32_t bc_checks_combination(const bc_checks *checks,
                              int32_t index,
                              char *buffer,
                              int64_t capacity,
                              int64_t *length_out);

// The numbers of a check: the value of greatest magnitude of the component with its sign, its
// place, the allowed magnitude, and the utilisation |value| / allowed; above 1 the limit is not
// kept.
int32_t bc_checks_values(const bc_checks *checks,
                         int32_t index,
                         double *value_m_out,
                         double *at_m_out,
                         double *allowed_m_out,
                         double *utilisation_out);

// Frees checks; NULL is allowed.
void bc_checks_free(bc_checks *checks);

// A layer for the simplified methods: EA, EI about its own elastic centroid, height with the
// centroid at its middle, z of the centroid upward from any level that is the same for all layers,
// modulus of the material whose stresses are asked for, and width.
int32_t bc_layer_input_new(double axial_stiffness_N,
                           double bending_stiffness_Nm2,
                           double height_m,
                           double centroid_z_m,
                           double modulus_Pa,
                           double width_m,
                           bc_layer_input **layer_input_out);

// A rectangular layer of one material for the simplified methods: EA = E b h, EI = E b h^3/12.
int32_t bc_layer_input_rectangle(double modulus_Pa,
                                 double width_m,
                                 double height_m,
                                 double centroid_z_m,
                                 bc_layer_input **layer_input_out);

// EA and EI of a layer for the simplified methods.
int32_t bc_layer_input_stiffness(const bc_layer_input *layer_input,
                                 double *axial_stiffness_N_out,
                                 double *bending_stiffness_Nm2_out);

// Frees a layer for the simplified methods; NULL is allowed.
void bc_layer_input_free(bc_layer_input *layer_input);

// The length l of the half sine wave that the simplified methods take for a span or cantilever
// (BC_LENGTH_...).
int32_t bc_reference_length(int32_t length_kind, double length_m, double *reference_length_m_out);

// Two or three layers that slip on each other by the gamma method (EN 1995-1-1:2004 Annex B, from
// memory): layers from the lowest upward, the slip modulus per length of each joint between two of
// them, and a span or cantilever (BC_LENGTH_...).
int32_t bc_simplified_gamma(const bc_layer_input *const *layers,
                            int32_t layer_count,
                            const double *slip_moduli_N_per_m2,
                            int32_t joint_count,
                            int32_t length_kind,
                            double length_m,
                            bc_simplified **simplified_out);

// Any number of layers that slip on each other under a load in the form of half a sine wave, for
// which this is exact; parameters as for bc_simplified_gamma.
int32_t bc_simplified_sine_layers(const bc_layer_input *const *layers,
                                  int32_t layer_count,
                                  const double *slip_moduli_N_per_m2,
                                  int32_t joint_count,
                                  int32_t length_kind,
                                  double length_m,
                                  bc_simplified **simplified_out);

// The number of warnings: where the method does not hold, or only nearly.
int32_t bc_simplified_warning_count(const bc_simplified *simplified, int32_t *count_out);

// A warning in words. Warnings are counted from 0.
int32_t bc_simplified_warning(const bc_simplified *simplified,
                              int32_t index,
                              char *buffer,
                              int64_t capacity,
                              int64_t *length_out);

// Frees layers by a simplified method; NULL is allowed.
void bc_simplified_free(bc_simplified *simplified);

// The number of layers.
int32_t bc_simplified_layer_count(const bc_simplified *simplified, int32_t *count_out);

// The effective bending stiffness EI_ef.
int32_t bc_simplified_bending_stiffness(const bc_simplified *simplified,
                                        double *bending_stiffness_Nm2_out);

// The arm of a layer, positive upward: a_i of the gamma method, the effective arm e_i of sine
// layers (which is gamma_i a_i). Layers are counted from 0, from the lowest upward.
int32_t bc_simplified_arm(const bc_simplified *simplified, int32_t layer_index, double *arm_m_out);

// The factor gamma_i of a layer: 1 for a rigid joint, 0 for a loose one. Of sine layers, which
// have none, has_value_out is 0 and the factor is left as it is.
int32_t bc_simplified_gamma_factor(const bc_simplified *simplified,
                                   int32_t layer_index,
                                   int32_t *has_value_out,
                                   double *factor_out);

// The layer with gamma = 1 of the gamma method, counted from 0. Of sine layers, which have none,
// has_value_out is 0 and the layer is left as it is.
int32_t bc_simplified_base_layer(const bc_simplified *simplified,
                                 int32_t *has_value_out,
                                 int32_t *layer_index_out);

// The axial force of a layer under a moment, tension positive.
int32_t bc_simplified_axial_force(const bc_simplified *simplified,
                                  double moment_Nm,
                                  int32_t layer_index,
                                  double *force_N_out);

// The normal stresses of a layer under a moment, tension positive: at the middle of its height,
// what bending of the layer adds at its lower edge, and their sums at its lower and its upper edge.
int32_t bc_simplified_stress(const bc_simplified *simplified,
                             double moment_Nm,
                             int32_t layer_index,
                             double *axial_Pa_out,
                             double *bending_Pa_out,
                             double *bottom_Pa_out,
                             double *top_Pa_out);

// The flow of a joint under a shear force. Joints are counted from 0, from the lowest upward.
int32_t bc_simplified_flow(const bc_simplified *simplified,
                           double shear_N,
                           int32_t joint_index,
                           double *flow_N_per_m_out);

// The force of a fastener of a joint under a shear force: flow x spacing. Spacings are those of
// all joints, as of one row: with n rows, the spacing along the member over n.
int32_t bc_simplified_fastener_force(const bc_simplified *simplified,
                                     double shear_N,
                                     const double *spacings_m,
                                     int32_t spacing_count,
                                     int32_t joint_index,
                                     double *force_N_out);

// The greatest shear stress of a layer under a shear force, with its sign, and its place in the z
// of the layers.
int32_t bc_simplified_shear_stress(const bc_simplified *simplified,
                                   double shear_N,
                                   int32_t layer_index,
                                   double *value_Pa_out,
                                   double *z_m_out);

// The effective spacing of fasteners that stand closer where the shear force is greater:
// 0.75 s_min + 0.25 s_max (EN 1995-1-1:2004 9.1.3 and Annex B, from memory).
int32_t bc_effective_spacing(double least_m, double greatest_m, double *spacing_m_out);

// The number of warnings on an effective spacing: where it does not hold, or only nearly.
int32_t bc_effective_spacing_warning_count(double least_m, double greatest_m, int32_t *count_out);

// A warning on an effective spacing, in words. Warnings are counted from 0.
int32_t bc_effective_spacing_warning(double least_m,
                                     double greatest_m,
                                     int32_t index,
                                     char *buffer,
                                     int64_t capacity,
                                     int64_t *length_out);

// Deflection, flow and stresses of each span by a simplified method (BC_METHOD_...), beside the
// exact ones, under a combination at a time. It covers prismatic members of layers on each other
// under transverse loads; free strains are left out of both sides.
int32_t bc_response_compare(const bc_response *response,
                            const char *combination,
                            int32_t time,
                            int32_t method,
                            bc_comparison **comparison_out);

// The number of spans of a comparison.
int32_t bc_comparison_span_count(const bc_comparison *comparison, int32_t *count_out);

// The name of a span. Spans are counted from 0, from the left.
int32_t bc_comparison_span_name(const bc_comparison *comparison,
                                int32_t span_index,
                                char *buffer,
                                int64_t capacity,
                                int64_t *length_out);

// The length of the half sine wave for a span, the effective bending stiffness with the moduli of
// the time, and whether the combination holds free strains, which are left out (1) or not (0).
int32_t bc_comparison_span(const bc_comparison *comparison,
                           int32_t span_index,
                           double *length_m_out,
                           double *bending_stiffness_Nm2_out,
                           int32_t *leaves_out_strains_out);

// The number of factors gamma of a span, one for each layer; none of sine layers.
int32_t bc_comparison_factor_count(const bc_comparison *comparison,
                                   int32_t span_index,
                                   int32_t *count_out);

// A factor gamma of a span. Layers are counted from 0, from the lowest upward.
int32_t bc_comparison_factor(const bc_comparison *comparison,
                             int32_t span_index,
                             int32_t layer_index,
                             double *factor_out);

// The greatest deflection of a span with its place, by the method and by the exact solution, and
// their ratio less one.
int32_t bc_comparison_deflection(const bc_comparison *comparison,
                                 int32_t span_index,
                                 double *value_m_out,
                                 double *at_m_out,
                                 double *exact_value_m_out,
                                 double *exact_at_m_out,
                                 double *difference_out);

// The number of warnings for a span: where the method does not hold, or only nearly.
int32_t bc_comparison_warning_count(const bc_comparison *comparison,
                                    int32_t span_index,
                                    int32_t *count_out);

// A warning for a span, in words. Warnings are counted from 0.
int32_t bc_comparison_warning(const bc_comparison *comparison,
                              int32_t span_index,
                              int32_t index,
                              char *buffer,
                              int64_t capacity,
                              int64_t *length_out);

// Frees a comparison; NULL is allowed.
void bc_comparison_free(bc_comparison *comparison);

// The number of joints of a span in a comparison.
int32_t bc_comparison_joint_count(const bc_comparison *comparison,
                                  int32_t span_index,
                                  int32_t *count_out);

// The name of a joint in a comparison. Joints are counted from 0.
int32_t bc_comparison_joint_name(const bc_comparison *comparison,
                                 int32_t span_index,
                                 int32_t joint_index,
                                 char *buffer,
                                 int64_t capacity,
                                 int64_t *length_out);

// The greatest flow of a joint over a span with its place, by the method and by the exact
// solution, with the sign of the slip.
int32_t bc_comparison_flow(const bc_comparison *comparison,
                           int32_t span_index,
                           int32_t joint_index,
                           double *flow_N_per_m_out,
                           double *at_m_out,
                           double *exact_flow_N_per_m_out,
                           double *exact_at_m_out);

// The number of layers of a span in a comparison.
int32_t bc_comparison_layer_count(const bc_comparison *comparison,
                                  int32_t span_index,
                                  int32_t *count_out);

// The name of a layer in a comparison. Layers are counted from 0, from the lowest upward.
int32_t bc_comparison_layer_name(const bc_comparison *comparison,
                                 int32_t span_index,
                                 int32_t layer_index,
                                 char *buffer,
                                 int64_t capacity,
                                 int64_t *length_out);

// The stresses of a layer by the method at the place of the span's greatest moment: at the middle
// of its height, and what bending of the layer adds at its lower edge; with the place, and the
// axial force and moment of the layer there by the exact solution.
int32_t bc_comparison_stress(const bc_comparison *comparison,
                             int32_t span_index,
                             int32_t layer_index,
                             double *axial_Pa_out,
                             double *bending_Pa_out,
                             double *at_m_out,
                             double *exact_axial_N_out,
                             double *exact_moment_Nm_out);

// Reads a job from a text in TOML or JSON (BC_FORMAT_...). All that is wrong is reported at once.
int32_t bc_job_read(const char *document, int32_t format, bc_job **job_out);

// Reads a job from a file whose name ends in .toml or .json.
int32_t bc_job_open(const char *file_name, bc_job **job_out);

// A job written back as a text in TOML or JSON (BC_FORMAT_...).
int32_t bc_job_text(const bc_job *job,
                    int32_t format,
                    char *buffer,
                    int64_t capacity,
                    int64_t *length_out);

// Solves a job.
int32_t bc_job_solve(const bc_job *job, bc_outcome **outcome_out);

// Reads and solves a job in one call: the outcome as JSON.
int32_t bc_job_run(const char *document,
                   int32_t format,
                   char *buffer,
                   int64_t capacity,
                   int64_t *length_out);

// The JSON schema of the job document.
int32_t bc_job_schema(char *buffer, int64_t capacity, int64_t *length_out);

// Frees a job; NULL is allowed.
void bc_job_free(bc_job *job);

// The number at a path, in the SI unit that the path ends with, for example
// combinations["quasi-permanent"].final.deflection.greatest.value_m
int32_t bc_outcome_number(const bc_outcome *outcome, const char *path, double *value_out);

// The text at a path, for example job.mark
int32_t bc_outcome_text(const bc_outcome *outcome,
                        const char *path,
                        char *buffer,
                        int64_t capacity,
                        int64_t *length_out);

// The outcome as JSON.
int32_t bc_outcome_json(const bc_outcome *outcome,
                        char *buffer,
                        int64_t capacity,
                        int64_t *length_out);

// The outcome as a plain text of 80 columns, for reading.
int32_t bc_outcome_summary(const bc_outcome *outcome,
                           char *buffer,
                           int64_t capacity,
                           int64_t *length_out);

// The JSON schema of the outcome document.
int32_t bc_outcome_schema(char *buffer, int64_t capacity, int64_t *length_out);

// Frees an outcome; NULL is allowed.
void bc_outcome_free(bc_outcome *outcome);

// EI of layers stacked upward and joined rigidly, about the horizontal axis through their elastic
// centroid, in N m2. The three lists hold count numbers each, from the lowest layer upward.
double bc_plain_stack_bending_stiffness(const double *modulus_Pa,
                                        const double *width_m,
                                        const double *height_m,
                                        int32_t count);

// EA of layers stacked upward, in N; lists as for bc_plain_stack_bending_stiffness.
double bc_plain_stack_axial_stiffness(const double *modulus_Pa,
                                      const double *width_m,
                                      const double *height_m,
                                      int32_t count);

// Height of the elastic centroid of layers stacked upward above the lowest edge, in m; lists as
// for bc_plain_stack_bending_stiffness.
double bc_plain_stack_centroid(const double *modulus_Pa,
                               const double *width_m,
                               const double *height_m,
                               int32_t count);

// The greatest deflection in m of a beam on two supports at its ends under a line load over its
// whole length; positive downward, as the load.
double bc_plain_simple_span_uniform_deflection(double span_m,
                                               double bending_stiffness_Nm2,
                                               double load_N_per_m);

// The greatest deflection in m of a beam on two supports at its ends under a point load at a
// distance from its left end; positive downward, as the load.
double bc_plain_simple_span_point_deflection(double span_m,
                                             double bending_stiffness_Nm2,
                                             double load_N,
                                             double at_m);

// The effective modulus in Pa of a material that creeps, E/(1 + creep factor).
double bc_plain_effective_modulus(double modulus_Pa, double creep_factor);

// The creep factor phi of concrete between two ages; parameters as for
// bc_material_concrete_with_creep.
double bc_plain_concrete_creep(double mean_strength_Pa,
                               double relative_humidity_percent,
                               double notional_size_m,
                               double age_at_loading_s,
                               double age_at_end_s,
                               int32_t cement);

// A number of one unit as a number of another unit of the same kind: 50 from "mm" to "m" is 0.05.
double bc_plain_convert(double value, const char *from_unit, const char *to_unit);

// The mean modulus E_cm in Pa of concrete at 28 days of a mean compressive strength f_cm.
double bc_plain_concrete_mean_modulus(double mean_strength_Pa);

// The share of its strength at 28 days that concrete has at an age, by its cement
// (BC_CEMENT_...).
double bc_plain_concrete_strength_share(double age_s, int32_t cement);

// The mean modulus in Pa of concrete at an age, from the one at 28 days.
double bc_plain_concrete_modulus_at_age(double mean_modulus_Pa, double age_s, int32_t cement);

// The whole shrinkage of concrete at an age, drying and autogenous, as a strain that is positive
// where it shortens: mean strength f_cm, relative humidity in percent (50 means 50 %), notional
// size h0 = 2 A/u, the ages at which drying begins and at which the shrinkage is asked for.
double bc_plain_concrete_shrinkage(double mean_strength_Pa,
                                   double relative_humidity_percent,
                                   double notional_size_m,
                                   double age_at_drying_s,
                                   double age_at_end_s,
                                   int32_t cement);

#ifdef __cplusplus
}  // extern "C"
#endif  // __cplusplus

#endif  /* BEAMCORE_H */
