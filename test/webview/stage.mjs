// Runs every flow of this folder, each in an editor and a copy of the demo of its own.
import { cp, mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { setTimeout } from 'node:timers/promises';
import { root } from '../../.config/command.mjs';
import { openWorkbench } from './workbench.mjs';

/** A flow file exports `promise` (what is shown to hold), `flow(workbench)`, and where needed `options` of openWorkbench. */
export default async function stage(only = '') {
  const count = { passed: 0, failed: 0 };
  for (const name of (await readdir(import.meta.dirname)).filter(file => file.endsWith(`${only}.flow.mjs`))) {
    const { promise, flow, options } = await import(`./${name}`);
    const error = await once(flow, name.replace('.flow.mjs', ''), options);
    count[error === undefined ? 'passed' : 'failed']++;
    if (error !== undefined) console.log(`✗ ${promise}\n${error.stack ?? error}\n`);
  }
  return count;
}

async function once(flow, name, options) {
  const folder = await mkdtemp(path.join(tmpdir(), 'weighbeam-flow-'));
  const workspace = path.join(folder, 'tile works');
  let workbench;
  try {
    await cp(path.join(root, 'media', 'demo'), workspace, { recursive: true });
    workbench = await openWorkbench(workspace, options);
    await Promise.race([flow(workbench, workspace), tooLate()]);
    return undefined;
  } catch (error) {
    await workbench?.picture(`${name}-failed`).catch(() => undefined);
    return error;
  } finally {
    await workbench?.close();
    await rm(folder, { recursive: true, force: true, maxRetries: 5 });
  }
}

async function tooLate() {
  await setTimeout(120_000, undefined, { ref: false });
  throw new Error('the flow did not come to its end within two minutes');
}
