import type { DiagnosticCollection } from 'vscode';
import type { PanelManager } from './panel/panelManager';
import type { Services } from './services';

/** What commands work with. */
export interface Host extends Services {
  readonly panels: PanelManager;
  readonly diagnostics: DiagnosticCollection;
}
