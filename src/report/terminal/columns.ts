/** Marks that take no place of their own, and scripts whose letters take two places in a terminal. */
const NO_PLACE = /\p{Mn}|\u200d|\ufe0f/u;
const TWO_PLACES =
  /[\u1100-\u115f\u2e80-\u303e\u3041-\u33ff\u3400-\u4dbf\u4e00-\u9fff\ua000-\ua4cf\uac00-\ud7a3\uf900-\ufaff\ufe30-\ufe6f\uff00-\uff60\uffe0-\uffe6\u{1f300}-\u{1faff}\u{20000}-\u{3fffd}]/u;

/** Columns that a text takes in a terminal. Source: Unicode Standard Annex 11 (East Asian Width), wide and fullwidth. */
export function widthOf(text: string): number {
  let width = 0;
  for (const mark of text) width += NO_PLACE.test(mark) ? 0 : TWO_PLACES.test(mark) ? 2 : 1;
  return width;
}

export const padded = (text: string, width: number): string =>
  text + ' '.repeat(Math.max(0, width - widthOf(text)));

/** A text in lines of at most `width` columns: the first begins with `first`, the others with as many spaces as `indent`. */
export function wrapped(text: string, width: number, first = '', indent = widthOf(first)): readonly string[] {
  const lines: string[] = [];
  let start = first;
  let line = '';
  for (const word of text.split(' ').filter(part => part !== '')) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (line !== '' && widthOf(start + longer) > width) {
      lines.push(start + line);
      start = ' '.repeat(indent);
      line = word;
    } else {
      line = longer;
    }
  }
  return [...lines, (start + line).trimEnd()];
}

/** Rows of cells as columns, each as wide as its widest cell, `gap` spaces apart; the last is not padded. */
export function tabulated(rows: readonly (readonly string[])[], gap: number): readonly string[] {
  const widths = columnWidths(rows);
  return rows.map(row =>
    row
      .map((cell, at) => (at === row.length - 1 ? cell : padded(cell, (widths[at] ?? 0) + gap)))
      .join('')
      .trimEnd(),
  );
}

export function columnWidths(rows: readonly (readonly string[])[]): readonly number[] {
  const count = Math.max(0, ...rows.map(row => row.length));
  return Array.from({ length: count }, (_, at) => Math.max(...rows.map(row => widthOf(row[at] ?? ''))));
}
