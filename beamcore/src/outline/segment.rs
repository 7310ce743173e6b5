//! The circular segment: what lies between an arc and its chord.

/// A circular segment, by half its chord h and the signed distance d of the chord from the centre:
/// positive if the segment is less than half the disc.
///
/// The half angle a of the arc has sin a = h/r and cos a = d/r, so that only the angle itself is
/// transcendental.
#[derive(Clone, Copy, Debug)]
pub(super) struct Segment {
    half_chord: f64,
    offset: f64,
}

/// Moments of a circular segment about the middle of its chord; n runs across the chord towards
/// the arc, t along the chord. Those odd in t are zero.
#[derive(Clone, Copy, Debug)]
pub(super) struct SegmentMoments {
    /// int dA.
    pub area: f64,
    /// int n dA.
    pub n: f64,
    /// int n^2 dA.
    pub nn: f64,
    /// int t^2 dA.
    pub tt: f64,
}

/// Arcs with h/r up to this limit are integrated without the closed form, which cancels there.
const FLAT: f64 = 0.25;

/// Positive nodes and weights of the Gauss-Legendre rule of 10 points on (-1, 1), computed from the
/// roots of the Legendre polynomial with 50 digits. Source: Abramowitz and Stegun, Handbook of
/// Mathematical Functions, table 25.4 (from memory).
const GAUSS: [(f64, f64); 5] = [
    (0.148_874_338_981_631_22, 0.295_524_224_714_752_87),
    (0.433_395_394_129_247_2, 0.269_266_719_309_996_35),
    (0.679_409_568_299_024_4, 0.219_086_362_515_982_04),
    (0.865_063_366_688_984_5, 0.149_451_349_150_580_6),
    (0.973_906_528_517_171_7, 0.066_671_344_308_688_14),
];

impl Segment {
    pub const fn new(half_chord: f64, offset: f64) -> Self {
        Self { half_chord, offset }
    }

    pub fn radius(self) -> f64 {
        (self.half_chord * self.half_chord + self.offset * self.offset).sqrt()
    }

    /// Half the angle of the arc, from 0 to pi.
    fn half_angle(self) -> f64 {
        crate::math::atan2(self.half_chord, self.offset)
    }

    /// The length of the arc, 2 a r.
    pub fn arc_length(self) -> f64 {
        2.0 * self.half_angle() * self.radius()
    }

    /// Height over the chord, r - d.
    pub fn rise(self) -> f64 {
        self.height(0.0)
    }

    /// Height over the chord at the distance t from its middle: sqrt(r^2 - t^2) - d.
    fn height(self, t: f64) -> f64 {
        let (h, d, r) = (self.half_chord, self.offset, self.radius());
        let root = ((r - t) * (r + t)).sqrt();
        if d > 0.0 {
            // The same without a difference of nearly equal numbers.
            (h - t) * (h + t) / (root + d)
        } else {
            root - d
        }
    }

    pub fn moments(self) -> SegmentMoments {
        if self.offset > 0.0 && self.half_chord <= FLAT * self.radius() {
            self.flat()
        } else {
            self.closed()
        }
    }

    /// Closed form: about the centre of the circle, with k = a - sin a cos a,
    /// A = r^2 k, int n = 2 h^3/3, int n^2 = (r^2 A + 2 h^3 d)/4, int t^2 = (3 r^2 A - 2 h^3 d)/12,
    /// then moved to the chord. From int of 2 sqrt(r^2 - n^2) f(n) dn over d <= n <= r with
    /// n = r cos u.
    fn closed(self) -> SegmentMoments {
        let (h, d) = (self.half_chord, self.offset);
        let square = h * h + d * d;
        let area = square * self.half_angle() - h * d;
        let cube = h * h * h;
        let n = 2.0 / 3.0 * cube;
        let nn = (square * area + 2.0 * cube * d) / 4.0;
        SegmentMoments {
            area,
            n: n - d * area,
            nn: nn - 2.0 * d * n + d * d * area,
            tt: (3.0 * square * area - 2.0 * cube * d) / 12.0,
        }
    }

    /// Flat arcs: int over the chord of n, n^2/2, n^3/3 and t^2 n with the height n(t), by Gauss.
    /// The integrands are smooth beyond the chord as far as r >= 4 h, so that what the rule leaves
    /// out, of the order 7.9^-20, is below the last bit.
    fn flat(self) -> SegmentMoments {
        let mut sums = SegmentMoments {
            area: 0.0,
            n: 0.0,
            nn: 0.0,
            tt: 0.0,
        };
        for (node, weight) in GAUSS {
            // Both halves of the chord are alike.
            let (t, weight) = (self.half_chord * node, 2.0 * self.half_chord * weight);
            let n = self.height(t);
            sums.area += weight * n;
            sums.n += weight * n * n / 2.0;
            sums.nn += weight * n * n * n / 3.0;
            sums.tt += weight * t * t * n;
        }
        sums
    }
}
