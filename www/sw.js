// Keeps the page, so that it opens with no network. The build fills in the next three lines.
/** @type {{path: string, integrity: string, size: number}[]} */
const FILES = [];
const VERSION = "";
const POLICY = "";

const worker = /** @type {ServiceWorkerGlobalScope} */ (/** @type {unknown} */ (self));
// The cache carries the folder's name: another copy on the same server has its own.
const PREFIX = `girderbook ${worker.registration.scope} `;
const CACHE = PREFIX + VERSION;

/** @param {Response} response */
async function withPolicy(response) {
  const headers = new Headers(response.headers);
  headers.set('Content-Security-Policy', POLICY);
  return new Response(await response.blob(), { status: response.status, headers });
}

/** Whole or not at all: one file that is missing or changed, and the old version stays. */
async function keep() {
  const cache = await caches.open(CACHE);
  try {
    for (const { path, integrity } of FILES) {
      const response = await fetch(new Request(path, { cache: 'reload', integrity }));
      if (!response.ok) throw new Error(`${path}: ${response.status}`);
      await cache.put(path, await withPolicy(response));
    }
  } catch (error) {
    await caches.delete(CACHE);
    throw error;
  }
}

async function sweep() {
  for (const name of await caches.keys()) {
    if (name.startsWith(PREFIX) && name !== CACHE) await caches.delete(name);
  }
  await worker.clients.claim();
}

/** @param {Request} request */
async function answer(request) {
  const path = new URL(request.url).pathname;
  const wanted = path.endsWith('/') ? `${path}index.html` : path;
  const cache = await caches.open(CACHE);
  return (await cache.match(wanted)) ?? fetch(request);
}

worker.addEventListener('install', (event) => event.waitUntil(keep()));
worker.addEventListener('activate', (event) => event.waitUntil(sweep()));
worker.addEventListener('message', (event) => {
  // A new version waits until the user takes it.
  if (event.data === 'take') worker.skipWaiting();
});
worker.addEventListener('fetch', (event) => {
  if (event.request.method === 'GET') event.respondWith(answer(event.request));
});
