import type { Flag } from './flag';

/** Flags that more than one command takes, and the lists of the small commands. */
export const help: Flag = { name: 'help', value: null, says: 'this page', about: 'output' };

export const readingFlags: readonly Flag[] = [
  {
    name: 'delimiter',
    value: 'C',
    says: 'the character between cells; tab, semicolon, comma',
    about: 'reading the file',
  },
  { name: 'decimal', value: 'C', says: 'the decimal mark: point or comma', about: 'reading the file' },
  {
    name: 'header',
    value: 'N',
    says: 'the line that holds the column names; 0: none does',
    about: 'reading the file',
  },
  { name: 'encoding', value: 'E', says: 'as utf-8, windows-1252, utf-16le', about: 'reading the file' },
  {
    name: 'missing',
    value: 'WORD',
    repeats: true,
    says: 'a word that stands for a missing value in this file, beside the usual ones',
    about: 'reading the file',
  },
];

export const format = (choices: readonly string[]): Flag => ({
  name: 'format',
  value: 'WORD',
  choices,
  says: 'how the answer is written',
  about: 'output',
});
export const out: Flag = { name: 'out', value: 'FILE', says: 'write the answer there', about: 'output' };

export const inspectFlags: readonly Flag[] = [...readingFlags, format(['text', 'json']), out, help];
export const recheckFlags: readonly Flag[] = [
  {
    name: 'root',
    value: 'DIR',
    says: 'the folder that file names in blocks start from (the current one)',
    about: 'the record',
  },
  {
    name: 'allow',
    value: 'WORD[,…]',
    repeats: true,
    says: 'outcomes that shall not count as failed, as moved',
    about: 'output',
  },
  format(['text', 'json']),
  help,
];
export const methodsFlags: readonly Flag[] = [format(['text', 'json', 'markdown']), help];
export const explainFlags: readonly Flag[] = [help];
