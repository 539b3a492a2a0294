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

  // Zoom in the editor leaves a page half of its pixels: so does a window of half the width.
  await page.setViewportSize({ width: 690, height: 900 });
  await page.waitForTimeout(500);
  const narrow = await frame.evaluate('innerWidth');
  assert.ok(narrow <= 330, `the panel is ${narrow} px wide`);
  await picture('narrow, all unfolded');
  assert.deepEqual(await tooWide(), [], `at ${narrow} px`);
}
