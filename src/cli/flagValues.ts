import { UsageError } from './usageError';

const plainNumber = /^[+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?$/;

/** A number as typed after a flag, strictly: a point as decimal mark, nothing before or after it. */
export function numberOf(flag: string, text: string): number {
  const typed = text.trim().replace('\u2212', '-');
  const value = Number(typed);
  if (plainNumber.test(typed) && Number.isFinite(value)) return value;
  if (/^[+-]?\d+,\d+$/.test(typed)) {
    throw new UsageError(
      `--${flag} ${text} has a decimal comma`,
      `On the command line numbers have a point: --${flag} ${typed.replace(',', '.')}.`,
    );
  }
  if (/%$/.test(typed)) {
    throw new UsageError(
      `--${flag} ${text} has a percent sign`,
      `Write a plain number, as ${flag === 'confidence' ? '0.95' : '5'}.`,
    );
  }
  throw new UsageError(`--${flag} ${text} is not a number`, 'Write a plain number, as 12.5.');
}

/** A whole number of at least `least`. */
export function wholeNumberOf(flag: string, text: string, least: number): number {
  const value = numberOf(flag, text);
  if (Number.isSafeInteger(value) && value >= least) return value;
  throw new UsageError(
    `--${flag} ${text} is not a whole number of at least ${least}`,
    'Write it without decimals.',
  );
}

/** Two numbers with a comma between them. */
export function twoNumbersOf(flag: string, text: string, names: string): readonly [number, number] {
  const parts = text.split(',');
  const [first, second] = parts;
  if (parts.length !== 2 || first === undefined || second === undefined) {
    throw new UsageError(
      `--${flag} ${text} is not two numbers`,
      `Write --${flag} ${names}, with a point as decimal mark.`,
    );
  }
  return [numberOf(flag, first), numberOf(flag, second)];
}

/** Names with commas between them; a column whose own name has a comma is written as #3, by its place. */
export function namesOf(flag: string, texts: readonly string[]): readonly string[] {
  const names = texts.flatMap(text => text.split(','));
  if (names.some(name => name === '')) {
    throw new UsageError(
      `--${flag} has an empty name`,
      'Put one comma between names; write a column by its place as #3.',
    );
  }
  return names;
}

/** Closed ranges of line numbers: 2-41, or 17, or several with commas. */
export function rangesOf(flag: string, texts: readonly string[]): readonly (readonly [number, number])[] {
  return texts
    .flatMap(text => text.split(','))
    .map(text => {
      const found = /^\s*(\d+)(?:\s*-\s*(\d+))?\s*$/.exec(text);
      const first = Number(found?.[1]);
      const last = Number(found?.[2] ?? found?.[1]);
      if (found === null || first < 1 || last < first) {
        throw new UsageError(
          `--${flag} ${text} is not a range of lines`,
          'Write first-last, as 2-41; lines count from 1.',
        );
      }
      return [first, last] as const;
    });
}

/** Two texts around the first mark. */
export function around(flag: string, mark: string, text: string, example: string): readonly [string, string] {
  const at = text.indexOf(mark);
  if (at <= 0) throw new UsageError(`--${flag} ${text} has no ${mark.trim()}`, `Write --${flag} ${example}.`);
  return [text.slice(0, at), text.slice(at + mark.length)];
}
