/** A number as a person types it, with a point or a comma; null when it is none. */
export function readNumber(typed: string): number | null {
  const text = typed.trim().replace(',', '.').replace('\u2212', '-');
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(text) ? Number(text) : null;
}
