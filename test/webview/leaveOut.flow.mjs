import assert from 'node:assert/strict';
import { readFile } from 'node:fs/promises';
import path from 'node:path';

export const promise =
  'a click on a point goes to its cell and leaves its row out with a reason; take back and undo work in the panel';

export async function flow({ page, input, panel, rows, openFile, run, answerAll, picture }, folder) {
  const data = path.join(folder, 'firings-april.csv');
  const before = await readFile(data);
  await openFile('firings-april.csv');
  await run('Weighbeam: Compare groups…');
  await answerAll();
  const headline = panel.locator('h1').first();
  const said = await headline.innerText();

  // Marks are named by a title inside, which no selector for visible text finds.
  const point = panel.locator('xpath=//*[local-name()="path"][*[contains(., "731")]]');
  await point.scrollIntoViewIfNeeded();
  await point.click();
  const offer = rows.filter({ hasText: 'Leave line 31 out' });
  await offer.waitFor();
  await page.locator('.line-numbers.active-line-number', { hasText: '31' }).waitFor();
  await picture('leave out');
  await page.keyboard.press('Escape');
  await input.waitFor({ state: 'hidden' });
  assert.equal(await headline.innerText(), said, 'Escape changes nothing');

  await point.click();
  await offer.waitFor();
  await page.keyboard.press('Enter');
  await page.getByText('It stands in the settings block').waitFor();
  await page.keyboard.press('Enter');
  await page.getByText('A few words are needed').first().waitFor();
  await input.fill('tile cracked on the saw');
  await page.keyboard.press('Enter');
  await panel.getByText('tile cracked on the saw').first().waitFor();
  assert.notEqual(await headline.innerText(), said);
  await picture('left out');

  await panel.getByRole('button', { name: 'Take back' }).click();
  await panel.locator('h1', { hasText: said }).waitFor();
  await panel.getByRole('button', { name: 'Undo' }).click();
  await panel.getByText('tile cracked on the saw').first().waitFor();
  await run('Weighbeam: Undo the last change of the comparison');
  await panel.locator('h1', { hasText: said }).waitFor();
  assert.deepEqual(await readFile(data), before, 'the data file is as it was');
}
