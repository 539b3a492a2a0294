import type { Request } from '../../compare/request';
import type { Answered } from '../../protocol/fromWorker';
import type { ShownProblem } from '../../protocol/places';
import type { View } from '../../report/view';

/** What came of a comparison: an answer, or why there is none. */
export interface Shown {
  readonly revision: number;
  readonly request: Request;
  readonly view: View | null;
  readonly blockText: string | null;
  readonly problem: ShownProblem | null;
  readonly open: readonly string[];
  readonly numbers: Answered['numbers'];
  /** Of the files it was computed from, as the host stamped them; none where they could not be opened. */
  readonly stamps: readonly string[];
  /** Computed from the editor's text, which is not saved. */
  readonly unsaved: boolean;
  /** The worker had died and was started again. */
  readonly restarted: boolean;
}
