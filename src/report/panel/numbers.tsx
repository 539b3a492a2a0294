import type { NumbersShown } from '../view/shown';
import { Fold } from './fold';
import { Number } from './number';
import type { Part } from './part';

/** Groups across, quantities down; effect sizes, evidence and every number in full folded beneath. */
export function Numbers({ shown, words, send }: Part<NumbersShown>) {
  const { columns, rows, more } = shown;
  return (
    <section class="wb-part">
      <h2>{shown.heading}</h2>
      <table class={`wb-numbers wb-columns-${Math.min(columns.length, 4)}`} role="table">
        <caption class="wb-unseen">{shown.caption}</caption>
        <thead role="rowgroup">
          <tr role="row">
            <th role="columnheader" scope="col" class="wb-corner">
              <span class="wb-unseen">{shown.quantity}</span>
            </th>
            {columns.map(column => (
              <th key={column} role="columnheader" scope="col" class={shortClass(column)}>
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {rows.map(row => (
            <tr key={row.key} role="row">
              <th role="rowheader" scope="row" class={shortClass(row.name)}>
                {row.name}
              </th>
              {row.cells.map((cell, index) => (
                <td key={index} role="cell">
                  <Number printed={cell} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {more !== null && (
        <Fold summary={more.summary} send={send}>
          <ul class="wb-list">
            {more.effects.map(({ name, value }) => (
              <li key={name}>
                {name}: <Number printed={value} />
              </li>
            ))}
            {more.evidence.map(sentence => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
        </Fold>
      )}
      {send !== null && <InFull shown={shown} words={words} send={send} />}
    </section>
  );
}

const SHORT = 9;

/** A short label is never broken inside a word; a long one may be, so that the table fits a narrow panel. */
const shortClass = (label: string): string | undefined =>
  label.split(' ').every(word => word.length <= SHORT) ? 'wb-short' : undefined;

/** The same numbers with every digit, to be read and copied without pointing at them. */
function InFull({ shown, words, send }: Part<NumbersShown>) {
  const rows = shown.rows.filter(row => row.cells.some(cell => cell !== null && cell.full !== ''));
  return (
    <Fold summary={words.full} send={send}>
      <dl class="wb-full">
        {rows.map(row => (
          <div key={row.key}>
            <dt>{row.name}</dt>
            {row.cells.map(
              (cell, index) =>
                cell !== null &&
                cell.full !== '' && (
                  <dd key={index}>
                    {shown.columns[index]}: {cell.full}
                  </dd>
                ),
            )}
          </div>
        ))}
      </dl>
    </Fold>
  );
}
