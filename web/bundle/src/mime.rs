//! Media types of the files the page is made of.

/// The type of a file by its name; none for a kind of file that the page does not use.
pub fn of(path: &str) -> Option<&'static str> {
    let name = path.rsplit('/').next().unwrap_or(path);
    let (_, extension) = name.rsplit_once('.')?;
    Some(match extension {
        "html" => "text/html; charset=utf-8",
        "css" => "text/css; charset=utf-8",
        "js" => "text/javascript; charset=utf-8",
        // Declarations for the type checker; no browser asks for them.
        "ts" | "txt" => "text/plain; charset=utf-8",
        "wasm" => "application/wasm",
        "json" => "application/json; charset=utf-8",
        "webmanifest" => "application/manifest+json; charset=utf-8",
        "svg" => "image/svg+xml; charset=utf-8",
        "png" => "image/png",
        "ico" => "image/x-icon",
        "woff2" => "font/woff2",
        _ => return None,
    })
}

#[cfg(test)]
mod tests {
    use super::of;

    #[test]
    fn types_that_browsers_insist_on() {
        // Streaming compilation, module scripts and installation each refuse another type.
        assert_eq!(of("girderbook_web_bg.wasm"), Some("application/wasm"));
        assert_eq!(of("parts/app.js"), Some("text/javascript; charset=utf-8"));
        assert_eq!(of("app.webmanifest"), Some("application/manifest+json; charset=utf-8"));
        assert_eq!(of("index.html"), Some("text/html; charset=utf-8"));
    }

    #[test]
    fn unknown_kinds_have_none() {
        assert_eq!(of("book.exe"), None);
        assert_eq!(of("no_extension"), None);
        assert_eq!(of("folder.js/plain"), None);
    }
}
