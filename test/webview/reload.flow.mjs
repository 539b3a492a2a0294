import assert from 'node:assert/strict';

export const promise = 'the panel comes back after the window was reloaded, with the same answer';

export async function flow({ page, panel, openFile, run, answerAll }) {
  await openFile('gloss-five-glazes.csv');
  await run('Weighbeam: Compare groups…');
  await answerAll();
  const headline = await panel.locator('h1').first().innerText();
  await page.waitForTimeout(1000); // the editor stores its layout now and then
  await page.reload();
  await page.waitForFunction('globalThis.driver');
  await page.evaluate('driver.whenWorkbenchRestored()');
  await panel.getByText(headline).first().waitFor();
  assert.equal(await panel.locator('h1').first().innerText(), headline);
}
