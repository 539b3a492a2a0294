export type LineOf = (path: string) => number;

const TABLE = /^\[(?<array>\[)?\s*(?<name>[^\]]+?)\s*\]/u;
const KEY = /^(?<key>[A-Za-z0-9_-]+|"(?:[^"\\]|\\.)*")\s*=/u;

/**
 * Finds the line of a key by its path: 'result.p', 'left-out.0.line' for the first [[left-out]]. Every key of a block
 * starts its own line, so the lines themselves are the map. Falls back to the table, then to the first line.
 */
export function keyLines(lines: readonly string[], firstLine: number): LineOf {
  const at = new Map<string, number>();
  const counts = new Map<string, number>();
  let table = '';
  lines.forEach((line, index) => {
    const header = TABLE.exec(line)?.groups;
    if (header !== undefined) {
      const name = unquoted(header['name'] ?? '');
      const count = counts.get(name) ?? 0;
      counts.set(name, count + 1);
      table = header['array'] === undefined ? name : `${name}.${count}`;
      at.set(table, firstLine + index);
      if (!at.has(name)) at.set(name, firstLine + index);
      return;
    }
    const key = KEY.exec(line)?.groups?.['key'];
    if (key !== undefined)
      at.set(table === '' ? unquoted(key) : `${table}.${unquoted(key)}`, firstLine + index);
  });
  return path => {
    for (
      let part = path;
      part !== '';
      part = part.includes('.') ? part.slice(0, part.lastIndexOf('.')) : ''
    ) {
      const line = at.get(part);
      if (line !== undefined) return line;
    }
    return firstLine;
  };
}

const unquoted = (key: string): string => key.replace(/^"(.*)"$/u, '$1');
