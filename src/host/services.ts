import type { ExtensionContext } from 'vscode';
import type { ComputeClient } from './compute/computeClient';
import type { Log } from './log';

/** What every part of the host works with. */
export interface Services {
  readonly context: ExtensionContext;
  readonly client: ComputeClient;
  readonly log: Log;
  /** Numbers travel to the host only where a test compares them. */
  readonly testing: boolean;
}
