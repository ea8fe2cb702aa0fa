// The rig itself: a guard that cannot fail would guard nothing.
import assert from 'node:assert/strict';
import { test } from 'node:test';
import { checkAccess, openPage } from './rig.js';

/** @type {[string, () => void, RegExp][]} */
const faults = [
  ['a console error', () => console.error('broken'), /console error: broken/],
  [
    'an uncaught error',
    () => {
      setTimeout(() => {
        throw new Error('thrown');
      });
    },
    /uncaught error: .*thrown/,
  ],
  [
    'a violation of the policy',
    () => {
      const style = document.createElement('style');
      style.textContent = 'p { color: red }';
      document.head.append(style);
    },
    /policy violation: style-src/,
  ],
  [
    'markup from a string',
    () => {
      try {
        document.body.innerHTML = '<p>text</p>';
      } catch {
        // The browser refuses it, and reports that it did.
      }
    },
    /policy violation: require-trusted-types-for/,
  ],
  [
    'a request to another origin',
    () => {
      fetch('http://localhost:9/').catch(() => {});
    },
    /policy violation: connect-src/,
  ],
];

for (const [name, fault, pattern] of faults) {
  test(`the guard sees ${name}`, async (t) => {
    const { page, guard } = await openPage(t);
    guard.check();
    await page.evaluate(fault);
    const seen = async () => {
      while (!guard.faults().some((text) => pattern.test(text))) await page.waitForTimeout(20);
    };
    await Promise.race([seen(), page.waitForTimeout(5000)]);
    assert.ok(guard.faults().some((text) => pattern.test(text)), guard.faults().join('\n'));
    assert.throws(() => guard.check(), /not clean/);
    guard.allow(/./);
  });
}

test('the guard sees a page of another origin', async (t) => {
  const { page, guard } = await openPage(t);
  await page.goto('http://elsewhere.invalid/').catch(() => {});
  assert.match(guard.faults().join('\n'), /request to another origin: http:\/\/elsewhere\.invalid/);
  guard.allow(/./);
});

test('axe sees a button without a name and text under 7:1', async (t) => {
  const { page } = await openPage(t);
  await page.evaluate(() => {
    const button = document.createElement('button');
    const text = document.createElement('p');
    text.textContent = 'hardly to be read';
    // Dark enough for 4.5:1, not for 7:1. By the object model, which the policy allows.
    text.style.color = '#666';
    document.body.append(button, text);
  });
  await assert.rejects(checkAccess(page), /button-name[\s\S]*color-contrast-enhanced/);
});
