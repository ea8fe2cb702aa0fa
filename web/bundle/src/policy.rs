//! The security policy of the page: one text for the header, the page and the service worker.

/// Nothing is asked of any other origin, no text becomes code, and only the page's own Trusted
/// Types policy may name a script.
pub const POLICY: &str = "default-src 'none'; script-src 'self' 'wasm-unsafe-eval'; \
    style-src 'self'; img-src 'self' blob: data:; font-src 'self'; connect-src 'self'; \
    worker-src 'self'; manifest-src 'self'; base-uri 'none'; form-action 'none'; \
    require-trusted-types-for 'script'; trusted-types girderbook";

/// The policy inside the page, for a host that sends no headers.
pub fn meta() -> String {
    format!("<meta http-equiv=\"Content-Security-Policy\" content=\"{POLICY}\">")
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn the_text_fits_an_attribute_and_a_header() {
        assert!(!POLICY.contains(['"', '<', '>', '&', '\n']));
        assert!(!POLICY.contains("  "));
        // A browser ignores this one in a <meta> and complains on the console.
        assert!(!POLICY.contains("frame-ancestors"));
    }
}
