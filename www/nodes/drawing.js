// Drawings from data: paths and labels; what leads somewhere can be touched and reached by keyboard.
import { attribute, make, words } from '../dom.js';

/** @typedef {import('../surface.js').Hands} Hands */
/** @typedef {import('../surface.js').Mounted} Mounted */
/** @typedef {import('../border.js').TreeNode} TreeNode */

const SVG = 'http://www.w3.org/2000/svg';

/** @param {TreeNode} node @param {Hands} hands @returns {Mounted} */
export function drawing(node, hands) {
  const title = make('b');
  const note = make('span');
  const svg = document.createElementNS(SVG, 'svg');
  svg.setAttribute('role', 'group');
  const element = make('figure', { class: 'drawing' }, make('figcaption', { class: 'drawing-head' }, title, note));
  const desc = make('p', { class: 'unseen' });
  element.append(svg, desc);
  /** @type {{[name: string]: (value: string) => void}} */
  const slots = {
    title: (value) => {
      words(title, value);
      svg.setAttribute('aria-label', value || 'Drawing');
    },
    note: (value) => words(note, value),
    view: (value) => svg.setAttribute('viewBox', value),
    desc: (value) => words(desc, value),
  };
  if (!node.p.title) svg.setAttribute('aria-label', node.p.desc || 'Drawing');
  return { element, inside: svg, set: (name, value) => slots[name]?.(value), child: (part) => piece(part, hands) };
}

/** @param {TreeNode} node @param {Hands} hands @returns {Mounted} */
function piece(node, hands) {
  const label = node.k === 'label';
  const element = document.createElementNS(SVG, label ? 'text' : 'path');
  let target = '';
  const open = () => target && hands.go(target);
  element.addEventListener('click', open);
  element.addEventListener('keydown', (event) => {
    const key = /** @type {KeyboardEvent} */ (event).key;
    if (target && (key === 'Enter' || key === ' ')) {
      event.preventDefault();
      open();
    }
  });
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name === 'text') element.textContent = value;
    else if (name === 'anchor') attribute(element, 'text-anchor', value);
    else if (name === 'go') target = value;
    else if (name === 'name') attribute(element, 'aria-label', value);
    else attribute(element, name, value);
    if (name === 'go' || name === 'name') {
      // A label that leads somewhere says so by itself; a shape needs its name.
      const named = label || element.hasAttribute('aria-label');
      attribute(element, 'role', target && named ? 'button' : element.hasAttribute('aria-label') ? 'img' : '');
      attribute(element, 'tabindex', target && named ? '0' : '');
    }
  };
  return { element, set };
}
