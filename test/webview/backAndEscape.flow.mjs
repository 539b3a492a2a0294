import assert from 'node:assert/strict';

export const promise = 'every question can be gone back from and left by Escape, and then nothing is there';

export async function flow({ page, input, title, panel, openFile, run, answerAll, leaveQuestion }) {
  const back = page.locator('.quick-input-widget:visible').getByRole('button', { name: /^Back/ });
  await openFile('firings-april.csv');
  await run('Weighbeam: Compare groups…');
  await title.filter({ hasText: 'firings-april.csv ·' }).waitFor();

  const asked = [await title.innerText()];
  for (;;) {
    await leaveQuestion();
    await page.waitForTimeout(400);
    if (!(await input.isVisible())) break;
    asked.push(await title.innerText());
    assert.ok(await back.isVisible(), `there is a way back from ${asked.at(-1)}`);
    await back.click();
    await page.mouse.move(640, 600); // the button's own hint would take the next Escape
    await title.filter({ hasText: asked.at(-2) }).waitFor();
    await leaveQuestion();
    await title.filter({ hasText: asked.at(-1) }).waitFor();
  }
  assert.ok(asked.length >= 3, `too few questions: ${asked.join(' | ')}`);
  await panel.locator('h1').first().waitFor();
  await run('View: Close All Editors');
  await page.locator('iframe.webview').waitFor({ state: 'detached' });

  await openFile('firings-april.csv');
  for (let given = 0; given < asked.length; given++) {
    await run('Weighbeam: Compare groups…');
    await title.filter({ hasText: 'firings-april.csv ·' }).waitFor();
    for (let step = 0; step < given; step++) {
      await leaveQuestion();
      await title.filter({ hasText: asked[step + 1] }).waitFor();
    }
    await page.keyboard.press('Escape');
    await input.waitFor({ state: 'hidden' });
    await page.waitForTimeout(300);
    assert.equal(
      await page.locator('iframe.webview').count(),
      0,
      `a panel after ${given} answers and Escape`,
    );
    assert.equal(await page.locator('.notification-toast').count(), 0, 'Escape says nothing');
  }
  await run('Weighbeam: Compare groups…');
  await answerAll();
}
