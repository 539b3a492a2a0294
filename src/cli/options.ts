import { parseArgs } from 'node:util';
import type { Flag } from './flag';
import { nearest } from './nearest';
import { UsageError } from './usageError';

/** The flags of one command line, each with its texts in the order given, and the words that are no flags. */
export interface Options {
  readonly words: readonly string[];
  has(flag: string): boolean;
  /** The text of a flag that may be given once; undefined when it was not. */
  text(flag: string): string | undefined;
  texts(flag: string): readonly string[];
  /** As `text`, for a flag with choices. */
  choice<Word extends string>(flag: string, choices: readonly Word[]): Word | undefined;
}

/** A value that starts with a minus sign is a value when it goes on as a number: `--against -5`. */
function joined(argv: readonly string[], flags: readonly Flag[]): string[] {
  const takesValue = new Set(flags.filter(({ value }) => value !== null).map(({ name }) => `--${name}`));
  const result: string[] = [];
  for (const word of argv) {
    const before = result.at(-1);
    if (before !== undefined && takesValue.has(before) && /^[-\u2212][\d.,]/.test(word)) {
      result[result.length - 1] = `${before}=${word}`;
    } else result.push(word);
  }
  return result;
}

function asUsage(error: unknown, argv: readonly string[], command: string, flags: readonly Flag[]): unknown {
  const code = error instanceof Error && 'code' in error ? error.code : null;
  if (code === 'ERR_PARSE_ARGS_UNKNOWN_OPTION') {
    const known = flags.map(({ name }) => name);
    const given = argv.filter(word => word.startsWith('-')).map(word => word.replace(/=.*$/s, ''));
    const unknown =
      given.find(word => word !== '-h' && !known.includes(word.replace(/^-+/, ''))) ?? given[0] ?? '';
    const meant = nearest(unknown.replace(/^-+/, ''), known);
    const fix = meant === null ? `See weighbeam ${command} --help.` : `Did you mean --${meant}?`;
    return new UsageError(`There is no flag ${unknown}`, fix);
  }
  if (code === 'ERR_PARSE_ARGS_INVALID_OPTION_VALUE' && error instanceof Error) {
    const named = /'(?:-\w, )?--([\w-]+)/.exec(error.message)?.[1] ?? '';
    const flag = flags.find(({ name }) => name === named);
    return flag === undefined || flag.value === null
      ? new UsageError(`--${named} takes no value`, `Write --${named} alone.`)
      : new UsageError(
          `--${named} needs a value`,
          `Write --${named} ${flag.value}; put = before a value that starts with a dash.`,
        );
  }
  return error;
}

function checkChoice(flag: Flag, text: string): void {
  if (flag.choices === undefined || flag.choices.includes(text)) return;
  const meant = nearest(text, flag.choices);
  const choices = `It takes ${flag.choices.join(', ')}.`;
  throw new UsageError(
    `--${flag.name} ${text} is not among its words`,
    meant === null ? choices : `Did you mean ${meant}? ${choices}`,
  );
}

/**
 * Takes the words of one command apart by its flags; an unknown flag, a missing value, a word that is not among the
 * choices and a flag given twice that counts once are each a UsageError that says what was probably meant.
 */
export function parseOptions(argv: readonly string[], command: string, flags: readonly Flag[]): Options {
  let values: Record<string, (string | boolean)[] | undefined>;
  let words: string[];
  try {
    ({ values, positionals: words } = parseArgs({
      args: joined(argv, flags),
      allowPositionals: true,
      strict: true,
      options: Object.fromEntries(
        flags.map(({ name, value }) => [
          name,
          {
            type: value === null ? 'boolean' : 'string',
            multiple: true,
            ...(name === 'help' ? { short: 'h' } : {}),
          } as const,
        ]),
      ),
    }));
  } catch (error) {
    throw asUsage(error, argv, command, flags);
  }
  const texts = (name: string) => (values[name] ?? []).filter(value => typeof value === 'string');
  for (const flag of flags) {
    const given = texts(flag.name);
    if (flag.repeats !== true && given.length > 1) {
      throw new UsageError(`--${flag.name} stands twice (${given.join(', ')})`, 'Give it once.');
    }
    if (flag.value === null && flag.name !== 'help' && (values[flag.name]?.length ?? 0) > 1)
      throw new UsageError(`--${flag.name} stands twice`, 'Give it once.');
    for (const text of given) checkChoice(flag, text);
  }
  return {
    words,
    has: name => values[name] !== undefined,
    text: name => texts(name)[0],
    texts,
    choice: (name, choices) => choices.find(choice => choice === texts(name)[0]),
  };
}
