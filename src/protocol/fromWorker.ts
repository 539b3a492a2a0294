import * as v from 'valibot';
import { checked } from './checked';
import type { Request } from '../compare/request';
import type { LeftOut, Provenance } from '../core/model/settings';
import type { View } from '../report/view';
import { stepSchema, type Step } from './asking';
import { countSchema, lineSchema, shownProblemSchema, type ShownProblem } from './places';
import { provenanceSchema } from './provenance';
import { leftOutSchema, partialRequestSchema } from './request';

interface Reply {
  readonly call: number;
  readonly revision: number;
}

/** What the reader decided about one file and how much it kept: for the log, never a value of a cell. */
export interface ReadingFacts {
  readonly file: string;
  readonly encoding: string;
  readonly delimiter: string;
  readonly decimal: string;
  readonly headerLine: number;
  readonly rows: number;
  /** What was passed over or repaired, and how often. */
  readonly met: readonly (readonly [what: string, times: number])[];
}

export interface Surveyed extends Reply {
  readonly type: 'surveyed';
  readonly readings: readonly ReadingFacts[];
  /** Closed ranges of line numbers the selection takes; null: every row. */
  readonly rows: readonly (readonly [number, number])[] | null;
  /** Columns it takes; null: none was singled out. */
  readonly columns: readonly string[] | null;
  /** What was taken, in words: "lines 2–41, 3 columns". */
  readonly says: string;
}

export interface Asked extends Reply {
  readonly type: 'asked';
  /** null: nothing is left to ask. */
  readonly step: Step | null;
  /** The request with the plain answers that were taken without asking. */
  readonly request: Partial<Request>;
}

export interface Answered extends Reply {
  readonly type: 'answered';
  readonly view: View;
  readonly blockText: string | null;
  readonly readings: readonly ReadingFacts[];
  /** Digest of the cells used: what was seen of these data is remembered under it. */
  readonly cells: string;
  /** Ids of the questions that the data leave open. */
  readonly open: readonly string[];
  /** The rows left out, in the order asked: the lines they stand on now, each with its digest. */
  readonly leaveOut: readonly LeftOut[];
  readonly numbers: Readonly<Record<string, unknown>> | null;
}

export interface Restored extends Reply {
  readonly type: 'restored';
  readonly provenance: Provenance;
}

/** A block of a text: its first and last line from 1, and the files it names. */
export interface BlockPlace {
  readonly firstLine: number;
  readonly lastLine: number;
  readonly files: readonly string[];
}

export interface BlocksFound extends Reply {
  readonly type: 'blocksFound';
  readonly blocks: readonly BlockPlace[];
}

export const outcomeKinds = ['same', 'moved', 'turned', 'altered', 'reworked', 'planned', 'blocked'] as const;

/** What became of one block: `line` is that of the key that moved, or the block's first. */
export interface OutcomeShown {
  readonly kind: (typeof outcomeKinds)[number];
  readonly firstLine: number;
  readonly line: number;
  readonly sentence: string;
  readonly changes: readonly { readonly key: string; readonly was: string; readonly is: string }[];
}

export interface Rechecked extends Reply {
  readonly type: 'rechecked';
  readonly outcomes: readonly OutcomeShown[];
}

/** A cell in its text: line and columns from 1, the end is behind its last character. */
export interface Located extends Reply {
  readonly type: 'located';
  readonly line: number;
  readonly startColumn: number;
  readonly endColumn: number;
}

/** No answer can be given on these data or settings; says why and what to do. */
export interface Refused extends Reply {
  readonly type: 'refused';
  readonly problem: ShownProblem;
}

/** The call was given up. */
export interface CancelledReply extends Reply {
  readonly type: 'cancelled';
}

/** A mistake of ours: for the log. */
export interface Failed extends Reply {
  readonly type: 'failed';
  readonly message: string;
}

/** How far a call has come; follows no order and settles nothing. */
export interface Progress {
  readonly type: 'progress';
  readonly call: number;
  readonly done: number;
  readonly total: number;
}

export type WorkerReply =
  | Surveyed
  | Asked
  | Answered
  | Restored
  | BlocksFound
  | Rechecked
  | Located
  | Refused
  | CancelledReply
  | Failed;
export type FromWorker = WorkerReply | Progress;

const reply = { call: lineSchema, revision: countSchema };
const lineRange = v.tuple([lineSchema, lineSchema]);
const readings = v.array(
  v.strictObject({
    file: v.string(),
    encoding: v.string(),
    delimiter: v.string(),
    decimal: v.string(),
    headerLine: countSchema,
    rows: countSchema,
    met: v.array(v.tuple([v.string(), countSchema])),
  }),
);

/** The view is made by report from one typed function and only shown: that it is one is all that is asked of it here. */
export const viewSchema = v.custom<View>(
  value => typeof value === 'object' && value !== null && !Array.isArray(value),
);

const fromWorkerSchema: v.GenericSchema<unknown, FromWorker> = v.variant('type', [
  v.strictObject({
    type: v.literal('surveyed'),
    ...reply,
    readings,
    rows: v.nullable(v.array(lineRange)),
    columns: v.nullable(v.array(v.string())),
    says: v.string(),
  }),
  v.strictObject({
    type: v.literal('asked'),
    ...reply,
    step: v.nullable(stepSchema),
    request: partialRequestSchema,
  }),
  v.strictObject({
    type: v.literal('answered'),
    ...reply,
    view: viewSchema,
    blockText: v.nullable(v.string()),
    readings,
    cells: v.string(),
    open: v.array(v.string()),
    leaveOut: leftOutSchema,
    numbers: v.nullable(v.record(v.string(), v.unknown())),
  }),
  v.strictObject({
    type: v.literal('restored'),
    ...reply,
    provenance: provenanceSchema,
  }),
  v.strictObject({
    type: v.literal('blocksFound'),
    ...reply,
    blocks: v.array(
      v.strictObject({ firstLine: lineSchema, lastLine: lineSchema, files: v.array(v.string()) }),
    ),
  }),
  v.strictObject({
    type: v.literal('rechecked'),
    ...reply,
    outcomes: v.array(
      v.strictObject({
        kind: v.picklist(outcomeKinds),
        firstLine: lineSchema,
        line: lineSchema,
        sentence: v.string(),
        changes: v.array(v.strictObject({ key: v.string(), was: v.string(), is: v.string() })),
      }),
    ),
  }),
  v.strictObject({
    type: v.literal('located'),
    ...reply,
    line: lineSchema,
    startColumn: lineSchema,
    endColumn: lineSchema,
  }),
  v.strictObject({ type: v.literal('refused'), ...reply, problem: shownProblemSchema }),
  v.strictObject({ type: v.literal('cancelled'), ...reply }),
  v.strictObject({ type: v.literal('failed'), ...reply, message: v.string() }),
  v.strictObject({ type: v.literal('progress'), call: lineSchema, done: v.number(), total: v.number() }),
]);

/** The message, once it is known to be one; throws NotAMessage otherwise. */
export const readFromWorker = (message: unknown): FromWorker =>
  checked('from worker', fromWorkerSchema, message);
