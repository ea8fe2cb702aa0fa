// Keeps the open book as it is written, and says truthfully whether it is kept.
import * as store from './store.js';

const WAIT = 400;
const AGAIN = 5000;

/** @typedef {'saved' | 'saving' | 'failed' | 'elsewhere'} State */

export class Keeper {
  #id = '';
  #wanted = 0;
  #kept = 0;
  /** @type {ReturnType<typeof setTimeout> | undefined} */
  #timer;
  /** @type {Promise<void>} */
  #running = Promise.resolve();
  /** @type {(() => void) | null} */
  #release = null;
  #tell;
  #look;

  /**
   * @param {() => {text: string, summary: import('./border.js').Summary} | null} look the open book as it stands
   * @param {(state: State, words: string) => void} tell
   */
  constructor(look, tell) {
    this.#look = look;
    this.#tell = tell;
    const now = () => {
      if (document.visibilityState === 'hidden') void this.now();
    };
    document.addEventListener('visibilitychange', now);
    addEventListener('pagehide', () => void this.now());
  }

  /**
   * Begins with a book; false when another tab writes it.
   * @param {string} id
   */
  async begin(id) {
    await this.end();
    this.#id = id;
    this.#wanted = 0;
    this.#kept = 0;
    if (!navigator.locks) return true;
    return new Promise((resolve) => {
      const held = new Promise((release) => {
        this.#release = () => release(undefined);
      });
      void navigator.locks.request(`girderbook ${id}`, { ifAvailable: true }, (lock) => {
        resolve(Boolean(lock));
        if (!lock) {
          this.#id = '';
          this.#tell('elsewhere', 'open in another tab: not saved here');
        }
        return lock ? held : undefined;
      });
    });
  }

  /** Leaves the book, kept. */
  async end() {
    await this.now();
    this.#id = '';
    this.#release?.();
    this.#release = null;
  }

  /** Something was written. */
  changed() {
    if (!this.#id) return;
    this.#wanted += 1;
    this.#tell('saving', 'saving');
    clearTimeout(this.#timer);
    this.#timer = setTimeout(() => void this.now(), WAIT);
  }

  /** Keeps what is not kept yet; resolves when it is, or when it failed. */
  now() {
    clearTimeout(this.#timer);
    this.#running = this.#running.then(() => this.#keep());
    return this.#running;
  }

  async #keep() {
    const book = this.#look();
    if (!this.#id || !book || this.#kept === this.#wanted) return;
    const revision = this.#wanted;
    try {
      const at = await store.keep({ id: this.#id, revision, ...book });
      this.#kept = revision;
      if (this.#wanted === revision) this.#tell('saved', `kept on this tablet ${clock(at)}`);
    } catch (error) {
      this.#tell('failed', `not saved: ${reason(error)}. Save a copy now`);
      this.#timer = setTimeout(() => void this.now(), AGAIN);
    }
  }
}

/** @param {number} at */
function clock(at) {
  return new Date(at).toLocaleTimeString([], { hour: '2-digit', minute: '2-digit' });
}

/** @param {unknown} error */
function reason(error) {
  const name = error instanceof Error || error instanceof DOMException ? error.name : '';
  if (name === 'QuotaExceededError') return 'the storage of this tablet is full';
  if (name === 'SecurityError') return 'this browser refuses to store';
  return 'the storage of this browser failed';
}
