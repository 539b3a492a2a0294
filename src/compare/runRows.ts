import type { Row } from '../core/model/comparison';
import type { MethodDescriptor } from '../core/model/methods';
import { Refusal, type Ticker } from '../core/model/problem';
import type { Table } from '../core/model/cells';
import type { Settings } from '../core/model/settings';
import { askOf } from './askOf';
import { prepare, type Prepared } from './prepared';
import { notComputed, runRow, standsBeside, type RowAsk } from './runRow';
import { variantsOf } from './variants';

/** Which rows are wanted and where they come from. */
export interface Wanted {
  readonly chosen: MethodDescriptor;
  readonly list: readonly MethodDescriptor[];
  /** Ids to compute; null: every method that stands beside it. */
  readonly only: readonly string[] | null;
  readonly tick: Ticker;
}

/**
 * One row for each method that stands beside the data, in registry order; after the chosen one's its variants (left-out
 * rows put back, values below a limit taken otherwise), `all` first.
 */
export function runRows(
  table: Table | null,
  settings: Settings,
  prepared: Prepared,
  { chosen, list, only, tick }: Wanted,
): { readonly rows: readonly Row[]; readonly chosen: Row } {
  const ruled = settings.options['ruled-out'];
  const ruledOut = new Set(typeof ruled === 'string' ? ruled.split(',').map(id => id.trim()) : []);
  const asked: RowAsk = { ask: askOf(settings, list), data: 'all', chosen, ruledOut, tick };
  const { data, beside } = variantsOf(table, settings, prepared.selection);
  let answer: Row | null = null;
  const rows: Row[] = [];
  for (const method of list) {
    if (!standsBeside(method, chosen, prepared.design)) continue;
    if (only !== null && method !== chosen && !only.includes(method.id)) continue;
    const row = runRow(method, prepared.designs, { ...asked, data });
    if (method !== chosen) {
      rows.push(row);
      continue;
    }
    answer = row;
    const others = beside.map(variant =>
      variantRow(method, table, variant.settings, { ...asked, data: variant.data }),
    );
    rows.push(
      ...others.filter(other => other.data === 'all'),
      row,
      ...others.filter(other => other.data !== 'all'),
    );
  }
  if (answer === null)
    throw new Refusal('method-not-for-this', { method: chosen.id, measure: settings.measure });
  return { rows, chosen: answer };
}

/** A variant that turns out not to be computable is a row that says so, not a refusal of the whole. */
function variantRow(method: MethodDescriptor, table: Table | null, settings: Settings, asked: RowAsk): Row {
  try {
    return runRow(method, prepare(table, settings, asked.tick).designs, asked);
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    return notComputed(method.id, asked.data, { code: 'variant-refused', facts: { problem: error.code } });
  }
}
