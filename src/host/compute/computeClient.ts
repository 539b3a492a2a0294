import { CancellationError, l10n, type CancellationToken, type Disposable, type Uri } from 'vscode';
import { Calls } from '../../protocol/calls';
import { giveUp, makeCancelFlags } from '../../protocol/cancelFlags';
import { readFromWorker, type WorkerReply } from '../../protocol/fromWorker';
import type { ShownProblem } from '../../protocol/places';
import type { WorkerCall } from '../../protocol/toWorker';
import { startWorker } from '../platform/startWorker.node';
import type { Log } from '../log';
import type { RunningWorker } from './runningWorker';

/** What the data or the settings make impossible, in words. */
export class RefusedError extends Error {
  constructor(readonly problem: ShownProblem) {
    super(problem.message);
    this.name = 'RefusedError';
  }
}

type Reply<T extends WorkerReply['type']> = Extract<WorkerReply, { type: T }>;
interface Replies {
  survey: Reply<'surveyed'>;
  nextStep: Reply<'asked'>;
  answer: Reply<'answered'>;
  restore: Reply<'restored'>;
  blocks: Reply<'blocksFound'>;
  recheck: Reply<'rechecked'>;
  locate: Reply<'located'>;
}
type WithoutNumber<T> = T extends unknown ? Omit<T, 'call'> : never;
type CallOf<T extends WorkerCall['type']> = WithoutNumber<Extract<WorkerCall, { type: T }>>;

interface AskOptions {
  readonly token?: CancellationToken | undefined;
  readonly onProgress?: ((done: number, total: number) => void) | undefined;
}

/** The worker as the host sees it: started at the first call, started again after it died, told when to give up. */
export class ComputeClient implements Disposable {
  private readonly calls = new Calls<WorkerReply>();
  private readonly progress = new Map<number, (done: number, total: number) => void>();
  private readonly flags = makeCancelFlags();
  private running: RunningWorker | null = null;

  constructor(
    private readonly extensionUri: Uri,
    private readonly version: string,
    private readonly log: Log,
  ) {}

  /**
   * Asks the worker. Rejects with RefusedError (no answer on these data), CancellationError (given up) or
   * OtherSideGone (the worker died; the next call starts a new one).
   */
  async ask<T extends WorkerCall['type']>(
    message: CallOf<T> & { readonly type: T },
    options: AskOptions = {},
  ): Promise<Replies[T]> {
    if (options.token?.isCancellationRequested === true) throw new CancellationError();
    const { call, reply } = this.calls.open(number => this.worker().post({ ...message, call: number }));
    if (options.onProgress !== undefined) this.progress.set(call, options.onProgress);
    const givingUp = options.token?.onCancellationRequested(() => this.giveUp(call));
    try {
      const settled = await reply;
      switch (settled.type) {
        case 'refused':
          throw new RefusedError(settled.problem);
        case 'cancelled':
          throw new CancellationError();
        case 'failed':
          this.log.failed(message.type, settled.message);
          throw new Error(settled.message);
        default:
          return settled as Replies[T];
      }
    } finally {
      givingUp?.dispose();
      this.progress.delete(call);
    }
  }

  /** Ends the worker at once, as a crash would; waiting calls are rejected. */
  end(): void {
    this.running?.end();
  }

  dispose(): void {
    this.end();
  }

  private giveUp(call: number): void {
    this.calls.refuse(call, new CancellationError());
    if (this.flags === null) this.end();
    else giveUp(this.flags, call);
  }

  private worker(): RunningWorker {
    if (this.running !== null) return this.running;
    const worker = startWorker(this.extensionUri);
    this.running = worker;
    worker.listen(message => this.receive(message));
    worker.onEnd(reason => {
      if (this.running === worker) this.running = null;
      this.log.workerEnded(reason);
      this.calls.gone(reason);
    });
    worker.post({ type: 'start', words: bundleOf(), version: this.version, flags: this.flags });
    return worker;
  }

  private receive(message: unknown): void {
    try {
      const reply = readFromWorker(message);
      if (reply.type === 'progress') this.progress.get(reply.call)?.(reply.done, reply.total);
      else this.calls.answered(reply);
    } catch (error) {
      this.log.failed('receive', error instanceof Error ? error.message : String(error));
      const call: unknown = (message as { readonly call?: unknown } | null)?.call;
      if (typeof call === 'number')
        this.calls.refuse(call, error instanceof Error ? error : new Error(String(error)));
    }
  }
}

/** The translations as plain strings; null when the editor speaks English. */
function bundleOf(): Readonly<Record<string, string>> | null {
  const { bundle } = l10n;
  if (bundle === undefined) return null;
  const words: Record<string, string> = {};
  for (const [key, value] of Object.entries(bundle))
    words[key] = typeof value === 'string' ? value : String(value);
  return words;
}
