import assert from 'node:assert/strict';
import { mkdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import axe from 'axe-core';

export const promise =
  'the panel can be read in all four kinds of theme, by screen readers, and when it is narrow';

const themes = [
  ['Default Light Modern', 'vscode-light'],
  ['Default Dark Modern', 'vscode-dark'],
  ['Default High Contrast', 'vscode-high-contrast'],
  ['Default High Contrast Light', 'vscode-high-contrast-light'],
];

export async function flow({ page, panel, openFile, run, answerAll, picture }, folder) {
  await openFile('firings-april.csv');
  await run('Weighbeam: Compare groups…');
  await answerAll();
  const frame = await (await panel.locator('html').elementHandle()).ownerFrame();
  await frame.evaluate(axe.source);
  // The editor paints the ground outside of the panel's page, where the contrast check cannot see it.
  await frame.evaluate(`document.body.style.background = 'var(--vscode-editor-background)'`);
  const settings = path.join(folder, '.vscode', 'settings.json');
  await mkdir(path.dirname(settings));
  for (const [theme, bodyClass] of themes) {
    await writeFile(settings, JSON.stringify({ 'workbench.colorTheme': theme }));
    await panel.locator(`body.${bodyClass}`).waitFor();
    await page.waitForTimeout(300); // colours fade over
    await picture(`theme ${bodyClass}`);
    const { violations } = await frame.evaluate('axe.run(document)');
    const found = violations.flatMap(({ id, nodes }) => nodes.map(({ html }) => `${theme}: ${id}: ${html}`));
    assert.deepEqual(found, []);
  }
  await page.setViewportSize({ width: 760, height: 800 });
  const overflow = await frame.evaluate('document.documentElement.scrollWidth - innerWidth');
  await picture('narrow');
  assert.ok(overflow <= 0, `the page is ${overflow} px wider than the panel`);
}
