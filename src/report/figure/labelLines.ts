/** A label in at most `most` lines of about `width` letters, cut with … where it does not fit. */
export function labelLines(text: string, width: number, most: number): readonly string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (line !== '' && longer.length > width) {
      lines.push(line);
      line = word;
    } else {
      line = longer;
    }
  }
  lines.push(line);
  const shown = lines.slice(0, most).map(own => cut(own, width + 2));
  const last = shown.at(-1) ?? '';
  return lines.length > most ? [...shown.slice(0, -1), last.endsWith('…') ? last : `${last}…`] : shown;
}

const cut = (text: string, width: number): string =>
  text.length > width ? `${text.slice(0, width - 1)}…` : text;
