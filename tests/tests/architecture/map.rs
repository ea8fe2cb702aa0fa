//! What `DEVELOPERS.md` says about the house: the folders at the top and the table of rooms.

use std::collections::{BTreeMap, BTreeSet};

/// The house as it is meant to be.
#[derive(Debug)]
pub struct Map {
    /// Folders at the top of the workspace.
    pub folders: BTreeSet<String>,
    /// Each room of core with the rooms it may use.
    pub rooms: BTreeMap<String, BTreeSet<String>>,
}

impl Map {
    /// Reads the text of `DEVELOPERS.md`; the error says what is wrong with it.
    pub fn read(text: &str) -> Result<Map, String> {
        let ground = ground(text)?;
        let mut rooms = BTreeMap::new();
        for row in rows(text)? {
            let cells: Vec<&str> = row.trim().trim_matches('|').split('|').map(str::trim).collect();
            let [room, _, may_use] = cells[..] else {
                return Err(format!("not three cells: {row}"));
            };
            let room = room.trim_matches('`').split('/').next().unwrap_or_default().to_string();
            let mut uses = BTreeSet::new();
            for item in items(may_use).filter(|item| *item != "-") {
                match item {
                    "ground" => uses.extend(ground.iter().filter(|g| **g != room).cloned()),
                    _ => drop(uses.insert(item.to_string())),
                }
            }
            // From the ground up: this also keeps two rooms from needing each other.
            if let Some(unknown) = uses.iter().find(|used| !rooms.contains_key(*used)) {
                return Err(format!("`{room}` may use `{unknown}`, which does not stand above it"));
            }
            if rooms.insert(room.clone(), uses).is_some() {
                return Err(format!("`{room}` has two rows"));
            }
        }
        if rooms.is_empty() {
            return Err("the table of rooms is empty".into());
        }
        Ok(Map { folders: folders(text)?, rooms })
    }
}

/// The names of a list such as `bridge, basis ids, ground`: the first word of each item.
fn items(list: &str) -> impl Iterator<Item = &str> {
    list.split(',').filter_map(|item| item.split_whitespace().next()).map(|word| word.trim_matches('`'))
}

fn ground(text: &str) -> Result<Vec<String>, String> {
    let line = text.lines().find_map(|line| line.strip_prefix("`ground` ="));
    let line = line.ok_or("no line that begins with \"`ground` =\"")?;
    Ok(items(line.trim_end_matches('.')).map(str::to_string).collect())
}

fn rows(text: &str) -> Result<impl Iterator<Item = &str>, String> {
    let mut lines = text.lines().skip_while(|line| line.trim() != "| room | holds | may use |");
    lines.next().ok_or("no table with the head \"| room | holds | may use |\"")?;
    Ok(lines.skip(1).take_while(|line| line.trim().starts_with('|')))
}

fn folders(text: &str) -> Result<BTreeSet<String>, String> {
    let block = text.split("```").nth(1).ok_or("no block that lists the folders")?;
    let leading =
        block.lines().flat_map(|line| line.split_whitespace().map_while(|word| word.strip_suffix('/')));
    Ok(leading.filter_map(|path| path.split('/').next()).map(str::to_string).collect())
}

#[test]
fn a_map_is_read() {
    let map = Map::read(
        "```\n.ci/  .cargo/  commands\na/   first a/b/ named in passing\na/b/ inner\n```\n\
         | room | holds | may use |\n|---|---|---|\n| `low` | x | - |\n| `ground_two` | x | low |\n\
         | `top/<kind>` | x, y | low ids, ground |\n\n`ground` = low, ground_two.\n",
    )
    .unwrap();
    assert_eq!(map.folders.iter().collect::<Vec<_>>(), [".cargo", ".ci", "a"]);
    assert_eq!(map.rooms["top"].iter().collect::<Vec<_>>(), ["ground_two", "low"]);
    assert!(map.rooms["low"].is_empty());
}

#[test]
fn a_map_that_cannot_stand_is_refused() {
    let table = |rows: &str| {
        format!("```\na/\n```\n| room | holds | may use |\n|---|---|---|\n{rows}\n`ground` = low.\n")
    };
    let fault = |rows: &str| Map::read(&table(rows)).unwrap_err();
    assert!(Map::read(&table("| `low` | x | - |")).is_ok());
    assert!(fault("| `high` | x | low |\n| `low` | x | - |").contains("does not stand above"));
    assert!(fault("| `low` | x | absent |").contains("absent"));
    assert!(fault("| `low` | x | low |").contains("does not stand above"));
    assert!(fault("| `low` | x |").contains("three cells"));
    assert!(fault("| `low` | x | - |\n| `low` | y | - |").contains("two rows"));
    assert!(fault("").contains("empty"));
    assert!(Map::read("nothing").is_err());
}
