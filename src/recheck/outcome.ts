import type { Comparison } from '../core/model/comparison';
import type { Refusal } from '../core/model/problem';
import type { Reason } from '../core/model/say';

export type OutcomeKind = 'same' | 'moved' | 'turned' | 'altered' | 'reworked' | 'planned' | 'blocked';

/** A number or word of the record that is not what it was. `change` is is − was, for numbers. */
export interface OutcomeChange {
  /** Key of the block: 'result.p', 'result.mean[0]', 'data.0.cells'. */
  readonly key: string;
  readonly was: string | number;
  readonly is: string | number;
  readonly change: number | null;
}

/** What became of one settings block. */
export interface Outcome {
  readonly kind: OutcomeKind;
  /** Line of the first key that moved, else of the block. */
  readonly line: number;
  readonly firstLine: number;
  readonly changes: readonly OutcomeChange[];
  /**
   * 'lines-moved', 'file-changed', 'text-edited', 'questions-open' {ids of findings}, 'unknown-keys' {keys}, 'replaced'
   * {lines of the records that replace it}.
   */
  readonly notes: readonly Reason[];
  /** The data files that the block names; none where the block itself cannot be read. */
  readonly files: readonly string[];
  /** Why it is blocked. */
  readonly reason: Refusal | null;
  readonly now: Comparison | null;
}
