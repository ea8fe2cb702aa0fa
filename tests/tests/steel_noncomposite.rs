//! Flexure without a working slab: hand chains, published worked examples, printed formulas.

use girderbook_core::clauses::lrfd::steel::flange::Hold;
use girderbook_core::clauses::lrfd::steel::lateral::Torsion;
use girderbook_core::clauses::lrfd::steel::noncomposite::{FlexureCase, nominal_moment};
use girderbook_core::quantity::{Angle, Length, Moment, Stress};
use girderbook_core::section::effective::{Edge, Effective, Remains};
use girderbook_core::section::rolled;
use girderbook_core::worksheet::{Recorder, Silent, Val};

fn moment<R: Recorder>(rec: &mut R, name: &str, f_y: Stress, l_b: Length, torsion: Torsion) -> Moment {
    let shape = rolled::find(name).expect("in the catalogue").shape("members[0].section");
    let section = Effective::at(rec, &shape, &Remains::default()).expect("a section");
    let hold = Hold::At(Val::bare(l_b));
    let case = FlexureCase {
        section: &section,
        f_y: Val::bare(f_y),
        f_y_path: "members[0].steel.yield_strength",
        pressed: Edge::Top,
        hold: &hold,
        c_b: Val::bare(1.0),
        torsion,
        skew: Val::bare(Angle::ZERO),
    };
    nominal_moment(rec, &case).expect("a number").q
}

#[test]
fn w36x182_of_33_ksi_braced_at_15_ft() {
    for name in ["W36x182", "W36x182 (1980)"] {
        for torsion in [Torsion::Neglected, Torsion::Counted] {
            let m = moment(&mut Silent, name, Stress::from_ksi(33.0), Length::from_ft(15.0), torsion);
            println!("{name} {torsion:?} {} kip ft {} kN m", m.in_kip_ft(), m.in_kn_m());
        }
    }
}
