import type { NotebookShown } from '../view/shown';
import { Button } from './button';
import { Fold } from './fold';
import type { Part } from './part';

/** What goes into the notebook: what a person states, what was changed after the result, and the block to copy. */
export function Notebook({ shown, words, send }: Part<NotebookShown>) {
  const { blockText } = shown;
  return (
    <section class="wb-part">
      <h2>{shown.heading}</h2>
      <ul class="wb-controls">
        {shown.states.map(({ key, label, value }) => (
          <li key={key}>
            {send === null ? (
              <>
                {label} <b>{value}</b>
              </>
            ) : (
              <Button action={{ kind: 'state', key }} send={send} kind="control">
                {label} <b>{value}</b>
              </Button>
            )}
          </li>
        ))}
      </ul>
      {shown.changed.map(sentence => (
        <p key={sentence}>{sentence}</p>
      ))}
      {shown.noBlock !== null && <p>{shown.noBlock}</p>}
      {blockText !== null && send !== null && (
        <>
          <p>
            <Button action={{ kind: 'copyBlock' }} send={send} kind="main">
              {words.copyBlock}
            </Button>
          </p>
          <Fold summary={shown.blockHeading} send={send}>
            <pre class="wb-block" tabIndex={0} aria-label={shown.blockHeading}>
              {blockText}
            </pre>
          </Fold>
        </>
      )}
    </section>
  );
}
