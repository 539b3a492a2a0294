import { answerFrom } from '../../src/compare/answer';
import type { CompareOptions } from '../../src/compare/compare';
import type { Request } from '../../src/compare/request';
import type { Table } from '../../src/core/model/cells';
import type { Comparison, Row } from '../../src/core/model/comparison';
import { Refusal } from '../../src/core/model/problem';
import { tableFrom } from './tableFrom';

export const base: Request = { files: ['firings.csv'], wish: {} };

/** A comparison of comma-separated lines. */
export function ask(
  text: string | Table | null,
  request: Partial<Request>,
  options: CompareOptions = {},
): Comparison {
  const table = typeof text === 'string' ? tableFrom(text) : text;
  return answerFrom(table, { ...base, ...request }, () => undefined, options);
}

/** The refusal that asking ends with. */
export function refusal(run: () => unknown): Refusal {
  try {
    run();
  } catch (error) {
    if (error instanceof Refusal) return error;
    throw error;
  }
  throw new Error('it was not refused');
}

export const rowOf = (comparison: Comparison, id: string, data?: string): Row =>
  comparison.whatIf.rows.find(row => row.id === id && (data === undefined || row.data === data))!;
