import { l10n, Range, Selection, TextEditorRevealType, ViewColumn, window, type Uri } from 'vscode';
import type { CellRef } from '../../core/model/problem';
import type { FileInput } from '../../protocol/files';
import type { Request } from '../../compare/request';
import type { ComputeClient } from '../compute/computeClient';
import { lastPart } from './root';

interface Place {
  readonly uri: Uri;
  readonly input: FileInput;
  readonly wish: Request['wish'];
  readonly at: CellRef;
}

/** Goes to a cell in the editor of its file and selects it. */
export async function showCell(client: ComputeClient, { uri, input, wish, at }: Place): Promise<void> {
  const { line, startColumn, endColumn } = await client.ask({
    type: 'locate',
    revision: 0,
    files: [input],
    request: { wish },
    file: 0,
    line: at.line,
    field: at.field,
  });
  const range = new Range(line - 1, startColumn - 1, line - 1, endColumn - 1);
  const open = window.visibleTextEditors.find(editor => editor.document.uri.toString() === uri.toString());
  try {
    const editor = await window.showTextDocument(uri, {
      viewColumn: open?.viewColumn ?? ViewColumn.One,
      preview: false,
    });
    editor.selection = new Selection(range.start, range.end);
    editor.revealRange(range, TextEditorRevealType.InCenterIfOutsideViewport);
  } catch {
    // The editor shows no text of files this large.
    void window.showInformationMessage(
      l10n.t(
        '{0} is too large for a text editor; the cell is on line {1}, column {2}.',
        lastPart(uri),
        line,
        startColumn,
      ),
    );
  }
}
