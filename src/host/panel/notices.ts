import { l10n } from 'vscode';
import type { Notice } from '../../protocol/toPanel';
import { lastPart } from '../files/root';
import type { Shown } from './shown';
import type { Subject } from './subject';

/** What befell the files since the numbers were computed. */
export type FileState = 'as computed' | 'changed' | 'edited' | 'gone';

/** What the reader of the numbers must know before using them, most pressing first. */
export function noticesFor(shown: Shown | null, state: FileState, { files }: Subject): readonly Notice[] {
  const name = files.map(lastPart).join(', ');
  const notices: Notice[] = [];
  if (shown?.unsaved === true) {
    notices.push({
      text: l10n.t(
        'Computed from the text in the editor, which is not saved. No settings block is made of it.',
      ),
      action: { id: 'saveAndRunAgain', label: l10n.t('Save and run again') },
    });
  }
  const runAgain = { id: 'runAgain', label: l10n.t('Run again') } as const;
  switch (state) {
    case 'changed':
      notices.push({
        text: l10n.t('{0} has changed since these numbers were computed.', name),
        action: runAgain,
      });
      break;
    case 'edited':
      if (shown?.unsaved !== true) {
        notices.push({
          text: l10n.t('The text of {0} in the editor has changed since these numbers were computed.', name),
          action: { id: 'saveAndRunAgain', label: l10n.t('Save and run again') },
        });
      }
      break;
    case 'gone':
      notices.push({
        text: l10n.t('{0} is gone; these numbers were computed before that.', name),
        action: { id: 'chooseFile', label: l10n.t('Choose the file…') },
      });
      break;
    case 'as computed':
      break;
  }
  if (shown?.restarted === true) {
    notices.push({
      text: l10n.t('The calculation had stopped unexpectedly; it was started again.'),
      action: null,
    });
  }
  return notices;
}
