import type { Send } from '../panel/action';
import type { PointShown } from '../view/figureShown';
import { at, markPath } from './shapes';
import { swarm } from './swarm';

interface PointsProps {
  readonly points: readonly PointShown[];
  readonly group: number;
  /** Width of a mark. */
  readonly size: number;
  /** How far aside marks may be moved. */
  readonly reach: number;
  readonly scale: (value: number) => number;
  readonly middle: number;
  readonly send: Send | null;
}

/** Values as marks of the group's shape; a mark with a cell goes to it when clicked. */
export function Points({ points, group, size, reach, scale, middle, send }: PointsProps) {
  const heights = points.map(point => scale(point.value));
  const aside = swarm(heights, size + 0.5, reach);
  const path = markPath(group, (size * size * Math.PI) / 4);
  return (
    <g class={size > 4 ? 'wb-points' : 'wb-points wb-points-small'}>
      {points.map((point, index) => (
        <Mark
          key={index}
          point={point}
          path={path}
          x={middle + (aside[index] ?? 0)}
          y={heights[index] ?? 0}
          send={send}
        />
      ))}
    </g>
  );
}

interface MarkProps {
  readonly point: PointShown;
  readonly path: string;
  readonly x: number;
  readonly y: number;
  readonly send: Send | null;
}

function Mark({ point, path, x, y, send }: MarkProps) {
  const { at: cell, far, text, label } = point;
  const title = [text, label].filter(part => part !== '').join(', ');
  const kind = `${far ? 'wb-point wb-point-far' : 'wb-point'}${cell !== null && send !== null ? ' wb-point-live' : ''}`;
  const place = `translate(${at(x)} ${at(y)})`;
  if (cell === null || send === null)
    return (
      <path class={kind} d={path} transform={place}>
        {title !== '' && <title>{title}</title>}
      </path>
    );
  return (
    <path class={kind} d={path} transform={place} onClick={() => send({ kind: 'point', at: cell })}>
      <title>{title}</title>
    </path>
  );
}
