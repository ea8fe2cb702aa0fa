// The one Trusted Types policy of the page, and the service worker that it lets through.

const WORKER = 'sw.js';

/** @returns {string} */
function workerAddress() {
  const types = /** @type {any} */ (globalThis).trustedTypes;
  if (!types) return WORKER;
  const createScriptURL = (/** @type {string} */ url) => {
    if (url !== WORKER) throw new TypeError(`no script may come from ${url}`);
    return url;
  };
  return types.createPolicy('girderbook', { createScriptURL }).createScriptURL(WORKER);
}

/**
 * Keeps the page for the road.
 * @param {{kept: () => void, waiting: (take: () => void) => void, failed: () => void}} tell
 *   once it opens without a network; when a new version waits; when it could not be kept
 */
export async function keepOffline({ kept, waiting, failed }) {
  if (!navigator.serviceWorker) {
    failed();
    return;
  }
  const hadOne = Boolean(navigator.serviceWorker.controller);
  try {
    const registration = await navigator.serviceWorker.register(workerAddress(), { updateViaCache: 'none' });
    const offer = () => {
      const next = registration.waiting;
      if (!next || !navigator.serviceWorker.controller) return;
      waiting(() => {
        navigator.serviceWorker.addEventListener('controllerchange', () => location.reload(), { once: true });
        next.postMessage('take');
      });
    };
    registration.addEventListener('updatefound', () => {
      registration.installing?.addEventListener('statechange', offer);
    });
    offer();
    await navigator.serviceWorker.ready;
    kept();
  } catch {
    // Without a network the worker that is there goes on serving; only a first visit fails.
    if (!hadOne) failed();
  }
}
