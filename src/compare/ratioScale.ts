/** Units whose zero is a convention: a percent of such a value has no meaning. */
const INTERVAL_UNITS: ReadonlySet<string> = new Set([
  '°c',
  '℃',
  '°f',
  '℉',
  'degc',
  'deg c',
  'degf',
  'deg f',
  'ph',
  'db',
  'dba',
  'db(a)',
  'dbm',
]);

/** Names of columns that hold such values without saying a unit. */
const INTERVAL_NAME = /^ph\b/i;

/** Whether a percent of a value means anything: not for °C, °F, pH, decibels, nor where a value lies below 0. */
export function isRatioScale(name: string, unit: string | null, lowest: number | null): boolean {
  if (lowest !== null && lowest < 0) return false;
  if (INTERVAL_NAME.test(name.trim())) return false;
  return unit === null || !INTERVAL_UNITS.has(unit.trim().toLowerCase());
}
