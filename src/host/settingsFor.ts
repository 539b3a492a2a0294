import { workspace, type Uri } from 'vscode';
import type { Request } from '../compare/request';

/** What the extension's settings say of reading and of new comparisons; all of it is written into the record. */
export function settingsFor(uri: Uri | undefined): Pick<Request, 'wish' | 'confidence'> {
  const settings = workspace.getConfiguration('weighbeam', uri);
  const decimal = settings.get<string>('decimal');
  const missing = settings.get<readonly string[]>('missingWords') ?? [];
  return {
    wish: {
      ...(decimal === '.' || decimal === ',' ? { decimal } : {}),
      ...(missing.length > 0 ? { missing } : {}),
    },
    confidence: settings.get<number>('confidence') ?? 0.95,
  };
}
