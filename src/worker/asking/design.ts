import type { Designs } from '../../core/model/groups';
import type { Measure } from '../../core/model/settings';
import type { Request } from '../../compare/request';

/** What kind of comparison the answers so far make, as far as they say. */
export function designAsked(request: Partial<Request>): { design: keyof Designs; measure: Measure } {
  const measure = request.measure ?? 'mean';
  const paired = request.pair !== undefined && request.pair !== 'none';
  if (measure === 'proportion') return { design: paired ? 'pairedCounts' : 'counts', measure };
  return { design: paired ? 'pairs' : 'two', measure };
}
