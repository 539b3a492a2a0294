import { methods } from '../core/methods/index';
import { methodsText } from '../report/methodsList';
import { english } from './english';
import { methodsFlags } from './flags';
import { helpPage } from './help';
import { Exit, type ExitCode, type Io } from './io';
import { parseOptions } from './options';
import { UsageError } from './usageError';

/** The page of --help. */
export const methodsHelp = (): string =>
  helpPage(
    'methods [flags]',
    'Lists the methods there are and what choosing each of them claims.',
    methodsFlags,
  );

const cell = (text: string): string => text.replace(/\|/g, '\\|').replace(/\s+/g, ' ');

/** The table of the README: one row a method, in the order of the registry. */
export const methodsTable = (): string =>
  [
    '| method | measure | questions | what choosing it claims | source |',
    '| --- | --- | --- | --- | --- |',
    ...methods.map(
      one =>
        `| \`${one.id}\` | ${one.measure} | ${one.questions.join(', ')} | ${cell(one.assumes(english))} | ${cell(one.references[0] ?? '')} |`,
    ),
    '',
  ].join('\n');

const methodsJson = (): string =>
  `${JSON.stringify(
    methods.map(({ id, version, design, measure, questions, needs, counted, references, ...one }) => ({
      id,
      version,
      design,
      measure,
      questions,
      needs,
      counted,
      title: one.title(english),
      assumes: one.assumes(english),
      references,
    })),
    null,
    2,
  )}\n`;

/** weighbeam methods: the registry, for reading, for a program, or as the table of the README. */
export function methodsCommand(argv: readonly string[], io: Io): ExitCode {
  const options = parseOptions(argv, 'methods', methodsFlags);
  if (options.words.length > 0)
    throw new UsageError('methods takes no names', 'For one method write weighbeam explain ID.');
  if (options.has('help')) io.write(methodsHelp());
  else {
    const format = options.choice('format', ['text', 'json', 'markdown']) ?? 'text';
    io.write({ text: () => methodsText(english), json: methodsJson, markdown: methodsTable }[format]());
  }
  return Exit.Done;
}
