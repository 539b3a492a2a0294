import { CancellationError, commands, l10n, window, type Disposable } from 'vscode';
import { RefusedError } from '../compute/computeClient';
import type { Log } from '../log';

/** One command of the extension: its id and what it does. */
export interface Command {
  readonly id: string;
  readonly execute: (...args: readonly unknown[]) => Promise<unknown>;
}

/**
 * Registers commands. A command that the person gave up ends in silence; what goes wrong without a panel to say it in is
 * said once, with where to look.
 */
export const register = (log: Log, list: readonly Command[]): Disposable[] =>
  list.map(({ id, execute }) =>
    commands.registerCommand(id, async (...args: unknown[]) => {
      try {
        return await execute(...args);
      } catch (error) {
        if (error instanceof CancellationError) return undefined;
        log.failed(id, error instanceof Error ? (error.stack ?? error.message) : String(error));
        const message =
          error instanceof RefusedError
            ? `${error.problem.message} ${error.problem.fix}`
            : l10n.t(
                'Weighbeam could not do this: {0}',
                error instanceof Error ? error.message : String(error),
              );
        void tell(message, log);
        return undefined;
      }
    }),
  );

async function tell(message: string, log: Log): Promise<void> {
  const showLog = l10n.t('Show log');
  if ((await window.showErrorMessage(message, showLog)) === showLog) log.show();
}
