import { Cancelled, Refusal } from '../core/model/problem';
import { readToWorker, type WorkerCall } from '../protocol/toWorker';
import type { FromWorker } from '../protocol/fromWorker';
import type { Port } from '../protocol/port';
import { problemWords } from '../report/problem';
import { answerCall } from './calls/answerCall';
import { blocksCall } from './calls/blocksCall';
import { locateCall } from './calls/locateCall';
import { nextStepCall } from './calls/nextStepCall';
import { recheckCall } from './calls/recheckCall';
import { restoreCall } from './calls/restoreCall';
import { surveyCall } from './calls/surveyCall';
import { makeDesk, type Desk, type Sitting } from './desk';
import type { WorkerPlatform } from './platform';
import type { AnyReply, Reply } from './reply';
import { sayFrom } from './sayFrom';
import { tickerFor } from './ticker';

/**
 * Answers the calls that come in at a port: surveys, questions, comparisons, rechecks, places of cells. Each call gets
 * one reply with its number and revision; a call given up in the shared flags gets `cancelled`. The first message must
 * be `start`.
 */
export function serve(port: Port, platform: WorkerPlatform): void {
  let desk: Desk = makeDesk(platform, sayFrom(null), '');
  let flags: Int32Array | null = null;
  const post = (message: FromWorker): void => port.post(message);

  const settle = async (call: WorkerCall): Promise<void> => {
    const { call: number, revision } = call;
    const tick = tickerFor(number, flags, (done, total) =>
      post({ type: 'progress', call: number, done, total }),
    );
    let reply: AnyReply;
    try {
      reply = await answer(call, { desk, tick });
    } catch (error) {
      reply = refused(error, desk);
    }
    post({ ...reply, call: number, revision });
  };

  port.listen(message => {
    const known = read(message, post);
    if (known === null) return;
    if (known.type === 'start') {
      desk = makeDesk(platform, sayFrom(known.words), known.version);
      flags = known.flags;
    } else {
      void settle(known);
    }
  });
}

/** null for a message that cannot be understood: who sent it with a number is told so, and the worker lives on. */
function read(message: unknown, post: (message: FromWorker) => void): ReturnType<typeof readToWorker> | null {
  try {
    return readToWorker(message);
  } catch (error) {
    const { call, revision } = message as { readonly call?: unknown; readonly revision?: unknown };
    if (typeof call !== 'number' || typeof revision !== 'number') throw error;
    post({ type: 'failed', call, revision, message: error instanceof Error ? error.message : String(error) });
    return null;
  }
}

function answer(call: WorkerCall, sitting: Sitting): Promise<AnyReply> {
  switch (call.type) {
    case 'survey':
      return surveyCall(call, sitting);
    case 'nextStep':
      return nextStepCall(call, sitting);
    case 'answer':
      return answerCall(call, sitting);
    case 'restore':
      return restoreCall(call);
    case 'blocks':
      return blocksCall(call);
    case 'recheck':
      return recheckCall(call, sitting);
    case 'locate':
      return locateCall(call, sitting);
  }
}

function refused(error: unknown, desk: Desk): Reply<'refused'> | Reply<'cancelled'> | Reply<'failed'> {
  if (error instanceof Cancelled) return { type: 'cancelled' };
  if (error instanceof Refusal) {
    const at = typeof error.where === 'object' ? error.where : null;
    return { type: 'refused', problem: { ...problemWords(error, desk.t), at } };
  }
  return { type: 'failed', message: error instanceof Error ? (error.stack ?? error.message) : String(error) };
}
