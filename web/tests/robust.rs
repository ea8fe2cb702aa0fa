//! Whatever is typed or asked for, the open book stays whole.

mod common;

use common::{DEMOS, applied, assert_ids_unique, nodes, same};
use girderbook_core::document::book::UnitSystem;
use girderbook_web::desk::Desk;
use girderbook_web::pages::Page;

/// A plain generator, so that a failure can be repeated from its seed.
struct Dice(u64);

impl Dice {
    fn roll(&mut self, sides: usize) -> usize {
        self.0 = self.0.wrapping_mul(6_364_136_223_846_793_005).wrapping_add(1_442_695_040_888_963_407);
        usize::try_from(self.0 >> 33).expect("31 bits") % sides
    }
    fn pick<'a>(&mut self, all: &[&'a str]) -> &'a str {
        all[self.roll(all.len())]
    }
}

const TEXTS: [&str; 24] = [
    "",
    " ",
    "0",
    "-1",
    "1",
    "12",
    "2.18 m",
    "7 1/4 in",
    "12'-3 1/2\"",
    "1e300",
    "99999999999999999999",
    "abc",
    "65; 72; 70",
    ";;;",
    "W36x182",
    "36 ksi",
    "150 pcf",
    "m",
    "½",
    "1,2,3",
    "0.001 mm",
    "not-inspected",
    "g3",
    "\u{202e}fed",
];

const ACTS: [&str; 20] = [
    "girders.add",
    "girders.remove:g1",
    "girders.remove:g2",
    "findings.add",
    "findings.add:g3",
    "findings.remove:f6",
    "layers.add",
    "layers.remove:l1",
    "strips.add",
    "strips.remove:p1",
    "members.add",
    "members.remove:m1",
    "overrides.add",
    "vehicles.add",
    "girders.count:3",
    "girders.fill:spacing",
    "undo",
    "undo",
    "sheet.show:su7/legal/g3/moment/strength/worst",
    "nonsense:1",
];

#[test]
fn random_edits_keep_the_page_and_the_book_in_step() {
    for seed in 0..12_u64 {
        let mut dice = Dice(seed.wrapping_mul(0x9e37_79b9_7f4a_7c15) + 1);
        let mut desk = match seed % 3 {
            2 => Desk::empty("b", UnitSystem::FootKip),
            i => Desk::read(DEMOS[usize::try_from(i).expect("small")]).expect("a book"),
        };
        let mut shown = desk.open("site").clone();
        for step in 0..60 {
            let view = desk.view().clone();
            let paths: Vec<String> = nodes(&view)
                .iter()
                .filter(|n| matches!(n.k, "field" | "choice"))
                .map(|n| n.prop("path").to_owned())
                .collect();
            let update = match dice.roll(10) {
                0 => {
                    let page = Page::ALL[dice.roll(Page::ALL.len())];
                    shown = desk.open(page.id()).clone();
                    continue;
                }
                1 | 2 => desk.act(dice.pick(&ACTS)),
                3 if !paths.is_empty() => {
                    let path = &paths[dice.roll(paths.len())];
                    desk.provenance(path, dice.pick(&["measured", "drawing", "assumed", "guess"]))
                }
                _ if !paths.is_empty() => {
                    let path = &paths[dice.roll(paths.len())];
                    // As often as not something that the field could hold.
                    let options: Vec<String> = nodes(&view)
                        .iter()
                        .filter(|n| n.prop("path") == path)
                        .flat_map(|n| n.c.iter().map(|o| o.prop("value").to_owned()))
                        .collect();
                    if !options.is_empty() && dice.roll(2) == 0 {
                        desk.edit(path, &options[dice.roll(options.len())])
                    } else {
                        desk.edit(path, dice.pick(&TEXTS))
                    }
                }
                _ => desk.act("undo"),
            };
            shown = applied(&shown, &update);
            assert!(same(&shown, desk.view()), "seed {seed}, step {step}");
            assert_ids_unique(desk.view(), &format!("seed {seed}, step {step}"));
            for node in nodes(desk.view()) {
                for (_, value) in &node.p {
                    let broken = value.contains("NaN") || value.split(' ').any(|word| word == "inf");
                    assert!(!broken || node.k == "field", "seed {seed}, step {step}: {value}");
                }
            }
        }
        // Nothing that was typed is lost on the way to the file and back.
        let again = Desk::read(&desk.text()).expect("its own file");
        assert_eq!(again.text(), desk.text(), "seed {seed}");
        assert_eq!(again.summary(), desk.summary(), "seed {seed}");
    }
}

#[test]
fn a_file_that_is_no_book_is_refused_with_reasons() {
    for bad in [
        "",
        "{}",
        "[]",
        "{\"format\": 99, \"id\": \"a\", \"system\": \"m-kN\"}",
        "{\"format\": 1}",
        "nonsense",
    ] {
        let problems = Desk::read(bad).expect_err("must be refused");
        assert!(problems.iter().all(|p| !p.message.is_empty() && !p.mend.is_empty()), "{bad}: {problems:?}");
        assert!(!problems.is_empty());
    }
}
