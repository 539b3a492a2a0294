import assert from 'node:assert/strict';
import * as vscode from 'vscode';
import { long } from './data';
import { closeAll, commandLine, compare, open, read, weighbeam, write } from './editor';

const request = { measured: ['density (g/cm3)'], label: 'kiln', per: 'none' };
const stated = { sampling: 'drawn by lot', analyst: 'R. Kolb' };

suite('the settings block', () => {
  teardown(closeAll);

  test('is copied to the clipboard as the panel holds it, inside a fence', async () => {
    const { blockText } = await compare(await write('copied.csv', long), request);
    assert.ok(blockText);
    await vscode.commands.executeCommand('weighbeam.copyBlock', stated);
    const copied = await vscode.env.clipboard.readText();
    assert.match(copied, /^```toml\n# weighbeam settings block, format 1\n/);
    assert.match(copied, /\n# end of settings block\n```\n?$/);
    assert.match(copied, /\nsampling = "drawn by lot"\n/);
    const result = /\n\[result\]\n.*?\n\n?\[record\]/s;
    assert.equal(result.exec(copied)?.[0], result.exec(blockText)?.[0]);
  });

  test('says the same again on the command line, and something else once a cell has changed', async () => {
    const uri = await write('rechecked.csv', long);
    await compare(uri, request);
    await vscode.commands.executeCommand('weighbeam.copyBlock', stated);
    await write('rechecked.md', `Kilns\n\n${await vscode.env.clipboard.readText()}`);
    const before = await commandLine('recheck', 'rechecked.md');
    assert.equal(before.code, 0, before.output);
    assert.match(before.output, /^rechecked\.md:\d+: same: /);
    await write('rechecked.csv', long.replace('2.31', '2.32'));
    const after = await commandLine('recheck', 'rechecked.md');
    assert.equal(after.code, 1, after.output);
    assert.match(after.output, /: moved: /);
  });

  test('is added to a notebook, where the editor rechecks it', async () => {
    const uri = await write('added.csv', long);
    const notebook = await write('added.md', '# Kilns\n');
    await compare(uri, request);
    await vscode.commands.executeCommand('weighbeam.addToNotebook', notebook, stated);
    const document = await vscode.workspace.openTextDocument(notebook);
    assert.match(document.getText(), /^# Kilns\n\n.+```toml\n# weighbeam settings block/s);
    assert.equal(await read(notebook), '# Kilns\n', 'nothing is saved for the person');
    const same = await vscode.commands.executeCommand<readonly { kind: string }[]>(
      'weighbeam.recheckNotebook',
      notebook,
    );
    assert.deepEqual(
      same.map(({ kind }) => kind),
      ['same'],
    );
    assert.deepEqual(vscode.languages.getDiagnostics(notebook), []);

    await write('added.csv', long.replace('2.31', '2.32'));
    const moved = await vscode.commands.executeCommand<readonly { kind: string }[]>(
      'weighbeam.recheckNotebook',
      notebook,
    );
    assert.deepEqual(
      moved.map(({ kind }) => kind),
      ['moved'],
    );
    const [mark] = vscode.languages.getDiagnostics(notebook);
    assert.equal(mark?.source, 'Weighbeam');
    await document.save();
  });

  test('is not handed out for text that is not saved, until it is', async () => {
    const uri = await write('unsaved.csv', long);
    const editor = await open(uri);
    await editor.edit(edit => edit.insert(new vscode.Position(11, 0), 'west,2.25\n'));
    const shown = await compare(uri, request);
    assert.equal(shown.unsaved, true);
    assert.equal(shown.blockText, null);
    assert.equal((shown.numbers?.['groups'] as readonly { n: number }[])[1]?.n, 6);
    assert.equal(await read(uri), long);
    await editor.document.save();
    assert.ok((await compare(uri, request)).blockText);
  });

  test('marks what was changed after a result was seen, and undo takes it back', async () => {
    const uri = await write('changed.csv', long.replace('2.31', '2.315'));
    const first = await compare(uri, request);
    const second = await compare(uri, { ...request, confidence: 0.9 });
    assert.match(second.blockText ?? '', /\[\[changed\]\]\nkey = "confidence"\nfrom = 0\.95\nto = 0\.9\n/);
    await vscode.commands.executeCommand('weighbeam.undo');
    const third = (await weighbeam()).lastShown();
    assert.deepEqual(third?.numbers, first.numbers);
    assert.doesNotMatch(third.blockText ?? '[[changed]]', /\[\[changed\]\]/);
  });

  test('comes from a calculation that never writes to the data file', async () => {
    const uri = await write('untouched.csv', long);
    const { mtime } = await vscode.workspace.fs.stat(uri);
    await compare(uri, request);
    await vscode.commands.executeCommand('weighbeam.copyBlock', stated);
    assert.equal((await vscode.workspace.fs.stat(uri)).mtime, mtime);
    assert.equal(await read(uri), long);
  });
});
