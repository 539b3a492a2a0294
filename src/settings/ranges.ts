type Ranges = 'all' | readonly (readonly [number, number])[];

/** Ranges of line numbers as a block writes them: 'all', '5-76', '5-40, 50-76'. */
export const rangesText = (rows: Ranges): string =>
  rows === 'all' ? 'all' : rows.map(([first, last]) => `${first}-${last}`).join(', ');

/** The inverse of rangesText. The schema of a block lets no other text through. */
export function rangesOf(text: string): Ranges {
  const found = [...text.matchAll(/(\d+)\s*-\s*(\d+)/gu)].map(
    ([, first, last]) => [Number(first), Number(last)] as const,
  );
  return found.length === 0 ? 'all' : found;
}
