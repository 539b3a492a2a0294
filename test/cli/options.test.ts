import { describe, expect, it } from 'vitest';
import { compareFlags } from '../../src/cli/compareFlags';
import { recheckFlags } from '../../src/cli/flags';
import { nearest } from '../../src/cli/nearest';
import { parseOptions } from '../../src/cli/options';
import { UsageError } from '../../src/cli/usageError';

const refused = (argv: readonly string[]): string => {
  try {
    parseOptions(argv, 'compare', compareFlags);
  } catch (error) {
    if (error instanceof UsageError) return `${error.message}. ${error.fix}`;
    throw error;
  }
  return 'accepted';
};

describe('flags', () => {
  it('are read with a space or with =, in any place', () => {
    const options = parseOptions(['--of', 'hardness', 'a.csv', '--by=schedule'], 'compare', compareFlags);
    expect([options.words, options.text('of'), options.text('by')]).toEqual([
      ['a.csv'],
      'hardness',
      'schedule',
    ]);
  });

  it('take negative numbers without =', () => {
    const options = parseOptions(['--against', '-5', '--margin', '-2,3'], 'compare', compareFlags);
    expect([options.text('against'), options.text('margin')]).toEqual(['-5', '-2,3']);
  });

  it('that are unknown are named together with the nearest one', () => {
    expect(refused(['--confidance', '0.9'])).toBe(
      'There is no flag --confidance. Did you mean --confidence?',
    );
    expect(refused(['--referense=x'])).toContain('Did you mean --reference?');
    expect(refused(['--zzzzzz'])).toBe('There is no flag --zzzzzz. See weighbeam compare --help.');
    expect(refused(['-q'])).toContain('There is no flag -q');
  });

  it('without their value say which value they take', () => {
    expect(refused(['--of'])).toContain('--of needs a value. Write --of COL');
    expect(refused(['--of', '--by', 'x'])).toContain('--of needs a value');
    expect(refused(['--only-chosen=yes'])).toContain('--only-chosen takes no value');
  });

  it('with a word that is not among their choices name the choices', () => {
    expect(refused(['--variance', 'equal'])).toContain('It takes separate, pooled, known.');
    expect(refused(['--question', 'diffres'])).toContain('Did you mean differs?');
    expect(refused(['--format', 'pdf'])).toContain('text, json, block, markdown, html');
  });

  it('that count once are refused when they stand twice, so that none is silently dropped', () => {
    expect(refused(['--test', 'a', '--test', 'b'])).toContain('--test stands twice (a, b)');
    expect(refused(['--leave-out', '2:x', '--leave-out', '3:y'])).toBe('accepted');
  });

  it('bear one name each', () => {
    for (const flags of [compareFlags, recheckFlags]) {
      const names = flags.map(({ name }) => name);
      expect(new Set(names).size).toBe(names.length);
    }
  });
});

describe('the nearest word', () => {
  it('is the one with fewest edits, or the one begun, or none', () => {
    expect(nearest('recehck', ['compare', 'recheck'])).toBe('recheck');
    expect(nearest('conf', ['columns', 'confidence'])).toBe('confidence');
    expect(nearest('banana', ['compare', 'recheck'])).toBeNull();
  });
});
