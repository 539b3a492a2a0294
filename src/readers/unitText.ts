const PREFIX = '(?:[yzafpnuµμmcdhkMGTPEZY]|da)';
const SYMBOL =
  '(?:m|g|s|A|K|mol|cd|Hz|N|Pa|J|W|C|V|F|Ω|ohm|S|T|H|lm|lx|Bq|Gy|Sv|kat|L|l|t|eV|u|Da|bar|M|U|IU|cal|Wh|rad|cP|St|Å|ppm|ppb|ppt|min|h|d|a|yr|ha|dB|psi|mmHg|inch|in|ft|lb|oz|gal|rpm|pH|NTU|GU|HV|HB|HRC|CFU|cfu|counts?|cts|px|°C|°F|°|degC|degF|deg|%|‰)';
const POWER = '(?:\\^?[-−⁻]?[0-9¹²³⁴⁰]+)?';
const ONE = `(?:${PREFIX}?${SYMBOL}${POWER}|10\\^?\\d+|1|mass ?%|vol ?%|wt ?%|wt\\.-?%|% ?(?:w/w|v/v|w/v))`;
const UNIT = new RegExp(`^${ONE}(?:(?: ?[/·*⋅×] ?| )${ONE})*$`);
const BRACKETED = /^(?:\(([^()]{1,24})\)|\[([^[\]]{1,24})\])$/;
const IN_HEADER = /^(.*\S)\s*(?:\(([^()]{1,24})\)|\[([^[\]]{1,24})\])\s*$/s;
const QUOTIENT = /^(.*\S)\s+\/\s+(\S.{0,23})$/s;
const LONGEST = 24;
const UNITLESS = /^(?:-|–|—|1|\(-\)|\[-\]|n\/?a|none|units?:?|einheit(?:en)?:?)$/i;

/** The unit a cell of a units row names: (MPa), [mg/L], °C; '' for a cell that says there is none; null: no unit. */
export function unitOfCell(text: string): string | null {
  const cell = text.trim();
  if (cell === '' || UNITLESS.test(cell)) return '';
  const bracketed = BRACKETED.exec(cell);
  if (bracketed !== null) return (bracketed[1] ?? bracketed[2] ?? '').trim();
  return cell.length <= LONGEST && UNIT.test(cell) ? cell : null;
}

/** The unit at the end of a header: Mass (mg), Mass [mg], Mass / mg; null: none. */
export function unitInHeader(header: string): string | null {
  const bracketed = IN_HEADER.exec(header);
  if (bracketed !== null) return (bracketed[2] ?? bracketed[3] ?? '').trim() || null;
  const quotient = QUOTIENT.exec(header);
  const unit = quotient?.[2]?.trim() ?? '';
  return UNIT.test(unit) ? unit : null;
}
