import assert from 'node:assert/strict';
import * as vscode from 'vscode';
import { long } from './data';
import { closeAll, compareByEnter, open, takenBy, until, write } from './editor';

const select = (...ends: readonly (readonly [number, number, number, number])[]) =>
  ends.map(
    ([line, character, toLine, toCharacter]) => new vscode.Selection(line, character, toLine, toCharacter),
  );

/** What is said to be taken of a file's text when this is selected in it. */
async function taken(name: string, text: string, selections: readonly vscode.Selection[]): Promise<string> {
  const editor = await open(await write(name, text));
  editor.selections = [...selections];
  return takenBy();
}

const table =
  'firing,tile,kiln,density\n1,1,east,2.31\n1,2,east,2.35\n2,1,west,2.29\n2,2,west,2.27\n3,1,east,2.33\n3,2,east,2.3\n';

suite('what is selected is said before anything is asked', () => {
  teardown(closeAll);

  const cases: readonly (readonly [string, string, readonly vscode.Selection[]])[] = [
    ['nothing: the whole table', 'all 6 rows, 4 columns', select([0, 0, 0, 0])],
    ['a part of one cell: the whole table', 'all 6 rows, 4 columns', select([2, 5, 2, 7])],
    ['one data row: the whole table', 'all 6 rows, 4 columns', select([2, 0, 2, 13])],
    ['a range: its rows with all columns', 'lines 2–5, 4 columns', select([1, 3, 4, 5])],
    ['a range that ends before a line: not that line', 'lines 2–4, 4 columns', select([1, 0, 4, 0])],
    ['a part of the header line: those columns', 'all 6 rows, columns kiln, density', select([0, 13, 0, 22])],
    [
      'several ranges: the rows and the columns they touch',
      'lines 2–3, 6–7, column density',
      select([1, 9, 1, 12], [2, 9, 2, 12], [5, 9, 5, 12], [6, 9, 6, 11]),
    ],
    [
      'a box over cells that are not aligned: the columns of any row, named',
      'lines 2–3, columns kiln, density',
      select([1, 4, 1, 12], [2, 9, 2, 12]),
    ],
  ];
  for (const [promise, says, selections] of cases) {
    test(promise, async () => {
      assert.equal(await taken('taken.csv', table, selections), `taken.csv · ${says}`);
    });
  }

  test('a quoted cell of several lines is one row, whichever of its lines is selected', async () => {
    const text =
      'kiln,note,density\neast,"first\nshelf",2.31\neast,top,2.35\nwest,"x\ny\nz",2.29\nwest,,2.27\n';
    assert.equal(await taken('lines.csv', text, select([2, 1, 3, 4])), 'lines.csv · lines 2–4, 3 columns');
  });

  test('short and long rows are taken as they are', async () => {
    const text = 'kiln,density,note\neast,2.31\neast,2.35,,,\nwest,2.29,x\nwest,2.27\n';
    assert.equal(await taken('ragged.csv', text, select([1, 0, 3, 2])), 'ragged.csv · lines 2–4, 3 columns');
  });

  test('text that was never saved to a file is read as it stands', async () => {
    const document = await vscode.workspace.openTextDocument({ content: long });
    await vscode.window.showTextDocument(document);
    assert.match(await takenBy(), / · all 10 rows, 2 columns$/);
    await vscode.commands.executeCommand('workbench.action.revertAndCloseActiveEditor');
  });

  test('a tab of a viewer stands for its file and the whole table', async () => {
    const uri = await write('viewed.csv', long);
    await vscode.commands.executeCommand('vscode.openWith', uri, 'imagePreview.previewEditor');
    await until(
      'the viewer is open',
      () => vscode.window.tabGroups.activeTabGroup.activeTab?.input instanceof vscode.TabInputCustom,
    );
    assert.equal(await takenBy(), 'viewed.csv · all 10 rows, 2 columns');
  });

  test('a file too large for the text of an editor is compared whole, from the disk', async function () {
    this.timeout(120_000);
    const row = (index: number): string =>
      `${index % 2 === 0 ? 'east' : 'west'},2.${100 + ((index * 7919) % 800)},${'kept on the shelf '.repeat(3)}\n`;
    const chunk = Array.from({ length: 1000 }, (_, index) => row(index)).join('');
    const rows = 1000 * Math.ceil(60e6 / chunk.length);
    const uri = await write('large.csv', `kiln,density,note\n${chunk.repeat(rows / 1000)}`);
    await vscode.commands.executeCommand('vscode.open', uri);
    await until('the file is open', () => {
      const input = vscode.window.tabGroups.activeTabGroup.activeTab?.input;
      return input instanceof vscode.TabInputText && input.uri.toString() === uri.toString();
    });
    const { numbers, problem } = await compareByEnter();
    assert.equal(problem, null);
    const groups = numbers?.['groups'] as readonly { n: number }[];
    assert.equal(
      groups.reduce((sum, { n }) => sum + n, 0),
      rows,
    );
    await vscode.workspace.fs.delete(uri);
  });
});
