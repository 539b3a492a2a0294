import * as v from 'valibot';
import type { CellRef, Problem } from '../core/model/problem';

export const countSchema = v.pipe(v.number(), v.integer(), v.minValue(0));
export const lineSchema = v.pipe(v.number(), v.integer(), v.minValue(1));

export const cellRefSchema: v.GenericSchema<unknown, CellRef> = v.strictObject({
  file: countSchema,
  line: lineSchema,
  field: countSchema,
});

/** A problem in words with the cell it is about, so that it can be gone to. */
export interface ShownProblem {
  readonly code: string;
  readonly message: Problem['message'];
  readonly where: Problem['where'];
  readonly fix: Problem['fix'];
  readonly at: CellRef | null;
}

export const shownProblemSchema: v.GenericSchema<unknown, ShownProblem> = v.strictObject({
  code: v.string(),
  message: v.string(),
  where: v.nullable(v.string()),
  fix: v.string(),
  at: v.nullable(cellRefSchema),
});
