import { describe, expect, it } from 'vitest';
import { fieldName, findField } from '../../src/readers/findField';
import { refusalOf } from './read';

const fieldsOf = (...names: readonly string[]) => names.map(name => ({ name, unit: null, file: 0 }));
const refused = (work: () => unknown) => refusalOf(Promise.resolve().then(work));

describe('a column', () => {
  const fields = fieldsOf('site', ' mass ', 'mass', 'depth', 'depth', '', '#9');

  it('is found by its exact header text before anything else', () => {
    expect([findField(fields, 'mass'), findField(fields, ' mass '), findField(fields, '#9')]).toEqual([
      2, 1, 6,
    ]);
  });

  it('is found without the blanks around its header when only one fits', () => {
    expect(findField(fieldsOf('site', ' mass'), 'mass')).toBe(1);
  });

  it('is found by its place', () => {
    expect([findField(fields, '#1'), findField(fields, '#6')]).toEqual([0, 5]);
  });

  it('that does not exist is refused with those that do', async () => {
    const refusal = await refused(() => findField(fields, 'weight'));
    expect(refusal?.code).toBe('column-unknown');
    expect(refusal?.facts).toEqual({
      name: 'weight',
      columns: ['site', ' mass ', 'mass', '#4', '#5', '#6', '#9'],
    });
    expect((await refused(() => findField(fields, '#8')))?.code).toBe('column-unknown');
    expect((await refused(() => findField(fields, '')))?.code).toBe('column-unknown');
  });

  it('whose name fits two is refused with their places', async () => {
    const refusal = await refused(() => findField(fields, 'depth'));
    expect([refusal?.code, refusal?.facts]).toEqual([
      'column-ambiguous',
      { name: 'depth', columns: ['#4', '#5'] },
    ]);
  });

  it('is called by its header, or by its place where that says too little', () => {
    expect(fields.map((_, index) => fieldName(fields, index))).toEqual([
      'site',
      ' mass ',
      'mass',
      '#4',
      '#5',
      '#6',
      '#9',
    ]);
  });
});
