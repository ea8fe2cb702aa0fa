// One entry: label and hint, the input with its unit, where it comes from, what is wrong and how to mend it.
import { attribute, make, words } from '../dom.js';

/** @typedef {import('../surface.js').Hands} Hands */
/** @typedef {import('../surface.js').Mounted} Mounted */
/** @typedef {import('../border.js').TreeNode} TreeNode */

const ORIGINS = ['measured', 'drawing', 'assumed'];
let count = 0;

/** @param {TreeNode} _node @param {Hands} hands @returns {Mounted} */
export function field(_node, hands) {
  count += 1;
  const id = `field-${count}`;
  let path = '';
  let repair = '';

  const label = make('label', { for: id });
  const hint = make('span', { class: 'hint', id: `${id}-hint`, hidden: '' });
  const echo = make('span', { class: 'echo', id: `${id}-echo`, hidden: '' });
  const note = make('span', { class: 'note', hidden: '' });
  const input = make('input', { id, type: 'text', autocomplete: 'off', spellcheck: 'false', enterkeyhint: 'next' });
  const unit = make('span', { class: 'unit', hidden: '' });
  const from = make('div', { class: 'from', role: 'group', hidden: '' });
  const message = make('strong');
  const mend = make('span');
  const mender = make('button', { type: 'button', hidden: '' });
  const trouble = make('div', { class: 'trouble', id: `${id}-trouble`, hidden: '' }, message, mend, mender);
  input.setAttribute('aria-describedby', `${id}-hint ${id}-echo ${id}-trouble`);

  input.addEventListener('input', () => hands.edit(path, input.value));
  input.addEventListener('keydown', (event) => {
    if (event.key === 'Enter') next(input);
  });
  mender.addEventListener('click', () => {
    input.value = repair;
    hands.edit(path, repair);
    input.focus();
  });
  const origins = ORIGINS.map((name) => {
    const choice = make('button', { type: 'button', text: name, 'aria-pressed': 'false' });
    choice.addEventListener('click', () => hands.provenance(path, name));
    return choice;
  });
  from.append(...origins);

  const box = make('div', { class: 'box' }, input, unit, from);
  const element = make('div', { class: 'field' }, make('div', {}, label, hint, echo, note), box, trouble);

  /** @type {{[name: string]: (value: string) => void}} */
  const slots = {
    path: (value) => {
      path = value;
      input.dataset.path = value;
    },
    label: (value) => {
      label.textContent = value;
      from.setAttribute('aria-label', `Where ${value} comes from`);
    },
    hint: (value) => words(hint, value),
    echo: (value) => words(echo, value),
    note: (value) => words(note, value),
    unit: (value) => words(unit, value),
    text: (value) => {
      // What is being written is never written over.
      if (document.activeElement !== input) input.value = value;
    },
    ghost: (value) => {
      input.placeholder = value;
    },
    mode: (value) => {
      input.dataset.mode = value;
      input.inputMode = value === 'number' ? 'decimal' : 'text';
    },
    from: (value) => {
      from.hidden = !value;
      attribute(element, 'data-from', value);
      for (const choice of origins) choice.setAttribute('aria-pressed', String(choice.textContent === value));
    },
    problem: (value) => {
      trouble.hidden = !value;
      message.textContent = value;
      attribute(element, 'data-problem', value && 'yes');
      attribute(input, 'aria-invalid', value && 'true');
    },
    mend: (value) => {
      mend.textContent = value;
    },
    repair: (value) => {
      repair = value;
      mender.textContent = `Write ${value}`;
      mender.hidden = !value;
    },
  };
  return { element, set: (name, value) => slots[name]?.(value) };
}

/**
 * Enter goes to the next field of the page.
 * @param {HTMLInputElement} input
 */
function next(input) {
  const all = [.../** @type {NodeListOf<HTMLElement>} */ (document.querySelectorAll('#page input, #page select'))];
  const following = all[all.indexOf(input) + 1];
  following?.focus();
  if (following instanceof HTMLInputElement) following.select();
}
