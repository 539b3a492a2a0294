import assert from 'node:assert/strict';

export const promise = 'a result that arrives while the panel is hidden is there when it is shown again';

export async function flow({ page, panel, rows, openFile, run, answerAll, input, picture }) {
  await openFile('firings-april.csv');
  await run('Weighbeam: Compare groups…');
  await answerAll();
  const headline = panel.locator('h1').first();
  const said = await headline.innerText();
  const point = panel.locator('xpath=//*[local-name()="path"][*[contains(., "731")]]');
  await point.scrollIntoViewIfNeeded();
  await point.click();
  await rows.filter({ hasText: 'Leave line 31 out' }).click();
  await input.fill('tile cracked on the saw');
  await page.keyboard.press('Enter');
  await panel.getByText('tile cracked on the saw').first().waitFor();
  assert.notEqual(await headline.innerText(), said);

  const tab = page.locator('.tab', { hasText: 'Comparison: firings-april.csv' });
  await tab.click();
  // The Explorer opens a file in the group in front, which is the panel's: so it is covered.
  await page.locator('.explorer-folders-view .monaco-list-row', { hasText: 'firings-may.csv' }).click();
  await headline.waitFor({ state: 'hidden' });
  await run('Weighbeam: Undo the last change of the comparison');
  await page.waitForTimeout(1500);
  await tab.click();
  await panel.locator('h1', { hasText: said }).waitFor();
  await picture('shown again');
}
