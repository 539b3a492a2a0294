import * as v from 'valibot';
import { checked } from './checked';
import type { Request } from '../compare/request';
import type { Session } from '../compare/session';
import type { Provenance } from '../core/model/settings';
import { stepIds, type StepId } from './asking';
import { fileInputSchema, textSpanSchema, type FileInput, type TextSpan } from './files';
import { countSchema, lineSchema } from './places';
import { provenanceSchema } from './provenance';
import { partialRequestSchema } from './request';
import { sessionSchema } from './session';

/** First message to a new worker, once: the words of the reader's language, our version, and where giving up is marked. */
export interface Start {
  readonly type: 'start';
  readonly words: Readonly<Record<string, string>> | null;
  readonly version: string;
  readonly flags: Int32Array | null;
}

/** Every call has a number of its own; `revision` counts up within one panel, so that a late reply is known as late. */
interface Called {
  readonly call: number;
  readonly revision: number;
}

/** What stands in these files, and which rows and columns the selected text touches? */
export interface Survey extends Called {
  readonly type: 'survey';
  readonly files: readonly FileInput[];
  readonly request: Partial<Request>;
  readonly spans: readonly TextSpan[];
}

/** What is to be asked next, given the answers so far? */
export interface NextStep extends Called {
  readonly type: 'nextStep';
  readonly files: readonly FileInput[];
  readonly request: Partial<Request>;
  /** Columns that the selection touches; null: no column was singled out. */
  readonly columns: readonly string[] | null;
  readonly remembered: Partial<Request> | null;
  readonly answered: readonly StepId[];
  /** Just this question, though it is answered: what is remembered is then the answer that stands. */
  readonly only: StepId | null;
}

/** The whole comparison, ready to be shown. */
export interface Answer extends Called {
  readonly type: 'answer';
  readonly files: readonly FileInput[];
  readonly session: Session;
  /** What the record says of itself; the changes of the session follow those it names. */
  readonly provenance: Provenance;
  /** When the record is written: ISO 8601 with the offset of the place. */
  readonly written: string;
  /** False for unsaved text: no record is made of what stands in no file. */
  readonly record: boolean;
  /** Whether every number is sent beside the view (tests compare them with the command line's). */
  readonly numbers: boolean;
}

/** The recipe that a settings block holds. */
export interface Restore extends Called {
  readonly type: 'restore';
  readonly blockText: string;
}

/** Which settings blocks stand in a text, and which files do they name? */
export interface Blocks extends Called {
  readonly type: 'blocks';
  readonly text: string;
}

/** A file that a block names; `input` is null when it could not be found, or when it lies outside the root. */
export interface NamedFile {
  readonly name: string;
  readonly input: FileInput | null;
  readonly outside: boolean;
}

/** What became of every block of a text? */
export interface Recheck extends Called {
  readonly type: 'recheck';
  readonly text: string;
  readonly files: readonly NamedFile[];
}

/** Where in the text is this cell? */
export interface Locate extends Called {
  readonly type: 'locate';
  readonly files: readonly FileInput[];
  readonly request: Partial<Request>;
  readonly file: number;
  readonly line: number;
  readonly field: number;
}

export type WorkerCall = Survey | NextStep | Answer | Restore | Blocks | Recheck | Locate;
export type ToWorker = Start | WorkerCall;

const called = { call: lineSchema, revision: countSchema };
const files = v.array(fileInputSchema);

const toWorkerSchema: v.GenericSchema<unknown, ToWorker> = v.variant('type', [
  v.strictObject({
    type: v.literal('start'),
    words: v.nullable(v.record(v.string(), v.string())),
    version: v.string(),
    flags: v.nullable(v.custom<Int32Array>(value => value instanceof Int32Array)),
  }),
  v.strictObject({
    type: v.literal('survey'),
    ...called,
    files,
    request: partialRequestSchema,
    spans: v.array(textSpanSchema),
  }),
  v.strictObject({
    type: v.literal('nextStep'),
    ...called,
    files,
    request: partialRequestSchema,
    columns: v.nullable(v.array(v.string())),
    remembered: v.nullable(partialRequestSchema),
    answered: v.array(v.picklist(stepIds)),
    only: v.nullable(v.picklist(stepIds)),
  }),
  v.strictObject({
    type: v.literal('answer'),
    ...called,
    files,
    session: sessionSchema,
    provenance: provenanceSchema,
    written: v.pipe(v.string(), v.isoTimestamp()),
    record: v.boolean(),
    numbers: v.boolean(),
  }),
  v.strictObject({ type: v.literal('restore'), ...called, blockText: v.string() }),
  v.strictObject({ type: v.literal('blocks'), ...called, text: v.string() }),
  v.strictObject({
    type: v.literal('recheck'),
    ...called,
    text: v.string(),
    files: v.array(
      v.strictObject({ name: v.string(), input: v.nullable(fileInputSchema), outside: v.boolean() }),
    ),
  }),
  v.strictObject({
    type: v.literal('locate'),
    ...called,
    files,
    request: partialRequestSchema,
    file: countSchema,
    line: lineSchema,
    field: countSchema,
  }),
]);

/** The message, once it is known to be one; throws NotAMessage otherwise. */
export const readToWorker = (message: unknown): ToWorker => checked('to worker', toWorkerSchema, message);
