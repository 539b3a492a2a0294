import { hedgesG } from '../core/methods/effects/hedgesG';
import { percentOfReference } from '../core/methods/effects/percentOfReference';
import type { Effect, Row } from '../core/model/comparison';
import type { Designs } from '../core/model/groups';
import { isRatioScale } from './ratioScale';

interface Scale {
  readonly name: string;
  readonly unit: string | null;
  readonly lowest: number | null;
  /** Pairs: a size in pooled SDs would mix the scatter between pairs with that within. */
  readonly paired: boolean;
}

/**
 * Sizes beside the raw difference of two means: percent of the reference mean with the limits of the chosen row, and the
 * difference in pooled SDs. Empty when the chosen row has no number.
 */
export function meanEffects(
  { test, reference }: Designs['two'],
  chosen: Row,
  scale: Scale,
): readonly Effect[] {
  const difference = chosen.result?.estimate ?? null;
  if (chosen.result === null || difference === null) return [];
  const percent = isRatioScale(scale.name, scale.unit, scale.lowest)
    ? percentOfReference(difference, reference.mean, chosen.result)
    : null;
  const g = !scale.paired && test.n > 1 && reference.n > 1 ? hedgesG(test, reference, difference) : null;
  return [
    ...(percent === null ? [] : [{ id: 'percent', ...percent }]),
    ...(g === null ? [] : [{ id: 'hedges-g', value: g, lower: null, upper: null }]),
  ];
}
