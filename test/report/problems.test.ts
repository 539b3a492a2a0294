import { describe, expect, it } from 'vitest';
import { Refusal } from '../../src/core/model/problem';
import { english } from './fixtures/english';
import { problemWithFlag, problemWords } from '../../src/report/problem';
import { askingProblems } from '../../src/report/problems/asking';
import { computingProblems } from '../../src/report/problems/computing';
import { namingProblems } from '../../src/report/problems/naming';
import { readingProblems } from '../../src/report/problems/reading';
import { toldBy } from '../../src/report/problems/told';

const words = { ...readingProblems, ...namingProblems, ...askingProblems, ...computingProblems };

describe('a problem says what happened and what to do', () => {
  it.each(Object.entries(words))('%s, without naming a flag where there is no command line', (_, say) => {
    for (const needed of ['measured', 'label', 'pair']) {
      const { message, fix } = say(toldBy({ needed, open: [], delimiters: [] }, english));
      expect(message).toMatch(/^[^-]/);
      expect(`${message} ${fix}`).not.toMatch(/--[a-z]/);
      expect(fix).toMatch(/\.$|\?/);
    }
  });

  it('and on the command line also what to type', () => {
    const refusal = new Refusal('layouts-equal', { delimiters: [',', ';'] });
    expect(problemWords(refusal, english).fix).toBe('Name the delimiter.');
    expect(problemWithFlag(refusal, english).fix).toBe('Name the delimiter (--delimiter C).');
  });

  it('and of a measure without a method, that there is none', () => {
    const refusal = new Refusal('method-not-for-this', { measure: 'rank' });
    expect(problemWords(refusal, english).message).toBe('There is no method for the measure rank');
  });
});
