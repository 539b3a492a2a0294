import type { Summary, Count } from './groups';

export type Question = 'differs' | 'higher' | 'lower' | 'equivalent' | 'not-lower' | 'not-higher';
export type Measure = 'mean' | 'ratio' | 'proportion' | 'rank' | 'spread';
export type OptionValue = string | number | boolean | readonly number[];
export type Below = 'refuse' | 'zero' | 'half' | 'limit';

export type Layout =
  | { readonly kind: 'long'; readonly measured: readonly string[]; readonly label: string }
  | { readonly kind: 'wide'; readonly columns: readonly string[] }
  | { readonly kind: 'files'; readonly measured: string }
  /** Rows of the file are summaries: columns label, n, mean, sd; or label, x, n. */
  | { readonly kind: 'summary'; readonly label: string }
  | { readonly kind: 'typed'; readonly groups: readonly (Summary | Count)[] };

/**
 * How rows belong together. 'rows': nothing was said (each row counts once, printed as not stated); 'independent': a
 * person said so; 'units': readings are averaged level by level, outermost column first; 'pairs': matched by a column.
 */
export type Relation =
  | { readonly kind: 'rows' }
  | { readonly kind: 'independent' }
  | { readonly kind: 'units'; readonly columns: readonly string[] }
  | { readonly kind: 'pairs'; readonly column: string };

export interface LeftOut {
  readonly file: number;
  readonly line: number;
  readonly reason: string;
  readonly afterResult: boolean;
  /** SHA-256 of the cells of the row that was meant, once it is known: by it the row is found again on another line. */
  readonly digest?: string;
}

/** Everything that can change a number, and nothing else. Columns are exact header texts, or '#3'. */
export interface Settings {
  /** Relative to the root, '/' separated; empty for typed summaries. */
  readonly files: readonly string[];
  readonly reading: {
    readonly encoding: string;
    readonly delimiter: string;
    readonly decimal: '.' | ',';
    readonly thousands: string;
    readonly header: number;
    readonly missing: readonly string[];
    readonly below: Below;
  };
  /** 'all' grows with the file; else closed ranges of line numbers. */
  readonly rows: 'all' | readonly (readonly [number, number])[];
  readonly where: readonly (readonly [column: string, label: string])[];
  readonly layout: Layout;
  readonly relation: Relation;
  /** Ids start again in each group: a shared id does not make a pair. */
  readonly numberingRestarts: boolean;
  /** Labels, column names or file names; both null: several groups in order of first appearance. */
  readonly test: string | null;
  readonly reference: string | null;
  readonly same: readonly (readonly [from: string, to: string])[];
  readonly leftOut: readonly LeftOut[];
  readonly measure: Measure;
  /** An id of the registry: the one truth about the variance assumption, df rule and curve. */
  readonly method: string;
  readonly question: Question;
  readonly confidence: number;
  readonly against: number;
  readonly margin: readonly [number, number] | null;
  readonly matters: number | null;
  /** Keys declared by methods and evidence: sigma, success, curve, seed, draws, thresholds, ruled-out. */
  readonly options: Readonly<Record<string, OptionValue>>;
}

/** A change made after a result was seen. */
export interface Change {
  readonly key: string;
  readonly from: OptionValue;
  readonly to: OptionValue;
  readonly when: string;
  readonly reason: string;
}

/** Printed in the block, never changes a number. */
export interface Provenance {
  readonly questionInWords: string;
  readonly sampling: string;
  readonly analyst: string;
  readonly reasons: Readonly<Record<string, string>>;
  readonly changed: readonly Change[];
  readonly looks: number;
  readonly plan: string | null;
  readonly replaces: string | null;
}
