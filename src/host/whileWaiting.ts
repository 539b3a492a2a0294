import { CancellationTokenSource, ProgressLocation, window, type CancellationToken } from 'vscode';

const PATIENCE_MS = 700;

interface Waiting {
  readonly token: CancellationToken;
  readonly onProgress: (done: number, total: number) => void;
}

/** Runs a task; when it takes longer than a moment, says so with its progress and a way to give up. */
export async function whileWaiting<T>(title: string, task: (waiting: Waiting) => Promise<T>): Promise<T> {
  const source = new CancellationTokenSource();
  let tell: Waiting['onProgress'] = () => undefined;
  const running = task({ token: source.token, onProgress: (done, total) => tell(done, total) });
  const timer = setTimeout(() => {
    void window.withProgress(
      { location: ProgressLocation.Notification, title, cancellable: true },
      (progress, token) => {
        let before = 0;
        tell = (done, total) => {
          const percent = total > 0 ? (100 * done) / total : 0;
          progress.report({ increment: Math.max(0, percent - before) });
          before = Math.max(before, percent);
        };
        token.onCancellationRequested(() => source.cancel());
        return running.then(
          () => undefined,
          () => undefined,
        );
      },
    );
  }, PATIENCE_MS);
  try {
    return await running;
  } finally {
    clearTimeout(timer);
    source.dispose();
  }
}
