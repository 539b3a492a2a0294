import type { Designs, Group } from '../model/groups';
import { method, type Ask } from '../model/methods';
import type { Reason } from '../model/say';
import { chiSquareUpperTail } from '../numeric/chiSquare';
import { keysOf } from '../numeric/numbers';
import { quotient } from '../numeric/quotient';
import { midRanksOf, type Ranks } from '../numeric/ranks';
import { allottedRanks, waysOfSizes } from './allottedRanks';
import { ofAllGroups, severalQuestions, severalRefused, severalWhy } from './severalGroups';
import { cannotReach, waysWhy } from './ways';

type Several = Designs['several'];

/** All ways of allotting the ranks are gone through up to this size of every group and this many ways. */
const MOST_COUNTED = 5;
const MOST_WAYS = 200_000;
/** From this size of every group on chi-square is relied on (common practice). */
const LEAST_N = 5;

/** The mean ranks of several groups held against each other. */
export const kruskalWallis = method({
  id: 'kruskal-wallis',
  version: 1,
  design: 'several',
  measure: 'rank',
  questions: severalQuestions,
  statistic: 'H',
  needs: 'values',
  counted: true,
  options: [],
  references: [
    'Kruskal & Wallis 1952, Journal of the American Statistical Association 47:583–621',
    'NIST/SEMATECH e-Handbook of Statistical Methods, 7.4.1',
  ],
  work: n => n * Math.log2(n + 1) + MOST_WAYS,
  applies: missing,
  doubts: ({ groups }, ask) => {
    const sizes = groups.map(({ n }) => n);
    const ways = waysOfSizes(sizes);
    if (isCounted(sizes)) return cannotReach(fewest(sizes) / ways, ways, ask);
    const few = groups.find(({ n }) => n < LEAST_N);
    return few === undefined ? null : { code: 'few-for-chi-square', facts: { label: few.label, n: few.n } };
  },
  run: ({ groups }, ask, tick) => {
    const sizes = groups.map(({ n }) => n);
    const ranked = ranksOf(groups);
    const { statistic, tieFactor } = rankSpread(ranked, sizes);
    const df = groups.length - 1;
    const p = chiSquareUpperTail(statistic, df);
    if (!isCounted(sizes)) return ofAllGroups(ask, { statistic, df, p, extra: { tieFactor } });
    const { ways, atLeast } = allottedRanks(ranked.ranks, sizes, tick);
    return ofAllGroups(ask, {
      statistic,
      df: null,
      p: atLeast / ways,
      extra: { tieFactor, ways, chiSquareDf: df, chiSquareP: p },
    });
  },
  title: t => t('one-way ranks'),
  assumes: t => t('the groups differ in where they lie, not in shape'),
  explains: t =>
    t(
      'All values are ranked together and the mean ranks of the groups compared; ties share their mean rank and are allowed for. H is held against chi-square on groups − 1 degrees of freedom; with at most {0} values in every group and at most {1} ways of allotting the ranks, against all of them.',
      MOST_COUNTED,
      MOST_WAYS,
    ),
  notWhen: t =>
    t(
      'The groups scatter differently: it then reacts to the spread as well. It says nothing of the size of a difference in units of the column.',
    ),
  why: (reason, t) => {
    switch (reason.code) {
      case 'all-equal':
        return t('all values are equal');
      case 'few-for-chi-square':
        return t(
          '{0} has {1} values: too few for chi-square to be near, and there are too many ways to count',
          String(reason.facts['label']),
          Number(reason.facts['n']),
        );
      case 'cannot-reach':
        return waysWhy(reason, t);
      default:
        return severalWhy(reason, t);
    }
  },
});

function missing(data: Several, ask: Ask): Reason | null {
  const refused = severalRefused(data, ask);
  if (refused !== null) return refused;
  if (data.groups.some(({ sample }) => sample === null)) return { code: 'no-values', facts: {} };
  const [first, ...others] = ranksOf(data.groups).ranks;
  return others.every(rank => rank === first) ? { code: 'all-equal', facts: {} } : null;
}

const isCounted = (sizes: readonly number[]): boolean =>
  sizes.every(size => size <= MOST_COUNTED) && waysOfSizes(sizes) <= MOST_WAYS;

/** Groups of one size can change places: so many ways, at least, share the largest H. */
const fewest = (sizes: readonly number[]): number =>
  sizes.reduce(
    (ways, size, place) => ways * sizes.slice(0, place + 1).filter(other => other === size).length,
    1,
  );

const ranksOf = (groups: readonly Group[]): Ranks =>
  midRanksOf(groups.flatMap(({ sample }) => (sample === null ? [] : [keysOf(sample.numbers)])));

/**
 * H = (N − 1) Σ n (R̄ − (N + 1)/2)² / Σ (r − (N + 1)/2)², which is the usual form divided by its tie factor
 * 1 − Σ (t³ − t)/(N³ − N). Twice the distances are whole numbers. Source: Kruskal & Wallis 1952, formulas 1.1 and 1.3.
 */
function rankSpread(
  { ranks, tieSizes }: Ranks,
  sizes: readonly number[],
): { readonly statistic: number; readonly tieFactor: number } {
  const all = ranks.length;
  let filled = 0;
  const between = sizes.reduce((sum, size) => {
    let distance = 0;
    for (const end = filled + size; filled < end; filled += 1)
      distance += 2 * (ranks[filled] ?? 0) - (all + 1);
    return sum + distance ** 2 / size;
  }, 0);
  const cubes = (n: number): bigint => BigInt(n) ** 3n - BigInt(n);
  const untied = cubes(all) - tieSizes.reduce((sum, size) => sum + cubes(size), 0n);
  return {
    statistic: (3 * (all - 1) * between) / Number(untied),
    tieFactor: quotient(untied, cubes(all)),
  };
}
