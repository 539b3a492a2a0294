import { fieldName } from '../readers/findField';
import { survey, type Survey } from '../readers/survey';
import { withMinus } from '../report/numbersPrinted';
import { columnWidths, padded, tabulated, wrapped } from '../report/terminal/columns';
import { quoted, visible } from '../report/words/label';
import { wishOf } from './compareRequest';
import { diskSource } from './diskSource';
import { english } from './english';
import { inspectFlags } from './flags';
import { helpPage } from './help';
import { inspectionFindings, type InspectionFinding } from './inspectionFindings';
import { Exit, type ExitCode, type Io } from './io';
import { parseOptions } from './options';
import { writeOut } from './output';
import { nameFiles } from './paths';
import { complain } from './problems';
import { UsageError } from './usageError';

const WIDTH = 80;
const LABELS = 4;

/** The page of --help. */
export const inspectHelp = (): string =>
  helpPage(
    'inspect FILE [flags]',
    'Says how a file is read, what its columns hold, and what needs a look before anything is compared. Nothing is computed and nothing is changed.',
    inspectFlags,
  );

const markNames: Readonly<Record<string, string>> = {
  '\t': 'tab',
  ' ': 'space',
  ',': 'comma',
  ';': 'semicolon',
  '|': 'pipe',
};

function readAs({ reading, rows, firstLine, lastLine }: Survey): readonly string[] {
  const { headerLine, unitsLine, decimal, delimiter, met } = reading;
  const before = met.filter(({ what }) => what === 'preamble');
  const parts: readonly (readonly [string, string])[] = [
    ['rows', `${rows}, lines ${firstLine} to ${lastLine}`],
    ['encoding', reading.encoding],
    [
      'cells',
      `separated by ${markNames[delimiter] ?? delimiter}, decimal ${decimal === ',' ? 'comma' : 'point'}`,
    ],
    [
      'header',
      headerLine === 0
        ? 'none; columns are called #1, #2, …'
        : `line ${headerLine}${unitsLine === null ? '' : `, units on line ${unitsLine}`}`,
    ],
    ...before.map(({ at, text }): readonly [string, string] => [
      `line ${at.line}`,
      `before the header: ${quoted(text)}`,
    ]),
  ];
  return parts.flatMap(([name, text]) => wrapped(text, WIDTH, name.padEnd(10), 10));
}

function holds({ kind, min, max, labels, distinct, nearlyUnique }: Survey['columns'][number]): string {
  if (kind === 'number' && min !== null && max !== null) return withMinus(`${min} to ${max}`);
  if (kind === 'empty') return '';
  if (nearlyUnique && distinct > LABELS) return 'nearly all different';
  const shown = labels.slice(0, LABELS).map(({ label, count }) => `${visible(label)} (${count})`);
  return `${shown.join(', ')}${distinct > LABELS ? ', …' : ''}`;
}

const kindNames = { number: 'numbers', label: 'labels', mixed: 'mixed', empty: 'nothing' } as const;

const titleOf = (name: string, unit: string | null): string =>
  unit === null || name.includes(unit) ? name : `${name}, ${unit}`;

/** A table whose last column is broken into lines under itself. */
function columnLines({ fields, columns }: Survey): readonly string[] {
  const rows = columns.map(column => [
    titleOf(visible(fieldName(fields, column.field)), column.unit),
    kindNames[column.kind],
    String(column.values + column.texts),
    String(column.missing),
    String(column.distinct),
    holds(column),
  ]);
  const table = [['column', 'holds', 'filled', 'missing', 'different', 'from, to or labels'], ...rows];
  const heads = tabulated(
    table.map(row => [...row.slice(0, -1), '']),
    2,
  );
  const indent = columnWidths(table.map(row => row.slice(0, -1))).reduce((sum, width) => sum + width + 2, 0);
  return table.flatMap((row, at) =>
    wrapped(row.at(-1) ?? '', WIDTH, padded(heads[at] ?? '', indent), indent),
  );
}

const findingLines = (findings: readonly InspectionFinding[]): readonly string[] =>
  findings.length === 0
    ? ['Nothing needs a look.']
    : findings.flatMap(({ level, sentence, lines }) => {
        const where =
          lines.length === 0 || sentence.startsWith('Line ')
            ? ''
            : ` (line${lines.length === 1 ? '' : 's'} ${lines.join(', ')})`;
        return wrapped(`${sentence}${where}`, WIDTH, level.padEnd(6), 6);
      });

function asText(name: string, surveyed: Survey, findings: readonly InspectionFinding[]): string {
  return [name, ...readAs(surveyed), '', ...columnLines(surveyed), '', ...findingLines(findings), ''].join(
    '\n',
  );
}

function asJson(name: string, surveyed: Survey, findings: readonly InspectionFinding[]): string {
  const { reading, rows, firstLine, lastLine, columns } = surveyed;
  const { encoding, delimiter, decimal, thousands, headerLine, unitsLine, footer, missingWords } = reading;
  return `${JSON.stringify(
    {
      format: 'weighbeam inspection 1',
      file: name,
      rows,
      firstLine,
      lastLine,
      reading: { encoding, delimiter, decimal, thousands, headerLine, unitsLine, footer, missingWords },
      columns,
      findings,
    },
    null,
    2,
  )}\n`;
}

/** weighbeam inspect: how one file is read and what it shows before any comparison. */
export async function inspectCommand(argv: readonly string[], io: Io): Promise<ExitCode> {
  const options = parseOptions(argv, 'inspect', inspectFlags);
  if (options.has('help')) {
    io.write(inspectHelp());
    return Exit.Done;
  }
  const [file, ...more] = options.words;
  if (file === undefined || more.length > 0)
    throw new UsageError('inspect takes one file', 'Write weighbeam inspect FILE.');
  const json = options.choice('format', ['text', 'json']) === 'json';
  const [named] = await nameFiles([file], io.cwd, undefined);
  if (named === undefined) return Exit.Problem;
  try {
    const surveyed = await survey(await diskSource(named.file, named.name), wishOf(options));
    const findings = inspectionFindings(surveyed, english);
    const written = (json ? asJson : asText)(named.name, surveyed, findings);
    const out = options.text('out');
    if (out === undefined) io.write(written);
    else await writeOut([{ flag: 'out', name: out, text: written }], { cwd: io.cwd, read: [file] });
    return Exit.Done;
  } catch (error) {
    return complain(error, io, json, [file]);
  }
}
