import assert from 'node:assert/strict';

export const promise = 'every question can be gone back from and left by Escape, and then nothing is there';

export async function flow({ page, input, panel, openFile, run, answerAll }) {
  const title = page.locator('.quick-input-widget:visible .quick-input-title');
  const back = page.locator('.quick-input-widget:visible').getByRole('button', { name: /^Back/ });
  const next = async () => {
    const now = await title.innerText();
    await page.keyboard.press('Enter');
    const same = title.filter({ hasText: now });
    for (let waited = 0; waited < 100 && (await same.isVisible()); waited++) await page.waitForTimeout(50);
  };
  await openFile('firings-april.csv');
  await run('Weighbeam: Compare groups…');
  await title.filter({ hasText: 'firings-april.csv ·' }).waitFor();

  const asked = [await title.innerText()];
  for (;;) {
    await next();
    await page.waitForTimeout(400);
    if (!(await input.isVisible())) break;
    asked.push(await title.innerText());
    assert.ok(await back.isVisible(), `there is a way back from ${asked.at(-1)}`);
    await back.click();
    await page.mouse.move(640, 600); // the button's own hint would take the next Escape
    await title.filter({ hasText: asked.at(-2) }).waitFor();
    await next();
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
      await next();
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
