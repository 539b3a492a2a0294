import {
  commands,
  EventEmitter,
  l10n,
  Uri,
  ViewColumn,
  window,
  workspace,
  type Disposable,
  type WebviewPanel,
} from 'vscode';
import type { PanelAction } from '../../report/panel/action';
import { readFromPanel } from '../../protocol/fromPanel';
import type { Busy, Notice, Show, Tool } from '../../protocol/toPanel';
import { failed } from '../failed';
import { documentOf } from '../files/openedFile';
import { lastPart } from '../files/root';
import { chooseFile } from '../selecting/chooseFile';
import type { Services } from '../services';
import type { Comparison } from './comparison';
import { FollowedFiles } from './followedFiles';
import { noticesFor } from './notices';
import { actOn, showProblemCell } from './panelActions';
import { answerQuestion, questionLabel } from './openQuestions';
import { panelHtml } from './panelHtml';

export const viewType = 'weighbeam.comparison';

/** One panel: shows a comparison, passes on what its controls ask for, and says what befalls its files. */
export class ComparisonPanel implements Disposable {
  private readonly disposables: Disposable[] = [];
  private readonly closed = new EventEmitter<void>();
  private readonly used = new EventEmitter<void>();
  readonly onDidClose = this.closed.event;
  /** The person did something in this panel: commands are about it from now on. */
  readonly onDidUse = this.used.event;
  private readonly files: FollowedFiles;
  private busy: Busy | null = null;
  private listening = false;

  constructor(
    private readonly services: Services,
    readonly comparison: Comparison,
    readonly panel: WebviewPanel,
  ) {
    const { extensionUri } = services.context;
    this.files = new FollowedFiles(comparison, services.log, () => this.send());
    panel.webview.options = {
      enableScripts: true,
      enableForms: false,
      localResourceRoots: [Uri.joinPath(extensionUri, 'dist'), Uri.joinPath(extensionUri, 'media')],
    };
    this.disposables.push(
      panel.webview.onDidReceiveMessage(message => this.receive(message)),
      panel.onDidChangeViewState(() => {
        // What was sent to a hidden panel never arrived.
        if (panel.visible) this.send();
      }),
      panel.onDidDispose(() => this.dispose()),
      comparison.onDidShow(() => {
        this.busy = null;
        this.send();
      }),
      comparison.onBusy(({ done, total }) => this.tell(done, total)),
    );
    panel.iconPath = Uri.joinPath(extensionUri, 'media', 'icon.svg');
    this.follow();
    panel.webview.html = panelHtml(panel.webview, extensionUri);
  }

  /** What befell the files or the calculation, as the panel says it. */
  get notices(): readonly Notice[] {
    const { shown, subject } = this.comparison;
    return noticesFor(shown, this.files.state, subject);
  }

  reveal(): void {
    this.panel.reveal(undefined, true);
  }

  dispose(): void {
    this.files.dispose();
    for (const disposable of this.disposables.splice(0)) disposable.dispose();
    this.comparison.dispose();
    this.closed.fire();
    this.closed.dispose();
    this.used.dispose();
    this.panel.dispose();
  }

  private receive(message: unknown): void {
    this.handle(message).catch((error: unknown) => failed('panel', error, this.services.log));
  }

  private async handle(received: unknown): Promise<void> {
    const message = readFromPanel(received);
    if (message.type !== 'ready') this.used.fire();
    switch (message.type) {
      case 'ready':
        this.listening = true;
        this.send();
        return;
      case 'act':
        // A click on numbers that have just been replaced means something else by now.
        if (message.revision === this.comparison.shown?.revision) await this.act(message.action);
        return;
      case 'notice':
        await this.onNotice(message.id);
        return;
      case 'tool':
        if (message.id === 'answer') await answerQuestion(this.services, this.comparison);
        else await commands.executeCommand(`weighbeam.${message.id}`);
        return;
      case 'showProblem':
        await showProblemCell(this.services, this.comparison);
    }
  }

  /** A point stands for a row of the file as it was computed from: in another file its line may hold another row. */
  private async act(action: PanelAction): Promise<void> {
    if (action.kind === 'point' || action.kind === 'show') {
      const state = (await this.files.look()).kind;
      if (state === 'changed' || state === 'edited') {
        void window.showWarningMessage(
          l10n.t(
            'The file is not as it was when these numbers were computed. Run the comparison again first.',
          ),
        );
        return;
      }
    }
    await actOn(this.services, this.comparison, action);
  }

  private async onNotice(id: NonNullable<Notice['action']>['id']): Promise<void> {
    const { comparison } = this;
    switch (id) {
      case 'saveAndRunAgain':
        for (const [index, uri] of comparison.subject.files.entries()) await this.save(index, uri);
        break;
      case 'runAgain':
        break;
      case 'chooseFile': {
        const lost = this.files.state.kind === 'gone' ? this.files.state.file : 0;
        const uri = await chooseFile();
        if (uri === null) return;
        this.replaceFile(lost, uri);
      }
    }
    await comparison.run();
  }

  /** The file lies elsewhere now: the comparison, its record and what is watched go with it. */
  private replaceFile(index: number, uri: Uri): void {
    this.comparison.moveTo(index, uri);
    this.follow();
  }

  /** Saves the text of a file; one that was never saved has another name from then on. */
  private async save(index: number, uri: Uri): Promise<void> {
    const document = documentOf(uri);
    if (document === undefined) return;
    if (!document.isUntitled) {
      await document.save();
      return;
    }
    const saved = await workspace.save(uri);
    if (saved !== undefined) this.replaceFile(index, saved);
  }

  private follow(): void {
    this.files.follow((index, to) => {
      this.replaceFile(index, to);
      void this.comparison.run();
    });
    this.panel.title = l10n.t('Comparison: {0}', this.comparison.subject.files.map(lastPart).join(', '));
  }

  /** Sends the whole of what is to be shown; never waits for it to arrive. */
  private send(): void {
    if (!this.listening || !this.panel.visible) return;
    const { shown, subject, request } = this.comparison;
    if (shown !== null) {
      const message: Show = {
        type: 'show',
        revision: shown.revision,
        recipe: { files: subject.files.map(String), blockText: shown.blockText, request },
        view: shown.view,
        problem: shown.problem,
        notices: this.notices,
        tools: toolsFor(this.comparison),
        words: {
          problem: l10n.t('Why there is no number'),
          showCell: l10n.t('Show'),
          ready: l10n.t('Computed'),
        },
      };
      void this.panel.webview.postMessage(message);
    }
    if (this.busy !== null) void this.panel.webview.postMessage(this.busy);
  }

  private tell(done: number, total: number): void {
    const revision = (this.comparison.shown?.revision ?? 0) + 1;
    this.busy = { type: 'busy', revision, says: l10n.t('Computing…'), done, total };
    if (this.listening && this.panel.visible) void this.panel.webview.postMessage(this.busy);
  }
}

/** The buttons that can do something now. */
function toolsFor({ canUndo, canRedo, shown }: Comparison): readonly Tool[] {
  const question = shown === null ? null : questionLabel(shown);
  const possible: readonly (readonly [boolean, Tool])[] = [
    [question !== null, { id: 'answer', label: question ?? '' }],
    [canUndo, { id: 'undo', label: l10n.t('Undo the last change') }],
    [canRedo, { id: 'redo', label: l10n.t('Redo it') }],
    [shown !== null && shown.blockText !== null, { id: 'addToNotebook', label: l10n.t('Add to notebook…') }],
  ];
  return possible.flatMap(([isPossible, tool]) => (isPossible ? [tool] : []));
}

/** A new, empty panel beside the editor in front; the focus stays where it is. */
export const createPanel = (): WebviewPanel =>
  window.createWebviewPanel(
    viewType,
    l10n.t('Comparison'),
    { viewColumn: ViewColumn.Beside, preserveFocus: true },
    { enableFindWidget: true },
  );
