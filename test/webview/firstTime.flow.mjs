import assert from 'node:assert/strict';

export const promise =
  'who has only the editor and a mouse decides whether the firing schedules differ, and finds it in the notebook';

export async function flow({ page, input, panel, rows, openFile, picture }) {
  await openFile('firings-april.csv');
  await page.getByRole('button', { name: 'Compare groups…' }).click();
  const title = page.locator('.quick-input-widget:visible .quick-input-title');
  const take = async (question, answer) => {
    await title.filter({ hasText: question }).waitFor();
    await rows.filter({ hasText: answer }).first().click();
  };
  await take('What was measured?', 'hardness');
  await take('What are the groups?', 'schedule');
  const answer = panel.locator('h1').first();
  for (let asked = 0; asked < 8 && !(await answer.isVisible()); asked++) {
    await picture(`first time ${asked + 3}`);
    const said = await title.innerText().catch(() => '');
    // The likely answer is the one under the cursor.
    await page.keyboard.press('Enter');
    const same = title.filter({ hasText: said || 'nothing' });
    for (let waited = 0; waited < 40 && (await same.isVisible()); waited++) await page.waitForTimeout(50);
    await page.waitForTimeout(400);
  }
  await answer.waitFor();
  assert.match(await answer.innerText(), /^hardness is higher in slow cool than in standard by/);
  await panel.getByRole('button', { name: 'Add to notebook…' }).click();
  await page.getByText('How were the samples taken?').first().waitFor();
  await page.keyboard.press('Enter');
  await page.getByText('Who did the analysis?').first().waitFor();
  await page.keyboard.press('Enter');
  await rows.filter({ hasText: 'kiln-notebook.md' }).first().click();
  await page.locator('.tab.active', { hasText: 'kiln-notebook.md' }).waitFor();
  await page.locator('.view-lines').getByText('# end of settings block').last().waitFor();
  await input.waitFor({ state: 'hidden' });
  await picture('first time, notebook');
}
