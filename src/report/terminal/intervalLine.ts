import { scaleLinear } from 'd3-scale';
import { withMinus } from '../numbersPrinted';
import { movedPoint } from '../words/rounding';
import type { FigureShown } from '../view/figureShown';
import { widthOf } from './columns';

const INDENT = 6;
const WIDTH = 36;
const ROOM = 2;

/**
 * The difference on an axis of characters: a line of values, then ├ ● ┤ for the interval, │ for what it is held against,
 * ┊ for what matters or a margin. An open end runs to the edge and has no ├ or ┤.
 */
export function intervalLines(difference: NonNullable<FigureShown['difference']>): readonly string[] {
  const { estimate, lower, upper, rules, power, unit } = difference;
  const values = [estimate, lower, upper, ...rules.map(rule => rule.at)].filter(value => value !== null);
  const [low, high] = [Math.min(...values), Math.max(...values)];
  if (!(high > low)) return [];

  const ticks = ticksOf(low, high, rules.find(rule => rule.kind === 'matters' && rule.at > 0)?.at ?? null);
  const axis = scaleLinear()
    .domain([Math.min(low, ticks[0] ?? low), Math.max(high, ticks.at(-1) ?? high)])
    .rangeRound([0, WIDTH]);
  const marks = new Array<string>(WIDTH + 1).fill(' ');
  const put = (value: number, mark: string): void => {
    marks[axis(value)] = mark;
  };
  // A limit that lies beside a ruled value is not drawn on it.
  const clear = (limit: number): number => {
    const beside = rules.filter(rule => rule.at !== limit && axis(rule.at) === axis(limit));
    const step = beside.some(rule => limit > rule.at) ? 1 : beside.length > 0 ? -1 : 0;
    return Math.min(WIDTH, Math.max(0, axis(limit) + step));
  };
  const from = lower === null ? 0 : clear(lower);
  const to = upper === null ? WIDTH : clear(upper);
  if (lower !== null || upper !== null) marks.fill('─', from, to + 1);
  for (const rule of rules) put(rule.at, rule.kind === 'against' ? '│' : '┊');
  if (lower !== null) marks[from] = '├';
  if (upper !== null) marks[to] = '┤';
  if (estimate !== null) put(estimate, '●');

  const labels = labelled(
    [...rules.map(rule => rule.at), ...ticks].map(value => ({
      at: axis(value),
      text: tickText(value, power),
    })),
  );
  const drawn = marks.join('').trimEnd();
  const name = difference.label;
  const beside = INDENT + WIDTH + 1 + ROOM + widthOf(name) <= 80;
  return [
    ...(beside ? [] : [' '.repeat(INDENT) + name]),
    `${' '.repeat(INDENT)}${labels}${unit === '' ? '' : `  ${unit}`}`.trimEnd(),
    `${' '.repeat(INDENT)}${beside ? `${drawn.padEnd(WIDTH + 1 + ROOM)}${name}` : drawn}`,
  ];
}

/** Steps of what matters where a few of them span the axis, else round steps. */
function ticksOf(low: number, high: number, matters: number | null): readonly number[] {
  if (matters !== null) {
    const first = Math.floor(low / matters);
    const last = Math.ceil(high / matters);
    if (last - first >= 2 && last - first <= 5)
      return Array.from({ length: last - first + 1 }, (_, at) => (first + at) * matters);
  }
  return scaleLinear().domain([low, high]).nice(4).ticks(4);
}

const tickText = (value: number, power: number): string =>
  withMinus(String(Number(movedPoint(value, power).toPrecision(10))));

/** Labels begin above their mark; of two that would touch, the one named first stays. */
function labelled(wanted: readonly { readonly at: number; readonly text: string }[]): string {
  let line = '';
  for (const { at, text } of wanted) {
    const from = Math.max(0, at - ROOM);
    const end = at + text.length;
    if (line.slice(from, end + ROOM).trim() !== '') continue;
    const wide = line.padEnd(end);
    line = wide.slice(0, at) + text + wide.slice(end);
  }
  return line;
}
