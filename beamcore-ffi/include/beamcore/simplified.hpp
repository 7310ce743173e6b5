// Simplified methods for layers that slip on each other: hand formulas, without a member.
#ifndef BEAMCORE_SIMPLIFIED_HPP
#define BEAMCORE_SIMPLIFIED_HPP

#include "../beamcore_units.hpp"
#include "handle.hpp"

namespace beamcore {

// A simplified method for layers that slip.
enum class SimplifiedMethod : std::int32_t {
    // EN 1995-1-1:2004 Annex B, for two or three layers.
    gamma = BC_METHOD_GAMMA,
    // For any number of layers.
    sine_layers = BC_METHOD_SINE_LAYERS,
};

// What the simplified methods know of a layer. Layers are listed from the lowest upward.
struct LayerInput {
    AxialStiffness axial;
    // EI about the layer's own elastic centroid.
    BendingStiffness bending;
    // With the centroid at its middle.
    Length height;
    // Upward from any level that is the same for all layers.
    Length centroid_z;
    // Of the material whose stresses are asked for.
    Modulus modulus;
    Length width;

    // A rectangular layer of one material.
    static LayerInput rectangle(Modulus modulus, Length width, Length height, Length centroid_z) {
        const auto layer =
            detail::make<bc_layer_input>(bc_layer_input_free, [&](bc_layer_input **out) {
                return bc_layer_input_rectangle(modulus.si(), width.si(), height.si(),
                                                centroid_z.si(), out);
            });
        double axial = 0.0, bending = 0.0;
        detail::check(bc_layer_input_stiffness(layer.get(), &axial, &bending));
        return LayerInput{AxialStiffness::from_si(axial),
                          BendingStiffness::from_si(bending),
                          height,
                          centroid_z,
                          modulus,
                          width};
    }
};

// What the length l of the half sine wave is taken from.
class ReferenceLength {
public:
    // A single span L: l = L.
    static ReferenceLength span(Length length) { return {BC_LENGTH_SPAN, length}; }
    // A span L of a member of several spans: l = 0.8 L.
    static ReferenceLength continuous(Length length) { return {BC_LENGTH_CONTINUOUS, length}; }
    // A cantilever of length L: l = 2 L.
    static ReferenceLength cantilever(Length length) { return {BC_LENGTH_CANTILEVER, length}; }

    // l.
    Length length() const {
        return Length::from_si(detail::number(
            [&](double *out) { return bc_reference_length(kind_, length_.si(), out); }));
    }

private:
    ReferenceLength(std::int32_t kind, Length length) : kind_(kind), length_(length) {}

    friend class SimplifiedLayers;

    std::int32_t kind_;
    Length length_;
};

// The normal stresses of a layer under a moment, tension positive.
struct LayerStress {
    // At the middle of the height.
    Stress axial;
    // What bending of the layer adds at its lower edge and takes off at its upper.
    Stress bending;
    Stress bottom;
    Stress top;
};

// The greatest shear stress of a layer, with its place in the z of the layers.
struct ShearStress {
    Stress value;
    Length z;
};

// What the gamma method and sine layers have in common.
class SimplifiedLayers {
public:
    // The effective bending stiffness EI_ef.
    BendingStiffness bending_stiffness() const {
        return BendingStiffness::from_si(detail::number(
            [&](double *out) { return bc_simplified_bending_stiffness(get(), out); }));
    }

    // The arm of each layer, positive upward: a_i of the gamma method, the effective arm e_i of
    // sine layers.
    std::vector<Length> arms() const {
        return of_layers<Length>([&](std::int32_t layer, double *out) {
            return bc_simplified_arm(get(), layer, out);
        });
    }

    // The axial force of each layer under a moment.
    std::vector<Force> axial_forces(Moment moment) const {
        return of_layers<Force>([&](std::int32_t layer, double *out) {
            return bc_simplified_axial_force(get(), moment.si(), layer, out);
        });
    }

    // The normal stresses of each layer under a moment.
    std::vector<LayerStress> stresses(Moment moment) const {
        std::vector<LayerStress> list;
        for (std::int32_t layer = 0; layer < layer_count(); ++layer) {
            double axial = 0.0, bending = 0.0, bottom = 0.0, top = 0.0;
            detail::check(bc_simplified_stress(get(), moment.si(), layer, &axial, &bending,
                                               &bottom, &top));
            list.push_back(LayerStress{Stress::from_si(axial), Stress::from_si(bending),
                                       Stress::from_si(bottom), Stress::from_si(top)});
        }
        return list;
    }

    // The flow of each joint under a shear force, from the lowest upward.
    std::vector<ShearFlow> flows(Force shear) const {
        return of_joints<ShearFlow>([&](std::int32_t joint, double *out) {
            return bc_simplified_flow(get(), shear.si(), joint, out);
        });
    }

    // The force of a fastener of each joint under a shear force: flow x spacing, the spacing as of
    // one row: with n rows, the spacing along the member over n.
    std::vector<Force> fastener_forces(Force shear, const std::vector<Length> &spacings) const {
        std::vector<double> spacings_m;
        for (const Length spacing : spacings) {
            spacings_m.push_back(spacing.si());
        }
        return of_joints<Force>([&](std::int32_t joint, double *out) {
            return bc_simplified_fastener_force(get(), shear.si(), spacings_m.data(),
                                                detail::size(spacings_m.size()), joint, out);
        });
    }

    // The greatest shear stress of each layer under a shear force.
    std::vector<ShearStress> shear_stresses(Force shear) const {
        std::vector<ShearStress> list;
        for (std::int32_t layer = 0; layer < layer_count(); ++layer) {
            double value = 0.0, z = 0.0;
            detail::check(bc_simplified_shear_stress(get(), shear.si(), layer, &value, &z));
            list.push_back(ShearStress{Stress::from_si(value), Length::from_si(z)});
        }
        return list;
    }

    // Where the method does not hold, or only nearly.
    std::vector<std::string> warnings() const {
        return detail::texts(get(), bc_simplified_warning_count, bc_simplified_warning);
    }

    // The handle of the C ABI; it lives as long as this object or a copy of it.
    const bc_simplified *get() const { return handle_.get(); }

protected:
    using Make = decltype(&bc_simplified_gamma);

    SimplifiedLayers(Make make, const std::vector<LayerInput> &layers,
                     const std::vector<SlipModulus> &joints, ReferenceLength length)
        : handle_(detail::make<bc_simplified>(bc_simplified_free, [&](bc_simplified **out) {
              std::vector<detail::Shared<bc_layer_input>> inputs;
              for (const LayerInput &layer : layers) {
                  inputs.push_back(input(layer));
              }
              const auto handles = detail::handles<bc_layer_input>(inputs);
              std::vector<double> moduli;
              for (const SlipModulus modulus : joints) {
                  moduli.push_back(modulus.si());
              }
              return make(handles.data(), detail::size(handles.size()), moduli.data(),
                          detail::size(moduli.size()), length.kind_, length.length_.si(), out);
          })) {}

    std::int32_t layer_count() const {
        return detail::count(
            [&](std::int32_t *out) { return bc_simplified_layer_count(get(), out); });
    }

    template <class Q, class Get> std::vector<Q> of_layers(Get get_value) const {
        return listed<Q>(layer_count(), get_value);
    }

private:
    static detail::Shared<bc_layer_input> input(const LayerInput &layer) {
        return detail::make<bc_layer_input>(bc_layer_input_free, [&](bc_layer_input **out) {
            return bc_layer_input_new(layer.axial.si(), layer.bending.si(), layer.height.si(),
                                      layer.centroid_z.si(), layer.modulus.si(), layer.width.si(),
                                      out);
        });
    }

    template <class Q, class Get> std::vector<Q> of_joints(Get get_value) const {
        return listed<Q>(layer_count() - 1, get_value);
    }

    template <class Q, class Get>
    static std::vector<Q> listed(std::int32_t count, Get get_value) {
        std::vector<Q> list;
        for (std::int32_t index = 0; index < count; ++index) {
            list.push_back(Q::from_si(
                detail::number([&](double *out) { return get_value(index, out); })));
        }
        return list;
    }

    detail::Shared<bc_simplified> handle_;
};

// Two or three layers that slip on each other, by the gamma method (EN 1995-1-1:2004 Annex B, from
// memory): with the slip modulus per length of each joint between two of them.
class Gamma : public SimplifiedLayers {
public:
    Gamma(const std::vector<LayerInput> &layers, const std::vector<SlipModulus> &joints,
          ReferenceLength length)
        : SimplifiedLayers(bc_simplified_gamma, layers, joints, length) {}

    // gamma_i of each layer: 1 for a rigid joint, 0 for a loose one.
    std::vector<double> factors() const {
        std::vector<double> list;
        for (std::int32_t layer = 0; layer < layer_count(); ++layer) {
            std::int32_t has_value = 0;
            list.push_back(detail::number([&](double *out) {
                return bc_simplified_gamma_factor(get(), layer, &has_value, out);
            }));
        }
        return list;
    }

    // The position of the layer with gamma = 1.
    std::int32_t base_layer() const {
        std::int32_t has_value = 0;
        return detail::count([&](std::int32_t *out) {
            return bc_simplified_base_layer(get(), &has_value, out);
        });
    }
};

// Any number of layers that slip on each other under a load in the form of half a sine wave, for
// which this is exact.
class SineLayers : public SimplifiedLayers {
public:
    SineLayers(const std::vector<LayerInput> &layers, const std::vector<SlipModulus> &joints,
               ReferenceLength length)
        : SimplifiedLayers(bc_simplified_sine_layers, layers, joints, length) {}
};

// An effective spacing, with where it does not hold or only nearly.
struct EffectiveSpacing {
    Length spacing;
    std::vector<std::string> warnings;
};

// The effective spacing of fasteners that stand closer where the shear force is greater:
// 0.75 s_min + 0.25 s_max.
inline EffectiveSpacing effective_spacing(Length least, Length greatest) {
    const double spacing = detail::number(
        [&](double *out) { return bc_effective_spacing(least.si(), greatest.si(), out); });
    const std::int32_t count = detail::count([&](std::int32_t *out) {
        return bc_effective_spacing_warning_count(least.si(), greatest.si(), out);
    });
    std::vector<std::string> warnings;
    for (std::int32_t index = 0; index < count; ++index) {
        warnings.push_back(
            detail::text([&](char *buffer, std::int64_t capacity, std::int64_t *length) {
                return bc_effective_spacing_warning(least.si(), greatest.si(), index, buffer,
                                                    capacity, length);
            }));
    }
    return EffectiveSpacing{Length::from_si(spacing), std::move(warnings)};
}

} // namespace beamcore

#endif // BEAMCORE_SIMPLIFIED_HPP
