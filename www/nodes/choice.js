// One of several.
import { attribute, make, words } from '../dom.js';

/** @typedef {import('../surface.js').Hands} Hands */
/** @typedef {import('../surface.js').Mounted} Mounted */
/** @typedef {import('../border.js').TreeNode} TreeNode */

let count = 0;

/** @param {TreeNode} _node @param {Hands} hands @returns {Mounted} */
export function choice(_node, hands) {
  count += 1;
  const id = `choice-${count}`;
  let path = '';
  let value = '';
  const label = make('label', { for: id });
  const hint = make('span', { class: 'hint', id: `${id}-hint`, hidden: '' });
  const select = make('select', { id, 'aria-describedby': `${id}-hint ${id}-trouble` });
  const message = make('strong');
  const mend = make('span');
  const trouble = make('div', { class: 'trouble', id: `${id}-trouble`, hidden: '' }, message, mend);
  select.addEventListener('change', () => hands.edit(path, select.value));
  const element = make('div', { class: 'choice' }, make('div', {}, label, hint), select, trouble);

  /** @type {{[name: string]: (value: string) => void}} */
  const slots = {
    path: (text) => {
      path = text;
      select.dataset.path = text;
    },
    label: (text) => {
      label.textContent = text;
    },
    hint: (text) => words(hint, text),
    value: (text) => {
      value = text;
      select.value = text;
    },
    problem: (text) => {
      trouble.hidden = !text;
      message.textContent = text;
      attribute(element, 'data-problem', text && 'yes');
      attribute(select, 'aria-invalid', text && 'true');
    },
    mend: (text) => {
      mend.textContent = text;
    },
  };
  return {
    element,
    inside: select,
    set: (name, text) => slots[name]?.(text),
    child: option,
    // The options came after the value.
    done: () => {
      select.value = value;
    },
  };
}

/** @returns {Mounted} */
function option() {
  const element = make('option');
  const set = (/** @type {string} */ name, /** @type {string} */ text) => {
    if (name === 'value') element.value = text;
    if (name === 'text') element.textContent = text;
  };
  return { element, set };
}
