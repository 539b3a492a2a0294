import type { Reading } from '../model/cells';
import type { Finding, Seen } from '../model/comparison';

/** What one reading met of a kind: how often, and the first of them with their places. */
export interface PassedOver {
  readonly count: number;
  readonly met: Reading['met'];
}

const CELLS = 20;

/** null where none of this kind was met. */
export function passedOver({ met, metCounts }: Reading, what: string): PassedOver | null {
  const own = met.filter(one => one.what === what);
  return own.length === 0 ? null : { count: metCounts[what] ?? own.length, met: own };
}

/** A finding about rows or cells that a reading met, at the places of the first of them. */
export function metFinding(
  id: string,
  level: Finding['level'],
  { count, met }: PassedOver,
  facts: Finding['facts'],
): Finding {
  const cells = met.slice(0, CELLS).map(({ at }) => at);
  return { id, level, facts: { ...facts, count }, group: null, count, cells, answers: [] };
}

/** What of this was not met in a row that is left out: that row says nothing about the values compared. */
export function withoutLeftOut({ count, met }: PassedOver, { settings }: Seen): PassedOver | null {
  const isOut = (file: number, line: number): boolean =>
    settings.leftOut.some(row => row.file === file && row.line === line);
  const left = met.filter(({ at }) => !isOut(at.file, at.line));
  return left.length === 0 ? null : { count: count - (met.length - left.length), met: left };
}
