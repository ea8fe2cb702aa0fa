// The border to the wasm: opens books, and takes a fresh instance when the program broke.
import init, * as wasm from './girderbook_web.js';

/** @typedef {{id: string, k: string, p: {[prop: string]: string}, c?: TreeNode[]}} TreeNode */
/** @typedef {{revision: number, head: TreeNode[], drawings: TreeNode[], page: TreeNode[], verdict: TreeNode[]}} View */
/** @typedef {{revision: number, changes: [string, string, string][], regions: TreeNode[], surfaces: {[name: string]: TreeNode[]}}} Update */
/** @typedef {{path: string, message: string, mend: string}} Refusal */
/** @typedef {{title: string, place: string, span: string, verdict: string, tone: string}} Summary */
/** @typedef {import('./girderbook_web.js').OpenBook} OpenBook */

export const ready = init();

/** The program broke; the book as it was last kept was opened again. */
export class Broke extends Error {}

/**
 * @param {string} text a saved book
 * @returns {{book: OpenBook, problems: Refusal[]} | {book: null, problems: Refusal[]}}
 */
export function read(text) {
  try {
    return { book: new wasm.OpenBook(text), problems: [] };
  } catch (error) {
    if (Array.isArray(error)) return { book: null, problems: error };
    throw error;
  }
}

/**
 * @param {string} id
 * @param {string} system
 */
export function empty(id, system) {
  return wasm.OpenBook.empty(id, system);
}

/** Version of the program. */
export function version() {
  return wasm.version();
}

/** A fresh instance of the wasm, after one that panicked; nothing of the old one is used again. */
export function refresh() {
  const reset = /** @type {{__wbg_reset_state?: () => void}} */ (/** @type {unknown} */ (wasm)).__wbg_reset_state;
  if (!reset) return false;
  reset();
  return true;
}
