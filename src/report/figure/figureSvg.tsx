import { renderToString } from 'preact-render-to-string';
import type { View } from '../view/shown';
import { DifferencePlot, differenceWidth } from './differencePlot';
import { figureStyle } from './figureStyle';
import { LabelText } from './labelText';
import { GroupsPlot, groupsPlotWidth, PLOT_HEIGHT } from './groupsPlot';

const MARGIN = 12;
const CAPTION = 40;
/** Width of a letter of the caption, on average. */
const LETTER = 6;

/** The figure as a stand-alone SVG document with its own style: a fixed light palette, the same on every screen and on paper. */
export function figureSvg(view: View): string {
  const { figure } = view;
  if (figure === null) return '';
  const groups = groupsPlotWidth(figure);
  const difference = figure.difference === null ? 0 : differenceWidth(figure.difference);
  const width = groups + difference + 2 * MARGIN;
  const height = PLOT_HEIGHT + CAPTION + 2 * MARGIN;
  const svg = (
    <svg
      xmlns="http://www.w3.org/2000/svg"
      class="wb-sheet"
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-labelledby="wb-sentence"
    >
      <title id="wb-sentence">{figure.sentence}</title>
      <style>{figureStyle}</style>
      <rect class="wb-paper" width={width} height={height} />
      <svg x={MARGIN} y={MARGIN} width={groups} height={PLOT_HEIGHT}>
        <GroupsPlot figure={figure} send={null} />
      </svg>
      {figure.difference !== null && (
        <svg x={MARGIN + groups} y={MARGIN} width={difference} height={PLOT_HEIGHT}>
          <DifferencePlot difference={figure.difference} />
        </svg>
      )}
      <LabelText
        text={figure.caption}
        x={MARGIN + 8}
        y={MARGIN + PLOT_HEIGHT + 16}
        width={Math.floor((width - 2 * MARGIN) / LETTER)}
        most={3}
        anchor="start"
        kind="wb-caption"
      />
    </svg>
  );
  return `${renderToString(svg)}\n`;
}
