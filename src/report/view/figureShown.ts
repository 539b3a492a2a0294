import type { CellRef } from '../../core/model/problem';

/** A value marked on an axis: 0, what matters, a margin. */
export interface RuleShown {
  readonly at: number;
  /** '' for the value of groups that are alike, which the axis names. */
  readonly label: string;
  readonly kind: 'zero' | 'against' | 'matters' | 'margin';
}

export interface IntervalShown {
  readonly estimate: number | null;
  /** null: open end. */
  readonly lower: number | null;
  readonly upper: number | null;
}

/** One value drawn as a point. `at` is its cell, null where there is none (unit means, summaries). */
export interface PointShown {
  readonly value: number;
  /** As it stands in the list of values. */
  readonly text: string;
  readonly label: string;
  readonly at: CellRef | null;
  /** Outside the fences of its group (quartiles less and plus 1.5 times their distance): drawn open. */
  readonly far: boolean;
}

/** Counts of values in equal bins, for groups too large to draw every point. */
export interface DensityShown {
  readonly from: number;
  readonly width: number;
  readonly counts: readonly number[];
}

export interface GroupFigure {
  readonly label: string;
  /** "n = 12". */
  readonly n: string;
  /** Values that count: readings, or unit means (then `small` holds the readings). */
  readonly points: readonly PointShown[];
  readonly small: readonly PointShown[];
  readonly density: DensityShown | null;
  /** Mean and its own interval; null for counts. */
  readonly mean: IntervalShown;
}

/** Geometry inputs of the figure: values in the units of the axis, never places on the screen. */
export interface FigureShown {
  /** One sentence that says what is seen, for those who do not see it. */
  readonly sentence: string;
  readonly caption: string;
  /** "hardness, MPa". */
  readonly axis: string;
  readonly kind: 'values' | 'pairs' | 'shares';
  readonly groups: readonly GroupFigure[];
  /** Matched values of the first two groups, test first. */
  readonly lines: readonly (readonly [number, number])[];
  readonly difference:
    | (IntervalShown & {
        readonly label: string;
        readonly axis: string;
        /** Unit of the difference, '' where there is none. */
        readonly unit: string;
        /** Power of ten by which axis values are printed larger: 2 for shares. */
        readonly power: number;
        readonly rules: readonly RuleShown[];
        /** Difference of each pair. */
        readonly points: readonly number[];
      })
    | null;
}
