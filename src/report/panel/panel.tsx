import type { View } from '../view/shown';
import type { Send } from './action';
import { Answer } from './answer';
import { Findings } from './findings';
import { LeftOut } from './leftOut';
import { Notebook } from './notebook';
import { Numbers } from './numbers';
import { Picture } from './picture';
import { PlainTable } from './plainTable';
import { WhatIf } from './whatIf';

interface PanelProps {
  readonly view: View;
  /** null on a page: no buttons, nothing folded. */
  readonly send: Send | null;
}

/** A whole comparison, the answer first; the same in the editor and, without buttons, on an exported page. */
export function Panel({ view, send }: PanelProps) {
  const { words, figure } = view;
  return (
    <article class="wb-panel" aria-label={view.title}>
      <Answer shown={view.answer} words={words} send={send} />
      {figure !== null && <Picture shown={figure} words={words} send={send} />}
      <WhatIf shown={view.whatIf} words={words} send={send} />
      {view.tables.map(table => (
        <PlainTable key={table.heading} shown={table} />
      ))}
      <Findings shown={view.findings} words={words} send={send} />
      <Numbers shown={view.numbers} words={words} send={send} />
      <LeftOut shown={view.leftOut} words={words} send={send} />
      <Notebook shown={view.notebook} words={words} send={send} />
      {view.columns.map(column => (
        <Panel key={column.title} view={column} send={send} />
      ))}
    </article>
  );
}
