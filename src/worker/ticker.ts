import { Cancelled, type Ticker } from '../core/model/problem';
import { isGivenUp } from '../protocol/cancelFlags';

/** A ticker for one call: stops it once it was given up, and reports every whole percent once. */
export function tickerFor(
  call: number,
  flags: Int32Array | null,
  report: (done: number, total: number) => void,
): Ticker {
  let reported = -1;
  return (done, total) => {
    if (isGivenUp(flags, call)) throw new Cancelled();
    const percent = total > 0 ? Math.floor((100 * done) / total) : 0;
    if (percent === reported) return;
    reported = percent;
    report(done, total);
  };
}
