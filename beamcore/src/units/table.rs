//! The table of all types and their units: the one place where a factor stands.
//!
//! A row is `"symbol" (num, den) constructor getter literal;` with `si = x * num / den`, the
//! fraction in lowest terms, so that a unit built from others has the same bits. A row without a
//! literal shares its symbol with another type, which has the number literal. The powers in brackets
//! are those of mass, length, time and, where there is one, temperature.
//!
//! Exact by definition: inch = 25.4 mm and foot = 12 inches (so in = 127/5000 m, ft = 381/1250 m);
//! pound = 0.45359237 kg; pound-force = 0.45359237 * 9.80665 N = 8896443230521/2e12 N; kip = 1000
//! pounds-force; year = 365.25 days. Only `deg` (pi is no fraction) and `kip in2` (its numerator
//! is wider than 53 bits) have a numerator that is itself rounded, once.

/// Calls the macro `$make` with the whole table.
macro_rules! with_table {
    ($make:ident) => {
        $make! {
            /// A length, a distance or a deflection.
            Length "length" [0, 1, 0] prints ["m", "mm"] {
                "m" (1.0, 1.0) from_m to_m m;
                "mm" (1.0, 1000.0) from_mm to_mm mm;
                "cm" (1.0, 100.0) from_cm to_cm cm;
                "in" (127.0, 5000.0) from_inch to_inch inch;
                "ft" (381.0, 1250.0) from_ft to_ft ft;
            }
            /// An area, A.
            Area "area" [0, 2, 0] prints ["m2", "mm2"] {
                "m2" (1.0, 1.0) from_m2 to_m2 m2;
                "mm2" (1.0, 1e6) from_mm2 to_mm2 mm2;
                "cm2" (1.0, 1e4) from_cm2 to_cm2 cm2;
                "in2" (16_129.0, 25e6) from_in2 to_in2 in2;
                "ft2" (145_161.0, 1_562_500.0) from_ft2 to_ft2 ft2;
            }
            /// A first moment of area, S = int z dA.
            FirstMoment "first moment of area" [0, 3, 0] prints ["m3", "mm3"] {
                "m3" (1.0, 1.0) from_m3 to_m3 m3;
                "mm3" (1.0, 1e9) from_mm3 to_mm3 mm3;
                "cm3" (1.0, 1e6) from_cm3 to_cm3 cm3;
                "in3" (2_048_383.0, 125e9) from_in3 to_in3 in3;
            }
            /// A second moment of area, I = int z^2 dA.
            SecondMoment "second moment of area" [0, 4, 0] prints ["m4", "mm4"] {
                "m4" (1.0, 1.0) from_m4 to_m4 m4;
                "mm4" (1.0, 1e12) from_mm4 to_mm4 mm4;
                "cm4" (1.0, 1e8) from_cm4 to_cm4 cm4;
                "in4" (260_144_641.0, 625e12) from_in4 to_in4 in4;
            }
            /// A force: a point load, a reaction, a shear force or an axial force.
            Force "force" [1, 1, -2] prints ["kN", "N"] {
                "N" (1.0, 1.0) from_N to_N N;
                "kN" (1000.0, 1.0) from_kN to_kN kN;
                "MN" (1e6, 1.0) from_MN to_MN MN;
                "lbf" (8_896_443_230_521.0, 2e12) from_lbf to_lbf lbf;
                "kip" (8_896_443_230_521.0, 2e9) from_kip to_kip kip;
            }
            /// A load along the member, force per length.
            LineLoad "line load" [1, 0, -2] prints ["kN/m", "N/m"] {
                "N/m" (1.0, 1.0) from_N_per_m to_N_per_m N_per_m;
                "kN/m" (1000.0, 1.0) from_kN_per_m to_kN_per_m kN_per_m;
                "N/mm" (1000.0, 1.0) from_N_per_mm to_N_per_mm N_per_mm;
                "plf" (8_896_443_230_521.0, 609_600_000_000.0) from_plf to_plf plf;
                "lbf/ft" (8_896_443_230_521.0, 609_600_000_000.0)
                    from_lbf_per_ft to_lbf_per_ft lbf_per_ft;
                "kip/ft" (8_896_443_230_521.0, 609_600_000.0)
                    from_kip_per_ft to_kip_per_ft kip_per_ft;
            }
            /// A bending moment or a couple.
            Moment "moment" [1, 2, -2] prints ["kN m", "N m"] {
                "N m" (1.0, 1.0) from_N_m to_N_m N_m;
                "kN m" (1000.0, 1.0) from_kN_m to_kN_m kN_m;
                "N mm" (1.0, 1000.0) from_N_mm to_N_mm N_mm;
                "kip ft" (3_389_544_870_828_501.0, 25e11) from_kip_ft to_kip_ft kip_ft;
                "kip in" (1_129_848_290_276_167.0, 1e13) from_kip_in to_kip_in kip_in;
                "lbf ft" (3_389_544_870_828_501.0, 25e14) from_lbf_ft to_lbf_ft lbf_ft;
            }
            /// A stress or a strength, force per area.
            Stress "stress" [1, -1, -2] prints ["MPa", "Pa"] {
                "Pa" (1.0, 1.0) from_Pa to_Pa Pa;
                "kPa" (1000.0, 1.0) from_kPa to_kPa kPa;
                "MPa" (1e6, 1.0) from_MPa to_MPa MPa;
                "GPa" (1e9, 1.0) from_GPa to_GPa;
                "N/mm2" (1e6, 1.0) from_N_per_mm2 to_N_per_mm2 N_per_mm2;
                "psi" (8_896_443_230_521.0, 1_290_320_000.0) from_psi to_psi psi;
                "ksi" (8_896_443_230_521.0, 1_290_320.0) from_ksi to_ksi ksi;
            }
            /// A modulus of elasticity E or a shear modulus G.
            Modulus "modulus" [1, -1, -2] prints ["GPa", "MPa", "Pa"] {
                "Pa" (1.0, 1.0) from_Pa to_Pa;
                "kPa" (1000.0, 1.0) from_kPa to_kPa;
                "MPa" (1e6, 1.0) from_MPa to_MPa;
                "GPa" (1e9, 1.0) from_GPa to_GPa GPa;
                "N/mm2" (1e6, 1.0) from_N_per_mm2 to_N_per_mm2;
                "psi" (8_896_443_230_521.0, 1_290_320_000.0) from_psi to_psi;
                "ksi" (8_896_443_230_521.0, 1_290_320.0) from_ksi to_ksi;
            }
            /// A load per area of floor or roof; times a tributary width it is a line load.
            AreaLoad "area load" [1, -1, -2] prints ["kN/m2", "N/m2"] {
                "N/m2" (1.0, 1.0) from_N_per_m2 to_N_per_m2 N_per_m2;
                "kN/m2" (1000.0, 1.0) from_kN_per_m2 to_kN_per_m2 kN_per_m2;
                "psf" (8_896_443_230_521.0, 185_806_080_000.0) from_psf to_psf psf;
                "lbf/ft2" (8_896_443_230_521.0, 185_806_080_000.0)
                    from_lbf_per_ft2 to_lbf_per_ft2 lbf_per_ft2;
            }
            /// A density, rho, mass per volume.
            Density "density" [1, -3, 0] prints ["kg/m3"] {
                "kg/m3" (1.0, 1.0) from_kg_per_m3 to_kg_per_m3 kg_per_m3;
                "lb/ft3" (28_349_523_125.0, 1_769_802_912.0)
                    from_lb_per_ft3 to_lb_per_ft3 lb_per_ft3;
            }
            /// An axial stiffness, EA = sum E_i A_i.
            AxialStiffness "axial stiffness" [1, 1, -2] prints ["MN", "kN", "N"] {
                "N" (1.0, 1.0) from_N to_N;
                "kN" (1000.0, 1.0) from_kN to_kN;
                "MN" (1e6, 1.0) from_MN to_MN;
            }
            /// A bending stiffness, EI = sum E_i (I_i + A_i (z_i - z_n)^2).
            BendingStiffness "bending stiffness" [1, 3, -2] prints ["MN m2", "kN m2", "N m2"] {
                "N m2" (1.0, 1.0) from_N_m2 to_N_m2 N_m2;
                "kN m2" (1000.0, 1.0) from_kN_m2 to_kN_m2 kN_m2;
                "MN m2" (1e6, 1.0) from_MN_m2 to_MN_m2 MN_m2;
                "N mm2" (1.0, 1e6) from_N_mm2 to_N_mm2 N_mm2;
                "kip in2" (8_896_443_230_521.0 * 16_129.0, 5e16) from_kip_in2 to_kip_in2 kip_in2;
            }
            /// A curvature, kappa, change of slope per length.
            Curvature "curvature" [0, -1, 0] prints ["/m"] {
                "/m" (1.0, 1.0) from_per_m to_per_m per_m;
                "/mm" (1000.0, 1.0) from_per_mm to_per_mm per_mm;
            }
            /// A strain, change of length per length. Its unit is the number one: as a text, a
            /// bare number is a strain.
            Strain "strain" [0, 0, 0] prints ["permille"] {
                "1" (1.0, 1.0) from_ratio to_ratio ratio;
                "permille" (1.0, 1000.0) from_permille to_permille permille;
            }
            /// An angle or a slope.
            Angle "angle" [0, 0, 0] prints ["rad", "mrad"] {
                "rad" (1.0, 1.0) from_rad to_rad rad;
                "mrad" (1.0, 1000.0) from_mrad to_mrad mrad;
                "deg" (std::f64::consts::PI, 180.0) from_deg to_deg deg;
            }
            /// A thermal expansion, alpha, strain per degree of warming.
            ThermalExpansion "thermal expansion" [0, 0, 0, -1] prints ["/K"] {
                "/K" (1.0, 1.0) from_per_K to_per_K per_K;
            }
            /// A mass.
            Mass "mass" [1, 0, 0] prints ["kg"] {
                "kg" (1.0, 1.0) from_kg to_kg kg;
                "t" (1000.0, 1.0) from_t to_t t;
                "lb" (45_359_237.0, 1e8) from_lb to_lb lb;
            }
            /// A mass per length of the member.
            LineMass "line mass" [1, -1, 0] prints ["kg/m"] {
                "kg/m" (1.0, 1.0) from_kg_per_m to_kg_per_m kg_per_m;
                "lb/ft" (45_359_237.0, 30_480_000.0) from_lb_per_ft to_lb_per_ft lb_per_ft;
            }
            /// A length of time.
            Duration "duration" [0, 0, 1] prints ["year", "d", "h", "s"] {
                "s" (1.0, 1.0) from_s to_s s;
                "h" (3600.0, 1.0) from_h to_h h;
                "d" (86_400.0, 1.0) from_d to_d d;
                "year" (31_557_600.0, 1.0) from_year to_year year;
            }
            /// A joint's stiffness per length, k: the force per length that one length of slip makes.
            SlipModulus "slip modulus" [1, -1, -2] prints ["N/mm2", "N/m2"] {
                "N/m2" (1.0, 1.0) from_N_per_m2 to_N_per_m2;
                "kN/m2" (1000.0, 1.0) from_kN_per_m2 to_kN_per_m2;
                "N/mm2" (1e6, 1.0) from_N_per_mm2 to_N_per_mm2;
            }
            /// A shear flow of a joint, T: the force per length that it passes on.
            ShearFlow "shear flow" [1, 0, -2] prints ["kN/m", "N/m"] {
                "N/m" (1.0, 1.0) from_N_per_m to_N_per_m;
                "kN/m" (1000.0, 1.0) from_kN_per_m to_kN_per_m;
                "N/mm" (1000.0, 1.0) from_N_per_mm to_N_per_mm;
            }
            /// The slip modulus K of one fastener in one shear plane: force per slip.
            FastenerStiffness "slip modulus of a fastener" [1, 0, -2] prints ["N/mm", "N/m"] {
                "N/m" (1.0, 1.0) from_N_per_m to_N_per_m;
                "N/mm" (1000.0, 1.0) from_N_per_mm to_N_per_mm;
                "kN/mm" (1e6, 1.0) from_kN_per_mm to_kN_per_mm kN_per_mm;
            }
            /// The stiffness of a spring: force per displacement.
            SpringStiffness "spring stiffness" [1, 0, -2] prints ["kN/m", "N/m"] {
                "N/m" (1.0, 1.0) from_N_per_m to_N_per_m;
                "kN/m" (1000.0, 1.0) from_kN_per_m to_kN_per_m;
                "N/mm" (1000.0, 1.0) from_N_per_mm to_N_per_mm;
                "kN/mm" (1e6, 1.0) from_kN_per_mm to_kN_per_mm;
            }
            /// The stiffness of a spring against rotation: moment per angle.
            RotationalStiffness "rotational stiffness" [1, 2, -2] prints ["kN m/rad", "N m/rad"] {
                "N m/rad" (1.0, 1.0) from_N_m_per_rad to_N_m_per_rad N_m_per_rad;
                "kN m/rad" (1000.0, 1.0) from_kN_m_per_rad to_kN_m_per_rad kN_m_per_rad;
            }
            /// A shear stiffness, kGA: shear force per shear angle.
            ShearStiffness "shear stiffness" [1, 1, -2] prints ["MN", "kN", "N"] {
                "N" (1.0, 1.0) from_N to_N;
                "kN" (1000.0, 1.0) from_kN to_kN;
                "MN" (1e6, 1.0) from_MN to_MN;
            }
            /// A change of temperature, positive for warmer; it is a difference and no reading of a
            /// thermometer.
            TemperatureChange "temperature change" [0, 0, 0, 1] prints ["K"] {
                "K" (1.0, 1.0) from_K to_K K;
                "degF" (5.0, 9.0) from_degF to_degF degF;
            }
        }
    };
}
