import type { TableShown } from '../view/shown';
import { Number } from './number';

/** Pairs of groups, or a family of columns: a table whose first cell names its row. */
export function PlainTable({ shown }: { readonly shown: TableShown }) {
  return (
    <section class="wb-part">
      <h2>{shown.heading}</h2>
      <table class="wb-plain">
        <caption>{shown.caption}</caption>
        <thead>
          <tr>
            {shown.columns.map(column => (
              <th key={column} scope="col">
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {shown.rows.map((row, at) => (
            <tr key={at}>
              {row.map((cell, index) =>
                index === 0 ? (
                  <th key={index} scope="row">
                    {cell.text}
                  </th>
                ) : (
                  <td key={index}>
                    <Number printed={cell} />
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
