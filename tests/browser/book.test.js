// The book in the browser: from nothing to a posted verdict, what is kept, what is refused.
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { checkAccess, openPage, readyOffline, screenshot } from './rig.js';

/** @typedef {import('playwright-core').Page} Page */

const PAGES = ['site', 'span', 'layers', 'members', 'findings', 'traffic', 'rating', 'posting', 'sheet'];

/** @param {Page} page @param {string} name */
async function turnTo(page, name) {
  await page.locator(`#tabs [data-page=${name}]`).tap();
  await page.locator(`#tabs [data-page=${name}][aria-current]`).waitFor();
}

/** @param {Page} page @param {string} path */
const field = (page, path) => page.locator(`#page [data-path="${path}"]`);

/** @param {Page} page @param {string} title */
async function openDemo(page, title) {
  await page.getByRole('button', { name: title, exact: true }).tap();
  await page.locator('#verdict .figure').waitFor();
}

/** @param {Page} page */
const verdict = (page) => page.locator('#verdict [data-node="verdict.words"]').innerText();

/** @param {Page} page */
const figure = (page) => page.locator('#verdict .number').innerText();

/** @param {Page} page */
const kept = (page) => page.locator('#kept[data-state=saved]').waitFor();

test('from an empty book to a posted verdict, by touch', async (t) => {
  const { page } = await openPage(t, { shape: 'portrait' });
  await page.getByRole('button', { name: 'New book, m and kN' }).tap();
  await page.locator('#verdict .figure').waitFor();
  // What is missing is said in order, and each item opens its field.
  const first = page.locator('#verdict [data-node="verdict.missing"] li button').first();
  await first.tap();
  await page.locator('#page :focus').waitFor();

  /** @type {[string, [string, string][]][]} */
  const entries = [
    ['site', [['site.year_built', '1958']]],
    ['span', [['spans.s1.length', '18.3'], ['skew', '0']]],
    ['span', [['girders.count', '5'], ['overhang', '0.35']]],
    ['layers', [['layers.l1.thickness', '65 72 70 68 78 74 70'], ['deck.slab', '7 1/4 in'], ['deck.haunch', '40'], ['strips.p1.weight', '440 lb/ft']]],
    ['members', [['members.m1.shape', 'W36x182 (1980)'], ['members.m1.brace_spacing', "15'"], ['members.m1.bearing_length', '200']]],
    ['traffic', [['traffic.adtt', '420']]],
  ];
  for (const [name, fields] of entries) {
    await turnTo(page, name);
    for (const [path, text] of fields) {
      await field(page, path).fill(text);
      await field(page, path).press('Enter');
    }
  }
  for (const [name, path, value] of [
    ['site', 'site.condition', 'fair'],
    ['members', 'members.m1.connectors', 'none'],
    ['members', 'members.m1.embedded', 'no'],
  ]) {
    await turnTo(page, name ?? '');
    await field(page, path ?? '').selectOption(value ?? '');
  }
  // What is left on the list is entered where it leads.
  /** @type {{[path: string]: string}} */
  const rest = { 'deck.width': '9.42', 'deck.roadway': '8.53', 'deck.haunch_width': '300' };
  for (let i = 0; i < 20; i += 1) {
    const item = page.locator('#verdict [data-node="verdict.missing"] li button').first();
    if (!(await item.isVisible())) break;
    await item.tap();
    const focused = page.locator('#page :focus');
    const path = (await focused.getAttribute('data-path')) ?? '';
    const text = rest[path] ?? (path.endsWith('.spacing') ? '2.18' : undefined);
    assert.ok(text, `what is still missing: ${path}`);
    await focused.fill(text);
  }
  assert.match(await verdict(page), /^Post for single-unit trucks: \d+ t/);
  assert.equal(await figure(page), '0.81');
  await screenshot(page, 'from-empty');

  await kept(page);
});

test('an edit changes the verdict in the next frame, and undo brings it back', async (t) => {
  const { page } = await openPage(t);
  await openDemo(page, 'Hollow Fork');
  const before = await figure(page);
  await turnTo(page, 'findings');
  await field(page, 'findings.f6.web_low').fill('11.0; 11.6; 11.3');
  const after = await figure(page);
  assert.notEqual(after, before, 'one millimetre of web changes what governs');
  assert.match(await page.locator('#verdict .caption').innerText(), /bending/);
  await page.getByRole('button', { name: 'Undo' }).tap();
  assert.equal(await figure(page), before);
});

test('what was written survives a reload, and the server gone', async (t) => {
  const { page, server } = await openPage(t);
  await openDemo(page, 'Hollow Fork');
  await readyOffline(page);
  await turnTo(page, 'layers');
  await field(page, 'layers.l1.thickness').fill('120 mm');
  const figureThen = await figure(page);
  await kept(page);
  await server.stop();
  await page.reload();
  await page.locator('#verdict .figure').waitFor();
  assert.equal(await figure(page), figureThen);
  await turnTo(page, 'layers');
  assert.equal(await field(page, 'layers.l1.thickness').inputValue(), '120 mm');
  await page.getByRole('button', { name: 'Shelf' }).tap();
  await page.locator('.card .name', { hasText: 'Hollow Fork' }).first().waitFor();
});

test('wrong input is told beside its field, kept as typed, and nothing is rated on it', async (t) => {
  const { page } = await openPage(t);
  await openDemo(page, 'Hollow Fork');
  const trouble = (/** @type {string} */ path) => page.locator('.field', { has: page.locator(`[data-path="${path}"]`) }).locator('.trouble');
  for (const [name, path, text, says] of [
    ['span', 'spans.s1.length', 'abc', 'abc'],
    ['span', 'spans.s1.length', '0', 'span must be'],
    ['span', 'spans.s1.length', '-5', 'span must be'],
    ['span', 'spans.s1.length', '1000000000000 m', 'span must be'],
    ['span', 'spans.s1.length', '12 kN', 'kN is the unit of a force'],
    ['layers', 'deck.slab', 'NaN', 'NaN'],
    ['layers', 'layers.l1.thickness', '<img src=x onerror=alert(1)>', '"<"'],
    ['members', 'members.m1.shape', 'W99x999', 'W99x999'],
  ]) {
    await turnTo(page, name ?? '');
    const input = field(page, path ?? '');
    const good = await input.inputValue();
    await input.fill(text ?? '');
    assert.ok((await trouble(path ?? '').innerText()).includes(says ?? ''), `${path} ${text}: ${await trouble(path ?? '').innerText()}`);
    assert.equal(await input.inputValue(), text);
    assert.equal(await input.getAttribute('aria-invalid'), 'true');
    assert.match(await verdict(page), /No rating/i);
    await input.fill(good);
    assert.match(await verdict(page), /^Post/);
  }
  // A repair is one tap.
  await turnTo(page, 'layers');
  await field(page, 'layers.l1.thickness').fill('1,234');
  await trouble('layers.l1.thickness').getByRole('button').tap();
  assert.equal(await field(page, 'layers.l1.thickness').inputValue(), '1234');
});

test('a book goes out as a file and comes back the same; wrong files are refused in words', async (t) => {
  const { page } = await openPage(t);
  await openDemo(page, 'Mill Race');
  const figureThen = await figure(page);
  const download = page.waitForEvent('download');
  await page.evaluate(() => Object.defineProperty(navigator, 'canShare', { value: () => false }));
  await page.getByRole('button', { name: 'Save a copy' }).tap();
  const path = await (await download).path();
  await page.getByRole('button', { name: 'Shelf' }).tap();
  for (const [name, text, says] of [
    ['broken.json', '{"format": 1', 'cannot be opened'],
    ['newer.json', '{"format": 99, "id": "x"}', 'newer'],
    ['odd.json', '{"format": 1, "id": "x", "system": "m-kN", "next_id": 1, "colour": "red"}', 'colour'],
  ]) {
    await page.locator('input[type=file]').setInputFiles({ name: name ?? '', mimeType: 'application/json', buffer: Buffer.from(text ?? '') });
    await page.locator('#shelf .problems', { hasText: says }).waitFor();
  }
  await page.locator('input[type=file]').setInputFiles({ name: 'large.json', mimeType: 'application/json', buffer: Buffer.alloc(10_000_001, 32) });
  await page.locator('#shelf .problems', { hasText: '10 MB' }).waitFor();
  await page.locator('input[type=file]').setInputFiles(path);
  await page.locator('#verdict .figure').waitFor();
  assert.equal(await figure(page), figureThen);
});

for (const shape of /** @type {const} */ (['landscape', 'portrait'])) {
  test(`every page is accessible and looks right in ${shape}`, async (t) => {
    const { page } = await openPage(t, { shape });
    await checkAccess(page);
    await openDemo(page, 'Hollow Fork');
    for (const name of PAGES) {
      await turnTo(page, name);
      await checkAccess(page);
      const wide = await page.evaluate(() => document.documentElement.scrollWidth > innerWidth);
      assert.equal(wide, false, `${name} is wider than the screen`);
      await screenshot(page, name);
    }
  });
}

test('an empty book and a wrong entry are accessible too', async (t) => {
  const { page } = await openPage(t);
  await page.getByRole('button', { name: 'New book, ft and kip' }).tap();
  await page.locator('#verdict .figure').waitFor();
  await checkAccess(page);
  await turnTo(page, 'span');
  await field(page, 'spans.s1.length').fill('twelve');
  await checkAccess(page);
  await screenshot(page, 'wrong-entry');
});

test('the sheet of a check opens from the rating and its lines lead back', async (t) => {
  const { page } = await openPage(t);
  await openDemo(page, 'Hollow Fork');
  await page.locator('#verdict').getByRole('button', { name: 'Open the sheet' }).tap();
  await page.locator('#page .line').first().waitFor();
  assert.ok((await page.locator('#page .line').count()) > 40);
  const reference = page.locator('#page .line .source button[aria-label^="Go to line"]').first();
  await reference.tap();
  await page.locator('#page .line.seen').waitFor();
});
