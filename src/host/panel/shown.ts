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
  /** Computed from the editor's text, which is not saved. */
  readonly unsaved: boolean;
  /** The worker had died and was started again. */
  readonly restarted: boolean;
}
