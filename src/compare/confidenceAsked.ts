import { Refusal } from '../core/model/problem';

/** The confidence asked for, strictly between 0 and 1; one typed in percent is refused with what was meant. */
export function confidenceAsked(confidence: number | undefined): number {
  if (confidence === undefined) return 0.95;
  if (confidence > 1 && confidence < 100) {
    throw new Refusal('confidence-as-percent', {
      confidence,
      meant: Number((confidence / 100).toPrecision(12)),
    });
  }
  if (!(confidence > 0 && confidence < 1)) throw new Refusal('confidence-out-of-range', { confidence });
  return confidence;
}
