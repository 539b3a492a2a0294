import assert from 'node:assert/strict';
import * as vscode from 'vscode';
import { long } from './data';
import {
  closeAll,
  compare,
  compareByEnter,
  open,
  panels,
  until,
  weighbeam,
  workspaceUri,
  write,
} from './editor';
import { MemoryFiles } from './memoryFiles';

const request = { measured: ['density (g/cm3)'], label: 'kiln', per: 'none' };
const other = long.replace('2.31', '2.91');

/** Types at the start of a line, without saving. */
async function edit(uri: vscode.Uri, line: number, text: string): Promise<void> {
  const editor = await open(uri);
  await editor.edit(change => change.insert(new vscode.Position(line, 0), text));
}

suite('the files of a comparison', () => {
  teardown(async () => {
    await vscode.commands.executeCommand('workbench.action.files.revert');
    await closeAll();
  });

  test('are told apart by what they hold, also where another text was open under the same name', async () => {
    const seen = [];
    for (const content of [long, other]) {
      const document = await vscode.workspace.openTextDocument({ language: 'csv', content });
      await vscode.window.showTextDocument(document);
      seen.push({ uri: document.uri.toString(), numbers: (await compare(document.uri, request)).numbers });
      await vscode.window.showTextDocument(document);
      await vscode.commands.executeCommand('workbench.action.revertAndCloseActiveEditor');
      await closeAll();
    }
    const [first, second] = seen;
    assert.equal(first?.uri, second?.uri, 'the editor gives the name anew');
    assert.notDeepEqual(first?.numbers, second?.numbers);
  });

  test('are told apart by what they hold where a file system does not tell when they changed', async () => {
    const files = new MemoryFiles();
    const registered = vscode.workspace.registerFileSystemProvider('weighbeam-still', files);
    try {
      const uri = vscode.Uri.parse('weighbeam-still:/kilns/density.csv');
      files.put(uri, long);
      const before = await compare(uri, request);
      files.put(uri, other);
      assert.notDeepEqual((await compare(uri, request)).numbers, before.numbers);
    } finally {
      registered.dispose();
    }
  });

  test('may grow lines: a row left out is found again on its new line, and undo knows it there', async () => {
    const uri = await write('grown.csv', long);
    const all = await compare(uri, request);
    const leaveOut = [{ file: 0, line: 3, reason: 'chipped', afterResult: true }];
    const without = await compare(uri, { ...request, leaveOut });
    await write('grown.csv', long.replace('east,2.31', ',\neast,2.31'));
    const api = await weighbeam();
    const again = await compare(uri, request);
    assert.match(again.blockText ?? '', /^line = 4$/m);
    const chosen = (shown: typeof again | null) => shown?.numbers?.['chosen'];
    assert.deepEqual(chosen(again), chosen(without));
    await vscode.commands.executeCommand('weighbeam.undo');
    assert.deepEqual(chosen(api.lastShown()), chosen(all));
    await vscode.commands.executeCommand('weighbeam.redo');
    assert.deepEqual(chosen(api.lastShown()), chosen(without));
    await write('grown.csv', long.replace('east,2.35\n', ''));
    const { problem } = await compare(uri, request);
    assert.equal(problem?.code, 'left-out-row-gone');
    assert.match(problem.message, /chipped/);
  });

  test('keep the name they have now when something is undone', async () => {
    const uri = await write('named.csv', long);
    await compare(uri, request);
    await compare(uri, { ...request, confidence: 0.99 });
    const renamed = vscode.Uri.joinPath(uri, '..', `renamed-${Date.now()}.csv`);
    const change = new vscode.WorkspaceEdit();
    change.renameFile(uri, renamed);
    await vscode.workspace.applyEdit(change);
    const name = renamed.path.split('/').at(-1) ?? '';
    const api = await weighbeam();
    const says = (text: string) => api.lastShown()?.blockText?.includes(text) === true;
    await until('the panel has followed', () => says(`file = "${name}"`));
    await vscode.commands.executeCommand('weighbeam.undo');
    assert.ok(says(`file = "${name}"`), api.lastShown()?.problem?.message);
    assert.ok(says('confidence = 0.95'));
    await vscode.commands.executeCommand('weighbeam.redo');
    assert.ok(says('confidence = 0.99'));
  });

  test('are followed when their folder is renamed', async () => {
    const uri = await write(`box-${Date.now()}/inside.csv`, long);
    await compare(uri, request);
    const folder = vscode.Uri.joinPath(uri, '..');
    const crate = `crate-${Date.now()}`;
    const change = new vscode.WorkspaceEdit();
    change.renameFile(folder, vscode.Uri.joinPath(workspaceUri(), crate));
    await vscode.workspace.applyEdit(change);
    const api = await weighbeam();
    await until(
      'the panel has followed',
      () => api.lastShown()?.blockText?.includes(`file = "${crate}/inside.csv"`) === true,
    );
  });

  test('are named one by one: the one that is gone is said to be', async () => {
    const [east, west] = [
      await write('east.csv', 'density\n2.31\n2.35\n2.29\n'),
      await write('west.csv', 'density\n2.27\n2.30\n2.24\n'),
    ];
    await compareByEnter(east, [east, west]);
    const api = await weighbeam();
    await until('the loss is noticed', async () => {
      await vscode.workspace.fs.delete(west).then(undefined, () => undefined);
      return api.notices().some(text => text.startsWith('west.csv is gone'));
    });
  });

  test('are looked at again after they were computed: a stale warning is withdrawn', async () => {
    const uri = await write('stale.csv', long);
    await compare(uri, request);
    const api = await weighbeam();
    await edit(uri, 1, 'east,2.40\n');
    await until('the edit is noticed', () => api.notices().some(text => text.includes('in the editor')));
    await vscode.commands.executeCommand('undo');
    await until('and its withdrawal', () => api.notices().length === 0);
  });

  test('that are not there are said to be gone, with a way to choose them, also from the beginning', async () => {
    const uri = vscode.Uri.joinPath(workspaceUri(), 'never-there.csv');
    const { problem } = await compare(uri, request);
    assert.equal(problem?.code, 'file-not-found');
    const api = await weighbeam();
    await until('it is said', () => api.notices().includes('never-there.csv is gone.'));
  });

  test('that are being edited are rechecked as they are stored', async () => {
    const uri = await write('stored.csv', long);
    const notebook = await write('stored.md', '# Kilns\n');
    await compare(uri, request);
    await vscode.commands.executeCommand('weighbeam.addToNotebook', notebook, { sampling: '', analyst: '' });
    await edit(uri, 1, 'east,9.99\n');
    const outcomes = await vscode.commands.executeCommand<readonly { kind: string }[]>(
      'weighbeam.recheckNotebook',
      notebook,
    );
    assert.deepEqual(
      outcomes.map(({ kind }) => kind),
      ['same'],
    );
  });

  test('that are stored in an old encoding are read as the editor shows them while they are edited', async () => {
    const uri = vscode.Uri.joinPath(workspaceUri(), 'encoded.csv');
    const umlaut = long.replaceAll('west', 'süd');
    await vscode.workspace.fs.writeFile(
      uri,
      Uint8Array.from(umlaut, letter => letter.charCodeAt(0)),
    );
    const asked = { ...request, wish: { encoding: 'windows-1252' }, test: 'süd', reference: 'east' };
    const stored = await compare(uri, asked);
    assert.equal(stored.problem, null);
    const text = await write('unicode.csv', umlaut);
    await edit(text, 1, '\n');
    const unsaved = await compare(text, asked);
    assert.equal(unsaved.problem, null);
    assert.equal(unsaved.unsaved, true);
    assert.deepEqual(unsaved.numbers?.['chosen'], stored.numbers?.['chosen']);
  });
});

suite('the panel that commands are about', () => {
  teardown(closeAll);

  test('is the one used last when the one in front is closed', async () => {
    const api = await weighbeam();
    const uris = [];
    for (const [index, name] of ['first', 'second', 'third'].entries())
      uris.push(await write(`${name}.csv`, long.replace('2.31', `2.5${index}`)));
    const [first, second, third] = uris;
    assert.ok(first && second && third);
    for (const uri of [first, second, third]) await compare(uri, request);
    const wanted = await compare(second, request);
    await compare(first, request);
    const front = vscode.window.tabGroups.all
      .flatMap(group => group.tabs)
      .find(tab => tab.label === 'Comparison: first.csv');
    assert.ok(front);
    await vscode.window.tabGroups.close(front);
    await until('it is closed', () => panels().length === 2);
    assert.deepEqual(api.lastShown()?.numbers, wanted.numbers);
  });

  test('computes typed numbers anew when something else is asked of them', async () => {
    const uri = await write('typed.csv', long);
    const typed = [
      { label: 'east', n: 12, mean: 2.31, sd: 0.02 },
      { label: 'west', n: 12, mean: 2.27, sd: 0.03 },
    ];
    for (const confidence of [0.95, 0.99]) {
      const { numbers } = await compare(uri, { typed, confidence });
      assert.equal((numbers?.['chosen'] as { confidence?: number } | undefined)?.confidence, confidence);
    }
  });
});
