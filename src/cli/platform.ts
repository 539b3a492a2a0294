import { createHasher } from './hasher';

/** What readers, compare and recheck need of the platform; a person ends a long run with Ctrl+C, so nothing is asked of a tick. */
export const platform = { tick: () => undefined, createHasher };
