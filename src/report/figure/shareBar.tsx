import type { GroupFigure } from '../view/figureShown';
import { at } from './shapes';

const WIDTH = 56;

interface ShareBarProps {
  readonly group: GroupFigure;
  readonly scale: (value: number) => number;
  readonly middle: number;
}

/** A share as a bar from 0. */
export function ShareBar({ group, scale, middle }: ShareBarProps) {
  const share = group.mean.estimate ?? 0;
  return (
    <rect
      class="wb-share"
      x={at(middle - WIDTH / 2)}
      width={WIDTH}
      y={at(scale(share))}
      height={at(Math.max(0, scale(0) - scale(share)))}
    />
  );
}
