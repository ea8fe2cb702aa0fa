// Nodes that are little more than their text.
import { make, words } from '../dom.js';

/** @typedef {import('../surface.js').Hands} Hands */
/** @typedef {import('../surface.js').Mounted} Mounted */
/** @typedef {import('../border.js').TreeNode} TreeNode */

/** @param {TreeNode} node @returns {Mounted} */
export function heading(node) {
  const levels = { 1: 'h1', 2: 'h2', 3: 'h3' };
  const element = make(/** @type {'h1' | 'h2' | 'h3'} */ (levels[/** @type {'1' | '2' | '3'} */ (node.p.level)] ?? 'h2'));
  return { element, set: (name, value) => name === 'text' && (element.textContent = value) };
}

/** @returns {Mounted} */
export function text() {
  const element = make('p', { class: 'text' });
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name === 'text') words(element, value);
    if (name === 'tone') element.className = `text ${value}`;
  };
  return { element, set };
}

/** @returns {Mounted} */
export function group() {
  const title = make('p', { class: 'group-title', hidden: '' });
  const note = make('p', { class: 'group-note', hidden: '' });
  const element = make('div', { class: 'group', role: 'group' }, title, note);
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name === 'title') {
      words(title, value);
      element.setAttribute('aria-label', value);
    }
    if (name === 'note') words(note, value);
    if (name === 'tone') element.className = `group ${value}`;
  };
  return { element, set };
}

/** @param {TreeNode} _node @param {Hands} hands @returns {Mounted} */
export function button(_node, hands) {
  let action = '';
  const element = make('button', { type: 'button', disabled: '' });
  element.addEventListener('click', () => hands.act(action));
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name === 'text') element.textContent = value;
    if (name === 'act') {
      action = value;
      element.disabled = !value;
    }
    if (name === 'tone') element.className = value;
  };
  return { element, set };
}

/** @param {TreeNode} _node @param {Hands} hands @returns {Mounted} */
export function link(_node, hands) {
  let target = '';
  const element = make('button', { type: 'button', class: 'link' });
  element.addEventListener('click', () => hands.go(target));
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name === 'text') element.textContent = value;
    if (name === 'go') target = value;
  };
  return { element, set };
}

/** @param {TreeNode} node @param {Hands} hands @returns {Mounted} */
export function list(node, hands) {
  const title = make('h3', { hidden: '' });
  const inside = make(node.p.ordered === '1' ? 'ol' : 'ul', { class: 'list' });
  const element = make('div', {}, title, inside);
  const set = (/** @type {string} */ name, /** @type {string} */ value) => name === 'title' && words(title, value);
  return { element, inside, set, child: () => item(hands) };
}

/** @param {Hands} hands @returns {Mounted} */
function item(hands) {
  const element = make('li');
  let target = '';
  let says = '';
  const show = () => {
    if (!target) return element.replaceChildren(says);
    const to = make('button', { type: 'button', class: 'link', text: says });
    to.addEventListener('click', () => hands.go(target));
    return element.replaceChildren(to);
  };
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name === 'text') says = value;
    if (name === 'go') target = value;
    if (name === 'tone') element.className = value;
    show();
  };
  return { element, set };
}

/** @returns {Mounted} */
export function figure() {
  const number = make('span', { class: 'number' });
  const caption = make('span', { class: 'caption' });
  const element = make('p', { class: 'figure' }, number, caption);
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name === 'text') {
      number.textContent = value;
      element.classList.toggle('words', !/^[\d.]+$/.test(value));
    }
    if (name === 'label') caption.textContent = value;
    if (name === 'tone') element.dataset.tone = value;
  };
  return { element, set };
}
