import type { RowShown, WhatIfShown } from '../view/shown';
import { Fold } from './fold';
import { barScale, IntervalBar, type BarScale } from './intervalBar';
import { Number } from './number';
import type { Part } from './part';

/** The rows under other assumptions, what they say together, and what stands beside them uncounted. */
export function WhatIf({ shown, send }: Part<WhatIfShown>) {
  const { others, notApplying } = shown;
  return (
    <section class="wb-part">
      <h2>{shown.heading}</h2>
      <p class="wb-verdict">{shown.verdict}</p>
      {shown.explained !== null && <p>{shown.explained}</p>}
      <Rows shown={shown} rows={shown.rows} caption={shown.caption} />
      <p class="wb-quiet">{shown.sameData}</p>
      {others !== null && (
        <Fold summary={others.summary} send={send}>
          <Rows shown={shown} rows={others.rows} caption={others.summary} />
        </Fold>
      )}
      {notApplying !== null && (
        <Fold summary={notApplying.summary} send={send}>
          <ul class="wb-list">
            {notApplying.rows.map(({ title, why }) => (
              <li key={`${title} ${why}`}>{why.startsWith(title) ? why : `${title}: ${why}`}</li>
            ))}
          </ul>
        </Fold>
      )}
    </section>
  );
}

interface RowsProps {
  readonly shown: WhatIfShown;
  readonly rows: readonly RowShown[];
  readonly caption: string;
}

/** Roles are named because narrow panels lay the cells out under one another. */
function Rows({ shown, rows, caption }: RowsProps) {
  const scale = barScale(
    rows.map(row => row.bar),
    shown.rules,
  );
  return (
    <table class="wb-rows" role="table">
      <caption class="wb-unseen">{caption}</caption>
      <thead role="rowgroup" class="wb-unseen">
        <tr role="row">
          <th role="columnheader" scope="col">
            {shown.words.assumption}
          </th>
          <th role="columnheader" scope="col">
            {shown.words.interval}
          </th>
          <th role="columnheader" scope="col">
            {shown.words.decision}
          </th>
          <th role="columnheader" scope="col">
            {shown.words.note}
          </th>
        </tr>
      </thead>
      <tbody role="rowgroup">
        {rows.map(row => (
          <RowLine key={`${row.id} ${row.data}`} shown={shown} row={row} scale={scale} />
        ))}
      </tbody>
    </table>
  );
}

interface RowLineProps {
  readonly shown: WhatIfShown;
  readonly row: RowShown;
  readonly scale: BarScale;
}

function RowLine({ shown, row, scale }: RowLineProps) {
  return (
    <tr role="row" class={row.chosen ? 'wb-row wb-row-chosen' : 'wb-row'}>
      <th role="rowheader" scope="row">
        {row.title}
        {row.chosenWord !== '' && <span class="wb-chosen"> ({row.chosenWord})</span>}
      </th>
      <td role="cell" class="wb-row-interval">
        {row.bar !== null && <IntervalBar bar={row.bar} rules={shown.rules} scale={scale} />}
        <Number printed={row.interval} />
      </td>
      <td role="cell">{row.decision}</td>
      <td role="cell" class="wb-quiet">
        {row.note}
      </td>
    </tr>
  );
}
