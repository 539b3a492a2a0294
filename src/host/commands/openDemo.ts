import { commands, FileType, l10n, Uri, window, workspace, ViewColumn } from 'vscode';
import type { Host } from '../host';
import type { Command } from './command';

/** Copies the demo into a folder of the person's choice, or one of ours, and opens its data beside its notebook. */
export const openDemo = ({ context }: Host): Command => ({
  id: 'weighbeam.openDemo',
  async execute(folder?: unknown) {
    const target = folder instanceof Uri ? folder : await chooseFolder(context.globalStorageUri);
    if (target === undefined) return;
    const demo = Uri.joinPath(target, 'weighbeam-demo');
    await copyNew(Uri.joinPath(context.extensionUri, 'media', 'demo'), demo);
    const notebook = await workspace.openTextDocument(Uri.joinPath(demo, 'notes', 'kiln-notebook.md'));
    await window.showTextDocument(notebook, { viewColumn: ViewColumn.One, preview: false });
    const data = await workspace.openTextDocument(Uri.joinPath(demo, 'firings-april.csv'));
    await window.showTextDocument(data, { viewColumn: ViewColumn.One, preview: false });
    await commands.executeCommand('revealInExplorer', data.uri).then(undefined, () => undefined);
  },
});

async function chooseFolder(own: Uri): Promise<Uri | undefined> {
  const here = workspace.workspaceFolders?.[0];
  const items = [
    ...(here === undefined
      ? []
      : [{ label: l10n.t('In this workspace'), description: here.name, uri: here.uri }]),
    { label: l10n.t('In another folder…'), description: '', uri: null },
    {
      label: l10n.t('In a folder of the extension'),
      description: l10n.t('Nothing is added to your own folders'),
      uri: own,
    },
  ];
  const picked = await window.showQuickPick(items, {
    title: l10n.t('Where should the copy of the demo go?'),
  });
  if (picked === undefined || picked.uri !== null) return picked?.uri;
  const folders = await window.showOpenDialog({
    canSelectFiles: false,
    canSelectFolders: true,
    openLabel: l10n.t('Copy here'),
  });
  return folders?.[0];
}

/** Copies a folder file by file; what is already there stays as it is, so that nobody's edits are lost. */
async function copyNew(from: Uri, to: Uri): Promise<void> {
  await workspace.fs.createDirectory(to);
  for (const [name, type] of await workspace.fs.readDirectory(from)) {
    const [source, target] = [Uri.joinPath(from, name), Uri.joinPath(to, name)];
    if (type === FileType.Directory) await copyNew(source, target);
    else await workspace.fs.copy(source, target, { overwrite: false }).then(undefined, () => undefined);
  }
}
