import {
  FileSystemError,
  l10n,
  Position,
  Range,
  Selection,
  TextEditorRevealType,
  Uri,
  ViewColumn,
  window,
  workspace,
  WorkspaceEdit,
} from 'vscode';
import { lastPart } from '../files/root';
import type { Host } from '../host';
import { blockToHandOut, statedBy } from './blockToHandOut';
import type { Command } from './command';

const MOST_LISTED = 200;

/** Writes the fenced settings block of the panel in front at the end of a notebook, and shows it there, not yet saved. */
export const addToNotebook = (host: Host): Command => ({
  id: 'weighbeam.addToNotebook',
  async execute(first, stated) {
    const comparison = host.panels.current;
    const block = await blockToHandOut(comparison, host.context.globalState, statedBy(stated));
    if (block === null || comparison === null) return;
    const notebook = first instanceof Uri ? first : await chooseNotebook(comparison.subject.root);
    if (notebook === null) return;
    const document = await workspace.openTextDocument(notebook);
    const end = document.lineAt(document.lineCount - 1).range.end;
    const gap = document.getText().trim() === '' ? '' : end.character === 0 ? '\n' : '\n\n';
    const edit = new WorkspaceEdit();
    edit.insert(
      notebook,
      new Position(end.line, end.character),
      `${gap}${block.paragraph}\n\n${block.fenced}`,
    );
    if (!(await workspace.applyEdit(edit)))
      throw new Error(l10n.t('the editor did not let {0} be changed', lastPart(notebook)));
    const editor = await window.showTextDocument(document, { viewColumn: ViewColumn.One, preview: false });
    const added = new Position(end.line + (gap.split('\n').length - 1), 0);
    editor.selection = new Selection(added, added);
    editor.revealRange(new Range(added, added), TextEditorRevealType.AtTop);
    void window.showInformationMessage(
      l10n.t('The answer and its settings block stand at the end of {0}, not saved yet.', lastPart(notebook)),
    );
  },
});

/** The notebook that the settings name, else one of the workspace's notebooks, else one chosen elsewhere. */
async function chooseNotebook(root: Uri): Promise<Uri | null> {
  const settings = workspace.getConfiguration('weighbeam', root);
  const named = settings.get<string>('notebookFile') ?? '';
  if (named !== '') return existing(Uri.joinPath(root, named));
  const found = await workspace.findFiles(settings.get<string>('notebooks') ?? '', undefined, MOST_LISTED);
  const elsewhere = { label: l10n.t('Another file…'), description: '', uri: null };
  const items = found
    .sort((a, b) => a.path.localeCompare(b.path))
    .map(uri => ({
      label: lastPart(uri),
      description: workspace.asRelativePath(Uri.joinPath(uri, '..')),
      uri,
    }));
  const title = l10n.t('To which notebook is the settings block added?');
  const picked =
    items.length === 0 ? elsewhere : await window.showQuickPick([...items, elsewhere], { title });
  if (picked === undefined) return null;
  if (picked.uri !== null) return picked.uri;
  const chosen = await window.showOpenDialog({ title });
  return chosen?.[0] ?? null;
}

/** The file, made empty where it is not there yet. */
async function existing(uri: Uri): Promise<Uri> {
  try {
    await workspace.fs.stat(uri);
  } catch (error) {
    if (!(error instanceof FileSystemError) || error.code !== 'FileNotFound') throw error;
    await workspace.fs.writeFile(uri, new Uint8Array());
  }
  return uri;
}
