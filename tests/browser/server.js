// The page's own server, as `cargo serve` runs it, on a free port and without building.
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { join, resolve } from 'node:path';
import { createInterface } from 'node:readline';

const ROOT = resolve(import.meta.dirname, '../..');

/** Cargo's target folder; a relative CARGO_TARGET_DIR counts from where the tests were started. */
export const TARGET = resolve(process.env.CARGO_TARGET_DIR ?? join(ROOT, 'target'));

/**
 * Starts the server of `dist/`. Stopping it is how tests take the network away: unlike a browser's
 * offline switch it also holds for the service worker.
 * @param {number} [port] a port to take again after a stop; otherwise any free one
 * @returns {Promise<{url: string, port: number, stop: () => Promise<void>}>}
 */
export async function startServer(port = 0) {
  const program = join(TARGET, 'debug', 'girderbook-bundle');
  const options = ['serve', '--no-build', '--port', String(port)];
  const child = spawn(program, options, { stdio: ['ignore', 'pipe', 'inherit'] });
  const kill = () => child.kill('SIGKILL');
  process.once('exit', kill);
  const ended = once(child, 'exit');

  const address = (async () => {
    for await (const line of createInterface({ input: child.stdout })) {
      const found = /http:\/\/localhost:(\d+)\//.exec(line);
      if (found) return found;
    }
    throw new Error('the server ended without an address; is dist/ built (cargo serve --build-only)?');
  })();
  const failed = once(child, 'error').then(([error]) => Promise.reject(error));
  // Only the one that settles first matters.
  failed.catch(() => {});
  const [url, taken] = await Promise.race([address, failed]);
  child.stdout.resume();

  return {
    url,
    port: Number(taken),
    async stop() {
      kill();
      await ended;
      process.removeListener('exit', kill);
    },
  };
}
