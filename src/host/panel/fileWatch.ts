import { Disposable, RelativePattern, Uri, workspace } from 'vscode';
import { lastPart } from '../files/root';
import type { FileState } from './notices';

/** Tells what befalls files: on the disk, by a rename within the editor, and in an editor's text. */
export function watchFiles(
  files: readonly Uri[],
  onState: (state: FileState) => void,
  onRenamed: (from: Uri, to: Uri) => void,
): Disposable {
  const isOurs = (uri: Uri): boolean => files.some(file => file.toString() === uri.toString());
  const watchers = files.map(file => {
    const watcher = workspace.createFileSystemWatcher(
      new RelativePattern(Uri.joinPath(file, '..'), lastPart(file)),
    );
    watcher.onDidChange(() => onState('changed'));
    watcher.onDidCreate(() => onState('changed'));
    watcher.onDidDelete(() => onState('gone'));
    return watcher;
  });
  return Disposable.from(
    ...watchers,
    workspace.onDidRenameFiles(({ files: renamed }) => {
      for (const { oldUri, newUri } of renamed) if (isOurs(oldUri)) onRenamed(oldUri, newUri);
    }),
    workspace.onDidChangeTextDocument(({ document, contentChanges }) => {
      if (contentChanges.length > 0 && document.isDirty && isOurs(document.uri)) onState('edited');
    }),
  );
}
