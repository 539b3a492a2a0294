import * as v from 'valibot';

/**
 * One file as the host hands it to the worker: a path on the disk that the worker streams, or the bytes themselves
 * (unsaved text, and file systems that are no disk). Exactly one of `path` and `bytes` is set.
 */
export interface FileInput {
  /** As it stands in records: relative to the root, with '/'. */
  readonly name: string;
  readonly path: string | null;
  readonly bytes: Uint8Array | null;
  /** Changes whenever the content may have: what was read under one stamp is read again only under another. */
  readonly stamp: string;
}

export const fileInputSchema: v.GenericSchema<unknown, FileInput> = v.pipe(
  v.strictObject({
    name: v.string(),
    path: v.nullable(v.string()),
    bytes: v.nullable(
      v.custom<Uint8Array>(value => ArrayBuffer.isView(value) && value instanceof Uint8Array),
    ),
    stamp: v.string(),
  }),
  v.check(file => (file.path === null) !== (file.bytes === null), 'either a path or bytes'),
);

/** A piece of text selected in the editor: lines and characters from 0, the end is behind the last character. */
export interface TextSpan {
  readonly startLine: number;
  readonly startCharacter: number;
  readonly endLine: number;
  readonly endCharacter: number;
}

const place = v.pipe(v.number(), v.integer(), v.minValue(0));
export const textSpanSchema: v.GenericSchema<unknown, TextSpan> = v.strictObject({
  startLine: place,
  startCharacter: place,
  endLine: place,
  endCharacter: place,
});
