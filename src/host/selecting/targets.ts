import { TabInputCustom, TabInputText, Uri, window, type TextEditor } from 'vscode';
import type { TextSpan } from '../../protocol/files';

/** What a command was asked to compare: files, and what is selected in the text of the only one. */
export interface Targets {
  readonly files: readonly Uri[];
  readonly spans: readonly TextSpan[];
}

/**
 * Reads the arguments that menus hand on: the Explorer gives the file clicked and all that are selected, an editor's
 * menus give its file, the palette gives nothing (the active editor, or the file behind a custom viewer's tab). null:
 * there is nothing to compare yet.
 */
export function targetsOf(first: unknown, second: unknown): Targets | null {
  const selected = urisOf(second);
  if (selected.length > 0) return { files: selected, spans: [] };
  const uri = first instanceof Uri ? first : activeUri();
  if (uri === null) return null;
  const editor = editorOf(uri);
  return { files: [uri], spans: editor === undefined ? [] : spansOf(editor) };
}

/** The file of the active tab, also where it is shown by a viewer or is too large for a text editor. */
export function activeUri(): Uri | null {
  const input = window.tabGroups.activeTabGroup.activeTab?.input;
  if (input instanceof TabInputText || input instanceof TabInputCustom) return input.uri;
  return window.activeTextEditor?.document.uri ?? null;
}

function editorOf(uri: Uri): TextEditor | undefined {
  const active = window.activeTextEditor;
  const editors = active === undefined ? window.visibleTextEditors : [active, ...window.visibleTextEditors];
  return editors.find(editor => editor.document.uri.toString() === uri.toString());
}

const urisOf = (value: unknown): readonly Uri[] =>
  Array.isArray(value) && value.every(item => item instanceof Uri) ? value : [];

const spansOf = (editor: TextEditor): readonly TextSpan[] =>
  editor.selections.map(({ start, end }) => ({
    startLine: start.line,
    startCharacter: start.character,
    endLine: end.line,
    endCharacter: end.character,
  }));
