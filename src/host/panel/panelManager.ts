import { commands, Uri, type Disposable, type WebviewPanel, type WebviewPanelSerializer } from 'vscode';
import type { Request } from '../../compare/request';
import type { Provenance } from '../../core/model/settings';
import { start } from '../../compare/session';
import { readPanelState, type Recipe } from '../../protocol/panelState';
import { rootOf } from '../files/root';
import type { Services } from '../services';
import { now } from '../now';
import { Comparison } from './comparison';
import { ComparisonPanel, createPanel } from './comparisonPanel';
import { freshProvenance } from './provenance';
import { subjectKey, type Subject } from './subject';

/** All panels: one for each comparison, the one in front, and those that come back after a reload. */
export class PanelManager implements WebviewPanelSerializer, Disposable {
  private readonly panels = new Set<ComparisonPanel>();
  private front: ComparisonPanel | null = null;

  constructor(private readonly services: Services) {}

  /** The comparison of the panel in front, else of the one that was in front last; null: there is none. */
  get current(): Comparison | null {
    return this.front?.comparison ?? null;
  }

  /** What the panel in front says of its files. */
  get notices(): readonly string[] {
    return (this.front?.notices ?? []).map(({ text }) => text);
  }

  /** Shows a comparison beside the editor. One that has a panel already is taken up there. */
  async show(subject: Subject, request: Request): Promise<void> {
    const key = subjectKey(subject, request);
    const there = [...this.panels].find(
      ({ comparison }) => subjectKey(comparison.subject, comparison.request) === key,
    );
    if (there === undefined) {
      const comparison = new Comparison(this.services, subject, start(request, now()), freshProvenance);
      this.add(new ComparisonPanel(this.services, comparison, createPanel()));
      await comparison.run();
      return;
    }
    this.bringForward(there);
    there.reveal();
    await there.comparison.askAnew(request);
  }

  /** Brings back a panel after the window was reloaded, from the request that it kept and its settings block. */
  async deserializeWebviewPanel(panel: WebviewPanel, kept: unknown): Promise<void> {
    const state = readPanelState(kept);
    if (state === null) {
      panel.dispose(); // kept by another version: nothing to bring back
      return;
    }
    const { recipe } = state;
    const files = recipe.files.map(file => Uri.parse(file, true));
    const root = rootOf(files[0] ?? panel.webview.asWebviewUri(this.services.context.extensionUri));
    const provenance = await this.provenanceOf(recipe);
    const comparison = new Comparison(
      this.services,
      { files, root, spans: [] },
      start(recipe.request, provenance.changed.at(-1)?.when ?? now()),
      provenance,
      true,
    );
    this.add(new ComparisonPanel(this.services, comparison, panel));
    await comparison.run();
  }

  dispose(): void {
    for (const panel of [...this.panels]) panel.dispose();
  }

  /** What the block says of its own making; a block of another version says nothing that could be kept. */
  private async provenanceOf({ blockText }: Recipe): Promise<Provenance> {
    if (blockText === null) return freshProvenance;
    try {
      return (await this.services.client.ask({ type: 'restore', revision: 0, blockText })).provenance;
    } catch {
      return freshProvenance;
    }
  }

  private add(panel: ComparisonPanel): void {
    this.bringForward(panel);
    panel.panel.onDidChangeViewState(({ webviewPanel }) => {
      if (webviewPanel.active) this.bringForward(panel);
    });
    panel.onDidUse(() => this.bringForward(panel));
    panel.onDidClose(() => {
      this.panels.delete(panel);
      if (this.front === panel) this.bringForward([...this.panels].at(-1) ?? null);
    });
  }

  private bringForward(panel: ComparisonPanel | null): void {
    this.front = panel;
    if (panel !== null) {
      this.panels.delete(panel); // the set keeps the order of use, so that the last one used comes next
      this.panels.add(panel);
    }
    void commands.executeCommand('setContext', 'weighbeam.hasComparison', panel !== null);
  }
}
