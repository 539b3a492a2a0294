import { commands, type Disposable } from 'vscode';
import { failed } from '../failed';
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
        failed(id, error, log);
        return undefined;
      }
    }),
  );
