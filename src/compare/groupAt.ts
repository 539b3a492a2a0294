/** What a list with one entry a group holds for this one; lists of one comparison always cover its groups. */
export function groupAt<T>(list: readonly T[], group: number): T {
  const own = list[group];
  if (own === undefined) throw new RangeError(`no group ${group}`);
  return own;
}
