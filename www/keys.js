// The key row: signs of lengths that tablet keypads lack.
import { make, part } from './dom.js';

/** What a key writes, and what it is called. */
const KEYS = [
  ["'", 'feet'],
  ['"', 'inches'],
  ['/', 'fraction'],
  ['-', 'minus or hyphen'],
  [' ft ', 'ft'],
  [' in', 'in'],
  [' mm', 'mm'],
  ['; ', 'next reading'],
];

/** @type {HTMLInputElement | null} */
let target = null;

/** Shows the row while a length is written. */
export function keys() {
  const row = part('keys');
  row.setAttribute('role', 'region');
  row.setAttribute('aria-label', 'Signs for readings');
  for (const [text, name] of KEYS) {
    const key = make('button', { type: 'button', text: text.trim(), 'aria-label': name });
    // The field keeps the focus, so that the keyboard stays.
    key.addEventListener('pointerdown', (event) => event.preventDefault());
    key.addEventListener('click', () => {
      if (!target) return;
      target.setRangeText(text, target.selectionStart ?? 0, target.selectionEnd ?? 0, 'end');
      target.dispatchEvent(new Event('input', { bubbles: true }));
      target.focus();
    });
    row.append(key);
  }
  document.addEventListener('focusin', (event) => {
    const input = event.target;
    const wanted = input instanceof HTMLInputElement && input.dataset.mode === 'length';
    if (wanted) target = input;
    else if (input instanceof Node && row.contains(input)) return;
    row.hidden = !wanted;
  });
}
