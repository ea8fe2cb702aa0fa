//! The unit system of a book: what a bare figure in a field means, and what is shown.

use crate::quantity::Dimension;

/// What a bare figure means and in which units results are shown. What was written with its own
/// unit keeps it.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum System {
    /// Metres, millimetres, kilonewtons, megapascals.
    MetreKilonewton,
    /// Feet, inches, kips, kips a square inch.
    FootKip,
}

/// Whether a length is long (a span, a spacing) or small (a thickness): they have different
/// default units in both systems.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Scale {
    /// Spans, spacings, widths: m or ft.
    Long,
    /// Thicknesses, depths, widths of flanges: mm or in.
    Small,
}

/// The default unit of a field, as its name in [`crate::units::mark`].
#[must_use]
pub const fn default_unit(system: System, dimension: Dimension, scale: Scale) -> &'static str {
    use Dimension as D;
    use System::{FootKip, MetreKilonewton};
    match (dimension, system, scale) {
        (D::Number, _, _) => "",
        (D::Angle, _, _) => "°",
        (D::Length, MetreKilonewton, Scale::Long) => "m",
        (D::Length, MetreKilonewton, Scale::Small) => "mm",
        (D::Length, FootKip, Scale::Long) => "ft",
        (D::Length, FootKip, Scale::Small) => "in",
        (D::Area, MetreKilonewton, _) => "mm2",
        (D::Area, FootKip, _) => "in2",
        (D::Modulus, MetreKilonewton, _) => "mm3",
        (D::Modulus, FootKip, _) => "in3",
        (D::Inertia, MetreKilonewton, _) => "mm4",
        (D::Inertia, FootKip, _) => "in4",
        (D::Force, MetreKilonewton, _) => "kN",
        (D::Force, FootKip, _) => "kip",
        (D::LineLoad, MetreKilonewton, _) => "kN/m",
        (D::LineLoad, FootKip, _) => "kip/ft",
        (D::Stress, MetreKilonewton, _) => "MPa",
        (D::Stress, FootKip, _) => "ksi",
        (D::UnitWeight, MetreKilonewton, _) => "kN/m3",
        (D::UnitWeight, FootKip, _) => "pcf",
        (D::Moment, MetreKilonewton, _) => "kN m",
        (D::Moment, FootKip, _) => "kip ft",
    }
}

/// Unit of weight on a sign. Short tons and tonnes differ by a tenth, so it stands beside every weight.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum WeightUnit {
    /// Short tons of 2,000 lb.
    ShortTons,
    /// Tonnes of 1,000 kg.
    Tonnes,
}
