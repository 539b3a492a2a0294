import { evidenceChecks } from '../core/evidence/index';
import { methods } from '../core/methods/index';
import type { OptionSpec } from '../core/model/methods';
import { english } from './english';
import type { About, Flag } from './flag';
import { format, help, out, readingFlags } from './flags';

export const formats = ['text', 'json', 'block', 'markdown', 'html'] as const;

const columns: readonly Flag[] = [
  {
    name: 'of',
    value: 'COL',
    repeats: true,
    says: 'the measured column; repeat for several',
    about: 'columns and groups',
  },
  {
    name: 'primary',
    value: 'COL',
    says: 'the one of several measured columns that was named beforehand',
    about: 'columns and groups',
  },
  { name: 'by', value: 'COL', says: 'the label column, one label a group', about: 'columns and groups' },
  {
    name: 'columns',
    value: 'A,B[,…]',
    repeats: true,
    says: 'one column a group, in place of --of and --by',
    about: 'columns and groups',
  },
  {
    name: 'test',
    value: 'L',
    says: 'label of the test group (or its column or file name)',
    about: 'columns and groups',
  },
  {
    name: 'reference',
    value: 'L',
    says: 'label of the reference group: difference = test - reference',
    about: 'columns and groups',
  },
  {
    name: 'per',
    value: 'COL[,COL]',
    repeats: true,
    says: 'unit columns, outermost first: readings of one unit are averaged and count once; none: rows are independent',
    about: 'columns and groups',
  },
  {
    name: 'pair',
    value: 'COL',
    says: 'the column that matches a value in one group with one in the other; none: ids start again in each group',
    about: 'columns and groups',
  },
  {
    name: 'summary',
    value: null,
    says: 'rows are summaries: columns n, mean, sd (or x, n)',
    about: 'columns and groups',
  },
];

const asking: readonly Flag[] = [
  {
    name: 'measure',
    value: 'WORD',
    choices: [...new Set(methods.map(({ measure }) => measure))],
    says: 'what is compared',
    about: 'the comparison',
  },
  {
    name: 'success',
    value: 'VALUE',
    says: 'the outcome that is counted (proportion)',
    about: 'the comparison',
  },
  {
    name: 'question',
    value: 'WORD',
    choices: ['differs', 'higher', 'lower', 'equivalent', 'not-lower', 'not-higher'],
    says: 'what is asked of the test group',
    about: 'the comparison',
  },
  {
    name: 'margin',
    value: 'M or LO,HI',
    says: 'the bound of equivalent, not-lower and not-higher',
    about: 'the comparison',
  },
  {
    name: 'matters',
    value: 'D',
    says: 'the smallest difference that matters in practice',
    about: 'the comparison',
  },
  { name: 'against', value: 'D', says: 'the hypothesised difference (0)', about: 'the comparison' },
  { name: 'confidence', value: 'C', says: 'between 0 and 1 (0.95)', about: 'the comparison' },
  {
    name: 'variance',
    value: 'WORD',
    choices: ['separate', 'pooled', 'known'],
    says: 'the variance assumption',
    about: 'the comparison',
  },
  {
    name: 'sigma',
    value: 'T,R',
    says: 'the known standard deviations, test then reference',
    about: 'the comparison',
  },
  {
    name: 'df',
    value: 'WORD',
    choices: ['welch', 'smaller'],
    says: 'the rule for the degrees of freedom',
    about: 'the comparison',
  },
  {
    name: 'curve',
    value: 'WORD',
    choices: ['t', 'normal', 'normal-over-30'],
    says: 'the curve that p and interval are read from',
    about: 'the comparison',
  },
  { name: 'method', value: 'ID', says: 'a method by its id (weighbeam methods)', about: 'the comparison' },
  {
    name: 'only-chosen',
    value: null,
    says: 'leave out the other assumptions: quick on very large files',
    about: 'the comparison',
  },
  { name: 'seed', value: 'N', says: 'of the rows that draw at random', about: 'the comparison' },
  { name: 'draws', value: 'N', says: 'of the rows that draw at random', about: 'the comparison' },
];

const rows: readonly Flag[] = [
  { name: 'rows', value: '2-41', repeats: true, says: 'only these lines of the file', about: 'the rows' },
  {
    name: 'where',
    value: '"COL=label"',
    repeats: true,
    says: 'only rows with this label',
    about: 'the rows',
  },
  {
    name: 'leave-out',
    value: '"LINE:reason"',
    repeats: true,
    says: 'leave a row out, and say why',
    about: 'the rows',
  },
  { name: 'same', value: '"A -> B"', repeats: true, says: 'read label A as label B', about: 'the rows' },
];

const below: Flag = {
  name: 'below',
  value: 'HOW',
  choices: ['refuse', 'zero', 'half', 'limit'],
  says: 'what a reading such as <0.02 counts as',
  about: 'reading the file',
};

const record: readonly Flag[] = [
  { name: 'purpose', value: 'TEXT', says: 'the question in your own words', about: 'the record' },
  { name: 'sampling', value: 'TEXT', says: 'how the samples were taken', about: 'the record' },
  {
    name: 'analyst',
    value: 'TEXT',
    says: 'your name, as it should stand in the record',
    about: 'the record',
  },
  {
    name: 'reason',
    value: 'KEY=TEXT',
    repeats: true,
    says: 'why a setting is what it is, as method=protocol 12',
    about: 'the record',
  },
  {
    name: 'like',
    value: 'NOTE.md[:LINE]',
    says: 'the recipe of a settings block, on this file; other flags are laid over it',
    about: 'the record',
  },
  {
    name: 'root',
    value: 'DIR',
    says: 'the folder that file names in the block start from (the current one)',
    about: 'the record',
  },
];

const figure: Flag = {
  name: 'figure',
  value: 'FILE.svg',
  says: 'draw the comparison there',
  about: 'output',
};

/** Options that methods and checks declare and that have no flag of their own above: one flag each. */
function declared(taken: readonly Flag[]): readonly { readonly flag: Flag; readonly option: OptionSpec }[] {
  const specs: readonly (readonly [About, OptionSpec])[] = [
    ...methods.flatMap(({ options }: { readonly options: readonly OptionSpec[] }) =>
      options.map(option => ['the comparison', option] as const),
    ),
    ...evidenceChecks.flatMap(({ thresholds }: { readonly thresholds: readonly OptionSpec[] }) =>
      thresholds.map(option => ['what the file shows', option] as const),
    ),
  ];
  const known = new Set(taken.map(({ name }) => name));
  const first = new Map(specs.filter(([, { flag }]) => !known.has(flag)).map(spec => [spec[1].flag, spec]));
  return [...first.values()].map(([about, option]) => ({
    option,
    flag: {
      name: option.flag,
      value: option.kind === 'choice' ? 'WORD' : option.kind === 'text' ? 'TEXT' : 'N',
      ...(option.choices === undefined ? {} : { choices: option.choices }),
      says: option.says(english),
      about,
    },
  }));
}

const fixed = [
  ...columns,
  ...asking,
  ...rows,
  ...readingFlags,
  below,
  ...record,
  format(formats),
  out,
  figure,
  help,
];
export const declaredFlags = declared(fixed);
export const compareFlags: readonly Flag[] = [...fixed, ...declaredFlags.map(({ flag }) => flag)];
