// The shelf's memory: books in IndexedDB, three snapshots each, nothing reported as kept that is not.

const NAME = 'girderbook';
const VERSION = 1;
const TRIES = 3;
const SNAPSHOTS = 3;

/** @typedef {import('./border.js').Summary} Summary */
/** @typedef {{id: string, text: string, sum: string, saved: number, revision: number, summary: Summary}} Kept */
/** @typedef {Kept & {key: [string, number]}} Snapshot */

/** @type {Promise<IDBDatabase> | null} */
let opened = null;

/** @returns {Promise<IDBDatabase>} */
function database() {
  opened ??= new Promise((resolve, reject) => {
    const request = indexedDB.open(NAME, VERSION);
    request.onupgradeneeded = () => {
      request.result.createObjectStore('books', { keyPath: 'id' });
      request.result.createObjectStore('snapshots', { keyPath: ['id', 'saved'] });
    };
    request.onsuccess = () => {
      const db = request.result;
      // Another tab with a newer version, or the browser closing the handle in the background.
      db.onversionchange = () => {
        db.close();
        opened = null;
      };
      db.onclose = () => {
        opened = null;
      };
      resolve(db);
    };
    request.onerror = () => reject(request.error);
    request.onblocked = () => reject(new Error('another tab holds an older version open'));
  });
  return opened;
}

/**
 * Runs one transaction; a dead handle is opened again, three times at most.
 * @template T
 * @param {IDBTransactionMode} mode
 * @param {(stores: {books: IDBObjectStore, snapshots: IDBObjectStore}) => IDBRequest<T> | void} work
 * @returns {Promise<T>}
 */
async function transact(mode, work) {
  /** @type {unknown} */
  let reason;
  for (let i = 0; i < TRIES; i += 1) {
    try {
      const db = await database();
      return await new Promise((resolve, reject) => {
        const transaction = db.transaction(['books', 'snapshots'], mode, { durability: 'strict' });
        const request = work({ books: transaction.objectStore('books'), snapshots: transaction.objectStore('snapshots') });
        transaction.oncomplete = () => resolve(/** @type {T} */ (request ? request.result : undefined));
        transaction.onabort = () => reject(transaction.error ?? new Error('the storage took it back'));
        transaction.onerror = () => reject(transaction.error ?? new Error('the storage failed'));
      });
    } catch (error) {
      reason = error;
      opened = null;
    }
  }
  throw reason;
}

/** @param {string} text */
async function checksum(text) {
  const bytes = new Uint8Array(await crypto.subtle.digest('SHA-256', new TextEncoder().encode(text)));
  return Array.from(bytes, (b) => b.toString(16).padStart(2, '0')).join('');
}

/** @param {Kept | undefined} kept @returns {Promise<Kept | null>} */
async function whole(kept) {
  return kept && (await checksum(kept.text)) === kept.sum ? kept : null;
}

/**
 * Keeps a book, and what was there before it as a snapshot when that is a minute old or more.
 * Reads back what was written: only then is it kept.
 * @param {{id: string, text: string, revision: number, summary: Summary}} book
 */
export async function keep(book) {
  const kept = { ...book, sum: await checksum(book.text), saved: Date.now() };
  await transact('readwrite', ({ books, snapshots }) => {
    const before = books.get(book.id);
    before.onsuccess = () => {
      const range = IDBKeyRange.bound([book.id, 0], [book.id, Infinity]);
      const old = snapshots.getAllKeys(range);
      old.onsuccess = () => {
        const keys = /** @type {[string, number][]} */ (old.result);
        const last = keys.at(-1)?.[1] ?? 0;
        if (before.result && before.result.text !== kept.text && kept.saved - last >= 60_000) {
          snapshots.put(before.result);
          for (const key of keys.slice(0, Math.max(0, keys.length + 1 - SNAPSHOTS))) snapshots.delete(key);
        }
      };
      books.put(kept);
    };
  });
  const back = await transact('readonly', ({ books }) => books.get(book.id));
  if (back?.sum !== kept.sum || back?.text !== kept.text) throw new Error('what was written did not come back');
  return kept.saved;
}

/**
 * A book from the shelf; the newest whole snapshot where the book itself was damaged.
 * @param {string} id
 * @returns {Promise<{kept: Kept, damaged: boolean} | null>}
 */
export async function take(id) {
  const kept = await whole(await transact('readonly', ({ books }) => books.get(id)));
  if (kept) return { kept, damaged: false };
  const range = IDBKeyRange.bound([id, 0], [id, Infinity]);
  const all = /** @type {Kept[]} */ (await transact('readonly', ({ snapshots }) => snapshots.getAll(range)));
  for (const snapshot of all.reverse()) {
    const good = await whole(snapshot);
    if (good) return { kept: good, damaged: true };
  }
  return null;
}

/** Every book on the shelf, the last one kept first. @returns {Promise<Kept[]>} */
export async function shelf() {
  const all = /** @type {Kept[]} */ (await transact('readonly', ({ books }) => books.getAll()));
  return all.sort((a, b) => b.saved - a.saved);
}

/** @param {string} id */
export async function drop(id) {
  await transact('readwrite', ({ books, snapshots }) => {
    books.delete(id);
    snapshots.delete(IDBKeyRange.bound([id, 0], [id, Infinity]));
  });
}
