import { l10n, window } from 'vscode';
import type { Host } from '../host';
import { offerToLeaveOut } from '../panel/panelActions';
import type { Command } from './command';

/** Leaves out the row under the cursor of the file that the comparison in front is about, the active editor first. */
export const leaveOut = ({ panels }: Host): Command => ({
  id: 'weighbeam.leaveOut',
  async execute() {
    const comparison = panels.current;
    const active = window.activeTextEditor;
    const editors = active === undefined ? window.visibleTextEditors : [active, ...window.visibleTextEditors];
    const compared = (comparison?.subject.files ?? []).map(String);
    for (const { document, selection } of editors) {
      const file = compared.indexOf(document.uri.toString());
      if (comparison === null || file < 0) continue;
      await offerToLeaveOut(comparison, { file, line: selection.active.line + 1, field: 0 });
      return;
    }
    void window.showInformationMessage(l10n.t('Put the cursor into the row of the compared file first.'));
  },
});
