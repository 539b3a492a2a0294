/** The id of the record that a settings block bears, or null without one. */
export const recordIdOf = (blockText: string | null): string | null => recordKeyOf(blockText, 'id');

/** The value of a key that stands once in a settings block, as written; null where it does not stand there. */
export function recordKeyOf(blockText: string | null, key: 'id' | 'written'): string | null {
  const line = new RegExp(`^\\s*${key} = "?([^"\\n]*)"?$`, 'm').exec(blockText ?? '');
  return line?.[1]?.trim() ?? null;
}
