import { describe, expect, it } from 'vitest';
import { ask, refusal, rowOf } from './ask';
import { tableFrom } from './tableFrom';

const LONG = `
schedule,hardness (MPa),firing,tile
slow,840,1,a
standard,815,2,a
slow,846,3,a
standard,821,4,a
slow,851,5,a
standard,809,6,a
slow,838,7,a
standard,818,8,a
`;
const long = { measured: ['hardness (MPa)'], label: 'schedule' };

describe('groups', () => {
  it('takes the first label met as the test group when none is named, and says so', () => {
    const found = ask(LONG, long);
    expect(found.groups.map(({ label, n }) => [label, n])).toEqual([
      ['slow', 4],
      ['standard', 4],
    ]);
    expect(found.notes).toContainEqual({
      code: 'first-is-test',
      facts: { test: 'slow', reference: 'standard' },
    });
    expect(found.chosen).toMatchObject({ id: 'separate-t', data: 'all', applies: true, counted: true });
    expect(found.chosen.result?.estimate).toBe(28);
    expect(found.measured).toBe('hardness (MPa)');
    expect(found.unit).toBe('MPa');
  });

  it('takes the other of two labels when one is named, whichever', () => {
    for (const named of [{ test: 'standard' }, { reference: 'slow' }]) {
      const found = ask(LONG, { ...long, ...named });
      expect(found.chosen.result?.estimate).toBe(-28);
      expect(found.notes).toEqual([]);
    }
  });

  it('refuses more than two labels of which not both are named, with their counts', () => {
    const three = `${LONG}other,800,9,a`;
    const { code, facts } = refusal(() => ask(three, { ...long, test: 'slow' }));
    expect(code).toBe('groups-too-many');
    expect(facts).toMatchObject({ labels: ['slow', 'standard', 'other'], counts: [4, 4, 1] });
    const found = ask(three, { ...long, test: 'slow', reference: 'standard' });
    expect(found.notes).toEqual([{ code: 'groups-not-compared', facts: { count: 1 } }]);
  });

  it('refuses a label that is not there, naming those that are', () => {
    const { code, facts } = refusal(() => ask(LONG, { ...long, test: 'Slow' }));
    expect(code).toBe('label-unknown');
    expect(facts).toMatchObject({
      label: 'Slow',
      column: 'schedule',
      labels: ['slow', 'standard'],
      counts: [4, 4],
    });
  });

  it('refuses a single label', () => {
    expect(refusal(() => ask('g,x\na,1\na,2', { measured: ['x'], label: 'g' })).code).toBe('groups-too-few');
  });

  it('compares columns: one a group, blanks at the end of a shorter one are not missing values', () => {
    const wide = 'slow,standard\n840,815\n,821\n851,\n838,';
    const found = ask(wide, { columns: ['slow', 'standard'] });
    expect(found.groups.map(({ n, missing }) => [n, missing])).toEqual([
      [3, 1],
      [2, 0],
    ]);
    expect(found.chosen.result?.estimate).toBe(25);
  });

  it('compares two files by their names', () => {
    const table = tableFrom('x\n1\n2\n4', 'x\n2\n5\n9');
    const found = ask(table, { files: ['kiln/april.csv', 'kiln/may.csv'], measured: ['x'] });
    expect(found.groups.map(({ label }) => label)).toEqual(['april.csv', 'may.csv']);
    expect(found.chosen.result?.estimate).toBe(-3);
  });

  it('merges labels that were declared the same, one merge after another', () => {
    const text = 'g,x\nSlow,1\nslow,2\nslow cool,4\nstandard,2\nstandard,7';
    const found = ask(text, {
      measured: ['x'],
      label: 'g',
      same: [
        ['Slow', 'slow'],
        ['slow', 'slow cool'],
      ],
    });
    expect(found.groups.map(({ label, n }) => [label, n])).toEqual([
      ['slow cool', 3],
      ['standard', 2],
    ]);
  });

  it('takes only the lines and labels asked for', () => {
    expect(
      ask(LONG, {
        ...long,
        rows: [
          [2, 5],
          [9, 9],
        ],
      }).groups.map(({ n }) => n),
    ).toEqual([2, 3]);
    const sites = 'g,x,site\na,1,N\na,2,N\nb,3,N\nb,5,N\na,9,S\nb,8,W\nb,7,W\na,6,W';
    const where = (...labels: string[]): number[] =>
      ask(sites, {
        measured: ['x'],
        label: 'g',
        where: labels.map(label => ['site', label] as const),
      }).groups.map(({ n }) => n);
    expect(where('N')).toEqual([2, 2]);
    expect(where('N', 'W')).toEqual([3, 4]);
    expect(refusal(() => where('E'))).toMatchObject({
      code: 'label-unknown',
      facts: { label: 'E', column: 'site' },
    });
    expect(refusal(() => ask(LONG, { ...long, rows: [[50, 60]] }))).toMatchObject({
      code: 'row-unknown',
      facts: { from: 50, to: 60, first: 2, last: 9 },
    });
  });

  it('counts missing values and rows without a label', () => {
    const found = ask('g,x\na,1\na,NA\na,3\n,5\nb,2\nb,4\nb,', { measured: ['x'], label: 'g' });
    expect(found.groups.map(({ n, missing }) => [n, missing])).toEqual([
      [2, 1],
      [2, 1],
    ]);
    expect(found.notes).toContainEqual({ code: 'rows-without-label', facts: { count: 1 } });
  });

  it('gives median, quartiles and range by linear interpolation at (n − 1)q', () => {
    // source: Hyndman & Fan 1996, The American Statistician 50:361–365, definition 7
    const [group] = ask('g,x\na,1\na,2\na,4\na,8\nb,0\nb,1', { measured: ['x'], label: 'g' }).groups;
    expect(group).toMatchObject({ median: 3, q1: 1.75, q3: 5, min: 1, max: 8 });
    expect(group?.se).toBeCloseTo(group!.sd / 2, 15);
  });
});

describe('rows under other assumptions', () => {
  it('has one row for each method of the measure, in registry order, each saying why it is not counted', () => {
    const { whatIf } = ask(LONG, long);
    expect(
      whatIf.rows.map(({ id, applies, counted, reason }) => [id, applies, counted, reason?.code ?? null]),
    ).toEqual([
      ['separate-t', true, true, null],
      ['pooled-t', true, true, null],
      ['conservative-t', true, false, 'bound'],
      ['large-n-z', true, false, 'too-few-for-normal'],
      ['known-sigma-z', false, false, 'sigma-absent'],
      ['permutation', true, true, null],
      ['paired-t', false, false, 'no-pairs'],
      ['sign-flip', false, false, 'no-pairs'],
    ]);
    expect(whatIf.counted).toEqual([0, 1, 5]);
  });

  it('does not count a row that was ruled out', () => {
    const found = ask(LONG, { ...long, options: { 'ruled-out': 'pooled-t' } });
    expect(rowOf(found, 'pooled-t')).toMatchObject({
      applies: true,
      counted: false,
      reason: { code: 'ruled-out' },
    });
  });

  it('computes the chosen row alone when asked to, and the counted rows of an old record when asked to', () => {
    expect(ask(LONG, { ...long, onlyChosen: true }).whatIf.rows.map(({ id }) => id)).toEqual(['separate-t']);
    const old = ask(LONG, { ...long, method: 'pooled-t' }, { counted: ['separate-t', 'pooled-t'] });
    expect(old.whatIf.rows.map(({ id }) => id)).toEqual(['separate-t', 'pooled-t']);
  });

  it('settles the rule of 30 by the data', () => {
    const many = (n: number): string =>
      `g,x\n${Array.from({ length: 2 * n }, (_, i) => `${i % 2 === 0 ? 'a' : 'b'},${(i * 7) % 11}`).join('\n')}`;
    const chosen = (n: number): string =>
      ask(many(n), { measured: ['x'], label: 'g', curve: 'normal-over-30' }).chosen.id;
    expect([chosen(30), chosen(31)]).toEqual(['separate-t', 'large-n-z']);
  });

  it('gives percent and Hedges’ g beside the difference, no percent on a scale whose zero is a convention', () => {
    const ids = (name: string): string[] =>
      ask(LONG.replace('hardness (MPa)', name), { measured: [name], label: 'schedule' }).effects.map(
        ({ id }) => id,
      );
    expect(ids('hardness (MPa)')).toEqual(['percent', 'hedges-g']);
    expect(ids('level (dB)')).toEqual(['hedges-g']);
    expect(ids('pH')).toEqual(['hedges-g']);
    expect(ids('peak (°C)')).toEqual(['hedges-g']);
    const [percent] = ask(LONG, long).effects;
    expect(percent?.value).toBeCloseTo((100 * 28) / 815.75, 12);
  });
});

describe('units', () => {
  const READINGS = `
schedule,firing,tile,x
slow,1,a,10
slow,1,a,20
slow,1,b,40
slow,2,a,30
standard,3,a,1
standard,3,b,3
standard,4,a,7
`;

  it('averages readings level by level: each piece counts once within the one above', () => {
    const found = ask(READINGS, { measured: ['x'], label: 'schedule', per: ['firing', 'tile'] });
    const [slow, standard] = found.groups;
    // firing 1: tile a (10 + 20)/2, tile b 40: (15 + 40)/2 = 27.5; firing 2: 30
    expect([slow?.n, slow?.readings, slow?.mean]).toEqual([2, 4, 28.75]);
    expect([standard?.n, standard?.readings, standard?.mean]).toEqual([2, 3, 4.5]);
    expect(slow?.units).toEqual([
      { path: ['1'], readings: 3 },
      { path: ['2'], readings: 1 },
    ]);
    expect(Array.from(slow!.unitOf!)).toEqual([0, 0, 0, 1]);
    expect(found.open).toEqual([]);
  });

  it('asks about units that stand in both groups, and makes no record of it until it is answered', () => {
    const shared = READINGS.replace('standard,3', 'standard,1');
    const found = ask(shared, { measured: ['x'], label: 'schedule', per: ['firing'] });
    expect(found.open).toEqual(['shared-unit']);
    expect(found.findings[0]).toMatchObject({
      id: 'shared-unit',
      level: 'ask',
      facts: { column: 'firing', shared: 1, ids: ['1'] },
      answers: [{ numberingRestarts: true }],
    });
    expect(found.findings[0]?.cells.map(({ line, field }) => [line, field])).toEqual([
      [2, 1],
      [6, 1],
    ]);
    expect(found.chosen.result).not.toBeNull();
    expect(ask(shared, { measured: ['x'], label: 'schedule', per: ['firing'], pair: 'none' }).open).toEqual(
      [],
    );
  });

  it('offers pairs where each shared unit has one reading a group', () => {
    const found = ask('g,x,plot\na,1,1\na,2,2\nb,2,1\nb,5,2', { measured: ['x'], label: 'g', per: ['plot'] });
    expect(found.findings[0]?.answers).toEqual([
      { relation: { kind: 'pairs', column: 'plot' } },
      { numberingRestarts: true },
    ]);
  });

  it('says when readings name no unit', () => {
    const found = ask(READINGS.replace('slow,2,a,30', 'slow,2,a,30\nslow,,a,99'), {
      measured: ['x'],
      label: 'schedule',
      per: ['firing'],
    });
    expect(found.groups[0]?.readings).toBe(4);
    expect(found.notes).toContainEqual({ code: 'rows-without-id', facts: { count: 1 } });
  });
});

describe('pairs', () => {
  const PAIRS =
    'g,x,day\nafter,5,mo\nbefore,3,mo\nafter,6,tu\nbefore,7,tu\nafter,9,we\nbefore,4,we\nafter,1,th\nbefore,,fr';
  const pairs = { measured: ['x'], label: 'g', pair: 'day' };

  it('matches by id, lists the unmatched, and compares the complete pairs', () => {
    const found = ask(PAIRS, pairs);
    expect(found.design).toBe('pairs');
    expect(found.pairs).toMatchObject({ complete: 3, unmatched: ['th'] });
    expect(found.groups.map(({ n }) => n)).toEqual([3, 3]);
    expect(found.chosen).toMatchObject({ id: 'paired-t' });
    expect(found.chosen.result?.estimate).toBe(2);
    expect(rowOf(found, 'separate-t')).toMatchObject({ applies: false, reason: { code: 'pairs-given' } });
    // by hand from the definition (Pearson): 5 6 9 against 3 7 4
    expect(found.pairs?.correlation).toBeCloseTo(-1 / 26, 14);
  });

  it('computes the unpaired answer only when it is asked for by name, and does not count it', () => {
    const found = ask(PAIRS, { ...pairs, method: 'separate-t' });
    expect(found.chosen).toMatchObject({
      id: 'separate-t',
      applies: true,
      counted: false,
      reason: { code: 'pairs-given' },
    });
    expect(found.groups.map(({ n }) => n)).toEqual([4, 3]);
  });

  it('refuses an id that stands twice in a group, and a file without a pair', () => {
    const repeated = refusal(() => ask(`${PAIRS}\nafter,2,mo`, pairs));
    expect(repeated).toMatchObject({
      code: 'pairs-repeated',
      facts: { id: 'mo', label: 'after', lines: [2, 10] },
      where: { line: 10, field: 2 },
    });
    expect(
      refusal(() => ask('g,x,d\na,1,p\na,2,q\nb,1,r\nb,2,s', { measured: ['x'], label: 'g', pair: 'd' }))
        .code,
    ).toBe('pairs-none');
  });

  it('pairs the columns of a wide layout by the id of the row', () => {
    const found = ask('day,after,before\nmo,5,3\ntu,6,7\nwe,9,4', {
      columns: ['after', 'before'],
      pair: 'day',
    });
    expect(found.chosen.result?.estimate).toBe(2);
  });
});

describe('left-out rows', () => {
  const out = { ...long, leaveOut: [{ file: 0, line: 2, reason: 'cracked on the saw', afterResult: false }] };

  it('are left out, named as they stand, and put back in a counted row beside', () => {
    const found = ask(LONG, { ...out, per: ['firing', 'tile'] });
    expect(found.groups[0]).toMatchObject({ n: 3, leftOut: 1 });
    expect(found.chosen).toMatchObject({ id: 'separate-t', data: 'without left-out' });
    const back = rowOf(found, 'separate-t', 'all');
    expect(back.counted).toBe(true);
    expect(back.result).toEqual(ask(LONG, { ...long, per: ['firing', 'tile'] }).chosen.result);
    expect(found.whatIf.rows.slice(0, 2).map(({ data }) => data)).toEqual(['all', 'without left-out']);
    expect(found.leftOut).toEqual([
      {
        file: 0,
        line: 2,
        reason: 'cracked on the saw',
        afterResult: false,
        row: 0,
        value: '840',
        group: 'slow',
        unit: [
          ['firing', '1'],
          ['tile', 'a'],
        ],
      },
    ]);
  });

  it('need a reason and a line on which a row starts', () => {
    expect(refusal(() => ask(LONG, { ...out, leaveOut: [{ ...out.leaveOut[0]!, reason: ' ' }] })).code).toBe(
      'reason-needed',
    );
    expect(refusal(() => ask(LONG, { ...out, leaveOut: [{ ...out.leaveOut[0]!, line: 1 }] }))).toMatchObject({
      code: 'leave-out-unknown',
      facts: { line: 1 },
    });
  });

  it('whose cell is text are not put back', () => {
    const found = ask(LONG.replace('840', 'broken'), out);
    expect(found.whatIf.rows.filter(({ id }) => id === 'separate-t').map(({ data }) => data)).toEqual([
      'without left-out',
    ]);
  });
});

describe('values below a limit', () => {
  const LEACH = 'g,x\na,<0.02\na,0.05\na,0.07\nb,0.03\nb,<0.02\nb,0.09';
  const asked = { measured: ['x'], label: 'g' };

  it('are refused until it is said what they stand for', () => {
    const found = refusal(() => ask(LEACH, asked));
    expect(found).toMatchObject({
      code: 'censored-unanswered',
      facts: { count: 2 },
      where: { line: 2, field: 1 },
    });
  });

  it('are 0, half the limit or the limit, each beside the other, all counted', () => {
    const found = ask(LEACH, { ...asked, wish: { below: 'half' } });
    expect(found.groups[0]?.sample?.sorted()[0]).toBe(0.01);
    expect(found.chosen.data).toBe('below as half');
    const rows = found.whatIf.rows.filter(({ id }) => id === 'separate-t');
    expect(rows.map(({ data, counted }) => [data, counted])).toEqual([
      ['below as half', true],
      ['below as zero', true],
      ['below as limit', true],
    ]);
    expect(ask(LEACH, { ...asked, wish: { below: 'limit' } }).groups[0]?.sample?.sorted()[0]).toBe(0.02);
    expect(ask(LEACH, { ...asked, wish: { below: 'zero' } }).groups[0]?.sample?.sorted()[0]).toBe(0);
  });
});

describe('what cannot be computed', () => {
  it('refuses text in a used cell with its place and what stands there', () => {
    const found = refusal(() => ask(LONG.replace('846', 'soft').replace('809', 'n. d.'), long));
    expect(found).toMatchObject({
      code: 'text-in-measured',
      facts: { texts: ['soft', 'n. d.'], count: 2 },
      where: { file: 0, line: 4, field: 1 },
    });
  });

  it('counts text by the cell where a row has one for each group, and names what stands at the place first', () => {
    const found = refusal(() =>
      ask('after,before\n1,gone\nsoft,lost\n3,4\n5,6', { columns: ['after', 'before'] }),
    );
    expect(found).toMatchObject({
      code: 'text-in-measured',
      facts: { texts: ['gone', 'soft', 'lost'], count: 3 },
      where: { line: 2, field: 1 },
    });
  });

  it('does not mind text in rows that are not compared', () => {
    expect(
      ask(`${LONG}other,soft,9,a`, { ...long, test: 'slow', reference: 'standard' }).chosen.result?.estimate,
    ).toBe(28);
  });

  it('refuses a group of one value, telling a label that stands once from values that are missing', () => {
    const once = refusal(() => ask('g,x\na,1\na,2\nb,3', { measured: ['x'], label: 'g' }));
    expect(once).toMatchObject({
      code: 'label-single-value',
      facts: { label: 'b', n: 1, lines: [4] },
      where: { line: 4 },
    });
    const short = refusal(() => ask('g,x\na,1\na,2\nb,3\nb,NA', { measured: ['x'], label: 'g' }));
    expect(short).toMatchObject({ code: 'values-too-few', facts: { label: 'b', n: 1, missing: 1 } });
    const none = refusal(() => ask('g,x\na,1\na,2\nb,\nb,NA', { measured: ['x'], label: 'g' }));
    expect(none).toMatchObject({ code: 'values-too-few', facts: { label: 'b', n: 0, missing: 2 } });
  });

  it('takes a group of one value with known standard deviations: the others say why they do not apply', () => {
    const found = ask('g,x\na,1\na,2\nb,3', {
      measured: ['x'],
      label: 'g',
      variance: 'known',
      sigma: [1, 1],
    });
    expect(found.chosen).toMatchObject({ id: 'known-sigma-z', applies: true, counted: true });
    expect(found.groups[1]?.sd).toBeNaN();
    for (const id of ['separate-t', 'pooled-t', 'conservative-t', 'large-n-z']) {
      expect(rowOf(found, id)).toMatchObject({
        applies: false,
        reason: { code: 'one-value', facts: { label: 'b' } },
      });
    }
  });

  it('refuses values that are all equal', () => {
    const found = refusal(() => ask('g,x\na,2\na,2\nb,2\nb,2.0', { measured: ['x'], label: 'g' }));
    expect(found).toMatchObject({ code: 'values-all-equal', facts: { value: 2, n: 4 } });
  });

  it('shows two constant groups with the exact difference and the recorded step, without a p', () => {
    const found = ask('g,x\na,2.4\na,2.4\nb,2.1\nb,2.1', { measured: ['x'], label: 'g' });
    expect(found.chosen).toMatchObject({
      applies: false,
      result: null,
      reason: { code: 'zero-spread', facts: { difference: 0.3, resolution: 0.1 } },
    });
  });

  it('warns of one constant group, and does not count the pooled row', () => {
    const found = ask('g,x\na,2\na,2\na,2\nb,2.1\nb,2.4', { measured: ['x'], label: 'g' });
    expect(found.chosen.result?.df).toBe(1);
    expect(rowOf(found, 'pooled-t')).toMatchObject({
      counted: false,
      reason: { code: 'one-constant-group' },
    });
    expect(found.findings[0]).toMatchObject({ id: 'constant', level: 'warn', group: 'a' });
  });

  it('refuses what is not measured in numbers, and two measured columns', () => {
    expect(refusal(() => ask(LONG, { measured: ['tile'], label: 'schedule' })).code).toBe('text-in-measured');
    expect(refusal(() => ask(LONG, { measured: ['firing', 'tile'], label: 'schedule' })).code).toBe(
      'columns-too-many',
    );
  });
});

describe('summaries', () => {
  const rows = 'group,n,mean,sd\nslow,4,843.75,5.909032633745278\nstandard,4,815.75,5.123475382979799';

  it('give the numbers that the values give, with a note that the data were not seen', () => {
    const raw = ask(LONG, long).chosen.result!;
    const found = ask(rows, { summary: true });
    expect(found.chosen.result?.statistic).toBeCloseTo(raw.statistic!, 12);
    expect(found.chosen.result?.p).toBeCloseTo(raw.p!, 12);
    expect(found.notes).toContainEqual({ code: 'summary-only', facts: {} });
    expect(found.groups[0]).toMatchObject({ median: null, min: null });
  });

  it('can be typed', () => {
    const found = ask(null, {
      files: [],
      typed: [
        { label: 'a', n: 20, mean: 5, sd: 1 },
        { label: 'b', n: 20, mean: 4, sd: 1 },
      ],
    });
    expect(found.chosen.result?.statistic).toBeCloseTo(Math.sqrt(10), 12);
    expect(found.evidence.map(({ id }) => id)).toEqual(['variance-ratio']);
  });

  it('can be counts', () => {
    const found = ask('batch,x,n\nnew,56,70\nold,48,80', { summary: true });
    expect(found).toMatchObject({ design: 'counts', chosen: { id: 'miettinen-nurminen' } });
    // source: Newcombe 1998, Statistics in Medicine 17:873–890, Table II (a), method 6
    expect(found.chosen.result?.lower?.toFixed(4)).toBe('0.0528');
  });

  it.each([
    ['a repeated group', `${rows}\nslow,3,1,1`, 'repeated'],
    ['a broken n', rows.replace('slow,4', 'slow,4.5'), 'n'],
    ['an SD below 0', rows.replace('5.909', '-5.909'), 'sd'],
    ['no mean', rows.replace('843.75', ''), 'mean'],
  ])('refuse %s', (_, text, what) => {
    expect(refusal(() => ask(text, { summary: true }))).toMatchObject({
      code: 'summary-invalid',
      facts: { what },
    });
  });

  it('refuse more successes than outcomes', () => {
    expect(refusal(() => ask('batch,x,n\nnew,71,70\nold,48,80', { summary: true }))).toMatchObject({
      code: 'summary-invalid',
      facts: { label: 'new', what: 'x' },
    });
  });

  it('need their columns', () => {
    expect(refusal(() => ask('g,n,mean\na,1,2', { summary: true }))).toMatchObject({
      code: 'column-needed',
      facts: { needed: 'sd' },
    });
  });
});

describe('shares', () => {
  const OUTCOMES =
    'batch,crazed,tile\nnew,yes,1\nnew,no,2\nnew,yes,3\nold,no,4\nold,no,5\nold,NA,6\nold,yes,7';
  const asked = { measured: ['crazed'], label: 'batch', measure: 'proportion' } as const;

  it('count a plain success by itself, missing words aside, and say which it is', () => {
    const found = ask(OUTCOMES, asked);
    expect(found.groups.map(({ count, missing }) => [count?.x, count?.n, missing])).toEqual([
      [2, 3, 0],
      [1, 3, 1],
    ]);
    expect(found.settings.options).toEqual({ success: 'yes' });
    expect(found.notes).toContainEqual({ code: 'success-is', facts: { success: 'yes' } });
    expect(found.groups[0]?.mean).toBeCloseTo(2 / 3, 15);
    expect(found.whatIf.rows.map(({ id }) => id)).toEqual(['proportion-z', 'newcombe', 'miettinen-nurminen']);
    expect(rowOf(found, 'proportion-z')).toMatchObject({ counted: false, reason: { code: 'few-expected' } });
  });

  it('follow from a named success', () => {
    const found = ask(OUTCOMES, { measured: ['crazed'], label: 'batch', success: 'no' });
    expect(found.groups.map(({ count }) => count?.x)).toEqual([1, 2]);
  });

  it('ask for the success where it is not plain, and refuse more than two outcomes unless one is named', () => {
    const text = OUTCOMES.replaceAll('yes', 'fine').replaceAll('no,', 'bad,');
    expect(refusal(() => ask(text, asked))).toMatchObject({
      code: 'success-needed',
      facts: { outcomes: ['fine', 'bad'] },
    });
    const three = text.replace('bad', 'worse');
    expect(refusal(() => ask(three, asked)).code).toBe('outcomes-too-many');
    const found = ask(three, { ...asked, success: 'fine' });
    expect(found.notes).toContainEqual({
      code: 'outcomes-joined',
      facts: { success: 'fine', outcomes: ['worse', 'bad'] },
    });
  });

  it('take a success that never occurs, with a note', () => {
    const found = ask(OUTCOMES, { ...asked, success: 'Yes' });
    expect(found.groups.map(({ count }) => count?.x)).toEqual([0, 0]);
    expect(found.notes).toContainEqual({
      code: 'success-never',
      facts: { success: 'Yes', outcomes: ['yes', 'no'] },
    });
  });

  it('count each unit once, and refuse a unit whose readings disagree, which means can compare', () => {
    const units = 'batch,crazed,firing\nnew,1,1\nnew,1,1\nnew,0,2\nold,0,3\nold,0,4';
    const found = ask(units, { ...asked, per: ['firing'] });
    expect(found.groups.map(({ count, readings }) => [count?.x, count?.n, readings])).toEqual([
      [1, 2, 3],
      [0, 2, 2],
    ]);
    const mixed = `${units}\nold,1,4\nold,1,5`;
    expect(refusal(() => ask(mixed, { ...asked, per: ['firing'] }))).toMatchObject({
      code: 'units-disagree',
      facts: { column: 'firing', unit: '4' },
      where: { line: 7, field: 1 },
    });
    const means = ask(mixed, { ...asked, measure: 'mean', success: '1', per: ['firing'] });
    expect(means.chosen.result?.estimate).toBe(0);
  });

  it('are decided at one level by a score and by an interval: not lower by 3 points, 60 of 100 against 75', () => {
    // Both two-sided intervals end at −2.0 points, past the margin, though the one-sided p of the score is 0.965.
    const found = ask(null, {
      files: [],
      typed: [
        { label: 'new', x: 60, n: 100 },
        { label: 'old', x: 75, n: 100 },
      ],
      question: 'not-lower',
      margin: [-0.03, 0.03],
    });
    expect(found.whatIf.rows.map(({ id, decision }) => [id, decision])).toEqual([
      ['proportion-z', null],
      ['newcombe', 'not shown'],
      ['miettinen-nurminen', 'not shown'],
    ]);
    expect(found.whatIf.depends).toBe('no');
  });

  it('of pairs are refused: no method here is right for them', () => {
    expect(refusal(() => ask(OUTCOMES, { ...asked, pair: 'tile' })).code).toBe('method-not-for-this');
  });
});
