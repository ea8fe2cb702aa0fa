// Real tables: rows that can lead somewhere.
import { attribute, make, words } from '../dom.js';

/** @typedef {import('../surface.js').Hands} Hands */
/** @typedef {import('../surface.js').Mounted} Mounted */
/** @typedef {import('../border.js').TreeNode} TreeNode */

/** @param {TreeNode} _node @param {Hands} hands @returns {Mounted} */
export function table(_node, hands) {
  const caption = make('caption', { hidden: '' });
  const inside = make('table', { class: 'table' }, caption);
  const element = make('div', { class: 'scroller', tabindex: '0', role: 'group' }, inside);
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name !== 'caption') return;
    words(caption, value);
    attribute(element, 'aria-label', value);
  };
  return { element, inside, set, child: (row) => tableRow(row, hands) };
}

/** @param {TreeNode} node @param {Hands} hands @returns {Mounted} */
function tableRow(node, hands) {
  const element = make('tr');
  const head = node.p.head === '1';
  const target = node.p.go;
  let first = true;
  const child = (/** @type {TreeNode} */ cellNode) => {
    // A head without words is no head.
    const cell = tableCell(head && Boolean(cellNode.p.text), first ? target : undefined, hands);
    first = false;
    return cell;
  };
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name === 'tone') element.className = value;
  };
  return { element, set, child };
}

/** @param {boolean} head @param {string | undefined} target @param {Hands} hands @returns {Mounted} */
function tableCell(head, target, hands) {
  const element = make(head ? 'th' : 'td', head ? { scope: 'col' } : {});
  const state = { text: '', go: target ?? '', num: '', tone: '' };
  const set = (/** @type {string} */ name, /** @type {string} */ value) => {
    if (name in state) state[/** @type {keyof typeof state} */ (name)] = value;
    element.className = [state.num && 'num', state.tone].filter(Boolean).join(' ');
    if (!state.go || !state.text) {
      element.textContent = state.text;
      return;
    }
    const to = make('button', { type: 'button', class: 'link', text: state.text });
    to.addEventListener('click', () => hands.go(state.go));
    element.replaceChildren(to);
  };
  return { element, set };
}
