export const promise =
  'the context menu of a CSV file in the Explorer starts the questions, and Escape leaves nothing';

export async function flow({ page, input, panel, answerAll, picture }) {
  const file = page.locator('.explorer-folders-view').getByText('gloss-readings.csv');
  const item = page.getByRole('menuitem', { name: 'Compare groups…' });
  const choose = async () => {
    await file.click({ button: 'right' });
    await page.waitForTimeout(300); // a menu that has just opened takes no click
    await item.click();
    await input.waitFor();
  };
  // The editor knows the menus of extensions a moment after it shows its own.
  for (let tried = 0; tried < 20 && !(await item.isVisible()); tried++) {
    await page.keyboard.press('Escape');
    await file.click({ button: 'right' });
    await page.waitForTimeout(500);
  }
  await page.keyboard.press('Escape');
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
