// npm run bench -- editor: how long the extension takes to wake, and an answer from the last Enter until it stands in the panel.
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { openWorkbench } from '../webview/workbench.mjs';
import { median } from './median.mjs';

const sizes = [100, 10_000, 100_000];
const REPEATS = 5;

/** Invented: two kilns in turn, densities in hundredths. */
const table = rows =>
  `kiln,density\n${Array.from({ length: rows }, (_, index) => `${index % 2 ? 'east' : 'west'},2.${10 + ((index * 7919) % 83)}\n`).join('')}`;

/**
 * Answers every question with Enter; gives the milliseconds from the last Enter to the headline in the panel, and how
 * many of them the editor took to load the page of a new panel, which no extension can hurry.
 */
async function answerMs({ page, panel, run, title, leaveQuestion }) {
  await run('Weighbeam: Compare groups…');
  for (;;) {
    await title.filter({ hasText: /\(\d+\/\d+\)/ }).waitFor();
    const said = await title.innerText();
    const [, now, of] = /\((\d+)\/(\d+)\)/.exec(said);
    if (now === of) break;
    await leaveQuestion();
  }
  const started = performance.now();
  await page.keyboard.press('Enter');
  await page.locator('iframe.webview').waitFor({ state: 'attached' });
  const opened = performance.now();
  await panel.locator('main').waitFor({ state: 'attached' });
  const loaded = performance.now();
  await panel.locator('h1').first().waitFor();
  return { whole: performance.now() - started, loading: loaded - opened };
}

async function activationMs({ page, run }) {
  await run('Developer: Show Running Extensions');
  const row = page.locator('.runtime-extensions-editor .monaco-list-row', { hasText: 'Weighbeam' });
  await row.first().waitFor();
  const said = await row.first().innerText();
  return Number(/(\d+)ms/.exec(said)?.[1] ?? NaN);
}

/** Prints one line a measurement: medians in milliseconds. */
export default async function bench() {
  const folder = await mkdtemp(path.join(tmpdir(), 'weighbeam-bench-'));
  let workbench;
  try {
    for (const rows of sizes) await writeFile(path.join(folder, `rows-${rows}.csv`), table(rows));
    workbench = await openWorkbench(folder);
    const { openFile, run, page } = workbench;
    for (const rows of sizes) {
      const times = [];
      for (let turn = 0; turn < REPEATS; turn++) {
        await openFile(`rows-${rows}.csv`);
        times.push(await answerMs(workbench));
        await run('View: Close All Editors');
        await page.locator('iframe.webview').waitFor({ state: 'detached' });
      }
      const [whole, loading] = ['whole', 'loading'].map(part => median(times.map(time => time[part])));
      console.log(
        `answer on screen, ${rows} rows: ${whole.toFixed(0)} ms, of which the editor loads the panel for ${loading.toFixed(0)} ms`,
      );
    }
    console.log(`activation: ${await activationMs(workbench)} ms, as the editor says`);
  } finally {
    await workbench?.close();
    await rm(folder, { recursive: true, force: true, maxRetries: 5 });
  }
}
