import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { evidenceById, evidenceChecks } from '../../../src/core/evidence/index';
import { methodById, methods } from '../../../src/core/methods/index';
import type { Finding } from '../../../src/core/model/comparison';
import type { MethodDescriptor } from '../../../src/core/model/methods';
import type { Reason, Say } from '../../../src/core/model/say';

const say: Say = (english, ...args) =>
  english.replace(/\{(\d+)\}/g, (_, index) => String(args[Number(index)]));
const all: readonly MethodDescriptor[] = methods;

/** Every reason that a method or the comparison gives, with the facts it comes with. */
const REASONS: readonly Reason[] = [
  { code: 'one-value', facts: { label: 'slow', n: 1 } },
  { code: 'zero-spread', facts: { difference: 0.3, resolution: 0.1 } },
  { code: 'zero-spread', facts: { difference: 0.3, resolution: null } },
  { code: 'no-pairs', facts: {} },
  { code: 'pairs-given', facts: {} },
  { code: 'not-this-design', facts: {} },
  { code: 'question-not-for-method', facts: {} },
  { code: 'other-unit', facts: {} },
  { code: 'ruled-out', facts: {} },
  { code: 'too-much-work', facts: {} },
  { code: 'variant-refused', facts: { problem: 'pairs-none' } },
];

const OWN_REASONS: Readonly<Record<string, readonly Reason[]>> = {
  'pooled-t': [{ code: 'one-constant-group', facts: { label: 'slow' } }],
  'conservative-t': [{ code: 'bound', facts: {} }],
  'large-n-z': [{ code: 'too-few-for-normal', facts: { label: 'slow', n: 12 } }],
  'known-sigma-z': [{ code: 'sigma-absent', facts: {} }],
  'paired-t': [
    { code: 'one-pair', facts: { n: 1 } },
    { code: 'equal-differences', facts: { difference: 2 } },
  ],
  'proportion-z': [
    { code: 'few-expected', facts: { expected: 3.5, least: 5 } },
    { code: 'no-variation', facts: {} },
    { code: 'against-not-zero', facts: {} },
    { code: 'no-outcomes', facts: { label: 'slow' } },
  ],
  newcombe: [{ code: 'no-outcomes', facts: { label: 'slow' } }],
  'miettinen-nurminen': [{ code: 'no-outcomes', facts: { label: 'slow' } }],
  'one-way': [
    { code: 'one-group', facts: {} },
    { code: 'against-not-zero', facts: {} },
    { code: 'no-spread-in-any', facts: {} },
    { code: 'one-constant-group', facts: { label: 'slow' } },
  ],
  'welch-one-way': [
    { code: 'one-group', facts: {} },
    { code: 'against-not-zero', facts: {} },
    { code: 'known-exactly', facts: { label: 'slow' } },
  ],
  'kruskal-wallis': [
    { code: 'one-group', facts: {} },
    { code: 'against-not-zero', facts: {} },
    { code: 'no-values', facts: {} },
    { code: 'all-equal', facts: {} },
    { code: 'few-for-chi-square', facts: { label: 'slow', n: 3 } },
    { code: 'cannot-reach', facts: { ways: 90, least: 0.067 } },
  ],
  permutation: [
    { code: 'no-values', facts: {} },
    { code: 'too-many-ways', facts: { n: 12, m: 12 } },
    { code: 'too-many-digits', facts: {} },
    { code: 'cannot-reach', facts: { ways: 20, least: 0.1 } },
  ],
  'sign-flip': [
    { code: 'one-pair', facts: { n: 1 } },
    { code: 'too-many-ways', facts: { n: 21 } },
    { code: 'too-many-digits', facts: {} },
    { code: 'cannot-reach', facts: { ways: 32, least: 0.0625 } },
  ],
};

describe('the registry of methods', () => {
  it('names each method once, in kebab case', () => {
    const ids = all.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const id of ids) expect(id).toMatch(/^[a-z]+(-[a-z]+)*$/);
    expect(methodById('separate-t')).toBe(methods[0]);
    expect(methodById('none of these')).toBeUndefined();
  });

  it.each(all.map(method => [method.id, method] as const))(
    '%s says what it is, what it claims, when not to use it, and where it comes from',
    (_, method) => {
      const texts = [method.title(say), method.assumes(say), method.explains(say), method.notWhen(say)];
      for (const text of texts) expect(text.length).toBeGreaterThan(4);
      expect(new Set(texts).size).toBe(4);
      expect(method.references.length).toBeGreaterThan(0);
      expect(method.questions.length).toBeGreaterThan(0);
      expect(method.version).toBeGreaterThanOrEqual(1);
      expect(method.options.every(option => option.says(say).length > 4)).toBe(true);
    },
  );

  it.each(all.map(method => [method.id, method] as const))(
    '%s has a sentence for every reason it can give',
    (id, method) => {
      for (const reason of [...REASONS, ...(OWN_REASONS[id] ?? [])]) {
        const sentence = method.why(reason, say);
        expect(sentence, reason.code).not.toBe(reason.code);
        expect(sentence).not.toMatch(/\{\d\}|undefined|NaN/);
      }
    },
  );

  it('is held to every reason that stands in the source of a method', () => {
    const folder = path.join(import.meta.dirname, '..', '..', '..', 'src', 'core', 'methods');
    const sources = readdirSync(folder)
      .filter(name => name.endsWith('.ts'))
      .map(name => readFileSync(path.join(folder, name), 'utf8'));
    const given = sources.flatMap(source =>
      [...source.matchAll(/code: '([a-z-]+)', facts/g)].map(([, code]) => code),
    );
    const held = new Set([...REASONS, ...Object.values(OWN_REASONS).flat()].map(({ code }) => code));
    expect(given.length).toBeGreaterThan(10);
    expect(given.filter(code => code === undefined || !held.has(code))).toEqual([]);
  });

  it('finds a method in any list given', () => {
    expect(methodById('paired-t', all.slice(0, 2))).toBeUndefined();
  });
});

describe('the registry of checks', () => {
  const finding = (facts: Finding['facts'], group: string | null = null): Finding => ({
    id: '',
    level: 'note',
    facts,
    group,
    count: 1,
    cells: [],
    answers: [],
  });

  it.each([
    ['shared-unit', finding({ column: 'firing', shared: 2, ids: ['1', '2'] }), 'firing'],
    ['constant', finding({ what: 'constant', value: 4, n: 3 }, 'slow'), 'slow is 4'],
    ['constant', finding({ what: 'two-values', n: 2 }, 'slow'), 'factor of about 32'],
    [
      'variance-ratio',
      finding({ test: 'slow', reference: 'standard', sdRatio: 1.5, interval: [0.8, 2.7] }),
      '1.5 times',
    ],
    ['brown-forsythe', finding({ smallest: 5 }), 'With 5 values'],
    ['brown-forsythe', finding({ smallest: 30 }), 'not evidence for them'],
  ])('%s says what it saw', (id, seen, words) => {
    expect(evidenceById(id)!.say(seen, say)).toContain(words);
  });

  it('names each check once and titles it', () => {
    expect(new Set(evidenceChecks.map(({ id }) => id)).size).toBe(evidenceChecks.length);
    for (const check of evidenceChecks) expect(check.title(say).length).toBeGreaterThan(4);
    expect(evidenceById('none of these')).toBeUndefined();
  });
});
