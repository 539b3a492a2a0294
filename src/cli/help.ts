import type { About, Flag } from './flag';

const width = 80;
const indent = 25;

const headings: readonly About[] = [
  'columns and groups',
  'the comparison',
  'the rows',
  'reading the file',
  'what the file shows',
  'the record',
  'output',
];

/** Breaks words at the width, every line after the first under the column of the text. */
function wrapped(text: string, from: number): string {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    if (line !== '' && from + line.length + 1 + word.length > width) {
      lines.push(line);
      line = word;
    } else line = line === '' ? word : `${line} ${word}`;
  }
  return [...lines, line].join(`\n${' '.repeat(from)}`);
}

function flagLine({ name, value, choices, says, repeats }: Flag): string {
  const flag = `  --${name}${value === null ? '' : ` ${value}`}`;
  const words = choices === undefined ? says : `${says}: ${choices.join(', ')}`;
  const text = wrapped(repeats === true ? `${words} (repeatable)` : words, indent);
  return flag.length < indent ? `${flag.padEnd(indent)}${text}` : `${flag}\n${' '.repeat(indent)}${text}`;
}

/** The page of one command: how it is called, what it does, its flags under their headings. */
export function helpPage(usage: string, says: string, flags: readonly Flag[], after = ''): string {
  const parts = headings.flatMap(heading => {
    const under = flags.filter(({ about }) => about === heading);
    return under.length === 0 ? [] : [`\n${heading}\n${under.map(flagLine).join('\n')}\n`];
  });
  return `weighbeam ${usage}\n${wrapped(says, 0)}\n${parts.join('')}${after === '' ? '' : `\n${after}\n`}`;
}
