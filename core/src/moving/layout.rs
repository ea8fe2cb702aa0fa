//! A train as the search sees it: in one direction, cut into groups of axles that keep their distances.

use crate::load::AxleTrain;
use crate::quantity::Quantity;

/// Axles between two variable spacings.
#[derive(Clone, Copy, Debug)]
pub(super) struct Group {
    /// Index of the first axle.
    pub start: usize,
    /// Index after the last axle.
    pub end: usize,
    /// Least and largest distance from the first axle of this group to that of the next.
    pub gap: (f64, f64),
}

/// One direction of a train; all axles move towards growing places, index 0 leads.
#[derive(Clone, Debug, Default)]
pub(super) struct Layout {
    /// Axle loads from the lead on.
    pub loads: Vec<f64>,
    /// Distance of each axle behind the first one of its group.
    pub offsets: Vec<f64>,
    /// The groups from the lead on.
    pub groups: Vec<Group>,
}

impl Layout {
    /// Takes a train as it is or with its order reversed, using the memory again; `closed_up`, every
    /// variable spacing is fixed at its least.
    pub fn set(&mut self, train: &AxleTrain, reversed: bool, closed_up: bool) {
        let n = train.axles().len();
        let nth = |i: usize, of: usize| if reversed { of - 1 - i } else { i };
        self.loads.clear();
        self.offsets.clear();
        self.groups.clear();
        let (mut start, mut offset) = (0, 0.0);
        for i in 0..n {
            self.loads.push(train.axles()[nth(i, n)].base());
            self.offsets.push(offset);
            if i + 1 == n {
                self.groups.push(Group { start, end: n, gap: (0.0, 0.0) });
                break;
            }
            let spacing = train.spacings()[nth(i, n - 1)];
            let (least, most) = (spacing.least().base(), spacing.most().base());
            if least < most && !closed_up {
                self.groups.push(Group { start, end: i + 1, gap: (offset + least, offset + most) });
                (start, offset) = (i + 1, 0.0);
            } else {
                offset += least;
            }
        }
    }
}
