// What browser tests stand on: Chromium, a tablet held either way, a guard, axe and screenshots.
import { mkdir, readFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { chromium } from 'playwright-core';
import { guard } from './guard.js';
import { TARGET, startServer } from './server.js';

export { startServer };

/** A tablet of about 10 inches, held either way. */
const SHAPES = {
  landscape: { width: 1180, height: 820 },
  portrait: { width: 820, height: 1180 },
};

const ARGUMENTS = [
  // Containers have neither the kernel's user namespaces nor a graphics device.
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  // Nothing but this machine exists, so a request elsewhere cannot even be answered.
  '--host-resolver-rules=MAP * ~NOTFOUND, EXCLUDE localhost',
];

/** Starts Chromium; whoever starts it closes it. */
export function launch() {
  const executablePath = process.env.CHROMIUM ?? '/usr/bin/chromium';
  return chromium.launch({ executablePath, headless: true, args: ARGUMENTS });
}

/**
 * A fresh server and browser, and the page open in it. When the test is over the guard is asked,
 * which fails the test if anything was found, and both are ended.
 * @param {import('node:test').TestContext} t
 * @param {{shape?: keyof SHAPES, path?: string}} [options] how the tablet is held; what to open
 */
export async function openPage(t, { shape = 'landscape', path = '' } = {}) {
  /** @type {(() => unknown)[]} */
  const ends = [];
  t.after(async () => {
    // Node runs such hooks first to last and stops at one that throws; these go back, all of them.
    let problem;
    for (const end of ends.reverse()) {
      try {
        await end();
      } catch (error) {
        problem ??= error;
      }
    }
    if (problem) throw problem;
  });
  const server = await startServer();
  ends.push(() => server.stop());
  const browser = await launch();
  ends.push(() => browser.close());
  const context = await browser.newContext({ viewport: SHAPES[shape], hasTouch: true, locale: 'en-US' });
  const watch = await guard(context, server.url);
  ends.push(() => watch.check());
  const page = await context.newPage();
  await page.goto(server.url + path);
  return { server, browser, context, page, guard: watch };
}

/**
 * Waits until a service worker serves the page, which is when the network may go away.
 * @param {import('playwright-core').Page} page
 */
export async function readyOffline(page) {
  await page.waitForFunction(async () => {
    const registration = await navigator.serviceWorker.ready;
    return registration.active?.state === 'activated';
  });
}

const AXE = await readFile(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/**
 * Fails on anything axe finds, with contrast at 7:1 and touch targets among its rules.
 * @param {import('playwright-core').Page} page
 */
export async function checkAccess(page) {
  // Through the debugger, which the page's policy does not bind; a script tag would be refused.
  const session = await page.context().newCDPSession(page);
  await session.send('Runtime.evaluate', { expression: `${AXE};0` });
  await session.detach();
  const violations = await page.evaluate(async () => {
    const rules = { 'color-contrast-enhanced': { enabled: true }, 'target-size': { enabled: true } };
    // @ts-expect-error axe has just been put there
    const result = await window.axe.run(document, { rules, resultTypes: ['violations'] });
    return result.violations.map((/** @type {any} */ v) => {
      const nodes = v.nodes.map((/** @type {any} */ n) => `${n.target.join(' ')}: ${n.failureSummary}`);
      return [`${v.id} (${v.impact}): ${v.help}`, ...nodes].join('\n    ');
    });
  });
  if (violations.length) throw new Error(`axe finds:\n  ${violations.join('\n  ')}`);
}

/**
 * Keeps a picture below target/screens/ for people to look at.
 * @param {import('playwright-core').Page} page
 * @param {string} name
 */
export async function screenshot(page, name) {
  const folder = join(TARGET, 'screens');
  await mkdir(folder, { recursive: true });
  const size = page.viewportSize();
  await page.screenshot({ path: join(folder, `${name}-${size?.width}x${size?.height}.png`) });
}
