//! What uses the bridge.

use super::{Page, button, group, opening, remove, subheading};
use crate::node::Node;
use crate::scene::Scene;

pub(super) fn regions(s: &Scene) -> Vec<Node> {
    let traffic = opening(s, Page::Traffic, "")
        .and(s.field("traffic.adtt", "Trucks a day", "in one direction; unknown is the highest factor"))
        .and(s.choice(
            "traffic.riding",
            "Riding surface",
            "approaches, joints and deck",
            &[
                ("not-inspected", "not inspected: counted as rough"),
                ("smooth", "smooth"),
                ("minor", "minor bumps or dips"),
                ("rough", "anything worse"),
            ],
        ));
    let mut own =
        Node::region("traffic.own", "Own vehicles").and(subheading("Vehicles of your state or agency"));
    for vehicle in &s.book.vehicles {
        let path = |field: &str| format!("vehicles.{}.{field}", vehicle.id.0);
        let title = match vehicle.name.trim() {
            "" => "Vehicle",
            name => name,
        };
        own.c.push(
            group(format!("g:vehicles.{}", vehicle.id.0), title)
                .and(s.field(&path("name"), "Called", ""))
                .and(s.field(&path("axles"), "Axles", "weight of each from the front, semicolons between"))
                .and(s.field(&path("spacings"), "Axle spacings", "from axle to axle, semicolons between"))
                .and(remove("Take this vehicle out", "vehicles", &vehicle.id.0)),
        );
    }
    vec![traffic, own.and(button("Add a vehicle", "vehicles.add"))]
}
