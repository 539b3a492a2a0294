import { describe, expect, it } from 'vitest';
import type { LabelColumn } from '../../../src/core/model/cells';
import { idFacts, nestIds } from '../../../src/worker/asking/relation';

function labels(name: string, cells: readonly string[]): LabelColumn {
  const levels = ['', ...new Set(cells.filter(cell => cell !== ''))];
  return { kind: 'label', name, levels, codes: Int32Array.from(cells, cell => levels.indexOf(cell)) };
}
const compared = ['slow', 'standard'];

describe('how ids stand to groups', () => {
  const schedule = labels('schedule', ['slow', 'slow', 'standard', 'standard', 'slow', 'standard']);

  it('knows ids that each lie within one group as what can have received the treatment', () => {
    const firing = labels('firing', ['1', '1', '2', '2', '3', '4']);
    expect(idFacts(schedule, firing, compared)).toEqual({
      ids: 4,
      fewest: 1,
      most: 2,
      withinGroups: true,
      pairs: false,
      shared: 0,
    });
  });

  it('knows ids that occur once in each group as partners', () => {
    const tile = labels('tile', ['a', 'b', 'a', 'b', 'c', 'c']);
    expect(idFacts(schedule, tile, compared)).toMatchObject({
      ids: 3,
      pairs: true,
      shared: 3,
      withinGroups: false,
    });
  });

  it('passes over rows without an id and groups that are not compared', () => {
    const groups = labels('schedule', ['slow', 'quick', 'standard', 'slow']);
    const ids = labels('firing', ['1', '1', '2', '']);
    expect(idFacts(groups, ids, compared)).toMatchObject({ ids: 2, most: 1, withinGroups: true });
  });

  it('finds nothing in a column without ids', () => {
    expect(idFacts(schedule, labels('x', ['', '', '', '', '', '']), compared)).toMatchObject({
      ids: 0,
      fewest: 0,
    });
  });

  it('tells ids apart by the column around them, for their numbering may start again there', () => {
    const nested = nestIds(labels('firing', ['1', '1', '2', '2']), labels('tile', ['1', '2', '1', '']));
    expect(nested.levels).toEqual(['', '1, 1', '1, 2', '2, 1']);
    expect([...nested.codes]).toEqual([1, 2, 3, 0]);
  });
});
