import {
  CancellationError,
  CancellationTokenSource,
  EventEmitter,
  l10n,
  type Disposable,
  type Uri,
} from 'vscode';
import type { Request } from '../../compare/request';
import { canRedo, canUndo, reduce, requestOf, type Action, type Session } from '../../compare/session';
import type { Provenance } from '../../core/model/settings';
import { OtherSideGone } from '../../protocol/calls';
import type { FileInput } from '../../protocol/files';
import type { ShownProblem } from '../../protocol/places';
import type { Answered } from '../../protocol/fromWorker';
import { RefusedError } from '../compute/computeClient';
import { openFile } from '../files/openedFile';
import { lastPart, recordName, rootOf } from '../files/root';
import { now } from '../now';
import type { Services } from '../services';
import { asComputed, type FileState } from './fileState';
import { afterLook } from './looks';
import { keepSeen, seenBefore } from './seenBefore';
import type { Shown } from './shown';
import type { Subject } from './subject';

interface Opened {
  readonly files: readonly FileInput[];
  /** How they are read. */
  readonly wish: Request['wish'];
  readonly unsaved: boolean;
}

/** One comparison: what is asked of which files, what came of it, and how it is computed anew. It knows no panel. */
export class Comparison implements Disposable {
  private readonly shownEmitter = new EventEmitter<Shown>();
  private readonly busyEmitter = new EventEmitter<{ readonly done: number; readonly total: number }>();
  readonly onDidShow = this.shownEmitter.event;
  readonly onBusy = this.busyEmitter.event;
  /** The last answer or problem; null: nothing was computed yet. */
  shown: Shown | null = null;
  private running: CancellationTokenSource | null = null;
  private revision = 0;
  /** Results that were seen here, by their cells and what was asked: to come back to one is no further look. */
  private readonly seen = new Set<string>();

  constructor(
    private readonly services: Services,
    public subject: Subject,
    private session: Session,
    private provenance: Provenance,
    private readonly isRestored = false,
  ) {}

  get request(): Request {
    return requestOf(this.session);
  }

  /** What stands before its questions. */
  get title(): string {
    return this.subject.files.map(lastPart).join(', ');
  }

  get stated(): Provenance {
    return this.provenance;
  }

  get canUndo(): boolean {
    return canUndo(this.session);
  }

  get canRedo(): boolean {
    return canRedo(this.session);
  }

  /** Whether a result was seen: what is changed from then on is marked in the record. */
  get wasSeen(): boolean {
    return this.session.firstShown !== null;
  }

  /** Takes up a change of what is asked and computes anew. */
  async act(...actions: readonly Action[]): Promise<void> {
    this.session = actions.reduce(reduce, this.session);
    await this.run();
  }

  /** Takes up a request that was asked from the beginning; rows left out and labels merged here stay so. */
  async askAnew(request: Request): Promise<void> {
    const staying: readonly (keyof Request)[] = ['leaveOut', 'same'];
    const keys = Object.keys(this.request) as (keyof Request)[];
    const unset = keys.filter(key => request[key] === undefined && !staying.includes(key));
    const isSame = unset.length === 0 && sameRequest({ ...this.request, ...request }, this.request);
    await (isSame ? this.run() : this.act({ kind: 'change', patch: request, unset, when: now() }));
  }

  /** States something for the record that changes no number. */
  async state(stated: Partial<Provenance>): Promise<void> {
    this.provenance = { ...this.provenance, ...stated };
    await this.run();
  }

  /** One of the files lies elsewhere now; its name in the record follows. */
  moveTo(index: number, uri: Uri): void {
    const files = this.subject.files.map((file, at) => (at === index ? uri : file));
    const root = rootOf(files[0] ?? uri);
    this.subject = { ...this.subject, files, root };
    this.session = reduce(this.session, { kind: 'moved', files: files.map(file => recordName(file, root)) });
  }

  /** What became of the files since what is shown was computed: the first that is not as it was. */
  async filesNow(): Promise<FileState> {
    const { shown, subject, request } = this;
    if (shown === null) return asComputed;
    for (const [file, uri] of subject.files.entries()) {
      try {
        const { input, unsaved } = await openFile(uri, request.files[file] ?? '');
        if (input.stamp !== shown.stamps[file]) return { kind: unsaved ? 'edited' : 'changed', file };
      } catch (error) {
        if (error instanceof RefusedError) return { kind: 'gone', file };
        throw error;
      }
    }
    return asComputed;
  }

  /** Computes what is asked now. A run that is overtaken by a later one shows nothing. */
  async run(): Promise<void> {
    this.running?.cancel();
    const source = new CancellationTokenSource();
    this.running = source;
    const revision = ++this.revision;
    this.busyEmitter.fire({ done: 0, total: 0 });
    try {
      const shown = await this.compute(revision, source);
      if (revision !== this.revision) return;
      this.shown = shown;
      this.shownEmitter.fire(shown);
    } catch (error) {
      if (!(error instanceof CancellationError)) throw error;
    } finally {
      if (this.running === source) this.running = null;
      source.dispose();
    }
  }

  /** The files as the worker gets them now. */
  async open(): Promise<Opened> {
    const names = this.request.files;
    const opened = await Promise.all(
      this.subject.files.map((uri, index) => openFile(uri, names[index] ?? '')),
    );
    const unsaved = opened.some(own => own.unsaved);
    const { wish } = this.request;
    return { files: opened.map(({ input }) => input), wish: unsaved ? withoutEncoding(wish) : wish, unsaved };
  }

  /** What tells apart the contents of the files as they are now. */
  async stamps(): Promise<readonly string[]> {
    return stampsOf(await this.open());
  }

  dispose(): void {
    this.running?.cancel();
    this.shownEmitter.dispose();
    this.busyEmitter.dispose();
  }

  private async compute(revision: number, source: CancellationTokenSource): Promise<Shown> {
    const request = this.request;
    const nothing = {
      revision,
      request,
      view: null,
      blockText: null,
      problem: null,
      open: [],
      numbers: null,
    };
    let stamps: readonly string[] = [];
    let unsaved = false;
    let restarted = false;
    try {
      const opened = await this.open();
      stamps = stampsOf(opened);
      unsaved = opened.unsaved;
      const answered = await this.ask(opened, revision, source).catch((error: unknown) => {
        if (!(error instanceof OtherSideGone)) throw error;
        restarted = true; // once: a calculation that always kills the worker must come to an end
        return this.ask(opened, revision, source);
      });
      const { view, blockText, open, numbers } = answered;
      return { ...nothing, view, blockText, open, numbers, stamps, unsaved, restarted };
    } catch (error) {
      if (error instanceof RefusedError) {
        this.services.log.refused(error.problem.code);
        return { ...nothing, problem: error.problem, stamps, unsaved, restarted };
      }
      if (error instanceof CancellationError) throw error;
      this.services.log.failed(
        'answer',
        error instanceof Error ? (error.stack ?? error.message) : String(error),
      );
      return { ...nothing, problem: stoppedProblem(), stamps, unsaved, restarted };
    }
  }

  private async ask(opened: Opened, revision: number, source: CancellationTokenSource): Promise<Answered> {
    const { client, log, testing } = this.services;
    const started = performance.now();
    const askOnce = (): Promise<Answered> =>
      client.ask(
        {
          type: 'answer',
          revision,
          files: opened.files,
          session: readAs(this.session, opened.wish),
          provenance: this.provenance,
          written: now(),
          record: !opened.unsaved,
          numbers: testing,
        },
        { token: source.token, onProgress: (done, total) => this.busyEmitter.fire({ done, total }) },
      );
    const answered = await askOnce();
    log.read(answered.readings, performance.now() - started);
    if (revision === this.revision)
      this.session = reduce(this.session, { kind: 'found', leaveOut: answered.leaveOut });
    const again = this.countLook(answered.cells);
    return again ? askOnce() : answered;
  }

  /**
   * Counts a result that is seen for the first time, under the cells it was made from. Gives whether the record has to
   * be written again, because these cells were seen before.
   */
  private countLook(cells: string): boolean {
    const result = JSON.stringify([cells, this.request]);
    if (this.seen.has(result)) return false;
    const state = this.services.context.workspaceState;
    const before = seenBefore(state, cells);
    const isFirst = this.seen.size === 0;
    this.seen.add(result);
    const written = this.provenance.looks;
    const look = { before, isFirst, isAgain: isFirst && this.isRestored, when: now() };
    const { session, provenance } = afterLook({ session: this.session, provenance: this.provenance }, look);
    this.session = session;
    this.provenance = provenance;
    const { looks } = provenance;
    if (session.firstShown !== null) {
      void keepSeen(state, cells, { looks, firstShown: session.firstShown });
    }
    return looks !== written || before !== null;
  }
}

const stampsOf = ({ files }: Opened): readonly string[] => files.map(({ stamp }) => stamp);

/** What the panel says instead of computing for ever. */
const stoppedProblem = (): ShownProblem => ({
  code: 'calculation-stopped',
  message: l10n.t('The calculation stopped unexpectedly'),
  where: null,
  fix: l10n.t('Run the comparison again; should it stop again, the log of Weighbeam says why.'),
  at: null,
});

/** Text from an editor comes as UTF-8, whatever its file is stored in: the encoding is seen anew. */
const withoutEncoding = (wish: Request['wish']): Request['wish'] =>
  Object.fromEntries(Object.entries(wish).filter(([key]) => key !== 'encoding'));

/** A session that reads its files in this way now. */
const readAs = (session: Session, wish: Request['wish']): Session => ({
  ...session,
  history: session.history.map((step, at) =>
    at === session.at ? { ...step, request: { ...step.request, wish } } : step,
  ),
});

/** Whether two requests say the same, in whatever order. */
function sameRequest(a: Request, b: Request): boolean {
  const keys = [...new Set([...Object.keys(a), ...Object.keys(b)])] as (keyof Request)[];
  return keys.every(key => JSON.stringify(a[key]) === JSON.stringify(b[key]));
}
