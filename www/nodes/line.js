// Lines of a worksheet: what a second engineer checks with a pencil.
import { attribute, make, words } from '../dom.js';

/** @typedef {import('../surface.js').Hands} Hands */
/** @typedef {import('../surface.js').Mounted} Mounted */
/** @typedef {import('../border.js').TreeNode} TreeNode */

/** @returns {Mounted} */
export function sheetTitle() {
  const element = make('h3', { class: 'sheet-title' });
  return { element, set: (name, value) => name === 'text' && (element.textContent = value) };
}

/** @param {TreeNode} node @param {Hands} hands @returns {Mounted} */
export function line(node, hands) {
  const p = node.p;
  const no = make('span', { class: 'no' });
  const what = make('div', { class: 'what' });
  const maths = make('div', { class: 'maths' });
  const source = make('div', { class: 'source' });
  const element = make('div', { class: 'line' }, no, make('div', {}, what, maths, source));
  /** @type {{[name: string]: string}} */
  const has = { ...p };

  const show = () => {
    no.textContent = has.no ?? '';
    if (has.no) element.id = `line-${has.no}`;
    words(what, has.what);
    attribute(element, 'data-from', has.from === 'assumed' ? 'assumed' : '');
    const steps = [has.formula, has.numbers].filter(Boolean).map((step) => ` = ${step}`);
    maths.replaceChildren(
      ...(has.symbol ? [has.symbol] : []),
      ...steps,
      ...(has.result ? [make('span', { class: 'result', text: `${has.symbol || steps.length ? ' = ' : ''}${has.result}` })] : []),
      ...(has.also ? [make('span', { class: 'also', text: ` (${has.also})` })] : []),
    );
    maths.hidden = !maths.textContent;
    source.replaceChildren([has.from, has.cite].filter(Boolean).join(' · '), ...references(has.refs ?? ''));
    if (has.go) {
      const to = make('button', { type: 'button', text: 'open the field' });
      to.addEventListener('click', () => hands.go(has.go ?? ''));
      source.append(' ', to);
    }
    source.hidden = !source.textContent;
  };
  return {
    element,
    set: (name, value) => {
      has[name] = value;
      show();
    },
  };
}

/** @param {string} refs lines that this one takes figures from, as "3,7" */
function references(refs) {
  return refs.split(',').filter(Boolean).map((number) => {
    const to = make('button', { type: 'button', text: `line ${number}`, 'aria-label': `Go to line ${number}` });
    to.addEventListener('click', () => {
      for (const old of document.querySelectorAll('.line.seen')) old.classList.remove('seen');
      const there = document.getElementById(`line-${number}`);
      there?.classList.add('seen');
      there?.scrollIntoView({ block: 'center' });
    });
    return to;
  });
}
