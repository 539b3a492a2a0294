import { Disposable, RelativePattern, Uri, workspace } from 'vscode';
import { lastPart } from '../files/root';

/**
 * Tells when files may no longer be as they were: changed, made or deleted on the disk, or edited in a text editor; and
 * where they went when they, or a folder that holds them, were renamed within the editor.
 */
export function watchFiles(
  files: readonly Uri[],
  onTouched: () => void,
  onRenamed: (index: number, to: Uri) => void,
): Disposable {
  const watchers = files.map(file => {
    const watcher = workspace.createFileSystemWatcher(
      new RelativePattern(Uri.joinPath(file, '..'), lastPart(file)),
    );
    watcher.onDidChange(onTouched);
    watcher.onDidCreate(onTouched);
    watcher.onDidDelete(onTouched);
    return watcher;
  });
  return Disposable.from(
    ...watchers,
    workspace.onDidRenameFiles(({ files: renamed }) => {
      for (const { oldUri, newUri } of renamed) {
        files.forEach((file, index) => {
          const to = movedWith(file, oldUri, newUri);
          if (to !== null) onRenamed(index, to);
        });
      }
    }),
    workspace.onDidChangeTextDocument(({ document, contentChanges }) => {
      if (contentChanges.length === 0) return;
      if (files.some(file => file.toString() === document.uri.toString())) onTouched();
    }),
  );
}

/** Where a file is after something was renamed; null where that was neither the file nor a folder around it. */
function movedWith(file: Uri, from: Uri, to: Uri): Uri | null {
  if (file.toString() === from.toString()) return to;
  const isWithin = file.scheme === from.scheme && file.authority === from.authority;
  const folder = `${from.path}/`;
  if (!isWithin || !file.path.startsWith(folder)) return null;
  return Uri.joinPath(to, file.path.slice(folder.length));
}
