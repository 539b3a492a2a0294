import assert from 'node:assert/strict';
import * as vscode from 'vscode';
import { long } from './data';
import { closeAll, compare, panels, read, until, weighbeam, write } from './editor';

const request = { measured: ['density (g/cm3)'], label: 'kiln', per: 'none' };

/** Invented, and enough that the worker can be ended under it. */
const many = `kiln,density (g/cm3)\n${Array.from(
  { length: 400_000 },
  (_, index) => `${index % 2 ? 'east' : 'west'},${(index * 7919) % 1009}\n`,
).join('')}`;

suite('the panel', () => {
  teardown(closeAll);

  test('goes with its file when that is renamed, and with it the record', async () => {
    const uri = await write('before.csv', long);
    const first = await compare(uri, request);
    const renamed = vscode.Uri.joinPath(uri, '..', `after-${Date.now()}.csv`);
    const edit = new vscode.WorkspaceEdit();
    edit.renameFile(uri, renamed);
    await vscode.workspace.applyEdit(edit);
    const api = await weighbeam();
    const name = renamed.path.split('/').at(-1) ?? '';
    const shown = await until('the panel has followed', () => {
      const now = api.lastShown();
      return now !== null && now !== first && now.blockText?.includes(`file = "${name}"`) === true && now;
    });
    assert.deepEqual(shown.numbers?.['chosen'], first.numbers?.['chosen']);
    assert.deepEqual(panels(), [`Comparison: ${name}`]);
  });

  test('says that its file has changed, and that it is gone', async () => {
    const uri = await write('watched.csv', long);
    await compare(uri, request);
    const api = await weighbeam();
    assert.deepEqual(api.notices(), []);
    await until('the change is noticed', async () => {
      await write('watched.csv', long.replace('2.31', '2.32'));
      return api.notices().some(text => text.includes('has changed'));
    });
    await vscode.workspace.fs.delete(uri);
    await until('the loss is noticed', () => api.notices().some(text => text.includes('is gone')));
  });

  test('stands beside another one for another comparison, and each keeps its own', async () => {
    const [first, second] = [
      await write('one.csv', long),
      await write('two.csv', long.replace('2.31', '2.41')),
    ];
    const one = await compare(first, request);
    const two = await compare(second, request);
    await until('two panels are open', () => panels().length === 2);
    const again = await compare(first, request);
    assert.deepEqual(again.numbers, one.numbers);
    assert.notDeepEqual(again.numbers, two.numbers);
    assert.equal(panels().length, 2);
  });

  test('takes back what was left out, by undo and by redo', async () => {
    const uri = await write('left-out.csv', long);
    const all = await compare(uri, request);
    const without = await compare(uri, {
      ...request,
      leaveOut: [{ file: 0, line: 3, reason: 'chipped', afterResult: true }],
    });
    assert.notDeepEqual(without.numbers, all.numbers);
    assert.match(without.blockText ?? '', /\[\[left-out\]\]\nline = 3\n/);
    const api = await weighbeam();
    await vscode.commands.executeCommand('weighbeam.undo');
    assert.deepEqual(api.lastShown()?.numbers, all.numbers);
    await vscode.commands.executeCommand('weighbeam.redo');
    assert.deepEqual(api.lastShown()?.numbers, without.numbers);
    assert.equal(await read(uri), long);
  });

  test('starts a lost calculation again when the worker dies under it, and says so', async function () {
    this.timeout(60_000);
    const uri = await write('lost.csv', many);
    const api = await weighbeam();
    const running = compare(uri, request);
    await new Promise(resolve => setTimeout(resolve, 150));
    api.endWorker();
    const shown = await running;
    assert.equal(shown.problem, null);
    assert.equal(shown.restarted, true);
    assert.ok(api.notices().some(text => text.includes('stopped unexpectedly')));
  });

  test('says so when the worker dies again and again, instead of computing for ever', async function () {
    this.timeout(60_000);
    const uri = await write('dying.csv', many);
    const api = await weighbeam();
    const killing = setInterval(() => api.endWorker(), 150);
    try {
      const shown = await compare(uri, request);
      assert.equal(shown.problem?.code, 'calculation-stopped');
    } finally {
      clearInterval(killing);
    }
    assert.equal((await compare(uri, request)).problem, null, 'the next try is answered');
  });

  test('shows the last of two requests that came at once, whichever is computed first', async function () {
    this.timeout(60_000);
    const uri = await write('overtaken.csv', many);
    const overtaken = { ...request, confidence: 0.9 };
    const first = vscode.commands.executeCommand('weighbeam.compare', uri, overtaken);
    await until('the panel is open', () => panels().length === 1);
    const shown = await compare(uri, { ...request, confidence: 0.99 });
    await first;
    const api = await weighbeam();
    assert.match(shown.blockText ?? '', /^confidence = 0\.99$/m);
    assert.equal(api.lastShown(), shown, 'the one that was overtaken shows nothing later');
  });

  test('that was closed while it computed gives no answer to anybody', async () => {
    const uri = await write('closed.csv', long);
    const api = await weighbeam();
    const running = vscode.commands.executeCommand('weighbeam.compare', uri, request);
    await until('the panel is open', () => panels().length === 1);
    await vscode.commands.executeCommand('workbench.action.closeAllEditors');
    await running;
    await until('no panel is open', () => panels().length === 0);
    assert.equal(api.lastShown(), null);
  });
});
