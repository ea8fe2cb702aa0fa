//! The face of a weight-limit sign in words, as the public sign standards have them.
//!
//! MUTCD (2009) section 2B.59, from memory: R12-1 `WEIGHT LIMIT nn TONS` for one limit, and R12-5
//! with a limit for each kind of vehicle; R11-2 for a closed bridge.

use super::show::signed;
use crate::check::{ClassLimit, Sign};
use crate::units::WeightUnit;

/// What stands on a sign.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Face {
    /// Lines from the top: what it is about, and the limit where the line has one.
    pub rows: Vec<(&'static str, String)>,
    /// The same in a sentence, for a voice.
    pub spoken: String,
}

/// The sign that a posting calls for; none where no sign is called for or nothing is known.
#[must_use]
pub fn face(sign: Sign) -> Option<Face> {
    let title = ("WEIGHT LIMIT", String::new());
    match sign {
        Sign::None
        | Sign::NotKnown
        | Sign::Limit { single_unit: ClassLimit::None, combination: ClassLimit::None, .. } => None,
        Sign::Close => Some(Face {
            rows: vec![("BRIDGE", String::new()), ("CLOSED", String::new())],
            spoken: "sign: bridge closed".to_owned(),
        }),
        Sign::Limit { single_unit: ClassLimit::NotAllowed, combination: ClassLimit::NotAllowed, .. } => {
            Some(Face {
                rows: vec![("NO", String::new()), ("TRUCKS", String::new())],
                spoken: "sign: no trucks".to_owned(),
            })
        }
        Sign::Limit {
            single_unit: ClassLimit::Weight(single),
            combination: ClassLimit::Weight(combination),
            unit,
        } if single == combination => {
            let rows = match unit {
                WeightUnit::ShortTons => vec![title, ("", single.to_string()), ("TONS", String::new())],
                WeightUnit::Tonnes => vec![title, ("", format!("{single} t"))],
            };
            Some(Face { rows, spoken: format!("sign: weight limit {}", signed(single, unit)) })
        }
        Sign::Limit { single_unit, combination, unit } => {
            let mut rows = vec![title];
            let mut parts = Vec::new();
            for (name, limit) in [("SINGLE UNIT", single_unit), ("COMBINATION", combination)] {
                let (text, spoken) = match (limit, unit) {
                    (ClassLimit::None, _) => continue,
                    (ClassLimit::NotAllowed, _) => ("NONE".to_owned(), "not allowed".to_owned()),
                    (ClassLimit::Weight(limit), WeightUnit::ShortTons) => {
                        (format!("{limit} T"), signed(limit, unit))
                    }
                    (ClassLimit::Weight(limit), WeightUnit::Tonnes) => {
                        (format!("{limit} t"), signed(limit, unit))
                    }
                };
                rows.push((name, text));
                parts.push(format!("{} {spoken}", name.to_lowercase()));
            }
            Some(Face { rows, spoken: format!("sign: weight limit, {}", parts.join(", ")) })
        }
    }
}

#[cfg(test)]
mod tests {
    use super::ClassLimit::{NotAllowed, Weight};
    use super::*;

    fn rows(sign: Sign) -> Vec<String> {
        let face = face(sign).expect("a sign");
        face.rows.iter().map(|(name, limit)| format!("{name} {limit}").trim().to_owned()).collect()
    }

    #[test]
    fn the_face_says_what_the_posting_says() {
        let limit = |single_unit, combination, unit| Sign::Limit { single_unit, combination, unit };
        assert_eq!(
            rows(limit(Weight(25), ClassLimit::None, WeightUnit::Tonnes)),
            ["WEIGHT LIMIT", "SINGLE UNIT 25 t"]
        );
        assert_eq!(
            rows(limit(Weight(21), Weight(34), WeightUnit::ShortTons)),
            ["WEIGHT LIMIT", "SINGLE UNIT 21 T", "COMBINATION 34 T"]
        );
        assert_eq!(
            rows(limit(Weight(12), Weight(12), WeightUnit::ShortTons)),
            ["WEIGHT LIMIT", "12", "TONS"]
        );
        assert_eq!(
            rows(limit(NotAllowed, Weight(34), WeightUnit::ShortTons)),
            ["WEIGHT LIMIT", "SINGLE UNIT NONE", "COMBINATION 34 T"]
        );
        assert_eq!(rows(limit(NotAllowed, NotAllowed, WeightUnit::Tonnes)), ["NO", "TRUCKS"]);
        assert_eq!(rows(Sign::Close), ["BRIDGE", "CLOSED"]);
        assert_eq!(face(Sign::None), None);
        assert_eq!(face(Sign::NotKnown), None);
        assert_eq!(face(limit(ClassLimit::None, ClassLimit::None, WeightUnit::Tonnes)), None);
    }

    #[test]
    fn it_can_be_spoken() {
        let sign =
            Sign::Limit { single_unit: Weight(21), combination: Weight(34), unit: WeightUnit::ShortTons };
        assert_eq!(
            face(sign).expect("a sign").spoken,
            "sign: weight limit, single unit 21 tons, combination 34 tons"
        );
    }
}
