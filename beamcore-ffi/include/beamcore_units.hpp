// Generated from the units table of beamcore; do not edit.
#ifndef BEAMCORE_UNITS_HPP
#define BEAMCORE_UNITS_HPP

namespace beamcore {

// Length: one double in the SI unit m.
class Length {
public:
    static constexpr Length from_si(double si) { return Length(si); }
    constexpr double si() const { return si_; }

    // The unit m.
    static constexpr Length from_m(double x) { return Length(x * 1.0 / 1.0); }
    constexpr double to_m() const { return si_ * 1.0 / 1.0; }

    // The unit mm.
    static constexpr Length from_mm(double x) { return Length(x * 1.0 / 1000.0); }
    constexpr double to_mm() const { return si_ * 1000.0 / 1.0; }

    // The unit cm.
    static constexpr Length from_cm(double x) { return Length(x * 1.0 / 100.0); }
    constexpr double to_cm() const { return si_ * 100.0 / 1.0; }

    // The unit in.
    static constexpr Length from_inch(double x) { return Length(x * 127.0 / 5000.0); }
    constexpr double to_inch() const { return si_ * 5000.0 / 127.0; }

    // The unit ft.
    static constexpr Length from_ft(double x) { return Length(x * 381.0 / 1250.0); }
    constexpr double to_ft() const { return si_ * 1250.0 / 381.0; }

    friend constexpr bool operator==(Length a, Length b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Length a, Length b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Length a, Length b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Length a, Length b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Length a, Length b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Length a, Length b) { return a.si_ >= b.si_; }

    friend constexpr Length operator+(Length a, Length b) { return Length(a.si_ + b.si_); }
    friend constexpr Length operator-(Length a, Length b) { return Length(a.si_ - b.si_); }
    friend constexpr Length operator-(Length a) { return Length(-a.si_); }
    friend constexpr Length operator*(Length a, double x) { return Length(a.si_ * x); }
    friend constexpr Length operator*(double x, Length a) { return Length(x * a.si_); }
    friend constexpr Length operator/(Length a, double x) { return Length(a.si_ / x); }
    friend constexpr double operator/(Length a, Length b) { return a.si_ / b.si_; }

private:
    explicit constexpr Length(double si) : si_(si) {}
    double si_;
};

// Area: one double in the SI unit m2.
class Area {
public:
    static constexpr Area from_si(double si) { return Area(si); }
    constexpr double si() const { return si_; }

    // The unit m2.
    static constexpr Area from_m2(double x) { return Area(x * 1.0 / 1.0); }
    constexpr double to_m2() const { return si_ * 1.0 / 1.0; }

    // The unit mm2.
    static constexpr Area from_mm2(double x) { return Area(x * 1.0 / 1000000.0); }
    constexpr double to_mm2() const { return si_ * 1000000.0 / 1.0; }

    // The unit cm2.
    static constexpr Area from_cm2(double x) { return Area(x * 1.0 / 10000.0); }
    constexpr double to_cm2() const { return si_ * 10000.0 / 1.0; }

    // The unit in2.
    static constexpr Area from_in2(double x) { return Area(x * 16129.0 / 25000000.0); }
    constexpr double to_in2() const { return si_ * 25000000.0 / 16129.0; }

    // The unit ft2.
    static constexpr Area from_ft2(double x) { return Area(x * 145161.0 / 1562500.0); }
    constexpr double to_ft2() const { return si_ * 1562500.0 / 145161.0; }

    friend constexpr bool operator==(Area a, Area b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Area a, Area b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Area a, Area b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Area a, Area b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Area a, Area b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Area a, Area b) { return a.si_ >= b.si_; }

    friend constexpr Area operator+(Area a, Area b) { return Area(a.si_ + b.si_); }
    friend constexpr Area operator-(Area a, Area b) { return Area(a.si_ - b.si_); }
    friend constexpr Area operator-(Area a) { return Area(-a.si_); }
    friend constexpr Area operator*(Area a, double x) { return Area(a.si_ * x); }
    friend constexpr Area operator*(double x, Area a) { return Area(x * a.si_); }
    friend constexpr Area operator/(Area a, double x) { return Area(a.si_ / x); }
    friend constexpr double operator/(Area a, Area b) { return a.si_ / b.si_; }

private:
    explicit constexpr Area(double si) : si_(si) {}
    double si_;
};

// First moment of area: one double in the SI unit m3.
class FirstMoment {
public:
    static constexpr FirstMoment from_si(double si) { return FirstMoment(si); }
    constexpr double si() const { return si_; }

    // The unit m3.
    static constexpr FirstMoment from_m3(double x) { return FirstMoment(x * 1.0 / 1.0); }
    constexpr double to_m3() const { return si_ * 1.0 / 1.0; }

    // The unit mm3.
    static constexpr FirstMoment from_mm3(double x) { return FirstMoment(x * 1.0 / 1000000000.0); }
    constexpr double to_mm3() const { return si_ * 1000000000.0 / 1.0; }

    // The unit cm3.
    static constexpr FirstMoment from_cm3(double x) { return FirstMoment(x * 1.0 / 1000000.0); }
    constexpr double to_cm3() const { return si_ * 1000000.0 / 1.0; }

    // The unit in3.
    static constexpr FirstMoment from_in3(double x) { return FirstMoment(x * 2048383.0 / 125000000000.0); }
    constexpr double to_in3() const { return si_ * 125000000000.0 / 2048383.0; }

    friend constexpr bool operator==(FirstMoment a, FirstMoment b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(FirstMoment a, FirstMoment b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(FirstMoment a, FirstMoment b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(FirstMoment a, FirstMoment b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(FirstMoment a, FirstMoment b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(FirstMoment a, FirstMoment b) { return a.si_ >= b.si_; }

    friend constexpr FirstMoment operator+(FirstMoment a, FirstMoment b) { return FirstMoment(a.si_ + b.si_); }
    friend constexpr FirstMoment operator-(FirstMoment a, FirstMoment b) { return FirstMoment(a.si_ - b.si_); }
    friend constexpr FirstMoment operator-(FirstMoment a) { return FirstMoment(-a.si_); }
    friend constexpr FirstMoment operator*(FirstMoment a, double x) { return FirstMoment(a.si_ * x); }
    friend constexpr FirstMoment operator*(double x, FirstMoment a) { return FirstMoment(x * a.si_); }
    friend constexpr FirstMoment operator/(FirstMoment a, double x) { return FirstMoment(a.si_ / x); }
    friend constexpr double operator/(FirstMoment a, FirstMoment b) { return a.si_ / b.si_; }

private:
    explicit constexpr FirstMoment(double si) : si_(si) {}
    double si_;
};

// Second moment of area: one double in the SI unit m4.
class SecondMoment {
public:
    static constexpr SecondMoment from_si(double si) { return SecondMoment(si); }
    constexpr double si() const { return si_; }

    // The unit m4.
    static constexpr SecondMoment from_m4(double x) { return SecondMoment(x * 1.0 / 1.0); }
    constexpr double to_m4() const { return si_ * 1.0 / 1.0; }

    // The unit mm4.
    static constexpr SecondMoment from_mm4(double x) { return SecondMoment(x * 1.0 / 1000000000000.0); }
    constexpr double to_mm4() const { return si_ * 1000000000000.0 / 1.0; }

    // The unit cm4.
    static constexpr SecondMoment from_cm4(double x) { return SecondMoment(x * 1.0 / 100000000.0); }
    constexpr double to_cm4() const { return si_ * 100000000.0 / 1.0; }

    // The unit in4.
    static constexpr SecondMoment from_in4(double x) { return SecondMoment(x * 260144641.0 / 625000000000000.0); }
    constexpr double to_in4() const { return si_ * 625000000000000.0 / 260144641.0; }

    friend constexpr bool operator==(SecondMoment a, SecondMoment b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(SecondMoment a, SecondMoment b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(SecondMoment a, SecondMoment b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(SecondMoment a, SecondMoment b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(SecondMoment a, SecondMoment b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(SecondMoment a, SecondMoment b) { return a.si_ >= b.si_; }

    friend constexpr SecondMoment operator+(SecondMoment a, SecondMoment b) { return SecondMoment(a.si_ + b.si_); }
    friend constexpr SecondMoment operator-(SecondMoment a, SecondMoment b) { return SecondMoment(a.si_ - b.si_); }
    friend constexpr SecondMoment operator-(SecondMoment a) { return SecondMoment(-a.si_); }
    friend constexpr SecondMoment operator*(SecondMoment a, double x) { return SecondMoment(a.si_ * x); }
    friend constexpr SecondMoment operator*(double x, SecondMoment a) { return SecondMoment(x * a.si_); }
    friend constexpr SecondMoment operator/(SecondMoment a, double x) { return SecondMoment(a.si_ / x); }
    friend constexpr double operator/(SecondMoment a, SecondMoment b) { return a.si_ / b.si_; }

private:
    explicit constexpr SecondMoment(double si) : si_(si) {}
    double si_;
};

// Force: one double in the SI unit N.
class Force {
public:
    static constexpr Force from_si(double si) { return Force(si); }
    constexpr double si() const { return si_; }

    // The unit N.
    static constexpr Force from_N(double x) { return Force(x * 1.0 / 1.0); }
    constexpr double to_N() const { return si_ * 1.0 / 1.0; }

    // The unit kN.
    static constexpr Force from_kN(double x) { return Force(x * 1000.0 / 1.0); }
    constexpr double to_kN() const { return si_ * 1.0 / 1000.0; }

    // The unit MN.
    static constexpr Force from_MN(double x) { return Force(x * 1000000.0 / 1.0); }
    constexpr double to_MN() const { return si_ * 1.0 / 1000000.0; }

    // The unit lbf.
    static constexpr Force from_lbf(double x) { return Force(x * 8896443230521.0 / 2000000000000.0); }
    constexpr double to_lbf() const { return si_ * 2000000000000.0 / 8896443230521.0; }

    // The unit kip.
    static constexpr Force from_kip(double x) { return Force(x * 8896443230521.0 / 2000000000.0); }
    constexpr double to_kip() const { return si_ * 2000000000.0 / 8896443230521.0; }

    friend constexpr bool operator==(Force a, Force b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Force a, Force b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Force a, Force b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Force a, Force b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Force a, Force b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Force a, Force b) { return a.si_ >= b.si_; }

    friend constexpr Force operator+(Force a, Force b) { return Force(a.si_ + b.si_); }
    friend constexpr Force operator-(Force a, Force b) { return Force(a.si_ - b.si_); }
    friend constexpr Force operator-(Force a) { return Force(-a.si_); }
    friend constexpr Force operator*(Force a, double x) { return Force(a.si_ * x); }
    friend constexpr Force operator*(double x, Force a) { return Force(x * a.si_); }
    friend constexpr Force operator/(Force a, double x) { return Force(a.si_ / x); }
    friend constexpr double operator/(Force a, Force b) { return a.si_ / b.si_; }

private:
    explicit constexpr Force(double si) : si_(si) {}
    double si_;
};

// Line load: one double in the SI unit N/m.
class LineLoad {
public:
    static constexpr LineLoad from_si(double si) { return LineLoad(si); }
    constexpr double si() const { return si_; }

    // The unit N/m.
    static constexpr LineLoad from_N_per_m(double x) { return LineLoad(x * 1.0 / 1.0); }
    constexpr double to_N_per_m() const { return si_ * 1.0 / 1.0; }

    // The unit kN/m.
    static constexpr LineLoad from_kN_per_m(double x) { return LineLoad(x * 1000.0 / 1.0); }
    constexpr double to_kN_per_m() const { return si_ * 1.0 / 1000.0; }

    // The unit N/mm.
    static constexpr LineLoad from_N_per_mm(double x) { return LineLoad(x * 1000.0 / 1.0); }
    constexpr double to_N_per_mm() const { return si_ * 1.0 / 1000.0; }

    // The unit plf.
    static constexpr LineLoad from_plf(double x) { return LineLoad(x * 8896443230521.0 / 609600000000.0); }
    constexpr double to_plf() const { return si_ * 609600000000.0 / 8896443230521.0; }

    // The unit lbf/ft.
    static constexpr LineLoad from_lbf_per_ft(double x) { return LineLoad(x * 8896443230521.0 / 609600000000.0); }
    constexpr double to_lbf_per_ft() const { return si_ * 609600000000.0 / 8896443230521.0; }

    // The unit kip/ft.
    static constexpr LineLoad from_kip_per_ft(double x) { return LineLoad(x * 8896443230521.0 / 609600000.0); }
    constexpr double to_kip_per_ft() const { return si_ * 609600000.0 / 8896443230521.0; }

    friend constexpr bool operator==(LineLoad a, LineLoad b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(LineLoad a, LineLoad b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(LineLoad a, LineLoad b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(LineLoad a, LineLoad b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(LineLoad a, LineLoad b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(LineLoad a, LineLoad b) { return a.si_ >= b.si_; }

    friend constexpr LineLoad operator+(LineLoad a, LineLoad b) { return LineLoad(a.si_ + b.si_); }
    friend constexpr LineLoad operator-(LineLoad a, LineLoad b) { return LineLoad(a.si_ - b.si_); }
    friend constexpr LineLoad operator-(LineLoad a) { return LineLoad(-a.si_); }
    friend constexpr LineLoad operator*(LineLoad a, double x) { return LineLoad(a.si_ * x); }
    friend constexpr LineLoad operator*(double x, LineLoad a) { return LineLoad(x * a.si_); }
    friend constexpr LineLoad operator/(LineLoad a, double x) { return LineLoad(a.si_ / x); }
    friend constexpr double operator/(LineLoad a, LineLoad b) { return a.si_ / b.si_; }

private:
    explicit constexpr LineLoad(double si) : si_(si) {}
    double si_;
};

// Moment: one double in the SI unit N m.
class Moment {
public:
    static constexpr Moment from_si(double si) { return Moment(si); }
    constexpr double si() const { return si_; }

    // The unit N m.
    static constexpr Moment from_N_m(double x) { return Moment(x * 1.0 / 1.0); }
    constexpr double to_N_m() const { return si_ * 1.0 / 1.0; }

    // The unit kN m.
    static constexpr Moment from_kN_m(double x) { return Moment(x * 1000.0 / 1.0); }
    constexpr double to_kN_m() const { return si_ * 1.0 / 1000.0; }

    // The unit N mm.
    static constexpr Moment from_N_mm(double x) { return Moment(x * 1.0 / 1000.0); }
    constexpr double to_N_mm() const { return si_ * 1000.0 / 1.0; }

    // The unit kip ft.
    static constexpr Moment from_kip_ft(double x) { return Moment(x * 3389544870828501.0 / 2500000000000.0); }
    constexpr double to_kip_ft() const { return si_ * 2500000000000.0 / 3389544870828501.0; }

    // The unit kip in.
    static constexpr Moment from_kip_in(double x) { return Moment(x * 1129848290276167.0 / 10000000000000.0); }
    constexpr double to_kip_in() const { return si_ * 10000000000000.0 / 1129848290276167.0; }

    // The unit lbf ft.
    static constexpr Moment from_lbf_ft(double x) { return Moment(x * 3389544870828501.0 / 2500000000000000.0); }
    constexpr double to_lbf_ft() const { return si_ * 2500000000000000.0 / 3389544870828501.0; }

    friend constexpr bool operator==(Moment a, Moment b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Moment a, Moment b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Moment a, Moment b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Moment a, Moment b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Moment a, Moment b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Moment a, Moment b) { return a.si_ >= b.si_; }

    friend constexpr Moment operator+(Moment a, Moment b) { return Moment(a.si_ + b.si_); }
    friend constexpr Moment operator-(Moment a, Moment b) { return Moment(a.si_ - b.si_); }
    friend constexpr Moment operator-(Moment a) { return Moment(-a.si_); }
    friend constexpr Moment operator*(Moment a, double x) { return Moment(a.si_ * x); }
    friend constexpr Moment operator*(double x, Moment a) { return Moment(x * a.si_); }
    friend constexpr Moment operator/(Moment a, double x) { return Moment(a.si_ / x); }
    friend constexpr double operator/(Moment a, Moment b) { return a.si_ / b.si_; }

private:
    explicit constexpr Moment(double si) : si_(si) {}
    double si_;
};

// Stress: one double in the SI unit Pa.
class Stress {
public:
    static constexpr Stress from_si(double si) { return Stress(si); }
    constexpr double si() const { return si_; }

    // The unit Pa.
    static constexpr Stress from_Pa(double x) { return Stress(x * 1.0 / 1.0); }
    constexpr double to_Pa() const { return si_ * 1.0 / 1.0; }

    // The unit kPa.
    static constexpr Stress from_kPa(double x) { return Stress(x * 1000.0 / 1.0); }
    constexpr double to_kPa() const { return si_ * 1.0 / 1000.0; }

    // The unit MPa.
    static constexpr Stress from_MPa(double x) { return Stress(x * 1000000.0 / 1.0); }
    constexpr double to_MPa() const { return si_ * 1.0 / 1000000.0; }

    // The unit GPa.
    static constexpr Stress from_GPa(double x) { return Stress(x * 1000000000.0 / 1.0); }
    constexpr double to_GPa() const { return si_ * 1.0 / 1000000000.0; }

    // The unit N/mm2.
    static constexpr Stress from_N_per_mm2(double x) { return Stress(x * 1000000.0 / 1.0); }
    constexpr double to_N_per_mm2() const { return si_ * 1.0 / 1000000.0; }

    // The unit psi.
    static constexpr Stress from_psi(double x) { return Stress(x * 8896443230521.0 / 1290320000.0); }
    constexpr double to_psi() const { return si_ * 1290320000.0 / 8896443230521.0; }

    // The unit ksi.
    static constexpr Stress from_ksi(double x) { return Stress(x * 8896443230521.0 / 1290320.0); }
    constexpr double to_ksi() const { return si_ * 1290320.0 / 8896443230521.0; }

    friend constexpr bool operator==(Stress a, Stress b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Stress a, Stress b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Stress a, Stress b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Stress a, Stress b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Stress a, Stress b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Stress a, Stress b) { return a.si_ >= b.si_; }

    friend constexpr Stress operator+(Stress a, Stress b) { return Stress(a.si_ + b.si_); }
    friend constexpr Stress operator-(Stress a, Stress b) { return Stress(a.si_ - b.si_); }
    friend constexpr Stress operator-(Stress a) { return Stress(-a.si_); }
    friend constexpr Stress operator*(Stress a, double x) { return Stress(a.si_ * x); }
    friend constexpr Stress operator*(double x, Stress a) { return Stress(x * a.si_); }
    friend constexpr Stress operator/(Stress a, double x) { return Stress(a.si_ / x); }
    friend constexpr double operator/(Stress a, Stress b) { return a.si_ / b.si_; }

private:
    explicit constexpr Stress(double si) : si_(si) {}
    double si_;
};

// Modulus: one double in the SI unit Pa.
class Modulus {
public:
    static constexpr Modulus from_si(double si) { return Modulus(si); }
    constexpr double si() const { return si_; }

    // The unit Pa.
    static constexpr Modulus from_Pa(double x) { return Modulus(x * 1.0 / 1.0); }
    constexpr double to_Pa() const { return si_ * 1.0 / 1.0; }

    // The unit kPa.
    static constexpr Modulus from_kPa(double x) { return Modulus(x * 1000.0 / 1.0); }
    constexpr double to_kPa() const { return si_ * 1.0 / 1000.0; }

    // The unit MPa.
    static constexpr Modulus from_MPa(double x) { return Modulus(x * 1000000.0 / 1.0); }
    constexpr double to_MPa() const { return si_ * 1.0 / 1000000.0; }

    // The unit GPa.
    static constexpr Modulus from_GPa(double x) { return Modulus(x * 1000000000.0 / 1.0); }
    constexpr double to_GPa() const { return si_ * 1.0 / 1000000000.0; }

    // The unit N/mm2.
    static constexpr Modulus from_N_per_mm2(double x) { return Modulus(x * 1000000.0 / 1.0); }
    constexpr double to_N_per_mm2() const { return si_ * 1.0 / 1000000.0; }

    // The unit psi.
    static constexpr Modulus from_psi(double x) { return Modulus(x * 8896443230521.0 / 1290320000.0); }
    constexpr double to_psi() const { return si_ * 1290320000.0 / 8896443230521.0; }

    // The unit ksi.
    static constexpr Modulus from_ksi(double x) { return Modulus(x * 8896443230521.0 / 1290320.0); }
    constexpr double to_ksi() const { return si_ * 1290320.0 / 8896443230521.0; }

    friend constexpr bool operator==(Modulus a, Modulus b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Modulus a, Modulus b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Modulus a, Modulus b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Modulus a, Modulus b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Modulus a, Modulus b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Modulus a, Modulus b) { return a.si_ >= b.si_; }

    friend constexpr Modulus operator+(Modulus a, Modulus b) { return Modulus(a.si_ + b.si_); }
    friend constexpr Modulus operator-(Modulus a, Modulus b) { return Modulus(a.si_ - b.si_); }
    friend constexpr Modulus operator-(Modulus a) { return Modulus(-a.si_); }
    friend constexpr Modulus operator*(Modulus a, double x) { return Modulus(a.si_ * x); }
    friend constexpr Modulus operator*(double x, Modulus a) { return Modulus(x * a.si_); }
    friend constexpr Modulus operator/(Modulus a, double x) { return Modulus(a.si_ / x); }
    friend constexpr double operator/(Modulus a, Modulus b) { return a.si_ / b.si_; }

private:
    explicit constexpr Modulus(double si) : si_(si) {}
    double si_;
};

// Area load: one double in the SI unit N/m2.
class AreaLoad {
public:
    static constexpr AreaLoad from_si(double si) { return AreaLoad(si); }
    constexpr double si() const { return si_; }

    // The unit N/m2.
    static constexpr AreaLoad from_N_per_m2(double x) { return AreaLoad(x * 1.0 / 1.0); }
    constexpr double to_N_per_m2() const { return si_ * 1.0 / 1.0; }

    // The unit kN/m2.
    static constexpr AreaLoad from_kN_per_m2(double x) { return AreaLoad(x * 1000.0 / 1.0); }
    constexpr double to_kN_per_m2() const { return si_ * 1.0 / 1000.0; }

    // The unit psf.
    static constexpr AreaLoad from_psf(double x) { return AreaLoad(x * 8896443230521.0 / 185806080000.0); }
    constexpr double to_psf() const { return si_ * 185806080000.0 / 8896443230521.0; }

    // The unit lbf/ft2.
    static constexpr AreaLoad from_lbf_per_ft2(double x) { return AreaLoad(x * 8896443230521.0 / 185806080000.0); }
    constexpr double to_lbf_per_ft2() const { return si_ * 185806080000.0 / 8896443230521.0; }

    friend constexpr bool operator==(AreaLoad a, AreaLoad b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(AreaLoad a, AreaLoad b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(AreaLoad a, AreaLoad b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(AreaLoad a, AreaLoad b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(AreaLoad a, AreaLoad b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(AreaLoad a, AreaLoad b) { return a.si_ >= b.si_; }

    friend constexpr AreaLoad operator+(AreaLoad a, AreaLoad b) { return AreaLoad(a.si_ + b.si_); }
    friend constexpr AreaLoad operator-(AreaLoad a, AreaLoad b) { return AreaLoad(a.si_ - b.si_); }
    friend constexpr AreaLoad operator-(AreaLoad a) { return AreaLoad(-a.si_); }
    friend constexpr AreaLoad operator*(AreaLoad a, double x) { return AreaLoad(a.si_ * x); }
    friend constexpr AreaLoad operator*(double x, AreaLoad a) { return AreaLoad(x * a.si_); }
    friend constexpr AreaLoad operator/(AreaLoad a, double x) { return AreaLoad(a.si_ / x); }
    friend constexpr double operator/(AreaLoad a, AreaLoad b) { return a.si_ / b.si_; }

private:
    explicit constexpr AreaLoad(double si) : si_(si) {}
    double si_;
};

// Density: one double in the SI unit kg/m3.
class Density {
public:
    static constexpr Density from_si(double si) { return Density(si); }
    constexpr double si() const { return si_; }

    // The unit kg/m3.
    static constexpr Density from_kg_per_m3(double x) { return Density(x * 1.0 / 1.0); }
    constexpr double to_kg_per_m3() const { return si_ * 1.0 / 1.0; }

    // The unit lb/ft3.
    static constexpr Density from_lb_per_ft3(double x) { return Density(x * 28349523125.0 / 1769802912.0); }
    constexpr double to_lb_per_ft3() const { return si_ * 1769802912.0 / 28349523125.0; }

    friend constexpr bool operator==(Density a, Density b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Density a, Density b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Density a, Density b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Density a, Density b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Density a, Density b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Density a, Density b) { return a.si_ >= b.si_; }

    friend constexpr Density operator+(Density a, Density b) { return Density(a.si_ + b.si_); }
    friend constexpr Density operator-(Density a, Density b) { return Density(a.si_ - b.si_); }
    friend constexpr Density operator-(Density a) { return Density(-a.si_); }
    friend constexpr Density operator*(Density a, double x) { return Density(a.si_ * x); }
    friend constexpr Density operator*(double x, Density a) { return Density(x * a.si_); }
    friend constexpr Density operator/(Density a, double x) { return Density(a.si_ / x); }
    friend constexpr double operator/(Density a, Density b) { return a.si_ / b.si_; }

private:
    explicit constexpr Density(double si) : si_(si) {}
    double si_;
};

// Axial stiffness: one double in the SI unit N.
class AxialStiffness {
public:
    static constexpr AxialStiffness from_si(double si) { return AxialStiffness(si); }
    constexpr double si() const { return si_; }

    // The unit N.
    static constexpr AxialStiffness from_N(double x) { return AxialStiffness(x * 1.0 / 1.0); }
    constexpr double to_N() const { return si_ * 1.0 / 1.0; }

    // The unit kN.
    static constexpr AxialStiffness from_kN(double x) { return AxialStiffness(x * 1000.0 / 1.0); }
    constexpr double to_kN() const { return si_ * 1.0 / 1000.0; }

    // The unit MN.
    static constexpr AxialStiffness from_MN(double x) { return AxialStiffness(x * 1000000.0 / 1.0); }
    constexpr double to_MN() const { return si_ * 1.0 / 1000000.0; }

    friend constexpr bool operator==(AxialStiffness a, AxialStiffness b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(AxialStiffness a, AxialStiffness b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(AxialStiffness a, AxialStiffness b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(AxialStiffness a, AxialStiffness b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(AxialStiffness a, AxialStiffness b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(AxialStiffness a, AxialStiffness b) { return a.si_ >= b.si_; }

    friend constexpr AxialStiffness operator+(AxialStiffness a, AxialStiffness b) { return AxialStiffness(a.si_ + b.si_); }
    friend constexpr AxialStiffness operator-(AxialStiffness a, AxialStiffness b) { return AxialStiffness(a.si_ - b.si_); }
    friend constexpr AxialStiffness operator-(AxialStiffness a) { return AxialStiffness(-a.si_); }
    friend constexpr AxialStiffness operator*(AxialStiffness a, double x) { return AxialStiffness(a.si_ * x); }
    friend constexpr AxialStiffness operator*(double x, AxialStiffness a) { return AxialStiffness(x * a.si_); }
    friend constexpr AxialStiffness operator/(AxialStiffness a, double x) { return AxialStiffness(a.si_ / x); }
    friend constexpr double operator/(AxialStiffness a, AxialStiffness b) { return a.si_ / b.si_; }

private:
    explicit constexpr AxialStiffness(double si) : si_(si) {}
    double si_;
};

// Bending stiffness: one double in the SI unit N m2.
class BendingStiffness {
public:
    static constexpr BendingStiffness from_si(double si) { return BendingStiffness(si); }
    constexpr double si() const { return si_; }

    // The unit N m2.
    static constexpr BendingStiffness from_N_m2(double x) { return BendingStiffness(x * 1.0 / 1.0); }
    constexpr double to_N_m2() const { return si_ * 1.0 / 1.0; }

    // The unit kN m2.
    static constexpr BendingStiffness from_kN_m2(double x) { return BendingStiffness(x * 1000.0 / 1.0); }
    constexpr double to_kN_m2() const { return si_ * 1.0 / 1000.0; }

    // The unit MN m2.
    static constexpr BendingStiffness from_MN_m2(double x) { return BendingStiffness(x * 1000000.0 / 1.0); }
    constexpr double to_MN_m2() const { return si_ * 1.0 / 1000000.0; }

    // The unit N mm2.
    static constexpr BendingStiffness from_N_mm2(double x) { return BendingStiffness(x * 1.0 / 1000000.0); }
    constexpr double to_N_mm2() const { return si_ * 1000000.0 / 1.0; }

    // The unit kip in2.
    static constexpr BendingStiffness from_kip_in2(double x) { return BendingStiffness(x * 1.4349073286507322e17 / 5e16); }
    constexpr double to_kip_in2() const { return si_ * 5e16 / 1.4349073286507322e17; }

    friend constexpr bool operator==(BendingStiffness a, BendingStiffness b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(BendingStiffness a, BendingStiffness b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(BendingStiffness a, BendingStiffness b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(BendingStiffness a, BendingStiffness b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(BendingStiffness a, BendingStiffness b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(BendingStiffness a, BendingStiffness b) { return a.si_ >= b.si_; }

    friend constexpr BendingStiffness operator+(BendingStiffness a, BendingStiffness b) { return BendingStiffness(a.si_ + b.si_); }
    friend constexpr BendingStiffness operator-(BendingStiffness a, BendingStiffness b) { return BendingStiffness(a.si_ - b.si_); }
    friend constexpr BendingStiffness operator-(BendingStiffness a) { return BendingStiffness(-a.si_); }
    friend constexpr BendingStiffness operator*(BendingStiffness a, double x) { return BendingStiffness(a.si_ * x); }
    friend constexpr BendingStiffness operator*(double x, BendingStiffness a) { return BendingStiffness(x * a.si_); }
    friend constexpr BendingStiffness operator/(BendingStiffness a, double x) { return BendingStiffness(a.si_ / x); }
    friend constexpr double operator/(BendingStiffness a, BendingStiffness b) { return a.si_ / b.si_; }

private:
    explicit constexpr BendingStiffness(double si) : si_(si) {}
    double si_;
};

// Curvature: one double in the SI unit /m.
class Curvature {
public:
    static constexpr Curvature from_si(double si) { return Curvature(si); }
    constexpr double si() const { return si_; }

    // The unit /m.
    static constexpr Curvature from_per_m(double x) { return Curvature(x * 1.0 / 1.0); }
    constexpr double to_per_m() const { return si_ * 1.0 / 1.0; }

    // The unit /mm.
    static constexpr Curvature from_per_mm(double x) { return Curvature(x * 1000.0 / 1.0); }
    constexpr double to_per_mm() const { return si_ * 1.0 / 1000.0; }

    friend constexpr bool operator==(Curvature a, Curvature b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Curvature a, Curvature b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Curvature a, Curvature b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Curvature a, Curvature b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Curvature a, Curvature b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Curvature a, Curvature b) { return a.si_ >= b.si_; }

    friend constexpr Curvature operator+(Curvature a, Curvature b) { return Curvature(a.si_ + b.si_); }
    friend constexpr Curvature operator-(Curvature a, Curvature b) { return Curvature(a.si_ - b.si_); }
    friend constexpr Curvature operator-(Curvature a) { return Curvature(-a.si_); }
    friend constexpr Curvature operator*(Curvature a, double x) { return Curvature(a.si_ * x); }
    friend constexpr Curvature operator*(double x, Curvature a) { return Curvature(x * a.si_); }
    friend constexpr Curvature operator/(Curvature a, double x) { return Curvature(a.si_ / x); }
    friend constexpr double operator/(Curvature a, Curvature b) { return a.si_ / b.si_; }

private:
    explicit constexpr Curvature(double si) : si_(si) {}
    double si_;
};

// Strain: one double in the SI unit 1.
class Strain {
public:
    static constexpr Strain from_si(double si) { return Strain(si); }
    constexpr double si() const { return si_; }

    // The unit 1.
    static constexpr Strain from_ratio(double x) { return Strain(x * 1.0 / 1.0); }
    constexpr double to_ratio() const { return si_ * 1.0 / 1.0; }

    // The unit permille.
    static constexpr Strain from_permille(double x) { return Strain(x * 1.0 / 1000.0); }
    constexpr double to_permille() const { return si_ * 1000.0 / 1.0; }

    friend constexpr bool operator==(Strain a, Strain b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Strain a, Strain b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Strain a, Strain b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Strain a, Strain b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Strain a, Strain b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Strain a, Strain b) { return a.si_ >= b.si_; }

    friend constexpr Strain operator+(Strain a, Strain b) { return Strain(a.si_ + b.si_); }
    friend constexpr Strain operator-(Strain a, Strain b) { return Strain(a.si_ - b.si_); }
    friend constexpr Strain operator-(Strain a) { return Strain(-a.si_); }
    friend constexpr Strain operator*(Strain a, double x) { return Strain(a.si_ * x); }
    friend constexpr Strain operator*(double x, Strain a) { return Strain(x * a.si_); }
    friend constexpr Strain operator/(Strain a, double x) { return Strain(a.si_ / x); }
    friend constexpr double operator/(Strain a, Strain b) { return a.si_ / b.si_; }

private:
    explicit constexpr Strain(double si) : si_(si) {}
    double si_;
};

// Angle: one double in the SI unit rad.
class Angle {
public:
    static constexpr Angle from_si(double si) { return Angle(si); }
    constexpr double si() const { return si_; }

    // The unit rad.
    static constexpr Angle from_rad(double x) { return Angle(x * 1.0 / 1.0); }
    constexpr double to_rad() const { return si_ * 1.0 / 1.0; }

    // The unit mrad.
    static constexpr Angle from_mrad(double x) { return Angle(x * 1.0 / 1000.0); }
    constexpr double to_mrad() const { return si_ * 1000.0 / 1.0; }

    // The unit deg.
    static constexpr Angle from_deg(double x) { return Angle(x * 3.141592653589793 / 180.0); }
    constexpr double to_deg() const { return si_ * 180.0 / 3.141592653589793; }

    friend constexpr bool operator==(Angle a, Angle b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Angle a, Angle b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Angle a, Angle b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Angle a, Angle b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Angle a, Angle b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Angle a, Angle b) { return a.si_ >= b.si_; }

    friend constexpr Angle operator+(Angle a, Angle b) { return Angle(a.si_ + b.si_); }
    friend constexpr Angle operator-(Angle a, Angle b) { return Angle(a.si_ - b.si_); }
    friend constexpr Angle operator-(Angle a) { return Angle(-a.si_); }
    friend constexpr Angle operator*(Angle a, double x) { return Angle(a.si_ * x); }
    friend constexpr Angle operator*(double x, Angle a) { return Angle(x * a.si_); }
    friend constexpr Angle operator/(Angle a, double x) { return Angle(a.si_ / x); }
    friend constexpr double operator/(Angle a, Angle b) { return a.si_ / b.si_; }

private:
    explicit constexpr Angle(double si) : si_(si) {}
    double si_;
};

// Thermal expansion: one double in the SI unit /K.
class ThermalExpansion {
public:
    static constexpr ThermalExpansion from_si(double si) { return ThermalExpansion(si); }
    constexpr double si() const { return si_; }

    // The unit /K.
    static constexpr ThermalExpansion from_per_K(double x) { return ThermalExpansion(x * 1.0 / 1.0); }
    constexpr double to_per_K() const { return si_ * 1.0 / 1.0; }

    friend constexpr bool operator==(ThermalExpansion a, ThermalExpansion b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(ThermalExpansion a, ThermalExpansion b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(ThermalExpansion a, ThermalExpansion b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(ThermalExpansion a, ThermalExpansion b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(ThermalExpansion a, ThermalExpansion b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(ThermalExpansion a, ThermalExpansion b) { return a.si_ >= b.si_; }

    friend constexpr ThermalExpansion operator+(ThermalExpansion a, ThermalExpansion b) { return ThermalExpansion(a.si_ + b.si_); }
    friend constexpr ThermalExpansion operator-(ThermalExpansion a, ThermalExpansion b) { return ThermalExpansion(a.si_ - b.si_); }
    friend constexpr ThermalExpansion operator-(ThermalExpansion a) { return ThermalExpansion(-a.si_); }
    friend constexpr ThermalExpansion operator*(ThermalExpansion a, double x) { return ThermalExpansion(a.si_ * x); }
    friend constexpr ThermalExpansion operator*(double x, ThermalExpansion a) { return ThermalExpansion(x * a.si_); }
    friend constexpr ThermalExpansion operator/(ThermalExpansion a, double x) { return ThermalExpansion(a.si_ / x); }
    friend constexpr double operator/(ThermalExpansion a, ThermalExpansion b) { return a.si_ / b.si_; }

private:
    explicit constexpr ThermalExpansion(double si) : si_(si) {}
    double si_;
};

// Mass: one double in the SI unit kg.
class Mass {
public:
    static constexpr Mass from_si(double si) { return Mass(si); }
    constexpr double si() const { return si_; }

    // The unit kg.
    static constexpr Mass from_kg(double x) { return Mass(x * 1.0 / 1.0); }
    constexpr double to_kg() const { return si_ * 1.0 / 1.0; }

    // The unit t.
    static constexpr Mass from_t(double x) { return Mass(x * 1000.0 / 1.0); }
    constexpr double to_t() const { return si_ * 1.0 / 1000.0; }

    // The unit lb.
    static constexpr Mass from_lb(double x) { return Mass(x * 45359237.0 / 100000000.0); }
    constexpr double to_lb() const { return si_ * 100000000.0 / 45359237.0; }

    friend constexpr bool operator==(Mass a, Mass b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Mass a, Mass b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Mass a, Mass b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Mass a, Mass b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Mass a, Mass b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Mass a, Mass b) { return a.si_ >= b.si_; }

    friend constexpr Mass operator+(Mass a, Mass b) { return Mass(a.si_ + b.si_); }
    friend constexpr Mass operator-(Mass a, Mass b) { return Mass(a.si_ - b.si_); }
    friend constexpr Mass operator-(Mass a) { return Mass(-a.si_); }
    friend constexpr Mass operator*(Mass a, double x) { return Mass(a.si_ * x); }
    friend constexpr Mass operator*(double x, Mass a) { return Mass(x * a.si_); }
    friend constexpr Mass operator/(Mass a, double x) { return Mass(a.si_ / x); }
    friend constexpr double operator/(Mass a, Mass b) { return a.si_ / b.si_; }

private:
    explicit constexpr Mass(double si) : si_(si) {}
    double si_;
};

// Line mass: one double in the SI unit kg/m.
class LineMass {
public:
    static constexpr LineMass from_si(double si) { return LineMass(si); }
    constexpr double si() const { return si_; }

    // The unit kg/m.
    static constexpr LineMass from_kg_per_m(double x) { return LineMass(x * 1.0 / 1.0); }
    constexpr double to_kg_per_m() const { return si_ * 1.0 / 1.0; }

    // The unit lb/ft.
    static constexpr LineMass from_lb_per_ft(double x) { return LineMass(x * 45359237.0 / 30480000.0); }
    constexpr double to_lb_per_ft() const { return si_ * 30480000.0 / 45359237.0; }

    friend constexpr bool operator==(LineMass a, LineMass b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(LineMass a, LineMass b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(LineMass a, LineMass b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(LineMass a, LineMass b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(LineMass a, LineMass b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(LineMass a, LineMass b) { return a.si_ >= b.si_; }

    friend constexpr LineMass operator+(LineMass a, LineMass b) { return LineMass(a.si_ + b.si_); }
    friend constexpr LineMass operator-(LineMass a, LineMass b) { return LineMass(a.si_ - b.si_); }
    friend constexpr LineMass operator-(LineMass a) { return LineMass(-a.si_); }
    friend constexpr LineMass operator*(LineMass a, double x) { return LineMass(a.si_ * x); }
    friend constexpr LineMass operator*(double x, LineMass a) { return LineMass(x * a.si_); }
    friend constexpr LineMass operator/(LineMass a, double x) { return LineMass(a.si_ / x); }
    friend constexpr double operator/(LineMass a, LineMass b) { return a.si_ / b.si_; }

private:
    explicit constexpr LineMass(double si) : si_(si) {}
    double si_;
};

// Duration: one double in the SI unit s.
class Duration {
public:
    static constexpr Duration from_si(double si) { return Duration(si); }
    constexpr double si() const { return si_; }

    // The unit s.
    static constexpr Duration from_s(double x) { return Duration(x * 1.0 / 1.0); }
    constexpr double to_s() const { return si_ * 1.0 / 1.0; }

    // The unit h.
    static constexpr Duration from_h(double x) { return Duration(x * 3600.0 / 1.0); }
    constexpr double to_h() const { return si_ * 1.0 / 3600.0; }

    // The unit d.
    static constexpr Duration from_d(double x) { return Duration(x * 86400.0 / 1.0); }
    constexpr double to_d() const { return si_ * 1.0 / 86400.0; }

    // The unit year.
    static constexpr Duration from_year(double x) { return Duration(x * 31557600.0 / 1.0); }
    constexpr double to_year() const { return si_ * 1.0 / 31557600.0; }

    friend constexpr bool operator==(Duration a, Duration b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(Duration a, Duration b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(Duration a, Duration b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(Duration a, Duration b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(Duration a, Duration b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(Duration a, Duration b) { return a.si_ >= b.si_; }

    friend constexpr Duration operator+(Duration a, Duration b) { return Duration(a.si_ + b.si_); }
    friend constexpr Duration operator-(Duration a, Duration b) { return Duration(a.si_ - b.si_); }
    friend constexpr Duration operator-(Duration a) { return Duration(-a.si_); }
    friend constexpr Duration operator*(Duration a, double x) { return Duration(a.si_ * x); }
    friend constexpr Duration operator*(double x, Duration a) { return Duration(x * a.si_); }
    friend constexpr Duration operator/(Duration a, double x) { return Duration(a.si_ / x); }
    friend constexpr double operator/(Duration a, Duration b) { return a.si_ / b.si_; }

private:
    explicit constexpr Duration(double si) : si_(si) {}
    double si_;
};

// Slip modulus: one double in the SI unit N/m2.
class SlipModulus {
public:
    static constexpr SlipModulus from_si(double si) { return SlipModulus(si); }
    constexpr double si() const { return si_; }

    // The unit N/m2.
    static constexpr SlipModulus from_N_per_m2(double x) { return SlipModulus(x * 1.0 / 1.0); }
    constexpr double to_N_per_m2() const { return si_ * 1.0 / 1.0; }

    // The unit kN/m2.
    static constexpr SlipModulus from_kN_per_m2(double x) { return SlipModulus(x * 1000.0 / 1.0); }
    constexpr double to_kN_per_m2() const { return si_ * 1.0 / 1000.0; }

    // The unit N/mm2.
    static constexpr SlipModulus from_N_per_mm2(double x) { return SlipModulus(x * 1000000.0 / 1.0); }
    constexpr double to_N_per_mm2() const { return si_ * 1.0 / 1000000.0; }

    friend constexpr bool operator==(SlipModulus a, SlipModulus b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(SlipModulus a, SlipModulus b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(SlipModulus a, SlipModulus b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(SlipModulus a, SlipModulus b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(SlipModulus a, SlipModulus b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(SlipModulus a, SlipModulus b) { return a.si_ >= b.si_; }

    friend constexpr SlipModulus operator+(SlipModulus a, SlipModulus b) { return SlipModulus(a.si_ + b.si_); }
    friend constexpr SlipModulus operator-(SlipModulus a, SlipModulus b) { return SlipModulus(a.si_ - b.si_); }
    friend constexpr SlipModulus operator-(SlipModulus a) { return SlipModulus(-a.si_); }
    friend constexpr SlipModulus operator*(SlipModulus a, double x) { return SlipModulus(a.si_ * x); }
    friend constexpr SlipModulus operator*(double x, SlipModulus a) { return SlipModulus(x * a.si_); }
    friend constexpr SlipModulus operator/(SlipModulus a, double x) { return SlipModulus(a.si_ / x); }
    friend constexpr double operator/(SlipModulus a, SlipModulus b) { return a.si_ / b.si_; }

private:
    explicit constexpr SlipModulus(double si) : si_(si) {}
    double si_;
};

// Shear flow: one double in the SI unit N/m.
class ShearFlow {
public:
    static constexpr ShearFlow from_si(double si) { return ShearFlow(si); }
    constexpr double si() const { return si_; }

    // The unit N/m.
    static constexpr ShearFlow from_N_per_m(double x) { return ShearFlow(x * 1.0 / 1.0); }
    constexpr double to_N_per_m() const { return si_ * 1.0 / 1.0; }

    // The unit kN/m.
    static constexpr ShearFlow from_kN_per_m(double x) { return ShearFlow(x * 1000.0 / 1.0); }
    constexpr double to_kN_per_m() const { return si_ * 1.0 / 1000.0; }

    // The unit N/mm.
    static constexpr ShearFlow from_N_per_mm(double x) { return ShearFlow(x * 1000.0 / 1.0); }
    constexpr double to_N_per_mm() const { return si_ * 1.0 / 1000.0; }

    friend constexpr bool operator==(ShearFlow a, ShearFlow b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(ShearFlow a, ShearFlow b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(ShearFlow a, ShearFlow b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(ShearFlow a, ShearFlow b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(ShearFlow a, ShearFlow b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(ShearFlow a, ShearFlow b) { return a.si_ >= b.si_; }

    friend constexpr ShearFlow operator+(ShearFlow a, ShearFlow b) { return ShearFlow(a.si_ + b.si_); }
    friend constexpr ShearFlow operator-(ShearFlow a, ShearFlow b) { return ShearFlow(a.si_ - b.si_); }
    friend constexpr ShearFlow operator-(ShearFlow a) { return ShearFlow(-a.si_); }
    friend constexpr ShearFlow operator*(ShearFlow a, double x) { return ShearFlow(a.si_ * x); }
    friend constexpr ShearFlow operator*(double x, ShearFlow a) { return ShearFlow(x * a.si_); }
    friend constexpr ShearFlow operator/(ShearFlow a, double x) { return ShearFlow(a.si_ / x); }
    friend constexpr double operator/(ShearFlow a, ShearFlow b) { return a.si_ / b.si_; }

private:
    explicit constexpr ShearFlow(double si) : si_(si) {}
    double si_;
};

// Slip modulus of a fastener: one double in the SI unit N/m.
class FastenerStiffness {
public:
    static constexpr FastenerStiffness from_si(double si) { return FastenerStiffness(si); }
    constexpr double si() const { return si_; }

    // The unit N/m.
    static constexpr FastenerStiffness from_N_per_m(double x) { return FastenerStiffness(x * 1.0 / 1.0); }
    constexpr double to_N_per_m() const { return si_ * 1.0 / 1.0; }

    // The unit N/mm.
    static constexpr FastenerStiffness from_N_per_mm(double x) { return FastenerStiffness(x * 1000.0 / 1.0); }
    constexpr double to_N_per_mm() const { return si_ * 1.0 / 1000.0; }

    // The unit kN/mm.
    static constexpr FastenerStiffness from_kN_per_mm(double x) { return FastenerStiffness(x * 1000000.0 / 1.0); }
    constexpr double to_kN_per_mm() const { return si_ * 1.0 / 1000000.0; }

    friend constexpr bool operator==(FastenerStiffness a, FastenerStiffness b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(FastenerStiffness a, FastenerStiffness b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(FastenerStiffness a, FastenerStiffness b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(FastenerStiffness a, FastenerStiffness b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(FastenerStiffness a, FastenerStiffness b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(FastenerStiffness a, FastenerStiffness b) { return a.si_ >= b.si_; }

    friend constexpr FastenerStiffness operator+(FastenerStiffness a, FastenerStiffness b) { return FastenerStiffness(a.si_ + b.si_); }
    friend constexpr FastenerStiffness operator-(FastenerStiffness a, FastenerStiffness b) { return FastenerStiffness(a.si_ - b.si_); }
    friend constexpr FastenerStiffness operator-(FastenerStiffness a) { return FastenerStiffness(-a.si_); }
    friend constexpr FastenerStiffness operator*(FastenerStiffness a, double x) { return FastenerStiffness(a.si_ * x); }
    friend constexpr FastenerStiffness operator*(double x, FastenerStiffness a) { return FastenerStiffness(x * a.si_); }
    friend constexpr FastenerStiffness operator/(FastenerStiffness a, double x) { return FastenerStiffness(a.si_ / x); }
    friend constexpr double operator/(FastenerStiffness a, FastenerStiffness b) { return a.si_ / b.si_; }

private:
    explicit constexpr FastenerStiffness(double si) : si_(si) {}
    double si_;
};

// Spring stiffness: one double in the SI unit N/m.
class SpringStiffness {
public:
    static constexpr SpringStiffness from_si(double si) { return SpringStiffness(si); }
    constexpr double si() const { return si_; }

    // The unit N/m.
    static constexpr SpringStiffness from_N_per_m(double x) { return SpringStiffness(x * 1.0 / 1.0); }
    constexpr double to_N_per_m() const { return si_ * 1.0 / 1.0; }

    // The unit kN/m.
    static constexpr SpringStiffness from_kN_per_m(double x) { return SpringStiffness(x * 1000.0 / 1.0); }
    constexpr double to_kN_per_m() const { return si_ * 1.0 / 1000.0; }

    // The unit N/mm.
    static constexpr SpringStiffness from_N_per_mm(double x) { return SpringStiffness(x * 1000.0 / 1.0); }
    constexpr double to_N_per_mm() const { return si_ * 1.0 / 1000.0; }

    // The unit kN/mm.
    static constexpr SpringStiffness from_kN_per_mm(double x) { return SpringStiffness(x * 1000000.0 / 1.0); }
    constexpr double to_kN_per_mm() const { return si_ * 1.0 / 1000000.0; }

    friend constexpr bool operator==(SpringStiffness a, SpringStiffness b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(SpringStiffness a, SpringStiffness b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(SpringStiffness a, SpringStiffness b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(SpringStiffness a, SpringStiffness b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(SpringStiffness a, SpringStiffness b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(SpringStiffness a, SpringStiffness b) { return a.si_ >= b.si_; }

    friend constexpr SpringStiffness operator+(SpringStiffness a, SpringStiffness b) { return SpringStiffness(a.si_ + b.si_); }
    friend constexpr SpringStiffness operator-(SpringStiffness a, SpringStiffness b) { return SpringStiffness(a.si_ - b.si_); }
    friend constexpr SpringStiffness operator-(SpringStiffness a) { return SpringStiffness(-a.si_); }
    friend constexpr SpringStiffness operator*(SpringStiffness a, double x) { return SpringStiffness(a.si_ * x); }
    friend constexpr SpringStiffness operator*(double x, SpringStiffness a) { return SpringStiffness(x * a.si_); }
    friend constexpr SpringStiffness operator/(SpringStiffness a, double x) { return SpringStiffness(a.si_ / x); }
    friend constexpr double operator/(SpringStiffness a, SpringStiffness b) { return a.si_ / b.si_; }

private:
    explicit constexpr SpringStiffness(double si) : si_(si) {}
    double si_;
};

// Rotational stiffness: one double in the SI unit N m/rad.
class RotationalStiffness {
public:
    static constexpr RotationalStiffness from_si(double si) { return RotationalStiffness(si); }
    constexpr double si() const { return si_; }

    // The unit N m/rad.
    static constexpr RotationalStiffness from_N_m_per_rad(double x) { return RotationalStiffness(x * 1.0 / 1.0); }
    constexpr double to_N_m_per_rad() const { return si_ * 1.0 / 1.0; }

    // The unit kN m/rad.
    static constexpr RotationalStiffness from_kN_m_per_rad(double x) { return RotationalStiffness(x * 1000.0 / 1.0); }
    constexpr double to_kN_m_per_rad() const { return si_ * 1.0 / 1000.0; }

    friend constexpr bool operator==(RotationalStiffness a, RotationalStiffness b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(RotationalStiffness a, RotationalStiffness b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(RotationalStiffness a, RotationalStiffness b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(RotationalStiffness a, RotationalStiffness b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(RotationalStiffness a, RotationalStiffness b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(RotationalStiffness a, RotationalStiffness b) { return a.si_ >= b.si_; }

    friend constexpr RotationalStiffness operator+(RotationalStiffness a, RotationalStiffness b) { return RotationalStiffness(a.si_ + b.si_); }
    friend constexpr RotationalStiffness operator-(RotationalStiffness a, RotationalStiffness b) { return RotationalStiffness(a.si_ - b.si_); }
    friend constexpr RotationalStiffness operator-(RotationalStiffness a) { return RotationalStiffness(-a.si_); }
    friend constexpr RotationalStiffness operator*(RotationalStiffness a, double x) { return RotationalStiffness(a.si_ * x); }
    friend constexpr RotationalStiffness operator*(double x, RotationalStiffness a) { return RotationalStiffness(x * a.si_); }
    friend constexpr RotationalStiffness operator/(RotationalStiffness a, double x) { return RotationalStiffness(a.si_ / x); }
    friend constexpr double operator/(RotationalStiffness a, RotationalStiffness b) { return a.si_ / b.si_; }

private:
    explicit constexpr RotationalStiffness(double si) : si_(si) {}
    double si_;
};

// Shear stiffness: one double in the SI unit N.
class ShearStiffness {
public:
    static constexpr ShearStiffness from_si(double si) { return ShearStiffness(si); }
    constexpr double si() const { return si_; }

    // The unit N.
    static constexpr ShearStiffness from_N(double x) { return ShearStiffness(x * 1.0 / 1.0); }
    constexpr double to_N() const { return si_ * 1.0 / 1.0; }

    // The unit kN.
    static constexpr ShearStiffness from_kN(double x) { return ShearStiffness(x * 1000.0 / 1.0); }
    constexpr double to_kN() const { return si_ * 1.0 / 1000.0; }

    // The unit MN.
    static constexpr ShearStiffness from_MN(double x) { return ShearStiffness(x * 1000000.0 / 1.0); }
    constexpr double to_MN() const { return si_ * 1.0 / 1000000.0; }

    friend constexpr bool operator==(ShearStiffness a, ShearStiffness b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(ShearStiffness a, ShearStiffness b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(ShearStiffness a, ShearStiffness b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(ShearStiffness a, ShearStiffness b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(ShearStiffness a, ShearStiffness b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(ShearStiffness a, ShearStiffness b) { return a.si_ >= b.si_; }

    friend constexpr ShearStiffness operator+(ShearStiffness a, ShearStiffness b) { return ShearStiffness(a.si_ + b.si_); }
    friend constexpr ShearStiffness operator-(ShearStiffness a, ShearStiffness b) { return ShearStiffness(a.si_ - b.si_); }
    friend constexpr ShearStiffness operator-(ShearStiffness a) { return ShearStiffness(-a.si_); }
    friend constexpr ShearStiffness operator*(ShearStiffness a, double x) { return ShearStiffness(a.si_ * x); }
    friend constexpr ShearStiffness operator*(double x, ShearStiffness a) { return ShearStiffness(x * a.si_); }
    friend constexpr ShearStiffness operator/(ShearStiffness a, double x) { return ShearStiffness(a.si_ / x); }
    friend constexpr double operator/(ShearStiffness a, ShearStiffness b) { return a.si_ / b.si_; }

private:
    explicit constexpr ShearStiffness(double si) : si_(si) {}
    double si_;
};

// Temperature change: one double in the SI unit K.
class TemperatureChange {
public:
    static constexpr TemperatureChange from_si(double si) { return TemperatureChange(si); }
    constexpr double si() const { return si_; }

    // The unit K.
    static constexpr TemperatureChange from_K(double x) { return TemperatureChange(x * 1.0 / 1.0); }
    constexpr double to_K() const { return si_ * 1.0 / 1.0; }

    // The unit degF.
    static constexpr TemperatureChange from_degF(double x) { return TemperatureChange(x * 5.0 / 9.0); }
    constexpr double to_degF() const { return si_ * 9.0 / 5.0; }

    friend constexpr bool operator==(TemperatureChange a, TemperatureChange b) { return a.si_ == b.si_; }
    friend constexpr bool operator!=(TemperatureChange a, TemperatureChange b) { return a.si_ != b.si_; }
    friend constexpr bool operator<(TemperatureChange a, TemperatureChange b) { return a.si_ < b.si_; }
    friend constexpr bool operator<=(TemperatureChange a, TemperatureChange b) { return a.si_ <= b.si_; }
    friend constexpr bool operator>(TemperatureChange a, TemperatureChange b) { return a.si_ > b.si_; }
    friend constexpr bool operator>=(TemperatureChange a, TemperatureChange b) { return a.si_ >= b.si_; }

    friend constexpr TemperatureChange operator+(TemperatureChange a, TemperatureChange b) { return TemperatureChange(a.si_ + b.si_); }
    friend constexpr TemperatureChange operator-(TemperatureChange a, TemperatureChange b) { return TemperatureChange(a.si_ - b.si_); }
    friend constexpr TemperatureChange operator-(TemperatureChange a) { return TemperatureChange(-a.si_); }
    friend constexpr TemperatureChange operator*(TemperatureChange a, double x) { return TemperatureChange(a.si_ * x); }
    friend constexpr TemperatureChange operator*(double x, TemperatureChange a) { return TemperatureChange(x * a.si_); }
    friend constexpr TemperatureChange operator/(TemperatureChange a, double x) { return TemperatureChange(a.si_ / x); }
    friend constexpr double operator/(TemperatureChange a, TemperatureChange b) { return a.si_ / b.si_; }

private:
    explicit constexpr TemperatureChange(double si) : si_(si) {}
    double si_;
};

// Products and quotients of quantities.
constexpr Area operator*(Length a, Length b) { return Area::from_si(a.si() * b.si()); }
constexpr Length operator/(Area a, Length b) { return Length::from_si(a.si() / b.si()); }
constexpr FirstMoment operator*(Area a, Length b) { return FirstMoment::from_si(a.si() * b.si()); }
constexpr Area operator/(FirstMoment a, Length b) { return Area::from_si(a.si() / b.si()); }
constexpr FirstMoment operator*(Length a, Area b) { return FirstMoment::from_si(a.si() * b.si()); }
constexpr Length operator/(FirstMoment a, Area b) { return Length::from_si(a.si() / b.si()); }
constexpr SecondMoment operator*(FirstMoment a, Length b) { return SecondMoment::from_si(a.si() * b.si()); }
constexpr FirstMoment operator/(SecondMoment a, Length b) { return FirstMoment::from_si(a.si() / b.si()); }
constexpr SecondMoment operator*(Length a, FirstMoment b) { return SecondMoment::from_si(a.si() * b.si()); }
constexpr Length operator/(SecondMoment a, FirstMoment b) { return Length::from_si(a.si() / b.si()); }
constexpr Moment operator*(Force a, Length b) { return Moment::from_si(a.si() * b.si()); }
constexpr Force operator/(Moment a, Length b) { return Force::from_si(a.si() / b.si()); }
constexpr Moment operator*(Length a, Force b) { return Moment::from_si(a.si() * b.si()); }
constexpr Length operator/(Moment a, Force b) { return Length::from_si(a.si() / b.si()); }
constexpr Force operator*(LineLoad a, Length b) { return Force::from_si(a.si() * b.si()); }
constexpr LineLoad operator/(Force a, Length b) { return LineLoad::from_si(a.si() / b.si()); }
constexpr Force operator*(Length a, LineLoad b) { return Force::from_si(a.si() * b.si()); }
constexpr Length operator/(Force a, LineLoad b) { return Length::from_si(a.si() / b.si()); }
constexpr LineLoad operator*(AreaLoad a, Length b) { return LineLoad::from_si(a.si() * b.si()); }
constexpr AreaLoad operator/(LineLoad a, Length b) { return AreaLoad::from_si(a.si() / b.si()); }
constexpr LineLoad operator*(Length a, AreaLoad b) { return LineLoad::from_si(a.si() * b.si()); }
constexpr Length operator/(LineLoad a, AreaLoad b) { return Length::from_si(a.si() / b.si()); }
constexpr Stress operator*(Modulus a, Strain b) { return Stress::from_si(a.si() * b.si()); }
constexpr Modulus operator/(Stress a, Strain b) { return Modulus::from_si(a.si() / b.si()); }
constexpr Stress operator*(Strain a, Modulus b) { return Stress::from_si(a.si() * b.si()); }
constexpr Strain operator/(Stress a, Modulus b) { return Strain::from_si(a.si() / b.si()); }
constexpr Force operator*(Stress a, Area b) { return Force::from_si(a.si() * b.si()); }
constexpr Stress operator/(Force a, Area b) { return Stress::from_si(a.si() / b.si()); }
constexpr Force operator*(Area a, Stress b) { return Force::from_si(a.si() * b.si()); }
constexpr Area operator/(Force a, Stress b) { return Area::from_si(a.si() / b.si()); }
constexpr AxialStiffness operator*(Modulus a, Area b) { return AxialStiffness::from_si(a.si() * b.si()); }
constexpr Modulus operator/(AxialStiffness a, Area b) { return Modulus::from_si(a.si() / b.si()); }
constexpr AxialStiffness operator*(Area a, Modulus b) { return AxialStiffness::from_si(a.si() * b.si()); }
constexpr Area operator/(AxialStiffness a, Modulus b) { return Area::from_si(a.si() / b.si()); }
constexpr Force operator*(AxialStiffness a, Strain b) { return Force::from_si(a.si() * b.si()); }
constexpr AxialStiffness operator/(Force a, Strain b) { return AxialStiffness::from_si(a.si() / b.si()); }
constexpr Force operator*(Strain a, AxialStiffness b) { return Force::from_si(a.si() * b.si()); }
constexpr Strain operator/(Force a, AxialStiffness b) { return Strain::from_si(a.si() / b.si()); }
constexpr BendingStiffness operator*(Modulus a, SecondMoment b) { return BendingStiffness::from_si(a.si() * b.si()); }
constexpr Modulus operator/(BendingStiffness a, SecondMoment b) { return Modulus::from_si(a.si() / b.si()); }
constexpr BendingStiffness operator*(SecondMoment a, Modulus b) { return BendingStiffness::from_si(a.si() * b.si()); }
constexpr SecondMoment operator/(BendingStiffness a, Modulus b) { return SecondMoment::from_si(a.si() / b.si()); }
constexpr Moment operator*(BendingStiffness a, Curvature b) { return Moment::from_si(a.si() * b.si()); }
constexpr BendingStiffness operator/(Moment a, Curvature b) { return BendingStiffness::from_si(a.si() / b.si()); }
constexpr Moment operator*(Curvature a, BendingStiffness b) { return Moment::from_si(a.si() * b.si()); }
constexpr Curvature operator/(Moment a, BendingStiffness b) { return Curvature::from_si(a.si() / b.si()); }
constexpr Strain operator*(Curvature a, Length b) { return Strain::from_si(a.si() * b.si()); }
constexpr Curvature operator/(Strain a, Length b) { return Curvature::from_si(a.si() / b.si()); }
constexpr Strain operator*(Length a, Curvature b) { return Strain::from_si(a.si() * b.si()); }
constexpr Length operator/(Strain a, Curvature b) { return Length::from_si(a.si() / b.si()); }
constexpr LineMass operator*(Density a, Area b) { return LineMass::from_si(a.si() * b.si()); }
constexpr Density operator/(LineMass a, Area b) { return Density::from_si(a.si() / b.si()); }
constexpr LineMass operator*(Area a, Density b) { return LineMass::from_si(a.si() * b.si()); }
constexpr Area operator/(LineMass a, Density b) { return Area::from_si(a.si() / b.si()); }
constexpr Mass operator*(LineMass a, Length b) { return Mass::from_si(a.si() * b.si()); }
constexpr LineMass operator/(Mass a, Length b) { return LineMass::from_si(a.si() / b.si()); }
constexpr Mass operator*(Length a, LineMass b) { return Mass::from_si(a.si() * b.si()); }
constexpr Length operator/(Mass a, LineMass b) { return Length::from_si(a.si() / b.si()); }
constexpr Strain operator*(ThermalExpansion a, TemperatureChange b) { return Strain::from_si(a.si() * b.si()); }
constexpr ThermalExpansion operator/(Strain a, TemperatureChange b) { return ThermalExpansion::from_si(a.si() / b.si()); }
constexpr Strain operator*(TemperatureChange a, ThermalExpansion b) { return Strain::from_si(a.si() * b.si()); }
constexpr TemperatureChange operator/(Strain a, ThermalExpansion b) { return TemperatureChange::from_si(a.si() / b.si()); }
constexpr ShearFlow operator*(SlipModulus a, Length b) { return ShearFlow::from_si(a.si() * b.si()); }
constexpr SlipModulus operator/(ShearFlow a, Length b) { return SlipModulus::from_si(a.si() / b.si()); }
constexpr ShearFlow operator*(Length a, SlipModulus b) { return ShearFlow::from_si(a.si() * b.si()); }
constexpr Length operator/(ShearFlow a, SlipModulus b) { return Length::from_si(a.si() / b.si()); }
constexpr Moment operator*(RotationalStiffness a, Angle b) { return Moment::from_si(a.si() * b.si()); }
constexpr RotationalStiffness operator/(Moment a, Angle b) { return RotationalStiffness::from_si(a.si() / b.si()); }
constexpr Moment operator*(Angle a, RotationalStiffness b) { return Moment::from_si(a.si() * b.si()); }
constexpr Angle operator/(Moment a, RotationalStiffness b) { return Angle::from_si(a.si() / b.si()); }
constexpr Force operator*(ShearFlow a, Length b) { return Force::from_si(a.si() * b.si()); }
constexpr Force operator*(Length a, ShearFlow b) { return Force::from_si(a.si() * b.si()); }
constexpr Length operator/(Force a, ShearFlow b) { return Length::from_si(a.si() / b.si()); }
constexpr Force operator*(FastenerStiffness a, Length b) { return Force::from_si(a.si() * b.si()); }
constexpr Force operator*(Length a, FastenerStiffness b) { return Force::from_si(a.si() * b.si()); }
constexpr Length operator/(Force a, FastenerStiffness b) { return Length::from_si(a.si() / b.si()); }
constexpr Force operator*(SpringStiffness a, Length b) { return Force::from_si(a.si() * b.si()); }
constexpr Force operator*(Length a, SpringStiffness b) { return Force::from_si(a.si() * b.si()); }
constexpr Length operator/(Force a, SpringStiffness b) { return Length::from_si(a.si() / b.si()); }
constexpr SlipModulus operator/(FastenerStiffness a, Length b) { return SlipModulus::from_si(a.si() / b.si()); }
constexpr Length operator/(FastenerStiffness a, SlipModulus b) { return Length::from_si(a.si() / b.si()); }

// Number literals with units: 50_mm, 6.5_kN_per_m.
namespace literals {
constexpr Length operator""_m(long double x) { return Length::from_m(static_cast<double>(x)); }
constexpr Length operator""_m(unsigned long long x) { return Length::from_m(static_cast<double>(x)); }
constexpr Length operator""_mm(long double x) { return Length::from_mm(static_cast<double>(x)); }
constexpr Length operator""_mm(unsigned long long x) { return Length::from_mm(static_cast<double>(x)); }
constexpr Length operator""_cm(long double x) { return Length::from_cm(static_cast<double>(x)); }
constexpr Length operator""_cm(unsigned long long x) { return Length::from_cm(static_cast<double>(x)); }
constexpr Length operator""_inch(long double x) { return Length::from_inch(static_cast<double>(x)); }
constexpr Length operator""_inch(unsigned long long x) { return Length::from_inch(static_cast<double>(x)); }
constexpr Length operator""_ft(long double x) { return Length::from_ft(static_cast<double>(x)); }
constexpr Length operator""_ft(unsigned long long x) { return Length::from_ft(static_cast<double>(x)); }
constexpr Area operator""_m2(long double x) { return Area::from_m2(static_cast<double>(x)); }
constexpr Area operator""_m2(unsigned long long x) { return Area::from_m2(static_cast<double>(x)); }
constexpr Area operator""_mm2(long double x) { return Area::from_mm2(static_cast<double>(x)); }
constexpr Area operator""_mm2(unsigned long long x) { return Area::from_mm2(static_cast<double>(x)); }
constexpr Area operator""_cm2(long double x) { return Area::from_cm2(static_cast<double>(x)); }
constexpr Area operator""_cm2(unsigned long long x) { return Area::from_cm2(static_cast<double>(x)); }
constexpr Area operator""_in2(long double x) { return Area::from_in2(static_cast<double>(x)); }
constexpr Area operator""_in2(unsigned long long x) { return Area::from_in2(static_cast<double>(x)); }
constexpr Area operator""_ft2(long double x) { return Area::from_ft2(static_cast<double>(x)); }
constexpr Area operator""_ft2(unsigned long long x) { return Area::from_ft2(static_cast<double>(x)); }
constexpr FirstMoment operator""_m3(long double x) { return FirstMoment::from_m3(static_cast<double>(x)); }
constexpr FirstMoment operator""_m3(unsigned long long x) { return FirstMoment::from_m3(static_cast<double>(x)); }
constexpr FirstMoment operator""_mm3(long double x) { return FirstMoment::from_mm3(static_cast<double>(x)); }
constexpr FirstMoment operator""_mm3(unsigned long long x) { return FirstMoment::from_mm3(static_cast<double>(x)); }
constexpr FirstMoment operator""_cm3(long double x) { return FirstMoment::from_cm3(static_cast<double>(x)); }
constexpr FirstMoment operator""_cm3(unsigned long long x) { return FirstMoment::from_cm3(static_cast<double>(x)); }
constexpr FirstMoment operator""_in3(long double x) { return FirstMoment::from_in3(static_cast<double>(x)); }
constexpr FirstMoment operator""_in3(unsigned long long x) { return FirstMoment::from_in3(static_cast<double>(x)); }
constexpr SecondMoment operator""_m4(long double x) { return SecondMoment::from_m4(static_cast<double>(x)); }
constexpr SecondMoment operator""_m4(unsigned long long x) { return SecondMoment::from_m4(static_cast<double>(x)); }
constexpr SecondMoment operator""_mm4(long double x) { return SecondMoment::from_mm4(static_cast<double>(x)); }
constexpr SecondMoment operator""_mm4(unsigned long long x) { return SecondMoment::from_mm4(static_cast<double>(x)); }
constexpr SecondMoment operator""_cm4(long double x) { return SecondMoment::from_cm4(static_cast<double>(x)); }
constexpr SecondMoment operator""_cm4(unsigned long long x) { return SecondMoment::from_cm4(static_cast<double>(x)); }
constexpr SecondMoment operator""_in4(long double x) { return SecondMoment::from_in4(static_cast<double>(x)); }
constexpr SecondMoment operator""_in4(unsigned long long x) { return SecondMoment::from_in4(static_cast<double>(x)); }
constexpr Force operator""_N(long double x) { return Force::from_N(static_cast<double>(x)); }
constexpr Force operator""_N(unsigned long long x) { return Force::from_N(static_cast<double>(x)); }
constexpr Force operator""_kN(long double x) { return Force::from_kN(static_cast<double>(x)); }
constexpr Force operator""_kN(unsigned long long x) { return Force::from_kN(static_cast<double>(x)); }
constexpr Force operator""_MN(long double x) { return Force::from_MN(static_cast<double>(x)); }
constexpr Force operator""_MN(unsigned long long x) { return Force::from_MN(static_cast<double>(x)); }
constexpr Force operator""_lbf(long double x) { return Force::from_lbf(static_cast<double>(x)); }
constexpr Force operator""_lbf(unsigned long long x) { return Force::from_lbf(static_cast<double>(x)); }
constexpr Force operator""_kip(long double x) { return Force::from_kip(static_cast<double>(x)); }
constexpr Force operator""_kip(unsigned long long x) { return Force::from_kip(static_cast<double>(x)); }
constexpr LineLoad operator""_N_per_m(long double x) { return LineLoad::from_N_per_m(static_cast<double>(x)); }
constexpr LineLoad operator""_N_per_m(unsigned long long x) { return LineLoad::from_N_per_m(static_cast<double>(x)); }
constexpr LineLoad operator""_kN_per_m(long double x) { return LineLoad::from_kN_per_m(static_cast<double>(x)); }
constexpr LineLoad operator""_kN_per_m(unsigned long long x) { return LineLoad::from_kN_per_m(static_cast<double>(x)); }
constexpr LineLoad operator""_N_per_mm(long double x) { return LineLoad::from_N_per_mm(static_cast<double>(x)); }
constexpr LineLoad operator""_N_per_mm(unsigned long long x) { return LineLoad::from_N_per_mm(static_cast<double>(x)); }
constexpr LineLoad operator""_plf(long double x) { return LineLoad::from_plf(static_cast<double>(x)); }
constexpr LineLoad operator""_plf(unsigned long long x) { return LineLoad::from_plf(static_cast<double>(x)); }
constexpr LineLoad operator""_lbf_per_ft(long double x) { return LineLoad::from_lbf_per_ft(static_cast<double>(x)); }
constexpr LineLoad operator""_lbf_per_ft(unsigned long long x) { return LineLoad::from_lbf_per_ft(static_cast<double>(x)); }
constexpr LineLoad operator""_kip_per_ft(long double x) { return LineLoad::from_kip_per_ft(static_cast<double>(x)); }
constexpr LineLoad operator""_kip_per_ft(unsigned long long x) { return LineLoad::from_kip_per_ft(static_cast<double>(x)); }
constexpr Moment operator""_N_m(long double x) { return Moment::from_N_m(static_cast<double>(x)); }
constexpr Moment operator""_N_m(unsigned long long x) { return Moment::from_N_m(static_cast<double>(x)); }
constexpr Moment operator""_kN_m(long double x) { return Moment::from_kN_m(static_cast<double>(x)); }
constexpr Moment operator""_kN_m(unsigned long long x) { return Moment::from_kN_m(static_cast<double>(x)); }
constexpr Moment operator""_N_mm(long double x) { return Moment::from_N_mm(static_cast<double>(x)); }
constexpr Moment operator""_N_mm(unsigned long long x) { return Moment::from_N_mm(static_cast<double>(x)); }
constexpr Moment operator""_kip_ft(long double x) { return Moment::from_kip_ft(static_cast<double>(x)); }
constexpr Moment operator""_kip_ft(unsigned long long x) { return Moment::from_kip_ft(static_cast<double>(x)); }
constexpr Moment operator""_kip_in(long double x) { return Moment::from_kip_in(static_cast<double>(x)); }
constexpr Moment operator""_kip_in(unsigned long long x) { return Moment::from_kip_in(static_cast<double>(x)); }
constexpr Moment operator""_lbf_ft(long double x) { return Moment::from_lbf_ft(static_cast<double>(x)); }
constexpr Moment operator""_lbf_ft(unsigned long long x) { return Moment::from_lbf_ft(static_cast<double>(x)); }
constexpr Stress operator""_Pa(long double x) { return Stress::from_Pa(static_cast<double>(x)); }
constexpr Stress operator""_Pa(unsigned long long x) { return Stress::from_Pa(static_cast<double>(x)); }
constexpr Stress operator""_kPa(long double x) { return Stress::from_kPa(static_cast<double>(x)); }
constexpr Stress operator""_kPa(unsigned long long x) { return Stress::from_kPa(static_cast<double>(x)); }
constexpr Stress operator""_MPa(long double x) { return Stress::from_MPa(static_cast<double>(x)); }
constexpr Stress operator""_MPa(unsigned long long x) { return Stress::from_MPa(static_cast<double>(x)); }
constexpr Stress operator""_N_per_mm2(long double x) { return Stress::from_N_per_mm2(static_cast<double>(x)); }
constexpr Stress operator""_N_per_mm2(unsigned long long x) { return Stress::from_N_per_mm2(static_cast<double>(x)); }
constexpr Stress operator""_psi(long double x) { return Stress::from_psi(static_cast<double>(x)); }
constexpr Stress operator""_psi(unsigned long long x) { return Stress::from_psi(static_cast<double>(x)); }
constexpr Stress operator""_ksi(long double x) { return Stress::from_ksi(static_cast<double>(x)); }
constexpr Stress operator""_ksi(unsigned long long x) { return Stress::from_ksi(static_cast<double>(x)); }
constexpr Modulus operator""_GPa(long double x) { return Modulus::from_GPa(static_cast<double>(x)); }
constexpr Modulus operator""_GPa(unsigned long long x) { return Modulus::from_GPa(static_cast<double>(x)); }
constexpr AreaLoad operator""_N_per_m2(long double x) { return AreaLoad::from_N_per_m2(static_cast<double>(x)); }
constexpr AreaLoad operator""_N_per_m2(unsigned long long x) { return AreaLoad::from_N_per_m2(static_cast<double>(x)); }
constexpr AreaLoad operator""_kN_per_m2(long double x) { return AreaLoad::from_kN_per_m2(static_cast<double>(x)); }
constexpr AreaLoad operator""_kN_per_m2(unsigned long long x) { return AreaLoad::from_kN_per_m2(static_cast<double>(x)); }
constexpr AreaLoad operator""_psf(long double x) { return AreaLoad::from_psf(static_cast<double>(x)); }
constexpr AreaLoad operator""_psf(unsigned long long x) { return AreaLoad::from_psf(static_cast<double>(x)); }
constexpr AreaLoad operator""_lbf_per_ft2(long double x) { return AreaLoad::from_lbf_per_ft2(static_cast<double>(x)); }
constexpr AreaLoad operator""_lbf_per_ft2(unsigned long long x) { return AreaLoad::from_lbf_per_ft2(static_cast<double>(x)); }
constexpr Density operator""_kg_per_m3(long double x) { return Density::from_kg_per_m3(static_cast<double>(x)); }
constexpr Density operator""_kg_per_m3(unsigned long long x) { return Density::from_kg_per_m3(static_cast<double>(x)); }
constexpr Density operator""_lb_per_ft3(long double x) { return Density::from_lb_per_ft3(static_cast<double>(x)); }
constexpr Density operator""_lb_per_ft3(unsigned long long x) { return Density::from_lb_per_ft3(static_cast<double>(x)); }
constexpr BendingStiffness operator""_N_m2(long double x) { return BendingStiffness::from_N_m2(static_cast<double>(x)); }
constexpr BendingStiffness operator""_N_m2(unsigned long long x) { return BendingStiffness::from_N_m2(static_cast<double>(x)); }
constexpr BendingStiffness operator""_kN_m2(long double x) { return BendingStiffness::from_kN_m2(static_cast<double>(x)); }
constexpr BendingStiffness operator""_kN_m2(unsigned long long x) { return BendingStiffness::from_kN_m2(static_cast<double>(x)); }
constexpr BendingStiffness operator""_MN_m2(long double x) { return BendingStiffness::from_MN_m2(static_cast<double>(x)); }
constexpr BendingStiffness operator""_MN_m2(unsigned long long x) { return BendingStiffness::from_MN_m2(static_cast<double>(x)); }
constexpr BendingStiffness operator""_N_mm2(long double x) { return BendingStiffness::from_N_mm2(static_cast<double>(x)); }
constexpr BendingStiffness operator""_N_mm2(unsigned long long x) { return BendingStiffness::from_N_mm2(static_cast<double>(x)); }
constexpr BendingStiffness operator""_kip_in2(long double x) { return BendingStiffness::from_kip_in2(static_cast<double>(x)); }
constexpr BendingStiffness operator""_kip_in2(unsigned long long x) { return BendingStiffness::from_kip_in2(static_cast<double>(x)); }
constexpr Curvature operator""_per_m(long double x) { return Curvature::from_per_m(static_cast<double>(x)); }
constexpr Curvature operator""_per_m(unsigned long long x) { return Curvature::from_per_m(static_cast<double>(x)); }
constexpr Curvature operator""_per_mm(long double x) { return Curvature::from_per_mm(static_cast<double>(x)); }
constexpr Curvature operator""_per_mm(unsigned long long x) { return Curvature::from_per_mm(static_cast<double>(x)); }
constexpr Strain operator""_ratio(long double x) { return Strain::from_ratio(static_cast<double>(x)); }
constexpr Strain operator""_ratio(unsigned long long x) { return Strain::from_ratio(static_cast<double>(x)); }
constexpr Strain operator""_permille(long double x) { return Strain::from_permille(static_cast<double>(x)); }
constexpr Strain operator""_permille(unsigned long long x) { return Strain::from_permille(static_cast<double>(x)); }
constexpr Angle operator""_rad(long double x) { return Angle::from_rad(static_cast<double>(x)); }
constexpr Angle operator""_rad(unsigned long long x) { return Angle::from_rad(static_cast<double>(x)); }
constexpr Angle operator""_mrad(long double x) { return Angle::from_mrad(static_cast<double>(x)); }
constexpr Angle operator""_mrad(unsigned long long x) { return Angle::from_mrad(static_cast<double>(x)); }
constexpr Angle operator""_deg(long double x) { return Angle::from_deg(static_cast<double>(x)); }
constexpr Angle operator""_deg(unsigned long long x) { return Angle::from_deg(static_cast<double>(x)); }
constexpr ThermalExpansion operator""_per_K(long double x) { return ThermalExpansion::from_per_K(static_cast<double>(x)); }
constexpr ThermalExpansion operator""_per_K(unsigned long long x) { return ThermalExpansion::from_per_K(static_cast<double>(x)); }
constexpr Mass operator""_kg(long double x) { return Mass::from_kg(static_cast<double>(x)); }
constexpr Mass operator""_kg(unsigned long long x) { return Mass::from_kg(static_cast<double>(x)); }
constexpr Mass operator""_t(long double x) { return Mass::from_t(static_cast<double>(x)); }
constexpr Mass operator""_t(unsigned long long x) { return Mass::from_t(static_cast<double>(x)); }
constexpr Mass operator""_lb(long double x) { return Mass::from_lb(static_cast<double>(x)); }
constexpr Mass operator""_lb(unsigned long long x) { return Mass::from_lb(static_cast<double>(x)); }
constexpr LineMass operator""_kg_per_m(long double x) { return LineMass::from_kg_per_m(static_cast<double>(x)); }
constexpr LineMass operator""_kg_per_m(unsigned long long x) { return LineMass::from_kg_per_m(static_cast<double>(x)); }
constexpr LineMass operator""_lb_per_ft(long double x) { return LineMass::from_lb_per_ft(static_cast<double>(x)); }
constexpr LineMass operator""_lb_per_ft(unsigned long long x) { return LineMass::from_lb_per_ft(static_cast<double>(x)); }
constexpr Duration operator""_s(long double x) { return Duration::from_s(static_cast<double>(x)); }
constexpr Duration operator""_s(unsigned long long x) { return Duration::from_s(static_cast<double>(x)); }
constexpr Duration operator""_h(long double x) { return Duration::from_h(static_cast<double>(x)); }
constexpr Duration operator""_h(unsigned long long x) { return Duration::from_h(static_cast<double>(x)); }
constexpr Duration operator""_d(long double x) { return Duration::from_d(static_cast<double>(x)); }
constexpr Duration operator""_d(unsigned long long x) { return Duration::from_d(static_cast<double>(x)); }
constexpr Duration operator""_year(long double x) { return Duration::from_year(static_cast<double>(x)); }
constexpr Duration operator""_year(unsigned long long x) { return Duration::from_year(static_cast<double>(x)); }
constexpr FastenerStiffness operator""_kN_per_mm(long double x) { return FastenerStiffness::from_kN_per_mm(static_cast<double>(x)); }
constexpr FastenerStiffness operator""_kN_per_mm(unsigned long long x) { return FastenerStiffness::from_kN_per_mm(static_cast<double>(x)); }
constexpr RotationalStiffness operator""_N_m_per_rad(long double x) { return RotationalStiffness::from_N_m_per_rad(static_cast<double>(x)); }
constexpr RotationalStiffness operator""_N_m_per_rad(unsigned long long x) { return RotationalStiffness::from_N_m_per_rad(static_cast<double>(x)); }
constexpr RotationalStiffness operator""_kN_m_per_rad(long double x) { return RotationalStiffness::from_kN_m_per_rad(static_cast<double>(x)); }
constexpr RotationalStiffness operator""_kN_m_per_rad(unsigned long long x) { return RotationalStiffness::from_kN_m_per_rad(static_cast<double>(x)); }
constexpr TemperatureChange operator""_K(long double x) { return TemperatureChange::from_K(static_cast<double>(x)); }
constexpr TemperatureChange operator""_K(unsigned long long x) { return TemperatureChange::from_K(static_cast<double>(x)); }
constexpr TemperatureChange operator""_degF(long double x) { return TemperatureChange::from_degF(static_cast<double>(x)); }
constexpr TemperatureChange operator""_degF(unsigned long long x) { return TemperatureChange::from_degF(static_cast<double>(x)); }

} // namespace literals
} // namespace beamcore

#endif // BEAMCORE_UNITS_HPP
