import { createHash } from 'node:crypto';
import type { Hasher } from '../../src/core/model/hasher';
import type { FileInput } from '../../src/protocol/files';
import {
  readFromWorker,
  type FromWorker,
  type Progress,
  type WorkerReply,
} from '../../src/protocol/fromWorker';
import type { WorkerCall } from '../../src/protocol/toWorker';
import { bytesSource } from '../../src/readers/byteSource';
import { serve } from '../../src/worker/serve';

type WithoutNumbers<T> = T extends unknown ? Omit<T, 'call' | 'revision'> : never;

const createHasher = (): Hasher => {
  const hash = createHash('sha256');
  return { update: bytes => void hash.update(bytes), hex: () => hash.digest('hex') };
};

/** A worker on this thread: messages are cloned as between threads, and every reply is checked. */
export function makeWorker(
  options: { readonly flags?: Int32Array | null; readonly words?: Record<string, string> } = {},
) {
  const progress: Progress[] = [];
  const waiting = new Map<number, (reply: WorkerReply) => void>();
  const opened: string[] = [];
  let receive: (message: unknown) => void = () => undefined;
  let last = 0;
  serve(
    {
      post: message => {
        const reply: FromWorker = readFromWorker(structuredClone(message));
        if (reply.type === 'progress') progress.push(reply);
        else waiting.get(reply.call)?.(reply);
      },
      listen: listener => (receive = listener),
    },
    {
      open: ({ name, bytes }) => {
        opened.push(name);
        return bytesSource(name, bytes ?? new Uint8Array());
      },
      createHasher,
    },
  );
  const { flags = null, words = null } = options;
  receive({ type: 'start', words, version: '9.9.9', flags });

  return {
    progress,
    /** Names of the files in the order they were opened. */
    opened,
    ask: (message: WithoutNumbers<WorkerCall>, revision = 0, call = ++last): Promise<WorkerReply> =>
      new Promise(resolve => {
        waiting.set(call, resolve);
        receive(structuredClone({ ...message, call, revision }));
      }),
  };
}

export const fileOf = (name: string, text: string, stamp = '1'): FileInput => ({
  name,
  path: null,
  bytes: new TextEncoder().encode(text),
  stamp,
});
