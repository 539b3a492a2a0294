import type { CellRef } from '../../core/model/problem';
import type { ChangeKey, StateKey } from '../panel/action';
import type { FigureShown, IntervalShown, RuleShown } from './figureShown';

/** A number as people read it, and in full: the shortest text that reads back to the same double; '' where it is words. */
export interface Printed {
  readonly text: string;
  readonly full: string;
}

/** A control: what it sets and what it is set to now. */
export interface ControlShown<Key = ChangeKey> {
  readonly key: Key;
  readonly label: string;
  readonly value: string;
}

export interface AnswerShown {
  /** "crazed = yes: 12/36 (33%) in slow cool, 6/36 (17%) in standard": printed first; null for means. */
  readonly shares: string | null;
  /** "hardness is higher in slow cool than in standard by 22.6 MPa". */
  readonly headline: string;
  /** The difference in words where the headline does not hold it; null where it does. */
  readonly difference: string | null;
  /** "95% interval 8.6 to 36.6 MPa"; for one-sided questions the bound. null: the chosen row has no interval. */
  readonly interval: string | null;
  /** The two-sided interval beside a bound; the interval at the stated confidence beside that of a margin question. */
  readonly beside: string | null;
  /** What the interval says of the size that matters, and the same in few words; '' where a margin was asked about. */
  readonly matters: string;
  readonly mattersShort: string;
  /** "p = 0.003"; null: the chosen row has none. */
  readonly p: string | null;
  /** "t 3.38 on 19.4 degrees of freedom". */
  readonly statistic: string | null;
  /** "12 firings against 12, each firing's own readings averaged." */
  readonly design: string;
  /** "separate variances": the chosen row in words. */
  readonly variance: string;
  /** What choosing the row claims, and why it should not be relied on, if so. */
  readonly doubt: string | null;
  /** Questions that the data leave open: no record is made until they are answered. */
  readonly open: readonly string[];
  readonly controls: readonly ControlShown[];
  /** One quiet line, always. */
  readonly caution: string;
  /** The fuller text where the words of the file suggest that a result could hurt someone; else empty. */
  readonly cautions: readonly string[];
  /** Things decided for the person that they should know. */
  readonly notes: readonly string[];
}

/** One line under other assumptions. */
export interface RowShown {
  readonly id: string;
  readonly data: string;
  readonly title: string;
  readonly chosen: boolean;
  /** "chosen", else ''. */
  readonly chosenWord: string;
  readonly counted: boolean;
  /** "8.6 to 36.6" or "no interval". */
  readonly interval: Printed;
  readonly decision: string;
  /** What the row assumes, or why it is not counted. */
  readonly note: string;
  /** null: no interval, or one on another scale. */
  readonly bar: IntervalShown | null;
}

export interface WhatIfShown {
  readonly heading: string;
  readonly caption: string;
  readonly verdict: string;
  /** Without the range of the intervals. */
  readonly verdictShort: string;
  /** One more sentence where the choice decides: which group is smaller and more variable. */
  readonly explained: string | null;
  readonly sameData: string;
  /** Column heads. */
  readonly words: {
    readonly assumption: string;
    readonly interval: string;
    readonly decision: string;
    readonly note: string;
  };
  /** Chosen first, then counted rows and bounds of the same quantity. */
  readonly rows: readonly RowShown[];
  /** Rows about another quantity: shown, not counted. */
  readonly others: { readonly summary: string; readonly rows: readonly RowShown[] } | null;
  readonly notApplying: {
    readonly summary: string;
    readonly rows: readonly { readonly title: string; readonly why: string }[];
  } | null;
  readonly rules: readonly RuleShown[];
}

export interface FindingShown {
  readonly id: string;
  readonly level: 'note' | 'warn' | 'ask' | 'stop';
  readonly levelWord: string;
  readonly sentence: string;
  readonly cells: readonly { readonly at: CellRef; readonly label: string }[];
}

export interface FindingsShown {
  readonly heading: string;
  /** stop, ask, warn: at most five, open. */
  readonly open: readonly FindingShown[];
  readonly folded: { readonly summary: string; readonly list: readonly FindingShown[] } | null;
  /** "18 checks saw nothing; 5 cannot tell with 12 firings." */
  readonly quiet: string;
}

export interface NumberRow {
  readonly key:
    'n' | 'readings' | 'missing' | 'leftOut' | 'mean' | 'sd' | 'median' | 'range' | 'percent' | 'p';
  readonly name: string;
  /** Without the unit. */
  readonly short: string;
  /** One cell a group, then one for the difference where there is one. */
  readonly cells: readonly (Printed | null)[];
}

export interface NumbersShown {
  readonly heading: string;
  readonly caption: string;
  readonly quantity: string;
  /** "in MPa", '' without a unit. */
  readonly inUnit: string;
  readonly columns: readonly string[];
  readonly rows: readonly NumberRow[];
  /** "2.8% of standard (1.0 to 4.5)"; null where it has no meaning. */
  readonly percent: string | null;
  /** Effect sizes and evidence on the assumptions, folded. */
  readonly more: {
    readonly summary: string;
    readonly effects: readonly { readonly name: string; readonly value: Printed }[];
    readonly evidence: readonly string[];
  } | null;
}

export interface LeftOutShown {
  readonly heading: string;
  /** "None." where nothing was left out. */
  readonly none: string | null;
  readonly rows: readonly {
    /** "line 31, firing 9, tile 3, 731 MPa: tile cracked on the saw (before the result)". */
    readonly sentence: string;
    /** "line 31, 731: tile cracked on the saw". */
    readonly short: string;
    /** "line 31". */
    readonly place: string;
    readonly file: number;
    readonly line: number;
    readonly at: CellRef;
  }[];
  /** "With it kept: 20.7 MPa (4.0 to 37.3), p = 0.018." */
  readonly kept: string | null;
}

export interface TableShown {
  readonly heading: string;
  readonly caption: string;
  readonly columns: readonly string[];
  readonly rows: readonly (readonly Printed[])[];
}

export interface NotebookShown {
  readonly heading: string;
  readonly states: readonly (ControlShown<StateKey> & {
    /** The command line's flag where it is not stated; else null. */
    readonly flag: string | null;
  })[];
  /** "Nothing was changed after the result was seen.", or one sentence a change. */
  readonly changed: readonly string[];
  readonly isChanged: boolean;
  readonly blockHeading: string;
  readonly blockText: string | null;
  /** Why there is no block; null where there is one. */
  readonly noBlock: string | null;
  /** One paragraph for a notebook. */
  readonly paragraph: string;
}

/** A part of the full record of an exported page: names and values. */
export interface RecordPart {
  readonly heading: string;
  readonly rows: readonly (readonly [name: string, value: string])[];
}

export interface RecordShown {
  readonly heading: string;
  readonly parts: readonly RecordPart[];
  /** Lines to sign on: "Performed", "Checked"; then the columns name, date, record id. */
  readonly signOff: {
    readonly heading: string;
    readonly rows: readonly string[];
    readonly columns: readonly string[];
    readonly recordId: string;
    readonly foot: readonly string[];
  };
}

/** Words of buttons and labels, in the reader's language. */
export interface ButtonWords {
  readonly show: string;
  readonly takeBack: string;
  readonly copyBlock: string;
  readonly full: string;
  readonly values: string;
  readonly ask: string;
  readonly theFile: string;
  readonly leftOut: string;
}

/** A comparison in words and printed numbers: plain data, the same for panel, terminal, notebook entry and page. */
export interface View {
  readonly title: string;
  readonly answer: AnswerShown;
  readonly figure: FigureShown | null;
  readonly whatIf: WhatIfShown;
  readonly findings: FindingsShown;
  readonly numbers: NumbersShown;
  /** Pairs of groups (several groups), the family (several columns). */
  readonly tables: readonly TableShown[];
  readonly leftOut: LeftOutShown;
  readonly notebook: NotebookShown;
  readonly record: RecordShown;
  readonly words: ButtonWords;
  /** Several measured columns: one view each, in the order asked. */
  readonly columns: readonly View[];
}
