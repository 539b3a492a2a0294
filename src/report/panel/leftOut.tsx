import type { LeftOutShown } from '../view/shown';
import { Button } from './button';
import type { Part } from './part';

/** Every row left out, each with the way back, and the answer with all of them kept. */
export function LeftOut({ shown, words, send }: Part<LeftOutShown>) {
  return (
    <section class="wb-part">
      <h2>{shown.heading}</h2>
      {shown.none !== null && <p>{shown.none}</p>}
      {shown.rows.length > 0 && (
        <ul class="wb-list wb-left-out">
          {shown.rows.map(({ sentence, file, line, at, place }) => (
            <li key={sentence}>
              {sentence}{' '}
              <Button action={{ kind: 'show', at }} send={send} about={place}>
                {words.show}
              </Button>
              <Button action={{ kind: 'takeBack', file, line }} send={send} about={place}>
                {words.takeBack}
              </Button>
            </li>
          ))}
        </ul>
      )}
      {shown.kept !== null && <p>{shown.kept}</p>}
    </section>
  );
}
