import { Refusal, type Problem } from '../core/model/problem';
import { problemLine, problemWithFlag } from '../report/problem';
import { english } from './english';
import { Exit, type ExitCode, type Io } from './io';
import { UsageError } from './usageError';

/** A problem of core, or one that only a command line can have. */
type Told = Omit<Problem, 'code'> & { readonly code: string };

/** Errors of the operating system that a person can do something about. */
const systemFixes: Readonly<Record<string, string>> = {
  EACCES: 'Look at who may read and write it.',
  EISDIR: 'Name a file, not a folder.',
  ENOENT: 'Look at the name; it is read from the current folder.',
  ENOTDIR: 'Look at the name; it is read from the current folder.',
  ENOSPC: 'Make room on the disk.',
  EROFS: 'Choose a place that can be written to.',
};

/** Words that cannot go together whatever the file holds: a fault of the command line, not of the data. */
const isUsage = ({ code, facts }: Refusal): boolean =>
  code === 'method-unknown' ||
  (code === 'method-not-for-this' && ['measure', 'pair', 'needs'].every(fact => facts[fact] === undefined));

function told(error: unknown, files: readonly string[]): { readonly problem: Told; readonly exit: ExitCode } {
  if (error instanceof UsageError) {
    return {
      exit: Exit.Usage,
      problem: { code: 'usage', message: error.message, where: null, fix: error.fix },
    };
  }
  if (error instanceof Refusal) {
    return {
      exit: isUsage(error) ? Exit.Usage : Exit.Problem,
      problem: problemWithFlag(error, english, files),
    };
  }
  const { message } = error instanceof Error ? error : new Error(String(error));
  const code = error instanceof Error && 'code' in error && typeof error.code === 'string' ? error.code : '';
  const fix = systemFixes[code];
  return fix === undefined
    ? {
        exit: Exit.Problem,
        problem: {
          code: 'unexpected',
          message,
          where: null,
          fix: 'This is a fault of weighbeam: please report it with the command.',
        },
      }
    : { exit: Exit.Problem, problem: { code: 'file-not-usable', message, where: null, fix } };
}

/** Says why there is no answer, on standard error and, where JSON was asked for, on standard output as well. */
export function complain(error: unknown, io: Io, json: boolean, files: readonly string[] = []): ExitCode {
  const { problem, exit } = told(error, files);
  io.complain(`${problemLine(problem)}\n`);
  if (json) io.write(`${JSON.stringify({ problem }, null, 2)}\n`);
  return exit;
}
