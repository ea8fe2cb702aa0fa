// The shelf: books on this tablet, new ones, demo books, files.
import { empty, read, version } from './border.js';
import { make, part, words } from './dom.js';
import { copyOut, textOf } from './files.js';
import * as store from './store.js';

/** @typedef {(id: string, text: string, fresh: boolean) => Promise<void>} Opener */

/** An id that no other book has. */
function newId() {
  return `b${crypto.randomUUID()}`;
}

/** @param {Opener} open */
export async function shelf(open) {
  const root = part('shelf');
  const problems = make('div', { class: 'problems', role: 'alert', hidden: '' });
  const books = make('ul', { class: 'cards' });
  const none = make('p', { class: 'empty', text: 'No book yet. Begin a new one, open a file, or look at a demo book.' });
  const demos = make('ul', { class: 'cards' });

  /** @param {string[]} lines */
  const refuse = (lines) => {
    problems.replaceChildren(make('strong', { text: 'This book cannot be opened.' }), ...lines.map((text) => make('p', { text })));
    problems.hidden = false;
  };
  /** Opens a text as a new book on the shelf. @param {string} text */
  const bringIn = async (text) => {
    const opened = read(text);
    if (!opened.book) {
      refuse(opened.problems.map((p) => [p.path, p.message, p.mend].filter(Boolean).join(': ')));
      return;
    }
    opened.book.free();
    await open(newId(), text, true);
  };

  const list = async () => {
    /** @type {store.Kept[]} */
    let kept = [];
    try {
      kept = await store.shelf();
    } catch {
      refuse(['The storage of this browser cannot be read. Books can be opened from files, but will not be kept here.']);
    }
    words(none, kept.length ? '' : none.textContent ?? '');
    books.replaceChildren(...kept.map((book) => card(book, open, list)));
  };

  const file = make('input', { type: 'file', accept: '.json,application/json', hidden: '', 'aria-label': 'Book file' });
  file.addEventListener('change', async () => {
    const chosen = file.files?.[0];
    file.value = '';
    problems.hidden = true;
    if (!chosen) return;
    const got = await textOf(chosen);
    if ('refused' in got) refuse([got.refused]);
    else await bringIn(got.text);
  });
  const openFile = make('button', { type: 'button', text: 'Open a file' });
  openFile.addEventListener('click', () => file.click());

  const begin = (/** @type {string} */ system, /** @type {string} */ label) => {
    const button = make('button', { type: 'button', class: 'main', text: label });
    button.addEventListener('click', async () => {
      const id = newId();
      const book = empty(id, system);
      const text = book.text();
      book.free();
      await open(id, text, true);
    });
    return button;
  };

  root.replaceChildren(
    make('header', {}, make('h1', { text: 'Girderbook' }), make('p', {
      class: 'lead',
      text: 'Write down what was measured; read what the bridge carries as it stands today, what governs, and how it must be posted.',
    })),
    make('main', {},
      make('div', { class: 'row' }, begin('m-kN', 'New book, m and kN'), begin('ft-kip', 'New book, ft and kip'), openFile, file),
      problems,
      make('h2', { text: 'On this tablet' }), none, books,
      make('h2', { text: 'Demo books of an invented county' }), demos),
    make('footer', { class: 'foot' }, make('p', {
      text: `Girderbook ${version()} supports a licensed engineer and replaces none. Books stay on this tablet; clearing the browser's data deletes them, so save copies out.`,
    })),
  );
  for (const demo of /** @type {{file: string, title: string, about: string}[]} */ (await (await fetch('demos.json')).json())) {
    const name = make('button', { type: 'button', class: 'name', text: demo.title });
    name.addEventListener('click', async () => bringIn(await (await fetch(demo.file)).text()));
    demos.append(make('li', { class: 'card' }, name, make('p', { text: demo.about })));
  }
  await list();
}

/**
 * @param {store.Kept} book
 * @param {Opener} open
 * @param {() => Promise<void>} again
 */
function card(book, open, again) {
  const { title, place, span, verdict } = book.summary;
  const name = make('button', { type: 'button', class: 'name', text: title });
  name.addEventListener('click', async () => {
    const taken = await store.take(book.id);
    if (taken) await open(book.id, taken.kept.text, false);
  });
  const copy = make('button', { type: 'button', text: 'Save a copy', 'aria-label': `Save a copy of ${title}` });
  copy.addEventListener('click', () => void copyOut(title, book.text));
  const drop = make('button', { type: 'button', class: 'danger', text: 'Delete', 'aria-label': `Delete ${title}` });
  let sure = false;
  drop.addEventListener('click', async () => {
    if (!sure) {
      sure = true;
      drop.textContent = 'Really delete?';
      return;
    }
    await store.drop(book.id);
    await again();
  });
  const about = [place, span].filter(Boolean).join(' · ');
  return make('li', { class: 'card' }, name,
    make('p', { text: about, ...(about ? {} : { hidden: '' }) }),
    make('p', { text: verdict }),
    make('p', { class: 'hint', text: `kept ${new Date(book.saved).toLocaleString([], { dateStyle: 'medium', timeStyle: 'short' })}` }),
    make('div', { class: 'row' }, copy, drop));
}
