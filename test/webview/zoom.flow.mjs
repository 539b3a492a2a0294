import assert from 'node:assert/strict';

export const promise =
  'the panel needs no scrolling sideways at 320 pixels, which is what a window of 1,380 pixels gives it at 200 % zoom';

export async function flow({ page, panel, openFile, run, answerAll, picture }) {
  await openFile('firings-april.csv');
  await run('Weighbeam: Compare groups…');
  await answerAll();
  await run('View: Toggle Primary Side Bar Visibility');
  const frame = await (await panel.locator('html').elementHandle()).ownerFrame();
  for (const fold of await panel.locator('summary').all()) await fold.click();
  const tooWide = () =>
    frame.evaluate(`document.documentElement.scrollWidth <= innerWidth
      ? []
      : [...document.querySelectorAll('body *')]
          .filter(part => part.getBoundingClientRect().right > innerWidth + 0.5)
          .map(part => part.tagName + ' ' + (part.getAttribute('class') ?? ''))`);

  // What a browser does at 200 % zoom: half of the pixels each way, each of them drawn by four.
  const session = await page.context().newCDPSession(page);
  const zoomed = { width: 690, height: 450, deviceScaleFactor: 2, mobile: false };
  await session.send('Emulation.setDeviceMetricsOverride', zoomed);
  await page.waitForTimeout(500);
  const narrow = await frame.evaluate('innerWidth');
  assert.ok(narrow <= 330, `the panel is ${narrow} px wide`);
  assert.equal(await frame.evaluate('devicePixelRatio'), 2);
  await picture('narrow, all unfolded');
  assert.deepEqual(await tooWide(), [], `at ${narrow} px`);
}
