//! Sizes as sentences and tables show them, in the units of the book and rounded for reading.

use super::convert::in_unit;
use super::figure::{decimals, figure_of, unit as unit_name};
use crate::check::Action;
use crate::quantity::{Dimension, Force, Length, LineLoad, Moment, Quantity, Stress};
use crate::units::{System, WeightUnit};

/// Significant digits of what is read off: more than a tape or a caliper gives.
const READ: usize = 4;

/// A quantity, given in its base unit, in the unit of its field.
#[must_use]
pub fn quantity(base: f64, dimension: Dimension, unit: &str) -> String {
    let figure = figure_of(in_unit(base, dimension, unit), READ);
    match unit {
        "" => figure,
        "°" => figure + "°",
        unit => format!("{figure} {}", unit_name(unit)),
    }
}

/// What several readings, given in their base unit, come to.
#[must_use]
pub fn readings(bases: &[f64], mean: f64, dimension: Dimension, unit: &str) -> String {
    let ends = bases.iter().fold((mean, mean), |(low, high), b| (b.min(low), b.max(high)));
    let plain = |base: f64| figure_of(in_unit(base, dimension, unit), READ);
    format!(
        "{} readings · mean {} · spread {} to {}",
        bases.len(),
        quantity(mean, dimension, unit),
        plain(ends.0),
        quantity(ends.1, dimension, unit)
    )
}

/// A place along the span, to a hundredth of a metre or a tenth of a foot.
#[must_use]
pub fn station(x: Length, system: System) -> String {
    match system {
        System::MetreKilonewton => format!("{:.2} m", x.in_m() + 0.0),
        System::FootKip => format!("{:.1} ft", x.in_ft() + 0.0),
    }
}

/// The weight of a vehicle: tonnes, or short tons.
#[must_use]
pub fn weight(force: Force, system: System) -> String {
    match system {
        System::MetreKilonewton => format!("{:.1} t", force.in_tonne()),
        System::FootKip => format!("{} tons", decimals(force.in_short_ton(), 2)),
    }
}

/// A weight that is carried, rounded down to a tenth: tonnes, or short tons.
#[must_use]
pub fn carried(force: Force, system: System) -> String {
    let tenths = |figure: f64| libm::floor(figure * 10.0 + 1e-9) / 10.0;
    match system {
        System::MetreKilonewton => format!("{:.1} t", tenths(force.in_tonne())),
        System::FootKip => format!("{:.1} tons", tenths(force.in_short_ton())),
    }
}

/// The weight of an axle, without its unit, and the unit.
#[must_use]
pub fn axle(force: Force, system: System) -> (String, &'static str) {
    match system {
        System::MetreKilonewton => (format!("{:.0}", force.in_kn()), "kN"),
        System::FootKip => (decimals(force.in_kip(), 1), "kip"),
    }
}

/// A load on a length, without its unit: kN/m, or kip/ft.
#[must_use]
pub fn line_load(load: LineLoad, system: System) -> String {
    match system {
        System::MetreKilonewton => format!("{:.2}", load.in_kn_m()),
        System::FootKip => format!("{:.3}", load.in_kip_ft()),
    }
}

/// Unit of [`line_load`].
#[must_use]
pub const fn line_load_unit(system: System) -> &'static str {
    match system {
        System::MetreKilonewton => "kN/m",
        System::FootKip => "kip/ft",
    }
}

/// An effect or a capacity, given in the base unit of its action.
#[must_use]
pub fn effect(base: f64, action: Action, system: System) -> String {
    let metric = system == System::MetreKilonewton;
    match action {
        Action::Moment if metric => format!("{:.0} kN m", Moment::from_base(base).in_kn_m()),
        Action::Moment => format!("{:.0} kip ft", Moment::from_base(base).in_kip_ft()),
        Action::Shear | Action::Bearing if metric => format!("{:.0} kN", Force::from_base(base).in_kn()),
        Action::Shear | Action::Bearing => format!("{:.1} kip", Force::from_base(base).in_kip()),
        Action::Stress if metric => format!("{:.0} MPa", Stress::from_base(base).in_mpa()),
        Action::Stress => format!("{:.1} ksi", Stress::from_base(base).in_ksi()),
    }
}

/// A weight in the unit of a sign, rounded down, as a sentence says it.
#[must_use]
pub fn limit(force: Force, unit: WeightUnit) -> String {
    match unit {
        WeightUnit::ShortTons => format!("{:.0} tons", libm::floor(force.in_short_ton())),
        WeightUnit::Tonnes => format!("{:.0} t", libm::floor(force.in_tonne())),
    }
}

/// A limit that a sign has, as a sentence says it.
#[must_use]
pub fn signed(limit: u32, unit: WeightUnit) -> String {
    match unit {
        WeightUnit::ShortTons => format!("{limit} tons"),
        WeightUnit::Tonnes => format!("{limit} t"),
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    /// A Type 3 weighs 50 kip, an SU7 77.5 kip (MBE, appendix D6A, from memory); 1 kip is 0.45359237 t.
    #[test]
    fn weights_say_their_ton() {
        let su7 = Force::from_kip(77.5);
        assert_eq!(weight(su7, System::MetreKilonewton), "35.2 t");
        assert_eq!(weight(su7, System::FootKip), "38.75 tons");
        assert_eq!(weight(Force::from_kip(50.0), System::FootKip), "25 tons");
        assert_eq!(limit(su7, WeightUnit::Tonnes), "35 t");
        assert_eq!(limit(su7, WeightUnit::ShortTons), "38 tons");
    }

    /// Seven cores, mean by hand: 497 / 7 = 71.
    #[test]
    fn readings_have_a_mean_and_a_spread() {
        let cores = [65.0, 72.0, 70.0, 68.0, 78.0, 74.0, 70.0].map(|mm| 10.0 * mm);
        let mean = cores.iter().sum::<f64>() / 7.0;
        assert_eq!(
            readings(&cores, mean, Dimension::Length, "mm"),
            "7 readings · mean 71 mm · spread 65 to 78 mm"
        );
        assert_eq!(quantity(254.0 * 7.25, Dimension::Length, "mm"), "184.2 mm");
        assert_eq!(quantity(0.85, Dimension::Number, ""), "0.85");
    }

    #[test]
    fn places_and_effects_are_rounded_for_reading() {
        assert_eq!(station(Length::from_m(9.144), System::MetreKilonewton), "9.14 m");
        assert_eq!(station(Length::from_m(9.144), System::FootKip), "30.0 ft");
        assert_eq!(station(-Length::ZERO, System::FootKip), "0.0 ft");
        let moment = Moment::from_kn_m(2304.3);
        assert_eq!(effect(moment.base(), Action::Moment, System::MetreKilonewton), "2304 kN m");
        assert_eq!(effect(moment.base(), Action::Moment, System::FootKip), "1700 kip ft");
        assert_eq!(line_load(LineLoad::from_kn_m(15.278), System::MetreKilonewton), "15.28");
    }
}
