import type { FindingShown, FindingsShown } from '../view/shown';
import { Button } from './button';
import { Fold } from './fold';
import type { Part } from './part';

const MOST_BUTTONS = 3;

/** What the file shows, gravest first. */
export function Findings({ shown, words, send }: Part<FindingsShown>) {
  const { open, folded } = shown;
  return (
    <section class="wb-part">
      <h2>{shown.heading}</h2>
      {open.length > 0 && <FindingList list={open} words={words} send={send} />}
      {folded !== null && (
        <Fold summary={folded.summary} send={send}>
          <FindingList list={folded.list} words={words} send={send} />
        </Fold>
      )}
      <p class="wb-quiet">{shown.quiet}</p>
    </section>
  );
}

type ListProps = { readonly list: readonly FindingShown[] } & Omit<Part<FindingsShown>, 'shown'>;

function FindingList({ list, words, send }: ListProps) {
  return (
    <ul class="wb-findings">
      {list.map((found, index) => (
        <li key={index} class={`wb-finding wb-finding-${found.level}`}>
          <b class="wb-level">{found.levelWord}</b> <span class="wb-finding-text">{found.sentence}</span>{' '}
          {found.cells.slice(0, MOST_BUTTONS).map(({ at, label }) => (
            <Button key={label} action={{ kind: 'show', at }} send={send} about={label}>
              {words.show}
            </Button>
          ))}
        </li>
      ))}
    </ul>
  );
}
