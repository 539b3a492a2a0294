/** Where a command runs and where its words go; tests pass their own. */
export interface Io {
  /** The current directory. */
  readonly cwd: string;
  /** Writes to standard output. */
  write(text: string): void;
  /** Writes to standard error. */
  complain(text: string): void;
  now(): Date;
}

/** Exit codes: 0 done; 1 a recheck found a block that does not hold; 2 usage; 3 a problem, no number was printed. */
export const Exit = { Done: 0, Outcome: 1, Usage: 2, Problem: 3 } as const;
export type ExitCode = (typeof Exit)[keyof typeof Exit];
