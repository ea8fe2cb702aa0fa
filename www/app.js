// Starts the wasm and the service worker.
import init from './girderbook_web.js';

const WORKER = 'sw.js';

/**
 * The one Trusted Types policy: it lets through the service worker's address and nothing else.
 * @returns {string}
 */
function workerAddress() {
  const types = /** @type {any} */ (globalThis).trustedTypes;
  if (!types) return WORKER;
  const rule = (/** @type {string} */ url) => {
    if (url !== WORKER) throw new TypeError(`no script may come from ${url}`);
    return url;
  };
  return types.createPolicy('girderbook', { createScriptURL: rule }).createScriptURL(WORKER);
}

/** @param {string} text */
function tell(text) {
  const state = document.getElementById('state');
  if (state) state.textContent = text;
}

await init();
tell('Open');
await navigator.serviceWorker.register(workerAddress(), { updateViaCache: 'none' });
await navigator.serviceWorker.ready;
tell('Ready offline');
