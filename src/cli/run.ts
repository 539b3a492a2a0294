import { version } from '../../package.json';
import { compareCommand, compareHelp } from './compare';
import { explainCommand, explainHelp } from './explain';
import { inspectCommand, inspectHelp } from './inspect';
import { Exit, type ExitCode, type Io } from './io';
import { methodsCommand, methodsHelp } from './methods';
import { nearest } from './nearest';
import { complain } from './problems';
import { recheckCommand, recheckHelp } from './recheck';
import { UsageError } from './usageError';

interface Command {
  readonly run: (argv: readonly string[], io: Io) => ExitCode | Promise<ExitCode>;
  readonly help: () => string;
  readonly usage: string;
  readonly says: string;
}

const commands: ReadonlyMap<string, Command> = new Map([
  [
    'compare',
    { run: compareCommand, help: compareHelp, usage: 'compare FILE', says: 'compare groups of a CSV file' },
  ],
  [
    'inspect',
    {
      run: inspectCommand,
      help: inspectHelp,
      usage: 'inspect FILE',
      says: 'how a file is read, and what needs a look',
    },
  ],
  [
    'recheck',
    {
      run: recheckCommand,
      help: recheckHelp,
      usage: 'recheck PATH…',
      says: 'compute the settings blocks of notebooks again',
    },
  ],
  ['methods', { run: methodsCommand, help: methodsHelp, usage: 'methods', says: 'the methods there are' }],
  [
    'explain',
    {
      run: explainCommand,
      help: explainHelp,
      usage: 'explain ID',
      says: 'one method: what, when not, source',
    },
  ],
]);

const overview = (): string =>
  [
    'weighbeam compares measured groups in CSV files, says what depends on the assumption,',
    'and rechecks every stated result later.',
    '',
    ...[...commands.values()].map(({ usage, says }) => `  weighbeam ${usage.padEnd(16)} ${says}`),
    '',
    'Each has --help. Exit codes: 0 done, 1 a recheck found a block that does not hold,',
    '2 the command line cannot be followed, 3 a problem and no number.',
    '',
  ].join('\n');

/** Whether JSON was asked for, told before the flags are known to be right. */
const wantsJson = (argv: readonly string[]): boolean =>
  argv.some((word, index) => word === '--format=json' || (word === 'json' && argv[index - 1] === '--format'));

async function dispatch(argv: readonly string[], io: Io): Promise<ExitCode> {
  const [name, ...rest] = argv;
  if (name === undefined || name === '--help' || name === '-h' || name === 'help') {
    io.write((rest[0] === undefined ? undefined : commands.get(rest[0]))?.help() ?? overview());
    return name === undefined ? Exit.Usage : Exit.Done;
  }
  if (name === '--version') {
    io.write(`${version}\n`);
    return Exit.Done;
  }
  const command = commands.get(name);
  if (command !== undefined) return command.run(rest, io);
  const meant = nearest(name, [...commands.keys()]);
  throw new UsageError(
    `There is no command ${name}`,
    meant === null ? `There are ${[...commands.keys()].join(', ')}.` : `Did you mean weighbeam ${meant}?`,
  );
}

/**
 * Runs one command line and gives its exit code. What goes wrong is said as a problem, never thrown.
 * @param argv the words after the program's name
 */
export async function run(argv: readonly string[], io: Io): Promise<ExitCode> {
  try {
    return await dispatch(argv, io);
  } catch (error) {
    return complain(error, io, wantsJson(argv));
  }
}
