import { Cell, type Numbers } from '../core/model/cells';
import type { Below } from '../core/model/settings';
import { exactText, gather } from '../core/numeric/numbers';
import { NumbersBuilder } from '../core/numeric/numbersBuilder';
import { parseDecimal } from '../core/numeric/decimal';
import { cellState, type Measured } from './measuredValues';

/**
 * The values of a measured column at these rows: numbers as written; outcomes as 1 (success) and 0; a reading below a
 * limit as 0, half the limit or the limit; a reading above one as the limit.
 */
export function gathered(
  measured: Measured,
  rows: Int32Array,
  below: Below,
  success: string | null,
): Numbers {
  if (measured.kind === 'outcomes') {
    const wanted = success === null ? -1 : measured.column.levels.indexOf(success);
    const builder = new NumbersBuilder(rows.length);
    for (const row of rows) builder.add(measured.column.codes[row] === wanted ? 1 : 0, 0);
    return builder.build();
  }
  const { numbers, state } = measured.column;
  const values = gather(numbers, rows);
  const isBelow = (row: number): boolean => cellState(measured, row) === Cell.Below;
  if (state === null || below === 'limit' || !rows.some(isBelow)) return values;
  const builder = new NumbersBuilder(rows.length);
  rows.forEach((row, at) => {
    const limit = exactText(values, at);
    if (!isBelow(row)) builder.addDecimal(limit);
    else if (below === 'zero') builder.add(0, 0);
    else addHalf(builder, limit);
  });
  return builder.build();
}

/** Half of a decimal is five times its digits, one place further down. */
function addHalf(builder: NumbersBuilder, limit: string): void {
  const parsed = parseDecimal(limit, '.');
  if (parsed !== null) builder.addInteger(parsed.digits * 5n, parsed.decimals + 1);
}
