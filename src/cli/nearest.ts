/** Insertions, deletions, replacements and swaps of neighbours that turn one word into the other. */
function editDistance(from: string, to: string): number {
  const at = Array.from({ length: from.length + 1 }, (_, row) =>
    Array.from({ length: to.length + 1 }, (__, column) => (row === 0 ? column : column === 0 ? row : 0)),
  );
  const read = (row: number, column: number) => at[row]?.[column] ?? 0;
  for (const [row, line] of at.entries()) {
    if (row === 0) continue;
    for (let column = 1; column <= to.length; column++) {
      const same = from[row - 1] === to[column - 1];
      let best = Math.min(
        read(row - 1, column) + 1,
        read(row, column - 1) + 1,
        read(row - 1, column - 1) + (same ? 0 : 1),
      );
      if (row > 1 && column > 1 && from[row - 1] === to[column - 2] && from[row - 2] === to[column - 1]) {
        best = Math.min(best, read(row - 2, column - 2) + 1);
      }
      line[column] = best;
    }
  }
  return read(from.length, to.length);
}

/** The known word that was probably meant: few edits away, or begun in the same way; null when none is close. */
export function nearest(word: string, known: readonly string[]): string | null {
  const begun = known.filter(candidate => word.length > 1 && candidate.startsWith(word));
  if (begun[0] !== undefined) return begun[0];
  const ranked = known
    .map(candidate => ({ candidate, edits: editDistance(word, candidate) }))
    .sort((one, other) => one.edits - other.edits);
  const best = ranked[0];
  return best !== undefined && best.edits <= Math.max(1, Math.floor(best.candidate.length / 3))
    ? best.candidate
    : null;
}
