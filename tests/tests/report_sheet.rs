//! The printed worksheet can be checked with a pocket calculator: what is printed is read back by a
//! small calculator of intervals, in which a rounded figure stands for everything that rounds to it.

#[path = "report/calculator.rs"]
mod calculator;

use calculator::{Answer, Interval, evaluate, figure_of};
use girderbook_core::bridge::Straightness;
use girderbook_core::check::Action;
use girderbook_core::clause;
use girderbook_core::clauses::lrfd::steel::bearing::{BearingCase, Place, web_crippling, web_yielding};
use girderbook_core::clauses::lrfd::steel::flange::Hold;
use girderbook_core::clauses::lrfd::steel::lateral::Torsion;
use girderbook_core::clauses::lrfd::steel::noncomposite::{FlexureCase, nominal_moment};
use girderbook_core::quantity::{Angle, Length, LineLoad, Moment, Stress};
use girderbook_core::report::sheet::{From, rows, text};
use girderbook_core::section::effective::{Edge, Effective, Remains};
use girderbook_core::section::rolled;
use girderbook_core::units::mark::{Ft, Inch, KNPerM, KNm, KipFt, Ksi, M, One};
use girderbook_core::units::{Entered, Provenance, System};
use girderbook_core::worksheet::{Kind, Recorder, Sheet, Val};

fn entered(path: &str, value: Length, written: &[&str], provenance: Provenance) -> Entered<Length> {
    Entered {
        value,
        readings: vec![value; written.len()],
        written: written.iter().map(|w| (*w).to_owned()).collect(),
        provenance,
        path: path.to_owned(),
        source: "",
    }
}

/// Flexure of rolled girders in each branch of lateral-torsional buckling, and a bearing.
fn steel_sheet() -> Sheet {
    let mut rec = Sheet::default();
    for (name, f_y, braced, torsion) in [
        ("W36x182 (1980)", 33.0, 15.0, Torsion::Neglected),
        ("W36x182 (1980)", 33.0, 40.0, Torsion::Neglected),
        ("W36x150", 36.0, 22.5, Torsion::Counted),
        ("W30x99", 50.0, 5.0, Torsion::Counted),
    ] {
        rec.heading(name);
        let shape = rolled::find(name).expect("in the catalogue").shape("members.m1");
        let section = Effective::at(&mut rec, &shape, &Remains::default()).expect("a section");
        let brace =
            entered("members.m1.brace_spacing", Length::from_ft(braced), &["x"], Provenance::Measured);
        let hold = Hold::At(rec.given("L_b", "unbraced length", &brace, Inch));
        let steel = Entered::assumed("members.m1.yield_strength", Stress::from_ksi(f_y), "by year");
        let f_y = rec.given("F_y", "yield strength", &steel, Ksi);
        let case = FlexureCase {
            section: &section,
            f_y,
            f_y_path: "members.m1.yield_strength",
            pressed: Edge::Top,
            hold: &hold,
            c_b: Val::bare(1.0),
            torsion,
            skew: Val::bare(Angle::ZERO),
        };
        nominal_moment(&mut rec, &case).expect("a number");
        let n = rec.given(
            "N",
            "length of bearing",
            &entered("members.m1.bearing_length", Length::from_mm(200.0), &["200 mm"], Provenance::Drawing),
            Inch,
        );
        let t_w =
            entered("findings.f1.web_low", Length::from_mm(9.1), &["9.9 mm", "9.1 mm"], Provenance::Measured);
        let t_w = rec.given_as("t_w", "least web thickness", &t_w, Length::from_mm(9.1), Inch);
        let case = BearingCase {
            section: &section,
            t_w,
            f_yw: f_y,
            n,
            n_path: "members.m1.bearing_length",
            place: Place::End,
            web: Straightness::Straight,
            web_path: "findings.f1.straight",
        };
        web_yielding(&mut rec, &case).expect("a number");
        web_crippling(&mut rec, &case).expect("a number");
    }
    rec
}

fn meets(a: Interval, b: Interval) -> bool {
    a.low <= b.high && b.low <= a.high
}

/// Every formula, condition and sum of the sheet from its printed figures; the printed result must
/// lie where they lead.
fn check(sheet: &Sheet, system: System) -> usize {
    let mut checked = 0;
    for row in rows(sheet, system) {
        let formula = match row.from {
            From::Formula | From::Choice | From::Sum => &row.numbers,
            _ => continue,
        };
        let answer = evaluate(formula).unwrap_or_else(|e| panic!("line {}: {formula}: {e}", row.no));
        match answer {
            Answer::Figure(got) => {
                let printed = figure_of(&row.result).expect("a figure");
                assert!(meets(got, printed), "line {}: {formula} = {got:?}, printed {}", row.no, row.result);
                let moved = Interval { low: printed.low * 1.01 + 0.001, high: printed.high * 1.01 + 0.001 };
                // Printed figures that cancel each other out leave nothing to tell a wrong result by.
                let cancelled = got.low <= 0.0 && got.high >= 0.0;
                assert!(
                    cancelled || !meets(got, moved),
                    "line {}: a wrong result would pass: {got:?}",
                    row.no
                );
            }
            // Where the figures as printed do not decide, nothing is said.
            Answer::Holds(Some(holds)) => {
                assert_eq!(row.result, if holds { "yes" } else { "no" }, "line {}: {formula}", row.no);
            }
            Answer::Holds(None) => {}
        }
        checked += 1;
    }
    checked
}

#[test]
fn printed_figures_lead_to_the_printed_result() {
    let sheet = steel_sheet();
    for system in [System::MetreKilonewton, System::FootKip] {
        let checked = check(&sheet, system);
        assert!(checked > 80, "only {checked} lines were checked");
    }
}

/// The sheets that somebody would open in the demo books: each load's worst check of each action.
#[test]
fn sheets_of_the_demo_books_can_be_checked() {
    use girderbook_core::basis::mbe_a::MbeA;
    use girderbook_core::document;
    use girderbook_core::rating::{Rater, work};
    let mut sheets = 0;
    for text in
        [include_str!("../../core/demos/hollow-fork.json"), include_str!("../../core/demos/mill-race.json")]
    {
        let book = document::read(text).expect("a book");
        let basis = MbeA::default();
        let bridge = document::bridge(&book, &basis).bridge.expect("a bridge");
        let rating = Rater::default().rate(&bridge, &basis).expect("a rating");
        for load in 0..rating.loads.len() {
            for action in [Action::Moment, Action::Shear, Action::Bearing, Action::Stress] {
                let of = rating.checks.iter().filter(|c| (c.key.load, c.key.action) == (load, action));
                let rank = |c: &&girderbook_core::rating::Check| c.outcome.rank().unwrap_or(f64::MAX);
                let worst = of.min_by(|a, b| rank(a).total_cmp(&rank(b))).expect("a check");
                let mut sheet = Sheet::default();
                let again = work(&bridge, &basis, &worst.key, &mut sheet).expect("a sheet");
                // Regression: the sheet is the rating, but for the order in which axles are summed.
                let (sheet_rank, rank) =
                    (again.outcome.rank().expect("rated"), worst.outcome.rank().expect("rated"));
                assert!((sheet_rank - rank).abs() <= 1e-12 * rank, "{sheet_rank} against {rank}");
                assert!(check(&sheet, book.system.into()) > 20);
                let text = text_of(&sheet, book.system.into());
                assert!(!text.contains("no figure") && !text.contains("NaN"), "{text}");
                sheets += 1;
            }
        }
    }
    assert!(sheets >= 72, "{sheets}");
}

fn text_of(sheet: &Sheet, system: System) -> String {
    text(&rows(sheet, system))
}

#[test]
fn a_line_referred_to_prints_the_same_figure() {
    let sheet = steel_sheet();
    let rows = rows(&sheet, System::FootKip);
    let mut compared = 0;
    for (line, row) in sheet.lines.iter().zip(&rows) {
        let (Kind::Formula { inputs, .. } | Kind::Choice { inputs, .. }) = &line.kind else { continue };
        for input in inputs.iter().filter(|input| input.from.0 > 0) {
            assert!(row.refs.contains(&input.from.0), "line {} refers to {:?}", row.no, input.from);
            let source = sheet.line(input.from).expect("the line is there");
            if source.unit == input.unit && row.formula.contains(input.symbol) {
                let result = &rows[input.from.0 as usize - 1].result;
                assert!(
                    row.numbers.contains(result.as_str()),
                    "line {}: {result} in {}",
                    row.no,
                    row.numbers
                );
                compared += 1;
            }
        }
    }
    assert!(compared > 100, "only {compared} were compared");
}

#[test]
fn symbols_have_their_greek_letters() {
    use girderbook_core::report::sheet::symbol;
    for (name, letter) in [("gamma_DC", "γ_DC"), ("eta", "η"), ("phi", "φ"), ("M_n", "M_n"), ("t", "t")] {
        assert_eq!(symbol(name), letter);
    }
}

#[test]
fn the_unit_stands_once_beside_each_symbol() {
    clause! {
        fn twice(a: Length [Inch], F: Stress [Ksi]) -> R: f64 [One] { a / (a + 1.0) * F / (F + a) }
        cite "mechanics" what "nothing"
    }
    let mut sheet = Sheet::default();
    let (a, f) = (Val::bare(Length::from_inch(3.0)), Val::bare(Stress::from_ksi(-36.0)));
    twice(&mut sheet, a, f);
    let row = &rows(&sheet, System::FootKip)[0];
    assert_eq!(row.formula, "a / (a + 1) · F / (F + a)");
    assert_eq!(row.numbers, "3 in / (3 + 1) · (-36 ksi) / ((-36) + 3)");
}

/// 1 kip ft = 1.355818 kN m (NIST SP 811, appendix B.8).
#[test]
fn the_result_stands_in_the_units_of_the_book_as_well() {
    let mut sheet = Sheet::default();
    sheet.found("M", "live load moment", Moment::from_kip_ft(1000.0), KipFt, 0.0, || "at midspan".to_owned());
    sheet.given(
        "L",
        "span",
        &entered("spans.s1.length", Length::from_m(18.3), &["18.30 m", "60 ft 1/2 in"], Provenance::Measured),
        Ft,
    );
    let metric = rows(&sheet, System::MetreKilonewton);
    assert_eq!((metric[0].result.as_str(), metric[0].also.as_str()), ("1000 kip ft", "1355.8 kN m"));
    assert_eq!((metric[1].result.as_str(), metric[1].also.as_str()), ("60.039 ft", "18.3 m"));
    assert_eq!(metric[1].numbers, "2 readings: 18.30 m; 60 ft 1/2 in");
    assert_eq!(metric[1].path, "spans.s1.length");
    assert!(rows(&sheet, System::FootKip).iter().all(|row| row.also.is_empty()));
}

#[test]
fn a_sheet_reads_as_plain_text() {
    clause! {
        fn total(w: LineLoad [KNPerM], L: Length [M]) -> M_DC: Moment [KNm] { w * pow(L, 2.0) / 8.0 }
        cite "statics" what "moment of an even load at midspan"
    }
    let mut sheet = Sheet::default();
    sheet.heading("Dead load of G3");
    let deck =
        sheet.look_up("", "slab", LineLoad::from_kn_m(9.827), KNPerM, "take-off", || "184 mm".to_owned());
    let steel =
        sheet.look_up("", "girder", LineLoad::from_kn_m(2.662), KNPerM, "AISC", || "W36x182".to_owned());
    let w = sheet.sum("w", "dead load", &[("slab", deck), ("girder", steel)], KNPerM);
    let span = entered("spans.s1.length", Length::from_m(18.3), &["18.30 m"], Provenance::Measured);
    let length = sheet.given("L", "span", &span, M);
    total(&mut sheet, w, length);
    sheet.remark(|| "Fatigue is not looked at".to_owned());
    assert_eq!(
        text(&rows(&sheet, System::MetreKilonewton)),
        "\
Dead load of G3
   2  slab
        9.827 kN/m
        [table: 184 mm | take-off]
   3  girder
        2.662 kN/m
        [table: W36x182 | AISC]
   4  dead load
        w = slab + girder
        = 9.827 + 2.662
        = 12.489 kN/m
        [from line 2, 3]
   5  span
        L = 18.3 m
        [measured: 18.30 m]
   6  moment of an even load at midspan
        M_DC = w · L^2 / 8
        = 12.489 kN/m · (18.3 m)^2 / 8
        = 522.81 kN m
        [statics | from line 4, 5]
      Fatigue is not looked at
"
    );
    assert_eq!(check(&sheet, System::MetreKilonewton), 2);
}

/// The calculator itself, by hand.
#[test]
fn the_calculator_calculates() {
    let figure = |text: &str| match evaluate(text) {
        Ok(Answer::Figure(i)) => (i.low + i.high) / 2.0,
        other => panic!("{text}: {other:?}"),
    };
    for (text, value) in [
        ("2 + 3 · 4", 14.0),
        ("(2 in + 3) · 4", 20.0),
        ("2 · 3^2", 18.0),
        ("-2 + 3", 1.0),
        ("√(16) / 2 / 2", 1.0),
        ("max(1, 2, 3) - min(4, 2)", 1.0),
        ("4^0.5 · 10 kip ft", 20.0),
        ("2 × 10³ mm⁴ / 4", 500.0),
        ("(-3)^2", 9.0),
    ] {
        assert!((figure(text) - value).abs() < 1e-9, "{text} = {}", figure(text));
    }
    assert!(matches!(evaluate("2 ≤ 3 and 3 ≤ 2"), Ok(Answer::Holds(Some(false)))));
    assert!(matches!(evaluate("1.2346 ≤ 1.2346"), Ok(Answer::Holds(None))));
    assert!(evaluate("2 +").is_err() && evaluate("x + 1").is_err());
    let wide = figure_of("1.2346 in").expect("a figure");
    assert!((wide.high - wide.low - 1e-4).abs() < 1e-9);
    let exact = figure_of("36 ksi").expect("a figure");
    assert!(exact.high - exact.low < 1e-9);
}
