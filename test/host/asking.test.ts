import assert from 'node:assert/strict';
import * as vscode from 'vscode';
import { long, wide } from './data';
import { closeAll, compareByEnter, escape, open, panels, read, until, weighbeam, write } from './editor';

const accept = () => vscode.commands.executeCommand('workbench.action.acceptSelectedQuickOpenItem');

suite('the command', () => {
  teardown(closeAll);

  test('compares the groups of long data, with Enter at every question', async () => {
    const uri = await write('asked-long.csv', long);
    await open(uri);
    const { numbers, request, problem } = await compareByEnter();
    assert.equal(problem, null);
    assert.deepEqual(request.measured, ['density (g/cm3)']);
    assert.equal(request.label, 'kiln');
    assert.equal((numbers?.['chosen'] as { id: string }).id, 'separate-t');
  });

  test('compares the columns of wide data, with Enter at every question', async () => {
    const uri = await write('asked-wide.csv', wide);
    await open(uri);
    const { request, problem } = await compareByEnter();
    assert.equal(problem, null);
    assert.deepEqual(request.columns, ['east (g/cm3)', 'west (g/cm3)']);
  });

  test('opens the panel beside the file and leaves the focus where it was', async () => {
    const uri = await write('beside.csv', long);
    await open(uri);
    await compareByEnter();
    await until('the panel is open', () => panels().length === 1);
    assert.equal(vscode.window.activeTextEditor?.document.uri.toString(), uri.toString());
    assert.equal(vscode.window.tabGroups.all.length, 2);
  });

  test('takes the rows that are selected, and no other', async () => {
    const uri = await write('selected.csv', long);
    const editor = await open(uri);
    editor.selections = [new vscode.Selection(2, 0, 5, 3), new vscode.Selection(7, 0, 10, 3)];
    const { request } = await compareByEnter();
    assert.deepEqual(request.rows, [
      [3, 6],
      [8, 11],
    ]);
  });

  for (const answered of [0, 1, 2]) {
    test(`leaves nothing behind when Escape is pressed after ${answered} answers`, async () => {
      const api = await weighbeam();
      const uri = await write('escaped.csv', long);
      await open(uri);
      const before = api.lastShown();
      const running = Promise.resolve(vscode.commands.executeCommand('weighbeam.compare'));
      const seen = new Set<string>();
      while (seen.size <= answered) {
        const step = await until('a further question is open', () => {
          const open = api.openStep();
          return open !== null && !seen.has(open.id) && open;
        });
        seen.add(step.id);
        // The question is known a moment before its box takes an answer.
        await until('the answer is taken', async () => {
          if (seen.size > answered || api.openStep()?.id !== step.id) return true;
          await accept();
          return false;
        });
      }
      await escape(running);
      assert.deepEqual(panels(), []);
      assert.equal(api.lastShown(), before);
      assert.equal(await read(uri), long);
    });
  }

  test('takes the file that is clicked in the Explorer, open or not', async () => {
    const uri = await write('clicked.csv', long);
    const { request, problem } = await compareByEnter(uri, [uri]);
    assert.equal(problem, null);
    assert.deepEqual(request.files, ['clicked.csv']);
  });

  test('takes two files selected in the Explorer as one group each', async () => {
    const east = await write('east.csv', 'density (g/cm3)\n2.31\n2.35\n2.29\n2.34\n');
    const west = await write('west.csv', 'density (g/cm3)\n2.27\n2.30\n2.24\n2.28\n');
    const { numbers, problem } = await compareByEnter(east, [east, west]);
    assert.equal(problem, null);
    const labels = (numbers?.['groups'] as readonly { label: string }[]).map(({ label }) => label);
    assert.deepEqual(labels, ['east.csv', 'west.csv']);
  });
});
