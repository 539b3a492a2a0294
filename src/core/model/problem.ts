import type { Facts } from './say';

/** A cell of a file: line from 1 (the line on which its row starts), field from 0. */
export interface CellRef {
  readonly file: number;
  readonly line: number;
  readonly field: number;
}

/** Why no number was printed, in words: made by report from a Refusal. */
export interface Problem {
  readonly code: ProblemCode;
  readonly message: string;
  readonly where: string | null;
  readonly fix: string;
}

/** Every way in which a comparison can be refused; report holds one sentence and one remedy for each. */
export type ProblemCode =
  // reading
  | 'file-empty'
  | 'file-header-only'
  | 'file-binary'
  | 'file-not-found'
  | 'file-outside-root'
  | 'encoding-invalid'
  | 'quote-unclosed'
  | 'decimal-undecidable'
  | 'layouts-equal'
  | 'header-not-found'
  | 'text-in-measured'
  | 'censored-unanswered'
  | 'number-unusable'
  // naming columns and groups
  | 'column-unknown'
  | 'column-ambiguous'
  | 'column-needed'
  | 'label-unknown'
  | 'label-needed'
  | 'label-single-value'
  | 'groups-too-few'
  | 'groups-too-many'
  | 'columns-too-many'
  | 'row-unknown'
  | 'leave-out-unknown'
  | 'success-needed'
  | 'outcomes-too-many'
  | 'units-disagree'
  | 'pairs-repeated'
  | 'pairs-none'
  // asking
  | 'confidence-out-of-range'
  | 'confidence-as-percent'
  | 'sigma-needed'
  | 'sigma-not-positive'
  | 'margin-needed'
  | 'margin-invalid'
  | 'matters-invalid'
  | 'share-out-of-range'
  | 'method-unknown'
  | 'method-not-for-this'
  | 'question-not-for-method'
  | 'answer-needed'
  | 'reason-needed'
  // computing
  | 'values-too-few'
  | 'values-all-equal'
  | 'summary-invalid'
  // blocks
  | 'block-not-readable'
  | 'block-newer-format'
  | 'left-out-row-gone';

/** Thrown wherever a comparison must stop; carries a code, its facts and the place, never words. */
export class Refusal extends Error {
  constructor(
    readonly code: ProblemCode,
    readonly facts: Facts = {},
    readonly where: CellRef | string | null = null,
  ) {
    super(code);
    this.name = 'Refusal';
  }
}

/** Thrown by a Ticker when the person gave up. */
export class Cancelled extends Error {
  constructor() {
    super('cancelled');
    this.name = 'Cancelled';
  }
}

/** Called inside every long loop; throws Cancelled when the person gave up. */
export type Ticker = (done: number, total: number) => void;
