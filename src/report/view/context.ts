import type { Table } from '../../core/model/cells';
import type { Say } from '../../core/model/say';
import type { Provenance } from '../../core/model/settings';

/** What a view needs beside the comparison: words, where values stand, and what the record says of itself. */
export interface ViewContext {
  readonly t: Say;
  /** The table compared, for the lines of values; null for typed numbers. */
  readonly table: Table | null;
  readonly files: readonly { readonly path: string; readonly bytes: number; readonly sha256: string }[];
  readonly version: string;
  readonly provenance: Provenance;
  /** The settings block as printed; null where no record can be made (an open question, unsaved text). */
  readonly blockText: string | null;
}
