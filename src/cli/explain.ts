import { evidenceChecks } from '../core/evidence/index';
import { methods } from '../core/methods/index';
import { explainText } from '../report/methodsList';
import { english } from './english';
import { explainFlags } from './flags';
import { helpPage } from './help';
import { Exit, type ExitCode, type Io } from './io';
import { nearest } from './nearest';
import { parseOptions } from './options';
import { UsageError } from './usageError';

const ids = (): readonly string[] => [...methods.map(({ id }) => id), ...evidenceChecks.map(({ id }) => id)];

/** The page of --help. */
export const explainHelp = (): string =>
  helpPage(
    'explain ID',
    'Says what a method computes, what choosing it claims, when not to use it, and its published source.',
    explainFlags,
    `The ids there are:\n  ${ids().join('\n  ')}`,
  );

/** weighbeam explain: one method or check in words. */
export function explainCommand(argv: readonly string[], io: Io): ExitCode {
  const options = parseOptions(argv, 'explain', explainFlags);
  if (options.has('help')) {
    io.write(explainHelp());
    return Exit.Done;
  }
  const [id, ...more] = options.words;
  if (id === undefined || more.length > 0) {
    throw new UsageError('explain takes one id', 'Write weighbeam explain ID; weighbeam methods lists them.');
  }
  const text = explainText(id, english);
  if (text === null) {
    const meant = nearest(id, ids());
    const fix = meant === null ? 'See weighbeam methods.' : `Did you mean ${meant}?`;
    throw new UsageError(`There is no method ${id}`, fix);
  }
  io.write(text);
  return Exit.Done;
}
