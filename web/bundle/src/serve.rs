//! `dist/` on localhost.

use std::io::BufReader;
use std::net::{Ipv4Addr, TcpListener, TcpStream};
use std::path::Path;
use std::time::Duration;

use crate::{Outcome, http};

const PORT: u16 = 8787;

/// A connection without a request for so long is closed; a browser opens another one.
const PATIENCE: Duration = Duration::from_secs(60);

/// Serves the folder until the process is ended.
pub fn run(dist: &Path, port: Option<u16>) -> Outcome<()> {
    let root = dist.canonicalize().map_err(|e| format!("{}: {e}", dist.display()))?;
    let listener = listen(port)?;
    let port = listener.local_addr().map_err(|e| e.to_string())?.port();
    println!("Girderbook is at http://localhost:{port}/");
    for stream in listener.incoming().flatten() {
        let root = root.clone();
        std::thread::spawn(move || {
            // A connection that breaks concerns nobody but the browser that broke it.
            let _ = attend(&root, stream);
        });
    }
    Ok(())
}

fn attend(root: &Path, stream: TcpStream) -> std::io::Result<()> {
    stream.set_read_timeout(Some(PATIENCE))?;
    stream.set_write_timeout(Some(PATIENCE))?;
    stream.set_nodelay(true)?;
    http::converse(root, BufReader::new(stream.try_clone()?), stream)
}

/// The port asked for, or the usual one, or the next that is free. Only this machine is listened
/// to: the page is for the person at it.
fn listen(port: Option<u16>) -> Outcome<TcpListener> {
    let bind = |port| TcpListener::bind((Ipv4Addr::LOCALHOST, port));
    if let Some(port) = port {
        return bind(port).map_err(|e| format!("Port {port} cannot be used ({e}); try another --port."));
    }
    (PORT..PORT + 100)
        .find_map(|port| bind(port).ok())
        .ok_or_else(|| format!("No port from {PORT} to {} is free; give one with --port.", PORT + 99))
}

#[cfg(test)]
mod tests {
    use std::io::{Read, Write};

    use super::*;

    #[test]
    fn a_busy_port_gives_way_to_the_next() {
        let first = listen(None).unwrap().local_addr().unwrap();
        assert!(first.ip().is_loopback());
        let held = listen(None).unwrap();
        let next = listen(None).unwrap();
        assert_ne!(held.local_addr().unwrap(), next.local_addr().unwrap());
        let busy = held.local_addr().unwrap().port();
        assert!(listen(Some(busy)).unwrap_err().contains("--port"));
    }

    #[test]
    fn a_huge_request_line_is_answered_over_the_wire() {
        let root = crate::dist::tests::scratch("serve").canonicalize().unwrap();
        let listener = listen(Some(0)).unwrap();
        let mut client = TcpStream::connect(listener.local_addr().unwrap()).unwrap();
        let (stream, _) = listener.accept().unwrap();
        let server = std::thread::spawn(move || attend(&root, stream));
        let request = format!("GET /{} HTTP/1.1\r\n\r\n", "a".repeat(200_000));
        client.write_all(request.as_bytes()).unwrap();
        client.shutdown(std::net::Shutdown::Write).unwrap();
        let mut reply = String::new();
        client.read_to_string(&mut reply).unwrap();
        assert!(reply.starts_with("HTTP/1.1 400 Bad Request\r\n"), "{reply}");
        server.join().unwrap().unwrap();
    }
}
