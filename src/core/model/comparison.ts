import type { Reading, Table } from './cells';
import type { Count, Group } from './groups';
import type { MethodResult, OptionSpec } from './methods';
import type { CellRef, Ticker } from './problem';
import type { Facts, Reason, Say } from './say';
import type { LeftOut, Settings } from './settings';

/** The words of each question (DEVELOPERS.md, glossary). */
export type Decision =
  | 'differs'
  | 'not settled'
  | 'higher'
  | 'lower'
  | 'not shown'
  | 'within margin'
  | 'outside margin'
  | 'not shown within margin'
  | 'not lower by the margin'
  | 'lower by at least the margin'
  | 'not higher by the margin'
  | 'higher by at least the margin'
  | 'some differ';

/** One line under other assumptions. */
export interface Row {
  readonly id: string;
  /** 'all', 'without left-out', 'below as half', … */
  readonly data: string;
  readonly result: MethodResult | null;
  readonly applies: boolean;
  readonly counted: boolean;
  readonly reason: Reason | null;
  readonly decision: Decision | null;
}

/** Something the file shows. */
export interface Finding {
  readonly id: string;
  readonly level: 'note' | 'warn' | 'ask' | 'stop';
  readonly facts: Facts;
  /** Label of the group it is about, or null. */
  readonly group: string | null;
  readonly count: number;
  /** The first 20 of `count`. */
  readonly cells: readonly CellRef[];
  /** Quick fixes: each a change of Settings. */
  readonly answers: readonly Partial<Settings>[];
}

/** A finding with a statistic: evidence about an assumption. */
export interface Evidence extends Finding {
  readonly statistic: number | null;
  readonly df: MethodResult['df'];
  readonly p: number | null;
}

/** What an evidence check looks at. `table` is null for typed numbers. */
export interface Seen {
  readonly table: Table | null;
  readonly groups: readonly Group[];
  readonly settings: Settings;
  readonly rows: readonly Row[];
}

/** An evidence check: its file, its test and one line of the list. */
export interface EvidenceDescriptor<Id extends string = string> {
  readonly id: Id;
  readonly thresholds: readonly OptionSpec[];
  readonly references: readonly string[];
  /** Gives findings, or evidence (a finding with a statistic) about an assumption; an empty list when it saw nothing. */
  look(seen: Seen, tick: Ticker): readonly (Finding | Evidence)[];
  /** Whether it could see anything at these n; a check that cannot tell is counted as such. */
  canTell(seen: Seen): boolean;
  title(t: Say): string;
  say(finding: Finding | Evidence, t: Say): string;
}

/** Five numbers of a group beside n, mean and SD (quartiles: linear interpolation at (n − 1)q). */
export interface GroupNumbers {
  readonly se: number | null;
  readonly median: number | null;
  readonly q1: number | null;
  readonly q3: number | null;
  readonly min: number | null;
  readonly max: number | null;
}

export interface Effect {
  readonly id: string;
  readonly value: number;
  readonly lower: number | null;
  readonly upper: number | null;
}

/** A row that was left out, as met in the file. */
export interface LeftOutRow extends LeftOut {
  readonly row: number;
  readonly value: string;
  readonly group: string;
  /** Column and id of its units, outermost first: ["firing", "9"], ["tile", "3"]. */
  readonly unit: readonly (readonly [column: string, id: string])[];
}

/** Whether the decision depends on the choice, over the counted rows. */
export interface WhatIf {
  readonly depends: 'no' | 'yes' | 'on the line';
  /** Indices into rows. */
  readonly counted: readonly number[];
  readonly rows: readonly Row[];
}

/** Every number and fact; sentences, JSON and TOML are made from it in report and settings. */
export interface Comparison {
  readonly settings: Settings;
  readonly readings: readonly Reading[];
  readonly design: 'two' | 'pairs' | 'several' | 'counts' | 'pairedCounts';
  /** Test group first. For counts: mean is the share x/n, sd its binomial SD. */
  readonly groups: readonly (Group & GroupNumbers & { readonly count: Count | null })[];
  /** Unit of the measured column, or null. */
  readonly unit: string | null;
  /** Name of the measured column; '' where the layout names none (one column a group, typed numbers). */
  readonly measured: string;
  readonly pairs: {
    readonly complete: number;
    readonly unmatched: readonly string[];
    readonly correlation: number | null;
  } | null;
  readonly chosen: Row;
  readonly whatIf: WhatIf;
  readonly effects: readonly Effect[];
  readonly evidence: readonly Evidence[];
  readonly findings: readonly Finding[];
  /** How many checks saw nothing, and how many cannot tell at these n. */
  readonly quiet: { readonly sawNothing: number; readonly cannotTell: number };
  readonly leftOut: readonly LeftOutRow[];
  /** Things decided for the person that they should know: "first label is the test group", … */
  readonly notes: readonly Reason[];
  /** Ids of findings at level ask: no record is made until they are answered. */
  readonly open: readonly string[];
  readonly pairsOfGroups: readonly {
    readonly a: string;
    readonly b: string;
    readonly row: Row;
    readonly pAdjusted: number;
  }[];
  readonly family: readonly {
    readonly column: string;
    readonly p: number;
    readonly holm: number;
    readonly benjaminiHochberg: number;
  }[];
  /** Several measured columns: one comparison each, in the order asked. */
  readonly columns: readonly Comparison[];
}
