import assert from 'node:assert/strict';

export const promise =
  'in a folder that is not trusted the whole job works: nothing of the folder is ever executed';
export const options = { trusted: false };

export async function flow({ page, panel, refusals, openFile, run, answerAll }) {
  await page.getByText('Restricted Mode').first().waitFor();
  await openFile('water-uptake-refired.csv');
  await run('Weighbeam: Compare groups…');
  await answerAll();
  assert.ok(await panel.locator('h1').first().isVisible());
  assert.deepEqual(refusals, []);
}
