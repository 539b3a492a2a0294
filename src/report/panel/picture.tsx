import { DifferencePlot } from '../figure/differencePlot';
import { GroupsPlot } from '../figure/groupsPlot';
import type { FigureShown } from '../view/figureShown';
import type { Part } from './part';
import { Values } from './values';

/** The figure, its caption, and every value with its cell for those who cannot point at it. */
export function Picture({ shown, words, send }: Part<FigureShown>) {
  return (
    <figure class="wb-figure">
      <div class="wb-plots" role="img" aria-label={shown.sentence}>
        <GroupsPlot figure={shown} send={send} />
        {shown.difference !== null && <DifferencePlot difference={shown.difference} />}
      </div>
      <figcaption>{shown.caption}</figcaption>
      {send !== null && <Values shown={shown} words={words} send={send} />}
    </figure>
  );
}
