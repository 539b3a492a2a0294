import { env, l10n, window } from 'vscode';
import type { Host } from '../host';
import { blockToHandOut, statedBy } from './blockToHandOut';
import type { Command } from './command';

/** Copies the settings block of the panel in front, fenced as it stands in a notebook. */
export const copyBlock = (host: Host): Command => ({
  id: 'weighbeam.copyBlock',
  async execute(stated) {
    const block = await blockToHandOut(host.panels.current, host.context.globalState, statedBy(stated));
    if (block === null) return;
    await env.clipboard.writeText(block.fenced);
    window.setStatusBarMessage(l10n.t('The settings block is on the clipboard.'), 5000);
  },
});
