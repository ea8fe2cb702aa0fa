//! Capacity of a steel girder at a place, with its factors.

use super::Settings;
use super::factors::{OnResistance, dead_factors, on_resistance, overridden};
use crate::basis::{Amount, At, FaceModuli, Resistance};
use crate::bridge::{Composite as Connectors, Straightness, WebEnds};
use crate::check::Action;
use crate::check::LimitState;
use crate::clause;
use crate::clauses::lrfd::effective_width::effective_width;
use crate::clauses::lrfd::steel::bearing::{self, BearingCase, Place};
use crate::clauses::lrfd::steel::composite::{self as composite_flexure, CompositeCase};
use crate::clauses::lrfd::steel::flange::Hold;
use crate::clauses::lrfd::steel::noncomposite::{self, FlexureCase};
use crate::clauses::lrfd::steel::shear::{self, Panel, ShearCase};
use crate::clauses::lrfd::steel::{material, phi, service};
use crate::clauses::mbe::rating::{force_capacity, moment_capacity, service_capacity};
use crate::load::dead::DeadLoad;
use crate::problem::Problem;
use crate::quantity::{Force, Inertia, Length, LineLoad, Modulus, Moment, Stress};
use crate::section::composite::{Composite, Slab};
use crate::section::effective::{Edge, Effective, Remains};
use crate::units::mark::{Deg, Ft, In3, In4, Inch, Kip, KipFt, KipPerFt, Ksi, One};
use crate::worksheet::{Recorder, Val};

clause! {
    /// Factored moment of dead load on a simple span, for the stages of first yield.
    pub fn staged_moment(gamma: f64 [One], w: LineLoad [KipPerFt], x: Length [Ft], L: Length [Ft])
        -> M: Moment [KipFt] { gamma * w * x * (L - x) / 2.0 }
    cite "statics" what "factored moment of dead load"
}

clause! {
    /// Sum of the two later stages.
    pub fn later_stages(M_DC2: Moment [KipFt], M_DW: Moment [KipFt]) -> M_D2: Moment [KipFt]
    { M_DC2 + M_DW }
    cite "AASHTO LRFD 9th ed. D6.2.2" what "factored moment on the long-term section"
}

clause! {
    /// Elastic modulus of a composite section at an edge of the steel.
    pub fn modulus_at(I: Inertia [In4], c: Length [Inch]) -> S: Modulus [In3] { I / c }
    cite "mechanics" what "elastic modulus at the edge"
}

clause! {
    /// The lesser of web yielding and web crippling, each with its resistance factor.
    pub fn lesser_force(R_1: Force [Kip], R_2: Force [Kip]) -> R_r: Force [Kip] { min(R_1, R_2) }
    cite "AASHTO LRFD 9th ed. D6.5.1" what "the lesser of web yielding and crippling"
}

clause! {
    /// A nominal resistance with its resistance factor.
    pub fn factored_force(phi: f64 [One], R_n: Force [Kip]) -> R_r: Force [Kip] { phi * R_n }
    cite "AASHTO LRFD 9th ed. D6.5.1" what "factored resistance"
}

clause! {
    /// The formulas of LRFD do not fall steadily as plates get thinner (a thinner tension flange can
    /// raise `M_n` by 10 % and more), but losing steel never makes a girder stronger.
    pub fn not_above_sound(M_worn: Moment [KipFt], M_sound: Moment [KipFt]) -> M_n: Moment [KipFt]
    { min(M_worn, M_sound) }
    cite "mechanics" what "nominal flexural resistance, not above that of the sound section"
}

/// Capacity for an action.
pub fn capacity<R: Recorder>(
    rec: &mut R,
    settings: &Settings,
    at: &At<'_>,
    dead: &DeadLoad,
    action: Action,
) -> Result<Resistance, Problem> {
    let girder = at.steel();
    let remains = Remains::of(rec, &girder.section, &at.left);
    let section = Effective::at(rec, &girder.section, &remains)?;
    let entry = &girder.steel.yield_strength;
    let f_y = rec.given("F_y", "yield strength", entry, Ksi);
    match action {
        Action::Moment => {
            let moment = |rec: &mut R, section: &Effective<'_>| {
                if girder.composite == Connectors::Proved {
                    composite_moment(rec, at, section, f_y, dead)
                } else {
                    bare_moment(rec, settings, at, section, f_y)
                }
            };
            let mut nominal = moment(rec, &section)?;
            if section.sound.is_some() {
                let sound = Effective::at(rec, &girder.section, &Remains::default())?;
                let sound = moment(rec, &sound)?;
                nominal = not_above_sound(rec, nominal, sound);
            }
            let phi = phi::flexure(rec);
            let factors = on(rec, settings, at, action)?;
            let phi = overridden(rec, at.bridge, "phi", phi);
            let factored = moment_capacity(rec, factors.both, phi, nominal);
            Ok(resistance(Amount::Moment(factored), phi, &factors))
        }
        Action::Shear => {
            let crooked = at.bridge.crooked_web_at(at.line, at.x);
            let case = ShearCase {
                section: &section,
                f_yw: f_y,
                f_y_path: &entry.path,
                panel: Panel::Unstiffened,
                web: crooked.map_or(Straightness::Straight, |f| f.straight),
                web_path: &crooked.map_or_else(String::new, |f| format!("findings.{}.straight", f.id)),
            };
            let nominal = shear::nominal_shear(rec, &case)?;
            let phi = phi::shear(rec);
            let factors = on(rec, settings, at, action)?;
            let phi = overridden(rec, at.bridge, "phi", phi);
            let factored = force_capacity(rec, factors.both, phi, nominal);
            Ok(resistance(Amount::Force(factored), phi, &factors))
        }
        Action::Bearing => bearing_capacity(rec, settings, at, &section, f_y),
        Action::Stress => {
            let limits = if girder.composite == Connectors::Proved {
                service::composite(rec, &section, f_y, &entry.path)?
            } else {
                service::noncomposite(rec, &section, f_y, &entry.path, Edge::Top)?
            };
            // The pressed edge has the lesser limit; it is taken for both.
            let factored = service_capacity(rec, limits.top);
            Ok(Resistance {
                factored: Amount::Stress(factored),
                resistance: 1.0,
                condition: 1.0,
                system: 1.0,
            })
        }
    }
}

fn on<R: Recorder>(
    rec: &mut R,
    settings: &Settings,
    at: &At<'_>,
    action: Action,
) -> Result<OnResistance, Problem> {
    let measured = at.bridge.loss_measured_at(at.line, at.x);
    on_resistance(rec, at.bridge, action, settings.condition_rises && measured)
}

fn resistance(factored: Amount, phi: Val<f64>, factors: &OnResistance) -> Resistance {
    Resistance { factored, resistance: phi.q, condition: factors.condition.q, system: factors.system.q }
}

fn bare_moment<R: Recorder>(
    rec: &mut R,
    settings: &Settings,
    at: &At<'_>,
    section: &Effective<'_>,
    f_y: Val<Stress>,
) -> Result<Val<Moment>, Problem> {
    let girder = at.steel();
    if girder.composite == Connectors::NotKnown {
        rec.remark(|| "Nobody proved connectors: the slab is not counted.".to_owned());
    }
    let path = format!("members.{}.brace_spacing", at.bridge.member(at.line).id);
    let hold = Hold::of(rec, &girder.bracing, &path);
    let c_b = rec.look_up("C_b", "moment gradient modifier", 1.0, One, "AASHTO LRFD 9th ed. A6.3.3", || {
        "1.0, safe for every moment shape".to_owned()
    });
    let skew =
        rec.given_as("theta", "skew of the supports", &at.bridge.skew, at.bridge.skew.value.abs(), Deg);
    let case = FlexureCase {
        section,
        f_y,
        f_y_path: &girder.steel.yield_strength.path,
        pressed: Edge::Top,
        hold: &hold,
        c_b,
        torsion: settings.torsion,
        skew,
    };
    noncomposite::nominal_moment(rec, &case)
}

/// The slab that works with the girder.
fn composite<'a, R: Recorder>(
    rec: &mut R,
    at: &At<'a>,
    section: &'a Effective<'a>,
) -> Result<Composite<'a>, Problem> {
    let deck = &at.bridge.deck;
    let t_s = rec.given("t_s", "thickness of the slab", &deck.slab, Inch);
    let f_c = rec.given("f'c", "strength of the deck concrete", &deck.concrete.strength, Ksi);
    let n = material::modular_ratio(rec, f_c, &deck.concrete.strength.path)?;
    let slab = Slab {
        b_e: effective_width(rec, at.bridge, at.line),
        t_s,
        haunch: rec.given("t_h", "haunch", &deck.haunch, Inch),
        f_c,
        n,
        n_long: material::long_term_ratio(rec, n),
        path: &deck.slab.path,
    };
    Composite::of(rec, section, slab)
}

fn composite_moment<R: Recorder>(
    rec: &mut R,
    at: &At<'_>,
    section: &Effective<'_>,
    f_y: Val<Stress>,
    dead: &DeadLoad,
) -> Result<Val<Moment>, Problem> {
    let whole = composite(rec, at, section)?;
    let span = &at.bridge.spans[0].length;
    let length = rec.given("L", "span", span, Ft);
    let x = Val { q: at.x, line: length.line };
    let (gamma_dc, gamma_dw) = dead_factors(rec, at.bridge, LimitState::StrengthI, dead);
    let m_d1 = staged_moment(rec, gamma_dc, dead.dc1, x, length);
    let m_dc2 = staged_moment(rec, gamma_dc, dead.dc2, x, length);
    let m_dw = staged_moment(rec, gamma_dw, dead.dw, x, length);
    let m_d2 = later_stages(rec, m_dc2, m_dw);
    let case = CompositeCase {
        section: &whole,
        f_y,
        f_y_path: &at.steel().steel.yield_strength.path,
        continuous: false,
        m_d1,
        m_d2,
    };
    composite_flexure::nominal_moment(rec, &case)
}

fn bearing_capacity<R: Recorder>(
    rec: &mut R,
    settings: &Settings,
    at: &At<'_>,
    section: &Effective<'_>,
    f_y: Val<Stress>,
) -> Result<Resistance, Problem> {
    let girder = at.steel();
    let member = &at.bridge.member(at.line).id;
    if girder.bearing_stiffeners {
        return Err(Problem::warning(
            format!("members.{member}.bearing_stiffeners"),
            "bearing stiffeners are not rated: web yielding and crippling do not apply to them",
            "rate the stiffeners by hand where they are damaged",
        ));
    }
    let line = &at.bridge.lines[at.line];
    let far = usize::from(at.x > Length::ZERO);
    let end_path = format!("girders.{}.{}", line.id, ["end_near", "end_far"][far]);
    let crooked = at.bridge.crooked_web_at(at.line, at.x);
    let (web, path) = match (crooked, line.ends[far]) {
        (Some(finding), _) => (finding.straight, format!("findings.{}.straight", finding.id)),
        (None, WebEnds::NotInspected) => (Straightness::NotInspected, end_path),
        (None, WebEnds::Inspected) => (Straightness::Straight, end_path),
    };
    let n_path = format!("members.{member}.bearing_length");
    let n = bearing::length(rec, girder.bearing_length.as_ref(), &n_path)?;
    let t_w =
        rec.found("t_w", "least web thickness left in its lowest band", at.left.web_low, Inch, 0.0, || {
            "least reading of the lowest band; the sound web where no finding covers the bearing".to_owned()
        });
    let case =
        BearingCase { section, t_w, f_yw: f_y, n, n_path: &n_path, place: Place::End, web, web_path: &path };
    let yielding = bearing::web_yielding(rec, &case)?;
    let phi_b = phi::bearing(rec);
    let r_y = factored_force(rec, phi_b, yielding);
    let crippling = bearing::web_crippling(rec, &case)?;
    let phi_w = phi::crippling(rec);
    let r_c = factored_force(rec, phi_w, crippling);
    let lesser = lesser_force(rec, r_y, r_c);
    let phi = if r_y.q <= r_c.q { phi_b } else { phi_w };
    let factors = on(rec, settings, at, Action::Bearing)?;
    let one = rec.look_up("phi", "resistance factor", 1.0, One, "already in R_r", String::new);
    let factored = force_capacity(rec, factors.both, one, lesser);
    Ok(resistance(Amount::Force(factored), phi, &factors))
}

/// Moduli of the top and bottom face. A face at the neutral axis, or beyond it, is not looked at.
pub fn moduli<R: Recorder>(rec: &mut R, at: &At<'_>) -> Result<[Option<FaceModuli>; 2], Problem> {
    let girder = at.steel();
    let remains = Remains::of(rec, &girder.section, &at.left);
    let section = Effective::at(rec, &girder.section, &remains)?;
    let bare = [section.left.s_top, section.left.s_bottom];
    if girder.composite != Connectors::Proved {
        return Ok(bare.map(|s| Some(FaceModuli { bare: s, long: s, short: s })));
    }
    let whole = composite(rec, at, &section)?;
    let least = Length::from_mm(1.0);
    let top = if whole.short.to_top.q > least && whole.long.to_top.q > least {
        Some(FaceModuli {
            bare: bare[0],
            long: modulus_at(rec, whole.long.inertia, whole.long.to_top),
            short: modulus_at(rec, whole.short.inertia, whole.short.to_top),
        })
    } else {
        None
    };
    let bottom = FaceModuli {
        bare: bare[1],
        long: modulus_at(rec, whole.long.inertia, whole.long.y),
        short: modulus_at(rec, whole.short.inertia, whole.short.y),
    };
    Ok([top, Some(bottom)])
}
