import assert from 'node:assert/strict';
import * as vscode from 'vscode';
import { long } from './data';
import { closeAll, compare, panels, until, weighbeam, workspaceUri, write } from './editor';
import { MemoryFiles } from './memoryFiles';

const request = { measured: ['density (g/cm3)'], label: 'kiln' };

suite('the extension', () => {
  teardown(closeAll);

  test('registers every command of its manifest', async () => {
    await weighbeam();
    const extension = vscode.extensions.getExtension('weighbeam.weighbeam');
    const { contributes } = extension?.packageJSON as {
      contributes: { commands: readonly { command: string }[] };
    };
    const registered = await vscode.commands.getCommands(true);
    assert.deepEqual(
      contributes.commands.filter(({ command }) => !registered.includes(command)),
      [],
    );
  });

  test('shows in the panel why there is no number, and what to do', async () => {
    const { problem, view, blockText } = await compare(
      await write('header-only.csv', 'kiln,density (g/cm3)\n'),
      request,
    );
    assert.equal(problem?.code, 'file-header-only');
    assert.ok(problem.fix);
    assert.equal(view, null);
    assert.equal(blockText, null);
    await until('the panel is open', () => panels().length === 1);
  });

  test('refuses a request it does not understand instead of passing it over', async () => {
    const api = await weighbeam();
    const before = api.lastShown();
    await vscode.commands.executeCommand('weighbeam.compare', await write('odd.csv', long), {
      mesured: ['density'],
    });
    assert.equal(api.lastShown(), before);
    assert.deepEqual(panels(), []);
  });

  test('reads files of a file system that is no disk', async () => {
    const files = new MemoryFiles();
    const registered = vscode.workspace.registerFileSystemProvider('weighbeam-memory', files);
    try {
      const uri = vscode.Uri.parse('weighbeam-memory:/kilns/density.csv');
      files.put(uri, long);
      const virtual = await compare(uri, request);
      const onDisk = await compare(await write('density.csv', long), request);
      assert.equal(virtual.problem, null);
      assert.deepEqual(virtual.numbers?.['chosen'], onDisk.numbers?.['chosen']);
    } finally {
      registered.dispose();
    }
  });

  test('starts its worker again after it has died, and says so only when a calculation was lost', async () => {
    const uri = await write('worker.csv', long);
    const before = await compare(uri, request);
    (await weighbeam()).endWorker();
    const after = await compare(uri, request);
    assert.deepEqual(after.numbers, before.numbers);
    assert.equal(after.restarted, false, 'no calculation was lost');
  });

  test('takes up the panel that a comparison has already', async () => {
    const uri = await write('again.csv', long);
    await compare(uri, request);
    await compare(uri, { ...request, confidence: 0.99 });
    await until('one panel is open', () => panels().length === 1);
  });

  test('opens a copy of the demo and keeps what is there', async () => {
    const folder = vscode.Uri.joinPath(workspaceUri(), 'demo here');
    await vscode.commands.executeCommand('weighbeam.openDemo', folder);
    const name = vscode.window.activeTextEditor?.document.uri.path ?? '';
    assert.match(name, /\/demo here\/weighbeam-demo\/.+\.csv$/);
    const shown = vscode.window.tabGroups.all.flatMap(group => group.tabs).map(tab => tab.label);
    assert.ok(shown.includes('kiln-notebook.md'), shown.join());
    await write('demo here/weighbeam-demo/notes/kiln-notebook.md', 'mine\n');
    await vscode.commands.executeCommand('weighbeam.openDemo', folder);
    const notebook = vscode.Uri.joinPath(folder, 'weighbeam-demo', 'notes', 'kiln-notebook.md');
    assert.equal(new TextDecoder().decode(await vscode.workspace.fs.readFile(notebook)), 'mine\n');
  });
});
