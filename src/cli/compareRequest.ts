import type { Request } from '../compare/request';
import type { LeftOut, OptionValue, Provenance } from '../core/model/settings';
import { MISSING_WORDS, type ReadingWish } from '../readers/readingWish';
import { around, namesOf, numberOf, rangesOf, twoNumbersOf, wholeNumberOf } from './flagValues';
import { declaredFlags } from './compareFlags';
import { refuseTwice } from './contradictions';
import type { Options } from './options';
import { UsageError } from './usageError';

/** What a command line says, laid over a recipe or alone; keys that were not said are absent. */
export type Said = Omit<Partial<Request>, 'files' | 'wish'>;

const delimiters: Readonly<Record<string, string>> = {
  tab: '\t',
  '\\t': '\t',
  comma: ',',
  semicolon: ';',
  space: ' ',
  pipe: '|',
};
const decimals: Readonly<Record<string, '.' | ','>> = { '.': '.', point: '.', ',': ',', comma: ',' };

/** Keeps what was said and drops what was not, as exact optional keys want it. */
function said<Keys extends object>(keys: {
  readonly [Key in keyof Keys]: Keys[Key] | undefined;
}): Partial<Keys> {
  const entries = Object.entries(keys).filter(([, value]) => value !== undefined);
  return Object.fromEntries(entries) as Partial<Keys>;
}

/** How the file shall be read, as far as flags say so. */
export function wishOf(options: Options): ReadingWish {
  const delimiter = options.text('delimiter');
  const decimal = options.text('decimal');
  const mark = decimal === undefined ? undefined : decimals[decimal];
  if (decimal !== undefined && mark === undefined) {
    throw new UsageError(
      `--decimal ${decimal} is no decimal mark`,
      'Write --decimal point or --decimal comma.',
    );
  }
  const character = delimiter === undefined ? undefined : (delimiters[delimiter] ?? delimiter);
  if (character !== undefined && character.length !== 1) {
    throw new UsageError(
      `--delimiter ${delimiter ?? ''} is not one character`,
      'Write one character, or tab, comma, semicolon, space, pipe.',
    );
  }
  const header = options.text('header');
  const missing = options.texts('missing');
  return said<ReadingWish>({
    encoding: options.text('encoding'),
    delimiter: character,
    decimal: mark,
    header: header === undefined ? undefined : wholeNumberOf('header', header, 0),
    missing: missing.length === 0 ? undefined : [...MISSING_WORDS, ...missing],
    below: options.choice('below', ['refuse', 'zero', 'half', 'limit']),
  });
}

function leaveOutOf(text: string, files: readonly string[]): LeftOut {
  const alone = /^\s*(\d+)\s*:\s*(.*\S)\s*$/s.exec(text);
  const withFile = /^(.+?):(\d+)\s*:\s*(.*\S)\s*$/s.exec(text);
  const example = '--leave-out "17:tile cracked on the saw"';
  if (alone !== null && files.length < 2) {
    return { file: 0, line: Number(alone[1]), reason: alone[2] ?? '', afterResult: false };
  }
  const file = files.findIndex(name => name === withFile?.[1] || name.endsWith(`/${withFile?.[1] ?? ''}`));
  if (withFile !== null && file >= 0) {
    return { file, line: Number(withFile[2]), reason: withFile[3] ?? '', afterResult: false };
  }
  if (alone !== null) {
    const named = files[0] ?? '';
    throw new UsageError(
      `--leave-out ${text} does not say which file`,
      `Put the file before the line: --leave-out "${named}:${text}".`,
    );
  }
  throw new UsageError(`--leave-out ${text} has no line or no reason`, `Write the line and why: ${example}.`);
}

function declaredOptions(options: Options): Record<string, OptionValue> {
  const values: Record<string, OptionValue> = {};
  for (const { flag, option } of declaredFlags) {
    const text = options.text(flag.name);
    if (text === undefined) continue;
    if (option.kind === 'number') values[option.key] = numberOf(flag.name, text);
    else if (option.kind === 'integer') values[option.key] = wholeNumberOf(flag.name, text, option.min ?? 0);
    else if (option.kind === 'numbers')
      values[option.key] = text.split(',').map(part => numberOf(flag.name, part));
    else values[option.key] = text;
  }
  return values;
}

const plainOptions = (options: Options): Record<string, OptionValue> => {
  const seed = options.text('seed');
  const draws = options.text('draws');
  const primary = options.text('primary');
  return {
    ...(seed === undefined ? {} : { seed: wholeNumberOf('seed', seed, 0) }),
    ...(draws === undefined ? {} : { draws: wholeNumberOf('draws', draws, 1) }),
    ...(primary === undefined ? {} : { primary }),
  };
};

function marginOf(text: string | undefined): readonly [number, number] | undefined {
  if (text === undefined) return undefined;
  if (text.includes(',')) return twoNumbersOf('margin', text, 'LO,HI');
  const margin = numberOf('margin', text);
  return [-margin, margin];
}

function columnsOf(texts: readonly string[]): readonly string[] {
  const columns = namesOf('columns', texts);
  const twice = columns.find((name, index) => columns.indexOf(name) !== index);
  if (twice !== undefined)
    throw new UsageError(`--columns names ${twice} twice`, 'Name each column once: each is a group.');
  return columns;
}

/** Numbers, names and rows of the flags as a request; `files` are the names of the data files, for leave-outs. */
export function saidBy(options: Options, files: readonly string[]): Said {
  const number = (flag: string) => {
    const text = options.text(flag);
    return text === undefined ? undefined : numberOf(flag, text);
  };
  const listed = <Value>(flag: string, values: (texts: readonly string[]) => readonly Value[]) => {
    const texts = options.texts(flag);
    return texts.length === 0 ? undefined : values(texts);
  };
  const per = listed('per', texts => namesOf('per', texts));
  const sigma = options.text('sigma');
  const values = { ...plainOptions(options), ...declaredOptions(options) };
  return said<Said>({
    measured: listed('of', texts => texts),
    label: options.text('by'),
    columns: listed('columns', columnsOf),
    summary: options.has('summary') ? true : undefined,
    test: options.text('test'),
    reference: options.text('reference'),
    per: per?.length === 1 && per[0] === 'none' ? 'none' : per,
    pair: options.text('pair'),
    measure: options.choice('measure', ['mean', 'ratio', 'proportion', 'rank', 'spread']),
    success: options.text('success'),
    variance: options.choice('variance', ['separate', 'pooled', 'known']),
    sigma: sigma === undefined ? undefined : twoNumbersOf('sigma', sigma, 'T,R'),
    df: options.choice('df', ['welch', 'smaller']),
    curve: options.choice('curve', ['t', 'normal', 'normal-over-30']),
    method: options.text('method'),
    question: options.choice('question', [
      'differs',
      'higher',
      'lower',
      'equivalent',
      'not-lower',
      'not-higher',
    ]),
    margin: marginOf(options.text('margin')),
    matters: number('matters'),
    against: number('against'),
    confidence: number('confidence'),
    rows: listed('rows', texts => rangesOf('rows', texts)),
    where: listed('where', texts => texts.map(text => around('where', '=', text, '"site=North"'))),
    leaveOut: listed('leave-out', texts =>
      refuseTwice(
        'leave-out',
        texts,
        texts.map(text => leaveOutOf(text, files)),
        ({ file, line }) => `${file} ${line}`,
      ),
    ),
    same: listed('same', texts =>
      refuseTwice(
        'same',
        texts,
        texts.map(text => around('same', ' -> ', text, '"Slow cool -> slow cool"')),
        ([from]) => from,
      ),
    ),
    onlyChosen: options.has('only-chosen') ? true : undefined,
    options: Object.keys(values).length === 0 ? undefined : values,
  });
}

/** What the record shall say beside the numbers; `purpose` is that of a recipe. */
export function provenanceOf(options: Options, purpose = ''): Provenance {
  const texts = options.texts('reason');
  const reasons = texts.map(text => around('reason', '=', text, '"method=protocol 12"'));
  return {
    questionInWords: options.text('purpose') ?? purpose,
    sampling: options.text('sampling') ?? '',
    analyst: options.text('analyst') ?? '',
    reasons: Object.fromEntries(refuseTwice('reason', texts, reasons, ([key]) => key)),
    changed: [],
    looks: 1,
    plan: null,
    replaces: null,
  };
}
