import assert from 'node:assert/strict';

export const promise = 'the panel comes back after the window was reloaded, with the same answer';

export async function flow({ page, panel, openFile, run, answerAll }) {
  await openFile('gloss-five-glazes.csv');
  await run('Weighbeam: Compare groups…');
  await answerAll();
  const headline = await panel.locator('h1').first().innerText();
  // The editor stores what a panel keeps now and then.
  while (!(await page.evaluate(isStored, 'openSections'))) await page.waitForTimeout(250);
  await page.reload();
  await page.waitForFunction('globalThis.driver');
  await page.evaluate('driver.whenWorkbenchRestored()');
  await panel.getByText(headline).first().waitFor();
  assert.equal(await panel.locator('h1').first().innerText(), headline);
}

/** Whether a word stands in what the workbench has stored in the browser. */
async function isStored(word) {
  const done = request =>
    new Promise((resolve, reject) => Object.assign(request, { onsuccess: resolve, onerror: reject }));
  for (const { name } of await globalThis.indexedDB.databases()) {
    const opening = globalThis.indexedDB.open(name);
    await done(opening);
    const database = opening.result;
    for (const store of database.objectStoreNames) {
      const reading = database.transaction(store).objectStore(store).getAll();
      await done(reading);
      if (JSON.stringify(reading.result).includes(word)) return true;
    }
    database.close();
  }
  return false;
}
