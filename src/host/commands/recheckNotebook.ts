import {
  Diagnostic,
  DiagnosticSeverity,
  l10n,
  Range,
  window,
  workspace,
  Uri,
  type TextDocument,
} from 'vscode';
import type { BlockPlace, OutcomeShown } from '../../protocol/fromWorker';
import type { NamedFile } from '../../protocol/toWorker';
import { findNamedFile } from '../files/namedFile';
import type { Host } from '../host';
import { activeUri } from '../selecting/targets';
import { whileWaiting } from '../whileWaiting';
import type { Command } from './command';

/**
 * Rechecks every settings block of the active text, or of the one given. What moved is marked in the text; the outcomes
 * are also given back.
 */
export const recheckNotebook = (host: Host): Command => ({
  id: 'weighbeam.recheckNotebook',
  async execute(first) {
    const uri = first instanceof Uri ? first : activeUri();
    if (uri === null) {
      void window.showInformationMessage(
        l10n.t('Open the notebook whose settings blocks are to be rechecked first.'),
      );
      return [];
    }
    const document = await workspace.openTextDocument(uri);
    const [text, version] = [document.getText(), document.version];
    const { blocks } = await host.client.ask({ type: 'blocks', revision: 0, text });
    if (blocks.length === 0) {
      void window.showInformationMessage(l10n.t('No settings block stands in this text.'));
      host.diagnostics.delete(uri);
      return [];
    }
    const files = await filesOf(blocks, uri);
    const { outcomes } = await whileWaiting(
      l10n.t('Rechecking {0} settings blocks', blocks.length),
      options => host.client.ask({ type: 'recheck', revision: 0, text, files }, options),
    );
    if (document.version !== version) {
      host.diagnostics.delete(uri);
      void window.showInformationMessage(
        l10n.t(
          'The text was edited while its settings blocks were rechecked. Recheck it again to have them marked.',
        ),
      );
      return outcomes;
    }
    host.diagnostics.set(
      uri,
      outcomes.flatMap(outcome => marked(outcome, document)),
    );
    void window.showInformationMessage(summary(outcomes));
    return outcomes;
  },
});

const filesOf = (blocks: readonly BlockPlace[], notebook: Uri): Promise<readonly NamedFile[]> =>
  Promise.all([...new Set(blocks.flatMap(block => block.files))].map(name => findNamedFile(name, notebook)));

/** Marks the line of the key that moved, or of the block; what is as it was leaves no mark. */
function marked(outcome: OutcomeShown, document: TextDocument): readonly Diagnostic[] {
  if (outcome.kind === 'same' || outcome.kind === 'planned') return [];
  const line = document.lineAt(Math.min(outcome.line, document.lineCount) - 1);
  const range = new Range(
    line.lineNumber,
    line.firstNonWhitespaceCharacterIndex,
    line.lineNumber,
    line.text.length,
  );
  const changes = outcome.changes.map(({ key, was, is }) => l10n.t('{0}: was {1}, is {2}', key, was, is));
  const severity = outcome.kind === 'blocked' ? DiagnosticSeverity.Error : DiagnosticSeverity.Warning;
  const diagnostic = new Diagnostic(range, [outcome.sentence, ...changes].join('\n'), severity);
  diagnostic.source = 'Weighbeam';
  diagnostic.code = outcome.kind;
  return [diagnostic];
}

/** "3 settings blocks: 2 same, 1 moved." */
function summary(outcomes: readonly OutcomeShown[]): string {
  const counts = new Map<string, number>();
  for (const { kind } of outcomes) counts.set(kind, (counts.get(kind) ?? 0) + 1);
  const parts = [...counts].map(([kind, count]) => `${count} ${kind}`).join(', ');
  const only = outcomes.length === 1 ? outcomes[0] : undefined;
  return only === undefined
    ? l10n.t('{0} settings blocks: {1}.', outcomes.length, parts)
    : l10n.t('1 settings block: {0}', only.sentence);
}
