import type { AnswerShown } from '../view/shown';
import { Button } from './button';
import type { Part } from './part';

/** The answer in the order in which it is asked for: open questions, which way and how much, whether it matters, how sure. */
export function Answer({ shown, send }: Part<AnswerShown>) {
  const { difference, interval, beside } = shown;
  const sure = [shown.p === null ? null : `${shown.p}.`, shown.design]
    .filter(part => part !== null)
    .join(' ');
  return (
    <header class="wb-answer">
      {shown.open.map(question => (
        <p key={question} class="wb-open">
          {question}
        </p>
      ))}
      {shown.shares !== null && <p class="wb-shares">{shown.shares}</p>}
      <h1>{shown.headline}</h1>
      {difference !== null && <p class="wb-size">{difference}</p>}
      {interval !== null && <p class="wb-size">{interval}</p>}
      {beside !== null && <p>{beside}</p>}
      {shown.doubt !== null && <p class="wb-doubt">{shown.doubt}</p>}
      {shown.matters !== '' && <p>{shown.matters}</p>}
      <p>{sure}</p>
      <Controls shown={shown} send={send} />
      {shown.notes.map(note => (
        <p key={note} class="wb-quiet">
          {note}
        </p>
      ))}
      <p class="wb-quiet">{shown.caution}</p>
      {shown.cautions.length > 0 && (
        <aside class="wb-cautions">
          {shown.cautions.map(caution => (
            <p key={caution}>{caution}</p>
          ))}
        </aside>
      )}
    </header>
  );
}

/** What was asked, each part a button that asks it anew. */
function Controls({ shown, send }: Pick<Part<AnswerShown>, 'shown' | 'send'>) {
  return (
    <ul class="wb-controls">
      {shown.controls.map(({ key, label, value }) => (
        <li key={key}>
          {send === null ? (
            <>
              {label} <b>{value}</b>
            </>
          ) : (
            <Button action={{ kind: 'change', key }} send={send} kind="control">
              {label} <b>{value}</b>
            </Button>
          )}
        </li>
      ))}
    </ul>
  );
}
