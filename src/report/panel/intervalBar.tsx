import { scaleLinear } from 'd3-scale';
import { at } from '../figure/shapes';
import type { IntervalShown, RuleShown } from '../view/figureShown';

const WIDTH = 150;
const HEIGHT = 18;
const EDGE = 6;

export type BarScale = (value: number) => number;

/** One scale for the bars of all rows, so that they can be compared by eye. */
export function barScale(bars: readonly (IntervalShown | null)[], rules: readonly RuleShown[]): BarScale {
  const values = [
    ...rules.map(rule => rule.at),
    ...bars.flatMap(bar => (bar === null ? [] : [bar.estimate, bar.lower, bar.upper])),
  ].filter(value => value !== null);
  return scaleLinear()
    .domain([Math.min(...values), Math.max(...values)])
    .range([EDGE, WIDTH - EDGE]);
}

interface BarProps {
  readonly bar: IntervalShown;
  readonly rules: readonly RuleShown[];
  readonly scale: BarScale;
}

/** An interval beside its text: a line with its estimate, what it is held against and what matters ruled down. */
export function IntervalBar({ bar, rules, scale }: BarProps) {
  const { estimate, lower, upper } = bar;
  const middle = HEIGHT / 2;
  const ends = [lower, upper].filter(limit => limit !== null);
  return (
    <svg class="wb-bar" viewBox={`0 0 ${WIDTH} ${HEIGHT}`} width={WIDTH} height={HEIGHT} aria-hidden="true">
      {rules.map(rule => (
        <g key={`${rule.kind} ${rule.at}`} class={`wb-rule wb-rule-${rule.kind}`}>
          <line x1={at(scale(rule.at))} x2={at(scale(rule.at))} y1={0} y2={HEIGHT} />
        </g>
      ))}
      <line
        class="wb-interval"
        x1={lower === null ? 0 : at(scale(lower))}
        x2={upper === null ? WIDTH : at(scale(upper))}
        y1={middle}
        y2={middle}
      />
      {ends.map(limit => (
        <line
          key={limit}
          class="wb-interval"
          x1={at(scale(limit))}
          x2={at(scale(limit))}
          y1={middle - 4}
          y2={middle + 4}
        />
      ))}
      {estimate !== null && <circle class="wb-estimate" cx={at(scale(estimate))} cy={middle} r={3.5} />}
    </svg>
  );
}
