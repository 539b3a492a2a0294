import { KEY_ORDER, MOMENT_KEYS, type Block } from './document';
import { momentOrText, tomlKey, tomlText } from './tomlText';

export const FORMAT = 1;
const FIRST_LINE = `# weighbeam settings block, format ${FORMAT}`;
export const LAST_LINE = '# end of settings block';

type Table = Readonly<Record<string, unknown>>;

/** The block as TOML 1.0 between its two comment lines: fixed order, one setting a line, LF, ending with LF. */
export function printBlock(block: Block): string {
  return [FIRST_LINE, ...tableLines(block), LAST_LINE, ''].join('\n');
}

function tableLines(block: Table): readonly string[] {
  const known = [...KEY_ORDER.keys()];
  const unknown = Object.keys(block).filter(key => !known.includes(key));
  return [
    ...loose(block, unknown),
    ...known.flatMap(name => tablesOf(name, block[name])),
    ...unknownTables(block, unknown),
  ];
}

/** Unknown keys that are no tables come first: TOML has no other place for them. */
const loose = (block: Table, unknown: readonly string[]): readonly string[] =>
  unknown.filter(key => !isTable(block[key])).map(key => `${tomlKey(key)} = ${tomlText(block[key])}`);

const unknownTables = (block: Table, unknown: readonly string[]): readonly string[] =>
  unknown.filter(key => isTable(block[key])).flatMap(key => tablesOf(key, block[key]));

function tablesOf(name: string, value: unknown): readonly string[] {
  if (Array.isArray(value))
    return value.flatMap(item => [`[[${tomlKey(name)}]]`, ...keyLines(name, item as Table)]);
  return value === undefined ? [] : [`[${tomlKey(name)}]`, ...keyLines(name, value as Table)];
}

function keyLines(table: string, values: Table): readonly string[] {
  const order = KEY_ORDER.get(table) ?? [];
  const keys = [
    ...order.filter(key => values[key] !== undefined),
    ...Object.keys(values).filter(key => !order.includes(key)),
  ];
  return keys.map(key => `${tomlKey(key)} = ${valueText(key, values[key])}`);
}

const valueText = (key: string, value: unknown): string =>
  MOMENT_KEYS.has(key) && typeof value === 'string' ? momentOrText(value) : tomlText(value);

const isTable = (value: unknown): boolean =>
  typeof value === 'object' &&
  value !== null &&
  (Array.isArray(value) ? value.length > 0 && value.every(isPlain) : isPlain(value));

const isPlain = (value: unknown): boolean =>
  typeof value === 'object' && value !== null && !Array.isArray(value) && !(value instanceof Date);
