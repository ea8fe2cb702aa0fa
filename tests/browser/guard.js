// Watches a browser context for everything that must not happen in any test.

/**
 * Collects console errors, uncaught errors, violations of the security policy and requests to any
 * other origin, in pages and workers alike.
 * @param {import('playwright-core').BrowserContext} context
 * @param {string} home the address of the page
 */
export async function guard(context, home) {
  const origin = new URL(home).origin;
  /** @type {string[]} */
  const found = [];
  /** @type {RegExp[]} */
  const allowed = [];

  const heard = (/** @type {import('playwright-core').ConsoleMessage} */ message) => {
    if (message.type() === 'error') {
      const { url } = message.location();
      found.push(`console error: ${message.text()}${url ? ` (${url})` : ''}`);
    }
  };
  context.on('console', heard);
  context.on('serviceworker', (worker) => worker.on('console', heard));
  context.on('weberror', (error) => found.push(`uncaught error: ${error.error()}`));
  context.on('request', (request) => {
    const url = new URL(request.url());
    const own = url.origin === origin || url.protocol === 'data:' || url.protocol === 'blob:';
    if (!own) found.push(`request to another origin: ${request.url()}`);
  });
  await context.exposeBinding('reportViolation', (_, text) => found.push(`policy violation: ${text}`));
  await context.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', (event) => {
      const { effectiveDirective, blockedURI, sample, sourceFile, lineNumber } = event;
      const place = `${sourceFile}:${lineNumber}`;
      // @ts-expect-error the binding is put there by the guard
      window.reportViolation(`${effectiveDirective} ${blockedURI} ${sample} at ${place}`);
    });
  });

  const faults = () => found.filter((text) => !allowed.some((pattern) => pattern.test(text)));
  return {
    /** Lets through what a test provokes on purpose. @param {RegExp} pattern */
    allow(pattern) {
      allowed.push(pattern);
    },
    faults,
    /** Throws when anything was found. */
    check() {
      const list = faults();
      if (list.length) throw new Error(`the page is not clean:\n  ${list.join('\n  ')}`);
    },
  };
}
