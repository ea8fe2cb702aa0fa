// The shell of the page: it opens clean either way up, and with the server gone.
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { checkAccess, openPage, readyOffline, screenshot } from './rig.js';

for (const shape of /** @type {const} */ (['landscape', 'portrait'])) {
  test(`the page opens clean in ${shape}`, async (t) => {
    const { page } = await openPage(t, { shape });
    await readyOffline(page);
    assert.match(await page.title(), /Girderbook/);
    await checkAccess(page);
    await screenshot(page, 'shell');
  });
}

test('the page opens with the server gone, in this tab and in a new one', async (t) => {
  const { page, context, server } = await openPage(t);
  await readyOffline(page);
  await server.stop();
  await page.reload();
  const heading = await page.getByRole('heading', { level: 1 }).first().textContent();
  const other = await context.newPage();
  await other.goto(server.url);
  await other.getByRole('heading', { level: 1, name: heading ?? '' }).waitFor();
});

test('the policy reaches the page from the service worker as well', async (t) => {
  const { page, server } = await openPage(t);
  await readyOffline(page);
  await server.stop();
  const response = await page.reload();
  assert.equal(response?.fromServiceWorker(), true);
  assert.match(response?.headers()['content-security-policy'] ?? '', /require-trusted-types-for 'script'/);
});
