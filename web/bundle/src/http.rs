//! Just enough HTTP/1.1 to serve a folder to a browser on the same machine.
//!
//! GET and HEAD of files; everything else gets a plain answer that says why not.

use std::io::{BufRead, Read, Write};
use std::path::{Path, PathBuf};

use crate::{mime, policy};

/// The whole head of a request may be this long; a browser's takes about 1 kB.
const LONGEST_HEAD: u64 = 16 * 1024;

/// Serves one connection until it closes, a request asks to close it, or one is malformed.
///
/// `root` must be canonical: what lies outside of it is never read.
pub fn converse(root: &Path, mut input: impl BufRead, mut output: impl Write) -> std::io::Result<()> {
    loop {
        let mut head = String::new();
        match read_head(&mut input, &mut head) {
            Head::End => return Ok(()),
            Head::Malformed => {
                Answer::plain(400, "Bad Request").send(&mut output, true, true)?;
                // Closing over unread input would take the answer away again.
                let _ = std::io::copy(&mut input.take(1 << 20), &mut std::io::sink());
                return Ok(());
            }
            Head::Whole => {}
        }
        let body_follows = header(&head, "content-length").is_some_and(|n| n != "0")
            || header(&head, "transfer-encoding").is_some();
        let version = head.lines().next().and_then(|line| line.split(' ').nth(2));
        let close = body_follows
            || version != Some("HTTP/1.1")
            || header(&head, "connection").is_some_and(|c| c.eq_ignore_ascii_case("close"));
        let (answer, with_body) = answer(root, head.lines().next().unwrap_or_default());
        answer.send(&mut output, with_body, close)?;
        if close {
            return Ok(());
        }
    }
}

enum Head {
    Whole,
    End,
    Malformed,
}

fn read_head(input: &mut impl BufRead, head: &mut String) -> Head {
    let mut limited = input.take(LONGEST_HEAD);
    loop {
        let before = head.len();
        match limited.read_line(head) {
            Ok(0) if head.is_empty() => return Head::End,
            // Longer than allowed, or cut off in the middle.
            Ok(0) => return Head::Malformed,
            Ok(_) if !head.ends_with('\n') => return Head::Malformed,
            Ok(_) if head[before..].trim_end().is_empty() && before > 0 => return Head::Whole,
            Ok(_) => {}
            Err(e) if e.kind() == std::io::ErrorKind::InvalidData => return Head::Malformed,
            Err(_) => return Head::End,
        }
    }
}

fn header<'a>(head: &'a str, name: &str) -> Option<&'a str> {
    let pairs = head.lines().skip(1).filter_map(|line| line.split_once(':'));
    pairs.into_iter().find(|(n, _)| n.eq_ignore_ascii_case(name)).map(|(_, value)| value.trim())
}

/// The answer to a request line, and whether its body is sent.
fn answer(root: &Path, line: &str) -> (Answer, bool) {
    let words: Vec<&str> = line.split(' ').collect();
    let [method, address, "HTTP/1.1" | "HTTP/1.0"] = words[..] else {
        return (Answer::plain(400, "Bad Request"), true);
    };
    let with_body = match method {
        "GET" => true,
        "HEAD" => false,
        _ => return (Answer::plain(405, "Method Not Allowed"), true),
    };
    let Some(path) = decode(address) else { return (Answer::plain(400, "Bad Request"), with_body) };
    let found = locate(root, &path).and_then(|file| {
        let kind = mime::of(&file.to_string_lossy()).unwrap_or("application/octet-stream");
        Some(Answer { status: 200, reason: "OK", kind, body: std::fs::read(file).ok()? })
    });
    (found.unwrap_or_else(|| Answer::plain(404, "Not Found")), with_body)
}

/// The path of a request target, percent signs resolved; none if it is not a path.
fn decode(address: &str) -> Option<String> {
    let path = address.split(['?', '#']).next()?;
    if !path.starts_with('/') {
        return None;
    }
    let mut bytes = Vec::with_capacity(path.len());
    let mut rest = path.bytes();
    while let Some(byte) = rest.next() {
        bytes.push(match byte {
            b'%' => {
                let high = char::from(rest.next()?).to_digit(16)?;
                let low = char::from(rest.next()?).to_digit(16)?;
                u8::try_from(high * 16 + low).ok()?
            }
            _ => byte,
        });
    }
    String::from_utf8(bytes).ok().filter(|path| !path.chars().any(char::is_control))
}

/// The file of a decoded path, if there is one below the root.
fn locate(root: &Path, path: &str) -> Option<PathBuf> {
    let path = path.strip_prefix('/')?;
    let folder = path.is_empty() || path.ends_with('/');
    let mut file = root.to_path_buf();
    for part in path.split('/').filter(|part| !part.is_empty()) {
        // A backslash or a colon would mean something to another system's paths.
        if part == "." || part == ".." || part.contains(['\\', ':']) {
            return None;
        }
        file.push(part);
    }
    if folder {
        file.push("index.html");
    }
    // Links are resolved before looking whether the file lies inside.
    let file = file.canonicalize().ok()?;
    (file.starts_with(root) && file.is_file()).then_some(file)
}

struct Answer {
    status: u16,
    reason: &'static str,
    kind: &'static str,
    body: Vec<u8>,
}

impl Answer {
    fn plain(status: u16, reason: &'static str) -> Self {
        let body = format!("{status} {reason}\n").into_bytes();
        Answer { status, reason, kind: "text/plain; charset=utf-8", body }
    }

    fn send(&self, output: &mut impl Write, with_body: bool, close: bool) -> std::io::Result<()> {
        let mut message = format!(
            "HTTP/1.1 {} {}\r\nContent-Type: {}\r\nContent-Length: {}\r\n\
             Content-Security-Policy: {}\r\nX-Content-Type-Options: nosniff\r\n\
             Cache-Control: no-cache\r\nConnection: {}\r\n",
            self.status,
            self.reason,
            self.kind,
            self.body.len(),
            policy::POLICY,
            if close { "close" } else { "keep-alive" },
        );
        if self.status == 405 {
            message += "Allow: GET, HEAD\r\n";
        }
        message += "\r\n";
        let mut message = message.into_bytes();
        if with_body {
            message.extend_from_slice(&self.body);
        }
        output.write_all(&message)?;
        output.flush()
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::dist::tests::scratch;

    /// A folder with a page, and a file beside it that must never be seen.
    fn site(name: &str) -> PathBuf {
        let folder = scratch(name);
        std::fs::write(folder.join("secret.txt"), "secret").unwrap();
        let root = folder.join("dist");
        std::fs::create_dir_all(root.join("parts")).unwrap();
        std::fs::write(root.join("index.html"), "<p>page</p>").unwrap();
        std::fs::write(root.join("parts/app.js"), "go();").unwrap();
        std::fs::write(root.join("a.wasm"), b"\0asm").unwrap();
        root.canonicalize().unwrap()
    }

    fn ask(root: &Path, request: &str) -> String {
        let mut output = Vec::new();
        converse(root, request.as_bytes(), &mut output).unwrap();
        String::from_utf8_lossy(&output).into_owned()
    }

    fn get(root: &Path, address: &str) -> String {
        ask(root, &format!("GET {address} HTTP/1.1\r\nHost: localhost\r\n\r\n"))
    }

    #[test]
    fn files_come_with_type_policy_and_no_cache() {
        let root = site("http_files");
        let page = get(&root, "/");
        assert!(page.starts_with("HTTP/1.1 200 OK\r\n") && page.ends_with("\r\n\r\n<p>page</p>"));
        assert!(page.contains("\r\nContent-Type: text/html; charset=utf-8\r\n"));
        assert!(page.contains("\r\nContent-Length: 11\r\n"));
        assert!(page.contains(&format!("\r\nContent-Security-Policy: {}\r\n", policy::POLICY)));
        assert!(page.contains("\r\nX-Content-Type-Options: nosniff\r\n"));
        assert!(page.contains("\r\nCache-Control: no-cache\r\n"));
        assert!(get(&root, "/a.wasm").contains("\r\nContent-Type: application/wasm\r\n"));
        assert!(get(&root, "/parts/app.js?x=1").ends_with("go();"));
        assert!(get(&root, "/parts/%61pp.js").ends_with("go();"));
    }

    #[test]
    fn head_is_the_same_without_a_body() {
        let root = site("http_head");
        let head = ask(&root, "HEAD /parts/app.js HTTP/1.1\r\n\r\n");
        assert!(head.starts_with("HTTP/1.1 200 OK\r\n") && head.ends_with("\r\n\r\n"));
        assert!(head.contains("\r\nContent-Length: 5\r\n"));
        assert!(ask(&root, "HEAD /none HTTP/1.1\r\n\r\n").ends_with("\r\n\r\n"));
    }

    #[test]
    fn nothing_outside_is_reached() {
        let root = site("http_outside");
        for address in [
            "/../secret.txt",
            "/parts/../../secret.txt",
            "/%2e%2e/secret.txt",
            "/%2E%2E%2Fsecret.txt",
            "/..%2fsecret.txt",
            "/..%5csecret.txt",
            "//../secret.txt",
            "/%252e%252e/secret.txt",
            "/./index.html",
            "/C:/index.html",
            "/parts",
            "/parts/",
            "/none.html",
        ] {
            let reply = get(&root, address);
            assert!(reply.starts_with("HTTP/1.1 404 Not Found\r\n"), "{address}: {reply}");
            assert!(!reply.contains("secret"), "{address}");
        }
        // An absolute path stays below the root: its leading slashes count for nothing.
        assert!(get(&root, "//parts/app.js").ends_with("go();"));
    }

    #[cfg(unix)]
    #[test]
    fn links_that_lead_outside_are_refused() {
        let root = site("http_links");
        std::os::unix::fs::symlink(root.join("../secret.txt"), root.join("link.txt")).unwrap();
        std::os::unix::fs::symlink(root.join(".."), root.join("up")).unwrap();
        std::os::unix::fs::symlink(root.join("index.html"), root.join("inside.html")).unwrap();
        assert!(get(&root, "/link.txt").starts_with("HTTP/1.1 404"));
        assert!(get(&root, "/up/secret.txt").starts_with("HTTP/1.1 404"));
        assert!(get(&root, "/inside.html").ends_with("<p>page</p>"));
    }

    #[test]
    fn other_methods_are_refused() {
        let root = site("http_methods");
        for method in ["POST", "PUT", "DELETE", "OPTIONS", "get"] {
            let reply = ask(&root, &format!("{method} / HTTP/1.1\r\n\r\n"));
            assert!(reply.starts_with("HTTP/1.1 405 Method Not Allowed\r\n"), "{method}: {reply}");
            assert!(reply.contains("\r\nAllow: GET, HEAD\r\n"));
        }
    }

    #[test]
    fn malformed_requests_get_400() {
        let root = site("http_malformed");
        let long = "a".repeat(40_000);
        for request in [
            format!("GET /{long} HTTP/1.1\r\n\r\n"),
            format!("GET / HTTP/1.1\r\nX: {long}\r\n\r\n"),
            format!("GET / HTTP/1.1\r\n{}\r\n", "A: b\r\n".repeat(4_000)),
            long,
            "GET /\r\n\r\n".into(),
            "GET / HTTP/2.0\r\n\r\n".into(),
            "GET index.html HTTP/1.1\r\n\r\n".into(),
            "GET http://elsewhere/ HTTP/1.1\r\n\r\n".into(),
            "GET /%zz HTTP/1.1\r\n\r\n".into(),
            "GET /%4 HTTP/1.1\r\n\r\n".into(),
            "GET /%ff HTTP/1.1\r\n\r\n".into(),
            "GET /a%00.html HTTP/1.1\r\n\r\n".into(),
            "GET / HTTP/1.1\r\nHost: cut".into(),
            "GET / HTTP/1.1\r\nHost: cut\r\n".into(),
            "GET  / HTTP/1.1\r\n\r\n".into(),
        ] {
            let reply = ask(&root, &request);
            assert!(reply.starts_with("HTTP/1.1 400 Bad Request\r\n"), "{request:.60}: {reply}");
        }
        assert_eq!(ask(&root, ""), "");
    }

    #[test]
    fn a_connection_is_kept_until_asked_to_close() {
        let root = site("http_keep");
        let two = ask(
            &root,
            "GET /parts/app.js HTTP/1.1\r\n\r\nHEAD / HTTP/1.1\r\nconnection: Close\r\n\r\nGET / HTTP/1.1\r\n\r\n",
        );
        assert_eq!(two.matches("HTTP/1.1 200 OK").count(), 2);
        assert_eq!(two.matches("Connection: keep-alive").count(), 1);
        // A body is not read, so nothing of it may be taken for the next request.
        let smuggled = ask(&root, "GET / HTTP/1.1\r\nContent-Length: 40\r\n\r\nGET /a.wasm HTTP/1.1\r\n\r\n");
        assert_eq!(smuggled.matches("HTTP/1.1").count(), 1);
    }
}
