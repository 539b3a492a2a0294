import { describe, expect, it } from 'vitest';
import type { LabelColumn } from '../../../src/core/model/cells';
import type { Request } from '../../../src/compare/request';
import { joinAnswers, type Step, type StepId } from '../../../src/protocol/asking';
import type { AskContext, ColumnFacts } from '../../../src/worker/asking/askContext';
import { nextStep, onlyStep } from '../../../src/worker/asking/nextStep';
import { sayFrom } from '../../../src/worker/sayFrom';

type Cells = Readonly<Record<string, readonly string[]>>;

function facts(cells: Cells): readonly ColumnFacts[] {
  return Object.entries(cells).map(([name, texts], field) => {
    const filled = texts.filter(text => text !== '');
    const labels = [...new Set(filled)].map(label => ({
      label,
      count: filled.filter(text => text === label).length,
    }));
    const numbers = filled.map(Number);
    const isNumber = numbers.every(value => !Number.isNaN(value));
    return {
      name,
      unit: null,
      field,
      kind: filled.length === 0 ? 'empty' : isNumber ? 'number' : 'label',
      values: isNumber ? filled.length : 0,
      missing: texts.length - filled.length,
      texts: isNumber ? 0 : filled.length,
      distinct: labels.length,
      labels,
      min: isNumber ? Math.min(...numbers) : null,
      max: isNumber ? Math.max(...numbers) : null,
      nearlyUnique: labels.length > 0.9 * filled.length,
    };
  });
}

function column(name: string, texts: readonly string[]): LabelColumn {
  const levels = ['', ...new Set(texts.filter(text => text !== ''))];
  return { kind: 'label', name, levels, codes: Int32Array.from(texts, text => levels.indexOf(text)) };
}

function about(cells: Cells, more: Partial<AskContext> = {}): AskContext {
  return {
    t: sayFrom(null),
    files: ['firings.csv'],
    rows: Object.values(cells)[0]?.length ?? 0,
    columns: facts(cells),
    request: { files: ['firings.csv'], wish: {} },
    picked: null,
    remembered: null,
    answered: [],
    labelsOf: name => (cells[name] === undefined ? null : column(name, cells[name])),
    ...more,
  };
}

/** Takes an answer at every question, the likely one unless told otherwise. */
function goThrough(
  context: AskContext,
  pick: Partial<Record<StepId, string>> = {},
): { asked: readonly Step[]; request: Partial<Request> } {
  const asked: Step[] = [];
  let now = context;
  for (;;) {
    const { step, request } = nextStep(now);
    if (step === null) return { asked, request };
    asked.push(step);
    now = {
      ...now,
      request: { ...request, ...answerTo(step, pick[step.id]) },
      answered: [...now.answered, step.id],
    };
  }
}

function answerTo(step: Step, label?: string): Partial<Request> {
  switch (step.kind) {
    case 'one': {
      const item =
        label === undefined ? step.items[step.likely] : step.items.find(each => each.label === label);
      if (item === undefined)
        throw new Error(`no ${String(label)} among ${step.items.map(each => each.label).join()}`);
      return item.adds;
    }
    case 'many':
      return joinAnswers(step.likely.map(index => step.items[index]?.adds ?? {}));
    case 'number':
      return { margin: [-Number(label), Number(label)] };
  }
}

const repeat = (texts: readonly string[], times: number): string[] =>
  Array.from({ length: times }, () => texts).flat();
const each = (texts: readonly string[], times: number): string[] =>
  texts.flatMap(text => repeat([text], times));

const firings: Cells = {
  firing: each(['1', '2', '3', '4', '5', '6'], 3),
  schedule: repeat([...each(['slow cool'], 3), ...each(['standard'], 3)], 3),
  tile: repeat(['1', '2', '3'], 6),
  hardness: Array.from({ length: 18 }, (_, row) => String(800 + 0.5 * row)),
};

describe('the questions before a comparison', () => {
  it('lead from a file of firings to a whole request by its likely answers', () => {
    const { asked, request } = goThrough(about(firings));
    expect(asked.map(step => step.id)).toEqual([
      'measured',
      'label',
      'reference',
      'units',
      'question',
      'variance',
    ]);
    expect(request).toEqual({
      files: ['firings.csv'],
      wish: {},
      measured: ['hardness'],
      label: 'schedule',
      reference: 'standard',
      test: 'slow cool',
      per: ['firing'],
      question: 'differs',
      method: 'separate-t',
    });
  });

  it('are numbered, and their count holds when the likely answers are taken', () => {
    const { asked } = goThrough(about(firings));
    expect(asked.map(step => [step.number, step.of])).toEqual(
      asked.map((_, index) => [index + 1, asked.length]),
    );
  });

  it('are not put where the answer is plain: one column of numbers, one of labels, no ids', () => {
    const { asked, request } = goThrough(
      about({
        kiln: repeat(['east', 'west'], 5),
        density: ['2.31', '2.27', '2.35', '2.30', '2.29', '2.24', '2.34', '2.28', '2.33', '2.26'],
      }),
      {},
    );
    expect(asked.map(step => step.id)).toEqual(['reference', 'question', 'variance']);
    expect(request).toMatchObject({ measured: ['density'], label: 'kiln' });
  });

  it('are not put when the request says it already', () => {
    const request = {
      measured: ['hardness'],
      label: 'schedule',
      reference: 'standard',
      per: 'none',
      question: 'lower',
    } as const;
    const { asked } = goThrough(about(firings, { request }));
    expect(asked.map(step => step.id)).toEqual(['test', 'variance'].filter(id => id !== 'test'));
  });

  it('say in one line what each answer about units and variances claims', () => {
    const { asked } = goThrough(about(firings));
    for (const step of asked.filter(({ id }) => id === 'units' || id === 'variance')) {
      if (step.kind !== 'one') throw new Error('one answer is picked');
      for (const item of step.items) expect(item.detail, item.label).not.toBe('');
    }
  });

  it('take the answers given last time as the likely ones', () => {
    const remembered = { measured: ['tile'], per: 'none', question: 'higher', method: 'pooled-t' } as const;
    const { request } = goThrough(about(firings, { remembered }));
    expect(request).toMatchObject(remembered);
  });

  it('name the columns that were selected first, and no other where one of them will do', () => {
    const { asked, request } = goThrough(about(firings, { picked: ['schedule', 'tile'] }));
    expect(asked[0]?.id).toBe('label');
    expect(request).toMatchObject({ measured: ['tile'], label: 'schedule' });
  });
});

describe('the question about groups', () => {
  it('takes the label that sounds like one as the reference', () => {
    const cells = { dose: repeat(['control', 'high'], 4), yield: ['1.5', '2', '3', '4', '5', '6', '7', '8'] };
    expect(goThrough(about(cells)).request).toMatchObject({ reference: 'control', test: 'high' });
  });

  it('asks for the test group too where there are more than two', () => {
    const cells = {
      glaze: repeat(['a', 'b', 'c'], 4),
      gloss: Array.from({ length: 12 }, (_, row) => `${row}.5`),
    };
    const { asked, request } = goThrough(about(cells), { reference: 'c', test: 'b' });
    expect(asked.map(step => step.id)).toEqual(['reference', 'test', 'question', 'variance']);
    expect(request).toMatchObject({ reference: 'c', test: 'b' });
  });

  it('asks whether labels that differ only in capitals or spaces mean the same', () => {
    const schedule = [...(firings['schedule'] ?? [])];
    schedule[2] = ' Slow cool';
    const { asked, request } = goThrough(about({ ...firings, schedule }));
    expect(asked.map(step => step.id)).toContain('same');
    expect(request.same).toEqual([[' Slow cool', 'slow cool']]);
    expect(request).toMatchObject({ test: 'slow cool', reference: 'standard' });
  });

  it('takes two files as one group each, by their names', () => {
    const files = ['east.csv', 'west.csv'];
    const { request } = goThrough(about({ density: ['2.3', '2.4', '2.2'] }, { files }));
    expect(request).toMatchObject({ measured: ['density'], reference: 'west.csv', test: 'east.csv' });
  });

  it('takes one column a group where no column holds labels', () => {
    const wide = { east: ['2.31', '2.35', '2.29', '2.34'], west: ['2.27', '2.30', '2.24', '2.28'] };
    expect(goThrough(about(wide)).request).toMatchObject({ columns: ['east', 'west'], reference: 'west' });
  });
});

describe('the question about units', () => {
  it('offers pairs where each id occurs once in each group, and then only methods for pairs', () => {
    const cells = {
      tile: repeat(['1', '2', '3', '4', '5'], 2),
      stage: each(['before', 'after'], 5),
      uptake: Array.from({ length: 10 }, (_, row) => `${row}.25`),
    };
    const { request } = goThrough(about(cells), { measured: 'uptake', label: 'stage' });
    expect(request).toMatchObject({ pair: 'tile', method: 'paired-t' });
    expect(request.per).toBeUndefined();
  });

  it('offers pairs where each group has a column of its own and each row an id', () => {
    const wide = {
      tile: ['1', '2', '3', '4'],
      before: ['2.31', '2.35', '2.29', '2.34'],
      after: ['2.27', '2.30', '2.24', '2.28'],
    };
    const { request } = goThrough(about(wide), { measured: 'One column for each group…' });
    expect(request).toMatchObject({ columns: ['before', 'after'], reference: 'before', pair: 'tile' });
  });

  it('rather counts ids that come again in each group once than every row of them', () => {
    const cells = {
      schedule: each(['a', 'b'], 8),
      plot: repeat(each(['1', '2', '3', '4'], 2), 2),
      yield: Array.from({ length: 16 }, (_, row) => `${row}.5`),
    };
    expect(goThrough(about(cells)).request).toMatchObject({ per: ['plot'], pair: 'none' });
  });

  it('offers units within units where readings come again inside them', () => {
    const cells = {
      glaze: each(['a', 'b'], 12),
      batch: each(['1', '2', '3', '4'], 6),
      tile: repeat(each(['1', '2', '3'], 2), 4),
      gloss: Array.from({ length: 24 }, (_, row) => `${row}.5`),
    };
    const { asked } = goThrough(about(cells), { measured: 'gloss', label: 'glaze' });
    const units = asked.find(step => step.id === 'units');
    if (units?.kind !== 'one') throw new Error('units are asked');
    expect(units.items.map(item => item.adds.per)).toContainEqual(['batch', 'tile']);
  });
});

describe('shares', () => {
  const cells = { kiln: each(['east', 'west'], 8), crazed: repeat(['yes', 'no', 'no', 'no'], 4) };

  it('are asked which outcome is counted, the telling one likely', () => {
    const { asked, request } = goThrough(about(cells), { measured: 'crazed', label: 'kiln' });
    expect(asked.map(step => step.id)).toContain('success');
    expect(request).toMatchObject({ measured: ['crazed'], measure: 'proportion', success: 'yes' });
  });
});

describe('one question put again', () => {
  it('has the answer that stands under the cursor', () => {
    const { request } = goThrough(about(firings), { question: 'Is slow cool higher than standard?' });
    const step = onlyStep(about(firings, { request }), 'question');
    if (step?.kind !== 'one') throw new Error('one answer is picked');
    expect(step.items[step.likely]?.adds).toEqual({ question: 'higher' });
    expect([step.number, step.of]).toEqual([1, 1]);
  });

  it('is not put where there is but one answer', () => {
    const { request } = goThrough(about(firings));
    expect(onlyStep(about(firings, { request: { ...request, per: 'none' } }), 'measure')).toBeNull();
  });
});

describe('the question about the label column', () => {
  it('rather takes what was done than what came out, and counts labels spelled alike once', () => {
    const schedule = [...(firings['schedule'] ?? [])];
    schedule[2] = 'Slow cool';
    const cells = { ...firings, crazed: repeat(['no', 'yes', 'no'], 6), schedule };
    expect(goThrough(about(cells)).request).toMatchObject({ label: 'schedule', test: 'slow cool' });
  });
});

describe('the question about the measured column', () => {
  it('rather takes numbers with decimals or a unit than whole numbers that may be ids', () => {
    const cells = {
      schedule: repeat(['slow cool', 'standard'], 6),
      firing: Array.from({ length: 12 }, (_, row) => String(row * row)),
      hardness: Array.from({ length: 12 }, (_, row) => `${800 + row}.5`),
    };
    expect(goThrough(about(cells)).request).toMatchObject({ measured: ['hardness'] });
  });
});

describe('a file of summaries', () => {
  it('is seen by its column names, and only methods that need no values are offered', () => {
    const cells = {
      mill: ['north', 'river'],
      n: ['18', '15'],
      mean: ['23.41', '24.36'],
      sd: ['1.12', '1.94'],
    };
    const { asked, request } = goThrough(about(cells));
    expect(request).toMatchObject({ summary: true, label: 'mill', reference: 'river', test: 'north' });
    expect(asked.map(step => step.id)).toEqual(['measured', 'reference', 'question', 'variance']);
  });
});
