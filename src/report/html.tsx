import { renderToString } from 'preact-render-to-string';
import { figureSvg } from './figure/figureSvg';
import { pageStyle } from './pageStyle';
import type { View } from './view/shown';

interface Rows {
  readonly caption: string;
  readonly head: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

/** A complete page that prints well: every section, the figure, the full record, a foot to sign on, and the block. */
export function htmlPage(view: View): string {
  return `<!DOCTYPE html>\n${renderToString(<Page view={view} />)}\n`;
}

function Page({ view }: { readonly view: View }) {
  const { answer, figure, whatIf, findings, numbers, leftOut, notebook, record } = view;
  return (
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <title>{view.title}</title>
        <style>{pageStyle}</style>
      </head>
      <body>
        <h1>{answer.headline}</h1>
        <Lines
          of={[answer.shares, answer.difference, answer.interval, answer.beside, answer.matters, answer.p]}
        />
        <Lines of={[answer.design, answer.variance, answer.doubt, ...answer.notes]} />
        <Lines of={[answer.caution, ...answer.cautions]} />
        {figure === null ? null : (
          <figure dangerouslySetInnerHTML={{ __html: figureSvg(view).replace(/^<\?xml[^>]*\?>/u, '') }} />
        )}
        <h2>{whatIf.heading}</h2>
        <Lines of={[whatIf.verdict, whatIf.explained, whatIf.sameData]} />
        <Table
          caption={whatIf.caption}
          head={[whatIf.words.assumption, whatIf.words.interval, whatIf.words.decision, whatIf.words.note]}
          rows={[...whatIf.rows, ...(whatIf.others?.rows ?? [])].map(row => [
            row.chosen ? `${row.title} (${row.chosenWord})` : row.title,
            row.interval.text,
            row.decision,
            row.note,
          ])}
        />
        <h2>{findings.heading}</h2>
        <ul>
          {[...findings.open, ...(findings.folded?.list ?? [])].map(at => (
            <li>
              {at.levelWord}: {at.sentence}
            </li>
          ))}
        </ul>
        <Lines of={[findings.quiet]} />
        <h2>{numbers.heading}</h2>
        <Table
          caption={numbers.caption}
          head={[numbers.quantity, ...numbers.columns]}
          rows={numbers.rows.map(({ name, cells }) => [name, ...cells.map(cell => cell?.text ?? '')])}
        />
        <h2>{leftOut.heading}</h2>
        <Lines of={[leftOut.none, ...leftOut.rows.map(({ sentence }) => sentence), leftOut.kept]} />
        <h2>{record.heading}</h2>
        <Lines of={notebook.changed} />
        {record.parts.map(part => (
          <Table caption={part.heading} head={[]} rows={part.rows} />
        ))}
        <h2>{record.signOff.heading}</h2>
        <Table
          caption={record.signOff.recordId}
          head={['', ...record.signOff.columns]}
          rows={record.signOff.rows.map(row => [row, ...record.signOff.columns.map(() => '')])}
        />
        <Lines of={record.signOff.foot} />
        {notebook.blockText === null ? <p>{notebook.noBlock}</p> : <pre>{notebook.blockText}</pre>}
      </body>
    </html>
  );
}

const Lines = ({ of }: { readonly of: readonly (string | null)[] }) => (
  <>{of.map(text => (text === null || text === '' ? null : <p>{text}</p>))}</>
);

const Table = ({ caption, head, rows }: Rows) => (
  <table>
    <caption>{caption}</caption>
    {head.length === 0 ? null : (
      <thead>
        <tr>
          {head.map(cell => (
            <th scope="col">{cell}</th>
          ))}
        </tr>
      </thead>
    )}
    <tbody>
      {rows.map(([first, ...cells]) => (
        <tr>
          <th scope="row">{first}</th>
          {cells.map(cell => (
            <td>{cell}</td>
          ))}
        </tr>
      ))}
    </tbody>
  </table>
);
