import type { Comparison, Row } from '../../core/model/comparison';
import type { Say } from '../../core/model/say';
import { methodTitle } from '../words/methodWords';

const LEFT_OUT = 'without left-out';

/** The short name of a row: its method, the treatment of its data where that is not the chosen one, or both. */
export function rowTitle(row: Row, comparison: Comparison, t: Say): string {
  const { chosen } = comparison;
  const method = methodTitle(row.id, t);
  if (row.data === chosen.data) return method;
  const data = dataWords(row.data, comparison, t);
  return row.id === chosen.id ? data : `${method}, ${data}`;
}

/** Whether the row is the chosen one with the person's left-out rows put back. */
export const putsBack = (row: Row, { chosen }: Pick<Comparison, 'chosen'>): boolean =>
  row.id === chosen.id &&
  row.data !== chosen.data &&
  partsOf(chosen.data).includes(LEFT_OUT) &&
  !partsOf(row.data).includes(LEFT_OUT);

/** How a row's data differ from those of the chosen row: left-out rows kept, values below a limit taken otherwise. */
function dataWords(data: string, { leftOut, chosen }: Comparison, t: Say): string {
  const own = partsOf(data);
  const usual = partsOf(chosen.data);
  const differing = own.filter(part => !usual.includes(part)).map(part => partWords(part, t));
  const kept = usual.includes(LEFT_OUT) && !own.includes(LEFT_OUT);
  const back =
    leftOut.length === 1
      ? t('line {0} kept', leftOut[0]?.line ?? 0)
      : t('{0} left-out rows kept', leftOut.length);
  return [...(kept ? [back] : []), ...differing].join(', ');
}

const partsOf = (data: string): readonly string[] => (data === 'all' ? [] : data.split(', '));

function partWords(part: string, t: Say): string {
  switch (part) {
    case LEFT_OUT:
      return t('without the rows left out');
    case 'below as zero':
      return t('below the limit as 0');
    case 'below as half':
      return t('below the limit as half of it');
    case 'below as limit':
      return t('below the limit as the limit');
    default:
      return part;
  }
}
