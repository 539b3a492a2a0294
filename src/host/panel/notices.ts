import { l10n } from 'vscode';
import type { Notice } from '../../protocol/toPanel';
import { lastPart } from '../files/root';
import type { FileState } from './fileState';
import type { Shown } from './shown';
import type { Subject } from './subject';

/** What the reader of the numbers must know before using them, most pressing first. */
export function noticesFor(shown: Shown | null, state: FileState, { files }: Subject): readonly Notice[] {
  const notices: Notice[] = [];
  const uri = state.kind === 'as computed' ? undefined : files[state.file];
  const name = uri === undefined ? '' : lastPart(uri);
  const runAgain = { id: 'runAgain', label: l10n.t('Run again') } as const;
  const saveAndRunAgain = { id: 'saveAndRunAgain', label: l10n.t('Save and run again') } as const;
  switch (state.kind) {
    case 'changed':
      notices.push({
        text: l10n.t('{0} has changed since these numbers were computed.', name),
        action: runAgain,
      });
      break;
    case 'edited':
      notices.push({
        text: l10n.t('The text of {0} in the editor has changed since these numbers were computed.', name),
        action: saveAndRunAgain,
      });
      break;
    case 'gone':
      notices.push({
        text:
          (shown?.view ?? null) === null
            ? l10n.t('{0} is gone.', name)
            : l10n.t('{0} is gone; these numbers were computed before that.', name),
        action: { id: 'chooseFile', label: l10n.t('Choose the file…') },
      });
      break;
    case 'as computed':
      if (shown?.unsaved === true) {
        notices.push({
          text: l10n.t(
            'Computed from the text in the editor, which is not saved. No settings block is made of it.',
          ),
          action: saveAndRunAgain,
        });
      }
  }
  if (shown?.restarted === true) {
    notices.push({
      text: l10n.t('The calculation had stopped unexpectedly; it was started again.'),
      action: null,
    });
  }
  return notices;
}
