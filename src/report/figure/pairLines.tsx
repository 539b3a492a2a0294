import type { FigureShown } from '../view/figureShown';
import { at } from './shapes';

interface PairLinesProps {
  readonly figure: FigureShown;
  readonly scale: (value: number) => number;
  readonly middle: (group: number) => number;
}

/** A line for each pair from its test value to its reference value. */
export function PairLines({ figure, scale, middle }: PairLinesProps) {
  return (
    <g class="wb-pairs">
      {figure.lines.map(([test, reference], index) => (
        <line key={index} x1={middle(0)} x2={middle(1)} y1={at(scale(test))} y2={at(scale(reference))} />
      ))}
    </g>
  );
}
