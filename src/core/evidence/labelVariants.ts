import type { LabelColumn, Table } from '../model/cells';
import type { EvidenceDescriptor, Finding, Seen } from '../model/comparison';
import { alikeLabels } from './alikeLabels';
import { mergedLabel } from './mergedLabel';

const CELLS = 20;

/** The field a name means: its exact header, else that but for spaces around it, else its place; −1 where there is none. */
function labelField({ fields }: Table, column: string): number {
  const exact = fields.findIndex(({ name }) => name === column);
  if (exact >= 0) return exact;
  const trimmed = fields.findIndex(({ name }) => name.trim() === column.trim());
  const place = /^#(\d+)$/.exec(column.trim());
  return trimmed >= 0 || place === null ? trimmed : Number(place[1]) - 1;
}

/**
 * Labels that are alike and count as different groups, at least one of them a group that is compared. A label declared the
 * same as itself is declared a group of its own.
 */
function openSets({ levels }: LabelColumn, { groups, settings }: Seen): readonly (readonly string[])[] {
  const compared = new Set(groups.map(({ label }) => label));
  const own = new Set(settings.same.filter(([from, to]) => from === to).map(([from]) => from));
  return alikeLabels(levels.filter(label => !own.has(label))).filter(set => {
    const counted = new Set(set.map(label => mergedLabel(label, settings.same)));
    return counted.size > 1 && [...counted].some(label => compared.has(label));
  });
}

function findingOf(set: readonly string[], field: number, table: Table, { groups, settings }: Seen): Finding {
  const { levels, codes } = table.labels(field);
  const rowsOf = new Map<string, number[]>(set.map(label => [label, []]));
  for (let row = 0; row < table.rows; row++) rowsOf.get(levels[codes[row] ?? 0] ?? '')?.push(row);
  const byRows = [...rowsOf].sort(([, one], [, other]) => other.length - one.length);
  const usual = byRows[0]?.[0] ?? '';
  const rare = byRows.slice(1);
  const compared = new Set(groups.map(({ label }) => label));
  // Both named as test and reference: a person has already said that they are two groups.
  const named = groups.length === 2 && set.filter(label => compared.has(label)).length === 2;
  return {
    id: 'label-variants',
    level: named ? 'warn' : 'ask',
    facts: {
      column: table.fields[field]?.name ?? '',
      labels: byRows.map(([label]) => label),
      counts: byRows.map(([, rows]) => rows.length),
    },
    group: null,
    count: rare.reduce((count, [, rows]) => count + rows.length, 0),
    cells: rare
      .flatMap(([, rows]) => rows)
      .slice(0, CELLS)
      .map(row => ({ file: table.file(row), line: table.line(row), field })),
    answers: [usual, null].map(into => ({
      same: [...settings.same, ...rare.map(([label]): [string, string] => [label, into ?? label])],
    })),
  };
}

/**
 * Labels that differ only in capitals, spaces or width, one of them compared and not all of them one group. Labels are
 * taken exactly as written, so rows of the other spelling are missing from the group: whether they belong to it changes
 * the numbers and only the person knows.
 */
export const labelVariants: EvidenceDescriptor<'label-variants'> = {
  id: 'label-variants',
  thresholds: [],
  references: [],
  look(seen) {
    const { table, settings } = seen;
    if (table === null || settings.layout.kind !== 'long') return [];
    const field = labelField(table, settings.layout.label);
    if (field < 0) return [];
    return openSets(table.labels(field), seen).map(set => findingOf(set, field, table, seen));
  },
  canTell: () => true,
  title: t => t('spellings of a label'),
  say({ facts }, t) {
    const labels = facts['labels'];
    const counts = facts['counts'];
    const listed =
      Array.isArray(labels) && Array.isArray(counts)
        ? labels.map((label, at) => `"${String(label)}" (${String(counts[at] ?? 0)})`)
        : [];
    return t(
      '{0} holds labels that differ only in capitals or spaces: {1}. Are they the same group?',
      String(facts['column']),
      listed.join(', '),
    );
  },
};
