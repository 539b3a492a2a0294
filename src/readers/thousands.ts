/** Marks that may stand between groups of three digits. */
const MARKS = ".,'\u2019 \u00a0\u2009\u202f";
const GROUPED = new RegExp(
  `^([+\\-\u2212]?)([1-9]\\d{0,2})([${MARKS}])(\\d{3}(?:\\3\\d{3})*)(?:([.,])(\\d+))?$`,
);

export interface Grouped {
  /** The number without its thousands marks. */
  readonly text: string;
  readonly mark: string;
  /** 1.234 and 1,234 are numbers without a thousands mark too, and three powers of ten away: only proof elsewhere helps. */
  readonly ambiguous: boolean;
}

/** Reads digits in groups of three: 1,234.5 or 1 234 567; null when the text is not written so. */
export function readGrouped(text: string, decimal: '.' | ','): Grouped | null {
  const match = GROUPED.exec(text);
  if (match === null) return null;
  const [, sign = '', first = '', mark = '', groups = '', point, fraction] = match;
  if (mark === decimal || (point !== undefined && point !== decimal)) return null;
  const whole = sign + first + groups.split(mark).join('');
  const canBeDecimal = mark === '.' || mark === ',';
  return {
    text: fraction === undefined ? whole : `${whole}${decimal}${fraction}`,
    mark,
    ambiguous: canBeDecimal && fraction === undefined && groups.length === 3,
  };
}
