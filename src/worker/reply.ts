import type { WorkerReply } from '../protocol/fromWorker';

type Unnumbered<R> = R extends WorkerReply ? Omit<R, 'call' | 'revision'> : never;

/** A reply before the numbers of its call are written on it. */
export type AnyReply = Unnumbered<WorkerReply>;
export type Reply<T extends WorkerReply['type']> = Extract<AnyReply, { type: T }>;
