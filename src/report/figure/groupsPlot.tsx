import { scaleLinear } from 'd3-scale';
import type { Send } from '../panel/action';
import type { FigureShown, GroupFigure, IntervalShown } from '../view/figureShown';
import { Axis } from './axis';
import { DensityShape } from './densityShape';
import { LabelText } from './labelText';
import { PairLines } from './pairLines';
import { Points } from './points';
import { at, groupClass } from './shapes';
import { ShareBar } from './shareBar';

export const PLOT_HEIGHT = 300;
const TOP = 30;
const BOTTOM = 250;
const LEFT = 58;
const COLUMN = 132;

/** Width of the plot in its own units: a column a group beside the axis. */
export const groupsPlotWidth = (figure: FigureShown): number => LEFT + COLUMN * figure.groups.length + 6;

interface GroupsPlotProps {
  readonly figure: FigureShown;
  readonly send: Send | null;
}

/** Every value of every group in its column, with the group's mean and interval. */
export function GroupsPlot({ figure, send }: GroupsPlotProps) {
  const width = groupsPlotWidth(figure);
  const shares = figure.kind === 'shares';
  const scale = scaleLinear().domain(domainOf(figure)).range([BOTTOM, TOP]).nice(6);
  const printed = shares
    ? scaleLinear()
        .domain(scale.domain().map(share => share * 100))
        .range([BOTTOM, TOP])
    : scale;
  const middle = (group: number): number => LEFT + COLUMN * (group + 0.5);
  return (
    <svg
      class="wb-plot wb-plot-groups"
      width={width}
      viewBox={`0 0 ${width} ${PLOT_HEIGHT}`}
      aria-hidden="true"
    >
      <LabelText text={figure.axis} x={8} y={14} width={52} most={1} anchor="start" kind="wb-axis-name" />
      <Axis scale={printed} x={LEFT} to={width - 6} count={6} />
      {figure.kind === 'pairs' && <PairLines figure={figure} scale={scale} middle={middle} />}
      {figure.groups.map((group, index) => (
        <g key={group.label} class={groupClass(index)}>
          {shares ? (
            <ShareBar group={group} scale={scale} middle={middle(index)} />
          ) : (
            <GroupColumn
              figure={figure}
              group={group}
              index={index}
              scale={scale}
              middle={middle(index)}
              send={send}
            />
          )}
          <LabelText
            text={group.label}
            x={middle(index)}
            y={BOTTOM + 18}
            width={18}
            most={2}
            anchor="middle"
            kind="wb-name"
            under={group.n}
          />
        </g>
      ))}
    </svg>
  );
}

export type Place = (value: number) => number;

interface ColumnProps extends GroupsPlotProps {
  readonly group: GroupFigure;
  readonly index: number;
  readonly scale: Place;
  readonly middle: number;
}

function GroupColumn({ figure, group, index, scale, middle, send }: ColumnProps) {
  const hasReadings = group.small.length > 0;
  const isPairs = figure.kind === 'pairs';
  const outer = index === 0 ? -1 : 1;
  const points = isPairs ? middle : hasReadings ? middle + 4 : middle - 10;
  const bare = group.points.length === 0 && group.density === null;
  const mean = bare ? middle : isPairs ? middle + outer * 30 : middle + 46;
  return (
    <>
      {group.density !== null && <DensityShape density={group.density} scale={scale} middle={middle - 10} />}
      {hasReadings && (
        <Points
          points={group.small}
          group={index}
          size={4}
          reach={16}
          scale={scale}
          middle={middle - 38}
          send={send}
        />
      )}
      <Points
        points={group.points}
        group={index}
        size={group.density !== null ? 3 : group.points.length > 60 ? 6 : 9}
        reach={isPairs || group.density !== null ? 0 : hasReadings ? 22 : 40}
        scale={scale}
        middle={points}
        send={send}
      />
      <MeanBar mean={group.mean} scale={scale} x={mean} />
    </>
  );
}

/** A group's mean as a bar across, its interval as a line. */
function MeanBar({
  mean,
  scale,
  x,
}: {
  readonly mean: IntervalShown;
  readonly scale: Place;
  readonly x: number;
}) {
  const { estimate, lower, upper } = mean;
  if (estimate === null) return null;
  return (
    <g class="wb-mean">
      {lower !== null && upper !== null && (
        <line class="wb-mean-interval" x1={x} x2={x} y1={at(scale(lower))} y2={at(scale(upper))} />
      )}
      <line class="wb-mean-mark" x1={x - 9} x2={x + 9} y1={at(scale(estimate))} y2={at(scale(estimate))} />
    </g>
  );
}

/** From the lowest to the highest value drawn; shares start at 0. */
function domainOf({ groups, kind }: FigureShown): [number, number] {
  let low = Infinity;
  let high = -Infinity;
  const meet = (value: number | null): void => {
    if (value === null || !Number.isFinite(value)) return;
    low = Math.min(low, value);
    high = Math.max(high, value);
  };
  for (const { points, small, density, mean } of groups) {
    points.forEach(point => meet(point.value));
    small.forEach(point => meet(point.value));
    [mean.estimate, mean.lower, mean.upper].forEach(meet);
    if (density !== null) [density.from, density.from + density.width * density.counts.length].forEach(meet);
  }
  if (kind === 'shares') return [0, high > 0 ? Math.min(1, high * 1.15) : 1];
  if (!(low <= high)) return [0, 1];
  return low < high ? [low, high] : [low - 1, high + 1];
}
