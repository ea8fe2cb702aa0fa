//! Readings as people write them. Conversion factors: NIST SP 811 (2008), appendix B; exact where
//! marked there in bold (inch, foot, pound-force).

use girderbook_core::limits;
use girderbook_core::quantity::{Angle, Force, Length, LineLoad, Quantity, Stress, UnitWeight};
use girderbook_core::units::System;
use girderbook_core::units::format::{factor, feet_inches, show, significant};
use girderbook_core::units::mark::{self, Mark};
use girderbook_core::units::parse::{readings, split};
use girderbook_core::units::registry;
use proptest::prelude::*;

fn lengths(text: &str, unit: &str) -> Vec<f64> {
    readings::<Length>(text, unit)
        .unwrap_or_else(|r| panic!("{text}: {}", r.message))
        .into_iter()
        .map(Quantity::base)
        .collect()
}

/// Base of a length is 0.1 mm: 254 an inch, 3048 a foot, exactly.
#[test]
fn lengths_in_every_spelling() {
    for (text, unit, expected) in [
        ("65", "mm", 650.0),
        ("65 mm", "in", 650.0),
        ("65mm", "mm", 650.0),
        ("7,1 cm", "mm", 710.0),
        ("7.1 CM", "mm", 710.0),
        ("2 3/8 in", "mm", 2.375 * 254.0),
        ("2 3/8", "in", 2.375 * 254.0),
        ("2-3/8\"", "in", 2.375 * 254.0),
        ("3/8 in", "in", 0.375 * 254.0),
        ("12'-3 1/2\"", "m", 12.0 * 3048.0 + 3.5 * 254.0),
        ("12' 3 1/2\"", "ft", 12.0 * 3048.0 + 3.5 * 254.0),
        ("12'-3 1/2", "ft", 12.0 * 3048.0 + 3.5 * 254.0),
        ("12'3.5\"", "ft", 12.0 * 3048.0 + 3.5 * 254.0),
        ("12 ft 3.5 in", "ft", 12.0 * 3048.0 + 3.5 * 254.0),
        ("12ft6.5in", "ft", 12.0 * 3048.0 + 6.5 * 254.0),
        ("12\u{2032}\u{2011}3\u{bd}\u{2033}", "ft", 12.0 * 3048.0 + 3.5 * 254.0),
        ("12\u{2019} 3\u{201d}", "ft", 12.0 * 3048.0 + 3.0 * 254.0),
        ("12-6 1/2", "ft", 12.0 * 3048.0 + 6.5 * 254.0),
        ("12.54'", "ft", 12.54 * 3048.0),
        ("150.5\"", "in", 150.5 * 254.0),
        ("18.3m", "m", 183_000.0),
        ("18.3 meters", "m", 183_000.0),
        ("2\u{be}", "in", 2.75 * 254.0),
        ("1e1 m", "m", 100_000.0),
        ("1,234.5 mm", "mm", 12_345.0),
        ("1.234,5 mm", "mm", 12_345.0),
        ("-5 mm", "mm", -50.0),
        ("\u{2212}5 mm", "mm", -50.0),
    ] {
        assert_eq!(lengths(text, unit), [expected], "{text}");
    }
}

#[test]
fn several_readings_in_one_field() {
    for text in
        ["65 72 70", "65 mm 72 mm 70 mm", "65, 72, 70", "65; 72; 70 mm", "65\n72\n70", "6,5 cm; 72; 70"]
    {
        let unit = "mm";
        if text.starts_with("6,5") {
            // One reading names another unit: the bare ones are not guessed.
            assert!(readings::<Length>(text, unit).is_err());
            continue;
        }
        assert_eq!(lengths(text, unit), [650.0, 720.0, 700.0], "{text}");
    }
    assert_eq!(split(" 65 mm; 2 3/8 in ;"), ["65 mm", "2 3/8 in"]);
    assert!(split("  ").is_empty());
}

#[test]
fn other_quantities() {
    let near = |a: f64, b: f64, text: &str| assert!((a / b - 1.0).abs() < 1e-6, "{text}: {a} against {b}");
    for (text, kn_m3) in [
        ("24.5 kN/m3", 24.5),
        ("24.5 kN/m^3", 24.5),
        ("24,5 kN/m\u{b3}", 24.5),
        ("150 pcf", 150.0 * 0.157_087_5),
        ("150 lb/ft3", 150.0 * 0.157_087_5),
        ("150 lbf/ft\u{b3}", 150.0 * 0.157_087_5),
        ("0.15 kcf", 150.0 * 0.157_087_5),
        ("2400 kg/m3", 2400.0 * 9.806_65e-3),
    ] {
        near(readings::<UnitWeight>(text, "kN/m3").expect(text)[0].in_kn_m3(), kn_m3, text);
    }
    for (text, mpa) in [
        ("36 ksi", 36.0 * 6.894_757),
        ("250 MPa", 250.0),
        ("250 N/mm2", 250.0),
        ("36000 psi", 36.0 * 6.894_757),
        ("250", 250.0),
    ] {
        near(readings::<Stress>(text, "MPa").expect(text)[0].in_mpa(), mpa, text);
    }
    for (text, kn_m) in [
        ("5.6 kN/m", 5.6),
        ("380 plf", 380.0 * 0.014_593_90),
        ("0.38 klf", 380.0 * 0.014_593_90),
        ("380 lb/ft", 380.0 * 0.014_593_90),
    ] {
        near(readings::<LineLoad>(text, "kN/m").expect(text)[0].in_kn_m(), kn_m, text);
    }
    for (text, kn) in [
        ("17 kip", 17.0 * 4.448_222),
        ("17 k", 17.0 * 4.448_222),
        ("8 t", 8.0 * 9.806_65),
        ("4 short tons", 8.0 * 4.448_222),
        ("8000 lb", 8.0 * 4.448_222),
    ] {
        near(readings::<Force>(text, "kN").expect(text)[0].in_kn(), kn, text);
    }
    assert_eq!(readings::<Angle>("15\u{b0}", "\u{b0}").expect("degrees")[0].in_deg(), 15.0);
    assert_eq!(readings::<f64>("1.25", "").expect("a number"), [1.25]);
}

#[test]
fn what_is_refused_and_how_it_is_mended() {
    for (text, unit, message, repair) in [
        ("12 6", "ft", "\"12 6\" can be feet and inches, or two readings", Some("12 ft 6 in")),
        ("abc", "mm", "\"abc\" is neither a figure nor a unit known here", None),
        ("65 kN", "mm", "kN is the unit of a force or weight; this field takes a length", None),
        ("1,234", "mm", "1,234 can be 1234 or 1.234", Some("1234")),
        ("3/0 in", "in", "3/0 is beyond what can be calculated with", None),
        ("1e999", "mm", "1e999 is beyond what can be calculated with", None),
        ("NaN", "mm", "\"NaN\" is neither a figure nor a unit known here", None),
        ("inf", "mm", "\"inf\" is neither a figure nor a unit known here", None),
        ("--5", "mm", "\"--5\" cannot be read as a length", None),
        ("5-", "mm", "\"5-\" cannot be read as a length", None),
        ("mm", "mm", "\"mm\" cannot be read as a length", None),
        (
            "2; 3; 4 in",
            "mm",
            "some readings have no unit: are they mm like the field, or in?",
            Some("2 in; 3 in; 4 in"),
        ),
    ] {
        let refusal = readings::<Length>(text, unit).expect_err(text);
        assert_eq!(refusal.message, message, "{text}");
        assert_eq!(refusal.repair.as_deref(), repair, "{text}");
        assert!(!refusal.mend.is_empty());
        if let Some(repair) = refusal.repair {
            readings::<Length>(&repair, unit)
                .unwrap_or_else(|r| panic!("the repair of {text}: {}", r.message));
        }
    }
    let ton = readings::<Force>("5 tons", "kN").expect_err("ambiguous");
    assert_eq!(ton.repair.as_deref(), Some("5 short tons"));
    assert!(readings::<Length>(&"1 ".repeat(400), "mm").is_err());
    assert!(readings::<Length>(&"1;".repeat(60), "mm").is_err());
}

#[test]
fn the_registry_and_the_marks_agree() {
    fn same<Q: Quantity, U: Mark<Q>>(_: U) {
        let unit = registry::by_name(U::NAME).unwrap_or_else(|| panic!("{}", U::NAME));
        assert_eq!(unit.dimension, Q::DIMENSION);
        assert!((unit.per / U::PER - 1.0).abs() < 1e-15, "{}", U::NAME);
    }
    same(mark::Deg);
    same(mark::Inch);
    same(mark::Ft);
    same(mark::Mm);
    same(mark::M);
    same(mark::In2);
    same(mark::Ft2);
    same(mark::Mm2);
    same(mark::M2);
    same(mark::In3);
    same(mark::Mm3);
    same(mark::In4);
    same(mark::Mm4);
    same(mark::Kip);
    same(mark::KN);
    same(mark::ShortTon);
    same(mark::Tonne);
    same(mark::KipPerFt);
    same(mark::KNPerM);
    same(mark::Ksi);
    same(mark::Mpa);
    same(mark::KNPerM2);
    same(mark::Pcf);
    same(mark::Kcf);
    same(mark::KNPerM3);
    same(mark::KipFt);
    same(mark::KipIn);
    same(mark::KNm);
}

#[test]
fn quantities_as_text() {
    assert_eq!(show(Length::from_mm(71.0), "mm"), "71.0 mm");
    assert_eq!(show(Length::from_m(-0.001), "m"), "0.00 m");
    assert_eq!(feet_inches(Length::from_inch(147.5)), "12'-3 1/2\"");
    assert_eq!(feet_inches(Length::from_inch(2.0 + 3.0 / 8.0)), "0'-2 3/8\"");
    assert_eq!(feet_inches(Length::from_inch(11.99)), "1'-0\"");
    assert_eq!(significant(0.012_345, 3), "0.0123");
    assert_eq!(significant(12_345.0, 3), "12345");
    // A factor never rounds up to or over a threshold that decides.
    for (rf, text) in [
        (0.8074, "0.81"),
        (0.9991, "0.99"),
        (0.996, "0.99"),
        (1.0, "1.00"),
        (1.366, "1.37"),
        (0.2999, "0.29"),
        (0.3, "0.30"),
    ] {
        assert_eq!(factor(rf), text, "{rf}");
    }
}

#[test]
fn limits_are_named_have_reasons_and_refuse() {
    for limit in limits::all() {
        assert!(limit.least < limit.most && !limit.reason.is_empty() && !limit.name.is_empty());
        assert!(limit.holds(limit.most) && !limit.holds(limit.most * 1.001 + 1.0));
        assert!(!limit.holds(f64::NAN) && !limit.holds(f64::INFINITY));
        assert_eq!(limit.holds(limit.least), !limit.open);
    }
    let problem = limits::SPAN
        .check("spans.s1.length", Length::from_m(1e12).base(), "1000000000000 m", System::MetreKilonewton)
        .expect_err("too long");
    assert_eq!(problem.path, "spans.s1.length");
    assert_eq!(problem.message, "span must be 2 to 60 m, not 1000000000000 m");
    assert_eq!(limits::SPAN.range(System::FootKip), "6.56 to 197 ft");
}

proptest! {
    #[test]
    fn no_text_makes_it_panic(text in "\\PC{0,40}") {
        let _ = readings::<Length>(&text, "ft");
        let _ = readings::<UnitWeight>(&text, "pcf");
        let _ = readings::<f64>(&text, "");
    }

    #[test]
    fn no_likely_text_makes_it_panic(text in "[0-9'\"/ .,;eE+ftimn-]{0,24}") {
        if let Ok(values) = readings::<Length>(&text, "ft") {
            prop_assert!(values.iter().all(|v| v.base().is_finite()));
        }
    }

    #[test]
    fn sixteenths_come_back_exactly(sixteenths in 0_i32..20_000) {
        let length = Length::from_inch(f64::from(sixteenths) / 16.0);
        let text = feet_inches(length);
        prop_assert_eq!(readings::<Length>(&text, "ft").expect("our own text")[0], length);
    }
}
