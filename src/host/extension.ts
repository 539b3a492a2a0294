import { ExtensionMode, languages, window, workspace, type ExtensionContext } from 'vscode';
import { addToNotebook } from './commands/addToNotebook';
import { register } from './commands/command';
import { compare } from './commands/compare';
import { copyBlock } from './commands/copyBlock';
import { leaveOut } from './commands/leaveOut';
import { openDemo } from './commands/openDemo';
import { recheckNotebook } from './commands/recheckNotebook';
import { redo, undo } from './commands/undoRedo';
import { ComputeClient } from './compute/computeClient';
import type { Host } from './host';
import { Log } from './log';
import { viewType } from './panel/comparisonPanel';
import { PanelManager } from './panel/panelManager';
import type { Shown } from './panel/shown';
import type { OpenStep, Services } from './services';

/** What the extension's own tests see of it. */
export interface TestApi {
  /** What the panel in front shows, or showed last. */
  lastShown(): Shown | null;
  /** Ends the worker as a crash would. */
  endWorker(): void;
  /** What the panel in front says of its files. */
  notices(): readonly string[];
  /** The question that is open. */
  openStep(): OpenStep | null;
}

/** Wires the parts; everything else begins when a command or a panel asks for it. */
export function activate(context: ExtensionContext): TestApi | undefined {
  const channel = window.createOutputChannel('Weighbeam', { log: true });
  const log = new Log(channel);
  const { version } = context.extension.packageJSON as { readonly version: string };
  const client = new ComputeClient(context.extensionUri, version, log);
  const testing = context.extensionMode === ExtensionMode.Test;
  let openStep: OpenStep | null = null;
  const onStep = (step: OpenStep | null): void => {
    openStep = step;
  };
  const services: Services = { context, client, log, testing, onStep };
  const panels = new PanelManager(services);
  const diagnostics = languages.createDiagnosticCollection('weighbeam');
  const host: Host = { ...services, panels, diagnostics };
  const commands = [compare, openDemo, copyBlock, addToNotebook, recheckNotebook, leaveOut, undo, redo];
  context.subscriptions.push(
    channel,
    client,
    panels,
    diagnostics,
    window.registerWebviewPanelSerializer(viewType, panels),
    // Marks stand at lines: once the text moves on they would point at something else.
    workspace.onDidChangeTextDocument(({ document, contentChanges }) => {
      if (contentChanges.length > 0) diagnostics.delete(document.uri);
    }),
    workspace.onDidCloseTextDocument(({ uri }) => diagnostics.delete(uri)),
    ...register(
      log,
      commands.map(make => make(host)),
    ),
  );
  return testing
    ? {
        lastShown: () => panels.current?.shown ?? null,
        endWorker: () => client.end(),
        openStep: () => openStep,
        notices: () => panels.notices,
      }
    : undefined;
}
