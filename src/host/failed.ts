import { CancellationError, l10n, window } from 'vscode';
import { RefusedError } from './compute/computeClient';
import type { Log } from './log';

/** Says what went wrong where no panel says it; what the person gave up ends in silence. */
export function failed(what: string, error: unknown, log: Log): void {
  if (error instanceof CancellationError) return;
  log.failed(what, error instanceof Error ? (error.stack ?? error.message) : String(error));
  const message =
    error instanceof RefusedError
      ? `${error.problem.message} ${error.problem.fix}`
      : l10n.t('Weighbeam could not do this: {0}', error instanceof Error ? error.message : String(error));
  void tell(message, log);
}

async function tell(message: string, log: Log): Promise<void> {
  const showLog = l10n.t('Show log');
  if ((await window.showErrorMessage(message, showLog)) === showLog) log.show();
}
