import type { FileInput, TextSpan } from '../../protocol/files';
import type { Survey as SurveyCall } from '../../protocol/toWorker';
import { readTable } from '../../readers/readTable';
import type { ReadingWish } from '../../readers/readingWish';
import type { Desk, Sitting } from '../desk';
import { scoutFiles, surveyFile } from '../filesAtHand';
import { readingFacts } from '../readingFacts';
import type { Reply } from '../reply';
import { sayTaken } from '../selecting/sayTaken';
import { selected, type Selected } from '../selecting/selected';
import { textLines } from '../selecting/cellSpans';

/** Looks over the files and says what the selected text takes of the first. */
export async function surveyCall(call: SurveyCall, { desk, tick }: Sitting): Promise<Reply<'surveyed'>> {
  const wish = call.request.wish ?? {};
  const surveys = await Promise.all(call.files.map(file => surveyFile(desk, file, wish, tick)));
  const [file] = call.files;
  const [first] = surveys;
  const fields = first?.fields.map(field => field.name) ?? [];
  const all: Selected = { rows: null, columns: null, rowCount: first?.rows ?? 0, uneven: false };
  const taken =
    file === undefined || call.files.length > 1 || call.spans.length === 0
      ? all
      : selected(call.spans, await selectable(desk, file, wish, call.spans));
  return {
    type: 'surveyed',
    readings: surveys.map((survey, index) =>
      readingFacts(call.files[index]?.name ?? '', survey.reading, survey.rows),
    ),
    rows: taken.rows,
    columns: taken.columns?.map(index => nameOf(fields, index)) ?? null,
    says: call.files.length > 1 ? desk.t('one group a file') : sayTaken(taken, fields, desk.t),
  };
}

/** A column's exact header text; its place where the header names two alike. */
function nameOf(fields: readonly string[], index: number): string {
  const name = fields[index] ?? '';
  return name === '' || fields.filter(other => other === name).length > 1 ? `#${index + 1}` : name;
}
