import { fenced } from '../settings/fenced';
import type { View } from './view/shown';

/** A notebook entry: the answer, its numbers, the rows under other assumptions, findings, left-out rows, then the fenced block. */
export function markdownReport(view: View): string {
  const { answer, numbers, whatIf, findings, leftOut, notebook } = view;
  const parts = [
    `## ${escaped(answer.headline)}`,
    escaped(notebook.paragraph),
    `### ${escaped(numbers.heading)}`,
    table(
      [numbers.quantity, ...numbers.columns],
      numbers.rows.map(({ name, cells }) => [name, ...cells.map(cell => cell?.text ?? '')]),
    ),
    `### ${escaped(whatIf.heading)}`,
    escaped(whatIf.verdict),
    escaped(whatIf.sameData),
    table(
      [whatIf.words.assumption, whatIf.words.interval, whatIf.words.decision, whatIf.words.note],
      whatIf.rows.map(row => [
        row.chosen ? `${row.title} (${row.chosenWord})` : row.title,
        row.interval.text,
        row.decision,
        row.note,
      ]),
    ),
    `### ${escaped(findings.heading)}`,
    list([...findings.open, ...(findings.folded?.list ?? [])].map(at => `${at.levelWord}: ${at.sentence}`)),
    escaped(findings.quiet),
    `### ${escaped(leftOut.heading)}`,
    leftOut.none === null ? list(leftOut.rows.map(({ sentence }) => sentence)) : escaped(leftOut.none),
    escaped(leftOut.kept ?? ''),
    list(notebook.changed),
    [answer.caution, ...answer.cautions].map(escaped).join('\n\n'),
    notebook.blockText === null ? escaped(notebook.noBlock ?? '') : fenced(notebook.blockText).trimEnd(),
  ];
  return `${parts.filter(part => part !== '').join('\n\n')}\n`;
}

const list = (sentences: readonly string[]): string =>
  sentences.map(sentence => `- ${escaped(sentence)}`).join('\n');

function table(head: readonly string[], rows: readonly (readonly string[])[]): string {
  const line = (cells: readonly string[]): string =>
    `| ${cells.map(cell => escaped(cell).replaceAll('|', '\\|')).join(' | ')} |`;
  return [line(head), line(head.map(() => '---')), ...rows.map(line)].join('\n');
}

/** Labels and reasons come from files and people: nothing in them may become markup or a new line. */
const escaped = (text: string): string =>
  text.replaceAll(/\s*\n\s*/gu, ' ').replaceAll(/[\\`*_<>[\]#]/gu, mark => `\\${mark}`);
