import type { LabelColumn } from '../../core/model/cells';
import type { FileInput } from '../../protocol/files';
import type { NextStep } from '../../protocol/toWorker';
import { fieldName } from '../../readers/findField';
import type { ReadingWish } from '../../readers/readingWish';
import type { Survey } from '../../readers/survey';
import type { AskContext } from '../asking/askContext';
import { canBeIds, canBeLabels } from '../asking/columnRoles';
import { nextStep, onlyStep } from '../asking/nextStep';
import type { Sitting } from '../desk';
import { surveyFile, tableOf } from '../filesAtHand';
import type { Reply } from '../reply';

/** Above this, columns in which every cell is another one are not held as labels: they would take more than all others. */
const MANY_ROWS = 200_000;

/** Decides what is to be asked next about these files. */
export async function nextStepCall(call: NextStep, sitting: Sitting): Promise<Reply<'asked'>> {
  const { desk, tick } = sitting;
  const wish = call.request.wish ?? {};
  const [file] = call.files;
  if (file === undefined) return { type: 'asked', step: null, request: call.request };
  const survey = await surveyFile(desk, file, wish, tick);
  const labels = await labelColumns(file, wish, survey, sitting);
  const context: AskContext = {
    t: desk.t,
    files: call.files.map(({ name }) => name),
    rows: survey.rows,
    columns: survey.columns.map(column => ({ ...column, name: fieldName(survey.fields, column.field) })),
    request: call.request,
    picked: call.columns,
    remembered: call.remembered,
    answered: call.answered,
    labelsOf: name => labels.get(name) ?? null,
  };
  if (call.only !== null) return { type: 'asked', step: onlyStep(context, call.only), request: call.request };
  return { type: 'asked', ...nextStep(context) };
}

/** Every column that could hold labels or ids, as labels. */
async function labelColumns(
  file: FileInput,
  wish: ReadingWish,
  survey: Survey,
  { desk, tick }: Sitting,
): Promise<ReadonlyMap<string, LabelColumn>> {
  const wanted = survey.columns
    .filter(column => canBeIds(column) || canBeLabels(column))
    .filter(column => survey.rows <= MANY_ROWS || !column.nearlyUnique)
    .map(({ field }) => field);
  const table = await tableOf(desk, file, wish, wanted, tick);
  return new Map(wanted.map(field => [fieldName(survey.fields, field), table.labels(field)]));
}
