import type { Field } from '../core/model/cells';
import type { Layout, Relation } from '../core/model/settings';
import { findField } from '../readers/findField';
import { summaryFields, type SummaryFields } from './summaryFields';

/** The field indices behind the names of a comparison. */
export interface Roles {
  /** One a group in the wide layout, else one; empty for summaries. */
  readonly measured: readonly number[];
  readonly label: number | null;
  /** Unit columns outermost first, or the pair column. */
  readonly ids: readonly number[];
  readonly where: readonly number[];
  readonly summary: SummaryFields | null;
}

type Named = {
  readonly layout: Layout;
  readonly relation: Relation;
  readonly where: readonly (readonly [column: string, label: string])[];
};

export function rolesOf({ layout, relation, where }: Named, fields: readonly Field[]): Roles {
  const find = (name: string): number => findField(fields, name);
  const summary = layout.kind === 'summary' ? summaryFields(fields, layout.label) : null;
  return {
    measured: measuredNames(layout).map(find),
    label: layout.kind === 'long' ? find(layout.label) : (summary?.label ?? null),
    ids: idNames(relation).map(find),
    where: where.map(([column]) => find(column)),
    summary,
  };
}

/** Unit columns outermost first, or the pair column; empty when rows stand alone. */
export function idNames(relation: Relation): readonly string[] {
  switch (relation.kind) {
    case 'units':
      return relation.columns;
    case 'pairs':
      return [relation.column];
    case 'rows':
    case 'independent':
      return [];
  }
}

function measuredNames(layout: Layout): readonly string[] {
  switch (layout.kind) {
    case 'long':
      return layout.measured;
    case 'wide':
      return layout.columns;
    case 'files':
      return [layout.measured];
    case 'summary':
    case 'typed':
      return [];
  }
}
