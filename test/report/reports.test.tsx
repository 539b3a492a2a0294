import { mkdir, readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import fc from 'fast-check';
import { renderToString } from 'preact-render-to-string';
import { describe, expect, it } from 'vitest';
import { figureSvg } from '../../src/report/figure/figureSvg';
import { htmlPage } from '../../src/report/html';
import { markdownReport } from '../../src/report/markdown';
import { Panel } from '../../src/report/panel/panel';
import { textReport } from '../../src/report/text';
import type { View } from '../../src/report/view';
import { findBlocks } from '../../src/settings/findBlocks';
import {
  batches,
  blockText,
  compared,
  crazed,
  firings,
  leaching,
  mills,
  shown,
  uptake,
} from './fixtures/cases';

const cases = { firings, crazed, uptake, mills, batches };
const surfaces = {
  txt: textReport,
  md: markdownReport,
  html: htmlPage,
  svg: figureSvg,
  panel: (view: View) => renderToString(<Panel view={view} send={() => undefined} />),
};

/** The stored text; WEIGHBEAM_UPDATE_GOLDEN=1 writes it anew, to be read before it is committed. */
async function golden(name: string, now: string): Promise<string> {
  const file = path.join(import.meta.dirname, 'golden', name);
  if (process.env['WEIGHBEAM_UPDATE_GOLDEN'] === '1') {
    await mkdir(path.dirname(file), { recursive: true });
    await writeFile(file, now);
  }
  return readFile(file, 'utf8');
}

/** Words that no sentence may hold, and numbers that were never numbers. */
const NEVER = /no difference|p = 0\.000|significant|undefined|\bNaN\b|Infinity|\[object/iu;

describe('a comparison', () => {
  it.each(Object.keys(cases) as (keyof typeof cases)[])(
    'of %s reads as it was agreed to read',
    async name => {
      const now = textReport(shown(cases[name]()));
      expect(now).toBe(await golden(`${name}.txt`, now));
    },
  );

  it.each(Object.keys(surfaces) as (keyof typeof surfaces)[])(
    'as %s says nothing that the data cannot say',
    surface => {
      for (const make of Object.values(cases)) expect(surfaces[surface](shown(make()))).not.toMatch(NEVER);
    },
  );

  it('says the same answer on every surface', () => {
    const view = shown(firings());
    for (const surface of ['txt', 'md', 'html', 'panel'] as const) {
      expect(surfaces[surface](view)).toContain(
        'hardness is higher in slow cool than in standard by 22.6 MPa',
      );
      expect(surfaces[surface](view)).toContain('8.6 to 36.6');
    }
  });

  it('never lets a label become markup', () => {
    const label = '<img src=x onerror=alert(1)>';
    const view = shown(
      compared(null, {
        typed: [
          { label, n: 18, mean: 23.41, sd: 1.12 },
          { label: '`*|# old', n: 15, mean: 23.96, sd: 1.94 },
        ],
        test: label,
        reference: '`*|# old',
      }),
    );
    for (const surface of ['html', 'svg', 'panel'] as const)
      expect(surfaces[surface](view)).not.toContain('<img');
    expect(markdownReport(view)).not.toMatch(/(?<!\\)<img/u);
  });

  it('gives a caution in full where its words suggest that a result could hurt someone', () => {
    expect(shown(firings()).answer.cautions).toEqual([]);
    expect(shown(leaching()).answer.cautions.length).toBeGreaterThan(0);
  });

  it('says of any two groups only what their numbers allow', () => {
    const number = fc.double({ min: -1e6, max: 1e6, noNaN: true });
    const group = fc.record({
      n: fc.integer({ min: 2, max: 500 }),
      mean: number,
      sd: fc.double({ min: 1e-6, max: 1e5, noNaN: true }),
    });
    fc.assert(
      fc.property(
        group,
        group,
        fc.constantFrom('differs' as const, 'higher' as const, 'lower' as const),
        (a, b, question) => {
          const typed = [
            { ...a, label: 'new' },
            { ...b, label: 'old' },
          ];
          const view = shown(compared(null, { typed, test: 'new', reference: 'old', question }));
          expect(textReport(view)).not.toMatch(NEVER);
          for (const line of textReport(view).split('\n')) expect(line.length).toBeLessThanOrEqual(80);
        },
      ),
      {
        numRuns: 60,
        examples: [[{ n: 2, mean: 1e-17, sd: 1e-6 }, { n: 2, mean: 5e-324, sd: 1e-6 }, 'differs']],
      },
    );
  });
});

describe('an exported entry', () => {
  it('prints a mean and a ratio of spreads that are small beside the other group with the digits they have', () => {
    const typed = [
      { label: 'tap', n: 12, mean: 4.25, sd: 0.21 },
      { label: 'effluent', n: 12, mean: 81_000, sd: 9_600 },
    ];
    const text = textReport(shown(compared(null, { typed })));
    expect(text).toMatch(/^mean +4\.25 +81000 /mu);
    expect(text).toMatch(/^SD .* 0\.000022 times \(0\.000012 to 0\.000041\)/mu);
  });

  it('ends with a settings block that can be found again', () => {
    expect(findBlocks(markdownReport(shown(firings())))[0]?.text).toBe(blockText);
    expect(htmlPage(shown(firings()))).toContain('# end of settings block');
  });

  it('as a page brings its own look and asks nothing of a network', () => {
    const page = htmlPage(shown(firings()));
    expect(page).toMatch(/^<!DOCTYPE html>/u);
    expect(page.replaceAll('http://www.w3.org/2000/svg', '')).not.toMatch(/https?:|<script|<link/u);
  });
});

describe('the panel', () => {
  it('carries no style attribute and no script, which its security policy refuses', () => {
    for (const make of Object.values(cases))
      expect(surfaces.panel(shown(make()))).not.toMatch(/ style=|<script/u);
  });
});
