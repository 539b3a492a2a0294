import { area, curveMonotoneY } from 'd3-shape';
import type { DensityShown } from '../view/figureShown';

const HALF_WIDTH = 40;

interface DensityProps {
  readonly density: DensityShown;
  readonly scale: (value: number) => number;
  readonly middle: number;
}

/** How many values lie where, as a shape whose width is their count. */
export function DensityShape({ density, scale, middle }: DensityProps) {
  const { from, width, counts } = density;
  const most = counts.reduce((high, count) => Math.max(high, count), 1);
  const shape = area<readonly [number, number]>()
    .x0(([, count]) => middle - (HALF_WIDTH * count) / most)
    .x1(([, count]) => middle + (HALF_WIDTH * count) / most)
    .y(([value]) => scale(value))
    .curve(curveMonotoneY)
    .digits(2);
  const points = counts.map((count, bin) => [from + (bin + 0.5) * width, count] as const);
  const ends = [[from, 0] as const, ...points, [from + counts.length * width, 0] as const];
  return <path class="wb-density" d={shape(ends) ?? ''} />;
}
