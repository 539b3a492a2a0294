import { labelLines } from './labelLines';

interface LabelTextProps {
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly most: number;
  readonly anchor: 'start' | 'middle';
  readonly kind: string;
  /** A quieter line under the label. */
  readonly under?: string;
}

const LINE_HEIGHT = 15;

/** A label in lines under one another; what is cut off stands in its title. */
export function LabelText({ text, x, y, width, most, anchor, kind, under }: LabelTextProps) {
  const lines = labelLines(text, width, most);
  return (
    <text class={kind} x={x} y={y} text-anchor={anchor}>
      <title>{text}</title>
      {lines.map((line, index) => (
        <tspan key={line} x={x} dy={index === 0 ? 0 : LINE_HEIGHT}>
          {line}
        </tspan>
      ))}
      {under !== undefined && (
        <tspan class="wb-under" x={x} dy={LINE_HEIGHT}>
          {under}
        </tspan>
      )}
    </text>
  );
}
