import type { ScaleLinear } from 'd3-scale';
import { at } from './shapes';

interface AxisProps {
  readonly scale: ScaleLinear<number, number>;
  /** Where the line of the axis stands. */
  readonly x: number;
  /** To where the grid lines run. */
  readonly to: number;
  readonly count: number;
}

/** A vertical axis: its values left of it, faint lines across. */
export function Axis({ scale, x, to, count }: AxisProps) {
  const format = scale.tickFormat(count);
  return (
    <g class="wb-axis">
      {scale.ticks(count).map(tick => (
        <g key={tick}>
          <line class="wb-grid" x1={x} x2={to} y1={at(scale(tick))} y2={at(scale(tick))} />
          <text class="wb-tick" x={x - 6} y={at(scale(tick))} dy="0.32em" text-anchor="end">
            {format(tick)}
          </text>
        </g>
      ))}
    </g>
  );
}
