import { scaleLinear } from 'd3-scale';
import type { FigureShown, RuleShown } from '../view/figureShown';
import { Axis } from './axis';
import { PLOT_HEIGHT } from './groupsPlot';
import { LabelText } from './labelText';
import { at, markPath } from './shapes';
import { swarm } from './swarm';

const TOP = 48;
const BOTTOM = 282;
const LEFT = 58;
const RIGHT = 136;

type Difference = NonNullable<FigureShown['difference']>;

const LEAST_BESIDE = 74;
const LETTER = 6.6;

/** Width of the plot in its own units: the axis and the longest label beside it. */
export const differenceWidth = ({ rules }: Difference): number =>
  RIGHT + Math.max(LEAST_BESIDE, ...rules.map(({ label }) => 10 + Math.ceil(label.length * LETTER)));

/** The difference with its interval on an axis of its own, with what it is held against and what matters ruled across. */
export function DifferencePlot({ difference }: { readonly difference: Difference }) {
  const { estimate, lower, upper, rules, points, power, axis } = difference;
  const factor = 10 ** power;
  const width = differenceWidth(difference);
  const scale = scaleLinear()
    .domain(domainOf(difference).map(value => value * factor))
    .range([BOTTOM, TOP])
    .nice(6);
  const height = (value: number): number => at(scale(value * factor));
  const middle = points.length > 0 ? RIGHT - 20 : (LEFT + RIGHT) / 2;
  const pointHeights = points.map(height);
  const aside = swarm(pointHeights, 5, 16);
  return (
    <svg
      class="wb-plot wb-plot-difference"
      width={width}
      viewBox={`0 0 ${width} ${PLOT_HEIGHT}`}
      aria-hidden="true"
    >
      <LabelText text={axis} x={8} y={14} width={30} most={2} anchor="start" kind="wb-axis-name" />
      <Axis scale={scale} x={LEFT} to={RIGHT} count={6} />
      {placed(rules, height).map(({ rule, y, label }) => (
        <g key={`${rule.kind} ${rule.at}`} class={`wb-rule wb-rule-${rule.kind}`}>
          <line x1={LEFT} x2={RIGHT} y1={y} y2={y} />
          <text x={RIGHT + 5} y={label} dy="0.32em">
            {rule.label}
          </text>
        </g>
      ))}
      <g class="wb-difference">
        {points.map((point, index) => (
          <path
            key={index}
            class="wb-difference-point"
            d={markPath(0, 16)}
            transform={`translate(${LEFT + 26 + (aside[index] ?? 0)} ${height(point)})`}
          />
        ))}
        {(lower !== null || upper !== null) && (
          <line
            class="wb-interval"
            x1={middle}
            x2={middle}
            y1={lower === null ? BOTTOM : height(lower)}
            y2={upper === null ? TOP : height(upper)}
          />
        )}
        {[lower, upper].map(
          limit =>
            limit !== null && (
              <line
                key={limit}
                class="wb-interval"
                x1={middle - 6}
                x2={middle + 6}
                y1={height(limit)}
                y2={height(limit)}
              />
            ),
        )}
        {estimate !== null && <circle class="wb-estimate" cx={middle} cy={height(estimate)} r={5} />}
      </g>
    </svg>
  );
}

function domainOf({ estimate, lower, upper, rules, points }: Difference): readonly number[] {
  const values = [estimate, lower, upper, ...rules.map(rule => rule.at), ...points].filter(
    value => value !== null,
  );
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const room = low < high ? (high - low) * 0.06 : Math.abs(low) || 1;
  return [low - room, high + room];
}

const LABEL_APART = 14;

/** Rules from the top down, their labels moved apart where they would touch. */
function placed(
  rules: readonly RuleShown[],
  height: (value: number) => number,
): readonly { readonly rule: RuleShown; readonly y: number; readonly label: number }[] {
  let last = -Infinity;
  return [...rules]
    .sort((a, b) => height(a.at) - height(b.at))
    .map(rule => {
      const y = height(rule.at);
      last = Math.max(y, last + LABEL_APART);
      return { rule, y, label: last };
    });
}
