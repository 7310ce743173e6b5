//! Shapes with sizes: values, problems and names.

use super::*;
use crate::units::Number;

/// Area, centroid and second moments of upright rectangles (y, z, width, height in mm of the middle
/// and sizes), some of them negative for what is cut out: sums of b h^3/12 and b h dz^2.
fn composed(rectangles: &[(f64, f64, f64, f64, f64)]) -> [f64; 6] {
    let sum = |f: &dyn Fn(f64, f64, f64, f64) -> f64| -> f64 {
        rectangles
            .iter()
            .map(|&(sign, y, z, w, h)| sign * f(y, z, w, h))
            .sum()
    };
    let area = sum(&|_, _, w, h| w * h);
    let (y0, z0) = (
        sum(&|y, _, w, h| y * w * h) / area,
        sum(&|_, z, w, h| z * w * h) / area,
    );
    [
        area,
        y0,
        z0,
        sum(&|_, z, w, h| w * h * h * h / 12.0 + w * h * (z - z0) * (z - z0)),
        sum(&|y, _, w, h| h * w * w * w / 12.0 + w * h * (y - y0) * (y - y0)),
        sum(&|y, z, w, h| w * h * (y - y0) * (z - z0)),
    ]
}

#[test]
fn shapes_are_the_sums_of_their_rectangles() {
    let cases = [
        (
            i_shape(300.mm(), 150.mm(), 12.mm(), 200.mm(), 20.mm(), 8.mm()),
            vec![
                (1.0, 0.0, 144.0, 150.0, 12.0),
                (1.0, 0.0, -140.0, 200.0, 20.0),
                (1.0, 0.0, 4.0, 8.0, 268.0),
            ],
            (200.0, 300.0),
        ),
        (
            tee(120.mm(), 100.mm(), 10.mm(), 6.mm()),
            vec![(1.0, 0.0, 55.0, 100.0, 10.0), (1.0, 0.0, -5.0, 6.0, 110.0)],
            (100.0, 120.0),
        ),
        (
            channel(200.mm(), 75.mm(), 11.mm(), 8.mm()),
            vec![
                (1.0, -33.5, 0.0, 8.0, 200.0),
                (1.0, 4.0, 94.5, 67.0, 11.0),
                (1.0, 4.0, -94.5, 67.0, 11.0),
            ],
            (75.0, 200.0),
        ),
        (
            angle(150.mm(), 90.mm(), 12.mm()),
            vec![
                (1.0, -39.0, 0.0, 12.0, 150.0),
                (1.0, 6.0, -69.0, 78.0, 12.0),
            ],
            (90.0, 150.0),
        ),
        (
            hollow_box(200.mm(), 300.mm(), 10.mm(), 25.mm()),
            vec![
                (1.0, 0.0, 0.0, 200.0, 300.0),
                (-1.0, 0.0, 0.0, 180.0, 250.0),
            ],
            (200.0, 300.0),
        ),
    ];
    for (outline, rectangles, (width, height)) in cases {
        assert_eq!(outline.problems("outline"), []);
        assert_eq!(
            (outline.width(), outline.height()),
            (width.mm(), height.mm())
        );
        let bounds = outline.region().bounds();
        assert_eq!(bounds.middle(), Point::ORIGIN);
        close(bounds.width(), width / 1000.0, 1.0, 1e-15);
        close(bounds.height(), height / 1000.0, 1.0, 1e-15);
        let [area, y, z, iyy, izz, iyz] = composed(&rectangles);
        close(outline.area().to_mm2(), area, area, 1e-14);
        close(outline.centroid_y().to_mm(), y, width, 1e-14);
        close(outline.centroid_z().to_mm(), z, height, 1e-14);
        close(outline.second_moment_yy().to_mm4(), iyy, iyy, 1e-14);
        close(outline.second_moment_zz().to_mm4(), izz, izz, 1e-14);
        close(outline.second_moment_yz().to_mm4(), iyz, iyy, 1e-14);
    }
}

/// 100 x 100 x 10 with sharp corners: the values were worked out by an independent script.
#[test]
fn an_angle_has_slanted_principal_axes() {
    let outline = angle(100.mm(), 100.mm(), 10.mm());
    let heel = 50.0 + outline.centroid_y().to_mm();
    close(heel, 28.684, heel, 2e-5);
    close(50.0 + outline.centroid_z().to_mm(), heel, heel, 1e-14);
    let (iyy, izz, iyz) = (
        outline.second_moment_yy().to_mm4(),
        outline.second_moment_zz().to_mm4(),
        outline.second_moment_yz().to_mm4(),
    );
    close(iyy, 1.80004e6, iyy, 5e-6);
    close(izz, iyy, iyy, 1e-14);
    close(iyz, -1.06579e6, iyy, 5e-6);
    let (mean, half) = ((iyy + izz) / 2.0, (iyy - izz) / 2.0);
    let radius = (half * half + iyz * iyz).sqrt();
    close(mean + radius, 2.86583e6, iyy, 5e-6);
    close(mean - radius, 0.73425e6, iyy, 5e-6);
    close(outline.perimeter().to_mm(), 400.0, 400.0, 1e-14);
}

/// The bits of b h and b h^3/12, in this order of products.
#[test]
fn a_rectangle_keeps_its_closed_form() {
    let (b, h) = (75.mm(), 220.mm());
    let found = rectangle(b, h).integrals();
    assert_eq!(found.area, (b * h).si());
    assert_eq!(found.iyy, (b * h * h * h / 12.0).si());
    assert_eq!(found.izz, (h * b * b * b / 12.0).si());
    assert_eq!((found.y, found.z, found.iyz), (0.0, 0.0, 0.0));
    same(&rectangle(b, h).region().integrals(), &found, 0.22, 1e-15);
}

#[test]
fn symmetric_shapes_have_exact_zeros() {
    for outline in [
        i_shape(301.mm(), 151.mm(), 12.3.mm(), 197.mm(), 19.7.mm(), 7.7.mm()),
        tee(123.mm(), 97.mm(), 9.7.mm(), 6.1.mm()),
        ring(76.1.mm(), 3.2.mm()),
        hollow_box(201.mm(), 307.mm(), 10.7.mm(), 25.1.mm()),
    ] {
        assert_eq!(outline.centroid_y(), Length::ZERO);
        assert_eq!(outline.second_moment_yz().si(), 0.0);
    }
    let outline = channel(203.mm(), 75.7.mm(), 11.1.mm(), 8.3.mm());
    assert_eq!(outline.centroid_z(), Length::ZERO);
    assert_eq!(outline.second_moment_yz().si(), 0.0);
}

/// A web as wide as its flange is a rectangle, with points that coincide.
#[test]
fn a_web_as_wide_as_its_flange_is_a_rectangle() {
    let plain = rectangle(80.mm(), 120.mm()).integrals();
    for outline in [
        tee(120.mm(), 80.mm(), 10.mm(), 80.mm()),
        i_shape(120.mm(), 80.mm(), 10.mm(), 80.mm(), 10.mm(), 80.mm()),
        channel(120.mm(), 80.mm(), 10.mm(), 80.mm()),
    ] {
        assert_eq!(outline.problems("outline"), []);
        same(&outline.integrals(), &plain, 0.12, 1e-14);
    }
}

#[test]
fn impossible_sizes_are_told() {
    let cases: [(Outline, &[&str]); 10] = [
        (
            rectangle(0.mm(), (-5).mm()),
            &[
                "o.rectangle.width: found 0 m; expected a length greater than zero",
                "o.rectangle.height: found -5 mm; expected a length greater than zero",
            ],
        ),
        (
            disc(Length::from_m(f64::NAN)),
            &["o.disc.diameter: found NaN mm; expected a length greater than zero"],
        ),
        (
            ring(60.mm(), 31.mm()),
            &[
                "o.ring.wall_thickness: found 31 mm, which leaves nothing inside; \
               expected less than half of the diameter, 60 mm",
            ],
        ),
        (
            hollow_box(100.mm(), 40.mm(), 50.mm(), 20.mm()),
            &[
                "o.box.side_thickness: found 50 mm, which leaves nothing inside; \
                 expected less than half of the width, 100 mm",
                "o.box.plate_thickness: found 20 mm, which leaves nothing inside; \
                 expected less than half of the height, 40 mm",
            ],
        ),
        (
            i_shape(30.mm(), 50.mm(), 12.mm(), 8.mm(), 20.mm(), 9.mm()),
            &[
                "o.i_shape.height: found 30 mm, of which the two flanges take 32 mm; \
                 expected a height that leaves some for the web between them",
                "o.i_shape.web_thickness: found 9 mm, which is wider than the flange; \
                 expected at most the bottom_width, 8 mm",
            ],
        ),
        (
            tee(20.mm(), 50.mm(), 20.mm(), 60.mm()),
            &[
                "o.tee.flange_thickness: found 20 mm, which leaves no height for the web; \
                 expected less than the height, 20 mm",
                "o.tee.web_thickness: found 60 mm, which is wider than the flange; \
                 expected at most the width, 50 mm",
            ],
        ),
        (
            channel(20.mm(), 50.mm(), 10.mm(), 5.mm()),
            &[
                "o.channel.flange_thickness: found 10 mm, which leaves nothing inside; \
               expected less than half of the height, 20 mm",
            ],
        ),
        (
            angle(50.mm(), 40.mm(), 45.mm()),
            &[
                "o.angle.thickness: found 45 mm, which is more than the leg is long; \
               expected at most the width, 40 mm",
            ],
        ),
        (
            tee(20.mm(), (-1).mm(), 20.mm(), 60.mm()),
            &["o.tee.width: found -1 mm; expected a length greater than zero"],
        ),
        (
            disc(Length::from_m(1e90)),
            &[
                "o.disc: found a size of 1e90 m by 1e90 m; expected sizes with which area and \
               second moments are ordinary numbers greater than zero",
            ],
        ),
    ];
    for (outline, expected) in cases {
        let found: Vec<_> = outline
            .problems("o")
            .iter()
            .map(ToString::to_string)
            .collect();
        assert_eq!(found, expected);
    }
}
