import { readFile } from 'node:fs/promises';
import path from 'node:path';
import type { Outcome } from '../recheck/outcome';
import { recheckText } from '../recheck/recheckText';
import { outcomeSentence } from '../report/outcome';
import { diskSource } from './diskSource';
import { english } from './english';
import { recheckFlags } from './flags';
import { namesOf } from './flagValues';
import { helpPage } from './help';
import { Exit, type ExitCode, type Io } from './io';
import { nearest } from './nearest';
import { findNotebooks } from './notebooks';
import { parseOptions } from './options';
import { findNamed, rootOf } from './paths';
import { platform } from './platform';
import { UsageError } from './usageError';

/** What recheck can answer; the first two never fail. */
const outcomes: readonly Outcome['kind'][] = [
  'same',
  'planned',
  'moved',
  'turned',
  'altered',
  'reworked',
  'blocked',
];

/** The page of --help. */
export const recheckHelp = (): string =>
  helpPage(
    'recheck PATH… [flags]',
    'Computes every settings block in notebooks, folders of notebooks or patterns again, one line a block: same, planned, moved, turned, altered, reworked or blocked. Exit code 0 when all are same or planned (or allowed), else 1.',
    recheckFlags,
    'for example\n  weighbeam recheck notes/ --allow moved',
  );

function allowedBy(texts: readonly string[]): ReadonlySet<string> {
  const words = texts.length === 0 ? [] : namesOf('allow', texts);
  for (const word of words) {
    if (outcomes.some(kind => kind === word)) continue;
    const meant = nearest(word, outcomes);
    throw new UsageError(
      `--allow ${word} is no outcome`,
      `${meant === null ? '' : `Did you mean ${meant}? `}It takes ${outcomes.join(', ')}.`,
    );
  }
  return new Set(['same', 'planned', ...words]);
}

interface Checked {
  readonly path: string;
  readonly line: number;
  readonly outcome: Outcome;
}

async function checkNotebook(
  notebook: string,
  io: Io,
  root: string | undefined,
): Promise<readonly Checked[]> {
  const from = await rootOf(notebook, io.cwd, root);
  const open = async (name: string) => {
    const file = await findNamed(name, from, notebook);
    return file === null ? null : diskSource(file, name);
  };
  const shown = path.relative(io.cwd, notebook).split(path.sep).join('/');
  const checked: Checked[] = [];
  for await (const outcome of recheckText(await readFile(notebook, 'utf8'), open, platform)) {
    checked.push({ path: shown, line: outcome.line, outcome });
  }
  return checked;
}

const asJson = (checked: readonly Checked[]): string =>
  `${JSON.stringify(
    {
      format: 'weighbeam recheck 1',
      blocks: checked.map(({ path: notebook, line, outcome }) => ({
        path: notebook,
        line,
        outcome: outcome.kind,
        sentence: outcomeSentence(outcome, english),
        changes: outcome.changes,
      })),
    },
    null,
    2,
  )}\n`;

/** weighbeam recheck: one line a block, `path:line: outcome: sentence`. */
export async function recheckCommand(argv: readonly string[], io: Io): Promise<ExitCode> {
  const options = parseOptions(argv, 'recheck', recheckFlags);
  if (options.has('help')) {
    io.write(recheckHelp());
    return Exit.Done;
  }
  if (options.words.length === 0)
    throw new UsageError('No notebook was named', 'Write weighbeam recheck PATH…; see --help.');
  const allowed = allowedBy(options.texts('allow'));
  const json = options.choice('format', ['text', 'json']) === 'json';
  const all: Checked[] = [];
  for (const notebook of await findNotebooks(options.words, io.cwd)) {
    for (const checked of await checkNotebook(notebook, io, options.text('root'))) {
      all.push(checked);
      if (!json)
        io.write(
          `${checked.path}:${checked.line}: ${checked.outcome.kind}: ${outcomeSentence(checked.outcome, english)}\n`,
        );
    }
  }
  if (all.length === 0) {
    throw new UsageError(
      `There is no settings block in ${options.words.join(', ')}`,
      'Name notebooks that hold one.',
    );
  }
  if (json) io.write(asJson(all));
  return all.every(({ outcome }) => allowed.has(outcome.kind)) ? Exit.Done : Exit.Outcome;
}
