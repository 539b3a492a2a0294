import type { Say } from '../../core/model/say';

/** An effect size by its name, with what its unit is. */
export function effectName(id: string, t: Say): string {
  switch (id) {
    case 'hedges-g':
      return t('difference in pooled SDs (Hedges g)');
    case 'cohen-d':
      return t('difference in pooled SDs (Cohen d)');
    case 'glass-delta':
      return t('difference in units of the reference group’s SD (Glass delta)');
    case 'ratio-of-geometric-means':
      return t('ratio of geometric means');
    case 'percent':
      return t('percent of the reference');
    case 'chance-larger':
      return t('chance that a value of the test group is the larger');
    case 'risk-ratio':
      return t('ratio of the shares');
    case 'odds-ratio':
      return t('ratio of the odds');
    default:
      return id;
  }
}

/** Values of an effect size that no limit may print as unless it has them: those that say neither way. */
export function effectSpecial(id: string): readonly number[] {
  if (id === 'chance-larger') return [0.5];
  return id === 'risk-ratio' || id === 'odds-ratio' || id === 'ratio-of-geometric-means' ? [1] : [0];
}
