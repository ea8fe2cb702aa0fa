// Mounts a view's nodes and applies updates to them, property by property.
import { attribute, make } from './dom.js';
import { choice } from './nodes/choice.js';
import { drawing } from './nodes/drawing.js';
import { field } from './nodes/field.js';
import { line, sheetTitle } from './nodes/line.js';
import { button, figure, group, heading, link, list, text } from './nodes/simple.js';
import { table } from './nodes/table.js';

/** @typedef {import('./border.js').TreeNode} TreeNode */
/** @typedef {import('./border.js').Update} Update */

/**
 * What a node does when its reader touches it.
 * @typedef {{
 *   edit: (path: string, text: string) => void,
 *   provenance: (path: string, from: string) => void,
 *   act: (action: string) => void,
 *   go: (target: string) => void,
 * }} Hands
 */

/**
 * A mounted node: its element, how it takes a property, and where its children go. A node that is
 * mounted by its parent (an option, a cell) comes from `child`.
 * @typedef {{
 *   element: Element,
 *   set: (name: string, value: string) => void,
 *   inside?: Element,
 *   child?: (node: TreeNode) => Mounted,
 *   done?: () => void,
 * }} Mounted
 */

/** @type {{[kind: string]: (node: TreeNode, hands: Hands) => Mounted}} */
const KINDS = { region, heading, text, group, field, choice, button, link, list, table, drawing, line, title: sheetTitle, figure };

/** @returns {Mounted} */
function region() {
  // A group, not a landmark: a page would have dozens of them.
  const element = make('div', { class: 'region', role: 'group' });
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name === 'label') attribute(element, 'aria-label', value);
    if (name === 'tone') attribute(element, 'data-tone', value);
  };
  return { element, set };
}

export class Surfaces {
  /** @type {Map<string, Mounted>} */
  #mounted = new Map();
  #roots;
  #hands;

  /**
   * @param {{[surface: string]: Element}} roots
   * @param {Hands} hands
   */
  constructor(roots, hands) {
    this.#roots = roots;
    this.#hands = hands;
  }

  /** @param {{[surface: string]: TreeNode[] | number}} view */
  open(view) {
    this.#mounted.clear();
    for (const [name, root] of Object.entries(this.#roots)) {
      const regions = view[name];
      if (Array.isArray(regions)) root.replaceChildren(...regions.map((node) => this.#mount(node)));
    }
  }

  /** @param {Update} update */
  update(update) {
    for (const [name, regions] of Object.entries(update.surfaces)) {
      this.#roots[name]?.replaceChildren(...regions.map((node) => this.#mount(node)));
    }
    for (const node of update.regions) {
      const old = this.#mounted.get(node.id)?.element;
      old?.replaceWith(this.#mount(node));
    }
    for (const [id, name, value] of update.changes) this.#mounted.get(id)?.set(name, value);
  }

  /** @param {TreeNode} node @param {(node: TreeNode) => Mounted} [from] */
  #mount(node, from) {
    const kind = from ?? ((/** @type {TreeNode} */ n) => (KINDS[n.k] ?? text)(n, this.#hands));
    const mounted = kind(node);
    mounted.element.setAttribute('data-node', node.id);
    for (const [name, value] of Object.entries(node.p)) mounted.set(name, value);
    for (const child of node.c ?? []) {
      (mounted.inside ?? mounted.element).append(this.#mount(child, mounted.child));
    }
    mounted.done?.();
    this.#mounted.set(node.id, mounted);
    return mounted.element;
  }
}
