export const promise =
  'the context menu of a CSV file in the Explorer starts the questions, and Escape leaves nothing';

export async function flow({ page, input, panel, answerAll, picture }) {
  const file = page.locator('.explorer-folders-view').getByText('gloss-readings.csv');
  const choose = async () => {
    await file.click({ button: 'right' });
    await page.getByRole('menuitem', { name: 'Compare groups…' }).click();
    await input.waitFor();
  };
  await choose();
  await picture('explorer');
  await page.keyboard.press('Escape');
  await input.waitFor({ state: 'hidden' });
  await page.waitForTimeout(500);
  if ((await page.locator('iframe.webview').count()) > 0) throw new Error('a panel is there after Escape');
  await choose();
  await answerAll();
  await panel.locator('h1').first().waitFor();
}
