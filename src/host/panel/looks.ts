import { reduce, type Session } from '../../compare/session';
import type { Provenance } from '../../core/model/settings';
import type { Seen } from '../../protocol/session';

interface Sitting {
  readonly session: Session;
  readonly provenance: Provenance;
}

interface Look {
  /** What was seen of the same cells before, in any sitting. */
  readonly before: Seen | null;
  /** Whether it is the first result of this sitting. */
  readonly isFirst: boolean;
  /** Whether it is the result of a record that came back after a reload: it was counted when it was made. */
  readonly isAgain: boolean;
  readonly when: string;
}

/** The sitting after a result was seen: counted, and the first one ever seen of these cells remembered as such. */
export function afterLook({ session, provenance }: Sitting, look: Look): Sitting {
  const { before, isFirst, isAgain, when } = look;
  const known = before === null || session.firstShown !== null ? null : before.firstShown;
  const here = isFirst && !isAgain ? 0 : provenance.looks;
  const looks = Math.max(before?.looks ?? 0, here) + (isAgain ? 0 : 1);
  if (known === null) {
    return { session: reduce(session, { kind: 'shown', when }), provenance: { ...provenance, looks } };
  }
  // Changes follow from what was seen first; the reasons given for them stand in the record.
  const reasons = Object.fromEntries(provenance.changed.map(({ key, reason }) => [key, reason]));
  return {
    session: { ...session, firstShown: known, reasons: { ...reasons, ...session.reasons } },
    provenance: { ...provenance, looks, changed: [] },
  };
}
