import { l10n, Uri, window, workspace } from 'vscode';
import { lastPart } from '../files/root';

const MOST_LISTED = 200;

/** Lets the person pick a CSV file of the workspace or any other; null when they gave up. */
export async function chooseFile(): Promise<Uri | null> {
  const found = await workspace.findFiles('**/*.{csv,tsv,tab}', undefined, MOST_LISTED);
  const items = found
    .sort((a, b) => a.path.localeCompare(b.path))
    .map(uri => ({
      label: lastPart(uri),
      description: workspace.asRelativePath(Uri.joinPath(uri, '..')),
      uri,
    }));
  const elsewhere = { label: l10n.t('Another file…'), description: '', uri: null };
  const picked =
    items.length === 0
      ? elsewhere
      : await window.showQuickPick([...items, elsewhere], {
          title: l10n.t('Which file holds the measurements?'),
          placeHolder: l10n.t(
            'In an open file, select the rows to compare first, or nothing for the whole table',
          ),
        });
  if (picked === undefined) return null;
  if (picked.uri !== null) return picked.uri;
  const chosen = await window.showOpenDialog({
    title: l10n.t('Which file holds the measurements?'),
    filters: { [l10n.t('Tables')]: ['csv', 'tsv', 'tab', 'txt'] },
  });
  return chosen?.[0] ?? null;
}
