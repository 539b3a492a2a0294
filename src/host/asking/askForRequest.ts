import { CancellationError } from 'vscode';
import type { Request } from '../../compare/request';
import type { StepId } from '../../protocol/asking';
import type { FileInput } from '../../protocol/files';
import type { ComputeClient } from '../compute/computeClient';
import { whileWaiting } from '../whileWaiting';
import type { Services } from '../services';
import { showStep } from './showStep';

interface Wanted {
  readonly files: readonly FileInput[];
  /** What is already known: the selection's rows, the settings of the extension. */
  readonly request: Partial<Request>;
  readonly columns: readonly string[] | null;
  readonly remembered: Partial<Request> | null;
  /** Stands before every question: what is compared and what was taken of it. */
  readonly title: string;
  readonly onStep: Services['onStep'];
}

interface Given {
  readonly request: Partial<Request>;
  readonly answered: readonly StepId[];
}

/**
 * Puts one question after another until nothing is left to ask. Going back brings the question before with the answer
 * it got under the cursor. Rejects with CancellationError when the person gives up: nothing was changed by then.
 */
export async function askForRequest(client: ComputeClient, wanted: Wanted): Promise<Partial<Request>> {
  const given: Given[] = [{ request: wanted.request, answered: [] }];
  let habits = wanted.remembered;
  for (;;) {
    const now = given.at(-1) ?? { request: wanted.request, answered: [] };
    const call = {
      type: 'nextStep',
      revision: 0,
      files: wanted.files,
      columns: wanted.columns,
      only: null,
    } as const;
    const { step, request } = await whileWaiting(wanted.title, options =>
      client.ask({ ...call, remembered: habits, ...now }, options),
    );
    if (step === null) return request;
    wanted.onStep({ id: step.id, title: wanted.title });
    const answer = await showStep(step, { title: wanted.title, canGoBack: given.length > 1 });
    wanted.onStep(null);
    if (answer === 'escape') throw new CancellationError();
    if (answer === 'back') {
      given.pop();
      continue;
    }
    habits = { ...habits, ...answer.adds };
    given.push({ request: { ...request, ...answer.adds }, answered: [...now.answered, step.id] });
  }
}
