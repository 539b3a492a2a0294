/** The id of the record that a settings block bears, or null without one. */
export function recordIdOf(blockText: string | null): string | null {
  return /^\s*\[record\]\s*\n\s*id = "([^"]*)"/m.exec(blockText ?? '')?.[1] ?? null;
}
