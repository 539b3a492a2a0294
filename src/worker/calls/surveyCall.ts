import type { FileInput } from '../../protocol/files';
import type { Survey as SurveyCall } from '../../protocol/toWorker';
import { fieldName } from '../../readers/findField';
import type { ReadingWish } from '../../readers/readingWish';
import type { Sitting } from '../desk';
import { scoutFiles, surveyFile, tableOf, textOf } from '../filesAtHand';
import { readingFacts } from '../readingFacts';
import type { Reply } from '../reply';
import { textLines } from '../selecting/cellSpans';
import { sayTaken } from '../selecting/sayTaken';
import { selected, type SelectableText, type Selected } from '../selecting/selected';

/** Looks over the files and says what the selected text takes of the first. */
export async function surveyCall(call: SurveyCall, sitting: Sitting): Promise<Reply<'surveyed'>> {
  const { desk, tick } = sitting;
  const wish = call.request.wish ?? {};
  const surveys = await Promise.all(call.files.map(file => surveyFile(desk, file, wish, tick)));
  const [file] = call.files;
  const [first] = surveys;
  const fields = first?.fields ?? [];
  const names = fields.map((_, index) => fieldName(fields, index));
  const whole: Selected = { rows: null, columns: null, rowCount: first?.rows ?? 0, uneven: false };
  const isSelected = file !== undefined && call.files.length === 1 && call.spans.length > 0;
  const taken = isSelected ? selected(call.spans, await selectable(file, wish, names, sitting)) : whole;
  return {
    type: 'surveyed',
    readings: surveys.map((survey, index) =>
      readingFacts(call.files[index]?.name ?? '', survey.reading, survey.rows),
    ),
    rows: taken.rows,
    columns: taken.columns?.map(index => names[index] ?? '') ?? null,
    says: call.files.length > 1 ? desk.t('one group a file') : sayTaken(taken, names, desk.t),
  };
}

async function selectable(
  file: FileInput,
  wish: ReadingWish,
  fields: readonly string[],
  { desk, tick }: Sitting,
): Promise<SelectableText> {
  const [scouted] = await scoutFiles(desk, [file], wish);
  const table = await tableOf(desk, file, wish, [], tick);
  return {
    lines: textLines(await textOf(desk, file, wish, tick)),
    delimiter: scouted?.reading.delimiter ?? ',',
    headerLine: scouted?.reading.headerLine ?? 1,
    rowLines: Array.from({ length: table.rows }, (_, row) => table.line(row)),
    fields,
  };
}
