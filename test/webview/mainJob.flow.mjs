import assert from 'node:assert/strict';
import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { command, root } from '../../.config/command.mjs';

export const promise = 'from a CSV to an answer and a settings block on the clipboard, by keyboard alone';

export async function flow(
  { page, input, panel, refusals, openFile, run, answerAll, clipboard, picture },
  folder,
) {
  const data = path.join(folder, 'firings-april.csv');
  const before = await readFile(data);
  await openFile('firings-april.csv');
  await run('Weighbeam: Compare groups…');

  // The questions name their file and what was taken of it.
  await page.getByText('firings-april.csv ·').waitFor();
  await picture('question');
  await answerAll();
  await picture('panel');
  assert.ok(await panel.getByRole('img').first().isVisible(), 'the figure is drawn');
  assert.ok((await panel.locator('table').count()) > 0, 'the numbers stand in a table');
  assert.deepEqual(refusals, [], 'the security policy of the panel refuses nothing');

  await run('Weighbeam: Copy settings block');
  await page.getByText('How were the samples taken?').waitFor();
  await input.fill('3 tiles a firing, places by lot');
  await page.keyboard.press('Enter');
  await page.getByText('Who did the analysis?').waitFor();
  await page.keyboard.press('Enter');
  await page.getByText('The settings block is on the clipboard').first().waitFor();
  const copied = await clipboard();
  assert.match(copied, /# weighbeam settings block, format 1\n/);
  assert.match(copied, /sampling = "3 tiles a firing, places by lot"/);

  // Whoever finds the block in a notebook gets the same numbers from the same file.
  await writeFile(path.join(folder, 'pasted.md'), copied);
  const recheck = await command(
    process.execPath,
    [path.join(root, 'dist', 'cli.js'), 'recheck', 'pasted.md'],
    {
      cwd: folder,
    },
  );
  assert.match(recheck.output, /: same: /);
  assert.deepEqual(await readFile(data), before, 'the data file is as it was');

  // What the policy forbids is seen by this test: a style attribute, as an injected one would be.
  await panel
    .locator('h1')
    .first()
    .evaluate(heading => heading.setAttribute('style', 'color: red'));
  await page.waitForTimeout(200);
  assert.equal(refusals.length, 1);
}
