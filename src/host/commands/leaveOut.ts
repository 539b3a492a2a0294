import { l10n, window } from 'vscode';
import type { Host } from '../host';
import { documentOf } from '../files/openedFile';
import { offerToLeaveOut } from '../panel/panelActions';
import type { Command } from './command';

/** Leaves out the row under the cursor of the file that the comparison in front is about. */
export const leaveOut = ({ panels }: Host): Command => ({
  id: 'weighbeam.leaveOut',
  async execute() {
    const comparison = panels.current;
    const editors = window.visibleTextEditors;
    for (const [file, uri] of (comparison?.subject.files ?? []).entries()) {
      const document = documentOf(uri);
      const editor = editors.find(({ document: shown }) => shown === document);
      if (comparison === null || editor === undefined) continue;
      await offerToLeaveOut(comparison, { file, line: editor.selection.active.line + 1, field: 0 });
      return;
    }
    void window.showInformationMessage(l10n.t('Put the cursor into the row of the compared file first.'));
  },
});
