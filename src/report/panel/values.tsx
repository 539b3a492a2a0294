import { useState } from 'preact/hooks';
import type { FigureShown, PointShown } from '../view/figureShown';
import { Button } from './button';
import type { Part } from './part';

/** Every value that has a cell, by group, made only when unfolded: what clicking a point does, by keyboard. */
export function Values({ shown, words, send }: Part<FigureShown>) {
  const [isOpen, setOpen] = useState(false);
  const groups = shown.groups.map(({ label, points, small }) => ({
    label,
    values: [...points, ...small].filter(point => point.at !== null),
  }));
  if (groups.every(({ values }) => values.length === 0)) return null;
  return (
    <details class="wb-fold" onToggle={event => setOpen(event.currentTarget.open)}>
      <summary>{words.values}</summary>
      {isOpen &&
        groups.map(({ label, values }) => (
          <section key={label} class="wb-values">
            <h3>{label}</h3>
            <ol>
              {values.map((point, index) => (
                <Value key={index} point={point} words={words} send={send} />
              ))}
            </ol>
          </section>
        ))}
    </details>
  );
}

function Value({ point, send }: { readonly point: PointShown } & Pick<Part<FigureShown>, 'words' | 'send'>) {
  const { at, label, text } = point;
  if (at === null) return null;
  return (
    <li>
      <Button action={{ kind: 'point', at }} send={send} about={label}>
        {text}
      </Button>
    </li>
  );
}
