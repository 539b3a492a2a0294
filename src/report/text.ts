import { tabulated, widthOf, wrapped } from './terminal/columns';
import { intervalLines } from './terminal/intervalLine';
import { numbersLines } from './terminal/numbersLines';
import type { View } from './view/shown';

const WIDTH = 80;
const LABEL_WIDTH = 11;

/** The whole comparison for a terminal of 80 columns: no colour, nothing framed, the answer first. Ends with a line feed. */
export function textReport(view: View): string {
  const parts = [
    answerLines(view),
    figureLines(view),
    numbersLines(view, WIDTH),
    tableLines(view),
    [
      ...whatIfLines(view),
      ...fileLines(view),
      ...leftOutLines(view),
      ...recordLines(view),
      ...cautionLines(view),
    ],
  ];
  const own = parts.filter(lines => lines.length > 0).map(lines => `${lines.join('\n')}\n`);
  const columns = view.columns.map(column => `${column.title}\n\n${textReport(column)}`);
  return [...own, ...columns].join('\n');
}

const say = (text: string, first = '', indent = widthOf(first)): readonly string[] =>
  text === '' ? [] : wrapped(text, WIDTH, first, indent);

function answerLines({ answer, words }: View): readonly string[] {
  const facts = [answer.interval, answer.p, answer.variance].filter(part => part !== null).join(', ');
  const asked = answer.open.flatMap(question => say(question, `${words.ask}: `));
  const sentences = [
    answer.shares ?? '',
    answer.headline,
    answer.difference ?? '',
    facts,
    answer.beside ?? '',
    answer.doubt ?? '',
    answer.mattersShort,
    answer.design,
    ...answer.notes,
  ];
  return [...asked, ...sentences.flatMap(sentence => say(sentence))];
}

function figureLines({ figure }: View): readonly string[] {
  const difference = figure?.difference ?? null;
  return difference === null ? [] : intervalLines(difference);
}

function tableLines({ tables }: View): readonly string[] {
  return tables.flatMap(({ caption, columns, rows }) => [
    ...say(caption),
    ...tabulated([columns, ...rows.map(row => row.map(cell => cell.text))], 2),
  ]);
}

function whatIfLines({ whatIf }: View): readonly string[] {
  const rows = whatIf.rows
    .filter(row => !row.chosen)
    .map(row => [`  ${row.title}`, row.interval.text, row.decision === '' ? row.note : row.decision]);
  return [
    ...say(`${lowerFirst(whatIf.heading)}: ${lowerFirst(whatIf.verdictShort)}`),
    ...say(whatIf.explained ?? ''),
    ...tabulated(rows, 3),
  ];
}

const lowerFirst = (text: string): string => text.slice(0, 1).toLowerCase() + text.slice(1);

function fileLines({ findings, words }: View): readonly string[] {
  const open = findings.open.map(found => `${found.levelWord} ${found.sentence}`);
  const folded =
    findings.folded === null ? [] : findings.folded.list.map(found => `${found.levelWord} ${found.sentence}`);
  return labelled(words.theFile, [...open, ...folded, findings.quiet]);
}

function leftOutLines({ leftOut, words }: View): readonly string[] {
  const rows = leftOut.rows.map(row => row.short);
  return labelled(words.leftOut, [leftOut.none ?? '', ...rows, leftOut.kept ?? '']);
}

function recordLines({ notebook }: View): readonly string[] {
  return [
    ...notebook.states
      .filter(({ key, flag }) => key === 'sampling' || flag === null)
      .flatMap(({ label, value, flag }) =>
        labelled(`${lowerFirst(label)}:`, [flag === null ? value : `${value} (${flag})`]),
      ),
    ...(notebook.changed.length > 0 && notebook.isChanged
      ? notebook.changed.flatMap(sentence => say(sentence))
      : []),
    ...say(notebook.noBlock ?? ''),
  ];
}

const cautionLines = ({ answer }: View): readonly string[] =>
  [answer.caution, ...answer.cautions].flatMap(sentence => say(sentence));

/** Lines under one label at the left; the label stands beside the first. */
function labelled(label: string, texts: readonly string[]): readonly string[] {
  const indent = Math.max(LABEL_WIDTH, widthOf(label) + 1);
  return texts
    .filter(text => text !== '')
    .flatMap((text, at) => say(text, (at === 0 ? label : '').padEnd(indent), indent));
}
