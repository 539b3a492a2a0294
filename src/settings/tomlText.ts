import { TomlDate } from 'smol-toml';
import { momentText } from './document';

const MOMENT = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}(\.\d+)?(Z|[+-]\d{2}:\d{2})$/u;
const BARE_KEY = /^[A-Za-z0-9_-]+$/u;
const SHORT_ESCAPES: Readonly<Record<string, string>> = {
  '\b': '\\b',
  '\t': '\\t',
  '\n': '\\n',
  '\f': '\\f',
  '\r': '\\r',
  '"': '\\"',
  '\\': '\\\\',
};

/** A value as TOML 1.0, on one line. Numbers are the shortest text that reads back to the same double. */
export function tomlText(value: unknown): string {
  if (typeof value === 'string') return quoted(value);
  if (typeof value === 'number') return numberText(value);
  if (typeof value === 'boolean' || typeof value === 'bigint') return String(value);
  if (value instanceof TomlDate) return momentText(value);
  if (Array.isArray(value)) return value.length === 0 ? '[]' : `[${value.map(tomlText).join(', ')}]`;
  if (typeof value === 'object' && value !== null) {
    const pairs = Object.entries(value).map(([key, item]) => `${tomlKey(key)} = ${tomlText(item)}`);
    return pairs.length === 0 ? '{}' : `{ ${pairs.join(', ')} }`;
  }
  throw new TypeError(`TOML has no ${typeof value}`);
}

/** A key, quoted where it must be. */
export const tomlKey = (key: string): string => (BARE_KEY.test(key) ? key : quoted(key));

/** A date and time as TOML writes it, or a string where it is none. */
export const momentOrText = (value: string): string => (isMoment(value) ? value : quoted(value));

function isMoment(value: string): boolean {
  return MOMENT.test(value) && !Number.isNaN(Date.parse(value)) && momentText(new TomlDate(value)) === value;
}

function numberText(value: number): string {
  if (Number.isNaN(value)) return 'nan';
  if (!Number.isFinite(value)) return value > 0 ? 'inf' : '-inf';
  if (Object.is(value, -0)) return '-0.0';
  // TOML integers end at 2^63 and readers may stop at 2^53: larger ones are written as floats.
  return Number.isInteger(value) && !Number.isSafeInteger(value) ? value.toExponential() : String(value);
}

function quoted(value: string): string {
  // A lone surrogate cannot stand in UTF-8 text; it is replaced as every encoder would. What other programs take for the
  // end of a line, or what turns the direction of a line and so could hide a part of it, is written as its code.
  const escaped = value
    .replace(/\p{Cs}/gu, '\ufffd')
    .replace(/["\\\p{Cc}\p{Zl}\p{Zp}\p{Bidi_Control}]/gu, escape);
  return `"${escaped}"`;
}

const escape = (character: string): string =>
  SHORT_ESCAPES[character] ?? `\\u${character.charCodeAt(0).toString(16).padStart(4, '0')}`;
