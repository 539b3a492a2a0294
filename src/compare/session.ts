import { Refusal } from '../core/model/problem';
import type { LeftOut, Settings } from '../core/model/settings';
import { patched } from './patched';
import type { Request } from './request';
import { requestPatch } from './requestPatch';

/** One state of what is asked, and when it was reached (an ISO 8601 text given by the surface). */
export interface Step {
  readonly request: Request;
  readonly when: string;
}

/** Everything a person has asked so far, plain data: it can be stored and sent. */
export interface Session {
  readonly history: readonly Step[];
  /** The step that is in force. */
  readonly at: number;
  /** What was asked when a result was first seen; null: none was seen yet. */
  readonly firstShown: Step | null;
  /** Reasons given for changes, by settings-block key. */
  readonly reasons: Readonly<Record<string, string>>;
}

/** What a surface may send. `when` is the surface's clock. */
export type Action =
  | {
      readonly kind: 'change';
      readonly patch: Partial<Request>;
      /** Keys to be left open again. */
      readonly unset?: readonly (keyof Request)[];
      readonly when: string;
    }
  | { readonly kind: 'answer'; readonly answer: Partial<Settings>; readonly when: string }
  | {
      readonly kind: 'leave out';
      readonly file: number;
      readonly line: number;
      readonly reason: string;
      readonly when: string;
    }
  | { readonly kind: 'take back'; readonly file: number; readonly line: number; readonly when: string }
  | { readonly kind: 'merge labels'; readonly from: string; readonly to: string; readonly when: string }
  | { readonly kind: 'reason'; readonly key: string; readonly reason: string }
  /** The files bear other names now: so they do in everything that was asked of them, also what undo brings back. */
  | { readonly kind: 'moved'; readonly files: readonly string[] }
  /** Where the rows left out now stand, in their order: the lines of the file they were on have moved. */
  | { readonly kind: 'found'; readonly leaveOut: readonly LeftOut[] }
  | { readonly kind: 'undo' }
  | { readonly kind: 'redo' }
  | { readonly kind: 'shown'; readonly when: string };

/** A session that begins with this request; `firstShown` is handed in where the same data were looked at before. */
export function start(request: Request, when: string, firstShown: Step | null = null): Session {
  return { history: [{ request, when }], at: 0, firstShown, reasons: {} };
}

/** What is asked now. */
export function requestOf(session: Session): Request {
  return stepOf(session).request;
}

export const canUndo = (session: Session): boolean => session.at > 0;

export const canRedo = (session: Session): boolean => session.at < session.history.length - 1;

/** The session after an action. Leaving a row out needs a reason ('reason-needed'). Pure. */
export function reduce(session: Session, action: Action): Session {
  const request = requestOf(session);
  switch (action.kind) {
    case 'change':
      return advance(session, patched(request, action.patch, action.unset), action.when);
    case 'answer':
      return advance(session, patched(request, requestPatch(action.answer)), action.when);
    case 'leave out':
      return advance(session, leaveOut(session, action), action.when);
    case 'take back': {
      const kept = (request.leaveOut ?? []).filter(
        ({ file, line }) => file !== action.file || line !== action.line,
      );
      return advance(session, { ...request, leaveOut: kept }, action.when);
    }
    case 'merge labels':
      return advance(
        session,
        patched(request, { same: [...(request.same ?? []), [action.from, action.to]] }),
        action.when,
      );
    case 'reason':
      return { ...session, reasons: { ...session.reasons, [action.key]: action.reason } };
    case 'moved': {
      const renamed = (step: Step): Step => ({ ...step, request: { ...step.request, files: action.files } });
      const { history, firstShown } = session;
      return {
        ...session,
        history: history.map(renamed),
        firstShown: firstShown === null ? null : renamed(firstShown),
      };
    }
    case 'found':
      return onLinesNow(session, action.leaveOut);
    case 'undo':
      return canUndo(session) ? { ...session, at: session.at - 1 } : session;
    case 'redo':
      return canRedo(session) ? { ...session, at: session.at + 1 } : session;
    case 'shown':
      return session.firstShown === null
        ? { ...session, firstShown: { request, when: action.when } }
        : session;
  }
}

function leaveOut(session: Session, row: Extract<Action, { kind: 'leave out' }>): Request {
  if (row.reason.trim() === '') throw new Refusal('reason-needed', { line: row.line });
  const request = requestOf(session);
  const others = (request.leaveOut ?? []).filter(({ file, line }) => file !== row.file || line !== row.line);
  const { file, line, reason } = row;
  return {
    ...request,
    leaveOut: [...others, { file, line, reason, afterResult: session.firstShown !== null }],
  };
}

/** Every request of the session named the rows by the lines of one and the same text: all of them move together. */
function onLinesNow(session: Session, found: readonly LeftOut[]): Session {
  const was = requestOf(session).leaveOut ?? [];
  const now = (row: LeftOut): LeftOut => {
    const at = was.findIndex(({ file, line }) => file === row.file && line === row.line);
    const { line, digest } = found[at] ?? row;
    return { ...row, line, ...(digest === undefined ? {} : { digest }) };
  };
  const moved = (step: Step): Step => {
    const { leaveOut } = step.request;
    return leaveOut === undefined
      ? step
      : { ...step, request: { ...step.request, leaveOut: leaveOut.map(now) } };
  };
  const { history, firstShown } = session;
  return {
    ...session,
    history: history.map(moved),
    firstShown: firstShown === null ? null : moved(firstShown),
  };
}

/** A new step; what had been undone is forgotten. */
function advance(session: Session, request: Request, when: string): Session {
  const history = [...session.history.slice(0, session.at + 1), { request, when }];
  return { ...session, history, at: history.length - 1 };
}

function stepOf(session: Session): Step {
  const step = session.history[session.at];
  if (step === undefined) throw new RangeError('a session always has a step in force');
  return step;
}
