//! Trains with variable spacings: the worst position and the worst spacings together, exactly.
//!
//! The effect is a sum of one function for each group of axles that keep their distances, over the
//! place of the group's lead. From the rear on, the best that the groups behind can do, over the place
//! of the one before them, is a largest value over a window of places: again a piecewise cubic. So the
//! search over any number of variable spacings ends in the largest value of one piecewise cubic.

use super::events::Heads;
use super::layout::Layout;
use super::profile::Profile;
use crate::numerics::Piecewise;

/// Memory of the search, used again.
#[derive(Clone, Debug, Default)]
pub(super) struct Spread {
    /// The best of each group together with those behind it, over the place of its lead.
    best: Vec<Profile>,
    own: Profile,
    behind: Profile,
    queue: Vec<usize>,
    /// Places of the leads of all groups at the best found last.
    pub leads: Vec<f64>,
}

impl Spread {
    /// The largest value of `sign` times the effect; the places of the leads are left in `leads`.
    pub fn largest(
        &mut self,
        f: &Piecewise,
        sign: f64,
        layout: &Layout,
        touch: f64,
        heads: &mut Heads,
    ) -> f64 {
        let groups = &layout.groups;
        if self.best.len() < groups.len() {
            self.best.resize_with(groups.len(), Profile::default);
        }
        for g in (0..groups.len()).rev() {
            let axles = groups[g].start..groups[g].end;
            let (loads, offsets) = (&layout.loads[axles.clone()], &layout.offsets[axles]);
            if g + 1 == groups.len() {
                self.best[g].of_group(f, sign, loads, offsets, touch, heads);
            } else {
                let (near, far) = groups[g].gap;
                self.own.of_group(f, sign, loads, offsets, touch, heads);
                self.behind.window(&self.best[g + 1], near, far, touch, &mut self.queue);
                self.best[g].sum(&self.own, &self.behind, touch);
            }
        }
        let (value, place) = self.best[0].largest();
        self.leads.clear();
        self.leads.push(place);
        for g in 1..groups.len() {
            let ahead = self.leads[g - 1];
            let (near, far) = groups[g - 1].gap;
            self.leads.push(self.best[g].best_within(ahead - far, ahead - near, touch));
        }
        value
    }
}
