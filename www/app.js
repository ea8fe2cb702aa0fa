// The controller: the only file that knows all the others.
import { ready, read, refresh } from './border.js';
import { make, part, words } from './dom.js';
import { copyOut } from './files.js';
import { Keeper } from './keeper.js';
import { keys } from './keys.js';
import { shelf } from './shelf.js';
import { Surfaces } from './surface.js';
import { keepOffline } from './trust.js';

/** @type {import('./border.js').OpenBook | null} */
let book = null;
let page = 'site';
/** Text of the book as it was last taken over, for a fresh instance after a panic. */
let last = '';

const hands = { edit, provenance, act, go };
const surfaces = new Surfaces(
  { head: part('head'), drawings: part('drawings'), page: part('page'), verdict: part('verdict') },
  hands,
);
const keeper = new Keeper(
  () => (book ? { text: book.text(), summary: /** @type {any} */ (book.summary()) } : null),
  (state, text) => {
    const kept = part('kept');
    kept.dataset.state = state;
    words(kept, text);
  },
);

/**
 * Does something with the open book. If the program breaks, a fresh instance opens the last good text
 * and the reader is told; what set it off stays in its field.
 * @template T
 * @param {(book: import('./border.js').OpenBook) => T} work
 * @returns {T | null}
 */
function withBook(work) {
  if (!book) return null;
  try {
    const done = work(book);
    last = book.text();
    return done;
  } catch (error) {
    console.warn('The program broke', error);
    notice('Something in the program broke on this entry. Nothing else was lost; write it another way, or save a copy and send it to the makers.');
    if (refresh()) {
      const again = read(last);
      book = again.book;
      book?.open(page);
    }
    return null;
  }
}

/** @param {any} update */
function apply(update) {
  if (!update) return;
  surfaces.update(update);
  keeper.changed();
  announce();
  badges();
}

/** @param {string} path @param {string} text */
function edit(path, text) {
  apply(withBook((b) => b.edit(path, text)));
}

/** @param {string} path @param {string} from */
function provenance(path, from) {
  apply(withBook((b) => b.provenance(path, from)));
}

/** @param {string} action */
function act(action) {
  apply(withBook((b) => b.act(action)));
}

/**
 * Opens a page, a sheet, or the field of a path.
 * @param {string} target
 */
function go(target) {
  if (target.startsWith('page:')) return open(target.slice(5));
  if (target.startsWith('sheet:')) {
    withBook((b) => b.act(`sheet.show:${target.slice(6)}`));
    return open('sheet');
  }
  const holder = withBook((b) => b.page_of(target));
  if (!holder) return undefined;
  if (holder !== page) open(holder);
  const input = /** @type {HTMLElement | null} */ (document.querySelector(`#page [data-path="${CSS.escape(target)}"]`));
  input?.focus();
  input?.scrollIntoView({ block: 'center' });
  return undefined;
}

/** @param {string} name */
function open(name) {
  page = name;
  const view = withBook((b) => b.open(name));
  if (!view) return;
  surfaces.open(/** @type {any} */ (view));
  part('page').scrollTop = 0;
  part('page').focus({ preventScroll: true });
  tabs();
  announce();
}

function tabs() {
  const all = /** @type {{id: string, title: string, badge: string}[]} */ (withBook((b) => b.pages()) ?? []);
  part('tabs').replaceChildren(...all.map(({ id, title }) => {
    const badge = make('span', { class: 'badge', 'aria-hidden': 'true', hidden: '' });
    const todo = make('span', { class: 'unseen' });
    const tab = make('button', { type: 'button', 'data-page': id }, make('span', { text: title }), badge, todo);
    if (id === page) tab.setAttribute('aria-current', 'page');
    tab.addEventListener('click', () => open(id));
    return tab;
  }));
  badges();
}

/** How many entries of each page keep a rating from being built. */
function badges() {
  const all = /** @type {{id: string, title: string, badge: string}[]} */ (withBook((b) => b.pages()) ?? []);
  for (const { id, badge } of all) {
    const tab = document.querySelector(`#tabs [data-page="${id}"]`);
    const mark = tab?.querySelector('.badge');
    const todo = tab?.querySelector('.unseen');
    if (!(mark instanceof HTMLElement) || !todo) continue;
    words(mark, badge);
    todo.textContent = badge ? `, ${badge} to enter or mend` : '';
  }
}

let spoken = '';
/** Says the verdict when it changed. */
function announce() {
  const says = document.querySelector('#verdict [data-node="verdict.words"] .text')?.textContent ?? '';
  if (says === spoken) return;
  spoken = says;
  part('said').textContent = says;
}

/** @param {string} text @param {{label: string, act: () => void}} [offer] */
function notice(text, offer) {
  const bar = part('notice');
  const close = make('button', { type: 'button', text: 'Close' });
  close.addEventListener('click', () => {
    bar.hidden = true;
  });
  const take = offer && make('button', { type: 'button', text: offer.label });
  take?.addEventListener('click', () => offer?.act());
  bar.replaceChildren(make('span', { text }), ...(take ? [take] : []), close);
  bar.hidden = false;
}

/**
 * @param {string} id
 * @param {string} text
 * @param {boolean} fresh whether it is not on the shelf yet
 */
async function openBook(id, text, fresh) {
  const opened = read(text);
  if (!opened.book) {
    notice(`This book cannot be opened: ${opened.problems[0]?.message ?? ''}`);
    return;
  }
  const mine = await keeper.begin(id);
  book = opened.book;
  last = text;
  history.replaceState(null, '', `#${id}`);
  part('shelf').hidden = true;
  part('book').hidden = false;
  open('site');
  if (fresh && mine) {
    keeper.changed();
    await keeper.now();
  } else if (mine) {
    part('kept').dataset.state = 'saved';
    words(part('kept'), 'kept on this tablet');
  }
}

async function toShelf() {
  await keeper.end();
  book?.free();
  book = null;
  history.replaceState(null, '', '#');
  part('book').hidden = true;
  part('shelf').hidden = false;
  document.title = 'Girderbook';
  await shelf(openBook);
}

async function start() {
  await ready;
  keys();
  const back = make('button', { type: 'button', text: 'Shelf' });
  back.addEventListener('click', () => void toShelf());
  const copy = make('button', { type: 'button', text: 'Save a copy' });
  copy.addEventListener('click', () => book && void copyOut(book.title(), book.text()));
  part('tools').append(back, copy);
  addEventListener('error', () => notice('Something on the page broke. What was written is kept; open the book again if it does not answer.'));

  const id = location.hash.slice(1);
  const { take } = await import('./store.js');
  const taken = id ? await take(id).catch(() => null) : null;
  if (taken) {
    await openBook(id, taken.kept.text, false);
    if (taken.damaged) notice('The newest state of this book was damaged; this is the last whole one.');
  } else {
    await toShelf();
  }
  void navigator.storage?.persist?.();
  await keepOffline({
    kept: () => document.documentElement.setAttribute('data-offline', 'ready'),
    waiting: (takeIt) => notice('A new version of Girderbook is ready.', {
      label: 'Take it',
      act: async () => {
        await keeper.end();
        takeIt();
      },
    }),
    failed: () => notice('This browser could not keep Girderbook for use without a network.'),
  });
}

await start();
