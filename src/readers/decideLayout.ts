import { Refusal } from '../core/model/problem';
import { COMMA, QUOTE } from './byteCodes';
import { isNumber, provenThousands } from './cellClasses';
import { isBlank } from './foot';
import { headRecords } from './headRecords';
import { bestCandidate, DELIMITERS, type Candidate } from './layoutScore';
import type { HeadBytes } from './readHead';
import { MISSING_WORDS, type ReadingWish } from './readingWish';
import { readGrouped } from './thousands';

export interface Layout extends Candidate {
  readonly thousands: string;
  readonly missing: readonly string[];
}

/** Two readings whose scores are nearer than this are equally good. */
const EQUAL = 0.98;

/** A first line that names the delimiter: sep=; */
const NAMED_DELIMITER = /^\uFEFF?"?sep=(.)"?\s*$/i;

/**
 * Decides delimiter, decimal mark and header row together: the reading under which most records have the width of the
 * header and most cells are numbers.
 * @param name the file, for problems
 * @param file its index, for problems
 * @throws Refusal quote-unclosed, file-empty, file-header-only, decimal-undecidable, layouts-equal, header-not-found
 */
export function decideLayout(head: HeadBytes, wish: ReadingWish, name: string, file: number): Layout {
  const missing = wish.missing ?? MISSING_WORDS;
  const delimiters = delimitersToTry(head, wish);
  const heads = delimiters.map(delimiter => headRecords(head.bytes, delimiter, head.whole));
  const candidates = delimiters.flatMap((delimiter, index) => {
    const records = heads[index] ?? { records: [], openQuote: null };
    return decimalsToTry(head, wish, delimiter).flatMap(
      decimal =>
        bestCandidate({
          head: records,
          delimiter,
          decimal,
          missing,
          headerLine: wish.header,
        }) ?? [],
    );
  });
  const best = candidates.reduce<Candidate | null>(
    (a, b) => (a === null || b.score > a.score + 1e-9 ? b : a),
    null,
  );
  const openQuote = heads.flatMap(records => records.openQuote ?? []).sort((a, b) => a.line - b.line)[0];
  // Where nothing parts cells, no quote can open one: such a reading must not hide a quote that another meets.
  const hidden = openQuote !== undefined && best !== null && best.width === 1;
  if (best === null || best.head.openQuote !== null || hidden) {
    if (openQuote === undefined) throw new Refusal('file-empty', { name }, name);
    throw new Refusal('quote-unclosed', { name, line: openQuote.line }, { file, ...openQuote });
  }
  refuseWithoutRows(best, head.whole, wish, name, file);
  refuseUndecidable(best, candidates, name, file);
  if (wish.decimal === undefined && wish.thousands === undefined) refuseGroupedPoints(best, name, file);
  refuseEqualLayouts(best, candidates, name);
  const rows = best.head.records.slice(best.place.data);
  const thousands =
    wish.thousands ?? provenThousands(rows, best.decimal, best.width, wish.decimal !== undefined);
  return { ...best, thousands, missing };
}

function delimitersToTry(head: HeadBytes, wish: ReadingWish): readonly string[] {
  if (wish.delimiter !== undefined) return [wish.delimiter];
  const firstLine = new TextDecoder().decode(head.bytes.subarray(0, 16)).split(/[\r\n]/)[0] ?? '';
  const named = NAMED_DELIMITER.exec(firstLine)?.[1];
  if (named !== undefined) return [named];
  const present = DELIMITERS.filter(delimiter => head.bytes.includes(delimiter.charCodeAt(0)));
  if (present.length === 0) return [','];
  // a comma alone may be a decimal mark: then there is one column, and any other delimiter says so
  return present.length === 1 && present[0] === ',' ? [';', ','] : present;
}

/** No cell holds a comma where commas part the cells and none is in quotes. */
function decimalsToTry(head: HeadBytes, wish: ReadingWish, delimiter: string): readonly ('.' | ',')[] {
  if (wish.decimal !== undefined) return [wish.decimal];
  const commas = head.bytes.includes(delimiter === ',' ? QUOTE : COMMA);
  return commas ? ['.', ','] : ['.'];
}

function refuseWithoutRows(
  best: Candidate,
  whole: boolean,
  wish: ReadingWish,
  name: string,
  file: number,
): void {
  const { records } = best.head;
  if (records.every(({ cells }) => isBlank(cells))) throw new Refusal('file-empty', { name }, name);
  const { header, data } = best.place;
  const at = records[Math.max(0, header)]?.line ?? 1;
  const noRows = records.length === 1 || (header >= 0 && data >= records.length);
  if (noRows && whole)
    throw new Refusal('file-header-only', { name, line: at }, { file, line: at, field: 0 });
  if (header < 0 && wish.header !== 0) {
    const line = wish.header ?? records[data]?.line ?? 1;
    throw new Refusal('header-not-found', { name, line }, { file, line, field: 0 });
  }
}

/** Every comma stands before three digits, and nothing says whether it parts decimals or thousands. */
function refuseUndecidable(best: Candidate, all: readonly Candidate[], name: string, file: number): void {
  const rival = all.find(
    ({ delimiter, decimal }) => delimiter === best.delimiter && decimal !== best.decimal,
  );
  if (rival === undefined || Math.abs(rival.score - best.score) > 1e-9) return;
  for (let row = best.place.data; row < best.head.records.length; row++) {
    const record = best.head.records[row];
    if (record === undefined) continue;
    for (const column of best.place.numeric) {
      const text = record.cells[column]?.trim() ?? '';
      const grouped = readGrouped(text, '.');
      if (!isNumber(best.classes[row]?.[column]) || grouped?.mark !== ',' || !grouped.ambiguous) continue;
      const facts = { name, text, asDecimal: text.replace(',', '.'), asThousands: grouped.text };
      throw new Refusal('decimal-undecidable', facts, { file, line: record.line, field: column });
    }
  }
}

const WHOLE_BELOW_1000 = /^[+\-\u2212]?\d{1,3}$/;
const POINT = /^[+\-\u2212]?\d+\.\d+$/;

/**
 * Where commas do not part the cells, a point before exactly three digits beside whole numbers below 1000 parts thousands as
 * well as decimals: 1.234 is 1234 where 345 stands under it.
 */
function refuseGroupedPoints(
  { head, place, delimiter, decimal }: Candidate,
  name: string,
  file: number,
): void {
  if (delimiter === ',' || decimal !== '.') return;
  for (const column of place.numeric) {
    const cells = head.records.slice(place.data).flatMap(({ cells: own, line }) => {
      const text = (own[column] ?? '').trim();
      return text === '' ? [] : [{ text, line }];
    });
    const points = cells.filter(({ text }) => POINT.test(text));
    const grouped = points.filter(({ text }) => readGrouped(text, ',')?.ambiguous === true);
    const [first] = grouped;
    const isMixed = cells.some(({ text }) => WHOLE_BELOW_1000.test(text));
    if (first === undefined || !isMixed || grouped.length < points.length) continue;
    const { text, line } = first;
    const facts = { name, text, asDecimal: text, asThousands: readGrouped(text, ',')?.text ?? text };
    throw new Refusal('decimal-undecidable', facts, { file, line, field: column });
  }
}

function refuseEqualLayouts(best: Candidate, all: readonly Candidate[], name: string): void {
  const rival = all.find(
    ({ delimiter, score }) => delimiter !== best.delimiter && score >= EQUAL * best.score,
  );
  if (rival === undefined) return;
  throw new Refusal(
    'layouts-equal',
    {
      name,
      delimiters: [best.delimiter, rival.delimiter],
      widths: [best.width, rival.width],
    },
    name,
  );
}
