import assert from 'node:assert/strict';

export const promise =
  'who knows nothing but the icon clicks through to whether the firing schedules differ, and finds it in the notebook';

export async function flow({ page, input, title, panel, rows, openFile, picture, leaveQuestion }) {
  const take = async (question, answer) => {
    await title.filter({ hasText: question }).waitFor();
    await leaveQuestion(() => answer.first().click());
  };
  await openFile('firings-april.csv');
  await page.getByRole('button', { name: 'Compare groups…' }).click();
  await take('What was measured?', rows.filter({ hasText: 'hardness' }));
  await take('What are the groups?', rows.filter({ hasText: 'schedule' }));
  const answer = panel.locator('h1').first();
  // From here on the likely answer, which is under the cursor of the list.
  const likely = page.locator('.quick-input-widget:visible .monaco-list-row.focused');
  for (let asked = 0; asked < 8 && !(await answer.isVisible()); asked++) {
    await Promise.race([likely.waitFor(), answer.waitFor()]);
    if (await likely.isVisible()) await leaveQuestion(() => likely.click());
  }
  await answer.waitFor();
  assert.match(await answer.innerText(), /^hardness is higher in slow cool than in standard by/);
  await panel.getByRole('button', { name: 'Add to notebook…' }).click();
  // Two lines may be typed; both are left empty.
  for (const line of ['How were the samples taken?', 'Who did the analysis?']) {
    await title.filter({ hasText: line }).waitFor();
    await leaveQuestion();
  }
  await rows.filter({ hasText: 'kiln-notebook.md' }).first().click();
  await page.locator('.tab.active', { hasText: 'kiln-notebook.md' }).waitFor();
  await page.locator('.view-lines').getByText('# end of settings block').last().waitFor();
  await input.waitFor({ state: 'hidden' });
  await picture('first time, notebook');
}
