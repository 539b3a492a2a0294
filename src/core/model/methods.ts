import type { Designs } from './groups';
import type { Ticker } from './problem';
import type { Facts, Reason, Say } from './say';
import type { Measure, OptionValue, Question } from './settings';

/** An option that a method or evidence check declares; flags, schema and block keys are derived from it. */
export interface OptionSpec {
  /** Key in Settings.options and in the block. */
  readonly key: string;
  /** Command-line flag without dashes. */
  readonly flag: string;
  readonly kind: 'number' | 'integer' | 'numbers' | 'choice' | 'text';
  readonly default: OptionValue | null;
  readonly choices?: readonly string[];
  readonly min?: number;
  readonly max?: number;
  says(t: Say): string;
}

/** A ratio is 1 where the groups are alike, the chance that a value of the test group is the larger 0.5. */
export type Estimates = 'difference' | 'ratio' | 'chance';

/** What is asked of a method. `against` and `margin` are in units of its measure: for `ratio` and `spread` they are ratios. */
export interface Ask {
  readonly question: Question;
  readonly confidence: number;
  readonly against: number;
  readonly margin: readonly [number, number] | null;
  option(key: string): OptionValue | null;
}

export interface MethodResult {
  readonly estimate: number | null;
  readonly se: number | null;
  readonly statistic: number | null;
  /** null: normal curve; a pair: F. */
  readonly df: number | readonly [number, number] | null;
  readonly p: number | null;
  /** null: open end, or no interval. */
  readonly lower: number | null;
  readonly upper: number | null;
  /** Of the printed interval or bound (0.9 for `equivalent` at confidence 0.95). */
  readonly confidence: number;
  /** Beside every question but `differs`: the two-sided p and interval at the stated confidence. */
  readonly twoSided?: {
    readonly p: number | null;
    readonly lower: number | null;
    readonly upper: number | null;
  };
  readonly extra?: Facts;
}

/** A statistical method: its file, its test and one line of the list are all it takes. */
export interface MethodDescriptor<Id extends string = string, D extends keyof Designs = keyof Designs> {
  readonly id: Id;
  /** Raised whenever a number it gives changes. */
  readonly version: number;
  readonly design: D;
  readonly measure: Measure;
  /** What the estimate is, and with it the value it has when the groups are alike; absent: a difference, and 0. */
  readonly estimates?: Estimates;
  readonly questions: readonly Question[];
  /** Name of the statistic as printed: t, z, F, … */
  readonly statistic: string;
  readonly needs: 'summary' | 'values';
  /** Enters the 'depends' verdict (never a row that draws at random, never a bound). */
  readonly counted: boolean;
  readonly options: readonly OptionSpec[];
  /** Full references, published sources first. */
  readonly references: readonly string[];
  /** Rough operations; above the budget compare leaves the row out and says so. */
  work(n: number, ask: Ask): number;
  /** Why it cannot be computed on these data; null when it can. */
  applies(data: Designs[D], ask: Ask): Reason | null;
  /** Computed, but not to be relied on (n small, a bound, pooled with one SD 0, …); null when nothing speaks against it. */
  doubts(data: Designs[D], ask: Ask): Reason | null;
  /** Called only when `applies` gave null. */
  run(data: Designs[D], ask: Ask, tick: Ticker): MethodResult;
  /** Short name of the row as printed ("separate", "smaller df"). */
  title(t: Say): string;
  /** One line: what choosing it claims. */
  assumes(t: Say): string;
  /** One paragraph for `explain`: what is computed. */
  explains(t: Say): string;
  /** One sentence for `explain`: when not to use it. */
  notWhen(t: Say): string;
  /** Sentence for a reason of its own. */
  why(reason: Reason, t: Say): string;
}

/** Keeps the literal id and design in the type of a descriptor. */
export const method = <Id extends string, D extends keyof Designs>(
  descriptor: MethodDescriptor<Id, D>,
): MethodDescriptor<Id, D> => descriptor;
