import { parse } from 'papaparse';

/**
 * Splits one record, quotes and all, into its cells as they read without quotes.
 * @param record a whole record without its line end; line ends stand only inside quotes
 */
export function splitQuoted(record: string, delimiter: string): readonly string[] {
  const { data } = parse<string[]>(`${record}\n`, {
    delimiter,
    newline: '\n',
    quoteChar: '"',
    header: false,
    dynamicTyping: false,
    skipEmptyLines: false,
    preview: 1,
  });
  return data[0] ?? [];
}
