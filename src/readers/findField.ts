import type { Field } from '../core/model/cells';
import { Refusal } from '../core/model/problem';

/**
 * The column of this name: the exact header text, else the only header equal to it but for spaces around it, else '#3' for
 * the third column.
 * @returns its index from 0
 * @throws Refusal column-unknown (facts name, columns) or column-ambiguous (facts name, columns: '#1', '#4', …)
 */
export function findField(fields: readonly Field[], name: string): number {
  for (const wanted of [
    (field: Field) => field.name === name,
    (field: Field) => field.name.trim() === name.trim(),
  ]) {
    const found = fields.flatMap((field, index) => (name.trim() !== '' && wanted(field) ? [index] : []));
    if (found.length > 1) {
      throw new Refusal('column-ambiguous', { name, columns: found.map(index => `#${index + 1}`) }, name);
    }
    if (found[0] !== undefined) return found[0];
  }
  const number = /^#(\d+)$/.exec(name.trim());
  const index = number === null ? -1 : Number(number[1]) - 1;
  if (index >= 0 && index < fields.length) return index;
  throw new Refusal('column-unknown', { name, columns: fields.map(nameOf) }, name);
}

/** What a column is called: its header text, or '#3' where it has none or shares it with another. */
export function fieldName(fields: readonly Field[], index: number): string {
  const name = fields[index]?.name ?? '';
  const shared = fields.filter(field => field.name === name).length > 1;
  return name.trim() === '' || shared ? `#${index + 1}` : name;
}

const nameOf = (_: Field, index: number, fields: readonly Field[]): string => fieldName(fields, index);
