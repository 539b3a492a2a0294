import type { NumberRow, View } from '../view/shown';
import { columnWidths, padded, widthOf, wrapped } from './columns';

const GAP = 2;
const SHOWN: readonly NumberRow['key'][] = ['n', 'readings', 'missing', 'leftOut', 'mean', 'sd', 'range'];

/** The table of numbers; where it is too wide for the terminal, one quantity a paragraph. Then statistic and percent. */
export function numbersLines({ numbers, answer }: View, width: number): readonly string[] {
  const rows = numbers.rows.filter(row => SHOWN.includes(row.key));
  const cells = [
    [numbers.inUnit, ...numbers.columns],
    ...rows.map(row => [row.short, ...row.cells.map(cell => cell?.text ?? '')]),
  ];
  const widths = columnWidths(cells);
  const total = widths.reduce((sum, own) => sum + own + GAP, -GAP);
  const table =
    total <= width
      ? cells.map(row =>
          row
            .map((cell, at) => padded(cell, (widths[at] ?? 0) + GAP))
            .join('')
            .trimEnd(),
        )
      : rows.flatMap(row => stacked(row, numbers.columns, width));
  const foot = [answer.statistic, numbers.percent].filter(part => part !== null);
  return [...table, ...(foot.length === 0 ? [] : wrapped(foot.join('; '), width))];
}

/** "mean, MPa", then a line for each group. */
function stacked(row: NumberRow, columns: readonly string[], width: number): readonly string[] {
  const lines = row.cells.flatMap((cell, at) =>
    cell === null ? [] : wrapped(`${columns[at] ?? ''}: ${cell.text}`, width, '  ', 4),
  );
  return widthOf(row.name) === 0 ? lines : [...wrapped(row.name, width), ...lines];
}
