import { splitQuoted } from './papa';

/** The cells of one record (without its line end) as they read without quotes. */
export const splitRecord = (record: string, delimiter: string): readonly string[] =>
  record.includes('"') ? splitQuoted(record, delimiter) : record.split(delimiter);
