import type { ExtensionContext } from 'vscode';
import type { StepId } from '../protocol/asking';
import type { ComputeClient } from './compute/computeClient';
import type { Log } from './log';

/** The question that is open: what it is about, and what stands over it. */
export interface OpenStep {
  readonly id: StepId;
  readonly title: string;
}

/** What every part of the host works with. */
export interface Services {
  readonly context: ExtensionContext;
  readonly client: ComputeClient;
  readonly log: Log;
  /** Numbers travel to the host only where a test compares them. */
  readonly testing: boolean;
  /** Told of every question that opens, and null once none is open. */
  readonly onStep: (step: OpenStep | null) => void;
}
